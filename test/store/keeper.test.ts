import { afterEach, beforeEach, expect, it, vi } from "vitest";
import { Autosave } from "../../src/store/autosave.ts";
import { Keeper } from "../../src/store/keeper.ts";
import { keeping } from "../../src/store/keeping.ts";
import { createDividerStore } from "../../src/store/store.ts";
import { inventedDesign } from "../file/invented.ts";
import { MemoryLocks, MemoryShelf } from "./memory.ts";

const nominal = "/brief/waveform/nominal_V";
let shelf: MemoryShelf;
let locks: MemoryLocks;
function tab() {
  const store = createDividerStore(inventedDesign(), { now: Date.now, takeCandidate: (document) => document });
  const keeper = new Keeper(store, new Autosave({ shelf, locks, now: Date.now }));
  const type = (value: number) => store.getState().editAt(nominal, value, { step: "nominal voltage" });
  return { store, keeper, type, volts: () => store.getState().document.brief.waveform.nominal_V };
}

beforeEach(() => {
  vi.useFakeTimers({ now: 1_000_000 });
  shelf = new MemoryShelf();
  locks = new MemoryLocks();
});
afterEach(() => void vi.useRealTimers());

it("writes a moment after the last keystroke, and during long typing now and then", async () => {
  const { keeper, type, store } = tab();
  await keeper.open("a");
  type(1);
  await vi.advanceTimersByTimeAsync(200);
  type(2);
  await vi.advanceTimersByTimeAsync(299);
  expect(shelf.writes).toBe(0);
  await vi.advanceTimersByTimeAsync(1);
  expect(shelf.writes).toBe(1);
  expect(store.getState().browserCopy).toEqual({ savedAt: 1_000_500, problem: null });
  for (let i = 0; i < 50; i += 1) {
    type(i);
    await vi.advanceTimersByTimeAsync(100);
  }
  expect(shelf.writes).toBe(3);
});

it("writes at once when the page is hidden, and nothing when nothing changed", async () => {
  const { keeper, type } = tab();
  await keeper.open("a");
  await keeper.flush();
  expect(shelf.writes).toBe(0);
  type(1);
  await keeper.flush();
  expect(shelf.writes).toBe(1);
  await vi.advanceTimersByTimeAsync(5000);
  expect(shelf.writes).toBe(1);
});

it("says what went wrong and tries again with the next change", async () => {
  const { keeper, type, store } = tab();
  await keeper.open("a");
  shelf.failure = new Error("the disk is on fire");
  type(1);
  await keeper.flush();
  expect(store.getState().browserCopy).toEqual({ savedAt: null, problem: "the disk is on fire" });
  shelf.failure = null;
  await keeper.flush();
  expect(store.getState().browserCopy.problem).toBeNull();
});

it("makes the second tab read-only until it works on a copy or the first is closed", async () => {
  const first = tab();
  await first.keeper.open("a");
  first.type(1000);
  await first.keeper.flush();
  const [second, third] = [tab(), tab()];
  await second.keeper.open("a");
  await third.keeper.open("a");
  expect(second.volts()).toBe(1000);
  expect(second.store.getState().file.readOnly).toBe("open elsewhere");
  expect(second.type(5).ok).toBe(false);
  await second.keeper.workOnACopy("b");
  expect(second.type(5).ok).toBe(true);
  expect(second.store.getState().document.name).toBe("copy of 6 kV supply");
  await second.keeper.flush();

  first.type(2000);
  await first.keeper.open("c");
  await vi.advanceTimersByTimeAsync(10);
  expect([third.volts(), third.store.getState().file.readOnly]).toEqual([2000, null]);
  expect(third.type(3).ok).toBe(true);
  const after = tab();
  await after.keeper.open("b");
  expect(after.store.getState().file.readOnly).toBe("open elsewhere");
  expect(after.volts()).toBe(5);
});

it("keeps in the browser exactly the keys that the table says", async () => {
  const { keeper, type } = tab();
  await keeper.open("a");
  type(1);
  await keeper.flush();
  const kept = Object.keys(JSON.parse(shelf.held[0]!.text)).toSorted();
  expect(kept).toEqual(
    Object.entries(keeping)
      .filter(([, where]) => where.browser)
      .map(([key]) => key)
      .toSorted(),
  );
});

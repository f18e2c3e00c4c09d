import { beforeEach, describe, expect, it } from "vitest";
import { Autosave } from "../../src/store/autosave.ts";
import { checksum } from "../../src/store/checksum.ts";
import { superfluous } from "../../src/store/generation.ts";
import { createDividerStore } from "../../src/store/store.ts";
import { inventedDesign } from "../file/invented.ts";
import { MemoryLocks, MemoryShelf } from "./memory.ts";

const around = { now: () => 5, takeCandidate: <T>(document: T) => document };
const nominal = "/brief/waveform/nominal_V";
let shelf: MemoryShelf;
let locks: MemoryLocks;
let time: number;
const tab = () => new Autosave({ shelf, locks, now: () => time });
function stateWith(...volts: number[]) {
  const store = createDividerStore(inventedDesign(), around);
  for (const value of volts) {
    store.getState().editAt(nominal, value, { step: `${value} V`, typed: `${value}` });
    store.getState().leaveField();
  }
  return store.getState();
}

beforeEach(() => {
  shelf = new MemoryShelf();
  locks = new MemoryLocks();
  time = 1_000_000;
});

it("has the checksum that the catalogue of CRC algorithms gives for its check text", () => {
  // CRC-32/ISO-HDLC, check value for "123456789": cbf43926.
  expect(checksum("123456789")).toBe("cbf43926");
  expect(checksum("")).toBe("00000000");
});

describe("the browser copy", () => {
  it("brings back document, file state and history after a reload", async () => {
    const first = tab();
    await first.open("a");
    const now = stateWith(1000, 2000, 3000);
    expect((await first.save(now)).kind).toBe("saved");
    await first.close();

    const { kept, writer, damaged } = await tab().open("a");
    expect([writer, damaged]).toEqual([true, []]);
    const back = createDividerStore(inventedDesign(), around);
    back.getState().resume(kept!);
    expect(back.getState().document).toEqual(now.document);
    expect(back.getState().file).toEqual(now.file);
    expect(back.getState().past.map((step) => step.name)).toEqual(["1000 V", "2000 V", "3000 V"]);
    while (back.getState().past.length > 0) back.getState().undo();
    expect(back.getState().document).toEqual(inventedDesign());
    while (back.getState().future.length > 0) back.getState().redo();
    expect(back.getState().document).toEqual(now.document);
  });

  it("names a damaged generation and opens the one before it", async () => {
    const first = tab();
    await first.open("a");
    await first.save(stateWith(1000));
    await first.save(stateWith(2000));
    time += 5;
    await first.save(stateWith(3000));
    await first.close();
    shelf.damage(3, ({ text }) => ({ text: text.slice(0, -1) }));
    shelf.damage(2, ({ text }) => ({ text: text.replace("2000", "2001") }));
    const second = tab();
    const { kept, damaged } = await second.open("a");
    expect(kept?.document.brief.waveform.nominal_V).toBe(1000);
    expect(damaged).toEqual([
      { at: 1_000_005, why: "its length is wrong" },
      { at: 1_000_000, why: "its checksum is wrong" },
    ]);
    expect((await second.save(stateWith(4000))).kind).toBe("saved");
    expect(shelf.held.at(-1)?.revision).toBe(4);
  });

  it("never writes a state that could not be opened again", async () => {
    const first = tab();
    await first.open("a");
    await first.save(stateWith(1000));
    const good = stateWith(2000);
    const broken = [
      { ...good, document: { ...good.document, brief: { ...good.document.brief, scaleFactor: Number.NaN } } },
      { ...good, document: {} as never },
      { ...good, document: undefined as never },
    ];
    for (const state of broken) {
      const saving = await first.save(state);
      expect(saving.kind).toBe("failed");
    }
    expect(shelf.held.map((one) => one.revision)).toEqual([1]);
  });

  it("says why when the browser has no room, keeps the old generation and goes on later", async () => {
    const first = tab();
    await first.open("a");
    await first.save(stateWith(1000));
    shelf.failure = Object.assign(new Error("full"), { name: "QuotaExceededError" });
    const saving = await first.save(stateWith(2000));
    expect(saving).toEqual({ kind: "failed", why: expect.stringContaining("no room") });
    shelf.failure = null;
    expect((await first.save(stateWith(3000))).kind).toBe("saved");
    expect(shelf.held.map((one) => one.revision)).toEqual([1, 2]);
  });

  it("lets go of the history, not of the document, when it does not fit", async () => {
    const first = tab();
    await first.open("a");
    await first.save(stateWith(1000));
    await first.close();
    const text = shelf.held[0]!.text.replace('"pointer":"/brief/waveform/nominal_V"', '"pointer":"/nowhere/else"');
    shelf.damage(1, () => ({ text, length: text.length, checksum: checksum(text) }));
    const { kept } = await tab().open("a");
    expect(kept?.document.brief.waveform.nominal_V).toBe(1000);
    expect(kept?.past).toEqual([]);
  });
});

describe("two tabs on one design", () => {
  it("let one write, and the other when the first is gone", async () => {
    const [first, second] = [tab(), tab()];
    expect((await first.open("a")).writer).toBe(true);
    await first.save(stateWith(1000));
    const opening = await second.open("a");
    expect(opening.writer).toBe(false);
    expect(opening.kept?.document.brief.waveform.nominal_V).toBe(1000);
    expect((await second.save(stateWith(9))).kind).toBe("stale");
    const later = second.whenFree();
    await first.save(stateWith(2000));
    await first.close();
    expect((await later)?.kept?.document.brief.waveform.nominal_V).toBe(2000);
    expect((await second.save(stateWith(3000))).kind).toBe("saved");
    expect((await second.open("b")).writer).toBe(true);
  });

  it("are kept apart by the revision where there are no locks", async () => {
    const [first, second] = [0, 1].map(() => new Autosave({ shelf, locks: null, now: () => time }));
    await first!.open("a");
    await second!.open("a");
    expect((await first!.save(stateWith(1000))).kind).toBe("saved");
    expect((await second!.save(stateWith(2000))).kind).toBe("stale");
    expect((await first!.open("a")).kept?.document.brief.waveform.nominal_V).toBe(1000);
  });
});

it("keeps few generations, one of them always old", () => {
  let held: { revision: number; at: number }[] = [];
  const minutes = 60_000;
  for (let revision = 1; revision <= 4000; revision += 1) {
    const at = revision * 2000;
    held.push({ revision, at });
    const gone = new Set(superfluous(held, at));
    expect([revision, revision - 1, revision - 2].some((one) => gone.has(one))).toBe(false);
    held = held.filter((one) => !gone.has(one.revision));
    expect(held.length).toBeLessThanOrEqual(9);
  }
  const ages = held.map(({ at }) => (4000 * 2000 - at) / minutes);
  expect(ages.some((age) => age > 16)).toBe(true);
  expect(ages.some((age) => age > 0.5 && age < 16)).toBe(true);
});

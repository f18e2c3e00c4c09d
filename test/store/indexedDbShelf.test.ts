import "fake-indexeddb/auto";
import { IDBFactory } from "fake-indexeddb";
import { beforeEach, expect, it } from "vitest";
import { type Generation, generationOf } from "../../src/store/generation.ts";
import { IndexedDbShelf } from "../../src/store/indexedDbShelf.ts";
import { createDividerStore } from "../../src/store/store.ts";
import { inventedDesign } from "../file/invented.ts";

const state = createDividerStore(inventedDesign(), { now: () => 0, takeCandidate: (document) => document }).getState();
const generation = (slot: string, revision: number, at = revision): Generation =>
  generationOf(state, slot, revision, at) as Generation;
const none = () => [];

beforeEach(() => {
  globalThis.indexedDB = new IDBFactory();
});

it("keeps generations over a new connection, newest first and by slot", async () => {
  const shelf = new IndexedDbShelf();
  expect(await shelf.write(generation("a", 1), 0, none)).toBe("written");
  expect(await shelf.write(generation("a", 2, 9), 1, none)).toBe("written");
  expect(await shelf.write(generation("ab", 1), 0, none)).toBe("written");
  const again = new IndexedDbShelf();
  expect((await again.read("a")).map((one) => one.revision)).toEqual([2, 1]);
  expect((await again.slots()).map((one) => [one.slot, one.revision])).toEqual([
    ["a", 2],
    ["ab", 1],
  ]);
  await again.forget("a");
  expect(await again.read("a")).toEqual([]);
  expect(await again.read("ab")).toHaveLength(1);
});

it("refuses a stale writer in the same transaction, however the two interleave", async () => {
  const [one, two] = [new IndexedDbShelf(), new IndexedDbShelf()];
  await one.write(generation("a", 1), 0, none);
  const outcomes = await Promise.all([one.write(generation("a", 2), 1, none), two.write(generation("a", 2), 1, none)]);
  expect(outcomes.toSorted()).toEqual(["stale", "written"]);
  expect(await two.write(generation("a", 2), 1, none)).toBe("stale");
  expect(await two.write(generation("a", 1), 0, none)).toBe("stale");
  expect((await one.read("a")).map((g) => g.revision)).toEqual([2, 1]);
});

it("takes away what is superfluous together with the write, never what was just written", async () => {
  const shelf = new IndexedDbShelf();
  for (let revision = 1; revision <= 4; revision += 1) {
    await shelf.write(generation("a", revision), revision - 1, (held) => held.slice(0, -2).map((one) => one.revision));
  }
  expect((await shelf.read("a")).map((one) => one.revision)).toEqual([4, 3]);
});

it("throws, and leaves all as it was, when the transaction is undone after its requests went well", async () => {
  const shelf = new IndexedDbShelf();
  await shelf.write(generation("a", 1), 0, none);
  const put = IDBObjectStore.prototype.put;
  IDBObjectStore.prototype.put = function (value: unknown) {
    const request = put.call(this, value);
    request.addEventListener("success", () => this.transaction.abort());
    return request;
  };
  await expect(shelf.write(generation("a", 2), 1, none)).rejects.toThrow();
  IDBObjectStore.prototype.put = put;
  expect((await shelf.read("a")).map((one) => one.revision)).toEqual([1]);
  expect(await shelf.write(generation("a", 2), 1, none)).toBe("written");
});

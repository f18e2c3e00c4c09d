import { type DBSchema, type IDBPDatabase, openDB } from "idb";
import type { Generation } from "./generation.ts";
import type { Shelf } from "./shelf.ts";

interface Kept extends DBSchema {
  generations: { key: [slot: string, revision: number]; value: Generation };
}

const slotRange = (slot: string) => IDBKeyRange.bound([slot, 0], [slot, Number.POSITIVE_INFINITY]);

/** Generations in IndexedDB. Only the completion of a transaction counts: on a full disk a request succeeds and then all is undone. */
export class IndexedDbShelf implements Shelf {
  readonly #name: string;
  #opened: Promise<IDBPDatabase<Kept>> | null = null;
  constructor(name = "stringwright") {
    this.#name = name;
  }

  async read(slot: string): Promise<readonly Generation[]> {
    return (await (await this.#database()).getAll("generations", slotRange(slot))).reverse();
  }

  async write(
    generation: Generation,
    expected: number,
    superfluous: (held: readonly Generation[]) => readonly number[],
  ): Promise<"written" | "stale"> {
    const database = await this.#database();
    const transaction = database.transaction("generations", "readwrite", { durability: "strict" });
    const { store } = transaction;
    const held = await store.getAll(slotRange(generation.slot));
    const stale = (held.at(-1)?.revision ?? 0) !== expected;
    const gone = stale ? [] : superfluous([...held, generation]);
    await Promise.all([
      ...(stale ? [] : [store.put(generation)]),
      ...gone.map((revision) => store.delete([generation.slot, revision])),
      transaction.done,
    ]);
    return stale ? "stale" : "written";
  }

  async slots(): Promise<readonly Generation[]> {
    const newest = new Map<string, Generation>();
    for (const one of await (await this.#database()).getAll("generations")) newest.set(one.slot, one);
    return [...newest.values()].sort((a, b) => b.at - a.at);
  }

  async forget(slot: string): Promise<void> {
    await (await this.#database()).delete("generations", slotRange(slot));
  }

  /** One connection, opened anew when the browser or a newer version of the page has closed it. */
  #database(): Promise<IDBPDatabase<Kept>> {
    const lost = () => {
      this.#opened = null;
    };
    this.#opened ??= openDB<Kept>(this.#name, 1, {
      upgrade: (fresh) => void fresh.createObjectStore("generations", { keyPath: ["slot", "revision"] }),
      blocking: (_, __, event) => {
        lost();
        (event.target as IDBDatabase).close();
      },
      terminated: lost,
    }).catch((error: unknown) => {
      lost();
      throw error;
    });
    return this.#opened;
  }
}

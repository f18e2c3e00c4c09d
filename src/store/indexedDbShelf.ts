import { type DBSchema, type IDBPDatabase, openDB } from "idb";
import type { Generation } from "./generation.ts";
import type { Shelf } from "./shelf.ts";

interface Kept extends DBSchema {
  generations: { key: [slot: string, revision: number]; value: Generation };
}

const slotRange = (slot: string) => IDBKeyRange.bound([slot, 0], [slot, Number.POSITIVE_INFINITY]);

/** Generations in IndexedDB. Only the completion of a transaction counts: on a full disk a request succeeds and then all is undone. */
export function indexedDbShelf(name = "stringwright"): Shelf {
  let opened: Promise<IDBPDatabase<Kept>> | null = null;
  const database = () => {
    opened ??= openDB<Kept>(name, 1, {
      upgrade: (fresh) => void fresh.createObjectStore("generations", { keyPath: ["slot", "revision"] }),
      blocking: (_, __, event) => {
        opened = null;
        (event.target as IDBDatabase).close();
      },
      terminated: () => {
        opened = null;
      },
    }).catch((error: unknown) => {
      opened = null;
      throw error;
    });
    return opened;
  };
  return {
    read: async (slot) => (await (await database()).getAll("generations", slotRange(slot))).reverse(),
    write: async (generation, expected, superfluous) => {
      const transaction = (await database()).transaction("generations", "readwrite", { durability: "strict" });
      const { store } = transaction;
      const held = await store.getAll(slotRange(generation.slot));
      const stale = (held.at(-1)?.revision ?? 0) !== expected;
      const requests = stale
        ? []
        : [
            store.put(generation),
            ...superfluous([...held, generation]).map((revision) => store.delete([generation.slot, revision])),
          ];
      await Promise.all([...requests, transaction.done]);
      return stale ? "stale" : "written";
    },
    slots: async () => {
      const newest = new Map<string, Generation>();
      for (const one of await (await database()).getAll("generations")) newest.set(one.slot, one);
      return [...newest.values()].sort((a, b) => b.at - a.at);
    },
    forget: async (slot) => (await database()).delete("generations", slotRange(slot)),
  };
}

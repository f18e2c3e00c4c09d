/** A shelf and a lock manager in memory, and ways to break them. */
import type { Locks } from "../../src/store/autosave.ts";
import type { Generation } from "../../src/store/generation.ts";
import type { Shelf } from "../../src/store/shelf.ts";

export class MemoryShelf implements Shelf {
  held: Generation[] = [];
  /** What the next write fails with. */
  failure: Error | null = null;
  writes = 0;

  readonly read = async (slot: string) =>
    this.held.filter((one) => one.slot === slot).toSorted((a, b) => b.revision - a.revision);
  readonly write: Shelf["write"] = async (generation, expected, superfluous) => {
    this.writes += 1;
    if (this.failure !== null) throw this.failure;
    const own = await this.read(generation.slot);
    if ((own[0]?.revision ?? 0) !== expected) return "stale";
    const gone = new Set(superfluous([...own, generation]));
    this.held = [...this.held, generation].filter((one) => one.slot !== generation.slot || !gone.has(one.revision));
    return "written";
  };
  readonly slots = async () => this.held;
  readonly forget = async () => {};

  /** Changes generation `revision` behind the program's back. */
  damage(revision: number, change: (generation: Generation) => Partial<Generation>): void {
    this.held = this.held.map((one) => (one.revision === revision ? { ...one, ...change(one) } : one));
  }
}

/** One holder a name; those who wait get it in turn. */
export class MemoryLocks implements Locks {
  readonly #waiting = new Map<string, (() => void)[]>();

  async request(name: string, options: { ifAvailable?: boolean }, hold: (lock: unknown) => Promise<unknown>) {
    const queue = this.#waiting.get(name);
    if (queue !== undefined) {
      if (options.ifAvailable === true) return hold(null);
      await new Promise<void>((turn) => queue.push(turn));
    } else this.#waiting.set(name, []);
    await hold({ name });
    const next = this.#waiting.get(name)!.shift();
    if (next === undefined) this.#waiting.delete(name);
    else next();
    return undefined;
  }
}

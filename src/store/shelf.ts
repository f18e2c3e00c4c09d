import type { Generation } from "./generation.ts";

/** Where generations are kept. Handed in, so that a test can hold it in memory. */
export interface Shelf {
  /** Every generation of a slot, newest first. */
  readonly read: (slot: string) => Promise<readonly Generation[]>;
  /**
   * In one transaction: refused as *stale* unless the newest revision of the slot is `expected` (0: none), else put, and what
   * `superfluous` names taken away. Answers when the transaction has completed, and throws when it has not.
   */
  readonly write: (
    generation: Generation,
    expected: number,
    superfluous: (held: readonly Generation[]) => readonly number[],
  ) => Promise<"written" | "stale">;
  /** The newest generation of every slot, newest first. */
  readonly slots: () => Promise<readonly Generation[]>;
  readonly forget: (slot: string) => Promise<void>;
}

/** The safety net in this browser: one slot a design, one tab that writes it, several generations that are checked on opening. */
import { generationOf, opened, superfluous } from "./generation.ts";
import type { Shelf } from "./shelf.ts";
import type { Kept } from "./state.ts";

/** As much of the browser's lock manager as is used; `navigator.locks` fits. */
export interface Locks {
  request(
    name: string,
    options: { readonly ifAvailable?: boolean; readonly signal?: AbortSignal },
    hold: (lock: unknown) => Promise<unknown>,
  ): Promise<unknown>;
}

export interface Opening {
  /** false: another tab writes this slot; nothing is written from here. */
  readonly writer: boolean;
  /** The newest sound generation; null: there is none. */
  readonly kept: Kept | null;
  /** Generations newer than it that could not be opened, each with the time it was written and what is wrong. */
  readonly damaged: readonly { readonly at: number; readonly why: string }[];
}

export type Saving =
  | { readonly kind: "saved"; readonly at: number }
  /** Another tab has written since: this one must not. */
  | { readonly kind: "stale" }
  | { readonly kind: "failed"; readonly why: string };

export interface AutosaveOptions {
  readonly shelf: Shelf;
  /** null where the browser has none: the revisions alone keep two writers apart. */
  readonly locks: Locks | null;
  readonly now: () => number;
}

export class Autosave {
  readonly #options: AutosaveOptions;
  #slot: string | null = null;
  #revision = 0;
  #letGo: (() => Promise<void>) | null = null;
  constructor(options: AutosaveOptions) {
    this.#options = options;
  }

  get writing(): boolean {
    return this.#letGo !== null;
  }

  /** Takes a slot, as its writer if no other tab is, and opens what it holds. A slot held before is let go. */
  async open(slot: string): Promise<Opening> {
    await this.close();
    this.#slot = slot;
    const letGo = await this.#lock(slot, { ifAvailable: true });
    if (letGo !== null && this.#slot !== slot) await letGo();
    else this.#letGo = letGo;
    return this.#read(slot);
  }

  /** Waits until the other tab lets the slot go, then opens what it left; null when another slot was opened meanwhile. */
  async whenFree(): Promise<Opening | null> {
    const slot = this.#slot;
    if (slot === null || this.#letGo !== null) return null;
    const letGo = await this.#lock(slot, {});
    if (this.#slot !== slot) {
      await letGo?.();
      return null;
    }
    this.#letGo = letGo;
    return this.#read(slot);
  }

  /** Writes a new generation. Never throws; a state that cannot be opened again is not written. */
  async save(kept: Kept): Promise<Saving> {
    const slot = this.#slot;
    if (slot === null || this.#letGo === null) return { kind: "stale" };
    const at = this.#options.now();
    const generation = generationOf(kept, slot, this.#revision + 1, at);
    if (typeof generation === "string") return { kind: "failed", why: generation };
    try {
      const written = await this.#options.shelf.write(generation, this.#revision, (held) => superfluous(held, at));
      if (written === "stale") return { kind: "stale" };
      if (this.#slot === slot) this.#revision = generation.revision;
      return { kind: "saved", at };
    } catch (error) {
      return { kind: "failed", why: whyNot(error) };
    }
  }

  /** Lets the slot go; done when another tab could take it. */
  async close(): Promise<void> {
    const letGo = this.#letGo;
    this.#letGo = null;
    this.#slot = null;
    this.#revision = 0;
    await letGo?.();
  }

  async #read(slot: string): Promise<Opening> {
    const damaged: { at: number; why: string }[] = [];
    const generations = await this.#options.shelf.read(slot);
    if (this.#slot === slot) this.#revision = generations[0]?.revision ?? 0;
    for (const generation of generations) {
      const kept = opened(generation);
      if (typeof kept !== "string") return { writer: this.writing, kept, damaged };
      damaged.push({ at: generation.at, why: kept });
    }
    return { writer: this.writing, kept: null, damaged };
  }

  /** A function that lets the lock go; null when another tab has it. */
  #lock(slot: string, options: { readonly ifAvailable?: boolean }): Promise<(() => Promise<void>) | null> {
    const { locks } = this.#options;
    if (locks === null) return Promise.resolve(async () => {});
    return new Promise((resolve, reject) => {
      const request: Promise<unknown> = locks.request(`stringwright ${slot}`, options, (lock) => {
        if (lock === null) {
          resolve(null);
          return Promise.resolve();
        }
        return new Promise<void>((end) => {
          resolve(async () => {
            end();
            await request;
          });
        });
      });
      request.catch(reject);
    });
  }
}

function whyNot(error: unknown): string {
  const name = error instanceof Error ? error.name : "";
  if (name === "QuotaExceededError") return "there is no room left for this page in the browser's storage";
  return error instanceof Error && error.message !== "" ? error.message : "the browser's storage refused it";
}

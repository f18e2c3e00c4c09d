import { type Repair, shown } from "./repair.ts";
import type { Raw } from "./shape.ts";

/** Where a value stands: in the file, and in the document being built (bad items that were dropped shift what follows). */
export interface Place {
  readonly from: string;
  readonly to: string;
}

/** Why an object cannot be read; climbs until something around it can be dropped. */
export class Lost {
  readonly from: string;
  readonly why: string;
  readonly was: unknown;
  constructor(from: string, why: string, was: unknown) {
    this.from = from;
    this.why = why;
    this.was = was;
  }
}

/** What was noted while reading one file. */
export class Reading {
  readonly repairs: Repair[] = [];
  readonly filled: string[] = [];
  /** Filled values that say something of the world: their origin becomes *assumed*. */
  readonly assumed: string[] = [];
  /** Items that moved because one before them was dropped; null: dropped itself. */
  readonly moved: { readonly from: string; readonly to: string | null }[] = [];
  readonly root: Raw;
  constructor(root: Raw) {
    this.root = root;
  }

  /** `fault`: what is wrong with what stood there; `now`: what was done about it. */
  repair(pointer: string, what: Repair["what"], fault: string, now: string, was: unknown): void {
    this.repairs.push({ pointer, what, fault, why: `${fault}; ${now}.`, was: shown(was) });
  }

  fill(place: Place, assumed: boolean): void {
    this.filled.push(place.to);
    if (assumed) this.assumed.push(place.to);
  }

  /** Runs `read`; when it is lost, forgets what was noted inside. */
  attempt<T>(read: () => T | Lost): T | Lost {
    const marks = [this.repairs, this.filled, this.assumed, this.moved].map((list) => list.length);
    const value = read();
    if (value instanceof Lost) {
      [this.repairs, this.filled, this.assumed, this.moved].forEach((list, i) => {
        list.length = marks[i]!;
      });
    }
    return value;
  }
}

export const isObject = (value: unknown): value is Raw =>
  typeof value === "object" && value !== null && !Array.isArray(value);

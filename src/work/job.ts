/** One numbered job and its one outcome. Plain data only: everything here crosses to a worker and back. */
import type { DividerDocument, Proof, Refusal, ResistorFamily, Sizing } from "../solver/index.ts";

/** *check*: the current design, newest job only. *long*: search (and later field, Monte Carlo). */
export type Job =
  | { readonly kind: "prove"; readonly document: DividerDocument }
  | { readonly kind: "size"; readonly document: DividerDocument; readonly top: number }
  | {
      /** The search when `design.follows`, then the proof of the design chosen. */
      readonly kind: "follow";
      readonly document: DividerDocument;
      readonly top: number;
    };

export interface Outcome {
  /** The document that was judged: for `follow`, with the best candidate as its design. */
  readonly document: DividerDocument;
  readonly sizing: Sizing | null;
  readonly proof: Proof | null;
}

export type JobMessage = { readonly number: number; readonly job: Job };
export type OutcomeMessage =
  | { readonly number: number; readonly kind: "done"; readonly outcome: Outcome; readonly took_ms: number }
  | { readonly number: number; readonly kind: "refused"; readonly refusal: Refusal }
  | { readonly number: number; readonly kind: "progress"; readonly share: number };

export type { ResistorFamily };

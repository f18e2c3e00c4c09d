/** One numbered job and its one outcome. Plain data only: everything here crosses to a worker and back. */
import type {
  ColumnField,
  DividerDocument,
  Proof,
  Refusal,
  ResistorFamily,
  Sizing,
  Speed,
  Through,
} from "../solver/index.ts";

/** The field solved last; "solve": solve it within the job where the document asks for it and it is another. */
export type FieldGiven = ColumnField | null | "solve";

/** *check*: the current design, newest job only. *long*: search; *field*: the field of the drawing. */
export type Job =
  | { readonly kind: "prove"; readonly document: DividerDocument; readonly field?: FieldGiven }
  | { readonly kind: "field"; readonly document: DividerDocument }
  | {
      /** A recorded waveform through the design that stands. */
      readonly kind: "through";
      readonly document: DividerDocument;
      readonly field: ColumnField | null;
      readonly record: { readonly time_s: readonly number[]; readonly value: readonly number[] };
      readonly reference: "electrode" | "source";
    }
  /** What speed comes to beyond the proof; asked for when it is looked at. */
  | { readonly kind: "speed"; readonly document: DividerDocument; readonly field?: FieldGiven }
  | { readonly kind: "size"; readonly document: DividerDocument; readonly top: number }
  | {
      /** The search when `design.follows`, then the proof of the design chosen. */
      readonly kind: "follow";
      readonly document: DividerDocument;
      readonly top: number;
      readonly field?: FieldGiven;
    };

export interface Outcome {
  /** The document that was judged: for `follow`, with the best candidate as its design. */
  readonly document: DividerDocument;
  readonly sizing: Sizing | null;
  readonly proof: Proof | null;
  /** The field of the drawing: solved by this job, or the one it was given. */
  readonly field: ColumnField | null;
  /** The document asks for the field of its drawing and the proof had to do without. */
  readonly awaitsField: boolean;
  readonly through: Through | null;
  /** Of a speed job alone. */
  readonly speed?: Speed;
}

export type JobMessage = { readonly number: number; readonly job: Job };
export type OutcomeMessage =
  | { readonly number: number; readonly kind: "done"; readonly outcome: Outcome; readonly took_ms: number }
  | { readonly number: number; readonly kind: "refused"; readonly refusal: Refusal }
  | { readonly number: number; readonly kind: "progress"; readonly share: number };

export type { ResistorFamily };

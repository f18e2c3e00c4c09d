import type { DividerDocument, Refusal } from "../solver/index.ts";

/** One thing that was changed on opening. */
export interface Repair {
  /** JSON pointer into the file as it was. */
  readonly pointer: string;
  readonly what: "replaced" | "dropped" | "renamed";
  /** Why what stood there could not stay, without a full stop. */
  readonly fault: string;
  /** One sentence: the fault and what stands there now. */
  readonly why: string;
  /** What stood there, as JSON, shortened; empty where nothing did. */
  readonly was: string;
}

/** What opening a file gives: a whole document with everything that was changed listed, or one clear reason. */
export type Restored =
  | {
      readonly kind: "document";
      readonly document: DividerDocument;
      readonly repairs: readonly Repair[];
      /** Pointers of keys that were missing and hold their default now, marked *assumed* where they say something of the world. */
      readonly filled: readonly string[];
      /** The file is from a newer version: shown, never saved over. */
      readonly readOnly: boolean;
    }
  | { readonly kind: "refused"; readonly refusal: Refusal };

/** A value as it stood in the file, short enough for a message. */
export function shown(value: unknown): string {
  if (value === undefined) return "";
  if (typeof value === "number" && !Number.isFinite(value))
    return value > 0 ? "a number too large" : "a number too low";
  const json = JSON.stringify(value) ?? "";
  return json.length > 80 ? `${json.slice(0, 77)}…` : json;
}

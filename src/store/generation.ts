import { version } from "../file/documentShape.ts";
import { browserText, fromBrowserText } from "./browserText.ts";
import { checksum } from "./checksum.ts";
import type { Kept } from "./state.ts";

/** One autosaved state. Several of a slot are kept, so that a damaged one is not the end. */
export interface Generation {
  readonly slot: string;
  /** Counts up by one within a slot. */
  readonly revision: number;
  /** Milliseconds since 1970. */
  readonly at: number;
  readonly name: string;
  /** Version of the document's shape. */
  readonly version: number;
  readonly length: number;
  readonly checksum: string;
  readonly text: string;
}

/** A state as a generation, opened again before it is handed out; or why it may not be kept. */
export function generationOf(kept: Kept, slot: string, revision: number, at: number): Generation | string {
  let text: string;
  try {
    text = browserText(kept);
  } catch (error) {
    return error instanceof Error ? error.message : String(error);
  }
  const generation = {
    slot,
    revision,
    at,
    name: kept.document.name,
    version,
    length: text.length,
    checksum: checksum(text),
    text,
  };
  const again = opened(generation);
  return typeof again === "string" ? again : generation;
}

/** The state of a generation, or what is wrong with it. */
export function opened(generation: Generation): Kept | string {
  const { text, length } = generation;
  if (typeof text !== "string" || text.length !== length) return "its length is wrong";
  if (checksum(text) !== generation.checksum) return "its checksum is wrong";
  return fromBrowserText(text);
}

/** How many of the newest are kept whatever their age. */
const newest = 3;
const minute_ms = 60_000;

/**
 * Revisions that may go. Beyond the newest three the oldest stays for every fourfold of age (up to 4 min, 16 min, 64 min …), so
 * that it can grow old and older work can be found too.
 */
export function superfluous(held: readonly Pick<Generation, "revision" | "at">[], now: number): readonly number[] {
  const bands = new Set<number>();
  const sorted = held.toSorted((a, b) => a.revision - b.revision);
  return sorted.slice(0, -newest).flatMap(({ revision, at }) => {
    const band = Math.floor(Math.log(Math.max(1, (now - at) / minute_ms)) / Math.log(4));
    if (bands.has(band)) return [revision];
    bands.add(band);
    return [];
  });
}

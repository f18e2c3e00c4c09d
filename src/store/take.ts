/** A design put in place of another as a whole: by taking a candidate, or by following the brief. */
import { isAtOrBelow } from "../file/pointer.ts";
import type { DividerDocument } from "../solver/index.ts";
import { without } from "./edit.ts";

/** Keys of an object that the next one does not have: what a person wrote into the file beside ours stays. */
function keepingNotes<T extends object>(old: T | null, next: T): T {
  if (old === null) return next;
  const notes = Object.entries(old).filter(([key]) => !Object.hasOwn(next, key));
  return { ...Object.fromEntries(notes), ...next };
}

/**
 * `document` with the design and parts of `chosen`. Origins and typed texts of the design are those of `chosen`; those of a
 * part follow it to its new place.
 */
export function withDesignOf(document: DividerDocument, chosen: DividerDocument, follows: boolean): DividerDocument {
  if (chosen.design === null) return document;
  const design = keepingNotes(document.design, { ...chosen.design, follows });
  const entries = <T>(old: Readonly<Record<string, T>>, next: Readonly<Record<string, T>>) => ({
    ...movedParts(without(old, "/design"), document, chosen),
    ...Object.fromEntries(Object.entries(next).filter(([pointer]) => isAtOrBelow(pointer, "/design"))),
  });
  return {
    ...document,
    design,
    parts: chosen.parts,
    origins: entries(document.origins, chosen.origins),
    typed: entries(document.typed, chosen.typed),
  };
}

function movedParts<T>(map: Readonly<Record<string, T>>, from: DividerDocument, to: DividerDocument) {
  const found: Record<string, T> = {};
  for (const [pointer, value] of Object.entries(map)) {
    const at = /^\/parts\/(\d+)(\/.*)?$/.exec(pointer);
    const part = at === null ? undefined : from.parts[Number(at[1])];
    const index = part === undefined ? -1 : to.parts.findIndex((one) => one.id === part.id);
    if (at === null) found[pointer] = value;
    else if (index >= 0) found[`/parts/${index}${at[2] ?? ""}`] = value;
  }
  return found;
}

/** A design put in place of another as a whole: by taking a candidate, or by following the brief. */
import type { DividerDocument } from "../solver/index.ts";
import { without } from "./edit.ts";

/** Keys of an object that the next one does not have: what a person wrote into the file beside ours stays. */
function keepingNotes<T extends object>(old: T | null, next: T): T {
  if (old === null) return next;
  const notes = Object.entries(old).filter(([key]) => !Object.hasOwn(next, key));
  return { ...Object.fromEntries(notes), ...next };
}

/**
 * `document` with the design and parts of `chosen`. Origins and typed texts of the old design go with it; those of a part
 * follow it to its new place.
 */
export function withDesignOf(document: DividerDocument, chosen: DividerDocument, follows: boolean): DividerDocument {
  if (chosen.design === null) return document;
  const design = keepingNotes(document.design, { ...chosen.design, follows });
  const entries = <T>(map: Readonly<Record<string, T>>) => movedParts(without(map, "/design"), document, chosen);
  return {
    ...document,
    design,
    parts: chosen.parts,
    origins: { ...originsOfNewParts(document, chosen), ...entries(document.origins) },
    typed: entries(document.typed),
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

/** Origins that the choice brought along with parts this document did not have. */
function originsOfNewParts(document: DividerDocument, chosen: DividerDocument): DividerDocument["origins"] {
  const known = new Set(document.parts.map((part) => part.id));
  return Object.fromEntries(
    Object.entries(chosen.origins).filter(([pointer]) => {
      const at = /^\/parts\/(\d+)\//.exec(pointer);
      const part = at === null ? undefined : chosen.parts[Number(at[1])];
      return part !== undefined && !known.has(part.id);
    }),
  );
}

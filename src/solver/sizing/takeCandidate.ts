import type { DividerDocument } from "../job/document.ts";
import type { Part } from "../job/part.ts";
import type { Candidate } from "./outcome.ts";

/**
 * The document with the candidate as its design and every part that it names copied in. Own parts stay; catalogue copies that
 * nothing names any more go. What was typed or known of the former design goes with it, but the height of the foot and the
 * inductances of the connections.
 * @param follows true where the best candidate is to be chosen again as the brief changes
 */
export function takeCandidate(document: DividerDocument, candidate: Candidate, follows = false): DividerDocument {
  const named = new Map(candidate.parts.map((part) => [part.id, part]));
  const own = document.parts.filter((part) => isOwn(part) || named.has(part.id));
  const known = new Set(own.map((part) => part.id));
  const design = { ...candidate.design, follows };
  return {
    ...document,
    parts: [...own, ...candidate.parts.filter((part) => !known.has(part.id))],
    design,
    origins: { ...without(document.origins), "/design": "catalogue", ...keptOrigins(document) },
    typed: without(document.typed),
  };
}

const isOwn = (part: Part): boolean => part.origin !== "catalogue" || part.inHand !== undefined;

/** What a search hands on as it was, in the order in which it is saved; not stated, it is assumed, and the inductances are left out. */
const kept = [
  "/design/geometry/footHeight_m",
  "/design/lead/damping_ohm",
  "/design/lead/inductance_H",
  "/design/lvArm/inductance_H",
];

function without<T>(map: Readonly<Record<string, T>>): Record<string, T> {
  const entries = Object.entries(map).filter(([pointer]) => kept.includes(pointer) || !/^\/design(\/|$)/.test(pointer));
  return Object.fromEntries(entries);
}

const keptOrigins = (document: DividerDocument): Record<string, "assumed"> =>
  Object.fromEntries(
    kept
      .filter((pointer) => document.typed[pointer] === undefined && document.origins[pointer] === undefined)
      .map((pointer) => [pointer, "assumed"]),
  );

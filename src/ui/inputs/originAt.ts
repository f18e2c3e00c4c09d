import type { Origin } from "../../solver/index.ts";

/** Origin of a field: its own, else that of the nearest place above it; a place not listed counts as typed. */
export function originAt(origins: Readonly<Record<string, Origin>>, pointer: string): Origin {
  for (let at = pointer; at.length > 1; at = at.slice(0, at.lastIndexOf("/"))) {
    const found = origins[at];
    if (found !== undefined) return found;
  }
  return "typed";
}

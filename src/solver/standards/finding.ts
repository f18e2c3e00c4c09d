import type { Source } from "./source.ts";

/**
 * One check's outcome. *stop*: a limit not met, or a single fault that puts more than its greatest input on the instrument
 * or more than an accessible limit on a person. *caution*: met with less than its stated margin, or resting on an assumed
 * input that could turn it, or outside its formula's range. *clear*: met with margin on typed, measured or catalogue inputs.
 */
export type Level = "stop" | "caution" | "clear";

/** One change of the document that a cure makes: a JSON pointer and the new value. */
export interface Edit {
  readonly pointer: string;
  readonly value: unknown;
  /** Origin of the new value; default *typed*. */
  readonly origin?: "typed" | "measured" | "catalogue" | "assumed";
}

/** What would clear a finding, as a button. Empty `edits` with `sizeAgain` asks for a new search. */
export interface Cure {
  readonly label: string;
  readonly edits: readonly Edit[];
  readonly sizeAgain?: boolean;
}

export interface Finding {
  /** Stable id of the check, e.g. `element.voltage.rms`, `fault.lvOpen`, `creepage.element`. */
  readonly id: string;
  readonly level: Level;
  /** What was checked, a few words: "element voltage, rms". */
  readonly what: string;
  /** The number found and its limit in SI base units, null where the check has no number. */
  readonly actual: number | null;
  readonly limit: number | null;
  readonly unit: string;
  /** Whether the limit is a greatest or a least value. */
  readonly sense: "atMost" | "atLeast" | "none";
  /** Share of the limit that is left: 1 - actual/limit (atMost) or 1 - limit/actual (atLeast); negative past it. */
  readonly margin: number | null;
  /** One or two sentences with the numbers: why this level. */
  readonly reason: string;
  readonly source: Source;
  readonly cure: Cure | null;
  /** Path of the number in the proof, so that its why can be opened. */
  readonly path: string | null;
  /** Series position 1 … n that the finding is about, if one. */
  readonly element?: number;
}

/** Share of the limit that is left: 0 at the limit, negative past it, at most 1. */
export function marginOf(sense: Finding["sense"], actual: number, limit: number): number {
  if (sense === "atLeast") return actual === 0 ? -1 : 1 - limit / actual;
  return limit === 0 ? (actual === 0 ? 0 : -1) : 1 - actual / limit;
}

const rank: Record<Level, number> = { stop: 0, caution: 1, clear: 2 };

/** Worst first: by level, then by how far past the limit. */
export function worstFirst(findings: readonly Finding[]): Finding[] {
  return [...findings].sort((a, b) => rank[a.level] - rank[b.level] || (a.margin ?? 0) - (b.margin ?? 0));
}

/** Where a table, formula or figure comes from, as data, so that screens and the command line can show it. */
export interface Source {
  /** Title of the standard, book or practice, e.g. `IEC 60664-1`. */
  readonly title: string;
  /** Edition and year, or null where the source has none. */
  readonly edition: string | null;
  /** Clause, table, chapter or section, or null. */
  readonly clause: string | null;
  /** How the figure was obtained. */
  readonly status: SourceStatus;
}

export type SourceStatus =
  | "figures from a secondary copy, primary not seen"
  | "common practice, no source"
  | "from memory"
  | "computed here"
  | "definition";

/** Source of what follows from circuit algebra. */
export const computedHere = (clause: string): Source => ({
  title: "Circuit algebra",
  edition: null,
  clause,
  status: "computed here",
});

/** Source of a rule that the trade keeps without a paper. */
export const practice = (clause: string): Source => ({
  title: "Common practice",
  edition: null,
  clause,
  status: "common practice, no source",
});

/** One line for a screen or a file: `IEC 60664-1, ed. 3 (2020), table F.5 (figures from a secondary copy, primary not seen)`. */
export function citation(source: Source): string {
  const parts = [source.title, source.edition, source.clause].filter((part) => part !== null);
  return `${parts.join(", ")} (${source.status})`;
}

import type { FaultRow } from "../../solver/index.ts";

/**
 * Faults that the reading does not show: the dc output stays within the wanted uncertainty of its normal value.
 * A fault that reads zero while the voltage stands is the worse kind and marked as that.
 */
export function faultMark(row: FaultRow, wantedUncertainty: number): "reads zero while live" | "silent" | null {
  if (row.readsZeroWhileLive) return "reads zero while live";
  if (row.id !== "unplugged" && Math.abs(row.outputShare - 1) <= wantedUncertainty) return "silent";
  return null;
}

const rank = { stop: 0, caution: 1, clear: 2 } as const;

/** By level, then by what the instrument sees. */
export function worstFaultsFirst(rows: readonly FaultRow[]): readonly FaultRow[] {
  const seen = (row: FaultRow) => Math.max(Math.abs(row.output_V), Math.abs(row.fastOutput_V));
  return [...rows].sort((a, b) => rank[a.level] - rank[b.level] || seen(b) - seen(a));
}

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

import type { Level } from "../standards/finding.ts";
import type { Solution } from "../standards/formula.ts";
import { computedHere, type Source } from "../standards/source.ts";

/** One fault: what the instrument sees at dc and at the instant of an edge, side by side, at the greatest peak. */
export interface FaultRow {
  readonly id: string;
  readonly name: string;
  /** Series position 1 … n, or 0. */
  readonly element: number;
  /** false: more than one part would have to fail at once; shown, not counted as the worst single fault. */
  readonly single: boolean;
  readonly output_V: number;
  readonly fastOutput_V: number;
  readonly greatestElementVoltage_V: number;
  /** dc output over its normal value. */
  readonly outputShare: number;
  readonly readsZeroWhileLive: boolean;
  readonly level: Level;
  readonly sentence: string;
}

export const faultRecord: Solution = {
  id: "faults.single",
  title: "Voltage at the instrument under a single fault",
  statement: "dc: V R'_2p / (R_1 + R'_2p); edge: V C_12 / (C_tap + C'_2), with the faulty part taken out or bridged",
  method: "Series and parallel sums at dc; the capacitive ladder with its strays at the instant of an edge.",
  holds: "Protectors are not counted on to conduct.",
  source: computedHere("the divider re-solved with one part open or shorted"),
  residualBound: 0,
};

/**
 * Accessible limits in normal condition (the stricter of the editions): above the voltage a part is hazardous live when the
 * current through the string or the charge behind it exceeds its own limit too.
 */
export const accessible: { dc_V: number; current_A: number; charge_C: number; source: Source } = {
  dc_V: 60,
  current_A: 2e-3,
  charge_C: 45e-6,
  source: {
    title: "IEC 61010-1",
    edition: "ed. 3.1 (2010 + AMD1:2016)",
    clause: "6.3, accessible parts",
    status: "from memory",
  },
};

/** The larger of what the instrument sees at dc and on an edge. */
export const seen = (row: FaultRow) => Math.max(Math.abs(row.output_V), Math.abs(row.fastOutput_V));

/** The single fault that puts most on the instrument; a pulled plug leaves nothing to harm and does not count. */
export function worstFault(rows: readonly FaultRow[]): FaultRow | null {
  return rows.reduce<FaultRow | null>(
    (worst, row) => (row.single && row.id !== "unplugged" && (worst === null || seen(row) > seen(worst)) ? row : worst),
    null,
  );
}

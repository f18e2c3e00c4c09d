import { wantedBand } from "../checks/band.ts";
import { capacitorOf, type Judging } from "../checks/judging.ts";
import { elementVoltages } from "../network/elementVoltages.ts";
import { grading } from "../network/grading.ts";
import { type LadderNetwork, withLvCapacitance } from "../network/ladderNetwork.ts";
import { edgeMatch } from "../network/lvCapacitance.ts";
import { responseTime } from "../network/stepFigures.ts";
import { availableValues } from "../parts/availableValues.ts";
import type { Cure } from "../standards/finding.ts";
import { greatestDeviation } from "./matches.ts";

/** What one choice of element capacitors costs, its LV capacitance matched at the edge. */
export interface GradedRow {
  readonly what: "as fitted" | "graded" | "graded, bought";
  readonly lvCapacitance_F: number | null;
  readonly bandDeviation_dB: number | null;
  readonly responseTime_s: number | null;
  /** Greatest share of an edge on one element, over its even share. */
  readonly greatestShare: number;
}

/** Element capacitors graded so that an edge is shared as dc is. Plain data. */
export interface Graded {
  /** Capacitor to be fitted across each element, F; null: none can do it. */
  readonly ideal_F: readonly (number | null)[];
  /** The nearest that its family sells. */
  readonly bought_F: readonly (number | null)[];
  readonly rows: readonly GradedRow[];
  /** Fits the bought capacitors; null where that changes nothing or cannot be done. */
  readonly cure: Cure | null;
  readonly sentence: string;
}

/**
 * Grading against the network with strays: C_i (V_i − V_(i−1)) is the same charge plus what the strays take below, from the capacitor
 * of element 1 up. null where an element has no capacitor to grade.
 */
export function graded(j: Judging, network: LadderNetwork): Graded | null {
  const { elements, strings } = j.design.hvArm;
  if (elements.length < 2 || elements.some(({ capacitor }) => capacitor === null)) return null;
  const whole = grading(network, network.capacitance_F[0]!);
  // What stands across an element beside its capacitor: the body and the column's own coupling.
  const beside = (i: number) => network.capacitance_F[i]! - strings * elements[i]!.capacitance_F;
  const ideal_F = whole.map((C, i) => (C === null || C < beside(i) ? null : (C - beside(i)) / strings));
  const bought_F = ideal_F.map((C, i) =>
    C === null ? null : nearest(availableValues(capacitorOf(j, elements[i]!.capacitor!)), C),
  );
  const missing = ideal_F.indexOf(null);
  const withThese = (list: readonly (number | null)[]): LadderNetwork => ({
    ...network,
    capacitance_F: Float64Array.from(list, (C, i) => strings * (C ?? 0) + beside(i)),
  });
  const rows = [rowOf(j, "as fitted", network)];
  if (missing < 0) rows.push(rowOf(j, "graded", withThese(ideal_F)));
  if (bought_F.every((C) => C !== null)) rows.push(rowOf(j, "graded, bought", withThese(bought_F)));
  return { ideal_F, bought_F, rows, cure: cureOf(j, bought_F), sentence: sentenceOf(rows, missing) };
}

/** The nearest in ratio. */
const nearest = (values: readonly number[], wanted: number): number | null =>
  values.reduce<number | null>(
    (best, value) =>
      best === null || Math.abs(Math.log(value / wanted)) < Math.abs(Math.log(best / wanted)) ? value : best,
    null,
  );

/** High enough that capacitors alone share. */
const edge_Hz = 1e12;

function rowOf(j: Judging, what: GradedRow["what"], network: LadderNetwork): GradedRow {
  const C2 = edgeMatch(network);
  const matched = C2 === null || C2 < 0 ? null : withLvCapacitance(network, C2);
  const { elementVoltage_V } = elementVoltages(network, [edge_Hz], 1);
  return {
    what,
    lvCapacitance_F: matched === null ? null : C2,
    bandDeviation_dB: matched === null ? null : greatestDeviation(matched, wantedBand(j.document.brief)),
    responseTime_s: matched === null ? null : responseTime(matched),
    greatestShare: network.n * Math.max(...elementVoltage_V[0]!),
  };
}

function cureOf(j: Judging, bought_F: readonly (number | null)[]): Cure | null {
  const { elements } = j.design.hvArm;
  if (bought_F.some((C) => C === null)) return null;
  const edits = bought_F.flatMap((C, i) =>
    C === elements[i]!.capacitance_F
      ? []
      : [{ pointer: `/design/hvArm/elements/${i}/capacitance_F`, value: C as number }],
  );
  return edits.length === 0 ? null : { label: "take the graded capacitors", edits };
}

function sentenceOf(rows: readonly GradedRow[], missing: number): string {
  const percent = (row: GradedRow) => `${Number((100 * (row.greatestShare - 1)).toPrecision(2))} %`;
  const [fitted, , bought] = rows;
  if (missing >= 0)
    return `Element ${missing + 1} would need less than nothing across it: strays to the electrode feed it already. A smaller electrode or a larger first capacitor lets it be graded.`;
  if (bought === undefined) return "The families sell no capacitor for some element.";
  return `On an edge the hardest element takes ${percent(fitted!)} above its even share as fitted, ${percent(bought)} with graded capacitors as sold.`;
}

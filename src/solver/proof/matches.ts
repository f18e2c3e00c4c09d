import { wantedBand } from "../checks/band.ts";
import type { Judging } from "../checks/judging.ts";
import type { Design } from "../job/design.ts";
import { type LadderNetwork, withLvCapacitance } from "../network/ladderNetwork.ts";
import { lvCapacitance } from "../network/lvCapacitance.ts";
import { responseTime } from "../network/stepFigures.ts";
import { decibel, sweep } from "../network/sweep.ts";
import { timeResponse } from "../network/timeResponse.ts";
import type { StepTrace } from "./proof.ts";
import { responseRecords } from "./responseFormulas.ts";

const points = 121;

/** One way to choose the LV capacitance: what it asks for, and the step response that it would give. */
export interface Match {
  readonly by: "highFrequency" | "flattest" | "responseTime";
  /** LV capacitance to be fitted; null where it would be negative or does not exist. */
  readonly capacitance_F: number | null;
  /** Whether the design's LV capacitance was chosen by it. */
  readonly chosen: boolean;
  /** Scale factor × output after an ideal step, about the time where the capacitors hand over to the resistors. */
  readonly step: StepTrace;
}

/** Whether a string or its LV arm holds any capacitor: without one there is nothing to match. */
export const hasCapacitors = ({ hvArm, lvArm }: Design): boolean =>
  hvArm.elements.some((element) => element.capacitance_F > 0) || lvArm.branches.some((branch) => !("series" in branch));

/**
 * LV capacitance by the three matches and what each costs: at the edge, over the band, in response time.
 * @param handover_s time constant of the two arms
 */
export function matches(j: Judging, network: LadderNetwork, residual: number, handover_s: number): Match[] {
  const band = wantedBand(j.document.brief);
  const found = lvCapacitance(network, band);
  const inputs = { C: "element.capacitance_F", C1: "hvArm.effectiveCapacitance_F", R1: "hvArm.resistance_ohm" };
  const put = (path: string, value: number | null) =>
    j.sheet.solved(path, responseRecords.lvCapacitance, value, inputs, residual);
  put("lvArm.capacitanceResponseTime_F", found.responseTime_F);
  put("lvArm.capacitanceHighFrequency_F", found.highFrequency_F);
  put("lvArm.capacitanceFlattest_F", found.flattest_F);
  // An inductance keeps the instant of the edge to itself.
  const edgeTells = network.lv.inductance_H === 0;
  const drawn = hasCapacitors(j.design);
  const sketches: Match[] = [];
  const unmatched = responseTime(withLvCapacitance(network, 0));
  for (const [name, C] of [
    ["responseTime", found.responseTime_F],
    ["highFrequency", found.highFrequency_F],
    ["flattest", found.flattest_F],
  ] as const) {
    if (drawn) sketches.push(sketchOf(j, network, name, C, handover_s));
    const trial = C === null ? null : withLvCapacitance(network, C);
    const g = trial === null || !edgeTells ? null : timeResponse(trial);
    put(`match.${name}.edgeError`, g === null ? null : g.initial - 1);
    put(`match.${name}.bandDeviation_dB`, trial === null ? null : greatestDeviation(trial, band));
    put(`match.${name}.responseTime_s`, trial === null ? null : nearlyNought(responseTime(trial), unmatched));
  }
  return sketches;
}

/** A step over three and a half decades: the edge, the handover and what it settles to. */
function sketchOf(
  j: Judging,
  network: LadderNetwork,
  by: Match["by"],
  capacitance_F: number | null,
  handover_s: number,
): Match {
  const g = capacitance_F === null ? null : timeResponse(withLvCapacitance(network, capacitance_F));
  const count = 36;
  const time_s =
    g === null ? [] : Array.from({ length: count }, (_, i) => handover_s * 10 ** ((3.5 * i) / (count - 1) - 2.5));
  return {
    by,
    capacitance_F,
    chosen: j.design.lvArm.capacitanceBy === by,
    step: { time_s, value: time_s.map((t) => g!.at(t)) },
  };
}

/** A match leaves rounding behind: a billionth of the response time without any LV capacitance counts as nought. */
const nearlyNought = (value: number | null, scale: number | null): number | null =>
  value !== null && scale !== null && Math.abs(value) < 1e-9 * Math.abs(scale) ? 0 : value;

/** Greatest deviation from the dc scale factor over the band, dB, signed; null without a band. */
export function greatestDeviation(network: LadderNetwork, band: readonly [number, number]): number | null {
  if (!(band[1] > 0)) return null;
  const frequencies = Array.from({ length: points }, (_, i) => band[0] * (band[1] / band[0]) ** (i / (points - 1)));
  const solved = sweep(network, frequencies);
  if (solved === null) return null;
  let worst = 0;
  for (let k = 0; k < points; k++) {
    const dB = decibel(solved.real[k]!, solved.imaginary[k]!);
    if (Math.abs(dB) > Math.abs(worst)) worst = dB;
  }
  return worst;
}

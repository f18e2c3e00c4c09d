import { wantedBand } from "../checks/band.ts";
import type { Judging } from "../checks/judging.ts";
import { type LadderNetwork, withLvCapacitance } from "../network/ladderNetwork.ts";
import { lvCapacitance } from "../network/lvCapacitance.ts";
import { responseTime } from "../network/stepFigures.ts";
import { decibel, sweep } from "../network/sweep.ts";
import { timeResponse } from "../network/timeResponse.ts";
import { responseRecords } from "./responseFormulas.ts";

const points = 121;

/** LV capacitance by the three matches and what each costs: at the edge, over the band, in response time. */
export function matches(j: Judging, network: LadderNetwork, residual: number): void {
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
  const unmatched = responseTime(withLvCapacitance(network, 0));
  for (const [name, C] of [
    ["responseTime", found.responseTime_F],
    ["highFrequency", found.highFrequency_F],
    ["flattest", found.flattest_F],
  ] as const) {
    const trial = C === null ? null : withLvCapacitance(network, C);
    const g = trial === null || !edgeTells ? null : timeResponse(trial);
    put(`match.${name}.edgeError`, g === null ? null : g.initial - 1);
    put(`match.${name}.bandDeviation_dB`, trial === null ? null : greatestDeviation(trial, band));
    put(`match.${name}.responseTime_s`, trial === null ? null : nearlyNought(responseTime(trial), unmatched));
  }
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

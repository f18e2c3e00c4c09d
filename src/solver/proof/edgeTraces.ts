import { edgeOnSheet } from "../checks/edge.ts";
import { capacitorOf, type Judging, trimmerOf } from "../checks/judging.ts";
import { capacitanceOf } from "../checks/lvArm.ts";
import { type LadderNetwork, type Reference, withLvCapacitance } from "../network/ladderNetwork.ts";
import { lumpedCable } from "../network/lumpedCable.ts";
import { type TimeResponse, timeResponse } from "../network/timeResponse.ts";
import { ramp } from "../network/waveforms.ts";
import { logarithmic } from "./logarithmic.ts";
import type { StepTrace } from "./proof.ts";

/** The same two time scales as the step response of the proof. */
export interface TracePair {
  readonly fast: StepTrace;
  readonly slow: StepTrace;
}

/** Responses beside the proof's own: scale factor × output over the height of the edge. */
export interface EdgeTraces {
  /** Rise time of the brief's own edge, 10-90 %; null: none is stated or stands behind the band. */
  readonly riseTime_s: number | null;
  /** An edge of that rise time at the electrode, and at the source. */
  readonly edge: TracePair | null;
  readonly edgeFromSource: TracePair | null;
  /** The same edge, or an ideal step where none is known, with the echoes of a cable that is a line; null: it is a lump. */
  readonly echoes: TracePair | null;
  /** An ideal step at the source. */
  readonly stepFromSource: TracePair;
  /** An ideal step with the LV capacitance at both ends of what its parts, the cable and the instrument leave open. */
  readonly spread: { readonly halfWidth_F: number; readonly less: TracePair; readonly more: TracePair };
}

/** Relative half-width of a cable's capacitance; common practice, no source. */
const cableSpread = 0.05;
const points = 151;
const fastEnds = [1e-9, 1e-5] as const;
/** A ramp from end to end over the 10-90 % time of it. */
const rampOver1090 = 1 / 0.8;

/** Every response beside the proof's own. Needs the figures of the response on the sheet. */
export function edgeTraces(j: Judging, network: LadderNetwork): EdgeTraces {
  const riseTime_s = j.sheet.number(edgeOnSheet(j));
  const calm = lumpedCable(network);
  const end = slowEnd(j);
  const step = (g: TimeResponse) => pair((t) => g.at(t), end);
  const edge = (reference: Reference): TracePair | null => {
    if (riseTime_s === null) return null;
    const g = timeResponse(calm, reference) as TimeResponse;
    return pair((t) => ramp(g, rampOver1090 * riseTime_s, t), end);
  };
  const halfWidth_F = spread_F(j);
  const fitted_F = calm.lv.capacitance_F;
  const off = (by: number) => step(timeResponse(withLvCapacitance(calm, Math.max(0, fitted_F + by))) as TimeResponse);
  return {
    riseTime_s,
    edge: edge("electrode"),
    edgeFromSource: edge("source"),
    echoes: network.cable.line === null ? null : withEchoes(network, calm, riseTime_s, end),
    stepFromSource: step(timeResponse(calm, "source") as TimeResponse),
    spread: { halfWidth_F, less: off(-halfWidth_F), more: off(halfWidth_F) },
  };
}

/** The line's own waves where they are seen, on the fast scale; the slow one has it as a lump. */
function withEchoes(network: LadderNetwork, calm: LadderNetwork, riseTime_s: number | null, end_s: number): TracePair {
  const shaped = (of: LadderNetwork) => {
    const g = timeResponse(of) as TimeResponse;
    return riseTime_s === null ? (t: number) => g.at(t) : (t: number) => ramp(g, rampOver1090 * riseTime_s, t);
  };
  return { fast: fastOf(shaped(network)), slow: slowOf(shaped(calm), end_s) };
}

const traceOf = (at: (t: number) => number, from_s: number, to_s: number): StepTrace => {
  const time_s = logarithmic(from_s, to_s, points);
  return { time_s, value: time_s.map(at) };
};
const fastOf = (at: (t: number) => number): StepTrace => traceOf(at, ...fastEnds);
const slowOf = (at: (t: number) => number, end_s: number): StepTrace => traceOf(at, 1e-6, end_s);
const pair = (at: (t: number) => number, end_s: number): TracePair => ({ fast: fastOf(at), slow: slowOf(at, end_s) });

/** As far as the proof's slow trace: a decade past settling and past the hand-over. */
export function slowEnd(j: Judging): number {
  const settling_s = j.sheet.number("response.settlingTime_s") ?? 0;
  const pole = j.sheet.number("response.lvPole_Hz");
  const handover_s = pole === null ? 0 : 1 / (2 * Math.PI * pole);
  const longest = Math.max(settling_s, handover_s, 1e-5);
  return Math.min(Math.max(10 ** Math.ceil(Math.log10(longest) + 1), 1e-3), 1e5);
}

/** What parts, cable and instrument leave open of the LV capacitance, all one way, F. */
function spread_F(j: Judging): number {
  const { cable, capacitanceSpread_F } = j.instrument;
  const parts = j.design.lvArm.branches.reduce((sum, branch) => {
    if ("series" in branch || branch.part === "") return sum;
    const { tolerance } = "trimmer" in branch ? trimmerOf(j, branch.part) : capacitorOf(j, branch.part);
    // A trimmer is set on the bench: what it is made to within does not matter.
    return "trimmer" in branch ? sum : sum + tolerance * capacitanceOf(branch);
  }, 0);
  return parts + cableSpread * cable.length_m * cable.capacitance_F_per_m + capacitanceSpread_F;
}

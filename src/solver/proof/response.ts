import { wantedBand } from "../checks/band.ts";
import { type Judging, plainFinding } from "../checks/judging.ts";
import type { Show } from "../checks/show.ts";
import { wantedOf } from "../checks/wanted.ts";
import { dcSolution } from "../network/dcSolution.ts";
import type { LadderNetwork } from "../network/ladderNetwork.ts";
import { lumpedCable } from "../network/lumpedCable.ts";
import { stepFigures } from "../network/stepFigures.ts";
import { bandwidth, decibel, degrees, sweep } from "../network/sweep.ts";
import { type TimeResponse, timeResponse } from "../network/timeResponse.ts";
import { formatQuantity, formatShare } from "../quantities/format.ts";
import { logarithmic } from "./logarithmic.ts";
import { fittedCapacitance } from "./lvShares.ts";
import { greatestDeviation, type Match, matches } from "./matches.ts";
import type { FrequencyResponse, StepResponse as StepResponseShape } from "./proof.ts";
import { responseRecords } from "./responseFormulas.ts";

const points = 241;

/** Frequency and step response of the design's network, their figures on the sheet, and the findings. */
export function response(
  j: Judging,
  network: LadderNetwork,
  show: Show,
): { frequency: FrequencyResponse; step: StepResponseShape; matches: Match[] } {
  const dc = dcSolution(network, 1);
  if (dc === null) throw new Error("a design's string passes dc");
  const predicted = j.sheet.number("scaleFactor.predicted") as number;
  const residual = Math.abs(dc.scaleFactor / predicted - 1);
  // The responses in time have the cable as a lump: its echoes cost too much for every keystroke and are answered when looked at.
  const calm = lumpedCable(network);
  fittedCapacitance(j);
  const pole = j.sheet.number("response.lvPole_Hz");
  const handover_s = pole === null ? 0 : 1 / (2 * Math.PI * pole);
  const sketches = matches(j, calm, residual, handover_s);
  const g = timeResponse(calm) as TimeResponse;
  const figures = stepFigures(calm, "electrode", g);
  const f3 = bandwidth(network);
  const inputs = {
    R: "/design/hvArm/elements/*/resistance_ohm",
    C: "element.capacitance_F",
    R2p: "lvArm.withInstrument_ohm",
  };
  const { step: stepRecord, frequency: frequencyRecord } = responseRecords;
  const put = (path: string, value: number | null) => j.sheet.solved(path, stepRecord, value, inputs, residual);
  j.sheet.solved("response.bandwidth_Hz", frequencyRecord, f3, inputs, residual);
  j.sheet.solved("response.responseTime_s", stepRecord, figures?.responseTime_s ?? null, inputs, residual);
  put("response.partialResponseTime_s", figures?.partialResponseTime_s ?? null);
  put("response.residualSettlingTime_s", figures?.residualSettlingTime_s ?? null);
  put("response.droop", droopOf(j, g));
  j.sheet.solved("response.riseTime_s", stepRecord, figures?.riseTime_s ?? null, inputs, residual);
  j.sheet.solved("response.overshoot", stepRecord, figures?.overshoot ?? null, inputs, residual);
  j.sheet.solved("response.settlingTime_s", stepRecord, figures?.settlingTime_s["1%"] ?? null, inputs, residual);
  const frequency = frequencyResponse(j, network, f3, residual, show);
  const step = stepTraces(g, figures?.settlingTime_s["1%"] ?? 0, handover_s, figures?.overshoot ?? 0);
  return { frequency, step, matches: sketches };
}

/** How much the top of the brief's pulse falls from right after its edge to its end, relative; null where no width is stated. */
function droopOf(j: Judging, g: TimeResponse): number | null {
  const { width_s, riseTime_s } = j.document.brief.waveform;
  if (width_s === null || !(width_s > 0)) return null;
  const start = g.at(Math.min(riseTime_s ?? 0, width_s / 10));
  return start === 0 ? null : 1 - g.at(width_s) / start;
}

function frequencyResponse(
  j: Judging,
  network: LadderNetwork,
  f3: number | null,
  residual: number,
  show: Show,
): FrequencyResponse {
  const { brief } = j.document;
  const band = wantedBand(brief);
  const pole = j.sheet.number("response.lvPole_Hz") ?? 1;
  const decade = (f: number) => 10 ** Math.floor(Math.log10(f));
  const from = decade(Math.min(pole, f3 ?? pole, band[1] > 0 ? Math.max(band[0], 1e-3) : pole) / 10);
  const to = decade(Math.max(pole, f3 ?? pole, band[1]) * 10) * 10;
  const frequency_Hz = logarithmic(from, to, points);
  const solved = sweep(network, frequency_Hz)!;
  const magnitude_dB = frequency_Hz.map((_, i) => decibel(solved.real[i]!, solved.imaginary[i]!));
  const deviation = bandDeviation(j, network, band, residual, show);
  const flat = deviation === null ? "" : `Within ${Number(deviation.toPrecision(2))} dB over the wanted band; `;
  const edge = f3 === null ? "no −3 dB point up to 1 THz in this model." : `−3 dB at ${formatQuantity(f3, "Hz")}.`;
  return {
    frequency_Hz,
    magnitude_dB,
    phase_deg: frequency_Hz.map((_, i) => degrees(solved.real[i]!, solved.imaginary[i]!)),
    inputImpedance_ohm: frequency_Hz.map((_, i) =>
      Math.hypot(solved.impedanceReal_ohm[i]!, solved.impedanceImaginary_ohm[i]!),
    ),
    sentence: `${flat}${edge}`,
  };
}

/** Greatest deviation over the wanted band, dB, and its finding against the wanted uncertainty. null for dc. */
function bandDeviation(
  j: Judging,
  network: LadderNetwork,
  band: readonly [number, number],
  residual: number,
  show: Show,
) {
  const inputs = {
    R: "/design/hvArm/elements/*/resistance_ohm",
    C: "element.capacitance_F",
    C2: "lvArm.capacitanceTotal_F",
  };
  if (!(band[1] > 0)) {
    j.sheet.solved("response.bandDeviation_dB", responseRecords.frequency, null, inputs, residual);
    return null;
  }
  const worst = greatestDeviation(network, band) ?? 0;
  j.sheet.solved("response.bandDeviation_dB", responseRecords.frequency, worst, inputs, residual);
  const error = Math.abs(10 ** (worst / 20) - 1);
  const wanted = wantedOf(j.document.brief);
  if (wanted === null) return Math.abs(worst);
  plainFinding(j, {
    id: "response.band",
    level: error > wanted ? "stop" : error > wanted / 2 ? "caution" : "clear",
    what: "deviation over the wanted band",
    actual: error,
    limit: wanted,
    unit: "1",
    sense: "atMost",
    margin: 1 - error / wanted,
    reason:
      `Up to ${show(band[1], "Hz")} the scale factor is off by ${formatShare(error)} at the worst; ${formatShare(wanted)} is wanted. ` +
      "Strays of the column and the match of the two arms decide it.",
    source: responseRecords.frequency.source,
    path: "response.bandDeviation_dB",
    cure:
      error > wanted
        ? {
            label: "compensate every element",
            edits: [{ pointer: "/brief/policy/compensation", value: "always" }],
            sizeAgain: true,
          }
        : null,
  });
  return Math.abs(worst);
}

/** The slow trace runs to a decade past settling and past the time where the capacitors hand over to the resistors. */
function stepTraces(g: TimeResponse, settling_s: number, handover_s: number, overshoot: number): StepResponseShape {
  const trace = (from: number, to: number) => {
    const time_s = logarithmic(from, to, 151);
    return { time_s, value: time_s.map((t) => g.at(t)) };
  };
  const end = Math.min(Math.max(10 ** Math.ceil(Math.log10(Math.max(settling_s, handover_s, 1e-5)) + 1), 1e-3), 1e5);
  const over = overshoot > 0 ? `overshoot ${formatShare(overshoot)}` : "no overshoot";
  const settled =
    settling_s === 0 ? "within 1 % from the start" : `within 1 % after ${formatQuantity(settling_s, "s")}`;
  const start = formatShare(g.initial);
  return {
    fast: trace(1e-9, 1e-5),
    slow: trace(1e-6, end),
    sentence: `Starts at ${start} of the final value, ${over}, ${settled}.`,
  };
}

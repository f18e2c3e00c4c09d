import type { LadderNetwork } from "../network/ladderNetwork.ts";
import { lumpedCable } from "../network/lumpedCable.ts";
import { stepFigures } from "../network/stepFigures.ts";
import { bandwidth, decibel, degrees, sweep } from "../network/sweep.ts";

/** What the source's own voltage becomes: source, lead and divider together, against what its terminals would have without the divider. */
export interface FromSource {
  readonly frequency_Hz: readonly number[];
  readonly magnitude_dB: readonly number[];
  readonly phase_deg: readonly number[];
  readonly bandwidth_Hz: number | null;
  readonly responseTime_s: number | null;
  readonly partialResponseTime_s: number | null;
  readonly riseTime_s: number | null;
  readonly overshoot: number | null;
  readonly settlingTime_s: number | null;
}

/** @param frequency_Hz those of the proof's own response, so that the two can be laid over each other */
export function fromSource(network: LadderNetwork, frequency_Hz: readonly number[]): FromSource {
  const figures = stepFigures(lumpedCable(network), "source");
  const f3 = bandwidth(network, "source");
  const solved = sweep(network, frequency_Hz, "source")!;
  return {
    frequency_Hz,
    magnitude_dB: frequency_Hz.map((_, i) => decibel(solved.real[i]!, solved.imaginary[i]!)),
    phase_deg: frequency_Hz.map((_, i) => degrees(solved.real[i]!, solved.imaginary[i]!)),
    bandwidth_Hz: f3,
    responseTime_s: figures?.responseTime_s ?? null,
    partialResponseTime_s: figures?.partialResponseTime_s ?? null,
    riseTime_s: figures?.riseTime_s ?? null,
    overshoot: figures?.overshoot ?? null,
    settlingTime_s: figures?.settlingTime_s["1%"] ?? null,
  };
}

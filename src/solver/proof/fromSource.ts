import type { LadderNetwork } from "../network/ladderNetwork.ts";
import { lumpedCable } from "../network/lumpedCable.ts";
import { stepFigures } from "../network/stepFigures.ts";
import { bandwidth, decibel, degrees, sweep } from "../network/sweep.ts";
import { logarithmic } from "./logarithmic.ts";

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

export function fromSource(network: LadderNetwork): FromSource {
  const figures = stepFigures(lumpedCable(network), "source");
  const f3 = bandwidth(network, "source");
  const frequency_Hz = logarithmic(1, Math.max(1e9, (f3 ?? 1e8) * 10), 241);
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

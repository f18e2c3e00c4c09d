import type { FrequencyResponse } from "../../solver/index.ts";
import { type Axis, linearAxis, niceStep } from "./logAxis.ts";

export type MagnitudeView = "dB" | "percent";

/** Deviation from the dc scale factor in percent. */
export const percentOf = (magnitude_dB: number): number => 100 * (10 ** (magnitude_dB / 20) - 1);

const deepest_dB = -12;
const highest_dB = 12;

/**
 * The magnitude axis. In dB it holds the −3 dB point, where there is one, and stops at ±12 dB; in percent it closes in on the wanted tolerance,
 * or on the greatest deviation inside the wanted band where that is larger.
 */
export function magnitudeAxis(
  view: MagnitudeView,
  response: FrequencyResponse,
  tolerance: number,
  band_Hz: readonly [number, number],
): Axis | null {
  const finite = response.magnitude_dB.filter(Number.isFinite);
  if (finite.length === 0) return null;
  if (view === "dB") {
    const low = Math.min(...finite);
    const high = Math.max(...finite);
    if (low <= -3 || high > highest_dB) return linearAxis([deepest_dB, Math.min(highest_dB, Math.max(3, high))], 6);
    const reach = 1.5 * Math.max(-low, high, 20 * Math.log10(1 + tolerance));
    return linearAxis([-reach, reach], 6);
  }
  const inBand = response.magnitude_dB.filter((v, i) => Number.isFinite(v) && response.frequency_Hz[i]! <= band_Hz[1]);
  const deviation = inBand.reduce((most, v) => Math.max(most, Math.abs(percentOf(v))), 0);
  const half = Math.min(100, 2 * niceStep(Math.max(100 * tolerance, deviation * 0.6)));
  return linearAxis([-half, half], 6);
}

/** Phase on steps of whole 15, 30, 45 or 90 degrees. */
export function phaseAxis(phase_deg: readonly number[]): Axis | null {
  const finite = phase_deg.filter(Number.isFinite);
  if (finite.length === 0) return null;
  const low = Math.min(0, ...finite);
  const high = Math.max(0, ...finite);
  const step = [5, 15, 30, 45, 90, 180].find((s) => (high - low) / s <= 4) ?? 360;
  const first = Math.floor(low / step);
  const last = Math.max(first + 1, Math.ceil(high / step));
  const ticks = Array.from({ length: last - first + 1 }, (_, i) => (first + i) * step);
  return { kind: "linear", domain: [ticks[0]!, ticks[ticks.length - 1]!], ticks, minor: [] };
}

/** Phase without its jumps of a whole turn, so that a trace is one line. */
export function unwrapped(phase_deg: readonly number[]): readonly number[] {
  let turns = 0;
  return phase_deg.map((phase, i) => {
    const before = phase_deg[i - 1];
    if (before !== undefined && Math.abs(phase - before) > 180) turns -= Math.sign(phase - before);
    return phase + 360 * turns;
  });
}

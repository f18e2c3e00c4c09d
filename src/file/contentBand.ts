import type { Raw } from "./shape.ts";

/** Beyond it no divider is asked for. */
const highest_Hz = 1e12;

const positive = (value: unknown): number | null =>
  typeof value === "number" && Number.isFinite(value) && value > 0 && value <= 1e13 ? value : null;

/**
 * Default band that must be right, from the waveform: highest frequency 0.35 / rise time, lowest 1/(2π·10·width), so that the
 * droop over one pulse stays near 1 %; a sine needs its own frequency only; [0, 0] for dc. Common practice, no source.
 */
export function contentBand_Hz(waveform: Raw): readonly [number, number] {
  const frequency = positive(waveform.frequency_Hz);
  const edge = Math.min(0.35 / (positive(waveform.riseTime_s) ?? 1e-6), highest_Hz);
  if (waveform.kind === "sine") return [frequency ?? 50, frequency ?? 50];
  if (waveform.kind === "square") return [frequency ?? 1000, Math.max(edge, frequency ?? 1000)];
  if (waveform.kind !== "pulse") return [0, 0];
  const droop = 1 / (2 * Math.PI * 10 * (positive(waveform.width_s) ?? 50e-6));
  const lowest = Math.min(Number(droop.toPrecision(2)), highest_Hz);
  return [lowest, Math.max(edge, lowest)];
}

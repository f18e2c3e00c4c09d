import type { Brief } from "../job/brief.ts";

/** Highest frequency that must be right, Hz: the band's top, the sine's own, 0.35 over the rise time of a pulse or square; 0 for dc. */
export function bandTop({ waveform, band_Hz }: Brief): number {
  if (waveform.kind === "dc" || band_Hz[1] > 0) return band_Hz[1];
  const edge = waveform.kind !== "sine" && waveform.riseTime_s ? 0.35 / waveform.riseTime_s : 0;
  return Math.max(waveform.frequency_Hz ?? 0, edge);
}

/** The band that must be right; a lower end of 0 counts as a millionth of the upper. */
export function wantedBand(brief: Brief): readonly [number, number] {
  const high = bandTop(brief);
  return [brief.band_Hz[0] > 0 ? brief.band_Hz[0] : high * 1e-6, high];
}

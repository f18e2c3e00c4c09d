import { crestFactors, type Waveform } from "../../solver/index.ts";

export interface MarkedLine {
  /** "mean = rms = peak" where they fall on one line. */
  readonly name: string;
  readonly value_V: number;
}

export interface SketchNumbers {
  readonly lines: readonly MarkedLine[];
  readonly peakToPeak_V: number;
  readonly top_V: number;
  readonly bottom_V: number;
}

/** The four numbers of a waveform as lines on its sketch; those that coincide share a line. */
export function sketchNumbers(waveform: Waveform): SketchNumbers {
  const { peakOverStated, rmsOverPeak, meanOverPeak } = crestFactors(waveform);
  const sign = waveform.nominal_V < 0 ? -1 : 1;
  const peak = sign * Math.abs(waveform.nominal_V) * peakOverStated;
  const twoSided = waveform.kind === "sine" || waveform.kind === "square";
  const lines: MarkedLine[] = [];
  for (const [name, value_V] of [
    ["mean", peak * meanOverPeak],
    ["rms", peak * rmsOverPeak],
    ["peak", peak],
  ] as const) {
    const on = lines.findIndex((each) => Math.abs(each.value_V - value_V) <= 1e-9 * Math.abs(peak));
    if (on < 0) lines.push({ name, value_V });
    else lines[on] = { name: `${lines[on]!.name} = ${name}`, value_V };
  }
  const other = twoSided ? -peak : 0;
  return {
    lines,
    peakToPeak_V: waveform.kind === "dc" ? 0 : Math.abs(peak - other),
    top_V: Math.max(peak, other),
    bottom_V: Math.min(peak, other),
  };
}

/** Places of labels that keep `least` apart, in the order given, top first; moved as little as their neighbours ask. */
export function apart(wanted: readonly number[], least: number): readonly number[] {
  const order = wanted.map((_, i) => i).sort((a, b) => wanted[a]! - wanted[b]!);
  const placed = [...wanted];
  for (let k = 1; k < order.length; k++) {
    const [over, under] = [order[k - 1]!, order[k]!];
    placed[under] = Math.max(placed[under]!, placed[over]! + least);
  }
  const drift = order.reduce((sum, i) => sum + placed[i]! - wanted[i]!, 0) / Math.max(1, order.length);
  return placed.map((each) => each - drift);
}

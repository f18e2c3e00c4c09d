import { scaleFactorOf } from "./dcSolution.ts";
import type { LadderNetwork, Reference } from "./ladderNetwork.ts";
import { transfer } from "./transfer.ts";

export const angular = (frequencies_Hz: ArrayLike<number>): Float64Array =>
  Float64Array.from(frequencies_Hz, (f) => 2 * Math.PI * f);

/** Frequency response at each frequency: H·scale factor (1 at dc), and the input impedance at the electrode. */
export interface Sweep {
  /** NaN-free; null where dc does not pass, so that there is no scale factor. */
  readonly real: Float64Array | null;
  readonly imaginary: Float64Array | null;
  /** Of the divider alone; infinite where nothing flows. */
  readonly impedanceReal_ohm: Float64Array;
  readonly impedanceImaginary_ohm: Float64Array;
}

/** Exact complex solve of the ladder at each frequency, O(n) a frequency. */
export function sweepAll(
  network: LadderNetwork,
  frequencies_Hz: ArrayLike<number>,
  reference: Reference = "electrode",
): Sweep {
  const scaleFactor = scaleFactorOf(network, reference);
  const sim = angular(frequencies_Hz);
  const H = transfer(network, new Float64Array(sim.length), sim, reference);
  const impedanceReal_ohm = new Float64Array(sim.length);
  const impedanceImaginary_ohm = new Float64Array(sim.length);
  for (let k = 0; k < sim.length; k++) {
    const d = H.Yre[k]! ** 2 + H.Yim[k]! ** 2;
    impedanceReal_ohm[k] = d === 0 ? Number.POSITIVE_INFINITY : H.Yre[k]! / d;
    impedanceImaginary_ohm[k] = d === 0 ? Number.POSITIVE_INFINITY : -H.Yim[k]! / d;
  }
  return {
    real: scaleFactor === null ? null : H.re.map((value) => value * scaleFactor),
    imaginary: scaleFactor === null ? null : H.im.map((value) => value * scaleFactor),
    impedanceReal_ohm,
    impedanceImaginary_ohm,
  };
}

/** The same of a network that passes dc; null of one that does not. */
export function sweep(
  network: LadderNetwork,
  frequencies_Hz: ArrayLike<number>,
  reference: Reference = "electrode",
): (Sweep & { readonly real: Float64Array; readonly imaginary: Float64Array }) | null {
  const found = sweepAll(network, frequencies_Hz, reference);
  const { real, imaginary } = found;
  return real === null || imaginary === null ? null : { ...found, real, imaginary };
}

export const decibel = (re: number, im: number): number => 10 * Math.log10(re * re + im * im);
/** Phase in (-180, 180]. */
export function degrees(re: number, im: number): number {
  const phase = (Math.atan2(im, re) * 180) / Math.PI;
  return phase <= -180 ? 180 : phase;
}

/** Lowest frequency where |H| crosses 1/√2 of dc, Hz; null where it never does between 1 µHz and 10 THz. */
export function bandwidth(network: LadderNetwork, reference: Reference = "electrode"): number | null {
  const perDecade = network.cable.line === null ? 20 : 120;
  const grid = Float64Array.from({ length: 19 * perDecade + 1 }, (_, i) => 10 ** (i / perDecade - 6));
  const scan = sweep(network, grid, reference);
  if (scan === null) return null;
  const excess = (re: number, im: number) => re * re + im * im - 0.5;
  const at = (f: number) => {
    const one = sweep(network, [f], reference)!;
    return excess(one.real[0]!, one.imaginary[0]!);
  };
  for (let i = 1; i < grid.length; i++) {
    if (excess(scan.real[i]!, scan.imaginary[i]!) > 0) continue;
    let low = Math.log(grid[i - 1]!);
    let high = Math.log(grid[i]!);
    for (let step = 0; step < 50; step++) {
      const middle = (low + high) / 2;
      if (at(Math.exp(middle)) > 0) low = middle;
      else high = middle;
    }
    return Math.exp((low + high) / 2);
  }
  return null;
}

import { dcSolution } from "./dcSolution.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";
import { tapTwoPort, transfer } from "./tapTwoPort.ts";

/** Frequency response at each frequency: H·scale factor (1 at dc), and the input impedance at the electrode. */
export interface Sweep {
  readonly real: Float64Array;
  readonly imaginary: Float64Array;
  readonly impedanceReal_ohm: Float64Array;
  readonly impedanceImaginary_ohm: Float64Array;
}

export const angular = (frequencies_Hz: ArrayLike<number>): Float64Array =>
  Float64Array.from(frequencies_Hz, (f) => 2 * Math.PI * f);

/** Exact complex solve of the ladder at each frequency, O(n) a frequency. null where dc does not pass. */
export function sweep(network: LadderNetwork, frequencies_Hz: ArrayLike<number>): Sweep | null {
  const dc = dcSolution(network, 1);
  if (dc === null) return null;
  const sim = angular(frequencies_Hz);
  const sre = new Float64Array(sim.length);
  const H = transfer(network, tapTwoPort(network, sre, sim), sre, sim);
  const impedanceReal_ohm = new Float64Array(sim.length);
  const impedanceImaginary_ohm = new Float64Array(sim.length);
  for (let k = 0; k < sim.length; k++) {
    const d = H.Yre[k]! ** 2 + H.Yim[k]! ** 2;
    impedanceReal_ohm[k] = H.Yre[k]! / d;
    impedanceImaginary_ohm[k] = -H.Yim[k]! / d;
  }
  return {
    real: H.re.map((value) => value * dc.scaleFactor),
    imaginary: H.im.map((value) => value * dc.scaleFactor),
    impedanceReal_ohm,
    impedanceImaginary_ohm,
  };
}

export const decibel = (re: number, im: number): number => 10 * Math.log10(re * re + im * im);
/** Phase in (-180, 180]. */
export function degrees(re: number, im: number): number {
  const phase = (Math.atan2(im, re) * 180) / Math.PI;
  return phase <= -180 ? 180 : phase;
}

/** Lowest frequency where |H| crosses 1/√2 of dc, Hz; null where it never does between 1 µHz and 1 THz. */
export function bandwidth(network: LadderNetwork): number | null {
  const perDecade = 20;
  const grid = Float64Array.from({ length: 18 * perDecade + 1 }, (_, i) => 10 ** (i / perDecade - 6));
  const scan = sweep(network, grid);
  if (scan === null) return null;
  const excess = (re: number, im: number) => re * re + im * im - 0.5;
  const at = (f: number) => {
    const one = sweep(network, [f])!;
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

import { scaleFactorOf } from "./dcSolution.ts";
import type { LadderNetwork, Reference } from "./ladderNetwork.ts";
import { maximum, timeGrid } from "./timeGrid.ts";
import { type TimeResponse, timeResponse } from "./timeResponse.ts";
import { transfer } from "./transfer.ts";

/** Figures of the step response (IEC 60060-2 annex C, from memory); times in s, overshoot a fraction of the final value 1. */
export interface StepFigures {
  readonly initial: number;
  readonly responseTime_s: number;
  readonly partialResponseTime_s: number;
  readonly t10_s: number;
  readonly t90_s: number;
  readonly riseTime_s: number;
  readonly overshoot: number;
  readonly peakTime_s: number | null;
  /** null: it never settles. */
  readonly settlingTime_s: { readonly "1%": number | null; readonly "0.1%": number | null };
  readonly residualSettlingTime_s: number | null;
}

/**
 * Response time T = ∫(1 − g) dt = −d(F·H)/ds at s = 0, taken as the imaginary part at an infinitesimal imaginary s, where the
 * elimination has nothing to cancel. null where dc does not pass.
 */
export function responseTime(network: LadderNetwork, reference: Reference = "electrode"): number | null {
  const scaleFactor = scaleFactorOf(network, reference);
  if (scaleFactor === null) return null;
  const tiny = 1e-60;
  return (-transfer(network, new Float64Array(1), Float64Array.of(tiny), reference).im[0]! * scaleFactor) / tiny;
}

/** All figures of the step response; null where dc does not pass. */
export function stepFigures(
  network: LadderNetwork,
  reference: Reference = "electrode",
  g: TimeResponse | null = timeResponse(network, reference),
): StepFigures | null {
  const T = responseTime(network, reference);
  if (g === null || T === null) return null;
  const grid = timeGrid(g);
  const values = grid.map((t) => g.at(t));
  // Once the response has settled for good the integral is its total; the quadrature's own noise would grow with t.
  const settled = grid[values.findLastIndex((value) => Math.abs(value - 1) > 1e-10) + 1] ?? Number.POSITIVE_INFINITY;
  const lost = (t: number) => (t >= settled ? T : g.deficit(t));
  const deficits = grid.map(lost);
  const cross = (level: number) => (g.initial >= level ? 0 : firstCrossing(g, grid, values, level));
  const t10_s = cross(0.1);
  const t90_s = cross(0.9);
  const peak = peakOf(g, grid, values);
  const settling = (band: number) =>
    lastOutside(
      grid,
      values.map((value) => Math.abs(value - 1) - band),
      (t) => Math.abs(g.at(t) - 1) - band,
    );
  return {
    initial: g.initial,
    responseTime_s: T,
    partialResponseTime_s: partial(lost, grid, deficits),
    t10_s,
    t90_s,
    riseTime_s: t90_s - t10_s,
    overshoot: peak.overshoot,
    peakTime_s: peak.time,
    settlingTime_s: { "1%": settling(0.01), "0.1%": settling(0.001) },
    residualSettlingTime_s: residualSettling(T, lost, grid, deficits),
  };
}

/** Bisection in ln t to the last digit; `f` changes sign between the two times. */
function crossing(f: (t: number) => number, from: number, to: number): number {
  let low = Math.log(from);
  let high = Math.log(to);
  const rising = f(to) > 0;
  for (let step = 0; step < 48; step++) {
    const middle = (low + high) / 2;
    if (f(Math.exp(middle)) > 0 === rising) high = middle;
    else low = middle;
  }
  return Math.exp((low + high) / 2);
}

function firstCrossing(g: TimeResponse, grid: readonly number[], values: readonly number[], level: number): number {
  const i = values.findIndex((value) => value >= level);
  if (i <= 0) return 0;
  return crossing((t) => g.at(t) - level, grid[i - 1]!, grid[i]!);
}

/** Greatest value with its time, refined by golden section; t = 0+ counted; below 1e-6 it is none. */
function peakOf(g: TimeResponse, grid: readonly number[], values: readonly number[]) {
  let at = 0;
  values.forEach((value, i) => {
    if (value > values[at]!) at = i;
  });
  let time = grid[at]!;
  let value = values[at]!;
  if (at > 0 && at < grid.length - 1) {
    time = maximum((t) => g.at(t), grid[at - 1]!, grid[at + 1]!);
    value = Math.max(value, g.at(time));
  }
  if (g.initial >= value * (1 - 1e-12)) {
    time = 0;
    value = g.initial;
  }
  const overshoot = value - 1;
  return overshoot < 1e-6 ? { overshoot: 0, time: null } : { overshoot, time };
}

/** Greatest value of ∫₀ᵗ(1 − g); the total counts too. */
function partial(lost: (t: number) => number, grid: readonly number[], deficits: readonly number[]): number {
  let at = 0;
  deficits.forEach((value, i) => {
    if (value > deficits[at]!) at = i;
  });
  if (deficits[at]! <= 0) return 0;
  if (at === 0 || at === grid.length - 1) return deficits[at]!;
  return Math.max(deficits[at]!, lost(maximum(lost, grid[at - 1]!, grid[at + 1]!)));
}

/** Earliest time after which |T − ∫₀ᵗ(1 − g)| < 0.02 t; before the first time looked at the integral counts for nothing. */
function residualSettling(
  T: number,
  lost: (t: number) => number,
  grid: readonly number[],
  deficits: readonly number[],
): number | null {
  const found = lastOutside(
    grid,
    grid.map((t, i) => Math.abs(T - deficits[i]!) - 0.02 * t),
    (t) => Math.abs(T - lost(t)) - 0.02 * t,
  );
  return found === 0 ? Math.abs(T) / 0.02 : found;
}

/** Last time at which `outside` is positive; 0 if never, null if it still is at the end. */
function lastOutside(
  grid: readonly number[],
  values: readonly number[],
  outside: (t: number) => number,
): number | null {
  for (let i = grid.length - 1; i >= 0; i--) {
    if (values[i]! <= 0) continue;
    return i === grid.length - 1 ? null : crossing(outside, grid[i]!, grid[i + 1]!);
  }
  return 0;
}

import { dcSolution } from "./dcSolution.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";
import { StepResponse } from "./stepResponse.ts";
import { tapTwoPort, transfer } from "./tapTwoPort.ts";

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
  readonly settlingTime_s: { readonly "1%": number; readonly "0.1%": number };
  readonly residualSettlingTime_s: number;
}

/**
 * Response time T = ∫(1 − g) dt = −d(F·H)/ds at s = 0, taken as the imaginary part at an infinitesimal imaginary s, where the
 * elimination has nothing to cancel. null where dc does not pass.
 */
export function responseTime(network: LadderNetwork): number | null {
  const dc = dcSolution(network, 1);
  if (dc === null) return null;
  const tiny = 1e-60;
  const sre = new Float64Array(1);
  const sim = Float64Array.of(tiny);
  return (-transfer(network, tapTwoPort(network, sre, sim), sre, sim).im[0]! * dc.scaleFactor) / tiny;
}

const perDecade = 40;
const first = -14;
const last = 7;

/** All figures of the step response of an R-C network; null where dc does not pass. */
export function stepFigures(network: LadderNetwork): StepFigures | null {
  const g = StepResponse.of(network);
  const T = responseTime(network);
  if (g === null || T === null) return null;
  const grid = Array.from({ length: (last - first) * perDecade }, (_, i) => 10 ** (first + i / perDecade));
  const values = grid.map((t) => g.at(t));
  const cross = (level: number) => (g.initial >= level ? 0 : firstCrossing(g, grid, values, level));
  const t10_s = cross(0.1);
  const t90_s = cross(0.9);
  const peak = peakOf(g, grid, values);
  return {
    initial: g.initial,
    responseTime_s: T,
    partialResponseTime_s: partial(g, grid),
    t10_s,
    t90_s,
    riseTime_s: t90_s - t10_s,
    overshoot: peak.overshoot,
    peakTime_s: peak.time,
    settlingTime_s: {
      "1%": lastOutside(grid, (t) => Math.abs(g.at(t) - 1) - 0.01),
      "0.1%": lastOutside(grid, (t) => Math.abs(g.at(t) - 1) - 0.001),
    },
    residualSettlingTime_s: lastOutside(grid, (t) => Math.abs(T - g.deficit(t)) - 0.02 * t),
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

function firstCrossing(g: StepResponse, grid: readonly number[], values: readonly number[], level: number): number {
  const i = values.findIndex((value) => value >= level);
  if (i <= 0) return 0;
  return crossing((t) => g.at(t) - level, grid[i - 1]!, grid[i]!);
}

/** Greatest value with its time, refined by golden section; t = 0+ counted; below 1e-6 it is none. */
function peakOf(g: StepResponse, grid: readonly number[], values: readonly number[]) {
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

function maximum(f: (t: number) => number, from: number, to: number): number {
  const golden = (Math.sqrt(5) - 1) / 2;
  let low = Math.log(from);
  let high = Math.log(to);
  for (let step = 0; step < 40; step++) {
    const left = high - golden * (high - low);
    const right = low + golden * (high - low);
    if (f(Math.exp(left)) > f(Math.exp(right))) high = right;
    else low = left;
  }
  return Math.exp((low + high) / 2);
}

/** Greatest value of ∫₀ᵗ(1 − g); the total counts too. */
function partial(g: StepResponse, grid: readonly number[]): number {
  const deficits = grid.map((t) => g.deficit(t));
  let at = 0;
  deficits.forEach((value, i) => {
    if (value > deficits[at]!) at = i;
  });
  if (deficits[at]! <= 0) return 0;
  if (at === 0 || at === grid.length - 1) return deficits[at]!;
  return Math.max(deficits[at]!, g.deficit(maximum((t) => g.deficit(t), grid[at - 1]!, grid[at + 1]!)));
}

/** Last time at which `outside` is positive; 0 if never. */
function lastOutside(grid: readonly number[], outside: (t: number) => number): number {
  for (let i = grid.length - 1; i >= 0; i--) {
    if (outside(grid[i]!) <= 0) continue;
    return i === grid.length - 1 ? grid[i]! : crossing(outside, grid[i]!, grid[i + 1]!);
  }
  return 0;
}

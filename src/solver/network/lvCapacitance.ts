import { scaleFactorOf } from "./dcSolution.ts";
import { type LadderNetwork, type Reference, withLvCapacitance } from "./ladderNetwork.ts";
import { responseTime } from "./stepFigures.ts";
import { angular, decibel } from "./sweep.ts";
import { tapTwoPort } from "./tapTwoPort.ts";
import { transfer, transferOf } from "./transfer.ts";

/** The LV capacitance to be fitted, all else held, by each of the three matches, F; null where it is negative or does not exist. */
export interface LvCapacitance {
  /** Makes the response time zero. */
  readonly responseTime_F: number | null;
  /** Makes the scale factor at the edge equal to dc. */
  readonly highFrequency_F: number | null;
  /** Smallest greatest deviation in dB over the band; 0 when the best would be negative. */
  readonly flattest_F: number | null;
  readonly flattest_dB: number | null;
}

export function lvCapacitance(
  network: LadderNetwork,
  band_Hz: readonly [number, number],
  reference: Reference = "electrode",
): LvCapacitance {
  const bare = withLvCapacitance(network, 0);
  const scaleFactor = scaleFactorOf(bare, reference);
  if (scaleFactor === null) return { responseTime_F: null, highFrequency_F: null, flattest_F: null, flattest_dB: null };
  const highFrequency = byHighFrequency(bare, scaleFactor, reference);
  const responseTime = byResponseTime(bare, reference);
  const start = [highFrequency, responseTime].find((each) => each !== null && each > 0) ?? 1e-8;
  const flattest = byFlatness(bare, scaleFactor, band_Hz, start, reference);
  return {
    responseTime_F: positive(responseTime),
    highFrequency_F: positive(highFrequency),
    flattest_F: flattest.capacitance,
    flattest_dB: flattest.deviation,
  };
}

const positive = (value: number | null): number | null => (value === null || value < 0 ? null : value);

/** T is linear in the LV capacitance (its slope is the tap's source resistance): two values give the root, a third its last digits. */
function byResponseTime(bare: LadderNetwork, reference: Reference): number | null {
  const at = (C: number) => responseTime(withLvCapacitance(bare, C), reference) as number;
  const T0 = at(0);
  const slope = (at(1e-9) - T0) / 1e-9;
  if (slope === 0) return null;
  const first = -T0 / slope;
  return first <= 0 ? first : first - (at(first) * first) / (at(first) - T0);
}

/** The LV capacitance that makes the scale factor at the edge equal to dc, all else held, F; negative or null where none can. */
export function edgeMatch(network: LadderNetwork, reference: Reference = "electrode"): number | null {
  const bare = withLvCapacitance(network, 0);
  const scaleFactor = scaleFactorOf(bare, reference);
  return scaleFactor === null ? null : byHighFrequency(bare, scaleFactor, reference);
}

const edge = 1e40;

/** At the edge v_tap = C_12/(C_tap + C2), solved for F·v_out = 1. null where the edge does not depend on it, or passes nothing. */
function byHighFrequency(bare: LadderNetwork, scaleFactor: number, reference: Reference): number | null {
  if (bare.lv.inductance_H > 0 || bare.cable.line !== null) return null;
  const sre = Float64Array.of(edge);
  const zero = new Float64Array(1);
  const initial = (network: LadderNetwork) => transfer(network, sre, zero, reference).re[0]! * scaleFactor;
  const none = initial(bare);
  if (Math.abs(none) < 1e-15) return null;
  // v_out = A/(S + C2): two values give S, and S the missing capacitance.
  const trial = 1e-9;
  const S = (trial * initial(withLvCapacitance(bare, trial))) / (none - initial(withLvCapacitance(bare, trial)));
  const found = S * (none - 1);
  if (!Number.isFinite(found)) return null;
  return found < 0 || Math.abs(initial(withLvCapacitance(bare, found)) - 1) < 1e-6 ? found : null;
}

function byFlatness(
  bare: LadderNetwork,
  scaleFactor: number,
  band: readonly [number, number],
  scale: number,
  reference: Reference,
) {
  const [low, high] = band;
  if (!(low > 0) || !(high >= low)) return { capacitance: null, deviation: null };
  const points = 241;
  const frequencies = Array.from({ length: points }, (_, i) => low * (high / low) ** (i / (points - 1)));
  const sim = angular(frequencies);
  const sre = new Float64Array(points);
  const port = tapTwoPort(bare, sre, sim);
  const worst = (C: number): number => {
    const H = transferOf(bare, port, sre, sim, reference, C);
    let greatest = 0;
    for (let k = 0; k < points; k++) {
      greatest = Math.max(greatest, Math.abs(decibel(H.re[k]! * scaleFactor, H.im[k]! * scaleFactor)));
    }
    return greatest;
  };
  let best = 0;
  let at = 0;
  const grid = [0, ...Array.from({ length: 321 }, (_, i) => scale * 10 ** (i / 40 - 6))];
  let least = worst(0);
  grid.forEach((C, i) => {
    const value = worst(C);
    if (value < least) {
      least = value;
      best = C;
      at = i;
    }
  });
  let from = grid[Math.max(at - 1, 0)]!;
  let to = grid[Math.min(at + 1, grid.length - 1)]!;
  const golden = (Math.sqrt(5) - 1) / 2;
  for (let step = 0; step < 60; step++) {
    const left = to - golden * (to - from);
    const right = from + golden * (to - from);
    if (worst(left) < worst(right)) to = right;
    else from = left;
  }
  const refined = (from + to) / 2;
  const value = worst(refined);
  return value < least ? { capacitance: refined, deviation: value } : { capacitance: best, deviation: least };
}

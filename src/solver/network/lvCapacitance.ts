import { dcSolution } from "./dcSolution.ts";
import { type LadderNetwork, withLvCapacitance } from "./ladderNetwork.ts";
import { responseTime } from "./stepFigures.ts";
import { angular, decibel } from "./sweep.ts";
import { tapTwoPort, transfer } from "./tapTwoPort.ts";

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

export function lvCapacitance(network: LadderNetwork, band_Hz: readonly [number, number]): LvCapacitance {
  const bare = withLvCapacitance(network, 0);
  const dc = dcSolution(bare, 1);
  if (dc === null) return { responseTime_F: null, highFrequency_F: null, flattest_F: null, flattest_dB: null };
  const highFrequency = byHighFrequency(bare, dc.scaleFactor);
  const flattest = byFlatness(bare, dc.scaleFactor, band_Hz, highFrequency);
  return {
    responseTime_F: positive(byResponseTime(bare)),
    highFrequency_F: positive(highFrequency),
    flattest_F: flattest.capacitance,
    flattest_dB: flattest.deviation,
  };
}

const positive = (value: number | null): number | null => (value === null || value < 0 ? null : value);

/** T is linear in the LV capacitance (its slope is the tap's source resistance): two values give the root. */
function byResponseTime(bare: LadderNetwork): number | null {
  const T0 = responseTime(bare);
  if (T0 === null) return null;
  const trial = 1e-9;
  const T1 = responseTime(withLvCapacitance(bare, trial)) as number;
  const slope = (T1 - T0) / trial;
  return slope === 0 ? null : -T0 / slope;
}

/** At the edge v_tap = C_12 / (C_tap + C2); solved for F·v_out = 1. */
function byHighFrequency(bare: LadderNetwork, scaleFactor: number): number | null {
  const { seriesProtector, instrument, cable } = bare;
  const behind = instrument.capacitance_F + instrument.protector.capacitance_F;
  const far = seriesProtector.at === "divider" ? behind + cable.capacitance_F : behind;
  if (seriesProtector.resistance_ohm > 0 && far > 0) return null;
  const s = 1e40;
  const sre = Float64Array.of(s);
  const zero = new Float64Array(1);
  const port = tapTwoPort(bare, sre, zero);
  const initial = transfer(bare, port, sre, zero).re[0]!;
  if (initial === 0) return null;
  // v_out = t·H/(H + E + L), so H + E + L = t·H/v_out and the missing capacitance is what makes v_out = 1/F.
  const t =
    seriesProtector.resistance_ohm > 0 ? 1 / (1 + seriesProtector.resistance_ohm / instrument.resistance_ohm) : 1;
  const H = port.Hre[0]! / s;
  return t * H * (scaleFactor - 1 / initial);
}

function byFlatness(bare: LadderNetwork, scaleFactor: number, band: readonly [number, number], start: number | null) {
  const [low, high] = band;
  if (!(low > 0) || !(high >= low)) return { capacitance: null, deviation: null };
  const points = 241;
  const frequencies = Array.from({ length: points }, (_, i) => low * (high / low) ** (i / (points - 1)));
  const sim = angular(frequencies);
  const sre = new Float64Array(points);
  const port = tapTwoPort(bare, sre, sim);
  const worst = (C: number): number => {
    const H = transfer(bare, port, sre, sim, C);
    let greatest = 0;
    for (let k = 0; k < points; k++) {
      greatest = Math.max(greatest, Math.abs(decibel(H.re[k]! * scaleFactor, H.im[k]! * scaleFactor)));
    }
    return greatest;
  };
  const scale = start !== null && start > 0 ? start : 1e-8;
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

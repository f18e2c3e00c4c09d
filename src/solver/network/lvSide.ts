import type { LadderNetwork, Line, Shunt } from "./ladderNetwork.ts";

/**
 * Everything from the tap to the instrument, at complex frequencies s: its admittance at the tap, and the output over the tap
 * voltage. Arrays hold one value a frequency.
 */
export interface LvSide {
  readonly Lre: Float64Array;
  readonly Lim: Float64Array;
  readonly Tre: Float64Array;
  readonly Tim: Float64Array;
}

export const conductance = (R: number): number => (R === Number.POSITIVE_INFINITY ? 0 : 1 / R);

/** Two shunts side by side, as conductance and capacitance. */
const beside = (a: Shunt, b: Shunt) => ({
  G: conductance(a.resistance_ohm) + conductance(b.resistance_ohm),
  C: a.capacitance_F + b.capacitance_F,
});

/** The admittance walked from the instrument back to the tap, with the share of the voltage that arrives. */
interface Walk {
  yr: number;
  yi: number;
  tr: number;
  ti: number;
}

/** @param extraC capacitance added in the place of the LV capacitor (a trial value), F; only without an LV inductance */
export function lvSide(network: LadderNetwork, sre: Float64Array, sim: Float64Array, extraC = 0): LvSide {
  const count = sre.length;
  const make = () => new Float64Array(count);
  const side = { Lre: make(), Lim: make(), Tre: make(), Tim: make() };
  const { lv, protector, cable, instrument, seriesProtector } = network;
  const end = beside(instrument, instrument.protector);
  const tap = beside({ resistance_ohm: lv.resistance_ohm, capacitance_F: 0 }, protector);
  const C2 = lv.capacitance_F + extraC;
  const atDivider = seriesProtector.at === "divider";
  const walk: Walk = { yr: 0, yi: 0, tr: 1, ti: 0 };
  for (let k = 0; k < count; k++) {
    const a = sre[k]!;
    const b = sim[k]!;
    walk.yr = end.G + a * end.C;
    walk.yi = b * end.C;
    walk.tr = 1;
    walk.ti = 0;
    if (!atDivider) throughSeries(walk, seriesProtector.resistance_ohm);
    if (cable.line !== null) throughLine(walk, cable.line, a, b);
    if (atDivider) {
      walk.yr += a * cable.capacitance_F;
      walk.yi += b * cable.capacitance_F;
      throughSeries(walk, seriesProtector.resistance_ohm);
    }
    const C = tap.C + (atDivider ? 0 : cable.capacitance_F);
    side.Lre[k] = walk.yr + tap.G + a * C;
    side.Lim[k] = walk.yi + b * C;
    addCapacitor(side, k, C2, lv.inductance_H, a, b);
    side.Tre[k] = walk.tr;
    side.Tim[k] = walk.ti;
  }
  return side;
}

/** A resistance in series: y becomes y/(1 + R y), and the share of the voltage 1/(1 + R y). */
function throughSeries(walk: Walk, R: number): void {
  if (R === 0) return;
  const dr = 1 + R * walk.yr;
  const di = R * walk.yi;
  const d2 = dr * dr + di * di;
  const qr = dr / d2;
  const qi = -di / d2;
  const { yr, yi, tr, ti } = walk;
  walk.yr = yr * qr - yi * qi;
  walk.yi = yr * qi + yi * qr;
  walk.tr = tr * qr - ti * qi;
  walk.ti = tr * qi + ti * qr;
}

/**
 * A lossless line with the load y and its termination at the far end and the series resistor at the near one. With E = exp(−2 s T),
 * m = 1 − E and p = 1 + E, z = Z0 y: y_in = (m + z p)/(Z0 (p + z m)) and v_end/v_in = 2 exp(−s T)/(p + z m). m is formed without
 * a difference, so that a line short against the wave loses nothing.
 */
function throughLine(walk: Walk, line: Line, a: number, b: number): void {
  const Z0 = line.impedance_ohm;
  const x = a * line.delay_s;
  const phase = b * line.delay_s;
  const zr = Z0 * (walk.yr + conductance(line.terminationAtEnd_ohm));
  const zi = Z0 * walk.yi;
  const decay = Math.exp(-2 * x);
  const sine = Math.sin(phase);
  const mr = -Math.expm1(-2 * x) * Math.cos(2 * phase) + 2 * sine * sine;
  const mi = decay * Math.sin(2 * phase);
  const pr = 2 - mr;
  const pi = -mi;
  const dr = pr + zr * mr - zi * mi;
  const di = pi + zr * mi + zi * mr;
  const nr = mr + zr * pr - zi * pi;
  const ni = mi + zr * pi + zi * pr;
  const d2 = dr * dr + di * di;
  walk.yr = (nr * dr + ni * di) / (d2 * Z0);
  walk.yi = (ni * dr - nr * di) / (d2 * Z0);
  const front = 2 * Math.exp(-x);
  const cr = (front * (Math.cos(phase) * dr - sine * di)) / d2;
  const ci = (front * (-Math.cos(phase) * di - sine * dr)) / d2;
  const { tr, ti } = walk;
  walk.tr = tr * cr - ti * ci;
  walk.ti = tr * ci + ti * cr;
  throughSeries(walk, line.seriesAtTap_ohm);
}

/** The LV capacitor with its inductance: s C/(1 + s² L C). */
function addCapacitor(side: LvSide, k: number, C: number, L: number, a: number, b: number): void {
  if (L === 0 || C === 0) {
    side.Lre[k] = side.Lre[k]! + a * C;
    side.Lim[k] = side.Lim[k]! + b * C;
    return;
  }
  const dr = 1 + L * C * (a * a - b * b);
  const di = 2 * L * C * a * b;
  const d2 = dr * dr + di * di;
  side.Lre[k] = side.Lre[k]! + (C * (a * dr + b * di)) / d2;
  side.Lim[k] = side.Lim[k]! + (C * (b * dr - a * di)) / d2;
}

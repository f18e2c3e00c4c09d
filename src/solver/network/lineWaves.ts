import type { LadderNetwork, Line, Reference } from "./ladderNetwork.ts";
import { conductance, lvSide } from "./lvSide.ts";
import { type TapTwoPort, tapTwoPort } from "./tapTwoPort.ts";
import { transferOf } from "./transfer.ts";

/**
 * A network around its lossless line, as waves: with delay T the output is Σ launch·round^k·exp(−(2k+1) s T), k = 0, 1, 2 …, where
 * `launch` is the first wave as the instrument sees it (over the reference input) and `round` the product of the reflections at
 * both ends, each seen into the network with the line's impedance in its place.
 */
export interface LineWaves {
  readonly launchRe: Float64Array;
  readonly launchIm: Float64Array;
  readonly roundRe: Float64Array;
  readonly roundIm: Float64Array;
}

const open = { resistance_ohm: Number.POSITIVE_INFINITY, capacitance_F: 0 };

/** The network with an endless line in the place of the line: what stands ahead of it, loaded by its impedance. */
export function matched(network: LadderNetwork, line: Line): LadderNetwork {
  return {
    ...network,
    cable: { ...network.cable, line: null },
    instrument: { ...open, resistance_ohm: line.impedance_ohm + line.seriesAtTap_ohm, protector: open },
    seriesProtector: ahead(network),
  };
}

/** What of the series protector stands between tap and line. */
const ahead = ({ seriesProtector }: LadderNetwork): LadderNetwork["seriesProtector"] =>
  seriesProtector.at === "divider" ? seriesProtector : { resistance_ohm: 0, at: "instrument" };

export function lineWaves(
  network: LadderNetwork,
  line: Line,
  reference: Reference,
  sre: Float64Array,
  sim: Float64Array,
): LineWaves {
  const port = tapTwoPort(network, sre, sim);
  const loaded = transferOf(matched(network, line), port, sre, sim, reference);
  const back = lookingBack(network, line, reference, port, sre, sim);
  const count = sre.length;
  const make = () => new Float64Array(count);
  const out = { launchRe: make(), launchIm: make(), roundRe: make(), roundIm: make() };
  const Z0 = line.impedance_ohm;
  const { instrument, seriesProtector } = network;
  const G = conductance(instrument.resistance_ohm) + conductance(instrument.protector.resistance_ohm);
  const C = instrument.capacitance_F + instrument.protector.capacitance_F;
  const Rs = seriesProtector.at === "instrument" ? seriesProtector.resistance_ohm : 0;
  const arriving = Z0 / (Z0 + line.seriesAtTap_ohm);
  for (let k = 0; k < count; k++) {
    const yr = G + sre[k]! * C;
    const yi = sim[k]! * C;
    // Behind a series protector the instrument takes 1/(1 + Rs y) of the voltage at the line's end.
    const [tr, ti] = quotient(1, 0, 1 + Rs * yr, Rs * yi);
    const zr = Z0 * (yr * tr - yi * ti + conductance(line.terminationAtEnd_ohm));
    const zi = Z0 * (yr * ti + yi * tr);
    const [fr, fi] = quotient(2 * arriving, 0, 1 + zr, zi);
    const ar = fr * tr - fi * ti;
    const ai = fr * ti + fi * tr;
    out.launchRe[k] = ar * loaded.re[k]! - ai * loaded.im[k]!;
    out.launchIm[k] = ar * loaded.im[k]! + ai * loaded.re[k]!;
    const [er, ei] = quotient(1 - zr, -zi, 1 + zr, zi);
    const wr = Z0 * back.re[k]!;
    const wi = Z0 * back.im[k]!;
    const [sr, si] = quotient(1 - wr, -wi, 1 + wr, wi);
    out.roundRe[k] = er * sr - ei * si;
    out.roundIm[k] = er * si + ei * sr;
  }
  return out;
}

/** Admittance that the line sees looking back into the divider, its source at rest. */
function lookingBack(
  network: LadderNetwork,
  line: Line,
  reference: Reference,
  port: TapTwoPort,
  sre: Float64Array,
  sim: Float64Array,
): { readonly re: Float64Array; readonly im: Float64Array } {
  const series = ahead(network);
  const atDivider = network.seriesProtector.at === "divider";
  const alone = lvSide(
    {
      ...network,
      cable: { capacitance_F: atDivider ? 0 : network.cable.capacitance_F, line: null },
      instrument: { ...open, protector: open },
      seriesProtector: { resistance_ohm: 0, at: "instrument" },
    },
    sre,
    sim,
  );
  const re = new Float64Array(sre.length);
  const im = new Float64Array(sre.length);
  for (let k = 0; k < sre.length; k++) {
    const s: Pair = [sre[k]!, sim[k]!];
    const [hr, hi] = towardsSource(network, reference, s, [port.Hre[k]!, port.Him[k]!], [port.Pre[k]!, port.Pim[k]!]);
    let y: Pair = [alone.Lre[k]! + port.Ere[k]! + hr, alone.Lim[k]! + port.Eim[k]! + hi];
    y = behind(y, series.resistance_ohm);
    if (atDivider) y = [y[0] + s[0] * network.cable.capacitance_F, y[1] + s[1] * network.cable.capacitance_F];
    y = behind(y, line.seriesAtTap_ohm);
    re[k] = y[0];
    im[k] = y[1];
  }
  return { re, im };
}

type Pair = readonly [re: number, im: number];

/** H to the electrode, which an ideal source holds at rest; counted with the source, H in series with P and the source branch. */
function towardsSource(network: LadderNetwork, reference: Reference, s: Pair, H: Pair, P: Pair): Pair {
  const { source } = network;
  const Zr = source.resistance_ohm + source.damping_ohm + s[0] * source.inductance_H;
  const Zi = s[1] * source.inductance_H;
  if (reference === "electrode" || (Zr === 0 && Zi === 0)) return H;
  const [yr, yi] = quotient(1, 0, Zr, Zi);
  const ar = P[0] + yr + s[0] * source.capacitance_F;
  const ai = P[1] + yi + s[1] * source.capacitance_F;
  const [qr, qi] = quotient(ar, ai, ar + H[0], ai + H[1]);
  return [H[0] * qr - H[1] * qi, H[0] * qi + H[1] * qr];
}

const behind = (y: Pair, R: number): Pair => (R === 0 ? y : quotient(y[0], y[1], 1 + R * y[0], R * y[1]));

function quotient(ar: number, ai: number, br: number, bi: number): Pair {
  const d = br * br + bi * bi;
  return [(ar * br + ai * bi) / d, (ai * br - ar * bi) / d];
}

import type { LadderNetwork, Reference } from "./ladderNetwork.ts";
import { lvSide } from "./lvSide.ts";
import { type TapTwoPort, tapTwoPort } from "./tapTwoPort.ts";

/** Output over the reference input and input admittance at the electrode, at each s. */
export interface Transfer {
  readonly re: Float64Array;
  readonly im: Float64Array;
  /** Of the divider alone, without the source branch and its capacitance. */
  readonly Yre: Float64Array;
  readonly Yim: Float64Array;
}

/** The string with its LV side, and ahead of it the source where the reference counts it. */
export function transfer(
  network: LadderNetwork,
  sre: Float64Array,
  sim: Float64Array,
  reference: Reference = "electrode",
): Transfer {
  return transferOf(network, tapTwoPort(network, sre, sim), sre, sim, reference);
}

/**
 * The same with the string's two-port in hand.
 * @param extraC capacitance added in the place of the LV capacitor (a trial value), F
 */
export function transferOf(
  network: LadderNetwork,
  port: TapTwoPort,
  sre: Float64Array,
  sim: Float64Array,
  reference: Reference = "electrode",
  extraC = 0,
): Transfer {
  const { count } = port;
  const side = lvSide(network, sre, sim, extraC);
  const make = () => new Float64Array(count);
  const out = { re: make(), im: make(), Yre: make(), Yim: make() };
  for (let k = 0; k < count; k++) {
    const Lr = side.Lre[k]! + port.Ere[k]!;
    const Li = side.Lim[k]! + port.Eim[k]!;
    const hr = port.Hre[k]!;
    const hi = port.Him[k]!;
    const Sr = Lr + hr;
    const Si = Li + hi;
    const S2 = Sr * Sr + Si * Si;
    const vr = S2 === 0 ? 0 : (hr * Sr + hi * Si) / S2;
    const vi = S2 === 0 ? 0 : (hi * Sr - hr * Si) / S2;
    const tr = side.Tre[k]!;
    const ti = side.Tim[k]!;
    out.re[k] = vr * tr - vi * ti;
    out.im[k] = vr * ti + vi * tr;
    out.Yre[k] = port.Pre[k]! + vr * Lr - vi * Li;
    out.Yim[k] = port.Pim[k]! + vr * Li + vi * Lr;
  }
  if (reference === "source") {
    const share = electrodeShare(network, out, sre, sim);
    for (let k = 0; k < count; k++) {
      const { re, im } = out;
      const hr = re[k]!;
      re[k] = hr * share.re[k]! - im[k]! * share.im[k]!;
      im[k] = hr * share.im[k]! + im[k]! * share.re[k]!;
    }
  }
  return out;
}

/** What stands between the source's own voltage and the electrode: Z = R/(1 + s R Ct) + damping + s L, Ct across its terminals. */
export function sourceImpedance({ source }: LadderNetwork, a: number, b: number): { re: number; im: number } {
  const { resistance_ohm: R, damping_ohm, inductance_H, atTerminals_F: C = 0 } = source;
  const dr = 1 + a * R * C;
  const di = b * R * C;
  const size = dr * dr + di * di;
  return { re: (R * dr) / size + damping_ohm + a * inductance_H, im: (-R * di) / size + b * inductance_H };
}

/** Electrode voltage over the source's own: 1/(1 + Z (Y + s Cs)). */
export function electrodeShare(
  network: LadderNetwork,
  { Yre, Yim }: Pick<Transfer, "Yre" | "Yim">,
  sre: Float64Array,
  sim: Float64Array,
): { readonly re: Float64Array; readonly im: Float64Array } {
  const { capacitance_F } = network.source;
  const re = new Float64Array(sre.length);
  const im = new Float64Array(sre.length);
  for (let k = 0; k < sre.length; k++) {
    const { re: Zr, im: Zi } = sourceImpedance(network, sre[k]!, sim[k]!);
    const yr = Yre[k]! + sre[k]! * capacitance_F;
    const yi = Yim[k]! + sim[k]! * capacitance_F;
    const dr = 1 + Zr * yr - Zi * yi;
    const di = Zr * yi + Zi * yr;
    const d2 = dr * dr + di * di;
    re[k] = dr / d2;
    im[k] = -di / d2;
  }
  return { re, im };
}

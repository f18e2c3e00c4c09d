import type { LadderNetwork, Reference } from "./ladderNetwork.ts";
import { lvSide } from "./lvSide.ts";
import { angular } from "./sweep.ts";
import { conductances, tapTwoPort } from "./tapTwoPort.ts";
import { electrodeShare, transferOf } from "./transfer.ts";

/** Amplitude of each element's voltage and of the tap's at each frequency, V. */
export interface ElementVoltages {
  readonly elementVoltage_V: number[][];
  readonly tapVoltage_V: number[];
}

/**
 * Back-substitution from the tap upward without a difference of equals: with E to earth and H to the electrode of node i (all above it
 * eliminated), v_i − v_(i−1) = (H d_(i−1) − E v_(i−1))/S and d_i = V − v_i = (E V + y d_(i−1))/S, S = E + H + y.
 * @param peak_V amplitude at the reference input
 */
export function elementVoltages(
  network: LadderNetwork,
  frequencies_Hz: readonly number[],
  peak_V: number,
  reference: Reference = "electrode",
): ElementVoltages {
  const { n } = network;
  const sim = angular(frequencies_Hz);
  const sre = new Float64Array(sim.length);
  const port = tapTwoPort(network, sre, sim);
  const side = lvSide(network, sre, sim);
  const share = electrodeShare(network, transferOf(network, port, sre, sim), sre, sim);
  const steps = { er: new Float64Array(n), ei: new Float64Array(n), hr: new Float64Array(n), hi: new Float64Array(n) };
  const elementVoltage_V: number[][] = [];
  const tapVoltage_V: number[] = [];
  for (let k = 0; k < sim.length; k++) {
    const peak = reference === "source" ? peak_V * Math.hypot(share.re[k]!, share.im[k]!) : peak_V;
    const below = { re: side.Lre[k]! + port.Ere[k]!, im: side.Lim[k]! + port.Eim[k]! };
    const H = { re: port.Hre[k]!, im: port.Him[k]! };
    const S = { re: below.re + H.re, im: below.im + H.im };
    const tap = { v: quotient(H.re, H.im, S.re, S.im), d: quotient(below.re, below.im, S.re, S.im) };
    descend(network, sim[k]!, steps);
    elementVoltage_V.push(climb(network, sim[k]!, steps, tap, peak));
    tapVoltage_V.push(Math.hypot(tap.v.re, tap.v.im) * peak);
  }
  return { elementVoltage_V, tapVoltage_V };
}

function quotient(ar: number, ai: number, br: number, bi: number): { re: number; im: number } {
  const d = br * br + bi * bi;
  return d === 0 ? { re: 0, im: 0 } : { re: (ar * br + ai * bi) / d, im: (ai * br - ar * bi) / d };
}

interface Steps {
  readonly er: Float64Array;
  readonly ei: Float64Array;
  readonly hr: Float64Array;
  readonly hi: Float64Array;
}

/** E and H of every inner node with all above it eliminated; node i stands at index i (1 … n-1). */
function descend(network: LadderNetwork, w: number, { er, ei, hr, hi }: Steps): void {
  const { n, capacitance_F: C, toEarth_F, toElectrode_F } = network;
  const G = conductances(network);
  let a = G[n - 1]!;
  let b = w * C[n - 1]!;
  let e = 0;
  let f = 0;
  for (let i = n - 1; i >= 1; i--) {
    f += w * toEarth_F[i - 1]!;
    b += w * toElectrode_F[i - 1]!;
    er[i] = e;
    ei[i] = f;
    hr[i] = a;
    hi[i] = b;
    const yr = G[i - 1]!;
    const yi = w * C[i - 1]!;
    const Sr = e + a + yr;
    const Si = f + b + yi;
    const d = Sr * Sr + Si * Si;
    if (d === 0) {
      a = b = e = f = 0;
      continue;
    }
    const qr = (yr * Sr + yi * Si) / d;
    const qi = (yi * Sr - yr * Si) / d;
    const er2 = qr * e - qi * f;
    f = qr * f + qi * e;
    e = er2;
    const hr2 = qr * a - qi * b;
    b = qr * b + qi * a;
    a = hr2;
  }
}

interface Tap {
  readonly v: { readonly re: number; readonly im: number };
  readonly d: { readonly re: number; readonly im: number };
}

function climb(network: LadderNetwork, w: number, steps: Steps, tap: Tap, peak: number): number[] {
  const { n, capacitance_F: C } = network;
  const G = conductances(network);
  let { re: vr, im: vi } = tap.v;
  let { re: dr, im: di } = tap.d;
  const out = new Array<number>(n);
  for (let i = 1; i < n; i++) {
    const er = steps.er[i]!;
    const ei = steps.ei[i]!;
    const hr = steps.hr[i]!;
    const hi = steps.hi[i]!;
    const yr = G[i - 1]!;
    const yi = w * C[i - 1]!;
    const Sr = er + hr + yr;
    const Si = ei + hi + yi;
    const scale = Sr * Sr + Si * Si;
    if (scale === 0) {
      out[i - 1] = 0;
      continue;
    }
    const nr = hr * dr - hi * di - er * vr + ei * vi;
    const ni = hr * di + hi * dr - er * vi - ei * vr;
    const ur = (nr * Sr + ni * Si) / scale;
    const ui = (ni * Sr - nr * Si) / scale;
    out[i - 1] = Math.hypot(ur, ui) * peak;
    const mr = er + yr * dr - yi * di;
    const mi = ei + yr * di + yi * dr;
    vr += ur;
    vi += ui;
    dr = (mr * Sr + mi * Si) / scale;
    di = (mi * Sr - mr * Si) / scale;
  }
  out[n - 1] = Math.hypot(dr, di) * peak;
  return out;
}

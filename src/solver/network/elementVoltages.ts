import type { LadderNetwork } from "./ladderNetwork.ts";
import { angular } from "./sweep.ts";
import { conductances, tapTwoPort, transfer } from "./tapTwoPort.ts";

/** Amplitude of each element's voltage and of the tap's at each frequency, for a peak at the electrode, V. */
export interface ElementVoltages {
  readonly elementVoltage_V: number[][];
  readonly tapVoltage_V: number[];
}

/**
 * Back-substitution from the tap upward with the difference formed directly: with E to earth and H to the electrode of node i
 * (all above it eliminated), v_i − v_(i−1) = (H (V − v_(i−1)) − E v_(i−1)) / (E + H + y).
 */
export function elementVoltages(
  network: LadderNetwork,
  frequencies_Hz: readonly number[],
  peak_V: number,
): ElementVoltages {
  const { n } = network;
  const elementVoltage_V: number[][] = [];
  const tapVoltage_V: number[] = [];
  const steps = { er: new Float64Array(n), ei: new Float64Array(n), hr: new Float64Array(n), hi: new Float64Array(n) };
  for (const f of frequencies_Hz) {
    const sim = angular([f]);
    const sre = new Float64Array(1);
    const bare = { ...network, seriesProtector: { ...network.seriesProtector } };
    const port = tapTwoPort(bare, sre, sim);
    const tap = tapOf(network, port, sre, sim);
    descend(network, sim[0]!, steps);
    elementVoltage_V.push(climb(network, sim[0]!, steps, tap, peak_V));
    tapVoltage_V.push(Math.hypot(tap.re, tap.im) * peak_V);
  }
  return { elementVoltage_V, tapVoltage_V };
}

/** v_tap over V: the transfer with the output taken at the tap, i.e. with the series part counted as load only. */
function tapOf(network: LadderNetwork, port: ReturnType<typeof tapTwoPort>, sre: Float64Array, sim: Float64Array) {
  const H = transfer(network, port, sre, sim);
  const Rs = network.seriesProtector.resistance_ohm;
  if (Rs === 0) return { re: H.re[0]!, im: H.im[0]! };
  const { instrument, cable, seriesProtector } = network;
  const g = (R: number) => (R === Number.POSITIVE_INFINITY ? 0 : 1 / R);
  const G = g(instrument.resistance_ohm) + g(instrument.protector.resistance_ohm);
  const C =
    instrument.capacitance_F +
    instrument.protector.capacitance_F +
    (seriesProtector.at === "divider" ? cable.capacitance_F : 0);
  const dr = 1 + Rs * G;
  const di = Rs * C * sim[0]!;
  return { re: H.re[0]! * dr - H.im[0]! * di, im: H.re[0]! * di + H.im[0]! * dr };
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
    [e, f] = [qr * e - qi * f, qr * f + qi * e];
    [a, b] = [qr * a - qi * b, qr * b + qi * a];
  }
}

function climb(
  network: LadderNetwork,
  w: number,
  steps: Steps,
  tap: { re: number; im: number },
  peak: number,
): number[] {
  const { n, capacitance_F: C } = network;
  const G = conductances(network);
  let vr = tap.re;
  let vi = tap.im;
  const out: number[] = [];
  for (let i = 1; i < n; i++) {
    const er = steps.er[i]!;
    const ei = steps.ei[i]!;
    const hr = steps.hr[i]!;
    const hi = steps.hi[i]!;
    const Sr = er + hr + G[i - 1]!;
    const Si = ei + hi + w * C[i - 1]!;
    const nr = hr * (1 - vr) + hi * vi - er * vr + ei * vi;
    const ni = hi * (1 - vr) - hr * vi - er * vi - ei * vr;
    const d = Sr * Sr + Si * Si;
    const ur = d === 0 ? 0 : (nr * Sr + ni * Si) / d;
    const ui = d === 0 ? 0 : (ni * Sr - nr * Si) / d;
    out.push(Math.hypot(ur, ui) * peak);
    vr += ur;
    vi += ui;
  }
  out.push(Math.hypot(1 - vr, vi) * peak);
  return out;
}

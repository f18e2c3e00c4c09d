import type { LadderNetwork } from "./ladderNetwork.ts";
import { lvSide } from "./lvSide.ts";
import { angular } from "./sweep.ts";
import { block, conductances } from "./tapTwoPort.ts";

/** Voltage of every node for 1 V at the electrode: row by row of frequencies, tap (0) to node n-1. */
export interface NodeVoltages {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/**
 * Every node at every frequency. Upward from the tap each node keeps P, the admittance looking down with its own strays, and J, the
 * current that the electrode drives into it through the strays below: with y the element above, S = y + P, the next node has
 * P y/S and J y/S, and v = J/S + (y/S) v_above on the way back. No subtraction. Several frequencies a pass, so that their
 * divisions overlap.
 */
export function nodeVoltages(network: LadderNetwork, frequencies_Hz: ArrayLike<number>): NodeVoltages {
  const { n } = network;
  const sim = angular(frequencies_Hz);
  const side = lvSide(network, new Float64Array(sim.length), sim);
  const G = conductances(network);
  const re = new Float64Array(sim.length * n);
  const im = new Float64Array(sim.length * n);
  const kept = new Float64Array(n * block * 4);
  const state = new Float64Array(block * 4);
  for (let from = 0; from < sim.length; from += block) {
    const width = Math.min(block, sim.length - from);
    for (let k = 0; k < width; k++) {
      state[4 * k] = side.Lre[from + k]!;
      state[4 * k + 1] = side.Lim[from + k]! + sim[from + k]! * network.electrodeToTap_F;
      state[4 * k + 2] = 0;
      state[4 * k + 3] = sim[from + k]! * network.electrodeToTap_F;
    }
    upward(network, G, sim, from, width, state, kept);
    downward(n, from, width, kept, re, im);
  }
  return { re, im };
}

function upward(
  network: LadderNetwork,
  G: Float64Array,
  sim: Float64Array,
  from: number,
  width: number,
  state: Float64Array,
  kept: Float64Array,
): void {
  const { n, capacitance_F: C, toEarth_F, toElectrode_F } = network;
  for (let i = 0; i < n; i++) {
    const g = G[i]!;
    const c = C[i]!;
    const h = i < n - 1 ? toElectrode_F[i]! : 0;
    const both = i < n - 1 ? toEarth_F[i]! + h : 0;
    for (let k = 0; k < width; k++) {
      const w = sim[from + k]!;
      const Pr = state[4 * k]!;
      const Pi = state[4 * k + 1]!;
      const Jr = state[4 * k + 2]!;
      const Ji = state[4 * k + 3]!;
      const yi = w * c;
      const Sr = Pr + g;
      const Si = Pi + yi;
      const size = Sr * Sr + Si * Si;
      const inverse = size > 0 ? 1 / size : 0;
      const xr = Sr * inverse;
      const xi = -Si * inverse;
      const qr = g * xr - yi * xi;
      const qi = g * xi + yi * xr;
      const at = (i * block + k) * 4;
      kept[at] = Jr * xr - Ji * xi;
      kept[at + 1] = Jr * xi + Ji * xr;
      kept[at + 2] = qr;
      kept[at + 3] = qi;
      state[4 * k] = qr * Pr - qi * Pi;
      state[4 * k + 1] = qr * Pi + qi * Pr + w * both;
      state[4 * k + 2] = qr * Jr - qi * Ji;
      state[4 * k + 3] = qr * Ji + qi * Jr + w * h;
    }
  }
}

function downward(
  n: number,
  from: number,
  width: number,
  kept: Float64Array,
  re: Float64Array,
  im: Float64Array,
): void {
  for (let k = 0; k < width; k++) {
    let vr = 1;
    let vi = 0;
    const row = (from + k) * n;
    for (let i = n - 1; i >= 0; i--) {
      const at = (i * block + k) * 4;
      const qr = kept[at + 2]!;
      const qi = kept[at + 3]!;
      const below = kept[at]! + qr * vr - qi * vi;
      vi = kept[at + 1]! + qr * vi + qi * vr;
      vr = below;
      re[row + i] = vr;
      im[row + i] = vi;
    }
  }
}

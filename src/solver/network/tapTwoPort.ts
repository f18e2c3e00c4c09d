import type { LadderNetwork } from "./ladderNetwork.ts";
import { conductance } from "./lvSide.ts";

/**
 * The string seen from its ends at complex frequencies s, inner nodes eliminated from the electrode to the tap by star-mesh
 * steps: each node keeps E to earth, H to the electrode, y to the node below; with S = E + H + y the node below gains yE/S
 * and yH/S, and E·H/S joins electrode and earth. No subtraction, so nothing cancels and nothing overflows.
 * Arrays hold one value a frequency: H and E at the tap, P between electrode and earth, all complex (re, im).
 */
export interface TapTwoPort {
  readonly count: number;
  readonly Hre: Float64Array;
  readonly Him: Float64Array;
  readonly Ere: Float64Array;
  readonly Eim: Float64Array;
  readonly Pre: Float64Array;
  readonly Pim: Float64Array;
}

/** The shares E/S, H/S and y/S of every inner node for the frequencies of one block, kept for the way back up. */
export interface Shares {
  /** Six values a node and frequency: E/S, H/S, y/S, re and im; node i = 1 … n-1 at (i·block + k)·6. */
  readonly values: Float64Array;
}

/** Frequencies a pass: enough for their divisions to overlap, few enough for the caches. */
export const block = 16;

export function tapTwoPort(network: LadderNetwork, sre: Float64Array, sim: Float64Array): TapTwoPort {
  const count = sre.length;
  const make = () => new Float64Array(count);
  const port = { count, Hre: make(), Him: make(), Ere: make(), Eim: make(), Pre: make(), Pim: make() };
  const G = conductances(network);
  for (let from = 0; from < count; from += block) eliminate(network, G, sre, sim, from, port, null);
  return port;
}

/** Eliminates the inner nodes at up to `block` frequencies from the given place on, side by side. */
export function eliminate(
  network: LadderNetwork,
  G: Float64Array,
  sre: Float64Array,
  sim: Float64Array,
  from: number,
  port: TapTwoPort,
  shares: Shares | null,
): void {
  const { n, capacitance_F: C, toEarth_F, toElectrode_F, electrodeToTap_F } = network;
  const width = Math.min(block, sre.length - from);
  const { a, b, er, ei, hr, hi, pr, pi } = state();
  const kept = shares?.values ?? null;
  for (let k = 0; k < width; k++) {
    a[k] = sre[from + k]!;
    b[k] = sim[from + k]!;
    // The top element joins node n-1 to the electrode.
    hr[k] = G[n - 1]! + a[k]! * C[n - 1]!;
    hi[k] = b[k]! * C[n - 1]!;
  }
  for (let i = n - 2; i >= 0; i--) {
    const g = G[i]!;
    const c = C[i]!;
    const e = toEarth_F[i]!;
    const h = toElectrode_F[i]!;
    for (let k = 0; k < width; k++) {
      const s = a[k]!;
      const w = b[k]!;
      const Er = er[k]! + s * e;
      const Ei = ei[k]! + w * e;
      const Hr = hr[k]! + s * h;
      const Hi = hi[k]! + w * h;
      const yr = g + s * c;
      const yi = w * c;
      const Sr = Er + Hr + yr;
      const Si = Ei + Hi + yi;
      const size = Sr * Sr + Si * Si;
      const inverse = size > 0 ? 1 / size : 0;
      const xr = Sr * inverse;
      const xi = -Si * inverse;
      const qr = yr * xr - yi * xi;
      const qi = yr * xi + yi * xr;
      const ur = Er * xr - Ei * xi;
      const ui = Er * xi + Ei * xr;
      pr[k] = pr[k]! + ur * Hr - ui * Hi;
      pi[k] = pi[k]! + ur * Hi + ui * Hr;
      er[k] = qr * Er - qi * Ei;
      ei[k] = qr * Ei + qi * Er;
      hr[k] = qr * Hr - qi * Hi;
      hi[k] = qr * Hi + qi * Hr;
      if (kept !== null) {
        const at = ((i + 1) * block + k) * 6;
        kept[at] = ur;
        kept[at + 1] = ui;
        kept[at + 2] = Hr * xr - Hi * xi;
        kept[at + 3] = Hr * xi + Hi * xr;
        kept[at + 4] = qr;
        kept[at + 5] = qi;
      }
    }
  }
  for (let k = 0; k < width; k++) {
    port.Hre[from + k] = hr[k]! + a[k]! * electrodeToTap_F;
    port.Him[from + k] = hi[k]! + b[k]! * electrodeToTap_F;
    port.Ere[from + k] = er[k]!;
    port.Eim[from + k] = ei[k]!;
    port.Pre[from + k] = pr[k]!;
    port.Pim[from + k] = pi[k]!;
  }
}

/** One value a frequency of the block: s, E and H of the node in hand, P so far. */
function state() {
  const make = () => new Float64Array(block);
  return { a: make(), b: make(), er: make(), ei: make(), hr: make(), hi: make(), pr: make(), pi: make() };
}

export function conductances(network: LadderNetwork): Float64Array {
  return network.resistance_ohm.map(conductance);
}

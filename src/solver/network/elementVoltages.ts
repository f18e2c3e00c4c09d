import type { LadderNetwork, Reference } from "./ladderNetwork.ts";
import { type LvSide, lvSide } from "./lvSide.ts";
import { angular } from "./sweep.ts";
import { block, conductances, eliminate, type Shares, type TapTwoPort } from "./tapTwoPort.ts";
import { electrodeShare, transfer } from "./transfer.ts";

/** Amplitude of each element's voltage and of the tap's at each frequency, V. */
export interface ElementVoltages {
  readonly elementVoltage_V: number[][];
  readonly tapVoltage_V: number[];
}

/**
 * Way back up from the tap without a difference of equals: with the shares of node i's own sum S (all above it eliminated),
 * v_i − v_(i−1) = (H/S) d_(i−1) − (E/S) v_(i−1), d_i = V − v_i = E/S + (y/S) d_(i−1).
 * @param peak_V amplitude at the reference input
 */
export function elementVoltages(
  network: LadderNetwork,
  frequencies_Hz: ArrayLike<number>,
  peak_V: number,
  reference: Reference = "electrode",
): ElementVoltages {
  const { n } = network;
  const sim = angular(frequencies_Hz);
  const sre = new Float64Array(sim.length);
  const elementVoltage_V = Array.from(sim, () => new Array<number>(n).fill(0));
  const tapVoltage_V = new Array<number>(sim.length).fill(0);
  const scales = peaks(network, sre, sim, peak_V, reference);
  climbing(network, sre, sim, (from, width, { values }, tap) => {
    for (let k = 0; k < width; k++) {
      let { vr, vi, dr, di } = tap(k);
      const scale = scales[from + k]!;
      tapVoltage_V[from + k] = Math.sqrt(vr * vr + vi * vi) * scale;
      const out = elementVoltage_V[from + k]!;
      for (let i = 1; i < n; i++) {
        const at = (i * block + k) * 6;
        const er = values[at]!;
        const ei = values[at + 1]!;
        const hr = values[at + 2]!;
        const hi = values[at + 3]!;
        const qr = values[at + 4]!;
        const qi = values[at + 5]!;
        const ur = hr * dr - hi * di - (er * vr - ei * vi);
        const ui = hr * di + hi * dr - (er * vi + ei * vr);
        out[i - 1] = Math.sqrt(ur * ur + ui * ui) * scale;
        const fall = er + qr * dr - qi * di;
        di = ei + qr * di + qi * dr;
        dr = fall;
        vr += ur;
        vi += ui;
      }
      out[n - 1] = Math.sqrt(dr * dr + di * di) * scale;
    }
  });
  return { elementVoltage_V, tapVoltage_V };
}

/** The tap's voltage and what is left of the electrode's above it, for 1 V at the electrode. */
interface Tap {
  readonly vr: number;
  readonly vi: number;
  readonly dr: number;
  readonly di: number;
}

type Climb = (from: number, width: number, shares: Shares, tap: (k: number) => Tap) => void;

/** Eliminates block by block and hands each block's shares to the way back. */
function climbing(network: LadderNetwork, sre: Float64Array, sim: Float64Array, climb: Climb): void {
  const count = sim.length;
  const make = () => new Float64Array(count);
  const port: TapTwoPort = { count, Hre: make(), Him: make(), Ere: make(), Eim: make(), Pre: make(), Pim: make() };
  const side = lvSide(network, sre, sim);
  const G = conductances(network);
  const shares: Shares = { values: new Float64Array(network.n * block * 6) };
  for (let from = 0; from < count; from += block) {
    eliminate(network, G, sre, sim, from, port, shares);
    climb(from, Math.min(block, count - from), shares, (k) => tapOf(port, side, from + k));
  }
}

function tapOf(port: TapTwoPort, side: LvSide, k: number): Tap {
  const hr = port.Hre[k]!;
  const hi = port.Him[k]!;
  const br = side.Lre[k]! + port.Ere[k]!;
  const bi = side.Lim[k]! + port.Eim[k]!;
  const Sr = br + hr;
  const Si = bi + hi;
  const d = Sr * Sr + Si * Si;
  if (d === 0) return { vr: 0, vi: 0, dr: 0, di: 0 };
  return {
    vr: (hr * Sr + hi * Si) / d,
    vi: (hi * Sr - hr * Si) / d,
    dr: (br * Sr + bi * Si) / d,
    di: (bi * Sr - br * Si) / d,
  };
}

/** The electrode's amplitude at every frequency. */
function peaks(
  network: LadderNetwork,
  sre: Float64Array,
  sim: Float64Array,
  peak_V: number,
  reference: Reference,
): Float64Array {
  const size = Math.abs(peak_V);
  if (reference === "electrode") return new Float64Array(sre.length).fill(size);
  const share = electrodeShare(network, transfer(network, sre, sim), sre, sim);
  return share.re.map((re, k) => size * Math.hypot(re, share.im[k]!));
}

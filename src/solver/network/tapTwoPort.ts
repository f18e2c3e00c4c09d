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

export function tapTwoPort(network: LadderNetwork, sre: Float64Array, sim: Float64Array): TapTwoPort {
  const count = sre.length;
  const make = () => new Float64Array(count);
  const port = { count, Hre: make(), Him: make(), Ere: make(), Eim: make(), Pre: make(), Pim: make() };
  const { n, capacitance_F: C, toEarth_F, toElectrode_F, electrodeToTap_F } = network;
  const G = conductances(network);
  for (let k = 0; k < count; k++) {
    const a = sre[k]!;
    const b = sim[k]!;
    // H: to the electrode, E: to earth, of the node in hand; the top element joins node n-1 to the electrode.
    let hr = G[n - 1]! + a * C[n - 1]!;
    let hi = b * C[n - 1]!;
    let er = 0;
    let ei = 0;
    let pr = 0;
    let pi = 0;
    for (let i = n - 2; i >= 0; i--) {
      const e = toEarth_F[i]!;
      const h = toElectrode_F[i]!;
      er += a * e;
      ei += b * e;
      hr += a * h;
      hi += b * h;
      const yr = G[i]! + a * C[i]!;
      const yi = b * C[i]!;
      const Sr = er + hr + yr;
      const Si = ei + hi + yi;
      const inverse = 1 / (Sr * Sr + Si * Si);
      if (inverse === Number.POSITIVE_INFINITY) {
        er = ei = hr = hi = 0;
        continue;
      }
      // t = 1/S scaled; q = y/S
      const qr = (yr * Sr + yi * Si) * inverse;
      const qi = (yi * Sr - yr * Si) * inverse;
      const ur = (er * Sr + ei * Si) * inverse;
      const ui = (ei * Sr - er * Si) * inverse;
      pr += ur * hr - ui * hi;
      pi += ur * hi + ui * hr;
      const er2 = qr * er - qi * ei;
      ei = qr * ei + qi * er;
      er = er2;
      const hr2 = qr * hr - qi * hi;
      hi = qr * hi + qi * hr;
      hr = hr2;
    }
    port.Hre[k] = hr + a * electrodeToTap_F;
    port.Him[k] = hi + b * electrodeToTap_F;
    port.Ere[k] = er;
    port.Eim[k] = ei;
    port.Pre[k] = pr;
    port.Pim[k] = pi;
  }
  return port;
}

export function conductances(network: LadderNetwork): Float64Array {
  return network.resistance_ohm.map(conductance);
}

import type { LadderNetwork } from "./ladderNetwork.ts";
import { conductance } from "./lvSide.ts";

const least_per_s = 1e-40;
const greatest_per_s = 1e40;

/**
 * Slowest natural decay λ, 1/s, that does not ring, of the network left to itself (no source but its capacitance); a line counts as its
 * capacitance. With resistances and capacitances alone it is the smallest generalised eigenvalue of conductances and capacitances, by
 * bisection on the number of negative pivots (Sylvester's law of inertia), to rounding. With an LV inductance the same count holds up to
 * the resonance of the LV branch; beyond, its first change is searched in steps. Every node must have a resistance to earth.
 * null where nothing decays so.
 * @param held the electrode is held by an ideal source instead
 */
export function slowestDecay(network: LadderNetwork, held = false): number | null {
  const chain = instrumentChain(network);
  const changed = (x: number) => negativePivots(network, chain, x, held) > 0;
  const { inductance_H, capacitance_F } = network.lv;
  let low = least_per_s;
  let high = Math.min(greatest_per_s, 1 / Math.sqrt(inductance_H * capacitance_F));
  while (!changed(high)) {
    if (high >= greatest_per_s) return null;
    low = high;
    high *= 1.1;
  }
  for (;;) {
    const middle = Math.sqrt(low) * Math.sqrt(high);
    if (middle <= low || middle >= high || high <= low * (1 + 2 ** -51)) return low;
    if (changed(middle)) high = middle;
    else low = middle;
  }
}

/** A node between instrument and tap: what hangs from it, and the resistance towards the instrument (0: the same node). */
interface ChainNode {
  readonly fromInstrument_ohm: number;
  readonly G: number;
  readonly C: number;
}

/** Instrument, line, cable, tap. */
function instrumentChain(network: LadderNetwork): ChainNode[] {
  const { lv, protector, cable, instrument, seriesProtector } = network;
  const { line } = cable;
  const Rs = seriesProtector.resistance_ohm;
  const atDivider = seriesProtector.at === "divider";
  return [
    {
      fromInstrument_ohm: 0,
      G: conductance(instrument.resistance_ohm) + conductance(instrument.protector.resistance_ohm),
      C: instrument.capacitance_F + instrument.protector.capacitance_F,
    },
    {
      fromInstrument_ohm: atDivider ? 0 : Rs,
      G: line === null ? 0 : conductance(line.terminationAtEnd_ohm),
      C: line === null ? 0 : line.delay_s / line.impedance_ohm,
    },
    { fromInstrument_ohm: line?.seriesAtTap_ohm ?? 0, G: 0, C: cable.capacitance_F },
    {
      fromInstrument_ohm: atDivider ? Rs : 0,
      G: conductance(lv.resistance_ohm) + conductance(protector.resistance_ohm),
      C: protector.capacitance_F,
    },
  ];
}

/** Negative pivots of G − x C, eliminated from the instrument to the electrode by star-mesh steps. */
function negativePivots(network: LadderNetwork, chain: readonly ChainNode[], x: number, held: boolean): number {
  const { n, resistance_ohm, capacitance_F, toEarth_F, toElectrode_F } = network;
  let negative = 0;
  let E = 0;
  for (const { fromInstrument_ohm: R, G, C } of chain) {
    if (R > 0) {
      const S = pivot(E + 1 / R);
      if (S < 0) negative += 1;
      E = E / R / S;
    }
    E += G - x * C;
  }
  const { inductance_H: L, capacitance_F: C2 } = network.lv;
  E -= (x * C2) / (1 + L * C2 * x * x);
  let H = -x * network.electrodeToTap_F;
  let P = 0;
  for (let i = 0; i < n; i++) {
    const y = conductance(resistance_ohm[i]!) - x * capacitance_F[i]!;
    const top = i === n - 1;
    const S = pivot(E + H + y);
    if (S < 0) negative += 1;
    // The top element leads to the electrode itself.
    if (top) H += y;
    P += H * (E / S);
    if (top) break;
    E = y * (E / S) - x * toEarth_F[i]!;
    H = y * (H / S) - x * toElectrode_F[i]!;
  }
  if (held) return negative;
  return P - x * network.source.capacitance_F < 0 ? negative + 1 : negative;
}

/** A pivot that vanishes to the last digit lies on neither side. */
const pivot = (S: number): number => (S === 0 ? Number.MIN_VALUE * 2 ** 60 : S);

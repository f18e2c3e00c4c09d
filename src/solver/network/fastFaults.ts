import type { LadderNetwork } from "./ladderNetwork.ts";
import { atEdge, capacitive, element, type Leading, none, passed, plus, resistive, shared } from "./leadingPower.ts";
import { conductance } from "./lvSide.ts";

/** Output over the height of an ideal step at the electrode, at t = 0+, of the network and of every single fault in it. */
export interface FastFaults {
  readonly normal: number;
  /** n values each, tap first. */
  readonly elementOpen: readonly number[];
  readonly elementShort: readonly number[];
  readonly lvOpen: number;
  readonly lvShort: number;
  readonly instrumentOpen: number;
}

/** A node with one side of the string eliminated: E to earth, H to the electrode. */
interface Node {
  readonly E: Leading;
  readonly H: Leading;
}

/** The same, and the output as α·v + β of the node's voltage v and the electrode's, 1. */
interface NodeAbove extends Node {
  readonly alpha: Leading;
  readonly beta: Leading;
}

/**
 * One elimination from the electrode down and one from the tap up, in leading powers of s; each fault joins the two halves anew.
 * A line keeps the instant from the instrument: all 0.
 */
export function fastFaults(network: LadderNetwork): FastFaults {
  const { n } = network;
  if (network.cable.line !== null) {
    const zeros = new Array<number>(n).fill(0);
    return { normal: 0, elementOpen: zeros, elementShort: zeros, lvOpen: 0, lvShort: 0, instrumentOpen: 0 };
  }
  const from = descend(network);
  const up = climb(network);
  const withSide = (changed: LadderNetwork) => joined(tapNode(changed), from[0]!);
  const electrode: Node = { E: none, H: { c: 1, p: 2 } };
  return {
    normal: withSide(network),
    elementOpen: up.map((node) => joined(node, { E: none, H: none })),
    elementShort: up.map((node, i) =>
      joined(node, i === n - 1 ? electrode : together(from[i + 1]!, strays(network, i + 1))),
    ),
    lvOpen: withSide({ ...network, lv: { ...network.lv, resistance_ohm: Number.POSITIVE_INFINITY, capacitance_F: 0 } }),
    lvShort: 0,
    instrumentOpen: withSide({
      ...network,
      instrument: { ...network.instrument, resistance_ohm: Number.POSITIVE_INFINITY, capacitance_F: 0 },
    }),
  };
}

const together = (a: Node, b: Node): Node => ({ E: plus(a.E, b.E), H: plus(a.H, b.H) });

/** Output with the lower half `node` and the upper half `rest` meeting in one node. */
function joined(node: NodeAbove, rest: Node): number {
  const { E, H } = together(node, rest);
  return atEdge(plus(passed(shared(H, E), node.alpha, resistive(1)), node.beta));
}

/** Strays of the node above element i (1 … n-1). */
const strays = (network: LadderNetwork, i: number): Node => ({
  E: capacitive(network.toEarth_F[i - 1]!),
  H: capacitive(network.toElectrode_F[i - 1]!),
});

const elementAt = ({ resistance_ohm, capacitance_F }: LadderNetwork, i: number): Leading =>
  element(conductance(resistance_ohm[i]!), capacitance_F[i]!);

/** At each node from the tap (0) to the topmost inner one: all that hangs from its upper element. */
function descend(network: LadderNetwork): Node[] {
  const { n } = network;
  const nodes = new Array<Node>(n);
  nodes[n - 1] = { E: none, H: elementAt(network, n - 1) };
  for (let i = n - 1; i >= 1; i--) {
    const { E, H } = together(nodes[i]!, strays(network, i));
    const y = elementAt(network, i - 1);
    const S = plus(plus(E, H), y);
    nodes[i - 1] = { E: passed(y, E, S), H: passed(y, H, S) };
  }
  return nodes;
}

/** At each node from the tap to the topmost inner one: its own strays and all that stands below. */
function climb(network: LadderNetwork): NodeAbove[] {
  const nodes = [tapNode(network)];
  for (let i = 1; i < network.n; i++) {
    const { E, H, alpha, beta } = nodes[i - 1]!;
    const y = elementAt(network, i - 1);
    const S = plus(plus(E, H), y);
    nodes.push({
      ...together({ E: passed(y, E, S), H: passed(y, H, S) }, strays(network, i)),
      alpha: atInstant(passed(y, alpha, S)),
      beta: plus(beta, atInstant(passed(H, alpha, S))),
    });
  }
  return nodes;
}

/** Shares of a lower power than the step have no part in t = 0+. */
const atInstant = (share: Leading): Leading => (share.p < 0 ? none : share);

/** The tap with everything from it to the instrument; behind its inductance the LV capacitor does not answer at once. */
function tapNode(network: LadderNetwork): NodeAbove {
  const { lv, protector, cable, instrument, seriesProtector } = network;
  const atDivider = seriesProtector.at === "divider";
  const cableC = capacitive(cable.capacitance_F);
  const end = element(
    conductance(instrument.resistance_ohm) + conductance(instrument.protector.resistance_ohm),
    instrument.capacitance_F + instrument.protector.capacitance_F,
  );
  let y = atDivider ? plus(end, cableC) : end;
  let share = resistive(1);
  if (seriesProtector.resistance_ohm > 0) {
    const g = resistive(1 / seriesProtector.resistance_ohm);
    share = atInstant(shared(g, y));
    y = passed(g, y, plus(g, y));
  }
  const lvArm =
    lv.inductance_H > 0 && lv.capacitance_F > 0
      ? plus(resistive(conductance(lv.resistance_ohm)), { c: 1 / lv.inductance_H, p: -1 })
      : element(conductance(lv.resistance_ohm), lv.capacitance_F);
  const shunts = plus(lvArm, element(conductance(protector.resistance_ohm), protector.capacitance_F));
  return {
    E: plus(plus(y, shunts), atDivider ? none : cableC),
    H: capacitive(network.electrodeToTap_F),
    alpha: share,
    beta: none,
  };
}

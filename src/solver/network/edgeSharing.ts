import { elementVoltages } from "./elementVoltages.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";
import { conductance } from "./lvSide.ts";

/** High enough that every capacitance outweighs every conductance by twenty decades: the instant of the edge. */
const instant_Hz = 1e30;

/** Shares of an ideal edge at the electrode at its instant: each element's, tap first, and the tap's. */
export interface EdgeSharing {
  readonly element: readonly number[];
  readonly tap: number;
}

/**
 * At that instant a line is its impedance. The LV capacitors count without their inductance: it lifts the tap for a moment, which
 * hardly matters to the string. Where a node has no capacitance at all its resistors share.
 */
export function edgeSharing(network: LadderNetwork): EdgeSharing {
  const { cable, lv, protector } = network;
  const { line } = cable;
  const wave = line === null ? 0 : 1 / (line.impedance_ohm + line.seriesAtTap_ohm);
  const bare: LadderNetwork = {
    ...network,
    lv: { ...lv, inductance_H: 0 },
    cable: { ...cable, line: null },
    protector: { ...protector, resistance_ohm: 1 / (conductance(protector.resistance_ohm) + wave) },
  };
  const { elementVoltage_V, tapVoltage_V } = elementVoltages(bare, [instant_Hz], 1);
  return { element: elementVoltage_V[0]!, tap: tapVoltage_V[0]! };
}

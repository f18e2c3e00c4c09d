import { earthed } from "./dcSolution.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";
import type { DcAnswer } from "./networkForm.ts";

/**
 * An element without resistance blocks dc: no current, so nothing stands across the others; what shares the voltage among several
 * such elements, or holds the tap when nothing leads from it to earth, does not exist.
 */
export function blockedDc(network: LadderNetwork, voltage: number): DcAnswer {
  const blocks = Array.from(network.resistance_ohm, (R) => !Number.isFinite(R));
  const held = earthed(network) ? 0 : null;
  const alone = held !== null && blocks.filter(Boolean).length === 1;
  return {
    scaleFactor: null,
    scaleFactorFromSource: null,
    inputResistance_ohm: null,
    electrodeVoltage_V: voltage,
    tapVoltage_V: held,
    outputVoltage_V: held,
    current_A: 0,
    elementVoltage_V: blocks.map((each) => (each ? (alone ? voltage : null) : 0)),
    elementPower_W: blocks.map(() => 0),
    lvPower_W: 0,
  };
}

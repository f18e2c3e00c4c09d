import type { LadderNetwork } from "./ladderNetwork.ts";
import { lvShunts } from "./lvArm.ts";

/** Steady dc with an ideal source at the electrode; null where an element without resistance blocks dc. */
export interface DcSolution {
  readonly scaleFactor: number;
  /** Infinity where nothing leads from the tap to earth: no current, and the tap at the whole voltage. */
  readonly inputResistance_ohm: number;
  readonly tapVoltage_V: number;
  readonly outputVoltage_V: number;
  readonly current_A: number;
  readonly elementVoltage_V: number[];
  readonly elementPower_W: number[];
  /** In the LV resistor alone. */
  readonly lvPower_W: number;
}

/** Series sums from the tap up; F = (1 + R1/R2p)·(1 + Rs/Rm), exact. */
export function dcSolution(network: LadderNetwork, voltage: number): DcSolution | null {
  const { tapG, Rs, farG } = lvShunts(network);
  const R1 = network.resistance_ohm.reduce((sum, R) => sum + R, 0);
  const G = tapG + (farG === 0 ? 0 : 1 / (Rs + 1 / farG));
  if (!Number.isFinite(R1)) return null;
  const scaleFactor = (1 + R1 * G) * (1 + Rs * farG);
  const inputResistance_ohm = R1 + 1 / G;
  const current_A = voltage / inputResistance_ohm;
  const tapVoltage_V = voltage / (1 + R1 * G);
  const elementVoltage_V = Array.from(network.resistance_ohm, (R) => current_A * R);
  return {
    scaleFactor,
    inputResistance_ohm,
    tapVoltage_V,
    outputVoltage_V: voltage / scaleFactor,
    current_A,
    elementVoltage_V,
    elementPower_W: Array.from(network.resistance_ohm, (R) => current_A * current_A * R),
    lvPower_W: Number.isFinite(network.lv.resistance_ohm) ? tapVoltage_V ** 2 / network.lv.resistance_ohm : 0,
  };
}

import type { LadderNetwork, Reference } from "./ladderNetwork.ts";
import { lvSide } from "./lvSide.ts";

/** Steady dc of a network whose string passes it. */
export interface DcSolution {
  /** Electrode over output. */
  readonly scaleFactor: number;
  readonly scaleFactorFromSource: number;
  /** Infinity where nothing leads from the tap to earth: no current, and the tap at the whole voltage. */
  readonly inputResistance_ohm: number;
  readonly electrodeVoltage_V: number;
  readonly tapVoltage_V: number;
  /** Across the instrument. */
  readonly outputVoltage_V: number;
  readonly current_A: number;
  readonly elementVoltage_V: number[];
  readonly elementPower_W: number[];
  /** In the LV resistor alone. */
  readonly lvPower_W: number;
}

const atDc = new Float64Array(1);

/** Series sums from the tap up: F = (1 + R1 G)/T with G and T of the LV side at dc, exact. null: an element blocks dc. */
export function dcSolution(network: LadderNetwork, voltage: number): DcSolution | null {
  const R1 = network.resistance_ohm.reduce((sum, R) => sum + R, 0);
  if (!Number.isFinite(R1)) return null;
  const side = lvSide(network, atDc, atDc);
  const G = side.Lre[0]!;
  const ahead = network.source.resistance_ohm + network.source.damping_ohm;
  const scaleFactor = (1 + R1 * G) / side.Tre[0]!;
  const inputConductance = G / (1 + R1 * G);
  const current_A = (voltage * G) / (1 + (R1 + ahead) * G);
  const electrodeVoltage_V = voltage / (1 + ahead * inputConductance);
  const tapVoltage_V = voltage / (1 + (R1 + ahead) * G);
  return {
    scaleFactor,
    scaleFactorFromSource: scaleFactor * (1 + ahead * inputConductance),
    inputResistance_ohm: R1 + 1 / G,
    electrodeVoltage_V,
    tapVoltage_V,
    outputVoltage_V: tapVoltage_V * side.Tre[0]!,
    current_A,
    elementVoltage_V: Array.from(network.resistance_ohm, (R) => current_A * R),
    elementPower_W: Array.from(network.resistance_ohm, (R) => current_A * current_A * R),
    lvPower_W: Number.isFinite(network.lv.resistance_ohm) ? tapVoltage_V ** 2 / network.lv.resistance_ohm : 0,
  };
}

/** What a response is normalised by; null where dc does not pass. */
export function scaleFactorOf(network: LadderNetwork, reference: Reference): number | null {
  const dc = dcSolution(network, 1);
  if (dc === null) return null;
  return reference === "source" ? dc.scaleFactorFromSource : dc.scaleFactor;
}

/** Whether a resistance leads from the tap to earth. */
export const earthed = (network: LadderNetwork): boolean => lvSide(network, atDc, atDc).Lre[0]! > 0;

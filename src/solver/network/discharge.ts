import { dcSolution } from "./dcSolution.ts";
import { DischargeCurve } from "./dischargeCurve.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";
import type { DischargeAnswer } from "./networkForm.ts";
import { storedEnergy } from "./storedEnergy.ts";

/**
 * At steady dc the ideal source leaves with all that stands between it and the electrode; its capacitance stays. The time until the
 * electrode stays below the threshold, the energy of every capacitor at that instant, and the slowest time constant of all that is left.
 * The time is null where the electrode never gets there: no path to earth. A threshold not below the standing voltage: 0.
 * @param threshold_V above 0
 */
export function discharge(network: LadderNetwork, voltage_V: number, threshold_V: number): DischargeAnswer {
  const dc = dcSolution(network, voltage_V);
  const energy_J = storedEnergy(network, voltage_V);
  const standing_V = Math.abs(dc?.electrodeVoltage_V ?? voltage_V);
  const below = standing_V <= threshold_V;
  if (dc === null || !Number.isFinite(dc.inputResistance_ohm))
    return { time_s: below ? 0 : null, energy_J, slowestTimeConstant_s: null };
  const curve = new DischargeCurve(network, dc.inputResistance_ohm);
  return {
    time_s: below ? 0 : curve.timeTo(Math.log(threshold_V / standing_V)),
    energy_J,
    slowestTimeConstant_s: curve.slowest_per_s === null ? null : 1 / curve.slowest_per_s,
  };
}

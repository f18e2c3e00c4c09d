import { blockedDc } from "./blockedDc.ts";
import { type DcSolution, dcSolution } from "./dcSolution.ts";
import { type HeatedString, heatedString, reachedFromCold } from "./heatedString.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";
import { lvSide } from "./lvSide.ts";
import type { HeatAnswer, HeatAsk } from "./networkForm.ts";

/**
 * Steady state with every resistance at its own temperature and voltage, R = R0 (1 + α (ΔT_ambient + P Rth) + k_v |V|), the LV resistor
 * too, the ideal source held behind its resistance. It is the state reached while the source rises slowly from zero; where that branch
 * turns back before the full voltage (thermal runaway), or where α and k_v leave no resistance above zero, there is none: null.
 * A string that blocks dc stays cold: resistances at ambient temperature, no scale factor.
 */
export function selfHeating(network: LadderNetwork, voltage_V: number, ask: HeatAsk): HeatAnswer | null {
  const string = heatedString(network, ask);
  const cold = dcSolution(network, voltage_V);
  if (string === null) return null;
  if (cold === null) return blocked(network, string, voltage_V);
  const state = reachedFromCold(string, Math.abs(voltage_V));
  if (state === null) return null;
  const hot: LadderNetwork = {
    ...network,
    resistance_ohm: state.resistance_ohm,
    lv: { ...network.lv, resistance_ohm: state.lvResistance_ohm },
  };
  const dc = dcSolution(hot, voltage_V)!;
  return {
    scaleFactor: dc.scaleFactor,
    relativeShift: shift(network, hot, dc, ask),
    resistance_ohm: Array.from(state.resistance_ohm),
    lvResistance_ohm: finite(state.lvResistance_ohm),
    elementVoltage_V: dc.elementVoltage_V,
    elementPower_W: dc.elementPower_W,
    temperatureRise_K: dc.elementPower_W.map((P, i) => P * ask.thermalResistance_K_per_W[i]!),
  };
}

const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);
const atDc = new Float64Array(1);

/**
 * F'/F − 1 from the relative changes δ = α (ΔT_ambient + P Rth) + k_v |V| themselves, the output's share of the tap being the same:
 * (Σ R0 δ·G' + R1 ΔG)/(1 + R1 G) with ΔG = −δ/R of the LV resistor.
 */
function shift(cold: LadderNetwork, hot: LadderNetwork, dc: DcSolution, ask: HeatAsk): number {
  const warmed = (alpha: number, P: number, Rth: number, kv: number, V: number) =>
    alpha * (ask.ambientRise_K + P * Rth) + kv * Math.abs(V);
  const G = lvSide(cold, atDc, atDc).Lre[0]!;
  const R1 = cold.resistance_ohm.reduce((sum, R) => sum + R, 0);
  const more = cold.resistance_ohm.reduce((sum, R, i) => {
    const [P, V] = [dc.elementPower_W[i]!, dc.elementVoltage_V[i]!];
    const Rth = ask.thermalResistance_K_per_W[i]!;
    return sum + R * warmed(ask.temperatureCoefficient_per_K[i]!, P, Rth, ask.voltageCoefficient_per_V[i]!, V);
  }, 0);
  const lv = warmed(
    ask.lvTemperatureCoefficient_per_K,
    dc.lvPower_W,
    ask.lvThermalResistance_K_per_W,
    ask.lvVoltageCoefficient_per_V,
    dc.tapVoltage_V,
  );
  const moreG = -lv / hot.lv.resistance_ohm;
  return (more * (G + moreG) + R1 * moreG) / (1 + R1 * G);
}

/** No current: nothing warms but by the surroundings. */
function blocked(network: LadderNetwork, string: HeatedString, voltage: number): HeatAnswer {
  const { elementVoltage_V, elementPower_W } = blockedDc(network, voltage);
  return {
    scaleFactor: null,
    relativeShift: null,
    resistance_ohm: Array.from(string.cold_ohm, finite),
    lvResistance_ohm: finite(string.lvCold_ohm),
    elementVoltage_V,
    elementPower_W,
    temperatureRise_K: elementPower_W,
  };
}

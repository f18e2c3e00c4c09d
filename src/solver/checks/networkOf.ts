import { idealSource, type LadderNetwork } from "../network/ladderNetwork.ts";
import type { Judging } from "./judging.ts";
import {
  capacitanceOf,
  fixedOf,
  isResistive,
  leakageConductance,
  protectorCapacitance,
  seriesAt,
  seriesResistance,
  trimOf,
} from "./lvArm.ts";
import type { StringCapacitance } from "./stringCapacitance.ts";

/** The design as the linear ladder of the network room: equal strings in parallel are one string of p-fold admittance. */
export function networkOf(j: Judging, string: StringCapacitance): LadderNetwork {
  const { design, instrument } = j;
  const { elements, strings } = design.hvArm;
  const branches = design.lvArm.branches;
  const conductance = branches
    .filter(isResistive)
    .reduce((sum, b) => sum + 1 / (fixedOf(b.series) + trimOf(b.series)), 0);
  const leakage = leakageConductance(j);
  return {
    n: elements.length,
    resistance_ohm: Float64Array.from(elements, (element) => element.resistance_ohm / strings),
    capacitance_F: Float64Array.from(string.element_F),
    toEarth_F: Float64Array.from(string.strays.toEarth_F),
    toElectrode_F: Float64Array.from(string.strays.toElectrode_F),
    electrodeToTap_F: string.strays.electrodeToTap_F,
    lv: {
      resistance_ohm: conductance === 0 ? Number.POSITIVE_INFINITY : 1 / conductance,
      capacitance_F: branches.reduce((sum, branch) => sum + capacitanceOf(branch), 0),
      inductance_H: 0,
    },
    protector: {
      resistance_ohm: leakage === 0 ? Number.POSITIVE_INFINITY : 1 / leakage,
      // The tap's own stray to earth lies beside the limiting parts.
      capacitance_F: protectorCapacitance(j, "divider") + string.strays.tapToEarth_F,
    },
    cable: { capacitance_F: instrument.cable.length_m * instrument.cable.capacitance_F_per_m, line: null },
    instrument: {
      resistance_ohm: instrument.resistance_ohm,
      capacitance_F: instrument.capacitance_F,
      protector: {
        resistance_ohm: Number.POSITIVE_INFINITY,
        capacitance_F: protectorCapacitance(j, "instrument"),
      },
    },
    seriesProtector: { resistance_ohm: seriesResistance(j), at: seriesAt(j) },
    source: idealSource,
  };
}

import type { Cable, Instrument } from "../job/instrument.ts";
import type { LadderNetwork, Line } from "../network/ladderNetwork.ts";
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
export function networkOf(j: Judging, string: StringCapacitance, instrument: Instrument = j.instrument): LadderNetwork {
  const { design } = j;
  const { source } = j.document.brief;
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
      inductance_H: design.lvArm.inductance_H,
    },
    protector: {
      resistance_ohm: leakage === 0 ? Number.POSITIVE_INFINITY : 1 / leakage,
      // The tap's own stray to earth lies beside the limiting parts.
      capacitance_F: protectorCapacitance(j, "divider") + string.strays.tapToEarth_F,
    },
    cable: { capacitance_F: lumped_F(instrument.cable), line: lineOf(instrument.cable) },
    instrument: {
      resistance_ohm: instrument.resistance_ohm,
      capacitance_F: instrument.capacitance_F,
      protector: {
        resistance_ohm: Number.POSITIVE_INFINITY,
        capacitance_F: protectorCapacitance(j, "instrument"),
      },
    },
    seriesProtector: { resistance_ohm: seriesResistance(j), at: seriesAt(j) },
    source: {
      resistance_ohm: source.resistance_ohm,
      capacitance_F: 0,
      atTerminals_F: source.capacitance_F,
      inductance_H: design.lead.inductance_H,
      damping_ohm: design.lead.damping_ohm,
    },
  };
}

const lumped_F = (cable: Cable): number => (lineOf(cable) === null ? cable.length_m * cable.capacitance_F_per_m : 0);

/** A cable of no length is none. */
function lineOf({ end, length_m, impedance_ohm, delay_s_per_m }: Cable): Line | null {
  if (end === "lumped") return null;
  if (length_m === 0 && end === "open") return null;
  return {
    impedance_ohm,
    delay_s: Math.max(length_m, shortest_m) * delay_s_per_m,
    seriesAtTap_ohm: end === "matchedAtTap" ? impedance_ohm : 0,
    terminationAtEnd_ohm: end === "terminated" ? impedance_ohm : Number.POSITIVE_INFINITY,
  };
}

/** Its resistors stay where a line has shrunk to nothing. */
const shortest_m = 1e-6;

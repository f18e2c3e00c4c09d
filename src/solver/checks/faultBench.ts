import { type CapacitiveTwoPort, capacitiveLadder } from "./capacitiveLadder.ts";
import type { Judging } from "./judging.ts";
import { capacitanceOf, fixedOf, isResistive, leakageConductance, protectorCapacitance, trimOf } from "./lvArm.ts";
import type { StringCapacitance } from "./stringCapacitance.ts";
import { tapLoad } from "./tapLoad.ts";

/** What the faults of one design are computed from, gathered once. */
export interface FaultBench {
  readonly V: number;
  readonly R1: number;
  readonly n: number;
  readonly branches_ohm: readonly number[];
  readonly branchNames: readonly string[];
  readonly capacitors_F: readonly number[];
  readonly capacitorNames: readonly string[];
  readonly cable_F: number;
  readonly string: StringCapacitance;
}

/** What every fault is computed from, gathered once: needs the figures of string, LV arm and loading on the sheet. */
export function faultBench(j: Judging, string: StringCapacitance): FaultBench {
  const { design, instrument, sheet } = j;
  const resistive = design.lvArm.branches.filter(isResistive);
  const capacitive = design.lvArm.branches.filter((branch) => !isResistive(branch) && capacitanceOf(branch) > 0);
  return {
    V: sheet.number("working.greatest_Vpeak") as number,
    R1: sheet.number("hvArm.resistance_ohm") as number,
    n: design.hvArm.elements.length,
    branches_ohm: resistive.map((branch) => fixedOf(branch.series) + trimOf(branch.series)),
    branchNames: resistive.map((branch) => branch.name),
    capacitors_F: capacitive.map(capacitanceOf),
    capacitorNames: capacitive.map((branch) => branch.name),
    cable_F: instrument.cable.length_m * instrument.cable.capacitance_F_per_m,
    string,
  };
}

/**
 * dc at the instrument with these LV branches left; `unplugged` takes the instrument away and looks at the tap.
 * Leakage of the protectors is left out: stated as the most there may be, it would hold down a voltage that nothing holds.
 */
export function dcOutput(
  j: Judging,
  bench: FaultBench,
  branches: readonly number[],
  R1 = bench.R1,
  unplugged = false,
): number {
  const { series_ohm: Rs, input_ohm: Rm, shunt_S } = tapLoad(j);
  const termination = shunt_S - leakageConductance(j);
  const G = branches.reduce((sum, R) => sum + 1 / R, 0) + (unplugged ? 0 : termination + 1 / (Rs + Rm));
  if (G === 0) return bench.V;
  const tap = bench.V / (1 + R1 * G);
  return unplugged ? tap : (tap * Rm) / (Rs + Rm);
}

/** Instant of an edge at the tap with these LV capacitors left. */
export function fastOutput(
  j: Judging,
  bench: FaultBench,
  capacitors: readonly number[],
  twoPort = bench.string.twoPort,
  unplugged = false,
) {
  const fixed = unplugged
    ? protectorCapacitance(j, "divider")
    : bench.cable_F +
      j.instrument.capacitance_F +
      protectorCapacitance(j, "divider") +
      protectorCapacitance(j, "instrument");
  const total = capacitors.reduce((sum, C) => sum + C, fixed) + twoPort.tap_F;
  return total === 0 ? 0 : (bench.V * twoPort.transfer_F) / total;
}

/** Voltage of the element that bears most when `without` Ω of the string are gone. */
export function greatestElement(j: Judging, bench: FaultBench, gone: number): number {
  const values = j.design.hvArm.elements.map((element, i) => (i === gone ? 0 : element.resistance_ohm));
  const R1 = values.reduce((sum, R) => sum + R, 0) / j.design.hvArm.strings;
  return R1 === 0 ? bench.V : (bench.V * Math.max(...values)) / (R1 * j.design.hvArm.strings);
}

/** The capacitive ladder with one element a wire: its two ends are one node, their strays add. */
export function shortedLadder({ element_F, strays }: StringCapacitance, at: number): CapacitiveTwoPort {
  const last = element_F.length - 1;
  const merge = (list: readonly number[]) => {
    if (at === 0) return list.slice(1);
    if (at === last) return list.slice(0, -1);
    return [...list.slice(0, at - 1), (list[at - 1] ?? 0) + (list[at] ?? 0), ...list.slice(at + 1)];
  };
  const left = element_F.filter((_, i) => i !== at);
  const toTap = strays.electrodeToTap_F + (at === 0 ? (strays.toElectrode_F[0] ?? 0) : 0);
  if (left.length === 0) return { transfer_F: toTap, tap_F: toTap, electrode_F: toTap, residual: 0 };
  const ladder = capacitiveLadder(left, merge(strays.toEarth_F), merge(strays.toElectrode_F), toTap);
  return at === 0 ? { ...ladder, tap_F: ladder.tap_F + (strays.toEarth_F[0] ?? 0) } : ladder;
}

import type { Level } from "../standards/finding.ts";
import type { Solution } from "../standards/formula.ts";
import { computedHere, practice, type Source } from "../standards/source.ts";
import { type CapacitiveTwoPort, capacitiveLadder } from "./capacitiveLadder.ts";
import { type Judging, plainFinding } from "./judging.ts";
import {
  capacitanceOf,
  fixedOf,
  isResistive,
  leakageConductance,
  protectorCapacitance,
  seriesResistance,
  trimOf,
} from "./lvArm.ts";
import type { Show } from "./show.ts";
import type { StringCapacitance } from "./stringCapacitance.ts";

/** One fault: what the instrument sees at dc and at the instant of an edge, side by side, at the greatest peak. */
export interface FaultRow {
  readonly id: string;
  readonly name: string;
  /** Series position 1 … n, or 0. */
  readonly element: number;
  /** false: more than one part would have to fail at once; shown, not counted as the worst single fault. */
  readonly single: boolean;
  readonly output_V: number;
  readonly fastOutput_V: number;
  readonly greatestElementVoltage_V: number;
  /** dc output over its normal value. */
  readonly outputShare: number;
  readonly readsZeroWhileLive: boolean;
  readonly level: Level;
  readonly sentence: string;
}

export const faultRecord: Solution = {
  id: "faults.single",
  title: "Voltage at the instrument under a single fault",
  statement: "dc: V R'_2p / (R_1 + R'_2p); edge: V C_12 / (C_tap + C'_2), with the faulty part taken out or bridged",
  method: "Series and parallel sums at dc; the capacitive ladder with its strays at the instant of an edge.",
  holds: "Protectors are not counted on to conduct.",
  source: computedHere("the divider re-solved with one part open or shorted"),
  residualBound: 0,
};

/**
 * Accessible limits in normal condition (the stricter of the editions): above the voltage a part is hazardous live when the
 * current through the string or the charge behind it exceeds its own limit too.
 */
const accessible: { dc_V: number; current_A: number; charge_C: number; source: Source } = {
  dc_V: 60,
  current_A: 2e-3,
  charge_C: 45e-6,
  source: {
    title: "IEC 61010-1",
    edition: "ed. 3.1 (2010 + AMD1:2016)",
    clause: "6.3, accessible parts",
    status: "from memory",
  },
};

interface Bench {
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

export function faults(j: Judging, string: StringCapacitance, show: Show): FaultRow[] {
  const bench = benchOf(j, string);
  const normal = dcOutput(j, bench, bench.branches_ohm);
  const rows = [
    ...elementFaults(j, bench),
    ...lvResistorFaults(j, bench),
    ...lvCapacitorFaults(j, bench),
    ...plugFaults(j, bench),
  ].map((row) => judged(j, row, normal, bench, show));
  const worst = worstFault(rows);
  j.sheet.solved(
    "fault.worstOutput_V",
    faultRecord,
    worst === null ? null : seen(worst),
    { V: "working.greatest_Vpeak" },
    0,
  );
  faultFindings(j, rows, worst, show);
  return rows;
}

const seen = (row: FaultRow) => Math.max(Math.abs(row.output_V), Math.abs(row.fastOutput_V));

export function worstFault(rows: readonly FaultRow[]): FaultRow | null {
  return rows.reduce<FaultRow | null>(
    (worst, row) => (row.single && row.id !== "unplugged" && (worst === null || seen(row) > seen(worst)) ? row : worst),
    null,
  );
}

function benchOf(j: Judging, string: StringCapacitance): Bench {
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

type Raw = Omit<FaultRow, "level" | "sentence" | "outputShare" | "readsZeroWhileLive">;

/** dc at the instrument with these LV branches left; `unplugged` takes the instrument away and looks at the tap. */
function dcOutput(j: Judging, bench: Bench, branches: readonly number[], R1 = bench.R1, unplugged = false): number {
  const Rs = seriesResistance(j);
  const Rm = j.instrument.resistance_ohm;
  const G = branches.reduce((sum, R) => sum + 1 / R, leakageConductance(j)) + (unplugged ? 0 : 1 / (Rs + Rm));
  if (G === 0) return bench.V;
  const tap = bench.V / (1 + R1 * G);
  return unplugged ? tap : (tap * Rm) / (Rs + Rm);
}

/** Instant of an edge at the tap with these LV capacitors left. */
function fastOutput(
  j: Judging,
  bench: Bench,
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
function greatestElement(j: Judging, bench: Bench, gone: number): number {
  const values = j.design.hvArm.elements.map((element, i) => (i === gone ? 0 : element.resistance_ohm));
  const R1 = values.reduce((sum, R) => sum + R, 0) / j.design.hvArm.strings;
  return R1 === 0 ? bench.V : (bench.V * Math.max(...values)) / (R1 * j.design.hvArm.strings);
}

function elementFaults(j: Judging, bench: Bench): Raw[] {
  const { elements, strings } = j.design.hvArm;
  const largest = elements.reduce(
    (at, element, i) => (element.resistance_ohm > elements[at]!.resistance_ohm ? i : at),
    0,
  );
  const { element_F, strays } = bench.string;
  const shorted = shortedLadder(bench.string, largest);
  const opened = capacitiveLadder(
    element_F.map((c, i) => (i === largest ? 0 : c)),
    strays.toEarth_F,
    strays.toElectrode_F,
    strays.electrodeToTap_F,
  );
  const short: Raw = {
    id: "elementShort",
    name: `element ${largest + 1} shorted`,
    element: largest + 1,
    single: true,
    output_V: dcOutput(j, bench, bench.branches_ohm, bench.R1 - elements[largest]!.resistance_ohm / strings),
    fastOutput_V: fastOutput(j, bench, bench.capacitors_F, shorted),
    greatestElementVoltage_V: greatestElement(j, bench, largest),
  };
  const others = strings > 1;
  const open: Raw = {
    id: "elementOpen",
    name: others ? `element ${largest + 1} open in one string` : "any element open",
    element: largest + 1,
    single: true,
    output_V: others ? dcOutput(j, bench, bench.branches_ohm, (bench.R1 * strings) / (strings - 1)) : 0,
    fastOutput_V: fastOutput(j, bench, bench.capacitors_F, others ? bench.string.twoPort : opened),
    greatestElementVoltage_V: bench.V,
  };
  return [short, open];
}

/** The capacitive ladder with one element a wire: its two ends are one node, their strays add. */
function shortedLadder({ element_F, strays }: StringCapacitance, at: number): CapacitiveTwoPort {
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

function lvResistorFaults(j: Judging, bench: Bench): Raw[] {
  const normalElement = greatestElement(j, bench, -1);
  const rows: Raw[] = bench.branches_ohm.map((_, k) => ({
    id: bench.branches_ohm.length === 1 ? "lvOpen" : `lvBranchOpen.${k + 1}`,
    name: bench.branches_ohm.length === 1 ? "the only LV resistor open" : `LV branch ${bench.branchNames[k]} open`,
    element: 0,
    single: true,
    output_V: dcOutput(
      j,
      bench,
      bench.branches_ohm.filter((__, i) => i !== k),
    ),
    fastOutput_V: fastOutput(j, bench, bench.capacitors_F),
    greatestElementVoltage_V: normalElement,
  }));
  const lost = bench.branches_ohm.length > 1 || bench.capacitors_F.length > 0;
  if (lost)
    rows.push({
      id: "lvArmLost",
      name: "whole LV arm lost",
      element: 0,
      single: false,
      output_V: dcOutput(j, bench, []),
      fastOutput_V: fastOutput(j, bench, []),
      greatestElementVoltage_V: normalElement,
    });
  rows.push({
    id: "lvShort",
    name: "LV arm shorted",
    element: 0,
    single: true,
    output_V: 0,
    fastOutput_V: 0,
    greatestElementVoltage_V: normalElement,
  });
  return rows;
}

function lvCapacitorFaults(j: Judging, bench: Bench): Raw[] {
  return bench.capacitors_F.map((_, k) => ({
    id: `lvCapacitorOpen.${k + 1}`,
    name: `LV capacitor ${bench.capacitorNames[k]} open`,
    element: 0,
    single: true,
    output_V: dcOutput(j, bench, bench.branches_ohm),
    fastOutput_V: fastOutput(
      j,
      bench,
      bench.capacitors_F.filter((__, i) => i !== k),
    ),
    greatestElementVoltage_V: greatestElement(j, bench, -1),
  }));
}

function plugFaults(j: Judging, bench: Bench): Raw[] {
  const leaves = j.design.lvArm.stays === "withInstrument";
  return [
    {
      id: "unplugged",
      name: "instrument unplugged: voltage at the plug",
      element: 0,
      single: true,
      output_V: dcOutput(j, bench, leaves ? [] : bench.branches_ohm, bench.R1, true),
      fastOutput_V: fastOutput(j, bench, leaves ? [] : bench.capacitors_F, bench.string.twoPort, true),
      greatestElementVoltage_V: greatestElement(j, bench, -1),
    },
  ];
}

function judged(j: Judging, raw: Raw, normal: number, bench: Bench, show: Show): FaultRow {
  const plug = raw.id === "unplugged";
  const output = Math.max(Math.abs(raw.output_V), Math.abs(raw.fastOutput_V));
  const limit = plug ? accessible.dc_V : j.instrument.greatestInput_Vpeak;
  const over = output > limit;
  const hazardous = plug ? over && hazardousAtPlug(bench, output) : over;
  const readsZero = !plug && raw.output_V < 1e-3 * normal;
  const level: Level = hazardous && raw.single ? "stop" : over || readsZero ? "caution" : "clear";
  const outside = plug
    ? `above ${show(limit, "V")}, but the current through the string and the charge behind it are within the limits for a person`
    : `above the ${show(limit, "V")} it may see`;
  const verdict =
    hazardous && plug
      ? `above the ${show(limit, "V")} that a person may meet`
      : over
        ? outside
        : readsZero
          ? "reads zero while live"
          : `within ${show(limit, "V")}`;
  const where = plug ? "at the plug" : `at ${j.instrument.name}`;
  return {
    ...raw,
    outputShare: normal === 0 ? 0 : raw.output_V / normal,
    readsZeroWhileLive: readsZero,
    level,
    sentence: `${raw.name}: ${show(raw.output_V, "V")} at dc, ${show(raw.fastOutput_V, "V")} on an edge ${where}; ${verdict}.`,
  };
}

function hazardousAtPlug(bench: Bench, voltage: number): boolean {
  const charge = voltage * bench.capacitors_F.reduce((sum, C) => sum + C, bench.string.twoPort.tap_F);
  return bench.V / bench.R1 > accessible.current_A || charge > accessible.charge_C;
}

/** A finding for each single fault that stops; else one clear line with the worst. Also the single LV resistor. */
function faultFindings(j: Judging, rows: readonly FaultRow[], worst: FaultRow | null, show: Show): void {
  const limit = j.instrument.greatestInput_Vpeak;
  for (const row of rows.filter((each) => each.level === "stop")) {
    const plug = row.id === "unplugged";
    plainFinding(j, {
      id: `fault.${row.id}`,
      level: "stop",
      what: row.name,
      actual: seen(row),
      limit: plug ? accessible.dc_V : limit,
      unit: "V",
      sense: "atMost",
      margin: 1 - seen(row) / (plug ? accessible.dc_V : limit),
      reason: `${row.sentence} Split the LV arm so that no single part carries it alone, and limit it at the divider.`,
      source: plug ? accessible.source : faultRecord.source,
      cure: { label: "size again", edits: [], sizeAgain: true },
      path: "fault.worstOutput_V",
    });
  }
  const alone = j.design.lvArm.branches.filter(isResistive).length === 1;
  if (alone && !rows.some((row) => row.id === "lvOpen" && row.level === "stop")) {
    const open = rows.find((row) => row.id === "lvOpen");
    plainFinding(j, {
      id: "lvArm.single",
      level: "caution",
      what: "one LV resistor alone",
      actual: open === undefined ? null : seen(open),
      limit,
      unit: "V",
      sense: "atMost",
      margin: open === undefined ? null : 1 - seen(open) / limit,
      reason: `With this one resistor open the instrument sees ${show(open === undefined ? 0 : seen(open), "V")}. Fit two or three in parallel.`,
      source: practice("no single part may carry the LV arm alone"),
      cure: { label: "size again", edits: [], sizeAgain: true },
    });
  }
  if (j.design.lvArm.branches.filter(isResistive).length === 0) {
    plainFinding(j, {
      id: "lvArm.none",
      level: "stop",
      what: "no LV resistor",
      reason:
        "The instrument alone is the LV arm: unplugged, the full voltage stands at the plug. Fit LV resistors on the divider.",
      source: practice("the LV arm stays with the divider"),
      cure: { label: "size again", edits: [], sizeAgain: true },
    });
  }
  if (worst !== null && seen(worst) <= limit) {
    plainFinding(j, {
      id: "fault.worst",
      level: "clear",
      what: "worst single fault",
      actual: seen(worst),
      limit,
      unit: "V",
      sense: "atMost",
      margin: 1 - seen(worst) / limit,
      reason: worst.sentence,
      source: faultRecord.source,
      path: "fault.worstOutput_V",
    });
  }
}

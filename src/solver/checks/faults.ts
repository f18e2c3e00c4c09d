import type { Level } from "../standards/finding.ts";
import { capacitiveLadder } from "./capacitiveLadder.ts";
import { dcOutput, type FaultBench, fastOutput, faultBench, greatestElement, shortedLadder } from "./faultBench.ts";
import { faultFindings } from "./faultFindings.ts";
import { accessible, type FaultRow, faultRecord, seen, worstFault } from "./faultRow.ts";
import { type Judging, plainFinding } from "./judging.ts";
import type { Show } from "./show.ts";
import type { StringCapacitance } from "./stringCapacitance.ts";

type Raw = Omit<FaultRow, "level" | "sentence" | "outputShare" | "readsZeroWhileLive">;

/** The fault table at the greatest peak: one row a kind of single fault, dc and edge side by side, with its findings. */
export function faults(j: Judging, string: StringCapacitance, show: Show): FaultRow[] {
  const bench = faultBench(j, string);
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
  edgeInUse(j, fastOutput(j, bench, bench.capacitors_F), show);
  return rows;
}

/** An edge as high as the greatest peak, with nothing broken: too little LV capacitance puts it on the instrument. */
function edgeInUse(j: Judging, edge: number, show: Show): void {
  const limit = j.instrument.greatestInput_Vpeak;
  if (edge <= limit) return;
  plainFinding(j, {
    id: "instrument.edge",
    level: "stop",
    what: "voltage at the instrument on an edge",
    actual: edge,
    limit,
    unit: "V",
    sense: "atMost",
    margin: 1 - edge / limit,
    reason: `With nothing broken, an edge of the greatest peak puts ${show(edge, "V")} on ${j.instrument.name}, which may see ${show(limit, "V")}: the LV capacitance is too small for the string's. Switching on, a flash-over or a touched lead is such an edge.`,
    source: faultRecord.source,
    cure: { label: "size again", edits: [], sizeAgain: true },
  });
}

/** Resistance of `strings` equal strings, joined at their ends only, when one of them is `gone` Ω short. */
const withoutOne = (string_ohm: number, gone: number, strings: number): number =>
  1 / (1 / (string_ohm - gone) + (strings - 1) / string_ohm);

function elementFaults(j: Judging, bench: FaultBench): Raw[] {
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
    output_V: dcOutput(
      j,
      bench,
      bench.branches_ohm,
      withoutOne(bench.R1 * strings, elements[largest]!.resistance_ohm, strings),
    ),
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

function lvResistorFaults(j: Judging, bench: FaultBench): Raw[] {
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

function lvCapacitorFaults(j: Judging, bench: FaultBench): Raw[] {
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

function plugFaults(j: Judging, bench: FaultBench): Raw[] {
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

function judged(j: Judging, raw: Raw, normal: number, bench: FaultBench, show: Show): FaultRow {
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

function hazardousAtPlug(bench: FaultBench, voltage: number): boolean {
  const charge = voltage * bench.capacitors_F.reduce((sum, C) => sum + C, bench.string.twoPort.tap_F);
  return bench.V / bench.R1 > accessible.current_A || charge > accessible.charge_C;
}

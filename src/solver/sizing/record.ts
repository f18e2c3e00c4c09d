import { strayFormulas } from "../checks/columnStrays.ts";
import { capacitanceOf } from "../checks/lvArm.ts";
import type { ResistorFamily } from "../job/part.ts";
import { candidateFormulas } from "./candidateFormulas.ts";
import { pitchWith } from "./compensation.ts";
import { bodyRule, compensationFormulas, lvCapacitanceRecord, strayRule } from "./compensationFormulas.ts";
import type { Limits } from "./kind.ts";
import { lvSolutionFormulas } from "./lvSolution.ts";
import type { Candidate } from "./outcome.ts";
import { scaleFactorGivens } from "./scaleFactorBounds.ts";

/** Puts a candidate's figures on the sheet at `candidates.K.…` (K counted from 0), each with its formula, and takes them from there. */
export function recordCandidate(limits: Limits, candidate: Candidate): Candidate {
  const { sheet } = limits.ask.j;
  const at = `candidates.${candidate.rank - 1}`;
  const figure = (key: string) => sheet.number(`${at}.${key}`) as number;
  givens(limits, candidate, at);
  string(limits, at);
  lvArm(limits, at);
  capacitors(limits, candidate, at);
  return {
    ...candidate,
    hvArmResistance_ohm: figure("hvArmResistance_ohm"),
    columnLength_m: figure("columnLength_m"),
    partsUncertainty: figure("partsUncertainty"),
    loading: figure("loading"),
    elementVoltage_Vrms: figure("elementVoltage_Vrms"),
    elementVoltage_Vpeak: figure("elementVoltage_Vpeak"),
    elementDissipation_W: figure("elementDissipation_W"),
  };
}

function givens(limits: Limits, candidate: Candidate, at: string): void {
  const { sheet } = limits.ask.j;
  const { brief } = limits.ask.j.document;
  const family = candidate.parts.find((part) => part.id === candidate.family);
  if (family?.kind !== "resistor") throw new Error(`candidate ${candidate.rank} lacks its own family`);
  sheet.given(`${at}.elements`, candidate.elements);
  sheet.given(`${at}.strings`, candidate.strings);
  sheet.given(`${at}/part/resistance_ohm`, candidate.resistance_ohm);
  sheet.given(`${at}/part/tolerance`, family.tolerance);
  sheet.given(`${at}/part/temperatureCoefficient_per_K`, family.temperatureCoefficient_per_K);
  sheet.given(`${at}/part/voltageCoefficient_per_V`, family.voltageCoefficient_per_V);
  sheet.given(`${at}/part/pitch_m`, pitchOf(candidate, family, sheet.number("insulation.column_m") ?? 0));
  sheet.given("/brief/source/resistance_ohm", brief.source.resistance_ohm);
  sheet.given("/brief/surroundings/ambientSpan_K", brief.surroundings.ambientSpan_K);
  sheet.given(`/instruments/${limits.ask.at}/resistanceSpread`, limits.ask.j.instrument.resistanceSpread);
}

/** Pitch without stretching, m; the stretched one where the column is as long as it is wide. */
function pitchOf(
  { design, parts, elements, columnLength_m }: Candidate,
  family: ResistorFamily,
  need_m: number,
): number {
  const capacitor = parts.find((part) => part.id === design.hvArm.elements[0]?.capacitor);
  const own = family.bodyLength_m + family.leadSpace_m;
  const pitch = capacitor === undefined ? own : pitchWith(own, capacitor.bodyLength_m);
  return Math.max(elements * pitch, need_m) === columnLength_m ? pitch : design.geometry.pitch_m;
}

function string({ ask }: Limits, at: string): void {
  const { sheet } = ask.j;
  const f = candidateFormulas;
  const n = `${at}.elements`;
  const p = `${at}.strings`;
  const Re = `${at}/part/resistance_ohm`;
  const { F, Rm, Rs } = scaleFactorGivens(ask);
  const R1 = `${at}.hvArmResistance_ohm`;
  const Rin = `${at}.inputResistance_ohm`;
  sheet.derive(R1, f.hvArm, { n, Re, p });
  sheet.derive(Rin, f.inputResistance, { R1, F, Rs, Rm });
  const shared = { R1, n, Rin };
  sheet.derive(`${at}.elementVoltage_Vrms`, f.elementVoltage, { V: "working.rms_V", ...shared });
  sheet.derive(`${at}.elementVoltage_Vpeak`, f.elementVoltage, { V: "working.peak_V", ...shared });
  sheet.derive(`${at}.elementGreatest_Vrms`, f.elementVoltage, { V: "working.greatestRms_V", ...shared });
  sheet.derive(`${at}.elementDissipation_W`, f.elementDissipation, { V: `${at}.elementGreatest_Vrms`, Re });
  sheet.derive(`${at}.loading`, f.loading, { Rsrc: "/brief/source/resistance_ohm", Rin });
  sheet.derive(`${at}.columnLength_m`, f.columnLength, { n, pitch: `${at}/part/pitch_m`, need: "insulation.column_m" });
  sheet.derive(`${at}.partsUncertainty`, f.partsUncertainty, {
    t: `${at}/part/tolerance`,
    n,
    p,
    s: "/brief/surroundings/ambientSpan_K",
    tc: `${at}/part/temperatureCoefficient_per_K`,
    kv: `${at}/part/voltageCoefficient_per_V`,
    Ve: `${at}.elementVoltage_Vpeak`,
  });
}

function lvArm({ ask }: Limits, at: string): void {
  const { sheet } = ask.j;
  const f = lvSolutionFormulas;
  const nominal = { ...scaleFactorGivens(ask), R1: `${at}.hvArmResistance_ohm` };
  const ends = { ...nominal, t: `${at}/part/tolerance`, s: `/instruments/${ask.at}/resistanceSpread` };
  sheet.derive(`${at}.lvArmWanted_ohm`, f.nominal, nominal);
  sheet.derive(`${at}.lvArmLeast_ohm`, f.least, ends);
  sheet.derive(`${at}.lvArmGreatest_ohm`, f.greatest, ends);
}

/** The capacitor across each element with what it had to be, and the LV capacitance that matches it. */
function capacitors({ ask }: Limits, { design, parts, family }: Candidate, at: string): void {
  const { sheet } = ask.j;
  const element = design.hvArm.elements[0];
  const resistor = parts.find((part) => part.id === family) as ResistorFamily;
  if (element === undefined || element.capacitor === null) return;
  const given = (key: string, value: number): string => {
    sheet.given(`${at}${key}`, value);
    return `${at}${key}`;
  };
  sheet.given(`${at}.elementCapacitor_F`, element.capacitance_F);
  const Ce = `${at}.strayToEarth_F`;
  sheet.derive(Ce, strayFormulas.toEarth, {
    l: `${at}.columnLength_m`,
    d: given("/geometry/columnDiameter_m", design.geometry.columnDiameter_m),
    h: given("/geometry/footHeight_m", design.geometry.footHeight_m),
  });
  sheet.derive(`${at}.elementCapacitorLeast_F`, compensationFormulas.elementCapacitor, {
    ks: given(".strayRule", strayRule),
    kb: given(".bodyRule", bodyRule),
    Ce,
    n: `${at}.elements`,
    p: `${at}.strings`,
    Cb: given("/part/selfCapacitance_F", resistor.selfCapacitance_F),
  });
  if (design.lvArm.capacitanceBy === "none") return;
  const fitted = design.lvArm.branches.reduce((sum, branch) => sum + capacitanceOf(branch), 0);
  sheet.solved(`${at}.lvCapacitance_F`, lvCapacitanceRecord, fitted, { Ce, C: `${at}.elementCapacitor_F` }, 0);
}

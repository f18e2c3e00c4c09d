import type { Judging } from "../checks/judging.ts";
import { capacitanceOf, protectorCapacitance } from "../checks/lvArm.ts";
import type { LvBranch } from "../job/design.ts";
import { responseFormulas } from "./responseFormulas.ts";

/** What the LV capacitance is made of, in the order it is drawn: path on the sheet and plain name. */
export const lvShares = [
  ["lvArm.share.fixed_F", "fixed"],
  ["lvArm.share.links_F", "links"],
  ["lvArm.share.trimmer_F", "trimmer"],
  ["lvArm.share.cable_F", "cable"],
  ["lvArm.share.instrument_F", "instrument"],
  ["lvArm.share.protectors_F", "protectors"],
] as const;

type Kind = "fixed" | "links" | "trimmer";
const kindOf = (branch: LvBranch): Kind | null =>
  "series" in branch ? null : "trimmer" in branch ? "trimmer" : "link" in branch ? "links" : "fixed";

/**
 * What is fitted, with cable and instrument, and the pole. Writes `lvArm.share.*`, `lvArm.capacitanceFitted_F`,
 * `lvArm.capacitanceTotal_F` and `response.lvPole_Hz`.
 */
export function fittedCapacitance(j: Judging): void {
  const { sheet, design, instrument, document } = j;
  const { branches } = design.lvArm;
  const all = "/design/lvArm/branches/*/capacitance_F";
  sheet.given(all, branches.map(capacitanceOf));
  sheet.derive("lvArm.capacitanceFitted_F", responseFormulas.fitted, { C: all });
  for (const kind of ["fixed", "links", "trimmer"] as const) {
    sheet.given(`${all}:${kind}`, branches.filter((branch) => kindOf(branch) === kind).map(capacitanceOf));
    sheet.derive(`lvArm.share.${kind}_F`, responseFormulas.fitted, { C: `${all}:${kind}` });
  }
  const at = `/instruments/${document.instruments.indexOf(instrument)}`;
  sheet.given(`${at}/cable/length_m`, instrument.cable.length_m);
  sheet.given(`${at}/cable/capacitance_F_per_m`, instrument.cable.capacitance_F_per_m);
  sheet.derive("lvArm.share.cable_F", responseFormulas.cable, {
    length: `${at}/cable/length_m`,
    perMetre: `${at}/cable/capacitance_F_per_m`,
  });
  sheet.given(`${at}/capacitance_F`, instrument.capacitance_F);
  sheet.given(`${at}/capacitance_F:share`, [instrument.capacitance_F]);
  sheet.derive("lvArm.share.instrument_F", responseFormulas.fitted, { C: `${at}/capacitance_F:share` });
  const protectors = [protectorCapacitance(j, "divider"), protectorCapacitance(j, "instrument")];
  sheet.given("/design/protectors:share", protectors);
  sheet.derive("lvArm.share.protectors_F", responseFormulas.fitted, { C: "/design/protectors:share" });
  sheet.derive("lvArm.capacitanceTotal_F", responseFormulas.sum, {
    fitted: "lvArm.capacitanceFitted_F",
    cable: "lvArm.share.cable_F",
    instrument: `${at}/capacitance_F`,
    protectors: "lvArm.share.protectors_F",
  });
  sheet.derive("response.lvPole_Hz", responseFormulas.lvPole, {
    R1: "hvArm.resistance_ohm",
    R2p: "lvArm.withInstrument_ohm",
    C1: "hvArm.effectiveCapacitance_F",
    C2p: "lvArm.capacitanceTotal_F",
  });
}

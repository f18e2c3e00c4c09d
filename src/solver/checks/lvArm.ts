import type { LvBranch, LvSeriesItem } from "../job/design.ts";
import { formula } from "../standards/formula.ts";
import { computedHere, practice, type Source } from "../standards/source.ts";
import { capacitorOf, type Judging, plainFinding, protectorOf } from "./judging.ts";

const ohm = (symbol: string, meaning: string) => ({ symbol, unit: "ohm", meaning });
const iec60384: Source = {
  title: "IEC 60384 series",
  edition: null,
  clause: "class 1 and class 2 ceramic dielectrics",
  status: "from memory",
};

export const lvArmFormulas = {
  branch: formula({
    id: "lvArm.branch",
    title: "Resistance of one LV branch",
    statement: "{=} = {fixed} + {trim}",
    result: ohm("R_b", "branch resistance"),
    inputs: { fixed: ohm("R_fix", "fixed resistors in series"), trim: ohm("R_trim", "rheostat at its setting") },
    holds: "dc; the rheostat's end is tied so that a lifted wiper leaves the whole track in.",
    source: computedHere("series sum"),
    compute: ({ fixed, trim }) => fixed + trim,
  }),
  parallel: formula<never, "branches">({
    id: "lvArm.parallel",
    title: "LV arm resistance, its branches in parallel",
    statement: "1 / {=} = Σ 1 / {branches}",
    result: ohm("R_2", "LV arm resistance fitted"),
    inputs: { branches: ohm("R_b", "branch resistances") },
    arrays: ["branches"],
    holds: "dc; without the instrument and protectors.",
    source: computedHere("parallel sum"),
    compute: ({ branches }) => (branches.length === 0 ? null : 1 / branches.reduce((sum, R) => sum + 1 / R, 0)),
  }),
};

/** Fixed resistance of a branch, ohm. */
export const fixedOf = (series: readonly LvSeriesItem[]): number =>
  series.reduce((sum, item) => sum + ("resistance_ohm" in item ? item.resistance_ohm : 0), 0);

/** Resistance of a branch's rheostats as they are set, ohm. */
export const trimOf = (series: readonly LvSeriesItem[]): number =>
  series.reduce((sum, item) => {
    if (!("rheostat" in item)) return sum;
    const { least_ohm, greatest_ohm, setting } = item.rheostat;
    return sum + least_ohm + setting * (greatest_ohm - least_ohm);
  }, 0);

export type ResistiveBranch = Extract<LvBranch, { series: unknown }>;
/** Whether a branch carries dc. */
export const isResistive = (branch: LvBranch): branch is ResistiveBranch => "series" in branch;

/** Capacitance of a branch as it stands: fixed, a fitted link, a trimmer at its setting; 0 for a resistor branch. */
export function capacitanceOf(branch: LvBranch): number {
  if ("series" in branch) return 0;
  if ("trimmer" in branch) {
    const { least_F, greatest_F, setting } = branch.trimmer;
    return least_F + setting * (greatest_F - least_F);
  }
  if ("link" in branch) return branch.fitted ? branch.capacitance_F : 0;
  return branch.capacitance_F;
}

/** Conductance of the protectors' leakage at the tap or across the instrument, S: leakage over their least strike voltage. */
export function leakageConductance(j: Judging): number {
  return j.design.protectors.reduce((sum, fitted) => {
    const part = protectorOf(j, fitted.part);
    if (part.type === "seriesResistor" || part.leastStrike_V === null) return sum;
    return sum + part.leakage_A / part.leastStrike_V;
  }, 0);
}

/** Capacitance of the protectors at the divider or at the instrument, F. */
export const protectorCapacitance = (j: Judging, at: "divider" | "instrument"): number =>
  j.design.protectors.reduce((sum, fitted) => {
    const part = protectorOf(j, fitted.part);
    return fitted.at === at && part.type !== "seriesResistor" ? sum + part.capacitance_F : sum;
  }, 0);

/** Resistance of the series protectors between tap and instrument, ohm. */
export const seriesResistance = (j: Judging): number =>
  j.design.protectors.reduce((sum, fitted) => {
    const part = protectorOf(j, fitted.part);
    return part.type === "seriesResistor" ? sum + (part.resistance_ohm ?? 0) : sum;
  }, 0);

/** Where the series protectors stand: at the divider, with the cable behind them, as soon as one of them does; that is the slower case. */
export const seriesAt = (j: Judging): "divider" | "instrument" =>
  j.design.protectors.some((fitted) => fitted.at === "divider" && protectorOf(j, fitted.part).type === "seriesResistor")
    ? "divider"
    : "instrument";

/** Writes `lvArm.branch_ohm` and `lvArm.fitted_ohm`. */
export function lvArmResistance(j: Judging): void {
  const branches = j.design.lvArm.branches.filter(isResistive);
  j.sheet.given(
    "/design/lvArm/branches/*/series:fixed",
    branches.map((branch) => fixedOf(branch.series)),
  );
  j.sheet.given(
    "/design/lvArm/branches/*/series:rheostat",
    branches.map((branch) => trimOf(branch.series)),
  );
  j.sheet.deriveEach(
    "lvArm.branch_ohm",
    lvArmFormulas.branch,
    { fixed: "/design/lvArm/branches/*/series:fixed", trim: "/design/lvArm/branches/*/series:rheostat" },
    branches.length,
  );
  j.sheet.derive("lvArm.fitted_ohm", lvArmFormulas.parallel, { branches: "lvArm.branch_ohm" });
}

/** Dielectrics that spoil the scale factor, in either arm, and an LV arm that leaves with the plug. */
export function judgeLvArm(j: Judging): void {
  const { lvArm, hvArm } = j.design;
  const inHv = new Set(hvArm.elements.flatMap((element) => (element.capacitor === null ? [] : [element.capacitor])));
  const inLv = lvArm.branches.flatMap((branch) =>
    "part" in branch && !("trimmer" in branch) && branch.part !== "" ? [branch.part] : [],
  );
  for (const [arm, ids] of [
    ["HV arm", [...inHv]],
    ["LV arm", inLv],
  ] as const) {
    for (const id of new Set(ids)) {
      const family = capacitorOf(j, id);
      if (family.dielectricClass !== "class2" && family.dielectricClass !== "electrolytic") continue;
      plainFinding(j, {
        id: `dielectric.${arm === "HV arm" ? "hvArm" : "lvArm"}`,
        level: "stop",
        what: `dielectric in the ${arm}`,
        reason:
          `${family.name} stands in the ${arm}: a class 2 dielectric loses 20 to 60 % of its capacitance at rated voltage ` +
          "and drifts with temperature and age, so the scale factor would too. Fit class 1 (C0G), film or mica.",
        source: iec60384,
        cure: { label: "size again", edits: [], sizeAgain: true },
      });
    }
  }
  const resistive = lvArm.branches.filter(isResistive);
  if (resistive.length > 0 && resistive.every((branch) => branch.series.every((item) => "rheostat" in item))) {
    plainFinding(j, {
      id: "lvArm.rheostatAlone",
      level: "stop",
      what: "a trimmer alone as the LV arm",
      reason:
        "A lifted wiper or a turn to its end leaves no defined LV arm. Fit fixed resistors across it, and trim in one branch only.",
      source: practice("fixed resistors carry the LV arm, a trimmer adjusts it"),
      cure: { label: "size again", edits: [], sizeAgain: true },
    });
  }
  const unchosen = lvArm.branches.filter((branch) => "part" in branch && branch.part === "");
  if (unchosen.length > 0) {
    plainFinding(j, {
      id: "lvArm.partNotChosen",
      level: "caution",
      what: "LV capacitors without a part",
      reason: `${unchosen.map((branch) => branch.name).join(", ")}: the value is counted, but its dielectric and rating are not known. Choose class 1 (C0G), film or mica.`,
      source: practice("the dielectric decides what a capacitance is worth"),
    });
  }
  if (lvArm.stays === "withInstrument") {
    plainFinding(j, {
      id: "lvArm.stays",
      level: "stop",
      what: "LV arm on the instrument's side of the plug",
      reason: "Pulling the plug takes the LV arm away and leaves the full voltage at the tap. Mount it on the divider.",
      source: practice("the LV arm stays with the divider"),
      cure: {
        label: "mount the LV arm on the divider",
        edits: [{ pointer: "/design/lvArm/stays", value: "withDivider" }],
      },
    });
  }
}

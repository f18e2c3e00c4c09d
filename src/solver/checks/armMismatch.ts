import type { LvBranch } from "../job/design.ts";
import { formatShare } from "../quantities/format.ts";
import { formula } from "../standards/formula.ts";
import { computedHere } from "../standards/source.ts";
import { capacitorOf, type Judging, plainFinding, resistorOf } from "./judging.ts";
import { capacitanceOf } from "./lvArm.ts";
import { wantedOf } from "./wanted.ts";

const perK = (symbol: string, meaning: string) => ({ symbol, unit: "1/K", meaning });
const one = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });

export const mismatchFormulas = {
  edge: formula({
    id: "mismatch.edge",
    title: "Scale factor at the edge over the ambient span",
    statement: "{=} = (1 − 1/{F}) · |{a2} · {fitted}/{whole} − {a1}| · {dT}",
    result: one("ΔF/F", "relative change of the scale factor at the edge"),
    inputs: {
      F: one("F", "scale factor"),
      a1: perK("α_1", "temperature coefficient of the element capacitors"),
      a2: perK("α_2", "temperature coefficient of the LV capacitors, by their share"),
      fitted: { symbol: "C_2", unit: "F", meaning: "LV capacitance fitted" },
      whole: { symbol: "C_2p", unit: "F", meaning: "LV capacitance with cable and instrument" },
      dT: { symbol: "ΔT", unit: "K", meaning: "half-width of the ambient span" },
    },
    holds:
      "Both arms at one temperature; cable, instrument and strays keep their capacitance. One dielectric in both arms takes it out but for their share.",
    source: computedHere("difference of two capacitance ratios"),
    compute: ({ F, a1, a2, fitted, whole, dT }) =>
      whole > 0 ? (1 - 1 / F) * Math.abs((a2 * fitted) / whole - a1) * dT : null,
  }),
  dc: formula({
    id: "mismatch.dc",
    title: "Scale factor at dc over the ambient span",
    statement: "{=} = (1 − 1/{F}) · |{a1} − {a2} · {R2p}/{R2}| · {dT}",
    result: one("ΔF/F", "relative change of the scale factor at dc"),
    inputs: {
      F: one("F", "scale factor"),
      a1: perK("α_1", "greatest temperature coefficient of the string's resistors"),
      a2: perK("α_2", "temperature coefficient of the LV resistors, taken the other way where its sign is not known"),
      R2p: { symbol: "R_2p", unit: "ohm", meaning: "LV arm with the instrument" },
      R2: { symbol: "R_2", unit: "ohm", meaning: "LV arm fitted" },
      dT: { symbol: "ΔT", unit: "K", meaning: "half-width of the ambient span" },
    },
    holds: "Both arms at one temperature; the instrument keeps its resistance. Self-heating comes on top.",
    source: computedHere("difference of two resistance ratios"),
    compute: ({ F, a1, a2, R2p, R2, dT }) => (R2 > 0 ? (1 - 1 / F) * Math.abs(a1 - (a2 * R2p) / R2) * dT : null),
  }),
};

/** Share of the wanted uncertainty that the two arms' mismatch may take without a word. */
const share = 0.2;

/** What the two arms' different coefficients do to the scale factor over the ambient span. Writes `mismatch.edge` and `mismatch.dc`. */
export function judgeArmMismatch(j: Judging): void {
  const { sheet, document } = j;
  const dT = "/brief/surroundings/ambientSpan_K";
  sheet.given(dT, document.brief.surroundings.ambientSpan_K);
  sheet.given("mismatch.elementCapacitors_per_K", elementCoefficient(j));
  sheet.given("mismatch.lvCapacitors_per_K", lvCapacitorCoefficient(j));
  sheet.given("mismatch.elements_per_K", greatestOf(j.design.hvArm.elements.map(({ part }) => resistorOf(j, part))));
  sheet.given("mismatch.lvResistors_per_K", -greatestOf(lvResistors(j)));
  const edge = sheet.derive("mismatch.edge", mismatchFormulas.edge, {
    F: "scaleFactor.predicted",
    a1: "mismatch.elementCapacitors_per_K",
    a2: "mismatch.lvCapacitors_per_K",
    fitted: "lvArm.capacitanceFitted_F",
    whole: "lvArm.capacitanceTotal_F",
    dT,
  });
  sheet.derive("mismatch.dc", mismatchFormulas.dc, {
    F: "scaleFactor.predicted",
    a1: "mismatch.elements_per_K",
    a2: "mismatch.lvResistors_per_K",
    R2p: "lvArm.withInstrument_ohm",
    R2: "lvArm.fitted_ohm",
    dT,
  });
  const wanted = wantedOf(document.brief);
  if (edge === null || wanted === null || edge <= share * wanted) return;
  plainFinding(j, {
    id: "mismatch.edge",
    level: "caution",
    what: "temperature mismatch of the two arms' capacitors",
    actual: edge,
    limit: share * wanted,
    unit: "1",
    sense: "atMost",
    margin: 1 - edge / (share * wanted),
    reason: `Over the ambient span the scale factor at the edge moves by ${formatShare(edge)}, more than a fifth of what is wanted. Take one dielectric for both arms.`,
    source: mismatchFormulas.edge.source,
    path: "mismatch.edge",
  });
}

/** Mean over the elements; null where one has no capacitor. */
function elementCoefficient(j: Judging): number | null {
  const { elements } = j.design.hvArm;
  if (elements.some(({ capacitor }) => capacitor === null)) return null;
  return (
    elements.reduce((sum, { capacitor }) => sum + capacitorOf(j, capacitor!).temperatureCoefficient_per_K, 0) /
    elements.length
  );
}

const isCapacitor = (branch: LvBranch): branch is Extract<LvBranch, { readonly capacitance_F: number }> =>
  "capacitance_F" in branch;

/** By capacitance over the fixed capacitors and links; 0 where none is named by its part. */
function lvCapacitorCoefficient(j: Judging): number {
  const named = j.design.lvArm.branches.filter(isCapacitor).filter(({ part }) => part !== "");
  const whole = named.reduce((sum, branch) => sum + capacitanceOf(branch), 0);
  if (whole === 0) return 0;
  return named.reduce(
    (sum, branch) => sum + (capacitanceOf(branch) / whole) * capacitorOf(j, branch.part).temperatureCoefficient_per_K,
    0,
  );
}

const lvResistors = (j: Judging) =>
  j.design.lvArm.branches.flatMap((branch) =>
    "series" in branch
      ? branch.series.flatMap((item) => ("resistance_ohm" in item ? [resistorOf(j, item.part)] : []))
      : [],
  );

const greatestOf = (families: readonly { readonly temperatureCoefficient_per_K: number }[]): number =>
  families.reduce((most, each) => Math.max(most, Math.abs(each.temperatureCoefficient_per_K)), 0);

import { formula } from "../standards/formula.ts";
import { computedHere } from "../standards/source.ts";
import { type CapacitiveTwoPort, capacitiveLadder, capacitiveLadderRecord } from "./capacitiveLadder.ts";
import { type ColumnStrays, columnStrays, strayFormulas } from "./columnStrays.ts";
import { givenPerElement, type Judging, plainFinding } from "./judging.ts";
import { solvedStrays } from "./solvedStrays.ts";

const F = (symbol: string, meaning: string) => ({ symbol, unit: "F", meaning });

export const capacitanceFormulas = {
  element: formula({
    id: "capacitance.element",
    title: "Capacitance of an element",
    statement: "{=} = {p} · ({body} + {fitted})",
    result: F("C_i", "element capacitance, all strings"),
    inputs: {
      p: { symbol: "p", unit: "1", meaning: "strings in parallel" },
      body: F("C_b", "the resistor's own"),
      fitted: F("C_f", "capacitor across it"),
    },
    holds: "Lumped.",
    source: computedHere("parallel sum"),
    compute: ({ p, body, fitted }) => p * (body + fitted),
  }),
  withStray: formula({
    id: "capacitance.withStray",
    title: "Capacitance across an element with the column's own",
    statement: "{=} = {C} + {Cs}",
    result: F("C_i'", "across one element"),
    inputs: {
      C: F("C_i", "element capacitance"),
      Cs: F("C_s,i", "couplings along the column, folded onto the element"),
    },
    holds: "Exact for an evenly shared voltage; couplings over several elements are folded onto each of them.",
    source: computedHere("parallel sum"),
    compute: ({ C, Cs }) => C + Cs,
  }),
  string: formula<never, "C">({
    id: "capacitance.string",
    title: "HV arm capacitance, string alone",
    statement: "1 / {=} = Σ 1 / {C}",
    result: F("C_1", "string alone"),
    inputs: { C: F("C_i", "element capacitances") },
    arrays: ["C"],
    holds: "Without strays.",
    source: computedHere("series sum"),
    compute: ({ C }) => (C.some((c) => c === 0) ? 0 : 1 / C.reduce((sum, c) => sum + 1 / c, 0)),
  }),
};

export interface StringCapacitance {
  /** Each element with what the field puts across it. */
  readonly element_F: readonly number[];
  readonly strays: ColumnStrays;
  readonly twoPort: CapacitiveTwoPort;
}

/** Writes `hvArm.capacitance_F`, `hvArm.effectiveCapacitance_F`, `input.capacitance_F`, `strays.*`. */
export function stringCapacitance(j: Judging): StringCapacitance {
  const { sheet, design } = j;
  const { elements } = design.hvArm;
  const n = elements.length;
  const body = givenPerElement(j, "selfCapacitance_F", (part) => part.selfCapacitance_F);
  sheet.given(
    "/design/hvArm/elements/*/capacitance_F",
    elements.map((element) => element.capacitance_F),
  );
  const element_F = sheet.deriveEach(
    "element.capacitance_F",
    capacitanceFormulas.element,
    { p: "/design/hvArm/strings", body, fitted: "/design/hvArm/elements/*/capacitance_F" },
    n,
  ) as number[];
  sheet.derive("hvArm.capacitance_F", capacitanceFormulas.string, { C: "element.capacitance_F" });
  const strays = straysOf(j, n);
  const whole = withSeries(j, element_F, strays);
  const twoPort = capacitiveLadder(whole.element_F, strays.toEarth_F, strays.toElectrode_F, strays.electrodeToTap_F);
  const inputs = { C: whole.path, Ce: "strays.eachToEarth_F", Ch: "strays.eachToElectrode_F" };
  sheet.given("strays.eachToEarth_F", strays.toEarth_F);
  sheet.given("strays.eachToElectrode_F", strays.toElectrode_F);
  sheet.solved("hvArm.effectiveCapacitance_F", capacitiveLadderRecord, twoPort.transfer_F, inputs, twoPort.residual);
  sheet.solved("input.capacitance_F", capacitiveLadderRecord, twoPort.electrode_F, inputs, twoPort.residual);
  return { element_F: whole.element_F, strays, twoPort };
}

/** The elements with the couplings along the column that the field has folded onto them. */
function withSeries(j: Judging, element_F: readonly number[], { series_F }: ColumnStrays) {
  if (series_F === null) return { element_F, path: "element.capacitance_F" };
  j.sheet.given("strays.eachSeries_F", series_F);
  const path = "element.withStray_F";
  const each = j.sheet.deriveEach(
    path,
    capacitanceFormulas.withStray,
    { C: "element.capacitance_F", Cs: "strays.eachSeries_F" },
    element_F.length,
  );
  return { element_F: each as number[], path };
}

function straysOf(j: Judging, n: number): ColumnStrays {
  const { strays, geometry } = j.design;
  if (strays.from === "typed") return typedStrays(j, n);
  const solved = strays.from === "field" ? solvedStrays(j, n) : null;
  if (solved !== null) return solved;
  const found = columnStrays(geometry, n, j.sheet);
  if (j.sheet.number("strays.toEarth_F") === null) notLonger(j);
  return found;
}

function typedStrays(j: Judging, n: number): ColumnStrays {
  const { strays } = j.design;
  const inner = Math.max(n - 1, 0);
  const padded = (list: readonly number[]) => Array.from({ length: inner }, (_, i) => list[i] ?? 0);
  for (const [list, of] of [
    [strays.toEarth_F, "earth"],
    [strays.toElectrode_F, "the top electrode"],
  ] as const) {
    if (list.length !== 0 && list.length !== inner) otherCount(j, list.length, inner, of);
  }
  const toEarth_F = padded(strays.toEarth_F);
  j.sheet.given("/design/strays/toEarth_F", toEarth_F);
  j.sheet.given(
    "strays.toEarth_F",
    toEarth_F.reduce((sum, c) => sum + c, 0),
  );
  const toElectrode_F = padded(strays.toElectrode_F);
  return { toEarth_F, toElectrode_F, electrodeToTap_F: strays.electrodeToTap_F, series_F: null, tapToEarth_F: 0 };
}

function notLonger(j: Judging): void {
  plainFinding(j, {
    id: "strays.formula",
    level: "caution",
    what: "stray capacitance of the column",
    reason:
      "The column is not longer than it is wide: the formula for its strays does not hold, and none were counted. Correct its length or diameter, or type the strays.",
    source: strayFormulas.toEarth.source,
  });
}

function otherCount(j: Judging, given: number, inner: number, of: string): void {
  plainFinding(j, {
    id: "strays.count",
    level: "caution",
    what: `stray capacitances typed to ${of}`,
    actual: given,
    limit: inner,
    unit: "1",
    reason: `${given} typed, the string has ${inner} inner nodes: from the tap up, those missing count as zero and those too many are left out. Type one a node.`,
    source: computedHere("one value an inner node"),
  });
}

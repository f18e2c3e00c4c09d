import { describe, expect, it } from "vitest";
import { capacitanceOf } from "../../../src/solver/checks/lvArm.ts";
import type { Instrument } from "../../../src/solver/job/instrument.ts";
import type { CapacitorFamily, Part, TrimmerFamily } from "../../../src/solver/job/part.ts";
import { prove } from "../../../src/solver/proof/prove.ts";
import { why } from "../../../src/solver/proof/why.ts";
import { linkHoles } from "../../../src/solver/sizing/lvLinks.ts";
import type { Candidate } from "../../../src/solver/sizing/outcome.ts";
import { sizeFrom } from "../../../src/solver/sizing/sizeFrom.ts";
import { takeCandidate } from "../../../src/solver/sizing/takeCandidate.ts";
import { expectRelative } from "../../support/relative.ts";
import { document, family, lvResistor, meter, type Over, trim } from "./inventedBrief.ts";

const c0g = (
  id: string,
  ratedVoltage_V: number,
  greatest_F: number,
  over: Partial<CapacitorFamily> = {},
): CapacitorFamily => ({
  id,
  kind: "capacitor",
  name: id,
  origin: "typed",
  tolerance: 0.05,
  bodyLength_m: 0.006,
  bodyDiameter_m: 0.005,
  least_F: 1e-12,
  greatest_F,
  series: "E24",
  dielectric: "C0G",
  dielectricClass: "class1",
  ratedVoltage_V,
  temperatureCoefficient_per_K: 3e-5,
  dissipationFactor: 1e-3,
  leadInductance_H: 1e-9,
  ...over,
});
const trimmer: TrimmerFamily = {
  ...(trim as TrimmerFamily),
  id: "trimC",
  quantity: "F",
  spans: [60e-12],
  leastShare: 5 / 60,
};
const parts: Part[] = [
  family("hv", { limitingVoltage_V: 6000, greatest_ohm: 22e6, bodyLength_m: 0.03, series: "E12" }),
  lvResistor,
  trim,
  c0g("hvC", 4000, 2e-9),
  c0g("lvC", 630, 47e-9),
  c0g("bad", 6000, 1e-6, { dielectricClass: "class2", dielectric: "X7R" }),
  trimmer,
];
const scope: Instrument = {
  ...meter,
  id: "scope",
  function: "scope 1 MΩ",
  resistance_ohm: 1e6,
  resistanceSpread: 0.02,
  capacitance_F: 18e-12,
  capacitanceSpread_F: 3e-12,
  greatestInput_Vpeak: 300,
  cable: { length_m: 1.2, capacitance_F_per_m: 95e-12, impedance_ohm: 50, delay_s_per_m: 5e-9, end: "lumped" },
};
const pulse: Over = {
  brief: { wantedUncertainty: 0.03, band_Hz: [0, 3e5] },
  waveform: {
    kind: "pulse",
    statedAs: "peak",
    nominal_V: 30e3,
    greatest_Vpeak: 36e3,
    riseTime_s: 1e-6,
    width_s: 1e-5,
    repetition_Hz: 0,
  },
  policy: { leastCurrent_A: 1e-4 },
};
const doc = (over: Over, instrument = scope) => ({
  ...document(over, parts),
  instruments: [instrument],
  principal: instrument.id,
});
function first(over: Over, instrument = scope): Candidate {
  const result = sizeFrom(doc(over, instrument), [], 1);
  if (!result.ok) throw new Error(result.error.why);
  return result.value.candidates[0] as Candidate;
}

describe("capacitors across the elements", () => {
  const candidate = first(pulse);
  const element = candidate.design.hvArm.elements[0]!;

  it("are of class 1, rated for the element's greatest peak, and meet both rules by the smallest value", () => {
    expect(element.capacitor).toBe("hvC");
    expect((36e3 * 0.999) / candidate.elements).toBeLessThanOrEqual(0.6 * 4000);
    const { columnLength_m: l, columnDiameter_m: d } = candidate.design.geometry;
    const Ce = (2 * Math.PI * 8.8541878128e-12 * l) / Math.log(((2 * l) / d) * Math.sqrt((0.48 + l) / (0.48 + 3 * l)));
    const rule = Math.max((5 * Ce * candidate.elements) / candidate.strings - 0.3e-12, 20 * 0.3e-12);
    expect(element.capacitance_F).toBeGreaterThanOrEqual(rule);
    expect(element.capacitance_F).toBeLessThan(rule * 1.12);
  });

  it("are fitted for pulses, for a sine only where a bare divider would fall too far, never for dc or when forbidden", () => {
    const sine = (frequency_Hz: number): Over => ({
      ...pulse,
      brief: { wantedUncertainty: 0.03, band_Hz: [0, 0] },
      waveform: { kind: "sine", statedAs: "rms", nominal_V: 8e3, greatest_Vpeak: null, frequency_Hz },
    });
    expect(first(sine(50)).design.hvArm.elements[0]!.capacitor).toBeNull();
    expect(first(sine(5000)).design.hvArm.elements[0]!.capacitor).toBe("hvC");
    expect(first({ policy: pulse.policy! }).design.hvArm.elements[0]!.capacitor).toBeNull();
    expect(first({ policy: { ...pulse.policy, compensation: "always" } }).design.hvArm.elements[0]!.capacitor).toBe(
      "hvC",
    );
  });

  it("stay within what the source's own capacitance bears, and say so", () => {
    const small = first({ ...pulse, source: { capacitance_F: 1e-9 } });
    const C1 = small.design.hvArm.elements[0]!.capacitance_F / small.elements;
    expect(C1 / (C1 + 1e-9)).toBeLessThanOrEqual(0.03);
    expect(small.findings.map((each) => each.id)).toContain("compensation.stray");
  });
});

describe("the sheet", () => {
  it("opens a why for every traced figure of a compensated candidate", () => {
    const result = sizeFrom(doc(pulse), [], 3);
    if (!result.ok) throw new Error(result.error.why);
    const { sheet } = result.value;
    const kinds = Object.keys(sheet.traces).map((path) => why(path, sheet)?.kind);
    expect(new Set(kinds)).toEqual(new Set(["formula", "solution"]));
  });
});

describe("LV capacitors", () => {
  const candidate = first(pulse);
  const { branches } = candidate.design.lvArm;
  const fitted = branches.reduce((sum, branch) => sum + capacitanceOf(branch), 0);

  it("stand at what is flattest over the band on the whole network, as the proof finds it", () => {
    const proved = prove(takeCandidate(doc(pulse), candidate));
    if (!proved.ok) throw new Error(proved.error.why);
    const figure = (path: string) => proved.value.sheet.values[path] as number;
    expect(candidate.design.lvArm.capacitanceBy).toBe("flattest");
    expectRelative(fitted, figure("lvArm.capacitanceFlattest_F"), 1e-9, "the trimmer's setting is solved for");
    expect(Math.abs(figure("response.bandDeviation_dB"))).toBeLessThan(0.05);
    expect(proved.value.findings.filter((each) => each.level === "stop").map((each) => each.id)).toEqual([]);
  });

  it("are near C1eff · (F − 1) less cable and scope", () => {
    const { elements } = candidate.design.hvArm;
    const C1 = ((elements[0]!.capacitance_F + 0.3e-12) * candidate.strings) / candidate.elements;
    const { columnLength_m: l, columnDiameter_m: d } = candidate.design.geometry;
    const Ce = (2 * Math.PI * 8.8541878128e-12 * l) / Math.log(((2 * l) / d) * Math.sqrt((0.48 + l) / (0.48 + 3 * l)));
    const [a, K] = [0.3 / 1.3, Math.sqrt((1.3 * Ce) / C1)];
    const C1eff = (C1 * K * (1 - a + a * Math.cosh(K))) / Math.sinh(K);
    expectRelative(
      fitted,
      C1eff * 999 - 132e-12,
      0.01,
      "continuous string, edge matched; the flattest is within a percent",
    );
  });

  it("reach string, strays, cable and scope in tolerance without a hole", () => {
    const links = branches.flatMap((branch) => ("link" in branch ? [branch.capacitance_F] : []));
    const fixed = branches.flatMap((branch) =>
      "link" in branch || "series" in branch || "trimmer" in branch ? [] : [branch.capacitance_F],
    );
    const T1 = branches.find((branch) => "trimmer" in branch);
    if (T1 === undefined || !("trimmer" in T1)) throw new Error("no trimmer");
    const [low, high] = [T1.trimmer.least_F * 1.1, T1.trimmer.greatest_F * 0.9];
    const sum = (values: number[]) => values.reduce((total, each) => total + each, 0);
    expect(fixed.length).toBeGreaterThanOrEqual(2);
    expect(linkHoles(links, 0.05, high - low)).toEqual([]);
    const half = (fitted + 132e-12) * 0.05;
    expect(sum(fixed) * 1.05 + low).toBeLessThanOrEqual(fitted - half);
    expect((sum(fixed) + sum(links)) * 0.95 + high).toBeGreaterThanOrEqual(fitted + half);
    expect(T1.trimmer.setting).toBeGreaterThanOrEqual(0);
    expect(T1.trimmer.setting).toBeLessThanOrEqual(1);
  });

  it("do not exist where cable and scope are already more: both ways out are named", () => {
    const long = { ...scope, cable: { ...scope.cable, length_m: 30 } };
    const none = first(
      { ...pulse, source: { capacitance_F: 50e-12 }, brief: { ...pulse.brief, scaleFactor: 200 } },
      long,
    );
    const finding = none.findings.find((each) => each.id === "compensation.lvCapacitance");
    expect(none.stops).toContain("compensation.lvCapacitance");
    expect(finding?.reason).toMatch(/shorten the cable by .*\sm or raise C1 to .*\s[pn]F/);
    const edit = finding?.cure?.edits[0];
    expect(edit?.pointer).toBe("/instruments/0/cable/length_m");
    const cut = { ...long, cable: { ...long.cable, length_m: edit?.value as number } };
    const cured = first(
      { ...pulse, source: { capacitance_F: 50e-12 }, brief: { ...pulse.brief, scaleFactor: 200 } },
      cut,
    );
    expect(cured.stops).not.toContain("compensation.lvCapacitance");
  });
});

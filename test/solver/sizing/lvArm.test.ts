import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fixedOf, isResistive, trimOf } from "../../../src/solver/checks/lvArm.ts";
import { type LvGiven, lvNeed } from "../../../src/solver/sizing/lvSolution.ts";
import { parallelTrim, seriesTrim } from "../../../src/solver/sizing/lvTrim.ts";
import type { Candidate } from "../../../src/solver/sizing/outcome.ts";
import { sizeFrom } from "../../../src/solver/sizing/sizeFrom.ts";
import { expectRelative } from "../../support/relative.ts";
import { document, family, lvResistor, meter, trim } from "./inventedBrief.ts";

// Invented scenario, computed independently: 6 kV on 12 × 100 MΩ, 10 MΩ meter, scale factor 1000.
const given: LvGiven = {
  hvArm_ohm: 1.2e9,
  scaleFactor: 1000,
  instrument_ohm: 10e6,
  seriesProtector_ohm: 0,
  leakage_S: 0,
  stringTolerance: 0.01,
  instrumentSpread: 0.01,
};
const need = (over: Partial<LvGiven> = {}) => {
  const found = lvNeed({ ...given, ...over });
  if (!found.ok) throw new Error(found.error.why);
  return found.value;
};
const printed = "as many digits as were given";

describe("LV arm resistance", () => {
  it("is 1.365188 MΩ for nominal parts, 1.201201 MΩ with the meter", () => {
    const R2 = need().nominal_ohm;
    expectRelative(R2, 1.365188e6, 1e-6, printed);
    expectRelative(1 / (1 / R2 + 1e-7), 1.201201e6, 1e-6, printed);
  });

  it("runs from 1.347892 to 1.382653 MΩ over string and meter ±1 %", () => {
    expectRelative(need().least_ohm, 1.347892e6, 1e-6, printed);
    expectRelative(need().greatest_ohm, 1.382653e6, 1e-6, printed);
  });

  it("in series with 1.27 MΩ ±1 % takes 65.2 to 125.4 kΩ: 150 kΩ ±10 %, 135 kΩ at least", () => {
    const none = { ohm: 1, tolerance: 0, count: 0 };
    const span = seriesTrim(need(), { ohm: 1.27e6, tolerance: 0.01 }, none);
    expectRelative(span?.least_ohm, 65.2e3, 1e-3, "three digits given");
    expectRelative(span?.greatest_ohm, 125.4e3, 1e-3, "four digits given");
    expect(150e3 * 0.9).toBeGreaterThan(span?.greatest_ohm as number);
  });

  it("in parallel with 1.43 MΩ ±1 % would take 20.2 to 59.2 MΩ, which nobody sells", () => {
    const span = parallelTrim(need(), { ohm: 1.43e6, tolerance: 0.01 });
    expectRelative(span?.least_ohm, 20.2e6, 1e-3, "three digits given");
    expectRelative(span?.greatest_ohm, 59.2e6, 1e-3, "three digits given");
  });

  it("does not exist where the meter alone divides by more: both ways out are named", () => {
    const none = lvNeed({ ...given, hvArm_ohm: 1e9, scaleFactor: 100 });
    expect(none.ok).toBe(false);
    if (none.ok) return;
    expect(none.error.why).toMatch(/No LV arm gives 100.*already gives 101/);
    expect(none.error.cure).toMatch(/below 990\sMΩ.*above 101/);
  });

  it("solved and put back gives the scale factor, with series protector and leakage", () => {
    const positive = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(
        positive(1e5, 1e11),
        positive(2, 1e5),
        positive(1e5, 1e10),
        positive(0, 1e6),
        positive(0, 1e-9),
        (R1, F, Rm, Rs, G) => {
          const found = lvNeed({
            ...given,
            hvArm_ohm: R1,
            scaleFactor: F,
            instrument_ohm: Rm,
            seriesProtector_ohm: Rs,
            leakage_S: G,
          });
          const exists = F / (1 + Rs / Rm) > 1 + R1 * (1 / (Rs + Rm) + G);
          const R2 = found.ok ? found.value.nominal_ohm : null;
          if (!exists) expect(R2).toBeNull();
          if (R2 === null) return;
          const back = (1 + R1 * (1 / R2 + 1 / (Rs + Rm) + G)) * (1 + Rs / Rm);
          expectRelative(back, F, 1e-11, "a difference of nearly equal conductances loses a digit");
        },
      ),
    );
  });
});

describe("realised in parts", () => {
  const parts = [
    family("hv", { limitingVoltage_V: 1000, least_ohm: 100e6, greatest_ohm: 100e6, series: "E3" }),
    lvResistor,
    trim,
  ];
  const doc = document(
    {
      waveform: { nominal_V: 6e3, greatest_Vpeak: 6e3 },
      source: { resistance_ohm: 220e3 },
      policy: { leastCurrent_A: 6e3 / 1.25e9, greatestDissipation_W: 36e6 / 1.15e9 },
    },
    parts,
  );
  const result = sizeFrom(doc, [], 2);
  if (!result.ok) throw new Error(result.error.why);
  const candidate = result.value.candidates.find((each) => each.family === "hv") as Candidate;
  const branches = candidate.design.lvArm.branches.filter(isResistive);
  const ohms = (set: (i: number) => number) =>
    1 / branches.reduce((sum, branch, i) => sum + 1 / (fixedOf(branch.series) * set(i) + trimOf(branch.series)), 0);

  it("is two branches or more, one with a rheostat, and gives 1000 as set", () => {
    expect(candidate.elements).toBe(12);
    expect(candidate.stops).toEqual([]);
    expect(branches.length).toBeGreaterThanOrEqual(2);
    expectRelative(
      ohms(() => 1),
      need().nominal_ohm,
      1e-12,
      "the setting is solved for",
    );
    expectRelative(1 + 1.2e9 * (1 / ohms(() => 1) + 1 / meter.resistance_ohm), 1000, 1e-12, "scale factor");
  });

  it("reaches every extreme of string, meter, fixed parts and track", () => {
    const items = branches.flatMap((branch) => branch.series);
    const rheostat = items.find((item) => "rheostat" in item);
    if (rheostat === undefined || !("rheostat" in rheostat)) throw new Error("no rheostat");
    const { greatest_ohm, least_ohm } = rheostat.rheostat;
    const arm = (fixed: number, track: number) =>
      1 /
      branches.reduce((sum, b) => sum + 1 / (fixedOf(b.series) * fixed + (b.series.includes(rheostat) ? track : 0)), 0);
    expect(arm(1.01, least_ohm * 1.1)).toBeLessThanOrEqual(need().least_ohm);
    expect(arm(0.99, greatest_ohm * 0.9)).toBeGreaterThanOrEqual(need().greatest_ohm);
    const lifted = arm(1, greatest_ohm);
    expect(lifted / need().nominal_ohm).toBeLessThan(1.11);
  });

  it("has preferred values of the series wanted only", () => {
    const E24 = [10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91];
    for (const item of branches.flatMap((branch) => branch.series)) {
      if (!("resistance_ohm" in item)) continue;
      const figures = Math.round(item.resistance_ohm / 10 ** (Math.floor(Math.log10(item.resistance_ohm)) - 1));
      expect(E24).toContain(figures);
    }
  });
});

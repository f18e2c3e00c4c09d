import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { figure, finding, fixed, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

const meter: Sketch = {
  elements: 12,
  resistance_ohm: 100e6,
  capacitance_F: 100e-12,
  branches: [fixed("a", 2.730375e6), fixed("b", 2.730375e6)],
};
const typed = (toEarth_F: number[], toElectrode_F: number[] = []): Sketch => ({
  ...meter,
  strays: { from: "typed", toEarth_F, toElectrode_F },
});

describe("strays typed", () => {
  it.each([
    ["none", [], [], false],
    ["one an inner node", new Array(11).fill(1e-12), [], false],
    ["one an inner node, to both", new Array(11).fill(1e-12), new Array(11).fill(1e-13), false],
    ["one alone", [1e-12], [], true],
    ["one an element", new Array(12).fill(1e-12), [], true],
    ["too few to the electrode", [], [1e-12], true],
  ])("%s", (_, toEarth, toElectrode, wrong) => {
    const proof = proven(typed(toEarth, toElectrode));
    expect(finding(proof, "strays.count")?.level).toBe(wrong ? "caution" : undefined);
  });
  it("says what happens to those missing", () => {
    const found = finding(proven(typed([1e-12])), "strays.count")!;
    expect(found).toMatchObject({ actual: 1, limit: 11 });
    expect(found.reason).toMatch(/1 typed, the string has 11 inner nodes.*zero/);
  });
  it("those that stand count: the sum of the list", () =>
    expectRelative(figure(proven(typed([1e-12])), "strays.toEarth_F"), 1e-12, 1e-12, "sum"));
});

describe("strays by the field solve", () => {
  it.each([
    ["field", true],
    ["formula", false],
  ] as const)("asked from the %s: the closed formula stands in, said: %s", (from, said) => {
    const proof = proven({ ...meter, strays: { from } });
    expect(finding(proof, "strays.field")?.level).toBe(said ? "caution" : undefined);
    expectRelative(
      figure(proof, "strays.toEarth_F"),
      figure(proven({ ...meter, strays: { from: "formula" } }), "strays.toEarth_F"),
      1e-15,
      "the same formula",
    );
  });
});

describe("strays by the formula", () => {
  it.each([
    [0.66, 0.04, true],
    [0.041, 0.04, true],
    [0.04, 0.04, false],
    [1e-6, 0.04, false],
  ])("a column of %f m by %f m has them: %s", (columnLength_m, columnDiameter_m, exists) => {
    const proof = proven({ ...meter, geometry: { columnLength_m, columnDiameter_m } });
    expect(finding(proof, "strays.formula")?.level).toBe(exists ? undefined : "caution");
    if (exists) expect(figure(proof, "strays.toEarth_F")).toBeGreaterThan(0);
    else expect(figure(proof, "strays.toEarth_F")).toBeNull();
  });
  it("any column that a document may hold is judged, without a number that is none", () => {
    const size = (least: number, greatest: number) =>
      fc
        .double({ min: Math.log(least), max: Math.log(greatest), noNaN: true })
        .map((x) => Math.min(greatest, Math.exp(x)));
    fc.assert(
      fc.property(size(1e-6, 1e4), size(1e-6, 1e3), fc.oneof(fc.constant(0), size(1e-6, 1e3)), (l, d, h) => {
        const geometry = { columnLength_m: l, columnDiameter_m: d, footHeight_m: h };
        const proof = proven({ ...meter, geometry });
        const text = JSON.stringify(proof, (_, value) =>
          typeof value === "number" && !Number.isFinite(value) ? "no number" : value,
        );
        expect(text).not.toContain("no number");
        expect(text).not.toMatch(/NaN|Infinity|undefined/);
      }),
      { numRuns: 25 },
    );
  });
});

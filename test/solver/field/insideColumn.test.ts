import { describe, expect, it } from "vitest";
import { strayFigures } from "../../../src/solver/field/figures.ts";
import { besselQuotient, insideColumn } from "../../../src/solver/field/insideColumn.ts";
import { expectRelative } from "../../support/relative.ts";

const epsilon0 = 8.8541878128e-12;

describe("the inside of a graded column", () => {
  it.each([
    [1, 0.565159104 / 1.266065878],
    [5, 24.33564214 / 27.23987182],
  ])("I1/I0 at %f (Abramowitz and Stegun, table 9.8, from memory)", (x, expected) =>
    expectRelative(besselQuotient(x), expected, 1e-8, "ten printed digits"),
  );
  it.each([
    [1, 0.1],
    [4, 0.125],
    [20, 0.02],
  ])("of %i elements, radius %f: the straight profile takes ε0 A/l between the ends", (n, a) => {
    const figures = strayFigures(insideColumn(n, a, 1));
    const straight = epsilon0 * Math.PI * a * a;
    expectRelative(figures.inputLow_F, straight, 1e-9, "uniform field");
    expectRelative(figures.m_F, -straight, 1e-9, "all of it from the tap's own lid");
    for (const each of figures.toEarth_F)
      expectRelative(each, 0, 1e-9, "nothing leaves a closed surface", figures.adjacent_F[0]!);
  });
  it("of a thin rod is a chain of ε0 A/pitch and what the kink at a node takes", () => {
    const [a, pitch] = [1e-3, 0.5];
    const { adjacent_F } = strayFigures(insideColumn(2, a, 1));
    const chain = (epsilon0 * Math.PI * a * a) / pitch;
    expectRelative(adjacent_F[0]!, chain, 0.02, "uniform in each half but within a radius of the kink");
    expect(adjacent_F[0]!).toBeLessThan(chain);
  });
});

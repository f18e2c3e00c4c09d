import { describe, expect, it } from "vitest";
import type { Idealisation } from "../../../src/solver/field/fieldGeometry.ts";
import { solveField } from "../../../src/solver/field/solveField.ts";
import { expectRelative } from "../../support/relative.ts";
import { column, drawn, sphere } from "./invented.ts";

const epsilon0 = 8.8541878128e-12;

/** The converged figure is the same solve with twice the points on every panel. */
describe.each<[Idealisation, number]>([
  ["bands", 6e-4],
  ["distributed", 1e-3],
])("convergence of %s", (idealisation, allowed) => {
  it.each(drawn)("%s", (_, geometry) => {
    const usual = solveField(geometry, { idealisation, withUncertainty: true });
    const twice = solveField(geometry, { idealisation, resolution: 2 });
    for (const key of ["ceEff_F", "chEff_F", "inputLow_F", "inputHigh_F", "electrodeSelf_F"] as const)
      expectRelative(usual[key], twice[key], allowed, key);
    expectRelative(usual.m_F, twice.m_F, allowed, "M", twice.ceEff_F / 6 + twice.chEff_F / 3);
    expect(usual.fieldMax_per_m === null).toBe(geometry.electrode.kind === "none");
    if (twice.fieldMax_per_m !== null)
      expectRelative(usual.fieldMax_per_m, twice.fieldMax_per_m, 3e-4, "largest field");
    const { ceEff, chEff, m } = usual.uncertainty!;
    expect(Math.abs(usual.ceEff_F / twice.ceEff_F - 1), "within its own statement").toBeLessThan(ceEff + 1e-5);
    expect(Math.abs(usual.chEff_F / twice.chEff_F - 1), "within its own statement").toBeLessThan(chEff + 1e-5);
    expect(Math.max(ceEff, m)).toBeLessThan(5e-3);
  });
});

describe("what must hold whatever is drawn", () => {
  it.each(drawn)("%s: free charge takes less than held, and less than the linear profile", (_, geometry) => {
    const { inputHigh_F, inputLow_F, electrodeSelf_F } = solveField(geometry);
    // Thomson's theorem: floating nodes settle at the least energy.
    expect(inputHigh_F).toBeLessThan(inputLow_F);
    expect(inputHigh_F).toBeLessThan(electrodeSelf_F);
  });
  it("capacitances scale with size, fields with its inverse", () => {
    const one = solveField(column(10, 0.5, 10, 0.3, { electrode: sphere(0.1) }));
    const two = solveField(column(10, 1, 10, 0.3, { electrode: sphere(0.2) }));
    expectRelative(two.ceEff_F, 2 * one.ceEff_F, 1e-9, "a length");
    expectRelative(two.fieldMax_per_m, one.fieldMax_per_m! / 2, 1e-9, "one over a length");
  });
  it("finer and finer bands become the graded film", () => {
    const film = solveField(column(10, 1, 10, 0.2), { idealisation: "distributed" });
    const coarse = solveField(column(20, 1, 10, 0.2));
    const fine = solveField(column(80, 1, 10, 0.2));
    // First order in the pitch: a quarter of the pitch leaves a quarter of the difference.
    const limit = fine.m_F + (fine.m_F - coarse.m_F) / 3;
    const inside = epsilon0 * Math.PI * 0.05 ** 2;
    expectRelative(limit, film.m_F - inside, 3e-3, "M; open bands have the field within them counted");
  });
});

describe("a graded film with all nodes at one potential is a closed tube", () => {
  const whole = (l: number, d: number, h: number) => {
    const strays = solveField(column(10, l, l / d, h / l), { idealisation: "distributed" });
    const couplings = strays.toElectrode_F.reduce((sum, each) => sum + each, strays.tapToElectrode_F);
    const earth = strays.toEarth_F.reduce((sum, each) => sum + each, strays.tapToEarth_F);
    return earth + strays.electrodeSelf_F - couplings;
  };
  // Method of moments, computed independently; length, diameter, foot height in m.
  it.each([
    [1, 0.1, 0.5, 23.51],
    [1, 0.05, 0.2, 19.26],
    [2, 0.1, 0.2, 40.12],
    [0.3, 0.02, 0.1, 6.203],
  ])("%f m long, %f m wide, foot at %f m: %f pF", (l, d, h, pF) =>
    expectRelative(whole(l, d, h), pF * 1e-12, 6e-3, "coarse elements, ends not crowded"),
  );
  it.each([
    [4, 0.1],
    [10, 0.3],
    [30, 1],
    [80, 3],
  ])("l/d %f, h/l %f: as an independent fit, within 1.03 %%", (slender, t) => {
    const L = Math.log(slender);
    const floor = (2 * t + 2) * Math.log(2 * t + 2) - 2 * (2 * t + 1) * Math.log(2 * t + 1) + 2 * t * Math.log(2 * t);
    const d = 1 / slender;
    const tube = (2 * Math.PI * epsilon0) / (Math.log(4 * slender) - 1 - 0.617 * floor - 0.09 + 0.751 / L);
    const ends = 2.545 * epsilon0 * d + (0.954 * epsilon0 * d * d) / t;
    expectRelative(whole(1, d, t), tube + ends, 0.0103, "2πε0 l/[ln(4l/d) − 1 − 0.617Φ − 0.090 + 0.751/L] + ends");
  });
});

import { describe, expect, it } from "vitest";
import type { Idealisation } from "../../../src/solver/field/fieldGeometry.ts";
import { solveField } from "../../../src/solver/field/solveField.ts";
import { expectRelative } from "../../support/relative.ts";
import { column, drawn, sphere } from "./invented.ts";

const epsilon0 = 8.8541878128e-12;

/** The converged figure is the same solve with twice the points on every panel. */
describe.each<[Idealisation, number]>([
  ["bands", 2e-4],
  ["distributed", 3e-3],
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

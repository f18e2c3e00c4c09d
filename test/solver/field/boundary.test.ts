import { describe, expect, it } from "vitest";
import { capacitanceMatrix, densities, type Ring } from "../../../src/solver/field/boundary.ts";
import { arc, line } from "../../../src/solver/field/profile.ts";
import { ellipticK } from "../../../src/solver/field/ringPotential.ts";
import { expectRelative } from "../../support/relative.ts";

const epsilon0 = 8.8541878128e-12;
const alone = (rings: Ring[], floor = false) => capacitanceMatrix(rings, 1, densities(rings, 1, floor))[0]![0]!;
const sphere = (a: number, h: number, conductor = 0, count = 48) => arc([0, h], a, 0, Math.PI, count, conductor);

describe("K by the arithmetic-geometric mean (Abramowitz and Stegun, table 17.1, from memory)", () => {
  it.each([
    [1, 1.5707963267948966],
    [0.5, 1.854074677301372],
    [0.01, 3.695637362989875],
  ])("K(1 − m1 = %f) = %f", (m1, K) => expectRelative(ellipticK(m1), K, 1e-13, "printed to 15 digits"));
});

describe("capacitances against exact values (computed here; any field theory text)", () => {
  it("isolated sphere: 4π ε0 a", () =>
    expectRelative(alone(sphere(0.1, 0)), 4 * Math.PI * epsilon0 * 0.1, 2e-3, "48 rings"));
  it.each([
    [0.11, 23.979],
    [0.2, 14.921],
    [0.5, 12.364],
    [2, 11.412],
  ])("sphere of 0.1 m, centre %f m above a plane: %f pF", (h, pF) => {
    expectRelative(alone(sphere(0.1, h), true), pF * 1e-12, 4e-3, "48 rings, five printed digits");
  });
  it.each([
    [1, 0.1, 80.299],
    [0.2, 0.02, 16.06],
    [0.2, 0.05, 20.738],
    [0.2, 0.1, 27.056],
  ])("torus of ring radius %f and tube %f: %f pF", (R, a, pF) => {
    expectRelative(alone(arc([R, 0], a, 0, 2 * Math.PI, 48, 0)), pF * 1e-12, 3e-3, "48 rings, five printed digits");
  });
  it("two touching spheres: 8π ε0 a ln 2", () => {
    const rings = [...sphere(0.1, 0.1, 0, 64), ...sphere(0.1, -0.1, 0, 64)];
    expectRelative(alone(rings), 8 * Math.PI * epsilon0 * 0.1 * Math.LN2, 3e-3, "64 rings each");
  });
  it.each([
    [0.5, 0.963943],
    [1, 1.191499],
    [2, 1.573041],
    [4, 2.216649],
    [8, 3.313226],
  ])("solid cylinder, length over diameter %f: C/(4π ε0 radius) = %f", (ratio, expected) => {
    const [r, l] = [0.05, 0.1 * ratio];
    const rings = [
      ...line([0, l], [r, l], 20, "far", 0),
      ...line([r, l], [r, 0], 40, "both", 0),
      ...line([r, 0], [0, 0], 20, "near", 0),
    ];
    expectRelative(alone(rings) / (4 * Math.PI * epsilon0 * r), expected, 3e-3, "80 rings");
  });
  it("thin disc: 8 ε0 a", () =>
    expectRelative(alone(line([0, 0], [0.1, 0], 40, "far", 0)), 8 * epsilon0 * 0.1, 3e-3, "40 rings"));
  it("open hemispherical bowl: 4π ε0 a (π/2 + 1)/π", () => {
    const bowl = arc([0, 0], 0.1, Math.PI / 2, Math.PI, 48, 0, "near");
    expectRelative(alone(bowl), (4 * epsilon0 * 0.1 * Math.PI * (Math.PI / 2 + 1)) / Math.PI, 4e-3, "48 rings");
  });
  it("is symmetric, and its rows sum to what goes to earth", () => {
    const rings = [...sphere(0.1, 0.3, 0), ...sphere(0.05, 0.6, 1)];
    const C = capacitanceMatrix(rings, 2, densities(rings, 2, true));
    expectRelative(C[0]![1], C[1]![0]!, 2e-3, "reciprocity, to the discretisation");
    expect(C[0]![1]).toBeLessThan(0);
    expect(C[0]![0]! + C[0]![1]!).toBeGreaterThan(0);
  });
});

import { describe, expect, it } from "vitest";
import { gaussLegendre } from "../../../src/solver/field/gaussLegendre.ts";
import { along, alongInverse, alongSlope, type EndOrder } from "../../../src/solver/field/grading.ts";
import { ellipticK, ringKernel } from "../../../src/solver/field/ringPotential.ts";
import { expectRelative } from "../../support/relative.ts";

describe("K by the arithmetic-geometric mean (Abramowitz and Stegun, table 17.1, from memory)", () => {
  it.each([
    [1, 1.5707963267948966],
    [0.5, 1.854074677301372],
    [0.01, 3.695637362989875],
  ])("K(1 − m1 = %f) = %f", (m1, K) => expectRelative(ellipticK(m1), K, 1e-13, "printed to 15 digits"));
});

describe("the potential of a ring", () => {
  it.each([0.999, 0.5, 0.1, 1e-2, 1e-4, 1e-8, 1e-14])("by the polynomial against the mean, m1 = %f", (m1) => {
    // Two rings of radius 1 at the height that gives m1: dz² = 4 m1/(1 − m1).
    const dz = Math.sqrt((4 * m1) / (1 - m1));
    const expected = ellipticK(m1) / Math.sqrt(4 + dz * dz);
    expectRelative(ringKernel(1, dz, 1, 0), expected, 2e-8, "Abramowitz and Stegun 17.3.34: error of K below 2e-8");
  });
  it("on the axis is that of a charge at the distance of the ring", () =>
    expectRelative((ringKernel(0, 3, 4, 0) * 2) / Math.PI, 1 / 5, 2e-8, "3-4-5 triangle"));
});

describe("the rule of integration", () => {
  it.each([2, 5, 12, 24, 40])("of %i points is exact to degree 2n − 1", (n) => {
    const { points, weights } = gaussLegendre(n);
    const sum = points.reduce((total, u, k) => total + weights[k]! * u ** (2 * n - 1), 0);
    expectRelative(sum, 1 / (2 * n), 1e-12, "∫ u^(2n−1) du");
  });
});

describe("grading", () => {
  const ends: EndOrder[] = [1, 2, 3];
  it.each(ends.flatMap((p) => ends.map((q) => [p, q] as const)))("of orders %i and %i", (p, q) => {
    for (const u of [0.01, 0.2, 0.5, 0.9]) {
      expectRelative(alongInverse(p, q, along(p, q, u)), u, 1e-9, "there and back");
      const slope = (along(p, q, u + 1e-6) - along(p, q, u - 1e-6)) / 2e-6;
      expectRelative(alongSlope(p, q, u), slope, 1e-6, "difference quotient");
    }
    expect([along(p, q, 0), along(p, q, 1)]).toEqual([0, 1]);
  });
});

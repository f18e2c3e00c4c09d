import { describe, expect, it } from "vitest";
import { arc, line } from "../../../src/solver/field/curve.ts";
import { expectRelative } from "../../support/relative.ts";
import { alone, ball, ring, rod, solved, surface } from "./invented.ts";

const epsilon0 = 8.8541878128e-12;

describe("capacitances against exact values (any field theory text; digits computed here)", () => {
  it("isolated sphere: 4π ε0 a", () =>
    expectRelative(alone(ball(0.1, 0)), 4 * Math.PI * epsilon0 * 0.1, 1e-6, "exact"));
  it.each([
    [0.11, 23.979],
    [0.2, 14.921],
    [0.5, 12.364],
    [1, 11.712],
    [2, 11.412],
  ])("sphere of 0.1 m, centre %f m above a plane: %f pF", (h, pF) =>
    expectRelative(alone(ball(0.1, h), true), pF * 1e-12, 5e-5, "five printed digits"),
  );
  it.each([
    [1, 0.01, 52.298],
    [1, 0.1, 80.299],
    [0.2, 0.02, 16.06],
    [0.2, 0.05, 20.738],
    [0.2, 0.1, 27.056],
  ])("torus of ring radius %f and tube %f: %f pF (toroidal functions)", (R, a, pF) =>
    expectRelative(alone(ring(R, a)), pF * 1e-12, 1e-4, "five printed digits"),
  );
  it("two touching spheres: 8π ε0 a ln 2", () => {
    const pair = [...ball(0.1, 0.1), ...ball(0.1, -0.1)];
    expectRelative(alone(pair), 8 * Math.PI * epsilon0 * 0.1 * Math.LN2, 1e-4, "exact");
  });
  it.each([
    [0.5, 0.963943],
    [1, 1.191499],
    [2, 1.573041],
    [4, 2.216649],
    [8, 3.313226],
  ])("solid cylinder, length over diameter %f: C/(4π ε0 radius) = %f", (slender, expected) =>
    expectRelative(alone(rod(0.05, 0.1 * slender)) / (4 * Math.PI * epsilon0 * 0.05), expected, 1e-5, "seven digits"),
  );
  it("thin disc: 8 ε0 a", () =>
    expectRelative(alone([surface(line([0, 0], [0.1, 0]), 1, 2)]), 8 * epsilon0 * 0.1, 1e-5, "exact"));
  it("open hemispherical bowl: 4π ε0 a (π/2 + 1)/π", () => {
    const bowl = [surface(arc([0, 0], 0.1, Math.PI / 2, Math.PI), 2, 1)];
    expectRelative(alone(bowl), 4 * epsilon0 * 0.1 * (Math.PI / 2 + 1), 1e-4, "exact");
  });
  it("field of an isolated sphere: V/a, everywhere", () => {
    for (const each of solved(ball(0.1, 0)).field[0]!) expectRelative(each, 10, 3e-4, "1 V at 0.1 m");
  });
});

describe("Maxwell's matrix", () => {
  const { C } = solved([...ball(0.1, 0.3, 0), ...ball(0.05, 0.6, 1)], 2, true);
  it("is symmetric, its couplings negative, its rows what goes to earth", () => {
    expect(C[1]).toBe(C[2]);
    expect(C[1]!).toBeLessThan(0);
    expect(C[0]! + C[1]!).toBeGreaterThan(0);
    expect(C[2]! + C[3]!).toBeGreaterThan(0);
  });
  it("doubles as all lengths double", () => {
    const twice = solved([...ball(0.2, 0.6, 0), ...ball(0.1, 1.2, 1)], 2, true).C;
    twice.forEach((each, at) => {
      expectRelative(each, 2 * C[at]!, 1e-9, "capacitance is a length");
    });
  });
});

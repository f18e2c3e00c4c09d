import { describe, it } from "vitest";
import { maxwell } from "../../../src/solver/field/maxwell.ts";
import { meshOf } from "../../../src/solver/field/panel.ts";
import { expectRelative } from "../../support/relative.ts";
import { ball } from "./invented.ts";

describe("a plane wall by images round the axis", () => {
  // A sphere before a plane is the same sphere above a floor, whose capacitance is exact: 4π ε0 a sinhα Σ 1/sinh(nα).
  it.each([
    [0.2, 14.921, 0.03],
    [0.5, 12.364, 1e-3],
    [1, 11.712, 2e-4],
  ])("sphere of 0.1 m, %f m from it: %f pF", (distance, pF, allowed) => {
    const mesh = meshOf(ball(0.1, 0), () => 8);
    expectRelative(maxwell(mesh, 1, false, distance).C[0]!, pF * 1e-12, allowed, "charge kept even round the axis");
  });
});

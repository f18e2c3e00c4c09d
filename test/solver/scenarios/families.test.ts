import { describe, expect, it } from "vitest";
import type { DividerDocument } from "../../../src/solver/index.ts";
import { prove, size, takeCandidate } from "../../../src/solver/index.ts";
import { figure, fixed, invented } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

// Invented scenario, computed independently: 15 kV dc on about 300 MΩ from a drawer with one value of one family at a time.
const families = [
  [
    "A",
    { ratedDissipation_W: 0.6, limitingVoltage_V: 350, greatest_ohm: 10e6, voltageCoefficient_per_V: -0.5e-6 },
    4.3e6,
    72,
  ],
  [
    "B",
    { ratedDissipation_W: 1, limitingVoltage_V: 3500, greatest_ohm: 68e6, voltageCoefficient_per_V: -1e-6 },
    39e6,
    8,
  ],
  [
    "C",
    {
      ratedDissipation_W: 2,
      limitingVoltage_V: 15e3,
      greatest_ohm: 1e9,
      voltageCoefficient_per_V: -2e-6,
      tolerance: 0.05,
    },
    150e6,
    2,
  ],
] as const;
const figures = {
  A: { V: 208, shift: -104e-6, U: 0.0068, critical: 147e3 },
  B: { V: 1875, shift: -0.001875, U: 0.00782, critical: 8.82e6 },
  C: { V: 7500, shift: -0.015, U: 0.0527, critical: 81e6 },
} as const;

/** A brief without a design, whose strings may be made of `value` alone. */
function drawer(ratings: object, value: number): DividerDocument {
  const document = invented({
    waveform: { nominal_V: 15e3, greatest_Vpeak: 15e3 },
    brief: { wantedUncertainty: 0.1 },
    policy: { partsInHandOnly: true },
    family: { bodyLength_m: 0.3, inHand: [{ value, count: 200 }], ...ratings },
    elements: 1,
    resistance_ohm: 1e6,
    branches: [fixed("a", 1e6)],
  });
  return { ...document, design: null };
}

describe.each(families)("family %s", (id, ratings, value, n) => {
  const document = drawer(ratings, value);
  const sizing = size(document, { top: 1 });
  if (!sizing.ok) throw new Error(sizing.error.why);
  const candidate = sizing.value.candidates[0]!;
  it(`takes ${n} in series`, () => {
    expect(candidate).toMatchObject({ family: "r", elements: n, strings: 1, resistance_ohm: value });
  });
  it("has its share of voltage, voltage effect, tolerance and critical resistance in the proof", () => {
    const proved = prove(takeCandidate(document, candidate));
    if (!proved.ok) throw new Error(proved.error.why);
    const proof = proved.value;
    const given = figures[id];
    expectRelative(
      (proof.sheet.values["element.voltage_Vdc"] as number[])[0],
      given.V,
      3e-3,
      "three digits, R2 counts in",
    );
    expectRelative(figure(proof, "scaleFactor.voltageShift"), given.shift, 5e-3, "three digits, R2 counts in");
    expectRelative(2 * figure(proof, "hvArm.toleranceUncertainty"), given.U, 1e-3, "three digits given, k = 2");
    expectRelative(
      (proof.sheet.values["element.criticalResistance_ohm"] as number[])[0],
      given.critical,
      1e-9,
      "closed form",
    );
  });
});

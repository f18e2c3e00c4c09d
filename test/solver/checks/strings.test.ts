import { describe, it } from "vitest";
import { prove } from "../../../src/solver/index.ts";
import { fault, figure, fixed, invented, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

// Invented scenario, computed independently: two equal strings of 12 × 200 MΩ, joined at tap and electrode only.
const meter: Sketch = {
  waveform: { greatest_Vpeak: 6000 },
  elements: 12,
  resistance_ohm: 200e6,
  branches: [fixed("a", 2.730375e6), fixed("b", 2.730375e6)],
};
const document = invented(meter);
const proved = prove({
  ...document,
  design: { ...document.design!, hvArm: { ...document.design!.hvArm, strings: 2 } },
});
if (!proved.ok) throw new Error(proved.error.why);
const proof = proved.value;
const output = (R1: number) => 6000 / (1 + R1 / 1.2012012e6);

describe("two strings in parallel", () => {
  it("make one HV arm of half the resistance", () =>
    expectRelative(figure(proof, "hvArm.resistance_ohm"), 1.2e9, 1e-12, "closed form"));
  it("with one element of one string shorted", () =>
    expectRelative(
      fault(proof, "elementShort").output_V,
      output(1 / (1 / 2.2e9 + 1 / 2.4e9)),
      1e-6,
      "closed form; R2 given to seven digits",
    ));
  it("with one element of one string open", () =>
    expectRelative(fault(proof, "elementOpen").output_V, output(2.4e9), 1e-6, "closed form; R2 given to seven digits"));
});

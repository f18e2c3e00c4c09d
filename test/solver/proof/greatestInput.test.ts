import { describe, expect, it } from "vitest";
import { prove } from "../../../src/solver/proof/prove.ts";
import { figure, fixed, invented } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

const proven = (document: ReturnType<typeof invented>) => {
  const proof = prove(document);
  if (!proof.ok) throw new Error(proof.error.why);
  return proof.value;
};
const at = (proof: ReturnType<typeof proven>, i: number) => ({
  value: proof.greatestInput.greatest_Vpeak[i],
  by: proof.greatestInput.decidedBy[i],
  element: proof.greatestInput.element[i],
});

describe("greatest input against frequency (an invented divider, computed independently)", () => {
  const plain = invented({ elements: 10, resistance_ohm: 10e6, branches: [fixed("R2a", 2e5), fixed("R2b", 2e5)] });
  it("low down is what equal elements bear together, by their voltage or their dissipation", () => {
    const proof = proven(plain);
    const limit = (proof.sheet.values["element.voltageLimit_V"] as number[])[0]!;
    const watts = (proof.sheet.values["element.dissipationLimit_W"] as number[])[0]!;
    const each = Math.min(Math.SQRT2 * limit, Math.sqrt(2 * 10e6 * watts));
    const R2p = figure(proof, "lvArm.withInstrument_ohm");
    const low = at(proof, 0);
    if (low.by === "instrument") return;
    expectRelative(low.value!, (each * (100e6 + R2p)) / 10e6, 1e-3, "equal shares; strays do nothing at 10 Hz");
  });
  it("is the instrument's where that may see little", () => {
    const frail = { ...plain, instruments: [{ ...plain.instruments[0]!, greatestInput_Vpeak: 0.5 }] };
    const proof = proven(frail);
    expect(at(proof, 0)).toMatchObject({ by: "instrument", element: null });
    expectRelative(
      at(proof, 0).value!,
      0.5 * figure(proof, "scaleFactor.predicted"),
      1e-4,
      "F times its rating; strays at 10 Hz",
    );
  });
  it("doubling the instrument's rating never lowers it, and it never exceeds what any element bears", () => {
    const one = proven(plain).greatestInput.greatest_Vpeak;
    const more = { ...plain, instruments: [{ ...plain.instruments[0]!, greatestInput_Vpeak: 1e9 }] };
    proven(more).greatestInput.greatest_Vpeak.forEach((value, i) => {
      expect(value!).toBeGreaterThanOrEqual(one[i]! * (1 - 1e-12));
    });
  });
  it("says in words where the deciding part changes", () => {
    expect(proven(plain).greatestInput.sentence).toMatch(/peak at 10\.0.Hz, set by .*\. .* peak is left at .*Hz\.$/);
  });
});

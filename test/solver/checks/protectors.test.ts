import { describe, expect, it } from "vitest";
import { fault, figure, finding, fixed, protector, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

// Invented scenario, computed independently: 6 kV on 12 × 100 MΩ, 10 MΩ meter, scale factor 1000; the tap stands at 6 V.
const R2p = 1.2012012e6;
const meter: Sketch = {
  waveform: { greatest_Vpeak: 6000 },
  elements: 12,
  resistance_ohm: 100e6,
  branches: [fixed("a", 2.730375e6), fixed("b", 2.730375e6)],
};
const guarded = (more: Record<string, unknown>, at = "divider"): Sketch => ({
  ...meter,
  parts: [protector(more)],
  protectors: [{ part: "p", at }],
});
const level = (s: Sketch, id: string) => finding(proven(s), id)?.level;

describe("a protector across the LV arm", () => {
  it.each([
    [5.9, "stop"],
    [6.1, "caution"],
    [7.4, "caution"],
    [7.6, undefined],
    [72, undefined],
  ])("that may conduct from %f V while the tap stands at 6 V: %s", (leastStrike_V, expected) =>
    expect(level(guarded({ leastStrike_V }), "protector.strike")).toBe(expected),
  );
  it("that leaks 10 nA at 72 V lowers the LV arm by its share, and the scale factor rises", () => {
    const proof = proven(guarded({ leakage_A: 10e-9 }));
    const G = 10e-9 / 72;
    const lowered = 1 / (1 / R2p + G);
    expectRelative(figure(proof, "lvArm.withInstrument_ohm"), lowered, 1e-6, "closed form, R2 given to seven digits");
    expectRelative(figure(proof, "scaleFactor.predicted"), 1 + 1.2e9 / lowered, 1e-6, "closed form");
    expectRelative(figure(proof, "protector.leakageError"), G * lowered, 1e-6, "closed form");
    expect(finding(proof, "protector.leakage")).toBeUndefined();
  });
  it.each([
    [0.3e-6, undefined],
    [0.5e-6, "caution"],
    [3e-6, "stop"],
  ])("that leaks %f A against a wish of 3 %%: %s", (leakage_A, expected) =>
    expect(level(guarded({ leakage_A }), "protector.leakage")).toBe(expected),
  );
  it.each([null, 0])("that states %s as its strike voltage is not judged, and that is said", (leastStrike_V) => {
    const proof = proven(guarded({ leastStrike_V, leakage_A: 1e-3 }));
    expect(finding(proof, "protector.strike.notStated")?.level).toBe("caution");
    expect(finding(proof, "protector.strike")).toBeUndefined();
    expectRelative(figure(proof, "scaleFactor.predicted"), 1000, 1e-6, "leakage without a voltage is not counted");
  });
  it("is not judged against a wish that is not stated", () =>
    expect(
      level({ ...guarded({ leakage_A: 3e-6 }), brief: { wantedUncertainty: 0 } }, "protector.leakage"),
    ).toBeUndefined());
  it("that is a series resistor divides with the meter, and neither strikes nor leaks", () => {
    const proof = proven(
      guarded({ type: "seriesResistor", leastStrike_V: null, letThrough_V: null, resistance_ohm: 1e5 }),
    );
    const R2 = 1.3651875e6;
    const tap = 1 / (1 / R2 + 1 / 10.1e6);
    expectRelative(figure(proof, "scaleFactor.predicted"), (1 + 1.2e9 / tap) * 1.01, 1e-6, "closed form");
    expect(proof.findings.filter((each) => each.id.startsWith("protector."))).toEqual([]);
  });
});

describe("a series resistor of 100 kΩ and a cable of 1 nF", () => {
  const cable = { length_m: 1, capacitance_F_per_m: 1e-9, impedance_ohm: 50 };
  const series = { type: "seriesResistor", leastStrike_V: null, letThrough_V: null, resistance_ohm: 1e5 };
  const tap = 1 / (1 / 1.2e9 + 1 / 1.3651875e6);
  const parallel = (a: number, b: number) => 1 / (1 / a + 1 / b);
  it.each([
    ["divider", parallel(tap + 1e5, 10e6)],
    ["instrument", parallel(tap, 10.1e6)],
  ])("at the %s", (at, R) => {
    const s = { ...guarded(series, at), strays: { from: "typed" }, instrument: { cable } };
    const pole = 1 / (2 * Math.PI * R * 1e-9);
    expectRelative(figure(proven(s), "response.bandwidth_Hz"), pole, 1e-6, "one pole, closed form");
  });
});

describe("a lost LV arm behind a protector", () => {
  const lost = (s: Sketch) => fault(proven(s), "lvArmLost").output_V;
  it("stands at what 10 MΩ makes of 6 kV without one", () =>
    expectRelative(lost(meter), 49.587, 1e-4, "five digits given"));
  it("is never shown lower because a tube could strike above it", () =>
    expectRelative(lost(guarded({})), 49.587, 1e-4, "72 V is not reached"));
  it("is not held down by leakage, which is stated as the most there may be", () => {
    const alone = { ...guarded({ leastStrike_V: 26, leakage_A: 2e-6 }), branches: [fixed("a", 1.2e6)] };
    const proof = proven({ ...alone, instrument: { resistance_ohm: 1e10 } });
    expectRelative(fault(proof, "lvOpen").output_V, 6000 / (1 + 1.2e9 / 1e10), 1e-9, "closed form");
    expect(fault(proof, "lvOpen").level).toBe("stop");
    expect(proof.level).toBe("stop");
  });
});

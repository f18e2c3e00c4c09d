import { describe, expect, it } from "vitest";
import { bank, fault, figure, figureOf, finding, fixed, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

// Invented scenario, computed independently: 48 kV pulse, scope 1 MΩ ‖ 18 pF, 1.2 m of 95 pF/m, 24 × (12 MΩ ‖ 470 pF).
const pulse: Sketch = {
  waveform: {
    kind: "pulse",
    nominal_V: 48000,
    statedAs: "peak",
    greatest_Vpeak: 48000,
    riseTime_s: 1e-7,
    width_s: 1e-5,
    repetition_Hz: 0,
  },
  brief: { band_Hz: [1, 1e7] },
  family: { limitingVoltage_V: 4000 },
  elements: 24,
  resistance_ohm: 12e6,
  capacitance_F: 470e-12,
  instrument: {
    function: "scope 1 MΩ",
    resistance_ohm: 1e6,
    capacitance_F: 18e-12,
    greatestInput_Vpeak: 300,
    readingAccuracy: 0.02,
    cable: { length_m: 1.2, capacitance_F_per_m: 95e-12, impedance_ohm: 50 },
  },
  branches: [
    fixed("R2a", 3 * 405063),
    fixed("R2b", 3 * 405063),
    fixed("R2c", 3 * 405063),
    bank("C2a", 17.553e-9 / 3),
    bank("C2b", 17.553e-9 / 3),
    bank("C2c", 17.553e-9 / 3),
  ],
};
const capacitive = "capacitive and ladder figures are given to 0.1 %";

describe("a pulse into a scope", () => {
  const proof = proven(pulse);
  it.each([
    ["hvArm.resistance_ohm", 288e6, 1e-4],
    ["hvArm.capacitance_F", 19.583e-12, 1e-4],
    ["strays.toEarth_F", 11.799e-12, 1e-3],
    ["hvArm.effectiveCapacitance_F", 17.75e-12, 1e-3],
    ["lvArm.wanted_ohm", 405.063e3, 1e-5],
    ["lvArm.withInstrument_ohm", 288.288e3, 1e-4],
    ["scaleFactor.predicted", 1000, 1e-5],
  ])("has %s = %f", (path, expected, tolerance) => {
    expectRelative(figure(proof, path), expected, tolerance, capacitive);
  });
  it("computes the LV capacitance three ways", () => {
    const parallel = 132e-12;
    expectRelative(figure(proof, "lvArm.capacitanceHighFrequency_F") + parallel, 17.727e-9, 1e-3, capacitive);
    expectRelative(figure(proof, "lvArm.capacitanceResponseTime_F") + parallel, 17.597e-9, 1e-3, capacitive);
    expectRelative(figure(proof, "lvArm.capacitanceFlattest_F") + parallel, 17.685e-9, 2e-3, "given as 'about'");
  });
  it("has 0.906386 of its string's capacitance left, and 0.998077 with half as much stray to the electrode", () => {
    const left = (each: typeof proof) =>
      figure(each, "hvArm.effectiveCapacitance_F") / figure(each, "hvArm.capacitance_F");
    expectRelative(left(proof), 0.906386, 1e-6, "six digits given");
    const each = figure(proof, "strays.toEarth_F") / 24;
    const balanced = proven({
      ...pulse,
      strays: { from: "typed", toEarth_F: new Array(23).fill(each), toElectrode_F: new Array(23).fill(each / 2) },
    });
    expectRelative(left(balanced), 0.998077, 1e-6, "six digits given");
  });
  it("would dissipate 8.0 W at dc, and 1998 V stand on each element", () => {
    const steady = proven({
      ...pulse,
      waveform: { kind: "dc", nominal_V: 48000, greatest_Vpeak: 48000 },
      instrument: { ...pulse.instrument, function: "scope 1 MΩ" },
    });
    expectRelative(figure(steady, "input.dissipation_W"), 8.0, 2e-3, "two digits given");
    expectRelative(figureOf(steady, "element.voltage_Vdc"), 1998, 1e-4, "four digits given");
  });
  it("is a quarter of a percent low near its slowest time constant even where the edge is right", () => {
    const parallel = 132e-12;
    const edge = figure(proof, "lvArm.capacitanceHighFrequency_F") + parallel;
    expectRelative(edge, 17.727e-9, 1e-4, "five digits given");
    const matched = proven({ ...pulse, branches: [...pulse.branches!.slice(0, 3), bank("C2", edge - parallel)] });
    const { time_s, value } = matched.step.slow;
    const lowest = Math.min(...value);
    expectRelative(1 - lowest, 0.002482, 3e-3, "modal sum of the same network; at the nearest drawn time");
    const when = time_s[value.indexOf(lowest)]!;
    expect(when).toBeGreaterThan(1e-3);
    expect(when).toBeLessThan(20e-3);
  });
  it("has its pole where the arms hand over", () => {
    expectRelative(figure(proof, "response.lvPole_Hz"), 31.13, 5e-3, "given for the matched arm");
  });
  it("shows dc and edge of a lost LV arm side by side: 166 V and 5.49 kV", () => {
    const lost = fault(proof, "lvArmLost");
    expectRelative(lost.output_V, 166.1, 1e-3, "four digits given");
    expectRelative(lost.fastOutput_V, 5.49e3, 2e-3, "three digits given");
  });
  it("stops with one LV resistor and capacitor alone, and not when they are split in three", () => {
    const alone = proven({ ...pulse, branches: [fixed("R2", 405063), bank("C2", 17.553e-9)] });
    expect(finding(alone, "fault.lvCapacitorOpen.1")?.level).toBe("stop");
    expect(alone.level).toBe("stop");
    expect(proof.findings.filter((each) => each.id.startsWith("fault.") && each.level === "stop")).toEqual([]);
    expectRelative(
      fault(proof, "lvCapacitorOpen.1").fastOutput_V,
      71.7,
      1e-2,
      "a third of the capacitance gone; three digits",
    );
  });
  it("split as 3 × 1.21 MΩ has scale factor 1003.05, and 765.03 with one open: 62.7 V at dc", () => {
    const three = proven({
      ...pulse,
      branches: [fixed("a", 1.21e6), fixed("b", 1.21e6), fixed("c", 1.21e6), bank("C", 17.553e-9)],
    });
    expectRelative(figure(three, "scaleFactor.predicted"), 1003.05, 1e-5, "six digits given");
    expectRelative(fault(three, "lvBranchOpen.1").output_V, 48000 / 765.03, 1e-4, "five digits given");
  });
  it("without strays in mind would read pulses 9.35 % low", () => {
    const naive = proven({ ...pulse, branches: [...pulse.branches!.slice(0, 3), bank("C2", 19.5638e-9 - 132e-12)] });
    expectRelative(1 - naive.step.fast.value[0]!, 0.0935, 1e-2, "three digits; the tap counts in");
  });
});

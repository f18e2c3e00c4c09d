import { describe, expect, it } from "vitest";
import { figure, figureOf, finding, fixed, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

// Invented scenario, computed independently: 8 kV rms + 10 %, bench meter ac 1 MΩ ‖ 100 pF, cable 120 pF, 40 × 1 MΩ of 0.6 W, 350 V.
const mains: Sketch = {
  waveform: { kind: "sine", nominal_V: 8000, statedAs: "rms", greatest_Vpeak: null, frequency_Hz: 50 },
  brief: { band_Hz: [50, 1000], wantedUncertainty: 0.01 },
  family: { ratedDissipation_W: 0.6, limitingVoltage_V: 350 },
  elements: 40,
  resistance_ohm: 1e6,
  strays: { from: "typed", toEarth_F: new Array(39).fill(0.3e-12) },
  instrument: {
    function: "bench meter ac",
    resistance_ohm: 1e6,
    capacitance_F: 100e-12,
    greatestInput_Vpeak: 1060,
    readingAccuracy: 1e-3,
    cable: { length_m: 1.2, capacitance_F_per_m: 1e-10, impedance_ohm: 50 },
  },
  branches: [fixed("R2a", 2 * 41710), fixed("R2b", 2 * 41710)],
};

describe("a test transformer into an ac meter", () => {
  const proof = proven(mains);
  it.each([
    ["working.greatest_Vpeak", 12445],
    ["lvArm.withInstrument_ohm", 40.04e3],
    ["lvArm.wanted_ohm", 41.71e3],
    ["scaleFactor.predicted", 1000],
    ["input.dissipation_W", 1.6],
  ])("has %s = %f", (path, expected) => expectRelative(figure(proof, path), expected, 1e-3, "four digits given"));
  it("stands 220 V rms and 311 V peak an element at high mains, 48.4 mW: over the 60 % rule, under the rating", () => {
    expectRelative(figureOf(proof, "element.greatestRms_V"), 220, 2e-3, "three digits given, R2 counts in");
    expectRelative(figureOf(proof, "element.greatest_Vpeak"), 311, 2e-3, "three digits given");
    expectRelative(figureOf(proof, "element.dissipation_W"), 48.4e-3, 4e-3, "three digits given");
    expect(finding(proof, "element.voltage.rms")?.level).toBe("caution");
    expectRelative(finding(proof, "element.voltage.rms")!.actual! / 350, 0.629, 2e-3, "62.9 % of the rating");
  });
  it("has its LV pole at 18.09 kHz", () => {
    const bare = proven({ ...mains, strays: { from: "typed", toEarth_F: [] } });
    expectRelative(figure(bare, "response.lvPole_Hz"), 18.09e3, 2e-3, "four digits given");
  });
  it("stops a 1.2 GΩ dc string on 50 Hz, 12.8 % low", () => {
    const wrong = proven({
      ...mains,
      brief: { band_Hz: [50, 50], wantedUncertainty: 0.01 },
      elements: 200,
      resistance_ohm: 6e6,
      strays: { from: "typed", toEarth_F: new Array(199).fill(14e-12 / 200) },
      instrument: {
        ...mains.instrument,
        resistance_ohm: 1e9,
        capacitance_F: 0,
        cable: { length_m: 1, capacitance_F_per_m: 0, impedance_ohm: 50 },
      },
      branches: [fixed("a", 2.4e6), fixed("b", 2.4e6)],
    });
    expect(finding(wrong, "response.band")?.level).toBe("stop");
    expectRelative(finding(wrong, "response.band")!.actual!, 0.1284, 2e-2, "12.8 % for the continuous line");
  });
});

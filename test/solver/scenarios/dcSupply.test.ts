import { describe, expect, it } from "vitest";
import { fault, figure, figureOf, fixed, instrument, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

// Invented scenario, computed independently: 6 kV dc, 220 kΩ source, 12 × 100 MΩ, 10 MΩ meter, scale factor 1000.
const R2 = 1365187.7133105802;
const supply: Sketch = {
  waveform: { greatest_Vpeak: 6000 },
  source: { resistance_ohm: 220e3 },
  elements: 12,
  resistance_ohm: 100e6,
  branches: [fixed("R2a", 2 * R2), fixed("R2b", 2 * R2)],
};
const resistive = "resistive figures are given to 0.01 %";

describe("a dc supply into a hand-held meter", () => {
  const proof = proven(supply);
  it.each([
    ["hvArm.resistance_ohm", 1.2e9],
    ["lvArm.wanted_ohm", 1.365188e6],
    ["lvArm.withInstrument_ohm", 1.201201e6],
    ["scaleFactor.predicted", 1000],
    ["input.current_A", 4.995e-6],
    ["input.dissipation_W", 29.97e-3],
    ["source.sag", 183e-6],
    ["scaleFactor.instrumentShare", 0.12012],
    ["reading.atWorking_V", 6],
  ])("has %s = %f", (path, expected) => {
    expectRelative(figure(proof, path), expected, path === "source.sag" ? 3e-3 : 1e-4, resistive);
  });
  it("shares voltage and dissipation equally", () => {
    expectRelative(figureOf(proof, "element.voltage_Vdc", 11), 499.5, 1e-4, resistive);
    expectRelative(figureOf(proof, "element.dissipation_W", 0), 2.495e-3, 1e-3, "four digits given");
  });
  it.each([
    [9.9e6, 1001.212],
    [10.1e6, 998.812],
  ])("has another scale factor on a meter of %f Ω", (resistance_ohm, F) => {
    expectRelative(
      figure(proven({ ...supply, instrument: { resistance_ohm } }), "scaleFactor.predicted"),
      F,
      1e-5,
      resistive,
    );
  });
  it("puts 49.59 V on the meter when the whole LV arm is lost, and 6.818 V at the plug when it is pulled", () => {
    expectRelative(fault(proof, "lvArmLost").output_V, 49.587, 1e-4, resistive);
    expectRelative(fault(proof, "unplugged").output_V, 6.818, 1e-4, resistive);
    expect(proof.level).not.toBe("stop");
  });
});

describe("five instruments on the same LV arm", () => {
  const others = [
    ["hiz", 1e10, 880.12, 6.8173, 0.1362],
    ["eleven", 11e6, 989.09, 6.0662, 0.011],
    ["elevenOne", 11.1e6, 988.11, 6.0722, 0.012],
    ["ac", 1e6, 2080, 2.8846, -0.519],
  ] as const;
  const proof = proven({
    ...supply,
    others: others.map(([id, resistance_ohm]) => instrument({ id, name: id, resistance_ohm })),
  });
  it.each(others)(
    "%s: %f Ω has scale factor %f, shows %f V, error %f if the old one is used",
    (id, _, F, reading, error) => {
      const row = proof.instruments.find((each) => each.id === id)!;
      expectRelative(row.scaleFactor, F, 1e-4, resistive);
      expectRelative(row.readingAtWorking_V, reading, 1e-4, resistive);
      expectRelative(row.errorIfReused, error, 1e-2, "error given to two or three digits");
    },
  );
});

describe("a supply that sags: 30 kV behind 80 MΩ", () => {
  it.each([
    [1e9, 0.0741],
    [5e9, 0.01575],
    [10e9, 0.00794],
    [20e9, 0.00398],
  ])("R1 = %f Ω costs %f", (R1, sag) => {
    const proof = proven({
      waveform: { nominal_V: 30000, greatest_Vpeak: 30000 },
      brief: { scaleFactor: 10000 },
      source: { resistance_ohm: 80e6 },
      elements: 10,
      resistance_ohm: R1 / 10,
      branches: [fixed("R2a", 2e6), fixed("R2b", 2e6)],
    });
    expectRelative(figure(proof, "source.sag"), sag, 2e-3, "three digits; R2 counts in");
  });
  it("needs an LV arm of 1.111235 MΩ at 10 GΩ", () => {
    const proof = proven({
      brief: { scaleFactor: 10000 },
      elements: 10,
      resistance_ohm: 1e9,
      branches: [fixed("R2a", 1e6)],
    });
    expectRelative(figure(proof, "lvArm.wanted_ohm"), 1.111235e6, 1e-6, "seven digits given");
  });
});

import { describe, expect, it } from "vitest";
import { proveAt } from "../../../src/solver/index.ts";
import { figure, fixed, invented, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

// Invented scenarios, computed independently: what strays and LV capacitance do to a string without capacitors.
const quiet = { length_m: 1, capacitance_F_per_m: 0, impedance_ohm: 50 };
const bare = (n: number, R1: number, R2: number, Ce: number, more: Partial<Sketch> = {}): Sketch => ({
  waveform: { kind: "sine", nominal_V: 8000, statedAs: "rms", frequency_Hz: 50 },
  brief: { band_Hz: [50, 50] },
  elements: n,
  resistance_ohm: R1 / n,
  strays: { from: "typed", toEarth_F: new Array(n - 1).fill(Ce / n) },
  branches: [fixed("a", 2 * R2), fixed("b", 2 * R2)],
  ...more,
  instrument: { function: "bench meter ac", resistance_ohm: 1e9, cable: quiet, ...more.instrument },
});
const at = (s: Sketch, f: number) => {
  const { frequency } = proveAt(invented(s), [f], []);
  return { error: 10 ** (frequency.magnitude_dB[0]! / 20) - 1, phase_deg: frequency.phase_deg[0]! };
};

describe("the pole of the LV arm alone: 40 MΩ, meter 1 MΩ ‖ 100 pF, cable 120 pF", () => {
  const mains = bare(40, 40e6, 41710, 0, {
    instrument: {
      resistance_ohm: 1e6,
      capacitance_F: 100e-12,
      cable: { length_m: 1.2, capacitance_F_per_m: 1e-10, impedance_ohm: 50 },
    },
  });
  it.each([
    [50, -3.8e-6, 2e-2],
    [350, -187e-6, 3e-3],
    [1000, -0.00153, 4e-3],
  ])("at %f Hz costs %f", (f, error, tolerance) => {
    expectRelative(at(mains, f).error, error, tolerance, "two or three digits given");
  });
});

describe("the string's own strays at 50 Hz", () => {
  it.each([
    [200, 40e6, 12e-12, -126e-6, -1.44, 4e-3],
    [200, 120e6, 14e-12, -0.00154, -5.04, 4e-3],
    [400, 1.2e9, 14e-12, 0.8716 - 1, -47.8, 2e-3],
  ])("%i elements, %f Ω, %f F: %f and %f°", (n, R1, Ce, error, phase_deg, tolerance) => {
    const found = at(bare(n, R1, R1 / 1e6, Ce), 50);
    expectRelative(found.error, error, tolerance, "continuous line, tap at earth; three or four digits given");
    expectRelative(found.phase_deg, phase_deg, tolerance, "continuous line, tap at earth; three digits given");
  });
});

describe("30 kV behind 80 MΩ", () => {
  const sagging = (R1: number, R2: number, resistance_ohm: number, n = 10): Sketch => ({
    waveform: { nominal_V: 30000, greatest_Vpeak: 30000 },
    brief: { scaleFactor: 10000 },
    source: { resistance_ohm: 80e6 },
    elements: n,
    resistance_ohm: R1 / n,
    branches: [fixed("a", 2 * R2), fixed("b", 2 * R2)],
    instrument: { resistance_ohm },
  });
  it("read under one load and under half of it tells the voltage and the resistance of the source", () => {
    const [one, half] = [proven(sagging(10e9, 1.111235e6, 10e6)), proven(sagging(5e9, 1.111235e6 / 2, 5e6))];
    const read = (proof: typeof one) => 30000 * (1 - figure(proof, "source.sag"));
    const [V1, V2, load] = [read(one), read(half), figure(one, "input.resistance_ohm")];
    const open = (V1 * V2) / (2 * V2 - V1);
    expectRelative(V1, 29761.9, 1e-5, "six digits given; R2 counts in");
    expectRelative(V2, 29527.6, 1e-5, "six digits given; R2 counts in");
    expectRelative(open, 30000, 1e-9, "closed form, two-load reading");
    expectRelative(load * (open / V1 - 1), 80e6, 1e-7, "closed form; two nearly equal voltages are subtracted");
    expectRelative(
      figure(one, "input.current_A") * (1 - figure(one, "source.sag")),
      2.976e-6,
      2e-4,
      "four digits given",
    );
  });
  it("with 9 pF along 10 GΩ is 3 dB down at 16.2 Hz and settles to 1 % in 48.3 ms", () => {
    const slow = proven({
      ...sagging(10e9, 1.0001e6, 1e12, 60),
      strays: { from: "typed", toEarth_F: new Array(59).fill(9e-12 / 60) },
    });
    expectRelative(figure(slow, "response.bandwidth_Hz"), 16.2, 3e-3, "three digits given");
    const RC = 10e9 * 9e-12;
    expectRelative(
      figure(slow, "response.settlingTime_s"),
      (RC / Math.PI ** 2) * Math.log(200),
      2e-3,
      "slowest mode alone",
    );
    expectRelative(figure(slow, "response.responseTime_s"), RC / 6, 1e-3, "60 elements: 1 − 1/n²");
  });
});

describe("a divider is not a bleeder", () => {
  it("1 µF through 1.2 GΩ takes 92 minutes from 6 kV to 60 V", () => {
    const proof = proven({
      waveform: { greatest_Vpeak: 6000 },
      source: { capacitance_F: 1e-6 },
      elements: 12,
      resistance_ohm: 100e6,
      branches: [fixed("a", 2.730375e6), fixed("b", 2.730375e6)],
    });
    const wait = figure(proof, "charge.waitTime_s");
    expectRelative(wait, 5526, 1.1e-3, "given without R2, which adds a thousandth");
    expect(wait / 60).toBeGreaterThan(92);
    expect(JSON.stringify(proof.findings)).toMatch(/bleeder|discharge/i);
  });
});

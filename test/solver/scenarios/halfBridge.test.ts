import { describe, expect, it } from "vitest";
import { edgeFormulas, raisedCosineShare } from "../../../src/solver/checks/edgeFormulas.ts";
import { type TimeResponse, timeResponse } from "../../../src/solver/network/timeResponse.ts";
import { samples } from "../../../src/solver/network/waveforms.ts";
import { bank, figure, finding, fixed, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";
import { sketch } from "../network/invented.ts";

// Invented scenario, computed independently: 2.5 kV half bridge, 25 ns edge (10-90 %), F = 1000, R1 = 8 MΩ, raised cosine.
// The continuous line stands for the string there (no count is stated): 40 elements come close to it.
const elements = 40;
const bridge = (C1: number, more: Partial<Sketch> = {}): Sketch => ({
  waveform: {
    kind: "square",
    nominal_V: 2500,
    statedAs: "peak",
    greatest_Vpeak: 2500,
    frequency_Hz: 1e4,
    riseTime_s: 25e-9,
  },
  brief: { band_Hz: [0, 0], wantedUncertainty: 0.03 },
  elements,
  resistance_ohm: 8e6 / elements,
  capacitance_F: C1 * elements,
  strays: { from: "typed", toEarth_F: new Array(elements - 1).fill(0.8e-12 / elements), toElectrode_F: [] },
  branches: [fixed("R2", 8072.65), bank("C2", C1 === 2e-12 ? 1.8708e-9 : 9.858e-9)],
  instrument: { function: "scope 1 MΩ", resistance_ohm: 1e6, capacitance_F: 0, cable: { length_m: 0 } },
  ...more,
});
const withInductance = (C1: number, inductance_H: number) => proven(bridge(C1, { lvInductance_H: inductance_H }));

describe("a 25 ns edge of a half bridge", () => {
  it("rises in 42.35 ns from end to end", () => {
    expectRelative(25e-9 / raisedCosineShare, 42.35e-9, 2e-4, "four digits given");
    expectRelative(((Math.PI * raisedCosineShare) / 25e-9) ** 2 * 1250, 6.879e18, 2e-4, "four digits given");
  });
  it.each([
    [2e-12, 0.0637, 1.8708e-9],
    [10e-12, 0.0132, 9.858e-9],
  ])("of %d F loses %f to the strays", (C1, lost, C2p) => {
    const proof = proven(bridge(C1));
    const left = figure(proof, "hvArm.effectiveCapacitance_F");
    expectRelative(1 - left / C1, lost, 5e-3, "three digits given; 40 elements for a line");
    expectRelative(left * 999, C2p, 1e-3, "capacitive and ladder figures are given to 0.1 %");
  });
  it.each([
    [2e-12, 10e-9, 0.0515, 1e-3, 36.8e6],
    [10e-12, 10e-9, 0.272, 2e-3, 16.0e6],
    [2e-12, 0.5e-9, 0.0026, 2e-2, null],
    [10e-12, 0.5e-9, 0.0136, 4e-3, null],
  ])("C1 %d F with %d H in the LV arm spikes by %f", (C1, L2, spike, rounding, resonance) => {
    const proof = withInductance(C1, L2);
    expectRelative(figure(proof, "lvArm.spikeShare"), spike, rounding, "half of the last digit given");
    if (resonance !== null) {
      expectRelative(figure(proof, "lvArm.resonance_Hz"), resonance, 4e-3, "three digits given");
    }
  });
  it("stops at 10 nH of leads, and not in a ring of 0.5 nH", () => {
    expect(finding(withInductance(10e-12, 10e-9), "lvArm.spike")?.actual).toBeGreaterThan(0.25);
    expect(finding(withInductance(2e-12, 0.5e-9), "lvArm.spike")?.level).toBe("clear");
  });
  it("says what the capacitors' leads would add before they are counted", () => {
    const found = finding(proven(bridge(10e-12)), "lvArm.inductanceNotCounted");
    expectRelative(found?.actual, 0.0272, 3e-3, "1 nH of the invented part, a tenth of 10 nH");
    expect(found?.cure?.edits[0]).toMatchObject({ pointer: "/design/lvArm/inductance_H", value: 1e-9 });
  });
  it("is what the network itself gives, apart from the ring that the start of the edge excites", () => {
    // Independent route: a raised cosine as 4000 straight pieces through the exact response, averaged over one period of the ring.
    const [F, R1, C1, L2] = [1000, 8e6, 2e-12, 1e-9];
    const C2 = C1 * (F - 1);
    const plain = sketch({ n: 1, R: R1, C: C1, R2: R1 / (F - 1), C2 });
    const g = timeResponse({ ...plain, lv: { ...plain.lv, inductance_H: L2 } }) as TimeResponse;
    const whole = 42.35e-9;
    const edge = (t: number) => (1 - Math.cos((Math.PI * t) / whole)) / 2;
    const time_s = Float64Array.from({ length: 4001 }, (_, k) => (k / 4000) * whole);
    const value = time_s.map(edge);
    const ring_s = 2 * Math.PI * Math.sqrt((L2 * C1 * C2) / (C1 + C2));
    const spike = edgeFormulas.spike.compute({ F, L2, C1, tr: whole * raisedCosineShare }) as number;
    for (const share of [0.1, 0.3, 0.7]) {
      const times = Array.from({ length: 24 }, (_, k) => share * whole + (k / 24) * ring_s);
      const extra = times.reduce((sum, t) => sum + samples(g, time_s, value)(t) - edge(t), 0) / times.length;
      const middle = share * whole + (11.5 / 24) * ring_s;
      expectRelative(extra, spike * Math.cos((Math.PI * middle) / whole), 0.02, "second derivative of the edge", spike);
    }
  });
});

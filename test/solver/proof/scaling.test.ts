import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Proof, proveAt } from "../../../src/solver/index.ts";
import { bank, figure, fixed, invented, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

interface Size {
  n: number;
  R: number;
  C: number;
  R2: number;
  C2: number;
  Ce: number;
}
/** A pulse divider with every resistance `s` times and every capacitance 1/s times as large; 6 kV peak. */
const scaled = ({ n, R, C, R2, C2, Ce }: Size, s: number, nominal_V = 6000): Sketch => ({
  waveform: { kind: "pulse", nominal_V, statedAs: "peak", riseTime_s: 1e-6, width_s: 1e-5, repetition_Hz: 1000 },
  brief: { band_Hz: [10, 1e5] },
  elements: n,
  resistance_ohm: R * s,
  capacitance_F: C / s,
  branches: [fixed("a", R2 * s), fixed("b", R2 * s), bank("C", C2 / s)],
  strays: {
    from: "typed",
    toEarth_F: new Array(n - 1).fill(Ce / n / s),
    toElectrode_F: new Array(n - 1).fill(Ce / (3 * n) / s),
    electrodeToTap_F: Ce / 100 / s,
  },
  instrument: {
    function: "scope 1 MΩ",
    resistance_ohm: 1e6 * s,
    capacitance_F: 20e-12 / s,
    greatestInput_Vpeak: 300,
    cable: { length_m: 1, capacitance_F_per_m: 1e-10 / s, impedance_ohm: 50 },
  },
});
const sizes = fc.record({
  n: fc.integer({ min: 2, max: 40 }),
  R: fc.double({ min: 1e5, max: 1e8, noNaN: true }),
  C: fc.double({ min: 1e-12, max: 1e-9, noNaN: true }),
  R2: fc.double({ min: 1e4, max: 1e6, noNaN: true }),
  C2: fc.double({ min: 1e-10, max: 1e-7, noNaN: true }),
  Ce: fc.double({ min: 1e-13, max: 2e-11, noNaN: true }),
});
const frequencies = [1, 1e3, 1e5, 1e7];
const times = [1e-8, 1e-6, 1e-4, 1e-2];
const sameSize = ["lvArm.capacitanceHighFrequency_F", "lvArm.capacitanceResponseTime_F"] as const;

describe("every R times s and every C through s", () => {
  it("leaves frequency response, step response and scale factor as they were", () => {
    fc.assert(
      fc.property(sizes, fc.constantFrom(0.25, 2, 3.7), (size, s) => {
        const [a, b] = [scaled(size, 1), scaled(size, s)];
        const [x, y] = [a, b].map((each) => proveAt(invented(each), frequencies, times));
        frequencies.forEach((_, i) => {
          const [p, q] = [x!, y!].map((each) => 10 ** (each.frequency.magnitude_dB[i]! / 20));
          expectRelative(q, p!, 1e-8, "the same network", Math.max(p!, 1));
        });
        times.forEach((_, i) => {
          expectRelative(y!.step.value[i], x!.step.value[i]!, 1e-6, "the same network", Math.max(x!.step.value[i]!, 1));
        });
        const [p, q] = [proven(a), proven(b)];
        expectRelative(figure(q, "scaleFactor.predicted"), figure(p, "scaleFactor.predicted"), 1e-12, "closed form");
        expectRelative(figure(q, "response.lvPole_Hz"), figure(p, "response.lvPole_Hz"), 1e-12, "τ is unchanged");
        expectRelative(figure(q, "input.dissipation_W") * s, figure(p, "input.dissipation_W"), 1e-9, "V²/R");
        for (const path of sameSize) {
          const [C, D] = [figure(p, path), figure(q, path)];
          if (C === null) expect(D).toBeNull();
          else expectRelative(D * s, C, 1e-6, "capacitance through s", Math.max(Math.abs(C), 1e-10));
        }
      }),
      { numRuns: 12 },
    );
  });
});

describe("twice the voltage", () => {
  const list = (proof: Proof, path: string) => proof.sheet.values[path] as number[];
  it("doubles voltages, quadruples dissipation, leaves the scale factor without voltage effect alone", () => {
    fc.assert(
      fc.property(sizes, (size) => {
        const [p, q] = [proven(scaled(size, 1)), proven(scaled(size, 1, 12000))];
        expectRelative(figure(q, "scaleFactor.predicted"), figure(p, "scaleFactor.predicted"), 1e-12, "linear");
        expectRelative(figure(q, "reading.atWorking_V"), 2 * figure(p, "reading.atWorking_V"), 1e-12, "linear");
        expectRelative(list(q, "element.voltage_Vpeak")[0], 2 * list(p, "element.voltage_Vpeak")[0]!, 1e-9, "linear");
        expectRelative(figure(q, "input.dissipation_W"), 4 * figure(p, "input.dissipation_W"), 1e-9, "V²/R");
        expect(figure(p, "input.dissipation_W")).toBeGreaterThan(0);
        q.faults.forEach((row, i) => {
          const before = p.faults[i]!;
          expectRelative(row.output_V, 2 * before.output_V, 1e-9, row.id, Math.max(before.output_V, 1e-9));
          expectRelative(row.fastOutput_V, 2 * before.fastOutput_V, 1e-9, row.id, Math.max(before.fastOutput_V, 1e-9));
        });
      }),
      { numRuns: 12 },
    );
  });
});

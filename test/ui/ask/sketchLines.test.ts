import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Waveform } from "../../../src/solver/index.ts";
import { apart, sketchNumbers } from "../../../src/ui/ask/sketchLines.ts";
import { expectRelative } from "../../support/relative.ts";

const wave = (change: Partial<Waveform>): Waveform => ({
  kind: "sine",
  nominal_V: 230,
  statedAs: "rms",
  greatest_Vpeak: null,
  frequency_Hz: 50,
  riseTime_s: null,
  width_s: null,
  repetition_Hz: null,
  ...change,
});

describe("the numbers on the sketch", () => {
  it("of a sine stated as rms: peak √2 of it, twice that from peak to peak, mean 0", () => {
    const { lines, peakToPeak_V } = sketchNumbers(wave({}));
    expect(lines.map(({ name }) => name)).toEqual(["mean", "rms", "peak"]);
    expectRelative(lines[2]!.value_V, 325.2691193458119, 1e-14, "230·√2 by hand");
    expectRelative(peakToPeak_V, 650.5382386916237, 1e-14, "2·230·√2 by hand");
    expect(lines[0]!.value_V).toBe(0);
  });

  it("of dc: one line for all three, downward for a negative voltage", () => {
    const { lines, peakToPeak_V, bottom_V, top_V } = sketchNumbers(
      wave({ kind: "dc", statedAs: "dc", nominal_V: -6000 }),
    );
    expect(lines).toEqual([{ name: "mean = rms = peak", value_V: -6000 }]);
    expect([peakToPeak_V, bottom_V, top_V]).toEqual([0, -6000, 0]);
  });

  it("of a pulse train by its duty", () => {
    const { lines } = sketchNumbers(
      wave({ kind: "pulse", statedAs: "peak", nominal_V: 1000, width_s: 1e-3, repetition_Hz: 100 }),
    );
    expectRelative(lines.find(({ name }) => name === "mean")!.value_V, 100, 1e-14, "duty 0.1");
    expectRelative(lines.find(({ name }) => name === "rms")!.value_V, 316.22776601683796, 1e-14, "√0.1 of the peak");
  });
});

describe("labels beside lines", () => {
  it("keep apart and keep their order, without drifting as a whole", () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0, max: 100, noNaN: true }), { minLength: 1, maxLength: 5 }), (wanted) => {
        const placed = apart(wanted, 15);
        const sorted = [...placed].sort((a, b) => a - b);
        for (let k = 1; k < sorted.length; k++) expect(sorted[k]! - sorted[k - 1]!).toBeGreaterThanOrEqual(15 - 1e-9);
        const sum = (list: readonly number[]) => list.reduce((total, each) => total + each, 0);
        expectRelative(sum(placed), sum(wanted), 1e-12, "sums of a few numbers", 100);
      }),
    );
  });
});

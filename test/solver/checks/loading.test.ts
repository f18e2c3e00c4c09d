import { describe, expect, it } from "vitest";
import { bank, figure, finding, fixed, instrument, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

// Invented scenario, computed independently: 6 kV on 12 × 100 MΩ into a 10 MΩ meter, scale factor 1000: 4.995 µA, 6.000 V.
const meter: Sketch = {
  waveform: { greatest_Vpeak: 6000 },
  elements: 12,
  resistance_ohm: 100e6,
  branches: [fixed("a", 2.730375e6), fixed("b", 2.730375e6)],
};
const level = (s: Sketch, id: string) => finding(proven(s), id)?.level;

describe("what the source gives", () => {
  it.each([
    [null, undefined],
    [24e-6, "stop"],
    [26e-6, "clear"],
  ])("a limit of %s A against five times 4.995 µA: %s", (currentLimit_A, expected) =>
    expect(level({ ...meter, source: { currentLimit_A } }, "source.current")).toBe(expected),
  );
  it.each([
    [1e6, "clear"],
    [35e6, "clear"],
    [40e6, "stop"],
  ])("%f Ω inside against a wish of 3 %%: %s", (resistance_ohm, expected) =>
    expect(level({ ...meter, source: { resistance_ohm } }, "source.sag")).toBe(expected),
  );
});

describe("a source on the mains", () => {
  it.each([
    [false, undefined],
    [true, "caution"],
  ])("without isolation %s: %s", (mainsConnected, expected) =>
    expect(level({ ...meter, source: { mainsConnected } }, "source.mainsConnected")).toBe(expected),
  );
});

describe("what the instrument sees: 6.000 V", () => {
  it.each([
    [5.9, "stop"],
    [6.1, "caution"],
    [7.4, "caution"],
    [7.6, "clear"],
  ])("with %f V as its greatest input: %s", (greatestInput_Vpeak, expected) =>
    expect(level({ ...meter, instrument: { greatestInput_Vpeak } }, "instrument.input")).toBe(expected),
  );
  it.each([
    [5.9, "stop"],
    [6.1, "clear"],
  ])("on a locked range of %f V: %s", (range_V, expected) =>
    expect(level({ ...meter, instrument: { range_V } }, "instrument.range")).toBe(expected),
  );
  it("is judged on the range by magnitude when the voltage is negative", () => {
    const negative = { ...meter, waveform: { nominal_V: -6000, greatest_Vpeak: 6000 } };
    expect(level({ ...negative, instrument: { range_V: 5.9 } }, "instrument.range")).toBe("stop");
    expectRelative(figure(proven(negative), "reading.atWorking_V"), -6, 1e-6, "R2 given to seven digits");
  });
  it("uses rms for an ac meter and the peak for a scope", () => {
    const sine = { kind: "sine", nominal_V: 6000, statedAs: "rms", frequency_Hz: 50, greatest_Vpeak: null };
    const of = (kind: string) =>
      figure(proven({ ...meter, waveform: sine, instrument: { function: kind } }), "reading.atWorking_V");
    expectRelative(of("meter ac"), 6, 1e-6, "R2 given to seven digits");
    expectRelative(of("scope 1 MΩ"), 6 * Math.SQRT2, 1e-6, "R2 given to seven digits");
  });
  it("a second instrument that may see less than it would has a row of its own that says so", () => {
    const proof = proven({
      ...meter,
      others: [instrument({ id: "weak", resistance_ohm: 1e10, greatestInput_Vpeak: 5 })],
    });
    const row = proof.instruments.find((each) => each.id === "weak")!;
    expect(row.readingAtGreatest_Vpeak).toBeGreaterThan(row.greatestInput_Vpeak);
    expectRelative(row.readingAtGreatest_Vpeak, 6.8173, 1e-4, "five digits given");
  });
});

describe("an edge with nothing broken", () => {
  // 12 × 120 pF in series are 10 pF, against 50 pF of the meter: a sixth of the voltage, less what is fitted beside it.
  const edge = (fitted_F: number): Sketch => ({
    ...meter,
    capacitance_F: 120e-12,
    strays: { from: "typed" },
    instrument: { capacitance_F: 50e-12 },
    branches: [...meter.branches!, ...(fitted_F > 0 ? [bank("C", fitted_F)] : [])],
  });
  it("of 6 kV puts 1 kV on a bare meter: a stop where it may see less, none where it may see more or C is fitted", () => {
    const under = { ...edge(0), instrument: { capacitance_F: 50e-12, greatestInput_Vpeak: 1001 } };
    expect(level(under, "instrument.edge")).toBeUndefined();
    const over = { ...edge(0), instrument: { capacitance_F: 50e-12, greatestInput_Vpeak: 999 } };
    const found = finding(proven(over), "instrument.edge")!;
    expect(found.level).toBe("stop");
    expectRelative(found.actual, 1000, 1e-9, "capacitive divider of 10 and 50 pF");
    expect(level({ ...over, branches: edge(1e-9).branches! }, "instrument.edge")).toBeUndefined();
  });
});

describe("surroundings", () => {
  it.each([
    [0.7, undefined],
    [0.71, "caution"],
  ])("a relative humidity of %f: %s", (relativeHumidity, expected) =>
    expect(level({ ...meter, surroundings: { relativeHumidity } }, "surroundings.humidity")).toBe(expected),
  );
  it.each([
    [2000, 1],
    [5000, 1.48],
  ])("the tabulated clearance at %f m is %f times that at 2000 m", (altitude_m, factor) => {
    const at = (h: number) =>
      figure(proven({ ...meter, surroundings: { altitude_m: h } }), "insulation.tableClearance_m");
    // IEC 60664-1 ed. 3 (2020) table A.2; figures from a secondary copy, primary not seen.
    expectRelative(at(altitude_m) / at(0), factor, 1e-9, "table entry");
  });
  it("no altitude lowers what is required", () => {
    const required = (altitude_m: number) =>
      figure(proven({ ...meter, surroundings: { altitude_m } }), "insulation.clearance_m");
    const heights = [-50, 0, 1000, 2000, 3500, 8000, 20000].map(required);
    heights.slice(1).forEach((each, i) => {
      expect(each).toBeGreaterThanOrEqual(heights[i]!);
    });
  });
});

describe("dc strings on alternating voltage", () => {
  it.each([
    [50, "stop"],
    [1000, "stop"],
  ])("1.2 GΩ with 14 pF to earth, asked to %f Hz: %s", (f, expected) => {
    const s: Sketch = {
      ...meter,
      waveform: { kind: "sine", nominal_V: 6000, statedAs: "rms", frequency_Hz: f },
      brief: { band_Hz: [f, f] },
      elements: 60,
      resistance_ohm: 20e6,
      strays: { from: "typed", toEarth_F: new Array(59).fill(14e-12 / 60) },
      instrument: { function: "meter ac" },
    };
    expect(level(s, "response.band")).toBe(expected);
    expect(
      level({ ...s, waveform: { greatest_Vpeak: 6000 }, brief: { band_Hz: [0, 0] } }, "response.band"),
    ).toBeUndefined();
  });
  it("an ac meter on dc shows nothing: a stop", () =>
    expect(level({ ...meter, instrument: { function: "meter ac" } }, "instrument.function")).toBe("stop"));
});

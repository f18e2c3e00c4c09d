import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { prove } from "../../../src/solver/index.ts";
import { bank, figure, finding, fixed, invented, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

const meter: Sketch = {
  elements: 12,
  resistance_ohm: 100e6,
  branches: [fixed("a", 2.730375e6), fixed("b", 2.730375e6)],
};
const scope: Sketch = {
  ...meter,
  waveform: { kind: "pulse", nominal_V: 6000, statedAs: "peak", riseTime_s: 1e-6, width_s: 1e-5, repetition_Hz: 0 },
  brief: { band_Hz: [1e3, 3.5e5] },
  resistance_ohm: 10e6,
  capacitance_F: 100e-12,
  instrument: { function: "scope 1 MΩ", resistance_ohm: 1e6, greatestInput_Vpeak: 300, readingAccuracy: 0.02 },
  branches: [fixed("a", 272.9e3), fixed("b", 272.9e3), bank("C", 4e-9), bank("D", 4e-9)],
};
const level = (s: Sketch, id: string) => finding(proven(s), id)?.level;

describe("planted weaknesses", () => {
  it("one LV resistor alone: a caution where the meter stands it, a stop where it does not", () => {
    expect(level({ ...meter, branches: [fixed("R2", 1365188)] }, "lvArm.single")).toBe("caution");
    const fragile = {
      ...scope,
      instrument: { ...scope.instrument, resistance_ohm: 1e8 },
      branches: [fixed("R2", 1.2e5), bank("C", 8e-9)],
    };
    expect(level(fragile, "fault.lvOpen")).toBe("stop");
  });
  it("an open LV arm: a stop", () => expect(level({ ...meter, branches: [] }, "lvArm.none")).toBe("stop"));
  it("a trimmer alone as the LV arm: a stop", () => {
    const s: Sketch = {
      ...meter,
      branches: [{ name: "T", series: [{ part: "t", rheostat: { least_ohm: 0, greatest_ohm: 2e6, setting: 0.7 } }] }],
    };
    const document = invented({ ...meter });
    const trimmer = {
      id: "t",
      kind: "trimmer" as const,
      name: "trimmer",
      origin: "typed" as const,
      tolerance: 0.1,
      bodyLength_m: 0.01,
      bodyDiameter_m: 0.01,
      quantity: "ohm" as const,
      spans: [2e6],
      leastShare: 0,
      turns: 25,
      ratedVoltage_V: 300,
    };
    const design = { ...document.design!, lvArm: { ...document.design!.lvArm, branches: s.branches as never } };
    const proof = prove({ ...document, parts: [...document.parts, trimmer], design });
    expect(proof.ok && proof.value.findings.find((each) => each.id === "lvArm.rheostatAlone")?.level).toBe("stop");
  });
  it("a class 2 capacitor in either arm: a stop", () => {
    expect(level({ ...scope, capacitorClass: "class2" }, "dielectric.hvArm")).toBe("stop");
    expect(
      level(
        { ...scope, branches: [fixed("a", 272.9e3), fixed("b", 272.9e3), bank("C", 8e-9, "c2")] },
        "dielectric.lvArm",
      ),
    ).toBe("stop");
    expect(level(scope, "dielectric.hvArm")).toBeUndefined();
  });
  it("a column too short for creepage or clearance: a stop", () => {
    expect(level({ ...meter, geometry: { columnLength_m: 0.06, columnDiameter_m: 0.01 } }, "creepage.column")).toBe(
      "stop",
    );
    expect(level({ ...meter, geometry: { columnLength_m: 0.02, columnDiameter_m: 0.005 } }, "clearance.column")).toBe(
      "stop",
    );
    expect(level(meter, "creepage.column")).toBe("clear");
  });
  it("a body too short for its share of the voltage: a stop", () => {
    expect(level({ ...meter, family: { bodyLength_m: 0.003 } }, "creepage.element")).toBe("stop");
  });
  it("an LV arm on the instrument's side of the plug: a stop", () =>
    expect(level({ ...meter, stays: "withInstrument" }, "lvArm.stays")).toBe("stop"));
  it("a floating source: a stop, with its cure", () => {
    const proof = proven({ ...meter, source: { earth: "floating" } });
    expect(finding(proof, "source.earth")).toMatchObject({
      level: "stop",
      cure: { edits: [{ pointer: "/brief/source/earth" }] },
    });
  });
  it("a scope at 50 Ω: a stop", () =>
    expect(level({ ...scope, instrument: { ...scope.instrument, resistance_ohm: 50 } }, "instrument.fiftyOhm")).toBe(
      "stop",
    ));
  it("a scale factor that no LV arm gives: a stop that names what the meter alone divides by", () => {
    const proof = proven({ ...meter, brief: { scaleFactor: 100 }, elements: 10 });
    expect(finding(proof, "scaleFactor.existence")).toMatchObject({ level: "stop" });
    expect(finding(proof, "scaleFactor.existence")!.reason).toMatch(/already divides by 101\b.*Lower R1 below 990\sMΩ/);
    expect(figure(proof, "lvArm.wanted_ohm")).toBeNull();
  });
  it("48 V where kilovolts may be meant: a question, the value kept", () => {
    const proof = proven({ ...meter, waveform: { nominal_V: 48 } });
    expect(finding(proof, "voltage.low")).toMatchObject({ level: "caution", cure: { edits: [{ value: 48000 }] } });
    expect(figure(proof, "working.peak_V")).toBe(48);
  });
  it("a greatest peak below the working peak: a stop that shows both", () => {
    const found = finding(proven({ ...meter, waveform: { greatest_Vpeak: 5000 } }), "voltage.greatest");
    expect(found).toMatchObject({ level: "stop" });
    expect(found!.reason).toMatch(/5\.00\skV.*6\.00\skV/);
  });
  it("a negative voltage: sizes by its magnitude, the reading keeps its sign", () => {
    const [a, b] = [proven(meter), proven({ ...meter, waveform: { nominal_V: -6000 } })];
    expect(b.sheet.values["element.voltage_Vpeak"]).toEqual(a.sheet.values["element.voltage_Vpeak"]);
    expect(figure(b, "reading.atWorking_V")).toBe(-figure(a, "reading.atWorking_V"));
    expect(b.findings.map((each) => [each.id, each.level])).toEqual(a.findings.map((each) => [each.id, each.level]));
  });
  it("over the derating is a caution, over the rating a stop", () => {
    expect(level({ ...meter, family: { limitingVoltage_V: 800 } }, "element.voltage.rms")).toBe("caution");
    expect(level({ ...meter, family: { limitingVoltage_V: 400 } }, "element.voltage.rms")).toBe("stop");
    expect(level({ ...meter, family: { limitingVoltage_V: 2000 } }, "element.voltage.rms")).toBe("clear");
  });
  it("altitude: factor 1 below 2000 m, refused above 20 000 m", () => {
    const [sea, low] = [proven(meter), proven({ ...meter, surroundings: { altitude_m: -50 } })];
    expect(figure(low, "insulation.tableClearance_m")).toBe(figure(sea, "insulation.tableClearance_m"));
    const { design, ...rest } = invented(meter);
    const high = {
      ...rest,
      design,
      brief: { ...rest.brief, surroundings: { ...rest.brief.surroundings, altitude_m: 30000 } },
    };
    const proof = prove(high);
    expect(proof.ok && proof.value.findings.find((each) => each.id === "surroundings.altitude")?.level).toBe("stop");
  });
  it("a wish tighter than the instrument: a stop; an accuracy of 0: not stated", () => {
    expect(level({ ...meter, brief: { wantedUncertainty: 0.001 } }, "instrument.accuracy")).toBe("stop");
    expect(level({ ...meter, instrument: { readingAccuracy: 0 } }, "instrument.accuracyNotStated")).toBe("caution");
  });
  it("more than half of the voltage lost in the source: cannot be read", () => {
    const found = finding(proven({ ...meter, source: { resistance_ohm: 2e9 } }), "source.sag");
    expect(found).toMatchObject({ level: "stop" });
    expect(found!.reason).toMatch(/cannot be read\. Raise R1 above/);
  });
  it("a duty above 1, a dc function on ac, rms or peak not said", () => {
    expect(
      level({ ...scope, waveform: { ...scope.waveform, width_s: 0.02, repetition_Hz: 100 } }, "voltage.duty"),
    ).toBe("stop");
    const sine = { kind: "sine", nominal_V: 6000, statedAs: "rms", frequency_Hz: 50 };
    expect(level({ ...meter, waveform: sine }, "instrument.function")).toBe("stop");
    const asked = finding(
      proven({ ...meter, waveform: sine, origins: { "/brief/waveform/statedAs": "assumed" } }),
      "voltage.statedAs",
    );
    expect(asked!.reason).toMatch(/8\.49\skV peak.*6\.00\skV/);
  });
  it("an assumed input within reach of its limit turns clear into caution", () => {
    const near = { ...meter, family: { limitingVoltage_V: 1010 } };
    expect(level(near, "element.voltage.rms")).toBe("clear");
    expect(level({ ...near, origins: { "/brief/waveform/nominal_V": "assumed" } }, "element.voltage.rms")).toBe(
      "caution",
    );
  });
});

describe("properties", () => {
  const size = fc.record({
    n: fc.integer({ min: 1, max: 60 }),
    R: fc.double({ min: 1e5, max: 1e9, noNaN: true }),
    V: fc.double({ min: 2000, max: 4e4, noNaN: true }),
    R2: fc.double({ min: 1e4, max: 1e6, noNaN: true }),
  });
  const of = ({ n, R, V, R2 }: { n: number; R: number; V: number; R2: number }): Sketch => ({
    waveform: { nominal_V: V },
    elements: n,
    resistance_ohm: R,
    branches: [fixed("a", R2), fixed("b", R2)],
  });
  it("element voltages and the tap make up the whole; powers make up V²/Rin", () => {
    fc.assert(
      fc.property(size, (s) => {
        const proof = proven(of(s));
        const elements = proof.sheet.values["element.voltage_Vdc"] as number[];
        const tap = (s.V * figure(proof, "lvArm.withInstrument_ohm")) / figure(proof, "input.resistance_ohm");
        expectRelative(elements.reduce((sum, v) => sum + v, 0) + tap, s.V, 1e-9, "voltages in series");
        const power =
          elements.reduce((sum, v) => sum + (v * v) / s.R, 0) + tap ** 2 / figure(proof, "lvArm.withInstrument_ohm");
        expectRelative(power, figure(proof, "input.dissipation_W"), 1e-9, "conservation of energy");
      }),
      { numRuns: 25 },
    );
  });
  it("the scale factor rises when the instrument loads more, and 1 + R1/R2 without it", () => {
    fc.assert(
      fc.property(size, (s) => {
        const F = (resistance_ohm: number) =>
          figure(proven({ ...of(s), instrument: { resistance_ohm } }), "scaleFactor.predicted");
        expect(F(1e6)).toBeGreaterThan(F(1e7));
        expectRelative(F(1e15), 1 + (s.n * s.R) / (s.R2 / 2), 1e-6, "instrument of 1e15 Ω");
      }),
      { numRuns: 15 },
    );
  });
  it("no fault shows more than the whole voltage", () => {
    fc.assert(
      fc.property(size, (s) => {
        for (const row of proven(of(s)).faults) {
          expect(row.output_V).toBeLessThanOrEqual(s.V * 1.2 * (1 + 1e-9));
          expect(row.fastOutput_V).toBeLessThanOrEqual(s.V * 1.2 * (1 + 1e-9));
        }
      }),
      { numRuns: 15 },
    );
  });
});

describe("field case", () => {
  it("a homogeneous field claimed for a string: a stop, and the inhomogeneous case is used", () => {
    const claimed = proven({ ...meter, geometry: { fieldCase: "homogeneous" } });
    expect(finding(claimed, "clearance.fieldCase")?.level).toBe("stop");
    expect(figure(claimed, "insulation.tableClearance_m")).toBe(figure(proven(meter), "insulation.tableClearance_m"));
  });
});

describe("three matches of the LV capacitance", () => {
  it("each is best at what it is for", () => {
    const proof = proven(scope);
    const at = (match: string, key: string) => Math.abs(figure(proof, `match.${match}.${key}`));
    expect(at("highFrequency", "edgeError")).toBeLessThan(1e-9);
    expectRelative(
      at("responseTime", "responseTime_s"),
      0,
      1e-9,
      "zero by construction",
      at("flattest", "responseTime_s"),
    );
    for (const other of ["responseTime", "highFrequency"]) {
      expect(at("flattest", "bandDeviation_dB")).toBeLessThanOrEqual(at(other, "bandDeviation_dB") * (1 + 1e-6));
    }
  });
});

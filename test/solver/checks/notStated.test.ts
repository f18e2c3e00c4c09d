import { describe, expect, it } from "vitest";
import { figure, finding, fixed, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

const meter: Sketch = {
  source: { resistance_ohm: 1e6 },
  elements: 12,
  resistance_ohm: 100e6,
  branches: [fixed("a", 2.730375e6), fixed("b", 2.730375e6)],
};

describe("what is not stated is not met", () => {
  it("no voltage is a stop, though every figure is below its limit", () => {
    const proof = proven({ ...meter, waveform: { nominal_V: 0 } });
    expect(proof.level).toBe("stop");
    expect(finding(proof, "voltage.none")?.level).toBe("stop");
    expect(finding(proof, "voltage.low")).toBeUndefined();
  });
  it("a part without a limiting voltage is a stop that names it; it hides no other", () => {
    const proof = proven({ ...meter, family: { limitingVoltage_V: null } });
    expect(finding(proof, "element.voltage.notStated")).toMatchObject({ level: "stop", element: 1 });
    expect(finding(proof, "element.voltage.rms")).toBeUndefined();
    expect(finding(proof, "element.dissipation")?.level).toBe("clear");
  });
  it("a wanted uncertainty of 0 judges nothing, and says so", () => {
    const proof = proven({ ...meter, brief: { wantedUncertainty: 0 } });
    expect(proof.level).toBe("caution");
    expect(finding(proof, "uncertainty.notStated")?.level).toBe("caution");
    for (const id of ["source.sag", "instrument.accuracy", "scaleFactor.uncertainty"])
      expect(finding(proof, id), id).toBeUndefined();
    expectRelative(figure(proof, "source.sag"), 1e6 / (1e6 + 1.2012012e9), 1e-6, "closed form: still computed");
  });
  const pulse = { kind: "pulse", statedAs: "peak", riseTime_s: 1e-6, width_s: 1e-5, repetition_Hz: 1000 };
  const scope = { function: "scope 1 MΩ" };
  it.each([
    [{}, false],
    [{ repetition_Hz: 0 }, false],
    [{ repetition_Hz: 0, width_s: null }, false],
    [{ repetition_Hz: null }, true],
    [{ width_s: null }, true],
  ])("a pulse with %j: its heat not judged is %s", (more, missing) => {
    const proof = proven({
      ...meter,
      waveform: { ...pulse, ...more },
      brief: { band_Hz: [1, 100] },
      instrument: scope,
    });
    expect(finding(proof, "element.dissipation.notStated")?.level).toBe(missing ? "caution" : undefined);
    expect(finding(proof, "element.dissipation")?.level).toBe(missing ? undefined : "clear");
  });
  it.each([
    [1000, 6000 / Math.sqrt(0.01), undefined],
    [0, 6000, "stop"],
    [null, 6000, "stop"],
  ])("the rms of a pulse repeated %s times a second", (repetition_Hz, peak, expected) => {
    const waveform = { ...pulse, statedAs: "rms", repetition_Hz };
    const proof = proven({ ...meter, waveform, brief: { band_Hz: [1, 100] }, instrument: scope });
    expectRelative(figure(proof, "working.peak_V"), peak, 1e-12, "rms over the root of the duty");
    expect(finding(proof, "voltage.pulseRms")?.level).toBe(expected);
  });
  it("a sag accepted by itself is judged without a wanted uncertainty", () => {
    const proof = proven({ ...meter, brief: { wantedUncertainty: 0 }, policy: { allowedSag: 1e-4 } });
    expect(finding(proof, "source.sag")?.level).toBe("stop");
  });
});

it("a scale factor far off is told as a share, not as a bare number", () => {
  const proof = proven({ ...meter, brief: { scaleFactor: 100 }, elements: 10 });
  expect(finding(proof, "scaleFactor.deviation")?.reason).toMatch(/gives a scale factor \d{3}\s% off the one wanted/);
});

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
  it("a sag accepted by itself is judged without a wanted uncertainty", () => {
    const proof = proven({ ...meter, brief: { wantedUncertainty: 0 }, policy: { allowedSag: 1e-4 } });
    expect(finding(proof, "source.sag")?.level).toBe("stop");
  });
});

it("a scale factor far off is told as a share, not as a bare number", () => {
  const proof = proven({ ...meter, brief: { scaleFactor: 100 }, elements: 10 });
  expect(finding(proof, "scaleFactor.deviation")?.reason).toMatch(/gives a scale factor \d{3}\s% off the one wanted/);
});

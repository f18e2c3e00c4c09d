import { describe, expect, it } from "vitest";
import { restoreDocument } from "../../../src/file/restore.ts";
import { prove } from "../../../src/solver/index.ts";
import { fixed, invented, type Sketch } from "../../support/builders.ts";

const meter: Sketch = {
  elements: 12,
  resistance_ohm: 100e6,
  branches: [fixed("R2a", 2.730375e6), fixed("R2b", 2.730375e6)],
};
const trimmer = {
  id: "t",
  kind: "trimmer",
  name: "invented trimmer",
  origin: "typed",
  tolerance: 0.1,
  bodyLength_m: 0.01,
  bodyDiameter_m: 0.01,
  quantity: "ohm",
  spans: [2e6],
  leastShare: 0,
  turns: 25,
  ratedVoltage_V: 300,
};
const trimmed = (setting: number): Sketch => {
  const branch = { name: "T", series: [{ part: "t", rheostat: { least_ohm: 0, greatest_ohm: 2e6, setting } }] };
  return { ...meter, parts: [trimmer], branches: [fixed("R2a", 2.7e6), branch] };
};
const refused = (s: Sketch) => {
  const proof = prove(invented(s));
  return proof.ok ? null : proof.error;
};

describe("a wire for a resistor is refused with its place", () => {
  it("an element of 0 Ω", () =>
    expect(refused({ ...meter, resistance_ohm: 0 })).toMatchObject({
      where: "/design/hvArm/elements/0/resistance_ohm",
      why: "Element 1 is 0 Ω: a wire is no element.",
    }));
  it("an LV branch of 0 Ω", () => {
    const error = refused({ ...meter, branches: [fixed("R2a", 2.7e6), fixed("R2b", 0)] });
    expect(error).toMatchObject({ where: "/design/lvArm/branches/1/series" });
    expect(error!.why).toMatch(/R2b .*shorts the LV arm/);
  });
  it("a rheostat alone, turned to nought; not a little above", () => {
    expect(refused(trimmed(0))!.cure).toMatch(/turn its rheostat up/);
    expect(refused(trimmed(0.01))).toBeNull();
  });
  it("a branch whose only resistor could not be read", () => {
    const raw = JSON.parse(JSON.stringify(invented(meter)));
    raw.design.lvArm.branches[0].series[0].resistance_ohm = null;
    const restored = restoreDocument(JSON.stringify(raw));
    if (restored.kind === "refused") throw new Error(restored.refusal.why);
    expect(restored.repairs).toHaveLength(1);
    const proof = prove(restored.document);
    expect(proof.ok).toBe(false);
  });
});

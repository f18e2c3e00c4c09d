import { describe, expect, it } from "vitest";
import { encodeDocument } from "../../src/file/encode.ts";
import { restoreDocument } from "../../src/file/restore.ts";

/** A document as a person would write it by hand. */
const byHand = {
  format: "stringwright",
  version: 1,
  name: "by hand",
  brief: {
    waveform: { kind: "pulse", nominal_V: 48e3, statedAs: "peak", greatest_Vpeak: 0, riseTime_s: 1e-7, width_s: 1e-5 },
    scaleFactor: 1000,
    wantedUncertainty: 0.03,
    source: { resistance_ohm: 0 },
  },
  parts: [{ id: "r1", kind: "resistor", ratedDissipation_W: 2, limitingVoltage_V: 3500, tolerance: 0.01 }],
  instruments: [{ id: "scope", function: "scope 1 MΩ" }],
  principal: "scope",
  design: {
    follows: true,
    hvArm: { strings: 1, elements: [{ part: "r1", resistance_ohm: 12e6, capacitance_F: 470e-12 }] },
    lvArm: {
      stays: "withDivider",
      branches: [
        { name: "R2a", series: [{ resistance_ohm: 405063 }] },
        { name: "T1", trimmer: { least: 0, greatest: 6e-11, setting: 0.5 } },
        { name: "K1", link: true, capacitance_F: 1e-10, fitted: true },
      ],
    },
  },
};

const open = (value: unknown) => {
  const restored = restoreDocument(typeof value === "string" ? value : JSON.stringify(value));
  if (restored.kind === "refused") throw new Error(restored.refusal.why);
  return restored;
};

describe("a document written by hand", () => {
  it("opens without a repair, the missing keys filled and marked as assumed", () => {
    const { document, repairs, filled } = open(byHand);
    expect(repairs).toEqual([]);
    expect(document.brief.waveform.greatest_Vpeak).toBeNull();
    expect(document.brief.surroundings.ambient_degC).toBe(23);
    expect(filled).toContain("/brief/surroundings/ambient_degC");
    expect(document.origins["/brief/surroundings/ambient_degC"]).toBe("assumed");
    expect(document.origins["/brief/scaleFactor"]).toBeUndefined();
    expect(document.design?.lvArm.branches[1]).toEqual({
      name: "T1",
      part: "",
      trimmer: { least_F: 0, greatest_F: 6e-11, setting: 0.5 },
    });
    expect(document.instruments[0]?.resistance_ohm).toBe(1e6);
  });

  it("comes back the same after saving", () => {
    const first = open(byHand).document;
    const second = open(encodeDocument(first));
    expect(second.document).toEqual(first);
    expect(second.repairs).toEqual([]);
    expect(second.filled).toEqual([]);
  });
});

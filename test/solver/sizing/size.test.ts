import { describe, expect, it } from "vitest";
import { formulas } from "../../../src/solver/proof/formulas.ts";
import { prove } from "../../../src/solver/proof/prove.ts";
import { sizingFormulas } from "../../../src/solver/sizing/formulas.ts";
import { size } from "../../../src/solver/sizing/size.ts";
import { takeCandidate } from "../../../src/solver/sizing/takeCandidate.ts";
import { evaluate } from "../../../src/solver/standards/sheet.ts";
import { expectRelative } from "../../support/relative.ts";
import { document, type Over } from "./inventedBrief.ts";

const over: Over = {
  brief: { wantedUncertainty: 0.03 },
  waveform: { nominal_V: 6e3, greatest_Vpeak: null },
  source: { resistance_ohm: 220e3, currentLimit_A: 1e-3 },
  policy: { leastCurrent_A: 5e-7 },
};
const doc = document(over);
const result = size(doc, { top: 12 });
if (!result.ok) throw new Error(result.error.why);
const sizing = result.value;

describe("a search over the generic catalogue", () => {
  it("lists what was asked for in order, and accounts for every other family", () => {
    expect(sizing.candidates.length).toBe(12);
    expect(sizing.candidates.map((each) => each.rank)).toEqual([1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12]);
    const families = new Set([
      ...sizing.candidates.map((each) => each.family),
      ...sizing.lost.map((each) => each.family),
    ]);
    expect(families.size).toBeGreaterThanOrEqual(14);
    expect(sizing.considered).toBeGreaterThan(1e5);
    const within = sizing.candidates.filter((each) => each.partsUncertainty <= 0.03).map((each) => each.elementCount);
    expect(within).toEqual([...within].sort((a, b) => a - b));
  });

  it("is the same every time and knows nothing of the former design", () => {
    const again = size(takeCandidate(doc, sizing.candidates[3]!), { top: 12 });
    if (!again.ok) throw new Error(again.error.why);
    expect(again.value.candidates.map((each) => each.design)).toEqual(sizing.candidates.map((each) => each.design));
  });

  it("is plain data that survives JSON", () => {
    expect(JSON.parse(JSON.stringify(sizing))).toEqual(sizing);
  });
});

describe("the sheet of a search", () => {
  it("holds a formula behind every figure, and each recomputes from its inputs", () => {
    const { values, traces } = sizing.sheet;
    let recomputed = 0;
    for (const [path, trace] of Object.entries(traces)) {
      const record = formulas.get(trace.formula);
      expect(record, trace.formula).toBeDefined();
      const value = evaluate(record!, trace.inputs, (each) => values[each], null);
      if (value === null) expect(values[path]).toBeNull();
      else expectRelative(values[path] as number, value, 1e-12, "same formula, same inputs", Math.abs(value) || 1);
      recomputed++;
    }
    expect(recomputed).toBeGreaterThan(100);
    expect(new Set(sizingFormulas.map((each) => each.id)).size).toBe(sizingFormulas.length);
  });

  it("has every candidate's figures under its place", () => {
    sizing.candidates.forEach((each, i) => {
      for (const key of [
        "hvArmResistance_ohm",
        "columnLength_m",
        "partsUncertainty",
        "loading",
        "elementDissipation_W",
      ] as const)
        expect(sizing.sheet.values[`candidates.${i}.${key}`]).toBe(each[key]);
    });
  });
});

describe("a candidate taken as the design", () => {
  it("stands in the proof: no stop, the figures agree, the scale factor is the one wanted", () => {
    for (const candidate of sizing.candidates) {
      const taken = takeCandidate(doc, candidate);
      const proved = prove(taken);
      if (!proved.ok) throw new Error(proved.error.why);
      const figure = (path: string) => {
        const value = proved.value.sheet.values[path];
        return (Array.isArray(value) ? value[0] : value) as number;
      };
      expect(proved.value.findings.filter((each) => each.level === "stop").map((each) => each.id)).toEqual([]);
      expectRelative(figure("scaleFactor.predicted"), 1000, 1e-12, "the trim's setting is solved for");
      expectRelative(figure("hvArm.resistance_ohm"), candidate.hvArmResistance_ohm, 1e-12, "n·R/p");
      expectRelative(figure("element.voltage_Vpeak"), candidate.elementVoltage_Vpeak, 1e-9, "equal shares");
      expectRelative(figure("element.dissipation_W"), candidate.elementDissipation_W, 1e-9, "V²/R");
      expectRelative(figure("source.sag"), candidate.loading, 1e-9, "same formula");
      expect(figure("scaleFactor.uncertainty")).toBeGreaterThan(candidate.partsUncertainty * 0.998);
    }
  });

  it("follows only when told, keeps own parts, drops what the former design alone named", () => {
    const [first, second] = [
      sizing.candidates[0]!,
      sizing.candidates.find((each) => each.family !== sizing.candidates[0]!.family)!,
    ];
    const own = { ...first.parts[0]!, id: "own", origin: "typed" as const };
    const before = takeCandidate(
      { ...doc, parts: [own], typed: { "/brief/scaleFactor": "1k", "/design/lvArm": "x" } },
      first,
    );
    expect(before.design?.follows).toBe(false);
    expect(takeCandidate(doc, first, true).design?.follows).toBe(true);
    const after = takeCandidate(before, second);
    const ids = after.parts.map((part) => part.id);
    expect(ids).toContain("own");
    expect(ids).toContain(second.family);
    expect(ids).not.toContain(first.family);
    expect(new Set(ids).size).toBe(ids.length);
    expect(after.typed).toEqual({ "/brief/scaleFactor": "1k" });
    expect(after.origins["/design/geometry/footHeight_m"]).toBe("assumed");
  });
});

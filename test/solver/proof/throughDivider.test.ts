import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { restoreDocument } from "../../../src/file/restore.ts";
import { proveAt } from "../../../src/solver/proof/proveAt.ts";
import { throughDivider } from "../../../src/solver/proof/throughDivider.ts";
import { expectRelative } from "../../support/relative.ts";

const opened = restoreDocument(readFileSync("demo/pulse-into-scope.json", "utf8"));
if (!("document" in opened)) throw new Error("the demo opens");
const document = opened.document;

describe("a waveform through the design (the pulse demo, invented)", () => {
  it("a jump held is the step response, point by point", () => {
    const times = [0, 1e-7, 1e-6, 1e-5, 1e-4, 1e-3];
    const found = throughDivider(document, { time_s: times, value: times.map(() => 5) });
    const { step } = proveAt(document, [], times);
    found.output.forEach((value, k) => {
      expectRelative(value, 5 * step.value[k]!, 1e-9, "the same circuit");
    });
    expectRelative(found.peakError!, Math.max(...step.value) - 1, 1e-9, "greatest of the step", 1);
  });
  it("a slow ramp is followed, and the sentence says how far off", () => {
    const found = throughDivider(document, { time_s: [0, 10, 20], value: [0, 1, 1] });
    expect(Math.abs(found.peakError!)).toBeLessThan(1e-6);
    expect(found.sentence).toMatch(/^The peak is read right; the reading is off by .* % of the peak at the worst\.$/);
  });
  it("is linear: twice the record, twice the output; and holds no number that is none", () => {
    const time_s = Array.from({ length: 900 }, (_, k) => k * 2e-8);
    const value = time_s.map((t) => Math.exp(-t / 5e-6) - Math.exp(-t / 1e-7));
    const one = throughDivider(document, { time_s, value });
    const two = throughDivider(document, { time_s, value: value.map((each) => 2 * each) });
    expect(one.time_s).toHaveLength(600);
    one.output.forEach((each, k) => {
      expectRelative(two.output[k]!, 2 * each, 1e-12, "linear network", 1);
    });
    expect(throughDivider(document, { time_s: [0, 1], value: [0, 0] }).peakError).toBeNull();
  });
});

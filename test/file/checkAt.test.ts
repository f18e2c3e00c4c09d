import { describe, expect, it } from "vitest";
import { checkAt, defaultAt } from "../../src/file/checkAt.ts";
import { keysOf, valueAt, withoutItemAt, withValueAt } from "../../src/file/pointer.ts";
import { inventedDesign } from "./invented.ts";

const document = inventedDesign();

describe("a JSON pointer", () => {
  it("reads and changes without mutating, keys with / and ~ included", () => {
    const root = { "a/b": { "c~d": [1, 2, 3] }, other: {} };
    const changed = withValueAt(root, "/a~1b/c~0d/1", 9);
    expect(changed).toEqual({ "a/b": { "c~d": [1, 9, 3] }, other: {} });
    expect(changed?.other).toBe(root.other);
    expect(root["a/b"]["c~d"]).toEqual([1, 2, 3]);
    expect(valueAt(root, "/a~1b/c~0d/2")).toBe(3);
    expect(withValueAt(root, "/a~1b/c~0d/-", 4)?.["a/b"]["c~d"]).toEqual([1, 2, 3, 4]);
    expect(withoutItemAt(root, "/a~1b/c~0d/0")?.["a/b"]["c~d"]).toEqual([2, 3]);
    expect(keysOf("/a~1b/")).toEqual(["a/b", ""]);
  });

  it.each(["/list/3", "/list/01", "/list/-1", "/list/x", "/none/deep", "/__proto__/x", "x"])(
    "leads nowhere: %s",
    (pointer) => {
      expect(withValueAt({ list: [1, 2] }, pointer, 0)).toBeUndefined();
      expect(withoutItemAt({ list: [1, 2] }, "/list/-")).toBeUndefined();
    },
  );

  it("does not reach into prototypes", () => {
    expect(valueAt({}, "/constructor/name")).toBeUndefined();
    expect(valueAt([], "/length")).toBe(0);
  });
});

describe("the check of one value", () => {
  it.each([
    ["/brief/waveform/nominal_V", -6000, -6000],
    ["/brief/waveform/greatest_Vpeak", 0, null],
    ["/brief/waveform/greatest_Vpeak", null, null],
    ["/brief/band_Hz", [0, 50], [0, 50]],
    ["/brief/band_Hz/1", 50, 50],
    ["/design/lvArm/branches/2/trimmer/setting", 1, 1],
    ["/design/protectors/0", { part: "g1", at: "divider" }, { part: "g1", at: "divider" }],
    ["/a note", { any: "thing" }, { any: "thing" }],
  ])("lets %s be %j", (pointer, value, stored) => {
    expect(checkAt(document, pointer, value)).toEqual({ ok: true, value: stored });
  });

  it.each([
    ["/brief/surroundings/relativeHumidity", 50, "50 % is 0.5"],
    ["/brief/surroundings/pollutionDegree", 1.5, "whole number"],
    ["/instruments/0/resistance_ohm", 0, "above 0"],
    ["/brief/source/earth", "both", "oneSide, floating, none"],
    ["/brief/source/mainsConnected", "yes", "true or false"],
    ["/brief/band_Hz", [50, 0], "lowest stands after the highest"],
    ["/design/lvArm/branches/0", { name: "?" }, "cannot be told"],
    ["/a note", Number.NaN, "too large"],
    ["/brief/scaleFactor", undefined, "no such place"],
  ])("refuses %s as %j", (pointer, value, word) => {
    const checked = checkAt(document, pointer, value);
    expect(checked.ok ? "" : checked.error.why).toContain(word);
  });

  it("knows the default of a place, and whether it is an assumption", () => {
    expect(defaultAt(document, "/brief/surroundings/altitude_m")).toEqual({
      ok: true,
      value: { value: 1000, assumed: true },
    });
    expect(defaultAt(document, "/brief/policy/series")).toEqual({ ok: true, value: { value: "E24", assumed: false } });
    expect(defaultAt(document, "/design/hvArm/elements/0/resistance_ohm").ok).toBe(false);
    expect(defaultAt(document, "/a note").ok).toBe(false);
  });
});

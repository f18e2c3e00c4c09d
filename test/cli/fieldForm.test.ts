/** The raw geometry's form through the shell: what cannot be used ends in exit 2 with the key, and nothing on standard output. */
import { describe, expect, it } from "vitest";
import { run } from "../../src/cli/run.ts";
import { expectRelative } from "../support/relative.ts";

async function solve(form: unknown) {
  let out = "";
  let said = "";
  const code = await run(["field", "form"], {
    read: () => (typeof form === "string" ? form : JSON.stringify(form)),
    print: (text) => {
      out += text;
    },
    say: (text) => {
      said += text;
    },
  });
  expect(out).not.toMatch(/NaN|Infinity/);
  return { code, out, said };
}
/** Invented column; every part is drawn at once. */
const geometry = {
  elements: 20,
  columnDiameter_m: 0.03,
  columnLength_m: 0.5,
  footHeight_m: 0.15,
  bandFraction: 0.4,
  electrode: { kind: "sphere", radius_m: 0.1, tubeRadius_m: 0.03, thickness_m: 0.02, offset_m: 0 },
  shield: { radius_m: 0.06, from_m: 0.1, to_m: 0.25 },
  box: { radius_m: 0.1, top_m: 0.12 },
  wallDistance_m: null,
};
const form = (more: object = {}, rest: object = {}) => ({
  format: "stringwright-field",
  version: 1,
  geometry: { ...geometry, ...more },
  ...rest,
});

describe("a form that cannot be used", () => {
  it.each([
    ["null", /object/],
    ["[]", /object/],
    ["3", /object/],
    ['{"format":"stringwright"}', /\/format/],
    ['{"format":"stringwright-field","version":1}', /\/geometry/],
    ["", /not JSON/],
  ])("%s", async (text, message) => {
    const { code, out, said } = await solve(text);
    expect(code).toBe(2);
    expect(out).toBe("");
    expect(said).toMatch(message);
  });
  it.each<[object, RegExp]>([
    [{ elements: 0 }, /\/geometry\/elements/],
    [{ elements: 2.5 }, /\/geometry\/elements.*whole/],
    [{ elements: 501 }, /\/geometry\/elements.*500/],
    [{ elements: "20" }, /\/geometry\/elements/],
    [{ columnDiameter_m: undefined }, /\/geometry\/columnDiameter_m/],
    [{ columnDiameter_m: null }, /\/geometry\/columnDiameter_m/],
    [{ columnDiameter_m: -0.03 }, /\/geometry\/columnDiameter_m/],
    [{ columnDiameter_m: 30 }, /\/geometry\/columnDiameter_m/],
    [{ columnLength_m: 0 }, /\/geometry\/columnLength_m/],
    [{ footHeight_m: 0 }, /\/geometry\/footHeight_m/],
    [{ bandFraction: 1 }, /\/geometry\/bandFraction/],
    [{ bandFraction: 0 }, /\/geometry\/bandFraction/],
    [{ pitch_m: 0.025 }, /\/geometry\/pitch_m: This key is not known/],
    [{ electrode: "sphere" }, /\/geometry\/electrode/],
    [{ electrode: { kind: "ball", radius_m: 1 } }, /\/geometry\/electrode\/kind/],
    [{ electrode: { kind: "sphere" } }, /\/geometry\/electrode\/radius_m/],
    [{ electrode: { kind: "toroid", radius_m: 0.1 } }, /\/geometry\/electrode\/tubeRadius_m/],
    [{ electrode: { kind: "disc", radius_m: 0.1 } }, /\/geometry\/electrode\/thickness_m/],
    [{ electrode: { kind: "sphere", radius_m: 0.01 } }, /\/geometry\/electrode\/radius_m.*falls into/],
    [{ electrode: { kind: "sphere", radius_m: 0.1, colour: 1 } }, /\/geometry\/electrode\/colour/],
    [{ shield: { radius_m: 0.06 } }, /\/geometry\/shield\/from_m/],
    [{ shield: { radius_m: 0.01, from_m: 0.1, to_m: 0.2 } }, /\/geometry\/shield\/radius_m.*no wider than the column/],
    [{ shield: { radius_m: 0.06, from_m: 0.1, to_m: 0.7 } }, /\/geometry\/shield.*meets the electrode/],
    [{ shield: { radius_m: 0.01501, from_m: 0.13, to_m: 0.6 } }, /\/geometry:.*unknowns/],
    [{ box: { radius_m: 0.1, top_m: 0.15 } }, /\/geometry\/box\/top_m.*foot/],
    [{ wallDistance_m: 0.1 }, /\/geometry\/wallDistance_m/],
    [{ wallDistance_m: "1" }, /\/geometry\/wallDistance_m/],
  ])("geometry with %j", async (more, message) => {
    const { code, out, said } = await solve(form(more));
    expect(code).toBe(2);
    expect(out).toBe("");
    expect(said).toMatch(message);
    expect(said.trim().split("\n")).toHaveLength(1);
  });
  it.each<[object, RegExp]>([
    [{ version: 2 }, /\/version/],
    [{ version: "1" }, /\/version/],
    [{ more: 1 }, /\/more: This key is not known/],
    [{ ask: { idealisation: "wire" } }, /\/ask\/idealisation/],
    [{ ask: { resolution: 0 } }, /\/ask\/resolution/],
    [{ ask: { resolution: 100 } }, /\/ask\/resolution/],
    [{ ask: { wall: "flat" } }, /\/ask\/wall/],
    [{ ask: { frequencies_Hz: [] } }, /\/ask\/frequencies_Hz/],
  ])("form with %j", async (more, message) => {
    const { code, out, said } = await solve(form({}, more));
    expect(code).toBe(2);
    expect(out).toBe("");
    expect(said).toMatch(message);
  });
  it("holding an infinite number", async () => {
    const text = JSON.stringify(form()).replace('"columnLength_m":0.5', '"columnLength_m":1e999');
    expect((await solve(text)).said).toMatch(/\/geometry\/columnLength_m: It must be a finite number/);
  });
});

describe("an answer", () => {
  it("has every key of its form, lists of the right length", async () => {
    const { code, out, said } = await solve(form());
    expect(said).toBe("");
    expect(code).toBe(0);
    const answer = JSON.parse(out);
    expect(answer).toMatchObject({ format: "stringwright-field-answer", version: 1 });
    for (const key of ["toEarth_F", "toElectrode_F"]) expect(answer[key]).toHaveLength(19);
    expect(answer.adjacent_F).toHaveLength(20);
    expect(answer.ladder.series_F).toHaveLength(20);
    expect(answer.ladder.toEarth_F).toEqual(answer.toEarth_F);
    expect(answer.ladder.toElectrode_F).toEqual(answer.toElectrode_F);
    for (const key of ["tapToElectrode_F", "ceEff_F", "chEff_F", "m_F", "electrodeSelf_F", "inputLow_F", "inputHigh_F"])
      expect(answer[key]).toBeGreaterThan(0);
    expect(answer.fieldMax_per_m).toBeGreaterThan(5);
    expect(answer.unknowns).toBeGreaterThan(100);
    expect(answer.uncertainty.ceEff).toBeLessThan(1e-3);
    // Definitions: the effective values are weighted sums over the lists.
    const x = (k: number) => (k + 1) / 20;
    const sum = (list: number[], of: (k: number) => number) => list.reduce((all, each, k) => all + each * of(k), 0);
    const ce = sum(answer.toEarth_F, (k) => 6 * x(k) * (1 - x(k)));
    const ch = sum(answer.toElectrode_F, (k) => 3 * (1 - x(k)) ** 2);
    expectRelative(answer.ceEff_F, ce, 1e-12, "6 Σ C x (1 − x)");
    expectRelative(answer.chEff_F, ch, 1e-12, "3 Σ C (1 − x)²");
  });
  it("has no field without an electrode, and no estimate where none was fitted", async () => {
    const { out } = await solve(form({ electrode: { kind: "none" }, columnDiameter_m: 0.2, shield: null, box: null }));
    const answer = JSON.parse(out);
    expect(answer.fieldMax_per_m).toBeNull();
    expect(answer.estimate).toMatchObject({ ceEff_F: null, chEff_F: null, m_F: null });
  });
  it("stands for a single element too", async () => {
    const { code, out } = await solve(form({ elements: 1, shield: null, box: null }));
    expect(code).toBe(0);
    expect(JSON.parse(out)).toMatchObject({ toEarth_F: [], toElectrode_F: [], ceEff_F: 0, chEff_F: 0 });
  });
  it("moves by less than 0.5 % with twice the points, in both idealisations", async () => {
    for (const idealisation of ["bands", "distributed"]) {
      const [one, two] = await Promise.all(
        [1, 2].map(async (resolution) =>
          JSON.parse((await solve(form({}, { ask: { idealisation, resolution } }))).out),
        ),
      );
      for (const key of ["ceEff_F", "chEff_F", "m_F", "inputLow_F", "inputHigh_F", "electrodeSelf_F", "fieldMax_per_m"])
        expectRelative(one[key], two[key], 5e-3, `${idealisation}, ${key}`);
    }
  });
});

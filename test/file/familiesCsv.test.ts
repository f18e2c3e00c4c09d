import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readFamiliesCsv } from "../../src/file/familiesCsv.ts";
import { familiesCsvTemplate, familiesCsvText } from "../../src/file/familiesCsvText.ts";
import { type CapacitorFamily, catalogue, type ResistorFamily } from "../../src/solver/index.ts";

const head =
  "kind,name,series,least_ohm,greatest_ohm,tolerance,ratedDissipation_W,limitingVoltage_V,bodyLength_m,bodyDiameter_m";
const good = "resistor,my film,E24,100k,10M,1 %,0.6,350,0.0065,2.5 mm";
const read = (...lines: string[]) => readFamiliesCsv([head, ...lines].join("\r\n"));
const only = (text: string) => readFamiliesCsv(text).rows[0]!;

describe("families from a CSV file", () => {
  it("take a bare number in the unit of the head and a written unit as written", () => {
    const { families, rows, refused } = read(good);
    expect(refused).toBeNull();
    expect(families[0]).toMatchObject({
      id: "own-resistor-1",
      name: "my film",
      origin: "typed",
      least_ohm: 100e3,
      greatest_ohm: 10e6,
      tolerance: 0.01,
      bodyLength_m: 0.0065,
      bodyDiameter_m: 0.0025,
      seriesAbove: null,
      use: "divider",
    });
    expect(rows[0]).toMatchObject({ line: 2, ok: true, name: "my film" });
    expect(rows[0]?.assumed).toContain("temperatureCoefficient_per_K");
    expect(rows[0]?.assumed).not.toContain("tolerance");
  });
  it("take larger and smaller units from the head", () => {
    const row = only(
      "name,least_kohm,greatest_Mohm,tolerance_percent,ratedDissipation_mW,limitingVoltage_kV,bodyLength_mm,bodyDiameter_cm," +
        "temperatureCoefficient_ppm_per_K,voltageCoefficient_ppm_per_V,selfCapacitance_pF\nx,100,68,1,500,3.5,14,0.45,200,-1,0.3",
    );
    expect(row.family).toMatchObject({
      kind: "resistor",
      least_ohm: 1e5,
      greatest_ohm: 68e6,
      tolerance: 0.01,
      ratedDissipation_W: 0.5,
      limitingVoltage_V: 3500,
      bodyLength_m: 0.014,
      bodyDiameter_m: 0.0045,
      temperatureCoefficient_per_K: 2e-4,
      voltageCoefficient_per_V: -1e-6,
      selfCapacitance_F: 3e-13,
    });
  });
  it.each([
    ["semicolons and decimal commas", ";", "0,01;0,6;350;6,5 mm;2,5 mm"],
    ["tabs and decimal commas", "\t", "0,01\t0,6\t350\t6,5 mm\t2,5 mm"],
    ["semicolons and decimal points", ";", "0.01;0.6;350;6.5 mm;2.5 mm"],
  ])("of %s read alike", (_, separator, cells) => {
    const text = `\uFEFF${head.replaceAll(",", separator)}\n${["resistor", "my film", "E24", "100k", "10M"].join(separator)}${separator}${cells}`;
    expect(readFamiliesCsv(text).families).toEqual(read(good).families);
  });
  it("with the line that names its separator read alike, one line further down", () => {
    const { families, rows } = readFamiliesCsv(`sep=,\r\n${head}\r\n${good}`);
    expect(families).toEqual(read(good).families);
    expect(rows[0]?.line).toBe(3);
  });
  it("of capacitors read too, the kind told by the values; a dielectric not stated counts as the worst", () => {
    const { rows } = readFamiliesCsv(
      "name,least_pF,greatest_nF,tolerance,ratedVoltage_kV,bodyLength_mm,bodyDiameter_mm,inHand\nc,10,4.7,0.05,1,3.2,1.6,30 x 470p",
    );
    expect(rows[0]?.family).toMatchObject({
      id: "own-capacitor-1",
      kind: "capacitor",
      least_F: 1e-11,
      greatest_F: 4.7e-9,
      ratedVoltage_V: 1000,
      dielectricClass: "class2",
      inHand: [{ value: 4.7e-10, count: 30 }],
    });
    expect(rows[0]?.assumed).toContain("dielectricClass");
  });
  it("without the limiting voltage are kept, and are said not to be sized with", () => {
    const { rows } = read(good.replace(",350,", ",,"));
    expect(rows[0]).toMatchObject({
      ok: true,
      family: { limitingVoltage_V: null },
      problem: { where: "limitingVoltage_V", why: "Cannot size on it: the limiting element voltage is not stated." },
    });
  });
  it.each([
    ["0.6", "", "ratedDissipation_W", "missing"],
    ["1 %", "5", "tolerance", "1 % is 0.01"],
    ["1 %", "0.7", "tolerance", "at most 0.5"],
    ["100k", "10m", "least_ohm", "Did you mean M"],
    ["100k", "=1+1", "least_ohm", "not a number"],
    ["350", "@SUM(A1)", "limitingVoltage_V", "not a number"],
    ["350", "-350", "limitingVoltage_V", "negative"],
    ["350", '"3,500"', "limitingVoltage_V", "may be 3.5 or 3500"],
    ["0.0065", "6.5", "bodyLength_m", "no body length"],
    ["100k", "20M", "greatest_ohm", "below the least"],
    ["E24", "E25", "series", "E3, E6"],
    ["resistor", "coil", "kind", "neither"],
    ["my film", "", "name", "missing"],
  ])("with %s written as %s are refused at the cell, beside good ones that are taken", (cell, wrong, where, why) => {
    const { rows, families } = read(good.replace(cell, wrong), good);
    expect(rows[0]).toMatchObject({ ok: false, family: null, problem: { where } });
    const { problem } = rows[0]!;
    expect(`${problem?.why} ${problem?.cure}`).toContain(why);
    expect(families).toHaveLength(1);
  });
  it("say the line of the file, whatever lies between", () => {
    const text = `${head}\n\n${good}\n,,,\n"resistor","two\nlines",E24,1k,1M,0.01,0.6,350,0.006,0.002\ncoil,x`;
    expect(readFamiliesCsv(text).rows.map(({ line, ok, name }) => [line, ok, name])).toEqual([
      [3, true, "my film"],
      [5, true, "two lines"],
      [7, false, "x"],
    ]);
  });
  it("give no id and no name twice", () => {
    const [known] = read(good).families;
    const { rows } = readFamiliesCsv(
      `${head}\n${good}\n${good.replace("my", "other")}\n${good.replace("my", "other")}`,
      [known!],
    );
    expect(rows.map((row) => row.family?.id ?? row.problem?.where)).toEqual(["name", "own-resistor-2", "name"]);
  });
});

describe("written and read again", () => {
  const own = (each: ResistorFamily | CapacitorFamily, i: number) => {
    const count = (kind: string) => `own-${kind}-${i}`;
    return { ...each, origin: "typed" as const, id: count(each.kind) };
  };
  it("the whole catalogue is the same to the digit", () => {
    for (const list of [catalogue.resistors, catalogue.capacitors]) {
      const families = list.map((each, i) => own(each, i + 1));
      const { rows, families: again } = readFamiliesCsv(familiesCsvText(families));
      expect(rows.filter((row) => !row.ok)).toEqual([]);
      expect(again).toEqual(families);
      expect(rows.flatMap((row) => row.assumed)).toEqual([]);
    }
  });
  it("a family of any name and any drawer is the same", () => {
    const name = fc
      .string({ minLength: 1, maxLength: 30, unit: "grapheme" })
      .map((text) => text.replace(/[\s\0]+/g, " ").trim())
      .filter((text) => text !== "" && !text.startsWith("'") && !/\p{Surrogate}/u.test(text));
    const formula = fc
      .tuple(fc.constantFrom("=", "+", "-", "@", '"', ";", ","), name)
      .map(([sign, rest]) => sign + rest);
    const drawer = fc.uniqueArray(
      fc.record({ value: fc.double({ min: 1e-3, max: 1e12, noNaN: true }), count: fc.integer({ min: 1, max: 999 }) }),
      { maxLength: 4, minLength: 1 },
    );
    fc.assert(
      fc.property(fc.oneof(name, formula), drawer, (text, inHand) => {
        const family = { ...own(catalogue.resistors[0]!, 1), name: text, inHand };
        expect(readFamiliesCsv(familiesCsvText([family])).families).toEqual([family]);
      }),
    );
  });
  it("the empty file's two examples are families", () => {
    const { rows, unread, refused } = readFamiliesCsv(familiesCsvTemplate());
    expect([rows.map((row) => [row.family?.kind, row.assumed]), unread, refused]).toEqual([
      [
        ["resistor", []],
        ["capacitor", []],
      ],
      [],
      null,
    ]);
  });
});

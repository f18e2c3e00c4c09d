import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { csvLimits } from "../../src/file/csvTable.ts";
import { readDrawerCsv } from "../../src/file/drawerCsv.ts";
import { readFamiliesCsv } from "../../src/file/familiesCsv.ts";
import { familyColumns } from "../../src/file/familyColumns.ts";
import { catalogue } from "../../src/solver/index.ts";

const head = "name,least_ohm,greatest_ohm,tolerance,ratedDissipation_W,limitingVoltage_V,bodyLength_m,bodyDiameter_m";
const good = "film,1k,1M,0.01,0.6,350,0.006,0.002";

describe("a file that cannot be read as a whole", () => {
  it.each([
    ["nothing", "", "the first line"],
    ["blank lines", "\n \n\r\n", "the first line"],
    ["no head", good, "the first line"],
    ["a head with a column twice", `${head},tolerance_percent\n${good},1`, "the first line"],
    ["a head that is never closed", `"name,least_ohm\n${good}`, "the first line"],
    ["bytes", `${head}\n\0\0`, "the file"],
    ["too many characters", `${head}\n${"x".repeat(csvLimits.size)}`, "the file"],
    ["too many rows", `${head}\n${`${good}\n`.repeat(csvLimits.rows + 1)}`, "the file"],
  ])("of %s is refused with where, why and cure", (_, text, where) => {
    const { refused, families } = readFamiliesCsv(text);
    expect(refused).toMatchObject({ where, why: expect.stringMatching(/\.$/), cure: expect.stringMatching(/\.$/) });
    expect(families).toEqual([]);
  });
  it("of the most rows is read", () => {
    const rows = Array.from({ length: csvLimits.rows }, (_, i) => good.replace("film", `film ${i}`));
    expect(readFamiliesCsv([head, ...rows].join("\n")).families).toHaveLength(csvLimits.rows);
  });
});

describe("a hostile row", () => {
  it.each([
    ["a quotation mark left open", `${good}\n"film b,1k`],
    ["more cells than columns", `${good},1,2`],
    ["a thousand cells", `film${",1".repeat(1000)}`],
    ["a very long cell", `${"x".repeat(5000)},1k,1M,0.01,0.6,350,0.006,0.002`],
    ["a number too large to be held", good.replace("350", "1e999")],
    ["a huge exponent", good.replace("1k", "1e-9999")],
    ["keys of the language", good.replace("film", "x").replace("1k", "__proto__")],
  ])("of %s is refused and takes nothing with it", (_, row) => {
    const { rows, refused } = readFamiliesCsv(`${head}\n${row}`);
    expect(refused).toBeNull();
    const last = rows.at(-1)!;
    expect(last).toMatchObject({ ok: false, family: null });
    expect(Object.values(last.problem!).every((text) => text.length < 300)).toBe(true);
  });
  it("with names of the language as heads or families changes nothing", () => {
    const { families, unread } = readFamiliesCsv(
      `${head},__proto__,constructor\n${good.replace("film", "__proto__")},1,2`,
    );
    expect(families[0]?.name).toBe("__proto__");
    expect(unread).toEqual(["__proto__", "constructor"]);
    expect(({} as Record<string, unknown>).name).toBeUndefined();
  });
  it("with a formula for a name keeps it as text", () => {
    const name = '=HYPERLINK("x";"y")';
    const { families } = readFamiliesCsv(`${head}\n${good.replace("film", `"${name.replaceAll('"', '""')}"`)}`);
    expect(families[0]?.name).toBe(name);
  });
});

describe("any text", () => {
  const cell = fc.oneof(
    fc.constantFrom(
      "",
      "1",
      "4k7",
      "10m",
      "0,6",
      "=1",
      '"',
      "E24",
      "resistor",
      "capacitor",
      "20 x 10M",
      "-1",
      "1e400",
      "\r",
    ),
    fc.string({ maxLength: 6, unit: "binary" }),
  );
  const separator = fc.constantFrom(",", ";", "\t");
  const file = fc
    .tuple(
      separator,
      fc.subarray([...familyColumns], { minLength: 2 }),
      fc.array(fc.array(cell, { maxLength: 24 }), { maxLength: 5 }),
    )
    .map(([mark, heads, rows]) => [["name", "least_ohm", ...heads], ...rows].map((row) => row.join(mark)).join("\n"));
  it("is read without a throw: each row taken whole or refused with a reason", () => {
    fc.assert(
      fc.property(fc.oneof(file, fc.string({ unit: "binary", maxLength: 200 })), (text) => {
        const { rows, families } = readFamiliesCsv(text);
        expect(rows.filter((row) => row.ok).map((row) => row.family)).toEqual(families);
        for (const row of rows) if (!row.ok) expect(row.problem?.why).not.toBe("");
        expect(JSON.stringify(families)).not.toMatch(/:null,"limiting|Infinity|NaN/);
        const drawer = readDrawerCsv(text, catalogue.resistors.slice(0, 2));
        expect(drawer.families).toHaveLength(2);
      }),
      { numRuns: 300 },
    );
  });
});

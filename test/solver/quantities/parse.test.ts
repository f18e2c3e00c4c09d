import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { evaluateArithmetic } from "../../../src/solver/quantities/arithmetic.ts";
import { formatExact, formatQuantity, letterCode } from "../../../src/solver/quantities/format.ts";
import { parseQuantity } from "../../../src/solver/quantities/parse.ts";
import type { UnitName } from "../../../src/solver/quantities/unit.ts";

const value = (text: string, unit: UnitName) => {
  const parsed = parseQuantity(text, unit, { signed: true, counted: true });
  return parsed.kind === "value" ? parsed.value : parsed;
};

describe("quantity grammar", () => {
  // IEC 60062:2016 (ed. 6) + AMD1:2019, value codes; figures from a secondary copy, primary not seen.
  it.each([
    ["R47", 0.47],
    ["4R7", 4.7],
    ["470R", 470],
    ["4K7", 4700],
    ["47K", 47000],
    ["47K3", 47300],
    ["470K", 470000],
    ["4M7", 4.7e6],
    ["2M2", 2.2e6],
    ["1G", 1e9],
  ] as const)("reads the code %s as ohms", (text, expected) => expect(value(text, "ohm")).toBe(expected));
  it.each([
    ["10p", 1e-11],
    ["p10", 1e-13],
    ["4n7", 4.7e-9],
    ["n33", 3.3e-10],
    ["4µ7", 4.7e-6],
    ["4μ7", 4.7e-6],
    ["4u7", 4.7e-6],
    ["470p", 4.7e-10],
  ] as const)("reads the code %s as farads", (text, expected) => expect(value(text, "F")).toBe(expected));

  it.each([
    ["4k7", "ohm", 4700],
    ["4.7k", "ohm", 4700],
    ["4,7k", "ohm", 4700],
    ["4700", "ohm", 4700],
    ["4.7e3", "ohm", 4700],
    ["12 MΩ", "ohm", 12e6],
    ["12MΩ", "ohm", 12e6],
    ["12Mohm", "ohm", 12e6],
    ["4.7 meg", "ohm", 4.7e6],
    ["2*6.8M", "ohm", 13.6e6],
    ["6k/2", "ohm", 3000],
    ["48 kV", "V", 48000],
    ["-6 kV", "V", -6000],
    ["3 %", "1", 0.03],
    ["250 ppm", "1", 250e-6],
    ["50 ppm/K", "1/K", 50e-6],
    ["23 °C", "degC", 23],
    ["100 ns", "s", 1e-7],
  ] as const)("reads %s in %s", (text, unit, expected) => expect(value(text, unit)).toBe(expected));

  it("counts equal parts in series", () => {
    expect(parseQuantity("9x22M", "ohm", { counted: true })).toMatchObject({ kind: "value", value: 22e6, count: 9 });
    expect(parseQuantity("9000x22M", "ohm", { counted: true }).kind).toBe("refused");
  });

  it.each([
    "",
    "abc",
    "4k7x",
    "4k7 V",
    "1e400",
    "NaN",
    "Infinity",
    "4..7k",
    "12 MM",
    "0x10",
    "4k7k",
    "--3",
    "1/0",
    "--",
  ])("refuses %j whole, with a reason and a cure", (text) => {
    const parsed = parseQuantity(text, "ohm");
    expect(parsed.kind === "refused" || parsed.kind === "arithmetic").toBe(true);
    if (parsed.kind === "refused") expect(parsed.why.length * parsed.cure.length).toBeGreaterThan(0);
  });

  it("asks what it cannot know", () => {
    const milli = parseQuantity("10m", "ohm");
    expect(milli).toMatchObject({ kind: "ambiguous", choices: [{ value: 1e7 }, { value: 0.01 }] });
    expect(parseQuantity("1.234", "V", { locale: "comma" })).toMatchObject({ kind: "ambiguous" });
    expect(parseQuantity("1,234", "V", { locale: "comma" })).toMatchObject({ kind: "ambiguous" });
    expect(parseQuantity("1.234", "V")).toMatchObject({ kind: "value", value: 1.234 });
  });

  it("keeps within the caller's limits", () => {
    expect(parseQuantity("80", "1", { greatest: 1 })).toMatchObject({ kind: "refused" });
    expect(parseQuantity("-5", "V")).toMatchObject({ kind: "refused", why: "The value is negative." });
  });

  it("reads back exactly what it writes in full, over the whole range", () => {
    const units: UnitName[] = ["ohm", "F", "V", "s", "Hz", "m", "1", "degC"];
    const size = fc.double({ min: 1e-17, max: 1e16, noNaN: true });
    fc.assert(
      fc.property(size, fc.boolean(), fc.constantFrom(...units), (x, negative, unit) => {
        const given = negative ? -x : x;
        expect(value(formatExact(given, unit), unit)).toBe(given);
      }),
      { numRuns: 2000 },
    );
  });

  it("never fails on any text", () => {
    fc.assert(fc.property(fc.string({ maxLength: 40 }), (text) => parseQuantity(text, "ohm").kind.length > 0));
  });
});

describe("format", () => {
  it.each([
    [405063, "ohm", "405\u2009kΩ"],
    [999.6, "V", "1.00\u2009kV"],
    [4.7e-11, "F", "47.0\u2009pF"],
    [0, "A", "0\u2009A"],
    [1000.4, "1", "1000"],
    [12345.6, "1", "12\u2009346"],
    [-6000, "V", "\u22126.00\u2009kV"],
  ] as const)("shows %f %s as %s", (given, unit, expected) => expect(formatQuantity(given, unit)).toBe(expected));
  it("writes marking codes", () => {
    expect(letterCode(4700, "ohm")).toBe("4K7");
    expect(letterCode(4.7e-9, "F")).toBe("4n7");
    expect(letterCode(1e7, "ohm")).toBe("10M");
  });
});

describe("arithmetic", () => {
  it.each([
    ["2*6.8M + 470k", 14.07e6],
    ["(1k+2k)*3", 9000],
    ["12M/3/2", 2e6],
  ] as const)("evaluates %s", async (text, expected) => {
    const parsed = await evaluateArithmetic(text, "ohm");
    expect(parsed).toMatchObject({ kind: "value" });
    if (parsed.kind === "value") expect(Math.abs(parsed.value / expected - 1)).toBeLessThan(1e-12);
  });
  it.each([
    "config({number:'BigNumber'})",
    "zeros(1e9)",
    "f(x)=f(x);f(1)",
    "[1,2]",
    "1:9",
    "a=3",
    "'x'",
    "2+",
    "1/0+1",
    "pi",
  ])("refuses %s", async (text) => expect((await evaluateArithmetic(text, "ohm")).kind).toBe("refused"));
});

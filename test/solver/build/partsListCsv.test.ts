import fc from "fast-check";
import Papa from "papaparse";
import { describe, expect, it } from "vitest";
import type { PartsLine } from "../../../src/solver/build/partsList.ts";
import { disarmed, partsListCsv, plainDecimal } from "../../../src/solver/build/partsListCsv.ts";

const line: PartsLine = {
  designators: ["R1", "R2", "R3"],
  quantity: 3,
  spares: 2,
  buy: 5,
  part: "film",
  name: 'HV film, "1 W", axial',
  value: 4.7e-11,
  unit: "F",
  valueText: "47.0 pF",
  tolerance: 0.01,
  rating: "1 W, 3.5 kV",
  place: "HV arm",
  note: "",
};
const list = { lines: [line], total: 3, buy: 5 };

describe("parts list as CSV", () => {
  it("is read back by an independent reader, every number a number", () => {
    const { data } = Papa.parse<Record<string, string>>(partsListCsv(list, "data"), {
      header: true,
      skipEmptyLines: true,
    });
    expect(data).toHaveLength(1);
    expect(Number(data[0]!.value_base_unit)).toBe(4.7e-11);
    expect(data[0]!.value_base_unit).toBe("0.000000000047");
    expect(Number(data[0]!.tolerance_percent)).toBe(1);
    expect(data[0]!.part).toBe('HV film, "1 W", axial');
    expect(data[0]!.designators).toBe("R1 R2 R3");
    expect([data[0]!.quantity, data[0]!.spares, data[0]!.buy].map(Number)).toEqual([3, 2, 5]);
  });

  it("ends every row with CR LF and has a byte-order mark only for spreadsheets", () => {
    const data = partsListCsv(list, "data");
    expect(data.startsWith("designators,place")).toBe(true);
    expect(data.split("\r\n")).toHaveLength(3);
    expect(data.replaceAll("\r\n", "")).not.toMatch(/[\r\n]/);
    const sheet = partsListCsv(list, "spreadsheet", { separator: ";", decimalMark: "," });
    expect(sheet.charCodeAt(0)).toBe(0xfeff);
    expect(sheet).toContain(";0,000000000047;");
  });

  it.each([
    ["=1+1", "'=1+1"],
    ["  -2", "'  -2"],
    ["ok\n=1", "ok\n'=1"],
    ["ok\r\n @x", "ok\r\n' @x"],
    ["＝1", "'＝1"],
    ["\tx", "'\tx"],
    ["plain - text", "plain - text"],
  ])("disarms %j", (given, expected) => {
    expect(disarmed(given)).toBe(expected);
  });

  it("writes any finite number as a plain decimal that reads back the same", () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        const text = plainDecimal(value);
        expect(text).not.toMatch(/e/i);
        expect(Number(text)).toBe(value === 0 ? 0 : value);
      }),
    );
  });
});

import { describe, expect, it } from "vitest";
import { readDrawerCsv } from "../../src/file/drawerCsv.ts";
import { type CapacitorFamily, catalogued, type ResistorFamily } from "../../src/solver/index.ts";

const film = catalogued("resistors", "film-06") as ResistorFamily;
const hv = catalogued("resistors", "hv-film-1") as ResistorFamily;
const c0g = catalogued("capacitors", "c0g-1k") as CapacitorFamily;
const inHand = (text: string, ...families: (ResistorFamily | CapacitorFamily)[]) =>
  readDrawerCsv(text, families).families.map((each) => each.inHand);

describe("a drawer's list", () => {
  const list = [
    { value: 4.7e6, count: 12 },
    { value: 10e6, count: 20 },
  ];
  it.each([
    ["with a head", "value,count\n10M,20\n4M7,12"],
    ["without one", "10M,20\r\n4M7,12\r\n"],
    ["with the head in another order", "count;value\n20;10M\n12;4,7M"],
    ["with a value on two rows", "value\tcount\n10M\t15\n4M7\t12\n10000000\t5"],
  ])("%s fills the one family that is given", (_, text) => {
    expect(inHand(text, film)).toEqual([list]);
  });
  it("is added to what the family lists already, and leaves the family given as it was", () => {
    const owned = { ...film, inHand: [{ value: 10e6, count: 1 }] };
    expect(inHand("10M,20", owned)).toEqual([[{ value: 10e6, count: 21 }]]);
    expect(owned.inHand).toEqual([{ value: 10e6, count: 1 }]);
  });
  it("tells families by id or name, each in its own unit", () => {
    const text = `value,count,family\n10M,20,film-06\n33M,8,"${hv.name}"\n470p,30,c0g-1k`;
    expect(inHand(text, film, hv, c0g)).toEqual([
      [{ value: 10e6, count: 20 }],
      [{ value: 33e6, count: 8 }],
      [{ value: 4.7e-10, count: 30 }],
    ]);
  });
  it.each([
    ["10M,20", "family", "Several families"],
    ["10M,20,other", "family", "No family is named"],
    ["10m,20,film-06", "value", "m is milli"],
    ["22M,20,film-06", "value", "outside the range"],
    ["0,20,film-06", "value", "outside the range"],
    ["10M,-3,film-06", "count", "no whole count"],
    ["10M,1.5,film-06", "count", "no whole count"],
    ["10M,9999999,film-06", "count", "no whole count"],
    ["10M,,film-06", "count", "no whole count"],
    ["=1,2,film-06", "value", "not a number"],
    ['"10M,20', "row", "quotation mark"],
  ])("refuses the row %s, and takes the one beside it", (row, where, why) => {
    const { rows, families } = readDrawerCsv(`value,count,family\n10M,20,film-06\n${row}`, [film, hv]);
    expect(rows[1]).toMatchObject({ line: 3, ok: false, problem: { where, why: expect.stringContaining(why) } });
    expect(families[0]?.inHand).toEqual([{ value: 10e6, count: 20 }]);
    expect(families[1]).toBe(hv);
  });
  it("that is no text is refused as a whole", () => {
    expect(readDrawerCsv("\0", [film])).toMatchObject({ rows: [], refused: { where: "the file" } });
    expect(readDrawerCsv("", [film])).toEqual({ families: [film], rows: [], refused: null });
  });
});

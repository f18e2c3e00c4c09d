import { describe, expect, it } from "vitest";
import { emptyFamilyFile, readFamilyRows } from "../../../src/ui/families/familyRows.ts";
import { inventedResistor } from "../../support/inventedDocument.ts";

const head =
  "kind,name,series,least_ohm,greatest_ohm,tolerance,ratedDissipation_W,limitingVoltage_V,bodyLength_m,bodyDiameter_m,inHand";
const good = 'resistor,my film,E24,100k,10M,0.01,0.6,350,0.0065,2.5 mm,"20 x 10M, 12 x 4M7"';
const read = (...lines: string[]) => readFamilyRows([head, ...lines].join("\r\n"), []);

describe("families from a CSV file", () => {
  it("reads a bare number in the unit of its column and a written unit as written", () => {
    const { rows, refused } = read(good);
    expect(refused).toBeNull();
    expect(rows[0]?.part).toMatchObject({
      name: "my film",
      least_ohm: 100e3,
      tolerance: 0.01,
      bodyLength_m: 0.0065,
      bodyDiameter_m: 0.0025,
      inHand: [
        { value: 10e6, count: 20 },
        { value: 4.7e6, count: 12 },
      ],
    });
  });

  it("takes good rows beside bad ones, and says of each bad one what is wrong", () => {
    const { rows } = read(good, "resistor,no voltage,E24,1k,1M,0.01,0.6,,0.006,0.002,", "coil,x,E24,,,,,,,,");
    expect(rows.map((row) => row.part !== null)).toEqual([true, false, false]);
    expect(rows[1]?.faults.join()).toContain("limitingVoltage_V");
    expect(rows[2]?.faults.join()).toContain("neither resistor nor capacitor");
  });

  it("gives each family an id of its own and refuses a name twice", () => {
    const { rows } = read(good, good.replace("my film", "other film"), good);
    expect(rows.map((row) => row.part?.id)).toEqual(["own-resistor-1", "own-resistor-2", undefined]);
    expect(readFamilyRows(`${head}\n${good}`, [{ ...inventedResistor, name: "my film" }]).rows[0]?.part).toBeNull();
  });

  it("reads a semicolon file with a byte-order mark, and names columns it does not know", () => {
    const text = `\uFEFF${head.replaceAll(",", ";")};colour\n${good.replaceAll(",", ";").replace("10M; 12", "10M, 12")};blue`;
    const { rows, unread } = readFamilyRows(text, []);
    expect(rows[0]?.part).not.toBeNull();
    expect(unread).toEqual(["colour"]);
  });

  it("without a head is refused as a whole", () => {
    expect(readFamilyRows("1,2,3", []).refused).toContain("first line");
  });

  it("can be started from an empty file with its columns", () => {
    expect(readFamilyRows(emptyFamilyFile, [])).toEqual({ rows: [], unread: [], refused: null });
  });
});

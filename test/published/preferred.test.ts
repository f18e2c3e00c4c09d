/** IEC 60063:2015 (ed. 3), preferred number series; figures from a secondary copy, primary not seen. */
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import {
  preferredAbove,
  preferredBelow,
  preferredBetween,
  preferredNearest,
  preferredSeries,
  type SeriesName,
} from "../../src/solver/standards/preferred.ts";

const printed = JSON.parse(readFileSync(new URL("./iec60063_eseries.json", import.meta.url), "utf8")) as Record<
  SeriesName,
  number[]
>;
const names: SeriesName[] = ["E3", "E6", "E12", "E24", "E48", "E96", "E192"];

describe("preferred values", () => {
  it.each(names)("has all of %s", (name) => {
    expect(preferredSeries[name]).toEqual(printed[name]);
    expect(preferredSeries[name]).toHaveLength(Number(name.slice(1)));
  });
  it("keeps the irregular members: 9.20 in E192, and E24's", () => {
    expect(preferredSeries.E192).toContain(920);
    expect(preferredSeries.E192).not.toContain(919);
    for (const member of [27, 30, 33, 36, 39, 43, 47, 82]) expect(preferredSeries.E24).toContain(member);
  });
  it("follows the rule round(10^(n/N)) from E48 on, but for 9.20", () => {
    for (const name of ["E48", "E96", "E192"] as const) {
      const N = Number(name.slice(1));
      preferredSeries[name].forEach((member, n) => {
        if (member !== 920) expect(member).toBe(Math.round(100 * 10 ** (n / N)));
      });
    }
  });
  it("lists members as the doubles one would type", () => {
    expect(preferredBetween("E12", 1e6, 1e7)).toEqual([
      1e6, 1.2e6, 1.5e6, 1.8e6, 2.2e6, 2.7e6, 3.3e6, 3.9e6, 4.7e6, 5.6e6, 6.8e6, 8.2e6, 1e7,
    ]);
    expect(preferredBetween("E6", 4.7e-11, 4.7e-11)).toEqual([4.7e-11]);
  });
  it("steps and rounds", () => {
    expect(preferredAbove("E12", 4700)).toBe(5600);
    expect(preferredAbove("E12", 8200)).toBe(10000);
    expect(preferredBelow("E24", 10)).toBe(9.1);
    expect(preferredNearest("E24", 1365188)).toBe(1.3e6);
    expect(preferredNearest("E96", 1365188)).toBe(1.37e6);
  });
});

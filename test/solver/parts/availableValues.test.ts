import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { CapacitorFamily, ResistorFamily } from "../../../src/solver/job/part.ts";
import { availableValues, valuesInHand } from "../../../src/solver/parts/availableValues.ts";
import { catalogue, catalogued } from "../../../src/solver/parts/catalogue.ts";
import { withInHand, withinRange } from "../../../src/solver/parts/inHand.ts";
import { preferredSeries, type SeriesName } from "../../../src/solver/standards/preferred.ts";
import { expectRelative } from "../../support/relative.ts";

const names = Object.keys(preferredSeries) as SeriesName[];
/** Whether a value is a printed member of a series, found by its three leading figures as text. */
const isMember = (value: number, series: SeriesName) => {
  const figures = value.toExponential(2).replace(".", "").slice(0, 3);
  return preferredSeries[series].some((member) => String(member).padEnd(3, "0") === figures);
};
const hv = catalogued("resistors", "hv-film-1") as ResistorFamily;
const families = [...catalogue.resistors, ...catalogue.capacitors];

describe.each(families.map((each) => [each.id, each] as const))("values of %s", (_, family) => {
  const values = availableValues(family);
  it("rise, lie within its range and are members of the series sold there", () => {
    expect(values.length).toBeGreaterThan(2);
    values.forEach((value, i) => {
      if (i > 0) expect(value).toBeGreaterThan(values[i - 1]!);
      expect(withinRange(family, value)).toBe(true);
      const { series } = family;
      const above = family.kind === "resistor" ? family.seriesAbove : null;
      const here = above !== null && value > above.from_ohm ? above.series : series;
      expect(isMember(value, here), `${value} in ${here}`).toBe(true);
    });
  });
  it("are remembered", () => {
    expect(availableValues(family)).toBe(values);
  });
});

describe("values asked for", () => {
  it("of a coarser series are its members, of a finer one the family's own", () => {
    expect(availableValues(hv, { series: "E6", least: 1e6, greatest: 1e7 })).toEqual([
      1e6, 1.5e6, 2.2e6, 3.3e6, 4.7e6, 6.8e6, 1e7,
    ]);
    expect(availableValues(hv, { series: "E96" })).toEqual(availableValues(hv));
    expect(availableValues(hv, { series: "E24", least: 3e7 })).toEqual([3.3e7, 3.9e7, 4.7e7, 5.6e7, 6.8e7]);
  });
  it("within bounds are those of all that lie there, for any bounds and series", () => {
    const power = fc.double({ min: 4, max: 9, noNaN: true });
    fc.assert(
      fc.property(power, power, fc.constantFrom(...names), (a, b, series) => {
        const [least, greatest] = [10 ** Math.min(a, b), 10 ** Math.max(a, b)];
        const all = availableValues(hv, { series });
        expect(availableValues(hv, { series, least, greatest })).toEqual(
          all.filter((value) => value >= least && value <= greatest),
        );
      }),
    );
  });
  it("never lie below a family's least value, though its coarser series begins lower", () => {
    const late: ResistorFamily = {
      ...hv,
      least_ohm: 1e9,
      greatest_ohm: 1e10,
      seriesAbove: { from_ohm: 1e8, series: "E3" },
    };
    expect(availableValues(late)).toEqual([1e9, 2.2e9, 4.7e9, 1e10]);
    expect(availableValues({ ...late, seriesAbove: { from_ohm: 1e12, series: "E3" }, series: "E6" })).toHaveLength(7);
  });
  it("are none where the range is empty", () => {
    expect(availableValues({ ...hv, least_ohm: 1e9, greatest_ohm: 1e6 })).toEqual([]);
    expect(availableValues(hv, { least: 1e12 })).toEqual([]);
  });
});

describe("parts in hand", () => {
  const drawer = [
    { value: 22e6, count: 4 },
    { value: 10e6, count: 20 },
    { value: 22e6, count: 3 },
    { value: 47e6, count: 0 },
  ];
  it("stand ascending, each value once with its whole count, none that has run out", () => {
    expect(valuesInHand({ ...hv, inHand: drawer })).toEqual([
      { value: 10e6, count: 20 },
      { value: 22e6, count: 7 },
    ]);
    expect(availableValues({ ...hv, inHand: drawer }, { inHandOnly: true, least: 15e6 })).toEqual([22e6]);
    expect(availableValues(hv, { inHandOnly: true })).toEqual([]);
  });
  it("are added without losing one, in any order", () => {
    const list = fc.array(fc.record({ value: fc.constantFrom(1e6, 2e6, 3e6), count: fc.integer({ min: 0, max: 99 }) }));
    fc.assert(
      fc.property(list, list, (a, b) => {
        const both = withInHand(withInHand(hv, a), b);
        expect(both).toEqual(withInHand(withInHand(hv, b), a));
        const count = (all: readonly { count: number }[]) => all.reduce((sum, each) => sum + each.count, 0);
        expectRelative(count(both.inHand!), count(a) + count(b), 0, "whole counts", 1);
      }),
    );
    expect(hv).not.toHaveProperty("inHand");
    const c0g = catalogued("capacitors", "c0g-1k") as CapacitorFamily;
    expect(withInHand(c0g, [{ value: 4.7e-10, count: 3 }]).inHand).toEqual([{ value: 4.7e-10, count: 3 }]);
  });
});

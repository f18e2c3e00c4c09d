import { describe, expect, it } from "vitest";
import { elementBars, elementSentence } from "../../../src/ui/charts/elementBars.ts";

const many = (count: number, value: (i: number) => number) => Array.from({ length: count }, (_, i) => value(i));

describe("bars of a long string", () => {
  it("are thinned to 300 by keeping the hardest used of each run", () => {
    const values = many(1000, (i) => (i === 777 ? 2500 : 1000));
    const bars = elementBars(
      values,
      many(1000, () => 2000),
    );
    expect(bars.rows.length).toBeLessThanOrEqual(300);
    expect(bars.element).toContain(778);
    expect(bars.rows.filter((row) => row.past !== null)).toHaveLength(1);
  });

  it("judge each element by its own limit: the hardest used is not the one with most volts", () => {
    expect(elementSentence("voltage, peak", "V", [900, 500], [1000, 510])).toBe(
      "Hardest used: element 2 has 500\u2009V of 510\u2009V derated (98\u2009%); all are within it.",
    );
  });

  it("tell a limit that is passed", () => {
    expect(elementSentence("voltage, peak", "V", [900, 600], [500, 500])).toContain("2 of 2 are past it");
  });

  it("say which elements have no value instead of drawing nothing", () => {
    expect(elementBars([null, 3], [5, 5]).left).toBe(1);
  });
});

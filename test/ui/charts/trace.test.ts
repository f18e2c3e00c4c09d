import { describe, expect, it } from "vitest";
import { checkSeries, endPoint, nearest, thinRows } from "../../../src/ui/charts/trace.ts";

const trace = (y: readonly (number | null)[]) => [{ id: "a", name: "a", hue: 1, y }] as const;

describe("series before they are drawn", () => {
  it("counts every point that a log axis would drop without a word", () => {
    const { rows, left } = checkSeries([0, 1, 10, 100], trace([1, Number.NaN, 5, 7]), { x: true, y: false });
    expect(left).toBe(2);
    expect(rows.map((row) => row.a)).toEqual([null, 5, 7]);
  });

  it("keeps a gap that was meant and does not count it", () => {
    expect(checkSeries([1, 2], trace([null, 5]), { x: true, y: true }).left).toBe(0);
  });

  it("thins to few rows and never loses a peak", () => {
    const x = Array.from({ length: 5000 }, (_, i) => i + 1);
    const y = x.map((v) => (v === 3217 ? 99 : Math.sin(v / 50)));
    const { rows } = checkSeries(x, trace(y), { x: true, y: false });
    const thin = thinRows(rows, ["a"], 400);
    expect(thin.length).toBeLessThanOrEqual(401);
    expect(thin.some((row) => row.a === 99)).toBe(true);
    expect(thin[0]).toBe(rows[0]);
    expect(thin[thin.length - 1]).toBe(rows[4999]);
  });

  it("puts an end label where the trace leaves the axes", () => {
    const { rows } = checkSeries([1, 2, 3, 4], trace([0, -3, -20, -60]), { x: true, y: false });
    const y = { kind: "linear", domain: [-12, 3], ticks: [], minor: [] } as const;
    expect(endPoint(rows, "a", y)).toEqual({ x: 2, y: -3 });
  });

  it("finds the nearest point on the axis's own scale", () => {
    expect(nearest([1, 100], 20, true)).toBe(1);
    expect(nearest([1, 100], 20, false)).toBe(0);
  });
});

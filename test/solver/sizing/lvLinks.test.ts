import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fittedLinks, linkHoles, linkSet } from "../../../src/solver/sizing/lvLinks.ts";
import { preferredBetween } from "../../../src/solver/standards/preferred.ts";
import { expectRelative } from "../../support/relative.ts";

const pF = (...values: number[]) => values.map((value) => value * 1e-12);

describe("links and trimmer", () => {
  // Invented scenario, computed independently: 5 % links, a trimmer span of 55 pF.
  it("39/82/150/330/680 pF leaves two holes, 39/75/150/270/470/820 none", () => {
    expect(linkHoles(pF(39, 82, 150, 330, 680), 0.05, 55e-12).map((hole) => hole.link)).toEqual([3, 4]);
    expect(linkHoles(pF(39, 75, 150, 270, 470, 820), 0.05, 55e-12)).toEqual([]);
  });

  // Independent route: every assignment of tolerances' ends, every sum of links, the widest gap between neighbours.
  it.each([
    [39, 82, 150, 330, 680],
    [39, 75, 150, 270, 470, 820],
    [47, 100, 220],
    [56, 56, 120, 390],
  ])("the rule finds the widest gap that exhaustive sums find: %f, %f, %f …", (...values) => {
    const t = 0.05;
    const span = 55e-12;
    const links = pF(...values);
    let widest = 0;
    for (let ends = 0; ends < 2 ** links.length; ends++) {
      const sums = [0];
      links.forEach((link, i) => {
        const value = link * (1 + ((ends >> i) & 1 ? t : -t));
        sums.push(...sums.map((sum) => sum + value));
      });
      sums.sort((a, b) => a - b);
      for (let i = 1; i < sums.length; i++) widest = Math.max(widest, sums[i]! - sums[i - 1]! - span);
    }
    const found = Math.max(0, ...linkHoles(links, t, span).map((hole) => hole.missing_F));
    expectRelative(found, widest, 1e-9, "the same gap", 1e-12);
  });

  it("a set that was chosen reaches its end, and every sum of links at any tolerance leaves no gap above the span", () => {
    const values = preferredBetween("E24", 1e-12, 1e-8);
    const t = fc.constantFrom(0.01, 0.02, 0.05);
    const seeds = fc.array(fc.double({ min: -1, max: 1, noNaN: true }), { minLength: 16, maxLength: 16 });
    fc.assert(
      fc.property(
        t,
        fc.integer({ min: 20, max: 100 }),
        fc.integer({ min: 50, max: 3000 }),
        seeds,
        (tolerance, span, reach, draw) => {
          const links = linkSet(values, tolerance, span * 1e-12, reach * 1e-12);
          if (links === null) throw new Error("not reached");
          expect(linkHoles(links, tolerance, span * 1e-12)).toEqual([]);
          const real = links.map((value, i) => value * (1 + tolerance * Math.sign(draw[i]!)));
          const sums = [0];
          for (const value of real) sums.push(...sums.map((sum) => sum + value));
          sums.sort((a, b) => a - b);
          for (let i = 1; i < sums.length; i++)
            expect(sums[i]! - sums[i - 1]!).toBeLessThanOrEqual(span * 1e-12 * (1 + 1e-9));
          expect(sums.at(-1)).toBeGreaterThanOrEqual(reach * 1e-12 * (1 - 1e-9));
          const wanted = Math.abs(draw[0]!) * links.reduce((sum, value) => sum + value, 0);
          const { rest_F } = fittedLinks(links, wanted);
          expect(rest_F).toBeGreaterThanOrEqual(-1e-24);
          expect(rest_F).toBeLessThanOrEqual(span * 1e-12);
        },
      ),
      { numRuns: 60 },
    );
  });

  it("says so where the values sold cannot reach", () => {
    expect(linkSet(pF(100, 220), 0.05, 55e-12, 1e-9)).toBeNull();
  });
});

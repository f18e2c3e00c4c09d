import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { linearAxis, logAxis, shareOf, valueAt } from "../../../src/ui/charts/logAxis.ts";
import { expectRelative } from "../../support/relative.ts";

describe("log axis", () => {
  it("stands on whole decades with exact powers of ten as ticks", () => {
    const axis = logAxis([3.2e-9, 4.1e-6], 10);
    expect(axis?.domain).toEqual([1e-9, 1e-5]);
    expect(axis?.ticks).toEqual([1e-9, 1e-8, 1e-7, 1e-6, 1e-5]);
  });

  it("does not add a decade to a value that is a power of ten", () => {
    expect(logAxis([1e3, 1e6], 10)?.domain).toEqual([1e3, 1e6]);
  });

  it("thins its labels where few fit, and keeps their lines", () => {
    const axis = logAxis([1, 1e9], 5);
    expect(axis?.ticks).toEqual([1, 1e2, 1e4, 1e6, 1e8]);
    expect(axis?.minor).toContain(1e3);
  });

  it("does not exist without a positive value", () => {
    expect(logAxis([0, -3, Number.NaN], 10)).toBeNull();
  });
});

describe("linear axis", () => {
  it("stands on steps of 1, 2 or 5 around its values", () => {
    expect(linearAxis([0, 1830], 5)?.ticks).toEqual([0, 500, 1000, 1500, 2000]);
  });

  it("holds every value it was made for, on few ticks", () => {
    const value = fc.double({ min: -1e9, max: 1e9, noNaN: true, noDefaultInfinity: true });
    fc.assert(
      fc.property(fc.array(value, { minLength: 1, maxLength: 9 }), (values) => {
        const axis = linearAxis(values, 6)!;
        const slack = 1e-6 * (axis.domain[1] - axis.domain[0]);
        expect(axis.domain[0]).toBeLessThanOrEqual(Math.min(...values) + slack);
        expect(axis.domain[1]).toBeGreaterThanOrEqual(Math.max(...values) - slack);
        expect(axis.ticks.length).toBeLessThanOrEqual(9);
      }),
    );
  });
});

describe("place on an axis", () => {
  it("goes there and back", () => {
    const axis = logAxis([1, 1e9], 10)!;
    fc.assert(
      fc.property(fc.double({ min: 0, max: 9, noNaN: true }), (power) => {
        const value = 10 ** power;
        expectRelative(valueAt(axis, shareOf(axis, value)), value, 1e-12, "two logarithms and one power in double");
      }),
    );
  });
});

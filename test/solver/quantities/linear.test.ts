import { describe, expect, it } from "vitest";
import { factor, solve, solveMany } from "../../../src/solver/quantities/linear.ts";
import { expectRelative } from "../../support/relative.ts";

/** Numbers between -1 and 1 from a seed (Lehmer's generator, 48271 mod 2³¹ − 1). */
function numbers(seed: number, count: number): Float64Array {
  let state = seed;
  return Float64Array.from({ length: count }, () => {
    state = (state * 48271) % 2147483647;
    return (2 * state) / 2147483647 - 1;
  });
}
const times = (A: Float64Array, n: number, x: Float64Array) =>
  Float64Array.from({ length: n }, (_, i) => x.reduce((sum, each, j) => sum + A[i * n + j]! * each, 0));

describe("a dense system", () => {
  it.each([1, 2, 7, 8, 9, 16, 23, 65])("of %i unknowns is solved back", (n) => {
    const A = numbers(n, n * n);
    const x = numbers(n + 1, n);
    const b = times(A, n, x);
    const factors = A.slice();
    const found = solve(factors, factor(factors, n), b);
    found.forEach((each, i) => {
      expectRelative(each, x[i]!, 1e-10, "built from its solution", 1);
    });
  });
  it("with zeros on its diagonal changes rows", () => {
    const A = Float64Array.of(0, 1, 0, 0, 0, 2, 3, 0, 0);
    expect([...solve(A, factor(A, 3), Float64Array.of(5, 8, 9))]).toEqual([3, 5, 4]);
  });
  it("for many right-hand sides gives each its own solution", () => {
    const n = 19;
    const A = numbers(3, n * n);
    const pivots = factor(A, n);
    const sides = [1, 2, 3].map((seed) => numbers(seed, n));
    const together = Float64Array.from({ length: 3 * n }, (_, at) => sides[at % 3]![Math.floor(at / 3)]!);
    solveMany(A, pivots, together, 3);
    sides.forEach((side, c) => {
      solve(A, pivots, side).forEach((each, i) => {
        expectRelative(together[i * 3 + c]!, each, 1e-12, "one at a time", 1);
      });
    });
  });
  it("that is singular throws", () => {
    expect(() => factor(Float64Array.of(1, 2, 2, 4), 2)).toThrow("singular");
  });
});

/**
 * The one numeric comparison of the tests: relative, with the tolerance and its reason at the call.
 * `expectRelative(actual, expected, 1e-9, "closed form")`. For expected = 0 give `scale`, the size that counts as full scale.
 */
import { expect } from "vitest";

export function relativeError(actual: number, expected: number, scale = Math.abs(expected)): number {
  if (!Number.isFinite(actual) || !Number.isFinite(expected)) return Number.POSITIVE_INFINITY;
  if (scale === 0) return actual === expected ? 0 : Number.POSITIVE_INFINITY;
  return Math.abs(actual - expected) / scale;
}

export function expectRelative(
  actual: number | null | undefined,
  expected: number,
  tolerance: number,
  reason: string,
  scale?: number,
): void {
  const error = relativeError(actual ?? Number.NaN, expected, scale);
  expect(
    error,
    `${reason}: got ${actual}, expected ${expected}, relative error ${error}, allowed ${tolerance}`,
  ).toBeLessThanOrEqual(tolerance);
}

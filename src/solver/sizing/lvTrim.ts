import type { LvNeed } from "./lvSolution.ts";

/** The span that an adjustable part must cover, Ω: least reachable at or below `least`, greatest at or above `greatest`. */
export interface TrimSpan {
  readonly least_ohm: number;
  readonly greatest_ohm: number;
}

/**
 * Rheostat in series within one branch, with `equals` other branches of `parallel_ohm` beside it: total of that branch's
 * rheostat so that every extreme of the parts is reached. null where the other branches alone are already too low.
 * @example need of 1.347892 … 1.382653 MΩ, fixed 1.27 MΩ ±1 %, no other branch → 65.2 … 125.4 kΩ
 */
export function seriesTrim(
  need: LvNeed,
  fixed: { readonly ohm: number; readonly tolerance: number },
  others: { readonly ohm: number; readonly tolerance: number; readonly count: number },
): TrimSpan | null {
  const conductance = (ohm: number) => (others.count === 0 ? 0 : others.count / ohm);
  const low = 1 / need.least_ohm - conductance(others.ohm * (1 + others.tolerance));
  const high = 1 / need.greatest_ohm - conductance(others.ohm * (1 - others.tolerance));
  if (low <= 0 || high <= 0) return null;
  return {
    least_ohm: 1 / low - fixed.ohm * (1 + fixed.tolerance),
    greatest_ohm: 1 / high - fixed.ohm * (1 - fixed.tolerance),
  };
}

/**
 * Adjustable resistor in parallel with a fixed one: what it would have to cover. It is far above what rheostats are sold in.
 * @example the same need on 1.43 MΩ ±1 % → 20.2 … 59.2 MΩ
 */
export function parallelTrim(
  need: LvNeed,
  fixed: { readonly ohm: number; readonly tolerance: number },
): TrimSpan | null {
  const least = 1 / need.least_ohm - 1 / (fixed.ohm * (1 + fixed.tolerance));
  const greatest = 1 / need.greatest_ohm - 1 / (fixed.ohm * (1 - fixed.tolerance));
  if (least <= 0 || greatest <= 0) return null;
  return { least_ohm: 1 / least, greatest_ohm: 1 / greatest };
}

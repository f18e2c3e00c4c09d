import { preferredSeries } from "../standards/preferred.ts";
import type { Asking } from "./asking.ts";
import { coarser, lvResistorFamilies } from "./lvFamilies.ts";
import { type LvNeed, lvNeed, lvSolutionFormulas } from "./lvSolution.ts";
import { seriesTrim } from "./lvTrim.ts";
import type { Pool } from "./pool.ts";

/** Everything that an LV arm must make up for, for a string of this tolerance and resistance. */
export const lvNeedOf = (ask: Asking, hvArm_ohm: number, stringTolerance: number) =>
  lvNeed({
    hvArm_ohm,
    scaleFactor: ask.j.document.brief.scaleFactor,
    instrument_ohm: ask.j.instrument.resistance_ohm,
    seriesProtector_ohm: ask.seriesProtector_ohm,
    leakage_S: ask.leakage_S,
    stringTolerance,
    instrumentSpread: ask.j.instrument.resistanceSpread,
  });

/** LV arm resistance for nominal parts alone, Ω; null where none exists. */
export const nominalLvArm = (ask: Asking, hvArm_ohm: number): number | null =>
  lvSolutionFormulas.nominal.compute({
    F: ask.j.document.brief.scaleFactor,
    R1: hvArm_ohm,
    Rm: ask.j.instrument.resistance_ohm,
    Rs: ask.seriesProtector_ohm,
    G: ask.leakage_S,
  });

/**
 * Greatest R1, Ω, up to which the largest rheostat sold is sure to reach every extreme in series within one of two or three
 * branches. The span needed grows with R1, so halving finds it. Infinity where no rheostat is sold at all.
 */
export function trimReach(ask: Asking, pool: Pool, stringTolerance: number): number {
  const track_ohm = pool.trimmers
    .filter((trimmer) => trimmer.quantity === "ohm")
    .reduce((most, trimmer) => Math.max(most, Math.max(...trimmer.spans) * (1 - trimmer.tolerance)), 0);
  const family = lvResistorFamilies(pool)[0];
  if (track_ohm === 0 || family === undefined) return Number.POSITIVE_INFINITY;
  const step = largestStep(coarser(ask.j.document.brief.policy.series, family.series));
  const reaches = (hvArm_ohm: number): boolean => {
    const need = lvNeedOf(ask, hvArm_ohm, stringTolerance);
    return need.ok && [2, 3].some((count) => trackNeeded(need.value, count, family.tolerance, step) <= track_ohm);
  };
  let low = 1;
  let high = 1e15;
  if (!reaches(low)) return 0;
  for (let i = 0; i < 60; i++) {
    const middle = Math.sqrt(low * high);
    if (reaches(middle)) low = middle;
    else high = middle;
  }
  return low;
}

/** Track for branches of count · R2 each, the fixed part of the trimmed branch as coarse as the series may force. */
function trackNeeded(need: LvNeed, count: number, tolerance: number, step: number): number {
  const others = { ohm: count * need.nominal_ohm, tolerance, count: count - 1 };
  const whole = seriesTrim(need, { ohm: 0, tolerance: 0 }, others);
  if (whole === null) return Number.POSITIVE_INFINITY;
  const fixed = whole.least_ohm / (1 + tolerance) / step;
  return whole.greatest_ohm - fixed * (1 - tolerance);
}

/** Greatest proportion between neighbours of a series. */
function largestStep(series: keyof typeof preferredSeries): number {
  const decade = preferredSeries[series];
  return decade.reduce((most, value, i) => Math.max(most, (decade[i + 1] ?? decade[0]! * 10) / value), 1);
}

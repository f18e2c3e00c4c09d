import type { LvArm } from "../../solver/index.ts";

/** A stretch of LV capacitance that links and trimmer reach, nominal values. */
export interface Stretch {
  readonly from_F: number;
  readonly to_F: number;
}

const mostLinks = 10;

/**
 * What links (each fitted or not) and trimmers reach on top of the fixed capacitors, overlapping stretches merged, least first;
 * what lies between two stretches is a hole. Empty when the LV arm has no capacitor, or more than ten links.
 */
export function linkReach({ branches }: LvArm): readonly Stretch[] {
  let fixed = 0;
  let [least, greatest] = [0, 0];
  const links: number[] = [];
  for (const branch of branches) {
    if ("series" in branch) continue;
    if ("trimmer" in branch) {
      least += branch.trimmer.least_F;
      greatest += branch.trimmer.greatest_F;
    } else if ("link" in branch) links.push(branch.capacitance_F);
    else fixed += branch.capacitance_F;
  }
  if (links.length > mostLinks || fixed + greatest + links.length === 0) return [];
  let sums = [fixed];
  for (const link of links) sums = sums.concat(sums.map((sum) => sum + link));
  const stretches = sums.map((sum) => ({ from_F: sum + least, to_F: sum + greatest }));
  return merged(stretches.sort((a, b) => a.from_F - b.from_F));
}

function merged(stretches: readonly Stretch[]): readonly Stretch[] {
  const found: Stretch[] = [];
  for (const next of stretches) {
    const last = found[found.length - 1];
    if (last === undefined || next.from_F > last.to_F * (1 + 1e-9)) found.push(next);
    else found[found.length - 1] = { from_F: last.from_F, to_F: Math.max(last.to_F, next.to_F) };
  }
  return found;
}

/** How far a wanted capacitance lies from the nearest that is reached; 0 within reach. */
export function outOfReach(reach: readonly Stretch[], wanted_F: number): number {
  const away = (s: Stretch) => Math.max(0, s.from_F - wanted_F, wanted_F - s.to_F);
  return reach.reduce((least, s) => Math.min(least, away(s)), Number.POSITIVE_INFINITY);
}

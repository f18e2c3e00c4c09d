import type { CapacitorFamily, ResistorFamily } from "../job/part.ts";
import { preferredBetween } from "../standards/preferred.ts";

const remembered = new WeakMap<ResistorFamily | CapacitorFamily, readonly number[]>();

/** Values of a family that can be bought, ascending: its series, the coarser one above; in hand only: the drawer's. */
export function availableValues(family: ResistorFamily | CapacitorFamily, inHandOnly = false): readonly number[] {
  if (inHandOnly) {
    const values = (family.inHand ?? []).filter((each) => each.count > 0).map((each) => each.value);
    return [...new Set(values)].sort((a, b) => a - b);
  }
  const known = remembered.get(family);
  if (known !== undefined) return known;
  const values =
    family.kind === "capacitor"
      ? preferredBetween(family.series, family.least_F, family.greatest_F)
      : resistorValues(family);
  remembered.set(family, values);
  return values;
}

function resistorValues({ least_ohm, greatest_ohm, series, seriesAbove }: ResistorFamily): number[] {
  if (seriesAbove === null || seriesAbove.from_ohm >= greatest_ohm)
    return preferredBetween(series, least_ohm, greatest_ohm);
  const fine = preferredBetween(series, least_ohm, seriesAbove.from_ohm);
  const coarse = preferredBetween(seriesAbove.series, seriesAbove.from_ohm, greatest_ohm);
  return [...new Set([...fine, ...coarse])];
}

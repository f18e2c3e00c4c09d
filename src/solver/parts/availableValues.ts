import type { SeriesName } from "../job/brief.ts";
import type { CapacitorFamily, InHand, ResistorFamily } from "../job/part.ts";
import { preferredBetween } from "../standards/preferred.ts";

type Family = ResistorFamily | CapacitorFamily;

export interface Wanted {
  /** No finer series than this is asked for; the family's own where it is coarser. Not looked at for parts in hand. */
  readonly series?: SeriesName;
  /** Bounds of the value in the family's base unit, ends included. */
  readonly least?: number;
  readonly greatest?: number;
  /** Only what lies in the drawer. */
  readonly inHandOnly?: boolean;
}

const fineness: readonly SeriesName[] = ["E3", "E6", "E12", "E24", "E48", "E96", "E192"];
const remembered = new WeakMap<Family, Map<SeriesName, readonly number[]>>();
const slack = 1e-9;

/**
 * Values of a family that can be had, ascending, each once: its series, the coarser one above where it has one, or what is in hand.
 * @example availableValues(family, { series: "E12", least: 1e6, greatest: 2e6 }) // [1e6, 1.2e6, 1.5e6, 1.8e6]
 */
export function availableValues(family: Family, wanted: Wanted = {}): readonly number[] {
  const { series = "E192", least = 0, greatest = Number.POSITIVE_INFINITY, inHandOnly = false } = wanted;
  const all = inHandOnly ? valuesInHand(family).map((each) => each.value) : valuesSold(family, series);
  if (least <= 0 && greatest === Number.POSITIVE_INFINITY) return all;
  return all.filter((value) => value >= least * (1 - slack) && value <= greatest * (1 + slack));
}

/** What is in hand of a family: values ascending, each once with its whole count, none that has run out. */
export function valuesInHand({ inHand = [] }: Family): readonly InHand[] {
  const counts = new Map<number, number>();
  for (const { value, count } of inHand) if (count > 0) counts.set(value, (counts.get(value) ?? 0) + count);
  return [...counts].map(([value, count]) => ({ value, count })).sort((a, b) => a.value - b.value);
}

function valuesSold(family: Family, series: SeriesName): readonly number[] {
  const known = remembered.get(family) ?? new Map<SeriesName, readonly number[]>();
  remembered.set(family, known);
  const found = known.get(series);
  if (found !== undefined) return found;
  const values =
    family.kind === "capacitor"
      ? preferredBetween(coarser(series, family.series), family.least_F, family.greatest_F)
      : resistorValues(family, series);
  known.set(series, values);
  return values;
}

function resistorValues({ least_ohm, greatest_ohm, series, seriesAbove }: ResistorFamily, wanted: SeriesName) {
  if (seriesAbove === null) return preferredBetween(coarser(wanted, series), least_ohm, greatest_ohm);
  const { from_ohm } = seriesAbove;
  const fine = preferredBetween(coarser(wanted, series), least_ohm, Math.min(from_ohm, greatest_ohm));
  const above = preferredBetween(coarser(wanted, seriesAbove.series), Math.max(from_ohm, least_ohm), greatest_ohm);
  return [...new Set([...fine, ...above])];
}

const coarser = (a: SeriesName, b: SeriesName): SeriesName => (fineness.indexOf(a) < fineness.indexOf(b) ? a : b);

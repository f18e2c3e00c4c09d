import type { SeriesName } from "../job/brief.ts";
import type { ResistorFamily } from "../job/part.ts";
import { preferredBetween } from "../standards/preferred.ts";
import { type Pool, refusedFamily } from "./pool.ts";

/** Loosest tolerance that an LV arm's fixed resistor may have. */
const loosest = 0.01;

/** Families that fixed LV resistors are taken from: tightest first, then steadiest, smallest, by id. */
export function lvResistorFamilies(pool: Pool): readonly ResistorFamily[] {
  return pool.allResistors
    .filter((family) => refusedFamily(family) === null && family.tolerance <= loosest * (1 + 1e-9))
    .sort(
      (a, b) =>
        a.tolerance - b.tolerance ||
        a.temperatureCoefficient_per_K - b.temperatureCoefficient_per_K ||
        a.bodyLength_m - b.bodyLength_m ||
        (a.id < b.id ? -1 : 1),
    );
}

const fineness: readonly SeriesName[] = ["E3", "E6", "E12", "E24", "E48", "E96", "E192"];
/** The coarser of two series. */
export const coarser = (a: SeriesName, b: SeriesName): SeriesName =>
  fineness.indexOf(a) < fineness.indexOf(b) ? a : b;

/** Values of a family from `least` to `greatest`, Ω, ascending: of the wanted series, or of a coarser one where no finer is sold. */
export function lvValues(family: ResistorFamily, series: SeriesName, least: number, greatest: number): number[] {
  const { seriesAbove } = family;
  const low = Math.max(least, family.least_ohm);
  const high = Math.min(greatest, family.greatest_ohm);
  const from = seriesAbove === null ? high : Math.min(seriesAbove.from_ohm, high);
  const fine = preferredBetween(coarser(series, family.series), low, from);
  if (seriesAbove === null) return fine;
  const above = preferredBetween(coarser(series, seriesAbove.series), Math.max(low, from), high);
  return [...new Set([...fine, ...above])];
}

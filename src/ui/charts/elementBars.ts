import type { UnitName } from "../../solver/index.ts";
import { plainText, withUnit } from "./axisText.ts";
import type { BarRow } from "./BarPlot.tsx";

const most = 300;

type Values = readonly (number | null)[];

/** Bars of one quantity against its limit, thinned to at most 300 by keeping of each run of neighbours the one nearest its limit. */
export interface ElementBars {
  readonly rows: readonly BarRow[];
  readonly ticks: readonly string[];
  /** How many neighbours one bar stands for. */
  readonly run: number;
  /** Element number (1 is next to the tap) that each bar shows. */
  readonly element: readonly number[];
  /** One limit for all, or null. */
  readonly limit: number | null;
  readonly left: number;
}

/** @param rated the ratings themselves, where the limits are derated from them; empty: none stated */
export function elementBars(values: Values, limits: Values, rated: Values = []): ElementBars {
  const run = Math.max(1, Math.ceil(values.length / most));
  const element: number[] = [];
  for (let from = 0; from < values.length; from += run) element.push(hardest(values, limits, from, run) + 1);
  const rows = element.map((number) => row(number, values, limits, rated));
  const first = limits[0] ?? null;
  const limit = first !== null && limits.every((v) => v === first) ? first : null;
  const left = values.filter((v) => v === null || !Number.isFinite(v)).length;
  return { rows, ticks: tickNames(rows), run, element, limit, left };
}

function hardest(values: Values, limits: Values, from: number, run: number): number {
  let best = from;
  const used = (i: number) => Math.abs(values[i] ?? 0) / (limits[i] ?? 1);
  for (let i = from + 1; i < Math.min(from + run, values.length); i += 1) if (used(i) > used(best)) best = i;
  return best;
}

function row(number: number, values: Values, limits: Values, rated: Values): BarRow {
  const [value, limit, rating] = [values, limits, rated].map((list) => list[number - 1] ?? null) as (number | null)[];
  const drawn = value != null && Number.isFinite(value) ? Math.abs(value) : null;
  const over = drawn !== null && rating != null && drawn > rating;
  const past = drawn !== null && limit != null && drawn > limit && !over;
  return {
    name: String(number),
    within: past || over ? null : drawn,
    past: past ? drawn : null,
    over: over ? drawn : null,
    limit: limit ?? null,
  };
}

/** 1, then every 1st, 2nd, 5th, 10th … and the last, so that the numbers never touch. */
function tickNames(rows: readonly BarRow[]): readonly string[] {
  const every = [1, 2, 5, 10, 20, 50, 100].find((step) => rows.length / step <= 26) ?? 200;
  const names = rows.map((r) => r.name);
  const kept = names.filter((_, i) => i === 0 || (i + 1) % every === 0);
  const last = names[names.length - 1];
  if (last !== undefined && !kept.includes(last)) {
    if ((names.length - 1) % every < every / 2 && kept.length > 1) kept.pop();
    kept.push(last);
  }
  return kept;
}

/** The finding in words: the hardest-used element and how many are past their limit. */
export function elementSentence(
  quantity: string,
  unit: UnitName,
  values: Values,
  limits: Values,
  rated: Values = [],
): string {
  const at = hardest(values, limits, 0, values.length);
  const value = values[at] ?? null;
  const limit = limits[at] ?? null;
  if (value === null) return `No ${quantity} to show.`;
  const past = values.filter((v, i) => v !== null && limits[i] != null && Math.abs(v) > limits[i]!).length;
  const where = `element ${at + 1} has ${withUnit(Math.abs(value), unit)}`;
  if (limit === null) return `Greatest ${quantity}: ${where}; no limit is stated.`;
  const share = plainText(Number(((100 * Math.abs(value)) / limit).toPrecision(3)));
  const over = values.filter((v, i) => v !== null && rated[i] != null && Math.abs(v) > rated[i]!).length;
  const rating = over === 0 ? "" : `, ${over} past the rating itself`;
  const tail = past === 0 ? "all are within it" : `${past} of ${values.length} are past it${rating}`;
  return `Hardest used: ${where} of ${withUnit(limit, unit)} derated (${share}\u2009%); ${tail}.`;
}

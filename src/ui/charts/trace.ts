import type { Axis } from "./logAxis.ts";

/** One line of a chart. Its hue, its dash and its end label all tell it from the others. */
export interface Trace {
  readonly id: string;
  /** The end label. */
  readonly name: string;
  readonly hue: 1 | 2 | 3 | 4 | 5 | 6;
  readonly y: readonly (number | null)[];
}

/** Dashes by hue, so that a trace is told without its colour. */
export const dashes = ["", "7 3", "2 3", "10 3 2 3", "5 2 1 2 1 2", "1 2"] as const;

export interface Row {
  readonly x: number;
  readonly [trace: string]: number | null;
}

export interface Checked {
  readonly rows: readonly Row[];
  /** Points that cannot be drawn: not finite, or not positive on a log axis. Said under the chart, never dropped in silence. */
  readonly left: number;
}

/** Puts traces on one x into rows, refusing what an axis would drop without a word. `null` is a gap that was meant. */
export function checkSeries(x: readonly number[], traces: readonly Trace[], log: { x: boolean; y: boolean }): Checked {
  let left = 0;
  const drawable = (value: number, onLog: boolean) => Number.isFinite(value) && (!onLog || value > 0);
  const rows: Row[] = [];
  for (const [i, at] of x.entries()) {
    if (!drawable(at, log.x)) {
      left += 1;
      continue;
    }
    const row: Record<string, number | null> & { x: number } = { x: at };
    for (const trace of traces) {
      const value = trace.y[i] ?? null;
      const good = value !== null && drawable(value, log.y);
      if (value !== null && !good) left += 1;
      row[trace.id] = good ? value : null;
    }
    rows.push(row);
  }
  return { rows, left };
}

/**
 * Thins rows to about `most`, keeping in each bucket the first row and the extremes of every trace: a peak is never lost.
 */
export function thinRows(rows: readonly Row[], ids: readonly string[], most: number): readonly Row[] {
  if (rows.length <= most) return rows;
  const size = Math.ceil((rows.length * (1 + 2 * ids.length)) / most);
  const kept = new Set<number>([rows.length - 1]);
  for (let from = 0; from < rows.length; from += size) {
    kept.add(from);
    for (const id of ids) for (const i of extremes(rows, id, from, Math.min(from + size, rows.length))) kept.add(i);
  }
  return [...kept].sort((a, b) => a - b).map((i) => rows[i]!);
}

function extremes(rows: readonly Row[], id: string, from: number, to: number): readonly number[] {
  let low = -1;
  let high = -1;
  for (let i = from; i < to; i += 1) {
    const value = rows[i]![id];
    if (value === null || value === undefined) continue;
    if (low < 0 || value < rows[low]![id]!) low = i;
    if (high < 0 || value > rows[high]![id]!) high = i;
  }
  return [low, high].filter((i) => i >= 0);
}

/** The last point of a trace inside the axes: where its end label stands. */
export function endPoint(rows: readonly Row[], id: string, y: Axis): { x: number; y: number } | null {
  for (let i = rows.length - 1; i >= 0; i -= 1) {
    const value = rows[i]![id];
    if (value !== null && value !== undefined && value >= y.domain[0] && value <= y.domain[1])
      return { x: rows[i]!.x, y: value };
  }
  return null;
}

/** The index of the x nearest to a value, on the axis's own scale. */
export function nearest(x: readonly number[], value: number, log: boolean): number {
  const far = (v: number) => Math.abs(log ? Math.log(v / value) : v - value);
  let best = 0;
  for (let i = 1; i < x.length; i += 1) if (far(x[i]!) < far(x[best]!)) best = i;
  return best;
}

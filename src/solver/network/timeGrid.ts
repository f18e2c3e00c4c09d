import type { TimeResponse } from "./timeResponse.ts";

const perDecade = 40;
const first = -14;
const last = 7;
const perCycle = 16;
const mostPoints = 60000;

/**
 * Times at which a response is looked at to find its crossings and extremes, rising: forty a decade, sixteen a cycle of whatever
 * rings until it has died away, and as close after each arrival of a wave on a line.
 */
export function timeGrid(g: TimeResponse): number[] {
  const times = Array.from({ length: (last - first) * perDecade + 1 }, (_, i) => 10 ** (first + i / perDecade));
  if (g.delay_s > 0) {
    times.push(...lineTimes(g, times));
  } else {
    for (const p of g.ringing) {
      const step = (2 * Math.PI) / p.im / perCycle;
      const end = Math.min(30 / -p.re, step * mostPoints, 10 ** last);
      for (let t = step; t < end; t += step) times.push(t);
    }
  }
  times.sort((a, b) => a - b);
  return times.filter((t, i) => i === 0 || t > times[i - 1]!);
}

/** After the first arrivals in detail, sixteen a delay for sixty delays, then one period of the slowest mode, four delays, now and then. */
function lineTimes({ delay_s: T, ringing }: TimeResponse, plain: readonly number[]): number[] {
  const times: number[] = [];
  const soon = plain.filter((t) => t < 2 * T);
  for (let k = 0; k < 12; k++) {
    const at = (2 * k + 1) * T;
    times.push(at, ...soon.filter((_, i) => k < 2 || i % 4 === 0).map((t) => at + t));
  }
  for (let i = 1; i < 16 * 60; i++) times.push(T * (1 + i / 16));
  // The slow modes alone are strong enough to matter so late.
  const strong = ringing.slice(0, 40);
  const slowest = strong.reduce((least, p) => Math.min(least, -p.re), Number.POSITIVE_INFINITY);
  const period = strong.reduce((longest, p) => Math.max(longest, (2 * Math.PI) / p.im), 4 * T);
  for (const from of plain.filter((t, i) => t > 60 * T && t * slowest < 25 && i % 4 === 0)) {
    for (let i = 0; i < 24; i++) times.push(from + (i / 24) * period);
  }
  return times;
}

/** The time at which f is greatest, refined between the points of the grid. */
export function greatest(g: TimeResponse, f: (t: number) => number): number {
  const grid = timeGrid(g);
  let at = 0;
  let most = Number.NEGATIVE_INFINITY;
  grid.forEach((t, i) => {
    const value = f(t);
    if (value > most) {
      most = value;
      at = i;
    }
  });
  if (at === 0 || at === grid.length - 1) return grid[at]!;
  const found = maximum(f, grid[at - 1]!, grid[at + 1]!);
  return f(found) > most ? found : grid[at]!;
}

/** Greatest value between two times by golden section in ln t. */
export function maximum(f: (t: number) => number, from: number, to: number): number {
  const golden = (Math.sqrt(5) - 1) / 2;
  let low = Math.log(from);
  let high = Math.log(to);
  for (let step = 0; step < 40; step++) {
    const left = high - golden * (high - low);
    const right = low + golden * (high - low);
    if (f(Math.exp(left)) > f(Math.exp(right))) high = right;
    else low = left;
  }
  return Math.exp((low + high) / 2);
}

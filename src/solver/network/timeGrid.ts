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
    const arrivals = 12;
    const around = times.filter((t) => t < 2 * g.delay_s);
    for (let k = 0; k < arrivals; k++) {
      const at = (2 * k + 1) * g.delay_s;
      times.push(at, ...around.map((t) => at + t));
    }
  }
  for (const p of g.ringing) {
    // A mode far faster than the line's round trip is seen at its arrivals.
    if (g.delay_s > 0 && p.im * g.delay_s > 20) continue;
    const step = (2 * Math.PI) / p.im / perCycle;
    const end = Math.min(30 / -p.re, step * mostPoints, 10 ** last);
    for (let t = g.delay_s + step; t < end; t += step) times.push(t);
  }
  times.sort((a, b) => a - b);
  return times.filter((t, i) => i === 0 || t > times[i - 1]!);
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

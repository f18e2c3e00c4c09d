import type { TimeResponse } from "./timeResponse.ts";

/** Rising linearly from 0 to 1 in T, then 1. */
export function ramp(g: TimeResponse, T: number, t: number): number {
  if (t <= 0) return 0;
  return t <= T ? (t * g.mean(0, t)) / T : g.mean(t - T, t);
}

/** amplitude·(exp(−αt) − exp(−βt)). */
export const doubleExponential = (
  g: TimeResponse,
  amplitude: number,
  alpha: number,
  beta: number,
  t: number,
): number => (t < 0 ? 0 : amplitude * (g.exponential(alpha, t) - g.exponential(beta, t)));

/** sin(πt/D) up to D, then 0: past the end the two sinusoids cancel and only their transients are left. */
export function halfSine(g: TimeResponse, duration_s: number): (t: number) => number {
  const omega = Math.PI / duration_s;
  const { steady, transient } = g.sine(omega);
  return (t) => {
    if (t <= 0) return 0;
    if (t > duration_s) return transient(t) + transient(t - duration_s);
    return steady.im * Math.cos(omega * t) + steady.re * Math.sin(omega * t) + transient(t);
  };
}

/** Periods summed one by one; those before are taken by the Euler-Maclaurin formula. */
const oneByOne = 20000;

/** 1 for the first `duty` of each period from t = 0, else 0, from rest. At an edge the value just after it. */
export function square(g: TimeResponse, period_s: number, duty: number, t: number): number {
  if (t < 0 || duty === 0) return 0;
  if (duty === 1) return g.at(t);
  const close = 1e-12 * (t / period_s + 1);
  const periods = Math.floor(t / period_s + close);
  const since = Math.max(0, t - periods * period_s);
  const on = duty * period_s;
  const pulse = (tau: number) => g.at(tau) - (tau - on >= -close * period_s ? g.at(Math.max(0, tau - on)) : 0);
  const w = (j: number) => pulse(since + j * period_s);
  const last = Math.min(periods, oneByOne);
  let sum = 0;
  for (let j = 0; j <= last; j++) sum += w(j);
  if (periods === last) return sum;
  // Σ f(j), j = last … periods, of which f(last) is counted already.
  const a = since + last * period_s;
  const b = since + periods * period_s;
  const integral = duty * (g.mean(b - on, b) - g.mean(a - on, a));
  const slope = (w(periods + 1) - w(periods - 1) - (w(last + 1) - w(last - 1))) / 2;
  return sum + integral + (w(periods) - w(last)) / 2 + slope / 12;
}

/**
 * Linear between points, 0 before the first, the last value held. Two points at one time are a jump. What lies so far back that the
 * step response has settled counts by its last value alone.
 */
export function samples(g: TimeResponse, time_s: ArrayLike<number>, value: ArrayLike<number>): (t: number) => number {
  const settled = settledFrom(g);
  return (t) => {
    const held = lastBefore(time_s, t - settled);
    let sum = held >= 0 ? value[held]! : t >= time_s[0]! ? value[0]! * g.at(t - time_s[0]!) : 0;
    for (let k = Math.max(held, 0); k + 1 < time_s.length && time_s[k]! < t; k++) {
      const from = time_s[k]!;
      const to = time_s[k + 1]!;
      const rise = value[k + 1]! - value[k]!;
      if (rise === 0) continue;
      if (to === from) sum += rise * g.at(t - to);
      else if (t < to) sum += (rise * (t - from) * g.mean(0, t - from)) / (to - from);
      else sum += rise * g.mean(t - to, t - from);
    }
    return sum;
  };
}

/** Time after which the step response stays at 1 to rounding: looked for ten times a decade, and until what rings has died away. */
function settledFrom(g: TimeResponse): number {
  const rung = g.ringing.reduce((longest, p) => Math.max(longest, 25 / -p.re), 0);
  for (let i = 70; i >= -140; i--) {
    if (Math.abs(g.at(10 ** (i / 10)) - 1) > 2e-10) return Math.max(rung, 10 ** ((i + 1) / 10));
  }
  return rung;
}

/** Index of the last time not after t; -1: none. */
function lastBefore(time_s: ArrayLike<number>, t: number): number {
  let low = -1;
  let high = time_s.length;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (time_s[middle]! <= t) low = middle;
    else high = middle;
  }
  return low;
}

import type { TimeResponse } from "./timeResponse.ts";

/** Terms of the accelerated sum: its error is below (3 + √8)^−terms of what is summed. */
const terms = 24;
const mostDirect = 4000;

/**
 * The settled response to a square wave of ±1/2, duty 1/2, at t in [0, halfPeriod) after a rising edge: each past edge's step response
 * is summed with its sign, y = 1/2 + Σ (−1)^k (g(t + k T) − 1). The sum alternates and is accelerated (H. Cohen, F. Rodriguez Villegas,
 * D. Zagier, Experimental Mathematics 9 (2000) 1, from memory), once what rings has died away.
 */
export function steadySquare(g: TimeResponse, halfPeriod_s: number): (t: number) => number {
  const direct = ringingHalves(g, halfPeriod_s);
  return (t) => {
    const excess = (k: number) => g.at(t + k * halfPeriod_s) - 1;
    let sum = 0;
    for (let k = 0; k < direct; k++) sum += (k % 2 === 0 ? 1 : -1) * excess(k);
    const tail = alternating((k) => excess(direct + k));
    return 0.5 + sum + (direct % 2 === 0 ? tail : -tail);
  };
}

/** Half periods until the slowest ring is down to e^−30; that of a lossless ring is cut. */
function ringingHalves(g: TimeResponse, halfPeriod_s: number): number {
  const slowest = g.ringing.reduce((least, pole) => Math.min(least, -pole.re), Number.POSITIVE_INFINITY);
  return g.ringing.length === 0 ? 0 : Math.min(mostDirect, Math.ceil(30 / (slowest * halfPeriod_s)));
}

/** Σ (−1)^k a(k), k from 0, of a sum of decays. */
function alternating(a: (k: number) => number): number {
  const whole = (3 + Math.sqrt(8)) ** terms;
  const d = (whole + 1 / whole) / 2;
  let b = -1;
  let c = -d;
  let sum = 0;
  for (let k = 0; k < terms; k++) {
    c = b - c;
    sum += c * a(k);
    b = (b * (k + terms) * (k - terms)) / ((k + 0.5) * (k + 1));
  }
  return sum / d;
}

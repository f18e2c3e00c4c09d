/**
 * Crowding of points along a curve. Charge piles up as s^(-1/2) at a free edge and as s^(-1/3) at a square rim; with s growing
 * as u² or u³ there, charge per u is smooth and a polynomial follows it. End orders 1 (smooth), 2 (free edge), 3 (square rim).
 * s(u) = Σ_{j ≥ p} C(m, j) u^j (1−u)^(m−j), m = p + q − 1: the integral of u^(p−1)(1−u)^(q−1), from 0 to 1.
 */
export type EndOrder = 1 | 2 | 3;

const choose = [[1], [1, 1], [1, 2, 1], [1, 3, 3, 1], [1, 4, 6, 4, 1], [1, 5, 10, 10, 5, 1]] as const;

/** Fraction of the length at u, both 0 … 1. */
export function along(p: EndOrder, q: EndOrder, u: number): number {
  if (p === 1 && q === 1) return u;
  const m = p + q - 1;
  let sum = 0;
  for (let j = p; j <= m; j++) sum += choose[m]![j]! * u ** j * (1 - u) ** (m - j);
  return sum;
}

/** ds/du. */
export const alongSlope = (p: EndOrder, q: EndOrder, u: number): number => {
  const m = p + q - 1;
  return m * choose[m - 1]![p - 1]! * u ** (p - 1) * (1 - u) ** (q - 1);
};

/** The u of a fraction of the length. */
export function alongInverse(p: EndOrder, q: EndOrder, s: number): number {
  if (s <= 0) return 0;
  if (s >= 1) return 1;
  if (q === 1) return p === 1 ? s : p === 2 ? Math.sqrt(s) : Math.cbrt(s);
  if (p === 1) return 1 - (q === 2 ? Math.sqrt(1 - s) : Math.cbrt(1 - s));
  if (p === 2 && q === 2) return 0.5 - Math.sin(Math.asin(1 - 2 * s) / 3);
  let low = 0;
  let high = 1;
  let u = s;
  for (let step = 0; step < 60; step++) {
    const miss = along(p, q, u) - s;
    if (miss > 0) high = u;
    else low = u;
    const next = u - miss / alongSlope(p, q, u);
    const inside = next > low && next < high ? next : (low + high) / 2;
    if (Math.abs(inside - u) < 1e-14) return inside;
    u = inside;
  }
  return u;
}

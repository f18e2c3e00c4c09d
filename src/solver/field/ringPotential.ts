/** Complete elliptic integral K by the arithmetic-geometric mean, from the complementary parameter m1 = 1 − m, 0 < m1 ≤ 1. */
export function ellipticK(m1: number): number {
  let a = 1;
  let g = Math.sqrt(m1);
  for (let i = 0; i < 12; i++) {
    const next = (a + g) / 2;
    g = Math.sqrt(a * g);
    if (Math.abs(next - g) < 1e-15 * next) return Math.PI / (2 * next);
    a = next;
  }
  return Math.PI / (a + g);
}

/**
 * Potential at (r, z) of a thin ring of radius a at height h, as K(m)/√((r+a)² + (z−h)²): times q/(2π² ε0) it is in volts.
 * 1 − m = [(r−a)² + (z−h)²]/[(r+a)² + (z−h)²] is formed without a difference. K is the polynomial of Abramowitz and Stegun
 * 17.3.34 (from memory; within 2e-8). Infinite on the ring itself. Any two points, m.
 */
export function ringKernel(r: number, z: number, a: number, h: number): number {
  const dz2 = (z - h) * (z - h);
  const far = (r + a) * (r + a) + dz2;
  const m1 = ((r - a) * (r - a) + dz2) / far;
  const even = 1.38629436112 + m1 * (0.09666344259 + m1 * (0.03590092383 + m1 * (0.03742563713 + m1 * 0.01451196212)));
  const odd = 0.5 + m1 * (0.12498593597 + m1 * (0.06880248576 + m1 * (0.03328355346 + m1 * 0.00441787012)));
  return (even - odd * Math.log(m1)) / Math.sqrt(far);
}

import { epsilon0 } from "../standards/constants.ts";

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
 * Potential at (r, z) per coulomb on a thin ring of radius a at height h, V/C: K(m) / (2π² ε0 √((r+a)² + (z−h)²)), with
 * 1 − m = [(r−a)² + (z−h)²]/[(r+a)² + (z−h)²] formed without a difference (any field theory text; computed here).
 */
export function ringPotential(r: number, z: number, a: number, h: number): number {
  const far = (r + a) * (r + a) + (z - h) * (z - h);
  const near = (r - a) * (r - a) + (z - h) * (z - h);
  return ellipticK(near / far) / (2 * Math.PI * Math.PI * epsilon0 * Math.sqrt(far));
}

import { factor, solve } from "../quantities/linear.ts";
import { epsilon0 } from "../standards/constants.ts";
import { ringPotential } from "./ringPotential.ts";

/** A frustum ring of a conductor's surface: from (r1, z1) to (r2, z2), with one charge density. Lengths in m. */
export interface Ring {
  readonly r1: number;
  readonly z1: number;
  readonly r2: number;
  readonly z2: number;
  /** Number of its conductor; -1: earthed. */
  readonly conductor: number;
}

// Eight-point Gauss-Legendre on 0 … 1 (Abramowitz and Stegun, table 25.4, from memory).
const points = [0.0198550717512319, 0.1016667612931866, 0.2372337950418355, 0.4082826787521751];
const weights = [0.0506142681451881, 0.1111905172266872, 0.1568533229389436, 0.181341891689181];
const gauss: readonly (readonly [number, number])[] = points.flatMap((x, i) => [
  [x, weights[i]!] as const,
  [1 - x, weights[i]!] as const,
]);
const coarse: readonly (readonly [number, number])[] = [
  [0.1127016653792583, 5 / 18],
  [0.5, 8 / 18],
  [0.8872983346207417, 5 / 18],
];

export const areaOf = ({ r1, z1, r2, z2 }: Ring): number => Math.PI * (r1 + r2) * Math.hypot(r2 - r1, z2 - z1);

/**
 * Potential at (r, z) of one ring with unit charge density, V per C/m². Near the ring the integral is split at its nearest
 * point, with the substitution s = u³ that takes the logarithmic singularity out.
 */
export function potentialOf(ring: Ring, r: number, z: number): number {
  const { r1, z1, r2, z2 } = ring;
  const length = Math.hypot(r2 - r1, z2 - z1);
  const along = Math.min(1, Math.max(0, ((r - r1) * (r2 - r1) + (z - z1) * (z2 - z1)) / (length * length)));
  const distance = Math.hypot(r - r1 - along * (r2 - r1), z - z1 - along * (z2 - z1));
  const at = (s: number) => {
    const a = r1 + s * (r2 - r1);
    return 2 * Math.PI * a * length * ringPotential(r, z, a, z1 + s * (z2 - z1));
  };
  if (distance > 1.5 * length) return coarse.reduce((sum, [x, w]) => sum + w * at(x), 0);
  let sum = 0;
  for (const [from, span] of [
    [along, 1 - along],
    [along, -along],
  ] as const) {
    if (span === 0) continue;
    for (const [u, w] of gauss) sum += Math.abs(span) * 3 * u * u * w * at(from + span * u ** 3);
  }
  return sum;
}

/** Charge density on every ring for each conductor at 1 V, all others and the floor (by images) earthed: one array a conductor. */
export function densities(rings: readonly Ring[], conductors: number, floor = true): Float64Array[] {
  const n = rings.length;
  const matrix = new Float64Array(n * n);
  rings.forEach((at, i) => {
    const r = (at.r1 + at.r2) / 2;
    const z = (at.z1 + at.z2) / 2;
    rings.forEach((ring, j) => {
      matrix[i * n + j] = potentialOf(ring, r, z) - (floor ? potentialOf(ring, r, -z) : 0);
    });
  });
  const pivots = factor(matrix, n);
  return Array.from({ length: conductors }, (_, k) =>
    solve(
      matrix,
      pivots,
      Float64Array.from(rings, (ring) => (ring.conductor === k ? 1 : 0)),
    ),
  );
}

/** Maxwell's capacitance matrix, F: charge on conductor i per volt on conductor j, everything earthed as reference. */
export function capacitanceMatrix(
  rings: readonly Ring[],
  conductors: number,
  sigma: readonly Float64Array[],
): number[][] {
  const C = Array.from({ length: conductors }, () => new Array<number>(conductors).fill(0));
  rings.forEach((ring, e) => {
    if (ring.conductor < 0) return;
    const area = areaOf(ring);
    for (let j = 0; j < conductors; j++) C[ring.conductor]![j] = C[ring.conductor]![j]! + area * sigma[j]![e]!;
  });
  return C;
}

/** Field at a closed conductor's surface, V/m, from its charge density. */
export const surfaceField = (density: number): number => density / epsilon0;

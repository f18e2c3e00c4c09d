import type { Mesh } from "./panel.ts";
import { ringKernel } from "./ringPotential.ts";

const turns = 6;

/**
 * A plane vertical wall at a distance from the axis: each ring has an image of the other sign whose axis lies twice as far off.
 * Its potential is averaged round the ring it acts on, so that charge stays even round the axis: what a wall draws to the near
 * side of a body is left out, a share of the order of (radius / wall distance)² of the wall's own effect.
 */
export function wallImage(mesh: Mesh, matrix: Float64Array, floor: boolean, distance: number): void {
  const { count, r, z, weight } = mesh;
  const cosines = Array.from({ length: turns }, (_, k) => Math.cos((Math.PI * (k + 0.5)) / turns));
  const off = 2 * distance;
  for (let i = 0; i < count; i++) {
    const [ri, zi, wi] = [r[i]!, z[i]!, weight[i]!];
    for (let j = 0; j <= i; j++) {
      let sum = 0;
      for (const cosine of cosines) {
        const at = Math.sqrt(off * off + r[j]! * r[j]! + 2 * off * r[j]! * cosine);
        sum += ringKernel(ri, zi, at, z[j]!);
        if (floor) sum -= ringKernel(ri, -zi, at, z[j]!);
      }
      const value = sum / turns;
      matrix[i * count + j] = matrix[i * count + j]! - value * weight[j]!;
      if (j < i) matrix[j * count + i] = matrix[j * count + i]! - value * wi;
    }
  }
}

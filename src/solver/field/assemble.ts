import { heightAt, nearestOn, radiusAt } from "./curve.ts";
import { addNear } from "./nearIntegral.ts";
import type { Mesh, Panel } from "./panel.ts";
import { ringKernel } from "./ringPotential.ts";
import { wallImage } from "./wallImage.ts";

/**
 * The potential at every point of the mesh from the charge at every other: count × count, row by row, in units of 1/(π ε0).
 * Far pairs take the plain rule once for both ways; near ones the integral of `addNear`. The floor is the image with the other
 * sign, a wall the images of both, averaged round the axis.
 */
export function assemble(mesh: Mesh, floor: boolean, wallDistance: number | null): Float64Array {
  const { count, r, z, weight } = mesh;
  const matrix = new Float64Array(count * count);
  for (let i = 0; i < count; i++) {
    const [ri, zi, wi] = [r[i]!, z[i]!, weight[i]!];
    for (let j = 0; j < i; j++) {
      let value = ringKernel(ri, zi, r[j]!, z[j]!);
      if (floor) value -= ringKernel(ri, -zi, r[j]!, z[j]!);
      matrix[i * count + j] = value * weight[j]!;
      matrix[j * count + i] = value * wi;
    }
    if (floor) matrix[i * count + i] = -ringKernel(ri, -zi, ri, zi) * wi;
  }
  for (const panel of mesh.panels) nearBlocks(mesh, panel, matrix, floor);
  if (wallDistance !== null) wallImage(mesh, matrix, floor, wallDistance);
  return matrix;
}

/** Puts right what the plain rule gives for points too near a panel or its image. */
function nearBlocks(mesh: Mesh, panel: Panel, matrix: Float64Array, floor: boolean): void {
  const { count, r, z, weight } = mesh;
  const n = panel.rule.points.length;
  const row = new Float64Array(count);
  const within = nearness(n) * panel.length;
  const [rm, zm] = [radiusAt(panel.curve, 0.5), heightAt(panel.curve, 0.5)];
  const reach = within + panel.length / 2;
  for (let i = 0; i < count; i++) {
    const k = i - panel.first;
    const own = k >= 0 && k < n;
    for (const sign of [1, -1] as const) {
      if (sign < 0 && !floor) continue;
      const [ri, zi] = [r[i]!, sign * z[i]!];
      const self = own && sign > 0;
      if (!self) {
        const [dr, dz] = [ri - rm, zi - zm];
        if (dr * dr + dz * dz > reach * reach) continue;
        const s = nearestOn(panel.curve, ri, zi);
        if (Math.hypot(ri - radiusAt(panel.curve, s), zi - heightAt(panel.curve, s)) > within) continue;
      }
      row.fill(0, panel.first, panel.first + n);
      addNear(panel, ri, zi, self ? panel.rule.points[k]! : null, sign, row);
      for (let j = panel.first; j < panel.first + n; j++) {
        const at = i * count + j;
        const plain = i === j && self ? 0 : sign * ringKernel(ri, zi, r[j]!, z[j]!) * weight[j]!;
        matrix[at] = matrix[at]! + row[j]! - plain;
      }
    }
  }
}

/** Distance over length within which the plain rule of n points is off by more than about 1e-6 of the panel's own potential. */
function nearness(n: number): number {
  const rho = 1e-6 ** (-1 / (2 * n));
  return (rho - 1 / rho) / 4;
}

import { alongSlope } from "./grading.ts";
import type { Body, Mesh, Panel } from "./panel.ts";

const between = 4;
const kept = 0.5;

/**
 * Largest field at the surface of a body for 1 V with the linear profile, V/m per V; null where there is no such body.
 * Looked for on the polynomial through the points, between them too. A panel that ends at a contact or an edge is looked at only
 * beyond a quarter of its length from there: the field of a contact falls to zero, but as a quotient of two small numbers.
 */
export function surfaceField(
  mesh: Mesh,
  field: readonly Float64Array[],
  n: number,
  body: Body = "electrode",
): number | null {
  let most: number | null = null;
  for (const panel of mesh.panels) {
    if (panel.body !== body) continue;
    const profile = panel.rule.points.map((_, k) => {
      const i = panel.first + k;
      return field.reduce((sum, of, node) => sum + (of[i]! * node) / n, 0) * mesh.stretch[i]!;
    });
    most = Math.max(most ?? 0, largestOn(panel, profile));
  }
  return most;
}

function largestOn(panel: Panel, profile: Float64Array): number {
  const { points } = panel.rule;
  const from = panel.p === 1 ? 0 : kept;
  const to = panel.q === 1 ? 1 : 1 - kept;
  const count = between * points.length;
  let most = 0;
  for (let k = 0; k <= count; k++) {
    const u = from + ((to - from) * k) / count;
    const value = interpolate(panel, profile, u) / (panel.length * alongSlope(panel.p, panel.q, u));
    most = Math.max(most, Math.abs(value));
  }
  return most;
}

function interpolate({ rule }: Panel, values: Float64Array, u: number): number {
  let top = 0;
  let bottom = 0;
  for (let k = 0; k < values.length; k++) {
    const off = u - rule.points[k]!;
    if (Math.abs(off) < 1e-13) return values[k]!;
    top += (rule.barycentric[k]! / off) * values[k]!;
    bottom += rule.barycentric[k]! / off;
  }
  return top / bottom;
}

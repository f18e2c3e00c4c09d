import { heightAt, nearestOn, radiusAt } from "./curve.ts";
import { gaussLegendre } from "./gaussLegendre.ts";
import { along, alongInverse } from "./grading.ts";
import type { Panel } from "./panel.ts";
import { ringKernel } from "./ringPotential.ts";

/** Points enough for the logarithm and for a basis of the panel's own degree, which v³ triples. */
const pointsOn = (degree: number) => gaussLegendre(Math.max(12, 6 + 2 * degree));
const pointsBeside = (degree: number) => gaussLegendre(16 + degree);

/**
 * Adds to `out` the potential at (r, z) of each basis polynomial of a panel, times `sign`. Split at the nearest point: with
 * u = u* ± span·v³ where the point lies on the panel (`at` is its u), which takes the logarithm out, and u = u* ± b·sinh(ηv)
 * where it lies beside it, b being the u that corresponds to the distance.
 */
export function addNear(panel: Panel, r: number, z: number, at: number | null, sign: number, out: Float64Array): void {
  const { curve, p, q } = panel;
  const degree = panel.rule.points.length - 1;
  if (at !== null) {
    const { points, weights } = pointsOn(degree);
    for (const span of [1 - at, -at]) {
      for (let k = 0; k < points.length; k++) {
        const v = points[k]!;
        add(panel, r, z, at + span * v * v * v, sign * Math.abs(span) * 3 * v * v * weights[k]!, out);
      }
    }
    return;
  }
  const s = nearestOn(curve, r, z);
  const star = alongInverse(p, q, s);
  const away = Math.hypot(r - radiusAt(curve, s), z - heightAt(curve, s)) / panel.length;
  const { points, weights } = pointsBeside(degree);
  for (const way of [1, -1]) {
    const span = way > 0 ? 1 - star : star;
    if (span < 1e-14) continue;
    const b = Math.max(1e-12, Math.abs(alongInverse(p, q, s + way * away) - star));
    const eta = Math.asinh(span / b);
    for (let k = 0; k < points.length; k++) {
      const e = Math.exp(eta * points[k]!);
      const u = star + (way * b * (e - 1 / e)) / 2;
      add(panel, r, z, u, sign * b * eta * ((e + 1 / e) / 2) * weights[k]!, out);
    }
  }
}

function add(panel: Panel, r: number, z: number, u: number, weight: number, out: Float64Array): void {
  const { curve, rule, first } = panel;
  const { points, barycentric } = rule;
  const n = points.length;
  const s = along(panel.p, panel.q, u);
  const a = radiusAt(curve, s);
  const value = weight * a * ringKernel(r, z, a, heightAt(curve, s));
  // A point that rounding moves onto the ring itself: its weight is below 1e-9 of the whole.
  if (!Number.isFinite(value)) return;
  let sum = 0;
  for (let k = 0; k < n; k++) {
    const off = u - points[k]!;
    if (off === 0) {
      out[first + k] = out[first + k]! + value;
      return;
    }
    sum += barycentric[k]! / off;
  }
  const scale = value / sum;
  for (let k = 0; k < n; k++) out[first + k] = out[first + k]! + (scale * barycentric[k]!) / (u - points[k]!);
}

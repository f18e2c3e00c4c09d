import { arc, type Curve, line } from "./curve.ts";
import { type FieldGeometry, topOf } from "./fieldGeometry.ts";

/** The toroid's tube in the meridian plane. */
export interface Tube {
  readonly r: number;
  readonly z: number;
  readonly radius: number;
}

export const tubeOf = (geometry: FieldGeometry): Tube => ({
  r: geometry.electrode.radius_m,
  z: topOf(geometry) + geometry.electrode.offset_m,
  radius: geometry.electrode.tubeRadius_m,
});

/** A part of a curve with which of its ends are cuts. */
export interface Cut {
  readonly curve: Curve;
  readonly cutAtStart: boolean;
  readonly cutAtEnd: boolean;
}

/** The parts of a straight line that lie outside a tube. */
export function outsideTube(
  [r1, z1]: readonly [number, number],
  [r2, z2]: readonly [number, number],
  tube: Tube,
): Cut[] {
  const [dr, dz, fr, fz] = [r2 - r1, z2 - z1, r1 - tube.r, z1 - tube.z];
  const a = dr * dr + dz * dz;
  const b = fr * dr + fz * dz;
  const inside = b * b - a * (fr * fr + fz * fz - tube.radius * tube.radius);
  const roots = inside > 0 ? [(-b - Math.sqrt(inside)) / a, (-b + Math.sqrt(inside)) / a] : [];
  const marks = [0, ...roots.filter((s) => s > 1e-9 && s < 1 - 1e-9), 1];
  const at = (s: number) => [r1 + s * dr, z1 + s * dz] as const;
  return marks.slice(1).flatMap((end, i): Cut[] => {
    const start = marks[i]!;
    const [r, z] = at((start + end) / 2);
    if (Math.hypot(r - tube.r, z - tube.z) < tube.radius) return [];
    return [{ curve: line(at(start), at(end)), cutAtStart: start > 0, cutAtEnd: end < 1 }];
  });
}

/** The parts of the tube's circle that lie outside the column, r < radius below its top: quarters, or arcs between contacts. */
export function outsideColumn(tube: Tube, radius: number, top: number): Cut[] {
  const turn = 2 * Math.PI;
  const found: number[] = [];
  const sine = (radius - tube.r) / tube.radius;
  if (Math.abs(sine) < 1) {
    for (const angle of [Math.asin(sine), Math.PI - Math.asin(sine)])
      if (tube.z + tube.radius * Math.cos(angle) < top) found.push(angle);
  }
  const cosine = (top - tube.z) / tube.radius;
  if (Math.abs(cosine) < 1) {
    for (const angle of [Math.acos(cosine), -Math.acos(cosine)])
      if (tube.r + tube.radius * Math.sin(angle) < radius) found.push(angle);
  }
  const contacts = found.map((angle) => ((angle % turn) + turn) % turn).sort((a, b) => a - b);
  const marks = contacts.length > 0 ? [...contacts, contacts[0]! + turn] : [0, turn];
  return marks.slice(1).flatMap((to, i): Cut[] => {
    const from = marks[i]!;
    const middle = (from + to) / 2;
    const [r, z] = [tube.r + tube.radius * Math.sin(middle), tube.z + tube.radius * Math.cos(middle)];
    if (r < radius && z < top) return [];
    const parts = Math.max(1, Math.ceil((to - from) / (Math.PI / 2) - 1e-9));
    const step = (to - from) / parts;
    return Array.from({ length: parts }, (_, k) => ({
      curve: arc([tube.r, tube.z], tube.radius, from + k * step, from + (k + 1) * step),
      cutAtStart: contacts.length > 0 && k === 0,
      cutAtEnd: contacts.length > 0 && k === parts - 1,
    }));
  });
}

/** A line or an arc in the meridian plane, r ≥ 0, m. Arc angles: 0 straight up, growing towards the outside. */
export type Curve =
  | { readonly kind: "line"; readonly r1: number; readonly z1: number; readonly r2: number; readonly z2: number }
  | {
      readonly kind: "arc";
      readonly r: number;
      readonly z: number;
      readonly radius: number;
      readonly from: number;
      readonly to: number;
    };

export type Point = readonly [r: number, z: number];

export const line = ([r1, z1]: Point, [r2, z2]: Point): Curve => ({ kind: "line", r1, z1, r2, z2 });
export const arc = ([r, z]: Point, radius: number, from: number, to: number): Curve => ({
  kind: "arc",
  r,
  z,
  radius,
  from,
  to,
});

export const lengthOf = (curve: Curve): number =>
  curve.kind === "line"
    ? Math.hypot(curve.r2 - curve.r1, curve.z2 - curve.z1)
    : curve.radius * Math.abs(curve.to - curve.from);

/** Distance from the axis at the fraction s of the length. */
export const radiusAt = (curve: Curve, s: number): number =>
  curve.kind === "line"
    ? curve.r1 + s * (curve.r2 - curve.r1)
    : Math.max(0, curve.r + curve.radius * Math.sin(curve.from + s * (curve.to - curve.from)));

/** Height over the floor at the fraction s of the length. */
export const heightAt = (curve: Curve, s: number): number =>
  curve.kind === "line"
    ? curve.z1 + s * (curve.z2 - curve.z1)
    : curve.z + curve.radius * Math.cos(curve.from + s * (curve.to - curve.from));

/** Fraction of the length, 0 … 1, that lies nearest to a point of the plane. */
export function nearestOn(curve: Curve, r: number, z: number): number {
  if (curve.kind === "line") {
    const dr = curve.r2 - curve.r1;
    const dz = curve.z2 - curve.z1;
    return Math.min(1, Math.max(0, ((r - curve.r1) * dr + (z - curve.z1) * dz) / (dr * dr + dz * dz)));
  }
  const span = curve.to - curve.from;
  const turn = 2 * Math.PI;
  const middle = curve.from + span / 2;
  let off = Math.atan2(r - curve.r, z - curve.z) - middle;
  off -= turn * Math.round(off / turn);
  return Math.min(1, Math.max(0, 0.5 + off / span));
}

/** The part of a curve between two fractions of its length. */
export function partOf(curve: Curve, from: number, to: number): Curve {
  if (curve.kind === "line")
    return line([radiusAt(curve, from), heightAt(curve, from)], [radiusAt(curve, to), heightAt(curve, to)]);
  const span = curve.to - curve.from;
  return { ...curve, from: curve.from + from * span, to: curve.from + to * span };
}

import type { Ring } from "./boundary.ts";

/** How divisions crowd: at both ends, at the far end only, or evenly. Charge piles up at free edges and rims. */
export type Crowding = "both" | "far" | "near" | "even";

/** Marks from 0 to 1. */
export function marks(count: number, crowding: Crowding): number[] {
  return Array.from({ length: count + 1 }, (_, i) => {
    const x = i / count;
    if (crowding === "both") return (1 - Math.cos(Math.PI * x)) / 2;
    if (crowding === "far") return Math.sin((Math.PI * x) / 2);
    if (crowding === "near") return 1 - Math.cos((Math.PI * x) / 2);
    return x;
  });
}

type Point = readonly [r: number, z: number];

/** A straight line in the meridian, cut into rings. */
export function line(from: Point, to: Point, count: number, crowding: Crowding, conductor: number): Ring[] {
  const at = marks(count, crowding).map(
    (x): Point => [from[0] + x * (to[0] - from[0]), from[1] + x * (to[1] - from[1])],
  );
  return at.slice(1).map((end, i) => ringOf(at[i]!, end, conductor));
}

/** An arc around (r, z) of radius a from angle to angle (0: straight up, growing towards the outside), cut into rings. */
export function arc(
  centre: Point,
  a: number,
  fromAngle: number,
  toAngle: number,
  count: number,
  conductor: number,
  crowding: Crowding = "even",
): Ring[] {
  const at = marks(count, crowding).map((x): Point => {
    const angle = fromAngle + x * (toAngle - fromAngle);
    return [Math.max(0, centre[0] + a * Math.sin(angle)), centre[1] + a * Math.cos(angle)];
  });
  return at.slice(1).map((end, i) => ringOf(at[i]!, end, conductor));
}

const ringOf = ([r1, z1]: Point, [r2, z2]: Point, conductor: number): Ring => ({ r1, z1, r2, z2, conductor });

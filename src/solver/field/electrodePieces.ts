import { arc, type Curve, line } from "./curve.ts";
import { type FieldGeometry, topOf } from "./fieldGeometry.ts";
import type { EndOrder } from "./grading.ts";
import type { Piece } from "./panel.ts";
import { outsideColumn, tubeOf } from "./toroidContact.ts";

/** Height of a sphere's centre over the column's top, on whose rim it rests. */
export const sphereRise = (radius: number, columnDiameter: number): number =>
  Math.sqrt(radius * radius - (columnDiameter * columnDiameter) / 4);

/** The electrode's outer surface and the HV wire above it, all of the top node. What the column covers is left out. */
export function electrodePieces(geometry: FieldGeometry): Piece[] {
  const { electrode, elements, columnDiameter_m, wire } = geometry;
  const top = topOf(geometry);
  const rim = columnDiameter_m / 2;
  const start = wire ? wire.radius_m : 0;
  const first: EndOrder = wire ? 2 : 1;
  const of = (curve: Curve, p: EndOrder, q: EndOrder, body: "electrode" | "wire" = "electrode"): Piece => ({
    curve,
    body,
    low: elements,
    high: elements,
    p,
    q,
  });
  const wirePieces = (z: number): Piece[] =>
    wire ? [of(line([wire.radius_m, z], [wire.radius_m, z + wire.length_m]), 1, 2, "wire")] : [];
  if (electrode.kind === "sphere") {
    const a = electrode.radius_m;
    const centre = [0, top + sphereRise(a, columnDiameter_m)] as const;
    const from = Math.asin(start / a);
    const to = Math.PI - Math.asin(Math.min(1, rim / a));
    const middle = (from + to) / 2;
    return [
      of(arc(centre, a, from, middle), first, 1),
      of(arc(centre, a, middle, to), 1, 2),
      ...wirePieces(centre[1] + a * Math.cos(from)),
    ];
  }
  if (electrode.kind === "disc") {
    const half = electrode.thickness_m / 2;
    const flat = electrode.radius_m - half;
    const high = top + electrode.thickness_m;
    const face = flat > start ? [of(line([start, high], [flat, high]), first, 1)] : [];
    const round = [0, 1, 2, 3].map((k) =>
      of(arc([flat, top + half], half, (k * Math.PI) / 4, ((k + 1) * Math.PI) / 4), 1, 1),
    );
    const under = flat > rim * (1 + 1e-9) ? [of(line([flat, top], [rim, top]), 1, 2)] : [];
    return [...face, ...round, ...under, ...wirePieces(high)];
  }
  if (electrode.kind === "toroid") {
    const arcs = outsideColumn(tubeOf(geometry), rim, top).map(({ curve, cutAtStart, cutAtEnd }) =>
      of(curve, cutAtStart ? 2 : 1, cutAtEnd ? 2 : 1),
    );
    return [...arcs, ...wirePieces(top)];
  }
  return wirePieces(top);
}

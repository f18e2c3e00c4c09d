import { line, type Point } from "./curve.ts";
import { type FieldGeometry, type Idealisation, topOf } from "./fieldGeometry.ts";
import type { EndOrder } from "./grading.ts";
import type { Piece } from "./panel.ts";
import { outsideTube, tubeOf } from "./toroidContact.ts";

/** The column's surface: bands or a graded film, closed by a disc at either end. */
export function columnPieces(geometry: FieldGeometry, idealisation: Idealisation): Piece[] {
  const { elements: n, columnLength_m, footHeight_m: foot, bandFraction } = geometry;
  const a = geometry.columnDiameter_m / 2;
  const top = topOf(geometry);
  const pitch = columnLength_m / n;
  const half = (bandFraction * pitch) / 2;
  const wall = (from: number, to: number, low: number, high: number, p: EndOrder, q: EndOrder): Piece => ({
    curve: line([a, from], [a, to]),
    body: "column",
    low,
    high,
    p,
    q,
  });
  const pieces: Piece[] = [
    { curve: line([0, foot], [a, foot]), body: "end", low: 0, high: 0, p: 1, q: 3 },
    ...lid(geometry),
  ];
  if (idealisation === "distributed") {
    for (let i = 0; i < n - 1; i++)
      pieces.push(wall(foot + i * pitch, foot + (i + 1) * pitch, i, i + 1, i === 0 ? 3 : 2, 2));
    return [...pieces, wall(top - pitch, top, n - 1, n, n === 1 ? 3 : 2, rimOrder(geometry))];
  }
  pieces.push(wall(foot, foot + half, 0, 0, 3, 2));
  for (let i = 1; i < n; i++) pieces.push(wall(foot + i * pitch - half, foot + i * pitch + half, i, i, 2, 2));
  return [...pieces, ...ofTopNode([a, top - half], [a, top], geometry, "column", 2, rimOrder(geometry))];
}

/** Under a sphere or a disc the rim is no outer corner but a contact. */
const rimOrder = ({ electrode }: FieldGeometry): EndOrder =>
  electrode.kind === "none" || electrode.kind === "toroid" ? 3 : 2;

/** The disc that closes the column's top, from the HV wire (where it starts there) to the rim. */
function lid(geometry: FieldGeometry): Piece[] {
  const { electrode, elements: n, wire } = geometry;
  const [a, top] = [geometry.columnDiameter_m / 2, topOf(geometry)];
  const inner = wire && rimOrder(geometry) === 3 ? wire.radius_m : 0;
  const flat = electrode.radius_m - electrode.thickness_m / 2;
  if (electrode.kind !== "disc" || flat >= a)
    return ofTopNode([inner, top], [a, top], geometry, "end", inner > 0 ? 2 : 1, rimOrder(geometry));
  const node = { body: "end", low: n, high: n } as const;
  return [
    { ...node, curve: line([0, top], [flat, top]), p: 1, q: 2 },
    { ...node, curve: line([flat, top], [a, top]), p: 2, q: 3 },
  ];
}

/** A straight piece of the top node without what lies inside the toroid's tube. */
function ofTopNode(
  from: Point,
  to: Point,
  geometry: FieldGeometry,
  body: "column" | "end",
  p: EndOrder,
  q: EndOrder,
): Piece[] {
  const node = { body, low: geometry.elements, high: geometry.elements };
  if (geometry.electrode.kind !== "toroid") return [{ ...node, curve: line(from, to), p, q }];
  return outsideTube(from, to, tubeOf(geometry)).map(({ curve, cutAtStart, cutAtEnd }) => ({
    ...node,
    curve,
    p: cutAtStart ? 2 : p,
    q: cutAtEnd ? 2 : q,
  }));
}

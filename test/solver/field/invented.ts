/** Invented columns and bodies for the tests of the field. */
import { arc, type Curve, line } from "../../../src/solver/field/curve.ts";
import { type FieldElectrode, type FieldGeometry, noElectrode } from "../../../src/solver/field/fieldGeometry.ts";
import type { EndOrder } from "../../../src/solver/field/grading.ts";
import { maxwell, type Solved } from "../../../src/solver/field/maxwell.ts";
import { meshOf, type Piece } from "../../../src/solver/field/panel.ts";
import { refine } from "../../../src/solver/field/refine.ts";

/** A column of length l, its length over its diameter, its foot's height over its length. */
export const column = (
  elements: number,
  l: number,
  slenderness: number,
  foot: number,
  more: Partial<FieldGeometry> = {},
): FieldGeometry => ({
  elements,
  columnDiameter_m: l / slenderness,
  columnLength_m: l,
  footHeight_m: foot * l,
  bandFraction: 0.4,
  electrode: noElectrode,
  shield: null,
  box: null,
  wallDistance_m: null,
  ...more,
});
export const sphere = (radius_m: number): FieldElectrode => ({ ...noElectrode, kind: "sphere", radius_m });
export const toroid = (radius_m: number, tubeRadius_m: number, offset_m = 0): FieldElectrode => ({
  ...noElectrode,
  kind: "toroid",
  radius_m,
  tubeRadius_m,
  offset_m,
});
export const disc = (radius_m: number, thickness_m: number): FieldElectrode => ({
  ...noElectrode,
  kind: "disc",
  radius_m,
  thickness_m,
});

/** Every kind of surroundings, with its name. */
export const drawn: [string, FieldGeometry][] = [
  ["bare", column(20, 0.5, 16, 0.3)],
  ["bare, long elements", column(4, 3, 40, 5)],
  ["bare, thick, low", column(60, 0.1, 4, 0.02)],
  ["sphere", column(20, 0.5, 16.7, 0.3, { electrode: sphere(0.1) })],
  ["sphere as wide as the column", column(10, 0.5, 4, 0.3, { electrode: sphere(0.0625) })],
  ["large sphere", column(40, 1, 40, 1, { electrode: sphere(0.5) })],
  ["toroid", column(20, 0.5, 16.7, 0.3, { electrode: toroid(0.1, 0.03) })],
  ["toroid round the top", column(20, 0.5, 10, 0.3, { electrode: toroid(0.1, 0.03, -0.05) })],
  ["disc", column(20, 0.5, 16.7, 0.3, { electrode: disc(0.1, 0.02) })],
  ["disc with a rim over the column's own", column(20, 0.5, 10, 0.3, { electrode: disc(0.03, 0.02) })],
  ["wide disc near the floor", column(4, 0.1, 4, 0.05, { electrode: disc(0.1, 0.02) })],
  ["tight shield", column(20, 0.5, 10, 0.3, { shield: { radius_m: 0.035, from_m: 0.1, to_m: 0.3 } })],
  ["box", column(20, 0.5, 16.7, 0.3, { electrode: toroid(0.1, 0.03), box: { radius_m: 0.1, top_m: 0.12 } })],
  ["box just below", column(20, 0.5, 10, 0.3, { box: { radius_m: 0.1, top_m: 0.147 } })],
  [
    "shield through the lid of a box",
    column(20, 0.5, 16.7, 0.3, {
      electrode: sphere(0.1),
      shield: { radius_m: 0.06, from_m: 0.1, to_m: 0.25 },
      box: { radius_m: 0.1, top_m: 0.12 },
    }),
  ],
  ["wall", column(20, 0.5, 16.7, 0.3, { electrode: sphere(0.1), wallDistance_m: 0.5 })],
  ["HV wire", column(20, 0.5, 10, 0.3, { electrode: sphere(0.1), wire: { radius_m: 0.001, length_m: 1 } })],
];

/** A surface of one conductor. */
export const surface = (curve: Curve, p: EndOrder = 1, q: EndOrder = 1, node = 0): Piece => ({
  curve,
  body: "electrode",
  low: node,
  high: node,
  p,
  q,
});
export const ball = (a: number, z: number, node = 0): Piece[] => [
  surface(arc([0, z], a, 0, Math.PI / 2), 1, 1, node),
  surface(arc([0, z], a, Math.PI / 2, Math.PI), 1, 1, node),
];
export const ring = (R: number, a: number): Piece[] =>
  [0, 1, 2, 3].map((k) => surface(arc([R, 0], a, (k * Math.PI) / 2, ((k + 1) * Math.PI) / 2)));
export const rod = (a: number, l: number): Piece[] => [
  surface(line([0, l], [a, l]), 1, 3),
  surface(line([a, l], [a, 0]), 3, 3),
  surface(line([a, 0], [0, 0]), 3, 1),
];

export const solved = (pieces: Piece[], nodes = 1, floor = false, points = 8): Solved =>
  maxwell(
    meshOf(refine(pieces), () => points),
    nodes,
    floor,
  );
/** Capacitance of a single conductor, F. */
export const alone = (pieces: Piece[], floor = false): number => solved(pieces, 1, floor).C[0]!;

import { columnPieces } from "./columnPieces.ts";
import { line } from "./curve.ts";
import { electrodePieces } from "./electrodePieces.ts";
import { type FieldAsk, type FieldGeometry, highestOf } from "./fieldGeometry.ts";
import type { Piece } from "./panel.ts";

const earth = { low: -1, high: -1 } as const;

/** Every conducting surface of a geometry whose shape was found possible, cut at its corners and contacts only. */
export function meridian(geometry: FieldGeometry, ask: FieldAsk): Piece[] {
  return [
    ...columnPieces(geometry, ask.idealisation),
    ...electrodePieces(geometry),
    ...shieldPieces(geometry),
    ...boxPieces(geometry),
    ...(ask.wall === "round" ? wallPieces(geometry) : []),
  ];
}

/** A wall all round, from the floor to two distances above everything. */
function wallPieces(geometry: FieldGeometry): Piece[] {
  const a = geometry.wallDistance_m;
  if (a === null) return [];
  const curve = line([a, 0], [a, highestOf(geometry) + 2 * a]);
  return [{ curve, body: "wall", ...earth, p: 1, q: 2 }];
}

/** Whether the shield's lower end stands on the lid of the box, or reaches through it: what is inside the box does not count. */
const onLid = ({ shield, box }: FieldGeometry): boolean =>
  shield !== null && box !== null && shield.radius_m < box.radius_m && shield.from_m <= box.top_m;

function shieldPieces(geometry: FieldGeometry): Piece[] {
  const { shield, box } = geometry;
  if (shield === null) return [];
  const from = onLid(geometry) ? box!.top_m : shield.from_m;
  const stands = onLid(geometry) || from === 0;
  const curve = line([shield.radius_m, from], [shield.radius_m, shield.to_m]);
  return [{ curve, body: "shield", ...earth, p: stands ? 1 : 2, q: 2 }];
}

function boxPieces(geometry: FieldGeometry): Piece[] {
  const { shield, box } = geometry;
  if (box === null) return [];
  const { radius_m: a, top_m: h } = box;
  const side: Piece = { curve: line([a, 0], [a, h]), body: "box", ...earth, p: 1, q: 3 };
  if (!onLid(geometry)) return [side, { curve: line([a, h], [0, h]), body: "box", ...earth, p: 3, q: 1 }];
  const c = shield!.radius_m;
  return [
    side,
    { curve: line([a, h], [c, h]), body: "box", ...earth, p: 3, q: 1 },
    { curve: line([c, h], [0, h]), body: "box", ...earth, p: 1, q: 1 },
  ];
}

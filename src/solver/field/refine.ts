import { heightAt, lengthOf, nearestOn, partOf, radiusAt } from "./curve.ts";
import type { Piece } from "./panel.ts";

/** A panel may be this many times longer than it is away from another body or from its own image in the floor. */
const perDistance = 2;
/** … and this many times longer than it is away from the axis. */
const perRadius = 5;
const smallest = 1e-4;

interface Sized {
  readonly piece: Piece;
  readonly length: number;
  readonly r: number;
  readonly z: number;
}

const sized = (piece: Piece): Sized => ({
  piece,
  length: lengthOf(piece.curve),
  r: radiusAt(piece.curve, 0.5),
  z: heightAt(piece.curve, 0.5),
});

/**
 * Halves pieces until each is short against its distance from every other body (charge varies over that distance), the image of
 * itself in the floor, and the axis. Pieces that share an end are neighbours, whose distance says nothing.
 */
export function refine(pieces: readonly Piece[]): Piece[] {
  const done: Sized[] = [];
  const all = pieces.map(sized);
  const longest = Math.max(...all.map(({ length }) => length));
  const open = [...all];
  while (open.length > 0) {
    const each = open.pop()!;
    if (each.length > smallest * longest && tooLong(each, all)) open.push(...halves(each.piece).map(sized));
    else done.push(each);
  }
  return done.map(({ piece }) => piece);
}

function halves(piece: Piece): [Piece, Piece] {
  const [start, end] = piece.shares ?? [0, 1];
  const middle = (start + end) / 2;
  return [
    { ...piece, curve: partOf(piece.curve, 0, 0.5), q: 1, shares: [start, middle] },
    { ...piece, curve: partOf(piece.curve, 0.5, 1), p: 1, shares: [middle, end] },
  ];
}

/** Pairs whose distance asks for nothing: bands of one column, which crowd at their edges; flat faces of one conductor. */
const facing = (a: Piece, b: Piece): boolean =>
  (a.body === "column" && b.body === "column") ||
  (a.low === a.high && a.low === b.low && b.low === b.high && a.curve.kind === "line" && b.curve.kind === "line");

const samples = [0, 0.25, 0.5, 0.75, 1];

function tooLong({ piece, length, r, z }: Sized, all: readonly Sized[]): boolean {
  const { curve } = piece;
  if (piece.body !== "wire" && length > perRadius * Math.max(radiusAt(curve, 0), radiusAt(curve, 1))) return true;
  const allowed = length / perDistance;
  if (
    Math.min(heightAt(curve, 0), heightAt(curve, 1)) > 0 &&
    2 * Math.min(heightAt(curve, 0), heightAt(curve, 1)) < allowed
  )
    return true;
  for (const other of all) {
    if (facing(piece, other.piece)) continue;
    if (Math.hypot(other.r - r, other.z - z) - (other.length + length) / 2 > allowed) continue;
    const near = samples.map((s) => distance(radiusAt(curve, s), heightAt(curve, s), other.piece));
    const least = Math.min(...near);
    if (least < 1e-9 * length) continue;
    if (least < allowed) return true;
  }
  return false;
}

function distance(r: number, z: number, { curve }: Piece): number {
  const s = nearestOn(curve, r, z);
  return Math.hypot(r - radiusAt(curve, s), z - heightAt(curve, s));
}

import { type Curve, heightAt, lengthOf, radiusAt } from "./curve.ts";
import { gaussLegendre, type Rule } from "./gaussLegendre.ts";
import { along, alongSlope, type EndOrder } from "./grading.ts";

/** Which body a piece of surface belongs to. */
export type Body = "column" | "end" | "electrode" | "wire" | "shield" | "box" | "wall";

/** A piece of conducting surface: its meridian curve, how points crowd at its ends, and its potential. */
export interface Piece {
  readonly curve: Curve;
  readonly body: Body;
  /** Node at the curve's start and at its end; -1: earth. They differ only where the potential runs evenly from one to the other. */
  readonly low: number;
  readonly high: number;
  /** Share of the upper node in the potential at the curve's start and end; 0 and 1 when absent. */
  readonly shares?: readonly [number, number];
  readonly p: EndOrder;
  readonly q: EndOrder;
}

/** A piece with the points at which its charge is sought. */
export interface Panel extends Piece {
  readonly length: number;
  readonly rule: Rule;
  /** Index of its first unknown. */
  readonly first: number;
}

/** All points of all panels. `weight`: what turns charge per u into charge, without 2π. */
export interface Mesh {
  readonly panels: readonly Panel[];
  readonly count: number;
  readonly r: Float64Array;
  readonly z: Float64Array;
  readonly weight: Float64Array;
  /** Share of the upper node in the potential at each point. */
  readonly share: Float64Array;
  /** Length per u at each point: charge per u over this is charge per length of the meridian. */
  readonly stretch: Float64Array;
}

/** Points on every piece, as many as `order` gives. */
export function meshOf(pieces: readonly Piece[], order: (piece: Piece) => number): Mesh {
  let count = 0;
  const panels = pieces.map((piece): Panel => {
    const rule = gaussLegendre(order(piece));
    const panel = { ...piece, length: lengthOf(piece.curve), rule, first: count };
    count += rule.points.length;
    return panel;
  });
  const lists = () => new Float64Array(count);
  const mesh = { panels, count, r: lists(), z: lists(), weight: lists(), share: lists(), stretch: lists() };
  for (const { curve, rule, first, p, q, length, shares = [0, 1] } of panels) {
    rule.points.forEach((u, k) => {
      const s = along(p, q, u);
      const i = first + k;
      mesh.r[i] = radiusAt(curve, s);
      mesh.z[i] = heightAt(curve, s);
      mesh.weight[i] = mesh.r[i]! * rule.weights[k]!;
      mesh.share[i] = shares[0] + s * (shares[1] - shares[0]);
      mesh.stretch[i] = length * alongSlope(p, q, u);
    });
  }
  return mesh;
}

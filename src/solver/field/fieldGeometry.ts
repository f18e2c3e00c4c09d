import type { Geometry } from "../job/design.ts";

/** What the field is solved for: a drawn column and what stands round it; lengths in m. The floor is always there. */
export interface FieldGeometry {
  /** Elements of the column; nodes are 0 (tap) … elements (top electrode). */
  readonly elements: number;
  readonly columnDiameter_m: number;
  readonly columnLength_m: number;
  readonly footHeight_m: number;
  /** Share of the pitch that a node's band fills. */
  readonly bandFraction: number;
  readonly electrode: FieldElectrode;
  /** Open earthed tube round the column. */
  readonly shield: { readonly radius_m: number; readonly from_m: number; readonly to_m: number } | null;
  /** Earthed cylinder that stands on the floor below the column. */
  readonly box: { readonly radius_m: number; readonly top_m: number } | null;
  /** Plane vertical earthed wall, from the axis. */
  readonly wallDistance_m: number | null;
  /** Compound cast round the string over its whole length, to this radius; absent: air. */
  readonly potting?: { readonly permittivity: number; readonly radius_m: number } | null;
  /** Vertical HV wire on the axis, from the electrode (or the column's top) upwards; absent: none. */
  readonly wire?: { readonly radius_m: number; readonly length_m: number } | null;
}

export interface FieldElectrode {
  readonly kind: "none" | "sphere" | "toroid" | "disc";
  /** Sphere and disc: outer radius. Toroid: from the axis to the tube's centre. */
  readonly radius_m: number;
  readonly tubeRadius_m: number;
  readonly thickness_m: number;
  /** Toroid only: its centre plane over the column's top. */
  readonly offset_m: number;
}

/**
 * `bands`: node i is an open thin band at i · pitch. `distributed`: the outer surface of the whole column, its potential running
 * evenly from node to node (a graded film on a body); charge is shared between two nodes as the potential is. The field inside
 * that body is the string's own capacitance and is not counted as stray. Single couplings of a film mean little (neighbours share
 * the charge between them, and may come out negative); its sums and M do not depend on the number of elements.
 */
export type Idealisation = "bands" | "distributed";

/**
 * What a wall at `wallDistance_m` is: `round`, an earthed cylinder of that radius round the axis (walls on all sides: more than a
 * single wall does, about three times); `plane`, one flat wall, by images averaged round the axis.
 */
export type Wall = "round" | "plane";

export interface FieldAsk {
  readonly idealisation: Idealisation;
  /** Points on each panel as a multiple of the usual number, 0.5 … 4. */
  readonly resolution: number;
  readonly wall: Wall;
}

export const usualAsk: FieldAsk = { idealisation: "bands", resolution: 1, wall: "round" };

export const noElectrode: FieldElectrode = { kind: "none", radius_m: 0, tubeRadius_m: 0, thickness_m: 0, offset_m: 0 };

export const topOf = (geometry: FieldGeometry): number => geometry.footHeight_m + geometry.columnLength_m;

/** What the field needs of a design's geometry, for a string of so many elements. */
export function fieldGeometryOf(geometry: Geometry, elements: number): FieldGeometry {
  const { columnDiameter_m, columnLength_m, footHeight_m, bandFraction, electrode, shield, box } = geometry;
  const { wallDistance_m, potting } = geometry;
  return {
    elements,
    columnDiameter_m,
    columnLength_m,
    footHeight_m,
    bandFraction,
    electrode,
    shield,
    box,
    wallDistance_m,
    potting,
  };
}

/** Highest point of column, electrode, HV wire and shield. */
export function highestOf(geometry: FieldGeometry): number {
  const { electrode, columnDiameter_m, shield, wire } = geometry;
  const top = topOf(geometry);
  const { kind, radius_m, tubeRadius_m, thickness_m, offset_m } = electrode;
  const rise =
    kind === "sphere"
      ? radius_m + Math.sqrt(radius_m * radius_m - (columnDiameter_m * columnDiameter_m) / 4)
      : kind === "disc"
        ? thickness_m
        : 0;
  const tube = kind === "toroid" ? Math.max(0, offset_m + tubeRadius_m) : 0;
  const end = top + rise;
  return Math.max(end + (wire?.length_m ?? 0), top + tube, shield?.to_m ?? 0);
}

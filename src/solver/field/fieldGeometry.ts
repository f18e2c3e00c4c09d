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
 * `bands`: node i is an open thin band at i · pitch. `distributed`: the whole surface of the column, its potential running evenly
 * from node to node (a graded film); charge is shared between two nodes as the potential is.
 */
export type Idealisation = "bands" | "distributed";

export const noElectrode: FieldElectrode = { kind: "none", radius_m: 0, tubeRadius_m: 0, thickness_m: 0, offset_m: 0 };

export const topOf = (geometry: FieldGeometry): number => geometry.footHeight_m + geometry.columnLength_m;

import { type FieldGeometry, fieldGeometryOf } from "../field/fieldGeometry.ts";
import { shapeFault } from "../field/shapeFault.ts";
import { type FieldStrays, solveField } from "../field/solveField.ts";
import type { DividerDocument } from "../job/document.ts";
import { err, ok, type Result } from "../quantities/result.ts";

/** Nodes that are solved for one by one; a longer string is solved with this many and its strays are spread over its own nodes. */
const mostNodes = 80;

/** The strays of a drawn column for the ladder of its elements, solved for one geometry. Plain data. */
export interface ColumnField {
  readonly geometry: FieldGeometry;
  readonly strays: FieldStrays;
}

/**
 * The geometry that a document's strays are to be solved for; null where they come from elsewhere.
 * Refused where bodies cannot stand as drawn.
 */
export function fieldAsked(document: DividerDocument): Result<FieldGeometry | null> {
  const { design } = document;
  if (design === null || design.strays.from !== "field" || design.hvArm.elements.length < 2) return ok(null);
  const geometry = fieldGeometryOf(design.geometry, Math.min(design.hvArm.elements.length, mostNodes));
  const fault = shapeFault(geometry, { idealisation: "bands" });
  return fault === null ? ok(geometry) : err({ ...fault, where: `/design/geometry${fault.where}` });
}

/** Solves the drawn column, its wall a single plane one: tens of milliseconds. */
export const solveColumnField = (geometry: FieldGeometry): ColumnField => ({
  geometry,
  strays: solveField(geometry, { withUncertainty: true, wall: "plane" }),
});

/** Whether a solved field is that of the geometry asked for. */
export const isFieldOf = (field: ColumnField, geometry: FieldGeometry): boolean =>
  JSON.stringify(field.geometry) === JSON.stringify(geometry);

/** What each inner node and element of a string of n carries: the solve's own where it has as many nodes, else spread evenly. */
export function ladderOf({ strays }: ColumnField, n: number): FieldStrays["ladder"] {
  const { ladder } = strays;
  const solved = ladder.series_F.length;
  if (solved === n) return ladder;
  return {
    toEarth_F: spread(ladder.toEarth_F, n),
    toElectrode_F: spread(ladder.toElectrode_F, n),
    series_F: Array.from({ length: n }, (_, i) => (ladder.series_F[Math.floor((i * solved) / n)]! * n) / solved),
    electrodeToTap_F: ladder.electrodeToTap_F,
  };
}

/** Node i of m has the stretch (i ± ½)/m of the column; each of the n − 1 nodes takes its share of it. */
function spread(nodes: readonly number[], n: number): number[] {
  const m = nodes.length + 1;
  const out = new Array<number>(n - 1).fill(0);
  nodes.forEach((value, k) => {
    const from = (k + 0.5) / m;
    const to = (k + 1.5) / m;
    const first = Math.max(1, Math.round(from * n));
    const last = Math.min(n - 1, Math.max(first, Math.round(to * n) - 1));
    for (let i = first; i <= last; i++) out[i - 1] = out[i - 1]! + value / (last - first + 1);
  });
  return out;
}

import type { FieldGeometry, Idealisation } from "./fieldGeometry.ts";
import { type StrayFigures, strayFigures } from "./figures.ts";
import { maxwell } from "./maxwell.ts";
import { meridian } from "./meridian.ts";
import { meshOf, type Piece } from "./panel.ts";
import { refine } from "./refine.ts";
import { surfaceField } from "./surfaceField.ts";

export function solveOnce(geometry: FieldGeometry, idealisation: Idealisation, resolution: number, order = pointsOn) {
  const pieces = refine(meridian(geometry, idealisation));
  const mesh = meshOf(pieces, (piece) => Math.max(2, Math.round(order(piece) * resolution)));
  const solved = maxwell(mesh, geometry.elements + 1, true, geometry.wallDistance_m);
  const figures: StrayFigures = strayFigures(solved.C);
  return { ...figures, C: solved.C, fieldMax_per_m: surfaceField(mesh, solved.field, geometry.elements), unknowns: mesh.count };
}

function pointsOn(piece: Piece): number {
  if (piece.body === "column") return 4;
  return 6;
}

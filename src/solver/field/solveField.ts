import { type FieldAsk, type FieldGeometry, usualAsk } from "./fieldGeometry.ts";
import { type StrayFigures, strayFigures } from "./figures.ts";
import { insideColumn } from "./insideColumn.ts";
import { type FoldedLadder, foldedLadder } from "./ladder.ts";
import { maxwell } from "./maxwell.ts";
import { meridian } from "./meridian.ts";
import { type Body, meshOf, type Piece } from "./panel.ts";
import { inAir } from "./potting.ts";
import { refine } from "./refine.ts";
import { surfaceField } from "./surfaceField.ts";

/** How far each figure moved from a solve with two thirds of the points; shares of the figure itself, of M in shares of Ce/6 + Ch/3. */
export interface FieldUncertainty {
  readonly ceEff: number;
  readonly chEff: number;
  readonly m: number;
  readonly inputLow: number;
  readonly inputHigh: number;
  /** null without an electrode. */
  readonly fieldMax: number | null;
}

/** The strays of a drawn column and the fields at its surfaces, all for 1 V. */
export interface FieldStrays extends StrayFigures {
  /** Largest field at the electrode with the linear profile, V/m per V; null without an electrode. */
  readonly fieldMax_per_m: number | null;
  /** The same at shield and box; on an open tube both faces together. null where there is none. */
  readonly earthedField_per_m: { readonly shield: number | null; readonly box: number | null };
  readonly ladder: FoldedLadder;
  /** null where it was not asked for. */
  readonly uncertainty: FieldUncertainty | null;
  readonly unknowns: number;
}

export interface FieldOptions extends Partial<FieldAsk> {
  /** Solve a second time, with two thirds of the points, to see what still moves. */
  readonly withUncertainty?: boolean;
}

/**
 * Strays of a column whose shape was found possible (`shapeFault` gives null): boundary elements on the meridian, the floor by
 * images, vacuum. Figures are within 0.1 % of the converged ones over 4 to 60 elements, length over diameter 4 to 40, foot height
 * 0.02 to 5 lengths, with and without electrode, shield and box; the largest field too, unless the electrode is many times
 * larger than the column is long.
 */
export function solveField(geometry: FieldGeometry, options: FieldOptions = {}): FieldStrays {
  const ask = { ...usualAsk, ...options };
  const fine = solveOnce(geometry, ask);
  if (!options.withUncertainty) return fine;
  return { ...fine, uncertainty: moved(solveOnce(geometry, { ...ask, resolution: (ask.resolution * 2) / 3 }), fine) };
}

/** Greatest number of unknowns that is solved: about ten seconds. */
export const mostUnknowns = 2500;

/** How many unknowns the solve would have: parts that nearly touch, and many elements, need many. */
export function unknownsOf(geometry: FieldGeometry, ask: FieldAsk): number {
  return refine(meridian(inAir(geometry), ask)).reduce(
    (sum, piece) => sum + pointsAt(piece, geometry.elements, ask),
    0,
  );
}

/** Many short bands need fewer points each; a film's kinks at the nodes need more. */
function pointsOn({ body }: Piece, n: number, { idealisation }: FieldAsk): number {
  if (body !== "column") return 6;
  const more = idealisation === "distributed" ? 2 : 0;
  return more + (n <= 24 ? 4 : n <= 100 ? 3 : 2);
}
const pointsAt = (piece: Piece, n: number, ask: FieldAsk): number =>
  Math.max(2, Math.round(pointsOn(piece, n, ask) * ask.resolution));

function solveOnce(drawn: FieldGeometry, ask: FieldAsk): FieldStrays {
  const geometry = inAir(drawn);
  const n = geometry.elements;
  const pieces = refine(meridian(geometry, ask));
  const mesh = meshOf(pieces, (piece) => pointsAt(piece, n, ask));
  const { C, field } = maxwell(mesh, n + 1, true, ask.wall === "plane" ? geometry.wallDistance_m : null);
  if (ask.idealisation === "distributed") {
    const inside = insideColumn(n, geometry.columnDiameter_m / 2, geometry.columnLength_m);
    inside.forEach((each, at) => {
      C[at] = C[at]! - each;
    });
  }
  const at = (body: Body) => surfaceField(mesh, field, n, body);
  return {
    ...strayFigures(C),
    fieldMax_per_m: at("electrode"),
    earthedField_per_m: { shield: at("shield"), box: at("box") },
    ladder: foldedLadder(C),
    uncertainty: null,
    unknowns: mesh.count,
  };
}

function moved(coarse: FieldStrays, fine: FieldStrays): FieldUncertainty {
  const share = (a: number, b: number, scale = b) => (a === b ? 0 : Math.abs((a - b) / scale));
  return {
    ceEff: share(coarse.ceEff_F, fine.ceEff_F),
    chEff: share(coarse.chEff_F, fine.chEff_F),
    m: share(coarse.m_F, fine.m_F, fine.ceEff_F / 6 + fine.chEff_F / 3 || fine.inputLow_F),
    inputLow: share(coarse.inputLow_F, fine.inputLow_F),
    inputHigh: share(coarse.inputHigh_F, fine.inputHigh_F),
    fieldMax:
      coarse.fieldMax_per_m === null || fine.fieldMax_per_m === null
        ? null
        : share(coarse.fieldMax_per_m, fine.fieldMax_per_m),
  };
}

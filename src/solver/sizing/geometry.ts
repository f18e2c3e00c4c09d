import type { Electrode, Geometry } from "../job/design.ts";
import type { DividerDocument } from "../job/document.ts";
import { metre } from "../quantities/quantity.ts";
import { airDensityAtAltitude } from "../standards/airDensity.ts";
import { formula } from "../standards/formula.ts";
import { practice } from "../standards/source.ts";

const m = (symbol: string, meaning: string) => ({ symbol, unit: "m", meaning });

export const geometryFormulas = {
  envelope: formula({
    id: "sizing.envelope",
    title: "Diameter of the column",
    statement: "{=} = {d} · k({p})",
    result: m("d", "over the bodies"),
    inputs: {
      d: m("d_b", "body, with the capacitor beside it if any"),
      p: { symbol: "p", unit: "1", meaning: "strings side by side" },
    },
    holds: "Equal circles packed closest: 1, 2, 2.155, 2.414 diameters for one to four.",
    source: practice("strings side by side, touching"),
    compute: ({ d, p }) => envelope(d, p),
  }),
  electrodeRadius: formula({
    id: "sizing.electrodeRadius",
    title: "Radius of the top electrode",
    statement: "{=} = {V} / (2 kV/mm · δ({h}))",
    result: m("a", "least radius of a sphere"),
    inputs: {
      V: { symbol: "V_max", unit: "V", meaning: "greatest peak" },
      h: m("h", "altitude"),
    },
    holds: "A hand-built sphere far from earth; scratches, wet and dust lower it. δ is relative to sea level.",
    source: practice("2 kV/mm on round parts, with air density"),
    compute: ({ V, h }) => V / (2e6 * airDensityAtAltitude(metre(h))),
  }),
};

/** Diameter around 1 … 4 equal circles of diameter d, closest packing. */
export const envelope = (d: number, strings: number): number =>
  d * (([1, 1, 2, 1 + 2 / Math.sqrt(3), 1 + Math.SQRT2] as const)[strings] ?? strings);

/** Below this greatest peak no top electrode is fitted, V. */
const electrodeFrom_V = 10e3;
/** Height of the column's foot above the floor unless typed; the LV box ends a little below it, m. */
const footHeight = 0.12;
const boxGap = 0.02;
const boxRadius = 0.06;

/** Foot height of the column: as typed or measured in the present design, else 0.12 m. */
export function footHeightOf(document: DividerDocument): number {
  const pointer = "/design/geometry/footHeight_m";
  const origin = document.origins[pointer];
  const typed = document.typed[pointer] !== undefined || origin === "typed" || origin === "measured";
  return typed && document.design !== null ? document.design.geometry.footHeight_m : footHeight;
}

/** What a straight vertical column is drawn from. All lengths in m. */
export interface ColumnShape {
  readonly elements: number;
  readonly columnLength_m: number;
  readonly columnDiameter_m: number;
  readonly electrodeRadius_m: number;
  readonly greatest_Vpeak: number;
}

/** A straight vertical column on its LV box, with a sphere on top above 10 kV; strays follow by the closed formula. */
export function columnGeometry(document: DividerDocument, shape: ColumnShape): Geometry {
  const footHeight_m = footHeightOf(document);
  const { columnDiameter_m, columnLength_m } = shape;
  const top_m = footHeight_m - boxGap;
  return {
    columnDiameter_m,
    columnLength_m,
    footHeight_m,
    bandFraction: 0.4,
    fieldCase: "inhomogeneous",
    pitch_m: columnLength_m / shape.elements,
    electrode: electrodeOf(shape),
    shield: null,
    box: top_m > 0 ? { radius_m: Math.max(boxRadius, columnDiameter_m), top_m } : null,
    wallDistance_m: document.brief.surroundings.wallDistance_m,
    potting: null,
  };
}

function electrodeOf(shape: ColumnShape): Electrode {
  const none: Electrode = { kind: "none", radius_m: 0, tubeRadius_m: 0, thickness_m: 0, offset_m: 0 };
  if (shape.greatest_Vpeak <= electrodeFrom_V) return none;
  // A sphere rests on the column's rim: it is never narrower than the column.
  const radius_m = Math.max(shape.electrodeRadius_m, shape.columnDiameter_m * 0.75);
  return { ...none, kind: "sphere", radius_m: Math.ceil(radius_m * 1000 - 1e-9) / 1000 };
}

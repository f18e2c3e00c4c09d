import type { Design, DividerDocument } from "../../solver/index.ts";

/** The drawn column in metres above the floor, and how metres become pixels. Everything is to one scale. */
export interface ColumnScale {
  readonly height_px: number;
  readonly pxPerMetre: number;
  /** Pixels from the top of the drawing to a height above the floor. */
  readonly y: (height_m: number) => number;
  readonly top_m: number;
  readonly foot_m: number;
  /** Height of one element, px. */
  readonly pitch_px: number;
}

const above_px = 14;
const below_px = 22;

export function columnScale(design: Design, height_px: number): ColumnScale {
  const { geometry, hvArm } = design;
  const top_m = geometry.footHeight_m + geometry.columnLength_m;
  const pxPerMetre = (height_px - above_px - below_px) / (top_m + crown_m(design));
  return {
    height_px,
    pxPerMetre,
    y: (height_m) => height_px - below_px - height_m * pxPerMetre,
    top_m,
    foot_m: geometry.footHeight_m,
    pitch_px: (geometry.columnLength_m / hvArm.elements.length) * pxPerMetre,
  };
}

/** What stands above the column's top. */
function crown_m({ geometry: { electrode } }: Design): number {
  switch (electrode.kind) {
    case "none":
      return 0.005;
    case "sphere":
      return 2 * electrode.radius_m;
    case "toroid":
      return 2 * electrode.tubeRadius_m + Math.max(0, electrode.offset_m);
    case "disc":
      return electrode.thickness_m;
  }
}

/** Middle of element `element` (1 next to the tap), px from the top of the drawing. */
export const middleOf = (scale: ColumnScale, element: number): number =>
  scale.y(scale.foot_m) - (element - 0.5) * scale.pitch_px;

/** Every, every 2nd, 5th, 10th … element is labelled, so that labels keep `least` pixels apart. */
export function labelStep(pitch_px: number, least = 15): number {
  for (let decade = 1; ; decade *= 10) {
    for (const each of [1, 2, 5]) if (each * decade * pitch_px >= least) return each * decade;
  }
}

/** The elements that carry a label: first, last, and each step between that keeps clear of both. */
export function labelled(n: number, pitch_px: number, least = 15): readonly number[] {
  const step = labelStep(pitch_px, least);
  const apart = (from: number, to: number) => (to - from) * pitch_px >= least - 1;
  const found = n === 1 ? [1] : apart(1, n) ? [1, n] : [n];
  for (let i = step; i < n; i += step) if (i > 1 && apart(1, i) && apart(i, n)) found.push(i);
  return found.sort((a, b) => a - b);
}

/** A round step for the millimetre ruler. */
export function rulerStep_m(pxPerMetre: number, least = 26): number {
  for (const step of [0.001, 0.002, 0.005, 0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1, 2, 5])
    if (step * pxPerMetre >= least) return step;
  return 10;
}

export interface BodySize {
  readonly length_m: number;
  readonly diameter_m: number;
}

/** Body sizes of the parts by id. */
export const bodies = ({ parts }: DividerDocument): ReadonlyMap<string, BodySize> =>
  new Map(parts.map((part) => [part.id, { length_m: part.bodyLength_m, diameter_m: part.bodyDiameter_m }]));

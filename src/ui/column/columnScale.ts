import type { Design, DividerDocument } from "../../solver/index.ts";

/** The drawn column in metres above the floor, and how metres become pixels. Everything is to one scale. */
export interface ColumnScale {
  readonly height_px: number;
  readonly pxPerMetre: number;
  /** Pixels from the top of the drawing to a height above the floor. */
  readonly y: (height_m: number) => number;
  readonly top_m: number;
  readonly foot_m: number;
  readonly electrodeRadius_m: number;
}

export function columnScale(design: Design, height_px: number): ColumnScale {
  const { geometry } = design;
  const { electrode } = geometry;
  const electrodeRadius_m = electrode.kind === "none" ? 0 : electrode.radius_m;
  const crown =
    electrode.kind === "none"
      ? 0.005
      : electrode.kind === "sphere"
        ? 2 * electrode.radius_m
        : electrode.tubeRadius_m * 2 + electrode.thickness_m;
  const top_m = geometry.footHeight_m + geometry.columnLength_m;
  const whole = top_m + crown;
  const margin = 14;
  const pxPerMetre = (height_px - 2 * margin) / whole;
  return {
    height_px,
    pxPerMetre,
    y: (height_m) => height_px - margin - height_m * pxPerMetre,
    top_m,
    foot_m: geometry.footHeight_m,
    electrodeRadius_m,
  };
}

/** Every, every 2nd, 5th, 10th … element is labelled, so that labels keep `least` pixels apart. */
export function labelStep(pitch_px: number, least = 15): number {
  for (let decade = 1; ; decade *= 10) {
    for (const each of [1, 2, 5]) if (each * decade * pitch_px >= least) return each * decade;
  }
}

/** A round step for the millimetre ruler. */
export function rulerStep_m(pxPerMetre: number, least = 26): number {
  for (const step of [0.001, 0.002, 0.005, 0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1, 2, 5])
    if (step * pxPerMetre >= least) return step;
  return 10;
}

/** Body sizes of the distinct parts of the string. */
export function bodies(document: DividerDocument): ReadonlyMap<string, { length_m: number; diameter_m: number }> {
  return new Map(
    document.parts.map((part) => [part.id, { length_m: part.bodyLength_m, diameter_m: part.bodyDiameter_m }]),
  );
}

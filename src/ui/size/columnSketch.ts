import type { Candidate, Part } from "../../solver/index.ts";

/** A candidate's column as plain shapes in metres, earth at y = 0, upwards. */
export interface ColumnSketch {
  readonly width_m: number;
  readonly height_m: number;
  readonly foot_m: number;
  /** Lower end, height, diameter of each body of one string. */
  readonly bodies: readonly { readonly y_m: number; readonly length_m: number; readonly diameter_m: number }[];
  readonly strings: number;
  readonly electrode: { readonly kind: string; readonly radius_m: number; readonly thickness_m: number } | null;
  readonly top_m: number;
}

/** Reads the column from the candidate's geometry; bodies get their own length and diameter. */
export function columnSketch({ design, parts, strings }: Candidate): ColumnSketch {
  const { geometry, hvArm } = design;
  const byId = new Map<string, Part>(parts.map((part) => [part.id, part]));
  const bodies = hvArm.elements.map((element, i) => {
    const part = byId.get(element.part);
    const length_m = part?.bodyLength_m ?? geometry.pitch_m / 2;
    const y_m = geometry.footHeight_m + (i + 0.5) * geometry.pitch_m - length_m / 2;
    return { y_m, length_m, diameter_m: part?.bodyDiameter_m ?? geometry.columnDiameter_m / 4 };
  });
  const top_m = geometry.footHeight_m + Math.max(geometry.columnLength_m, hvArm.elements.length * geometry.pitch_m);
  const { electrode } = geometry;
  const thickness_m =
    electrode.kind === "sphere" ? 2 * electrode.radius_m : 2 * electrode.tubeRadius_m || electrode.thickness_m;
  const shown = electrode.kind === "none" ? null : { kind: electrode.kind, radius_m: electrode.radius_m, thickness_m };
  return {
    width_m: Math.max(geometry.columnDiameter_m, 2 * (shown?.radius_m ?? 0), 0.04),
    height_m: top_m + (shown === null ? 0.01 : thickness_m),
    foot_m: geometry.footHeight_m,
    bodies,
    strings,
    electrode: shown,
    top_m,
  };
}

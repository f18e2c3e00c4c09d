import type { Design } from "../../solver/index.ts";
import { type BodySize, type ColumnScale, middleOf } from "./columnScale.ts";

export interface BodyPaths {
  /** Resistor bodies gathered by ink, so that five thousand of them are a few dozen paths. */
  readonly shades: readonly { readonly ink: number | null; readonly d: string }[];
  /** Discrete capacitors across the elements, outlined. */
  readonly capacitors: string;
}

const steps = 32;
const unknown: BodySize = { length_m: 0.006, diameter_m: 0.003 };

/** Bodies at true length and diameter (never thinner than can be seen), strings side by side, capacitors to their left. */
export function bodyPaths(
  design: Design,
  sizes: ReadonlyMap<string, BodySize>,
  scale: ColumnScale,
  axis_px: number,
  ink: (i: number) => number | null,
): BodyPaths {
  const gathered = new Map<number | null, string>();
  let capacitors = "";
  const { strings, elements } = design.hvArm;
  elements.forEach((element, i) => {
    const size = sizes.get(element.part) ?? unknown;
    const middle = middleOf(scale, i + 1);
    const w = Math.max(1.6, size.diameter_m * scale.pxPerMetre);
    const h = Math.max(0.7, Math.min(scale.pitch_px * 0.94, size.length_m * scale.pxPerMetre));
    const share = ink(i);
    const key = share === null ? null : Math.round(share * steps) / steps;
    let d = gathered.get(key) ?? "";
    for (const x of stringsAt(strings, w)) d += box(axis_px + x - w / 2, middle - h / 2, w, h);
    gathered.set(key, d);
    if (element.capacitor === null) return;
    const c = sizes.get(element.capacitor) ?? unknown;
    const cw = Math.max(1.6, c.diameter_m * scale.pxPerMetre);
    const ch = Math.max(0.7, Math.min(scale.pitch_px * 0.8, c.length_m * scale.pxPerMetre));
    capacitors += box(axis_px + stringsAt(strings, w)[0]! - w / 2 - 2.5 - cw, middle - ch / 2, cw, ch);
  });
  return { shades: [...gathered].map(([key, d]) => ({ ink: key, d })), capacitors };
}

/** Where the strings stand beside the axis, px. */
export const stringsAt = (strings: number, body_px: number): readonly number[] =>
  Array.from({ length: strings }, (_, k) => (k - (strings - 1) / 2) * (body_px + 3));

const fixed = (value: number) => Number(value.toFixed(2));
const box = (x: number, y: number, w: number, h: number) =>
  `M${fixed(x)} ${fixed(y)}h${fixed(w)}v${fixed(h)}h${fixed(-w)}z`;

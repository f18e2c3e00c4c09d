import type { FieldGeometry, Wall } from "./fieldGeometry.ts";
import { shapeFault } from "./shapeFault.ts";
import { type FieldOptions, solveField } from "./solveField.ts";

/** What one thing near the column does to its strays. */
export interface Neighbour {
  readonly what: "as drawn" | "wall all round" | "plane wall" | "HV wire";
  /** Of the wall from the axis, or length of the wire; null: as drawn. */
  readonly distance_m: number | null;
  readonly ceEff_F: number;
  readonly chEff_F: number;
  readonly m_F: number;
}

const inLengths = [0.75, 1, 1.5, 2, 3];
const wires = [1, 3];

/**
 * The strays as drawn without wall and wire, then with walls at several column lengths (all round, and a single plane one), and
 * with a vertical HV wire 1, 3 column lengths up from the electrode. The wire is a thin tube on the axis at the electrode's
 * potential, 1/200 of the column's diameter or 0.5 mm in radius, whichever is more: one that leaves sideways does more on
 * its own side. A wall that what is drawn would touch is left out.
 */
export function proximity(geometry: FieldGeometry, options: FieldOptions = {}): Neighbour[] {
  const alone: FieldGeometry = { ...geometry, wallDistance_m: null, wire: null };
  const l = geometry.columnLength_m;
  const ask = { idealisation: options.idealisation ?? ("bands" as const) };
  const row = (what: Neighbour["what"], distance_m: number | null, drawn: FieldGeometry, wall: Wall): Neighbour[] => {
    if (shapeFault(drawn, ask) !== null) return [];
    const { ceEff_F, chEff_F, m_F } = solveField(drawn, { ...options, wall });
    return [{ what, distance_m, ceEff_F, chEff_F, m_F }];
  };
  const walls = (what: Neighbour["what"], wall: Wall) =>
    inLengths.flatMap((k) => row(what, k * l, { ...alone, wallDistance_m: k * l }, wall));
  const radius_m = Math.max(geometry.columnDiameter_m / 200, 5e-4);
  return [
    ...row("as drawn", null, alone, "round"),
    ...walls("wall all round", "round"),
    ...walls("plane wall", "plane"),
    ...wires.flatMap((k) => row("HV wire", k * l, { ...alone, wire: { radius_m, length_m: k * l } }, "round")),
  ];
}

import type { Source } from "../standards/source.ts";
import type { MaterialGroup } from "../standards/surroundings.ts";

/** An insulating material as a column, box or filling is made of it. Generic, as the trade names it. */
export interface InsulatingMaterial {
  readonly id: string;
  readonly name: string;
  /** Relative permittivity at low frequency: least, usual, greatest of what is sold. */
  readonly permittivity: readonly [least: number, usual: number, greatest: number];
  /** By tracking (IEC 60664-1), the worse where grades differ; null: a gas or liquid, it has no surface that tracks. */
  readonly materialGroup: MaterialGroup | null;
}

type Row = readonly [string, string, number, number, number, MaterialGroup | null];

const rows: readonly Row[] = [
  ["air", "air", 1.0006, 1.0006, 1.0006, null],
  ["oil", "mineral oil", 2.1, 2.2, 2.4, null],
  ["silicone-oil", "silicone oil", 2.2, 2.7, 2.9, null],
  ["ptfe", "PTFE", 2, 2.1, 2.1, "I"],
  ["pp", "polypropylene", 2.2, 2.2, 2.4, "I"],
  ["pmma", "PMMA, cast", 2.7, 3.5, 4.5, "I"],
  ["silicone", "silicone rubber", 2.8, 3.2, 9.8, "I"],
  ["epoxy", "epoxy, cast", 3.5, 3.6, 5, "IIIa"],
  ["fr4", "glass-epoxy laminate", 4.3, 4.5, 5, "IIIa"],
  ["pc", "polycarbonate", 2.8, 3, 3.2, "IIIa"],
  ["glass", "borosilicate glass", 4.3, 4.6, 5, "I"],
];

/** Materials for columns, boxes and fillings. */
export const materials: readonly InsulatingMaterial[] = rows.map(
  ([id, name, least, usual, greatest, materialGroup]) => ({
    id,
    name,
    permittivity: [least, usual, greatest],
    materialGroup,
  }),
);

/** Tracking depends on the grade: a data sheet's comparative tracking index decides the group. */
export const materialSource: Source = {
  title: "Permittivities by handbook ranges, material groups by usual comparative tracking index",
  edition: null,
  clause: "typical of the kind; the grade bought decides",
  status: "from memory",
};

import { formula } from "../standards/formula.ts";
import { computedHere } from "../standards/source.ts";
import type { FieldGeometry } from "./fieldGeometry.ts";

const m = (symbol: string, meaning: string) => ({ symbol, unit: "m", meaning });

export const pottingFormulas = {
  equivalentRadius: formula({
    id: "field.pottedColumn",
    title: "Column in air that a potted one is taken for",
    statement: "{=} = {b} · ({a}/{b})^(1/{εr})",
    result: m("a_eff", "radius of the column in air"),
    inputs: {
      a: m("a", "radius of the column"),
      b: m("b", "outer radius of the compound"),
      εr: { symbol: "ε_r", unit: "1", meaning: "relative permittivity of the compound" },
    },
    holds:
      "Exact where the field through the compound is radial, so for a column long against the compound's radius. Couplings along the column inside the compound are those of the wider column in air: too low. At the electrode and the foot it is a guess.",
    source: computedHere("ln(b/a)/ε_r = ln(b/a_eff), capacitances of two coaxial layers in series"),
    compute: ({ a, b, εr }) => b * (a / b) ** (1 / εr),
  }),
};

/** The geometry with its compound taken for a wider column in air. */
export function inAir(geometry: FieldGeometry): FieldGeometry {
  const { potting } = geometry;
  if (potting === undefined || potting === null) return geometry;
  const radius_m = pottingFormulas.equivalentRadius.compute({
    a: geometry.columnDiameter_m / 2,
    b: potting.radius_m,
    εr: potting.permittivity,
  }) as number;
  return { ...geometry, potting: null, columnDiameter_m: 2 * radius_m };
}

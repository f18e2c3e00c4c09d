import type { Geometry } from "../job/design.ts";
import { metre } from "../quantities/quantity.ts";
import { formula } from "../standards/formula.ts";
import type { Sheet } from "../standards/sheet.ts";
import { practice, type Source } from "../standards/source.ts";
import { verticalCylinderCapacitance } from "../standards/strayCapacitance.ts";

const m = (symbol: string, meaning: string) => ({ symbol, unit: "m", meaning });
const kuffel: Source = {
  title: "Kuffel, Zaengl, Kuffel: High Voltage Engineering, Fundamentals",
  edition: "2nd ed. (2000)",
  clause: "ch. 3, stray capacitance of a vertical cylinder",
  status: "from memory",
};

/** Share of the column's stray that goes to a top electrode instead, while no field has been solved; ±30 %. */
const electrodeShare = 0.3;

export const strayFormulas = {
  toEarth: formula({
    id: "strays.toEarth",
    title: "Stray capacitance of the column to earth",
    statement: "{=} = 2π ε_0 {l} / ln((2 {l} / {d}) · √((4 {h} + {l}) / (4 {h} + 3 {l})))",
    result: { symbol: "C_e", unit: "F", meaning: "whole column to earth" },
    inputs: { l: m("l", "column length"), d: m("d", "column diameter"), h: m("h", "height of its foot") },
    holds:
      "A bare graded column, length over diameter 10 to 30; too high by 10 to 95 % under a top electrode. Walls add to it. None where it is not longer than wide.",
    source: kuffel,
    compute: ({ l, d, h }) => (l > d ? verticalCylinderCapacitance(metre(l), metre(d), metre(h)) : null),
  }),
  toElectrode: formula({
    id: "strays.toElectrode",
    title: "Stray capacitance of the column to the top electrode",
    statement: "{=} = {k} · {Ce}",
    result: { symbol: "C_h", unit: "F", meaning: "whole column to the electrode" },
    inputs: {
      k: { symbol: "k_h", unit: "1", meaning: "share by the electrode's size, 0 without one" },
      Ce: { symbol: "C_e", unit: "F", meaning: "whole column to earth" },
    },
    holds: "A guess within ±30 % for an electrode about as wide as the column; a field solve settles it.",
    source: practice("share of a cap about as wide as the column"),
    compute: ({ k, Ce }) => k * Ce,
  }),
};

/** Strays by the closed formula: each inner node carries the n-th part (n elements, n-1 inner nodes). */
export interface ColumnStrays {
  readonly toEarth_F: readonly number[];
  readonly toElectrode_F: readonly number[];
  readonly electrodeToTap_F: number;
  /** Across each element, beside its own capacitance; none by the formula. */
  readonly series_F: readonly number[] | null;
  /** From the tap to earth, across the LV arm. */
  readonly tapToEarth_F: number;
}

/** Writes `strays.*` on the sheet and returns what each inner node carries; 0 where the formula gives none. */
export function columnStrays(geometry: Geometry, n: number, sheet: Sheet): ColumnStrays {
  sheet.given("/design/geometry/columnLength_m", geometry.columnLength_m);
  sheet.given("/design/geometry/columnDiameter_m", geometry.columnDiameter_m);
  sheet.given("/design/geometry/footHeight_m", geometry.footHeight_m);
  sheet.given("/design/geometry/electrode/kind:share", geometry.electrode.kind === "none" ? 0 : electrodeShare);
  const toEarth = sheet.derive("strays.toEarth_F", strayFormulas.toEarth, {
    l: "/design/geometry/columnLength_m",
    d: "/design/geometry/columnDiameter_m",
    h: "/design/geometry/footHeight_m",
  });
  const toElectrode = sheet.derive("strays.toElectrode_F", strayFormulas.toElectrode, {
    k: "/design/geometry/electrode/kind:share",
    Ce: "strays.toEarth_F",
  });
  const each = (total: number | null) => new Array<number>(Math.max(n - 1, 0)).fill((total ?? 0) / n);
  return {
    toEarth_F: each(toEarth),
    toElectrode_F: each(toElectrode),
    electrodeToTap_F: 0,
    series_F: null,
    tapToEarth_F: 0,
  };
}

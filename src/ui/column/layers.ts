import { type Design, formatQuantity, type Proof } from "../../solver/index.ts";

/** Views of the column: what the labels beside the bodies say and what the ink of the bodies stands for. */
export const layers = ["voltage", "step sharing", "heat", "strays", "millimetres"] as const;
export type Layer = (typeof layers)[number];

export interface LayerView {
  /** What the labels are, in a few words. */
  readonly caption: string;
  /** Ends of the scale of the ink; null: ink stands for nothing on this layer. */
  readonly scale: { readonly low: string; readonly high: string } | null;
  /** Ink of element `i` (0-based), 0 pale … 1 full; null where the number does not exist. */
  readonly share: (i: number) => number | null;
  /** Label of element `i` (0-based); a dash where the number does not exist. */
  readonly text: (i: number) => string;
}

type Unit = "V" | "W" | "F";

export function layerView(layer: Layer, design: Design, proof: Proof | null): LayerView {
  const list = (path: string): readonly (number | null)[] => {
    const found = proof?.sheet.values[path];
    return Array.isArray(found) ? (found as readonly (number | null)[]) : [];
  };
  switch (layer) {
    case "voltage":
      return shaded("potential of each upper end, working peak", list("element.nodePotential_V"), null, "V");
    case "step sharing": {
      const own = list("element.voltage_Vstep");
      return shaded(
        own.length > 0
          ? "voltage of each element at the instant of an edge; full ink is its derated limit"
          : "voltage of each element where the greatest peak is touched on; full ink is its derated limit",
        own.length > 0 ? own : list("element.voltage_VhotContact"),
        list("element.voltageLimit_Vpeak"),
        "V",
      );
    }
    case "heat":
      return shaded(
        "dissipation of each element; full ink is its derated limit",
        list("element.dissipation_W"),
        list("element.dissipationLimit_W"),
        "W",
      );
    case "strays":
      return shaded("stray capacitance of each upper end to earth", list("strays.eachToEarth_F"), null, "F");
    case "millimetres": {
      const { footHeight_m, columnLength_m } = design.geometry;
      const n = design.hvArm.elements.length;
      return {
        caption: "height of each upper end above the floor",
        scale: null,
        share: () => null,
        text: (i) => `${Math.round((footHeight_m + ((i + 1) * columnLength_m) / n) * 1000)}\u2009mm`,
      };
    }
  }
}

/** Ink up to each one's own limit, or up to the greatest of all. */
function shaded(
  caption: string,
  values: readonly (number | null)[],
  limits: readonly (number | null)[] | null,
  unit: Unit,
): LayerView {
  const top = greatestOf(limits ?? values);
  const at = (i: number) => values[i] ?? null;
  return {
    caption,
    scale: top === 0 ? null : { low: formatQuantity(0, unit), high: formatQuantity(top, unit) },
    share: (i) => {
      const value = at(i);
      const most = limits === null ? top : (limits[i] ?? 0);
      return value === null || most === 0 ? null : Math.min(1, Math.abs(value) / most);
    },
    text: (i) => {
      const value = at(i);
      return value === null ? "–" : formatQuantity(value, unit);
    },
  };
}

function greatestOf(values: readonly (number | null)[]): number {
  let top = 0;
  for (const each of values) if (each !== null && Math.abs(each) > top) top = Math.abs(each);
  return top;
}

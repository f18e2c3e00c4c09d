import { type Design, formatQuantity, type Proof } from "../../solver/index.ts";

/** Views of the column: what the labels beside the bodies say. */
export const layers = ["voltage", "heat", "strays", "millimetres"] as const;
export type Layer = (typeof layers)[number];

const at = (proof: Proof | null, path: string, i: number): number | null => {
  const value = proof?.sheet.values[path];
  return Array.isArray(value) ? ((value[i] as number | null | undefined) ?? null) : null;
};

/** The label of element `i` (0-based) on a layer; a dash where the number does not exist. */
export function layerText(layer: Layer, i: number, design: Design, proof: Proof | null): string {
  switch (layer) {
    case "voltage":
      return text(at(proof, "element.nodePotential_V", i), "V");
    case "heat":
      return text(at(proof, "element.dissipation_W", i), "W");
    case "strays":
      return text(at(proof, "strays.eachToEarth_F", Math.min(i, design.hvArm.elements.length - 2)), "F");
    case "millimetres": {
      const { footHeight_m, columnLength_m } = design.geometry;
      return `${Math.round((footHeight_m + ((i + 1) * columnLength_m) / design.hvArm.elements.length) * 1000)}\u2009mm`;
    }
  }
}

const text = (value: number | null, unit: "V" | "W" | "F"): string =>
  value === null ? "–" : formatQuantity(value, unit, { digits: 3 });

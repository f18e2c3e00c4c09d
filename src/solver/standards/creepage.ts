import { stepUp } from "../quantities/interpolate.ts";
import { type Metre, metre, type Volt } from "../quantities/quantity.ts";
import { ok, type Result, refuse } from "../quantities/result.ts";
import type { Source } from "./source.ts";
import type { MaterialGroup, PollutionDegree } from "./surroundings.ts";

export const creepageSource: Source = {
  title: "IEC 60664-1",
  edition: "ed. 3 (2020)",
  clause: "table F.5",
  status: "figures from a secondary copy, primary not seen",
};

/** As printed, mm: V r.m.s., PD1 all groups, PD2 I, II, III, PD3 I, II, III. Pollution degree 3 stops at 10 kV. */
export const creepageTable_mm: readonly (readonly (number | null)[])[] = [
  [10, 0.08, 0.4, 0.4, 0.4, 1, 1, 1],
  [12.5, 0.09, 0.42, 0.42, 0.42, 1.05, 1.05, 1.05],
  [16, 0.1, 0.45, 0.45, 0.45, 1.1, 1.1, 1.1],
  [20, 0.11, 0.48, 0.48, 0.48, 1.2, 1.2, 1.2],
  [25, 0.125, 0.5, 0.5, 0.5, 1.25, 1.25, 1.25],
  [32, 0.14, 0.53, 0.53, 0.53, 1.3, 1.3, 1.3],
  [40, 0.16, 0.56, 0.8, 1.1, 1.4, 1.6, 1.8],
  [50, 0.18, 0.6, 0.85, 1.2, 1.5, 1.7, 1.9],
  [63, 0.2, 0.63, 0.9, 1.25, 1.6, 1.8, 2],
  [80, 0.22, 0.67, 0.95, 1.3, 1.7, 1.9, 2.1],
  [100, 0.25, 0.71, 1, 1.4, 1.8, 2, 2.2],
  [125, 0.28, 0.75, 1.05, 1.5, 1.9, 2.1, 2.4],
  [160, 0.32, 0.8, 1.1, 1.6, 2, 2.2, 2.5],
  [200, 0.42, 1, 1.4, 2, 2.5, 2.8, 3.2],
  [250, 0.56, 1.25, 1.8, 2.5, 3.2, 3.6, 4],
  [320, 0.75, 1.6, 2.2, 3.2, 4, 4.5, 5],
  [400, 1, 2, 2.8, 4, 5, 5.6, 6.3],
  [500, 1.3, 2.5, 3.6, 5, 6.3, 7.1, 8],
  [630, 1.8, 3.2, 4.5, 6.3, 8, 9, 10],
  [800, 2.4, 4, 5.6, 8, 10, 11, 12.5],
  [1000, 3.2, 5, 7.1, 10, 12.5, 14, 16],
  [1250, 4.2, 6.3, 9, 12.5, 16, 18, 20],
  [1600, 5.6, 8, 11, 16, 20, 22, 25],
  [2000, 7.5, 10, 14, 20, 25, 28, 32],
  [2500, 10, 12.5, 18, 25, 32, 36, 40],
  [3200, 12.5, 16, 22, 32, 40, 45, 50],
  [4000, 16, 20, 28, 40, 50, 56, 63],
  [5000, 20, 25, 36, 50, 63, 71, 80],
  [6300, 25, 32, 45, 63, 80, 90, 100],
  [8000, 32, 40, 56, 80, 100, 110, 125],
  [10000, 40, 50, 71, 100, 125, 140, 160],
  [12500, 50, 63, 90, 125, null, null, null],
  [16000, 63, 80, 110, 160, null, null, null],
  [20000, 80, 100, 140, 200, null, null, null],
  [25000, 100, 125, 180, 250, null, null, null],
  [32000, 125, 160, 220, 320, null, null, null],
  [40000, 160, 200, 280, 400, null, null, null],
  [50000, 200, 250, 360, 500, null, null, null],
  [63000, 250, 320, 450, 600, null, null, null],
];

/**
 * Creepage distance, m, by working voltage (dc or r.m.s.), pollution degree and material group; IIIa and IIIb share a column.
 * Between rows the next larger; beyond the table, and for IIIb at pollution degree 3 above 630 V, refused.
 * @example creepage(volt(48000), 2, "IIIa") // 0.5 m
 */
export function creepage(voltage: Volt, pollutionDegree: PollutionDegree, group: MaterialGroup): Result<Metre> {
  if (pollutionDegree === 3 && group === "IIIb" && voltage > 630) {
    return refuse(
      "material group",
      "Group IIIb is not recommended at pollution degree 3 above 630 V.",
      "Use group IIIa or better.",
    );
  }
  const row = stepUp(creepageTable_mm, Math.max(voltage, 0), "creepage, IEC 60664-1 table F.5");
  if (!row.ok) return row;
  const column = { I: 0, II: 1, IIIa: 2, IIIb: 2 }[group];
  const distance = row.value[pollutionDegree === 1 ? 1 : pollutionDegree === 2 ? 2 + column : 5 + column];
  if (distance === null || distance === undefined) {
    return refuse(
      "creepage, IEC 60664-1 table F.5",
      "Pollution degree 3 is tabulated to 10 kV only.",
      "Lower the pollution degree by an enclosure, or take the value from another standard.",
    );
  }
  return ok(metre(distance / 1000));
}

import { interpolate, stepUp } from "../quantities/interpolate.ts";
import { type Metre, metre, type Plain, plain, type Volt } from "../quantities/quantity.ts";
import { ok, type Result, refuse } from "../quantities/result.ts";
import type { Source } from "./source.ts";
import type { PollutionDegree } from "./surroundings.ts";

const source = (clause: string): Source => ({
  title: "IEC 60664-1",
  edition: "ed. 3 (2020)",
  clause,
  status: "figures from a secondary copy, primary not seen",
});
export const steadyClearanceSource = source("table F.8");
export const impulseClearanceSource = source("table F.2");
export const altitudeSource = source("table A.2");

/** A: inhomogeneous field, the default. B: homogeneous, only where a field solve shows it. */
export type FieldCase = "A" | "B";

/** As printed: kV peak, case A mm, case B mm. Steady-state, temporary overvoltage or recurring peak. */
export const steadyClearanceTable: readonly (readonly (number | null)[])[] = [
  [0.04, 0.001, 0.001],
  [0.06, 0.002, 0.002],
  [0.1, 0.003, 0.003],
  [0.12, 0.004, 0.004],
  [0.15, 0.005, 0.005],
  [0.2, 0.006, 0.006],
  [0.25, 0.008, 0.008],
  [0.33, 0.01, 0.01],
  [0.4, 0.02, 0.02],
  [0.5, 0.04, 0.04],
  [0.6, 0.06, 0.06],
  [0.8, 0.13, 0.1],
  [1, 0.26, 0.15],
  [1.2, 0.42, 0.2],
  [1.5, 0.76, 0.3],
  [2, 1.27, 0.45],
  [2.5, 1.8, 0.6],
  [3, 2.4, 0.8],
  [4, 3.8, 1.2],
  [5, 5.7, 1.5],
  [6, 7.9, 2],
  [8, 11, 3],
  [10, 15.2, 3.5],
  [12, 19, 4.5],
  [15, 25, 5.5],
  [20, 34, 8],
  [25, 44, 10],
  [30, 55, 12.5],
  [40, 77, 17],
  [50, 100, 22],
  [60, null, 27],
  [80, null, 35],
  [100, null, 45],
];

/** As printed: kV peak of a 1.2/50 impulse, case A mm at PD1, PD2, PD3, case B mm at PD1, PD2, PD3. */
export const impulseClearanceTable: readonly (readonly number[])[] = [
  [0.33, 0.01, 0.2, 0.8, 0.01, 0.2, 0.8],
  [0.4, 0.02, 0.2, 0.8, 0.02, 0.2, 0.8],
  [0.5, 0.04, 0.2, 0.8, 0.04, 0.2, 0.8],
  [0.6, 0.06, 0.2, 0.8, 0.06, 0.2, 0.8],
  [0.8, 0.1, 0.2, 0.8, 0.1, 0.2, 0.8],
  [1, 0.15, 0.2, 0.8, 0.15, 0.2, 0.8],
  [1.2, 0.25, 0.25, 0.8, 0.2, 0.2, 0.8],
  [1.5, 0.5, 0.5, 0.8, 0.3, 0.3, 0.8],
  [2, 1, 1, 1, 0.45, 0.45, 0.8],
  [2.5, 1.5, 1.5, 1.5, 0.6, 0.6, 0.8],
  [3, 2, 2, 2, 0.8, 0.8, 0.8],
  [4, 3, 3, 3, 1.2, 1.2, 1.2],
  [5, 4, 4, 4, 1.5, 1.5, 1.5],
  [6, 5.5, 5.5, 5.5, 2, 2, 2],
  [8, 8, 8, 8, 3, 3, 3],
  [10, 11, 11, 11, 3.5, 3.5, 3.5],
  [12, 14, 14, 14, 4.5, 4.5, 4.5],
  [15, 18, 18, 18, 5.5, 5.5, 5.5],
  [20, 25, 25, 25, 8, 8, 8],
  [25, 33, 33, 33, 10, 10, 10],
  [30, 40, 40, 40, 12.5, 12.5, 12.5],
  [40, 60, 60, 60, 17, 17, 17],
  [50, 75, 75, 75, 22, 22, 22],
  [60, 90, 90, 90, 27, 27, 27],
  [80, 130, 130, 130, 35, 35, 35],
  [100, 170, 170, 170, 45, 45, 45],
];

/** As printed: altitude m, factor relative to 2000 m. */
export const altitudeTable: readonly (readonly [number, number])[] = [
  [2000, 1],
  [3000, 1.14],
  [4000, 1.29],
  [5000, 1.48],
  [6000, 1.7],
  [7000, 1.95],
  [8000, 2.25],
  [9000, 2.62],
  [10000, 3.02],
  [15000, 6.67],
  [20000, 14.5],
];

/**
 * Clearance for a steady or recurring peak, m, up to 2000 m. Between rows the next larger; case A is not tabulated above 50 kV.
 * @example steadyClearance(volt(20000), "A") // 34 mm
 */
export function steadyClearance(peak: Volt, field: FieldCase): Result<Metre> {
  const row = stepUp(steadyClearanceTable, Math.max(peak, 0) / 1000, "clearance, IEC 60664-1 table F.8");
  if (!row.ok) return row;
  const gap = row.value[field === "A" ? 1 : 2];
  if (gap === null || gap === undefined) {
    return refuse(
      "clearance, IEC 60664-1 table F.8",
      "The inhomogeneous case is not tabulated above 50 kV.",
      "Use 3 kV/cm along open parts, or another standard.",
    );
  }
  return ok(metre(gap / 1000));
}

/** Clearance for a required impulse withstand (1.2/50), m, up to 2000 m; pollution degree sets the least value. */
export function impulseClearance(peak: Volt, field: FieldCase, pollutionDegree: PollutionDegree): Result<Metre> {
  const row = stepUp(impulseClearanceTable, Math.max(peak, 0) / 1000, "clearance, IEC 60664-1 table F.2");
  if (!row.ok) return row;
  return ok(metre(row.value[(field === "A" ? 0 : 3) + pollutionDegree]! / 1000));
}

/** Factor on clearances by altitude: 1 to 2000 m, straight line between rows of table A.2; refused above 20 000 m. */
export function altitudeFactor(altitude: Metre): Result<Plain> {
  if (altitude <= 2000) return ok(plain(1));
  const factor = interpolate(altitudeTable, altitude, "altitude, IEC 60664-1 table A.2");
  return factor.ok ? ok(plain(factor.value)) : factor;
}

import type { CapacitorFamily, DielectricClass } from "../job/part.ts";
import type { Refusal } from "../quantities/result.ts";

/** Generic capacitor families: every figure typical of its kind, from memory; the data sheet of the part bought decides. */
type Row = readonly [
  id: string,
  name: string,
  dielectric: string,
  dielectricClass: DielectricClass,
  tolerance: number,
  least_F: number,
  greatest_F: number,
  series: CapacitorFamily["series"],
  rated_V: number,
  tc_ppm: number,
  dissipationFactor: number,
  length_mm: number,
  diameter_mm: number,
  inductance_nH: number,
];

const rows: readonly Row[] = [
  ["c0g-50", "class 1 ceramic chip, 50 V", "C0G", "class1", 0.05, 1e-12, 1e-7, "E12", 50, 30, 1e-3, 2, 1.25, 0.6],
  ["c0g-100", "class 1 ceramic chip, 100 V", "C0G", "class1", 0.02, 1e-12, 3.3e-8, "E24", 100, 30, 1e-3, 3.2, 1.6, 0.8],
  ["c0g-630", "class 1 ceramic chip, 630 V", "C0G", "class1", 0.05, 1e-12, 1e-8, "E12", 630, 30, 1e-3, 3.2, 1.6, 0.8],
  ["c0g-1k", "class 1 ceramic chip, 1 kV", "C0G", "class1", 0.05, 1e-12, 4.7e-9, "E12", 1000, 30, 1e-3, 3.2, 1.6, 0.8],
  ["c0g-2k", "class 1 ceramic chip, 2 kV", "C0G", "class1", 0.05, 1e-12, 2.2e-9, "E12", 2000, 30, 1e-3, 4.5, 3.2, 1],
  ["c0g-3k", "class 1 ceramic chip, 3 kV", "C0G", "class1", 0.05, 1e-12, 1e-9, "E12", 3000, 30, 1e-3, 5.7, 5, 1.2],
  ["c0g-6k", "class 1 ceramic disc, 6 kV", "C0G", "class1", 0.05, 1e-12, 4.7e-10, "E12", 6000, 30, 1e-3, 12, 6, 8],
  ["pp-1k", "polypropylene film, 1 kV", "PP", "film", 0.05, 1e-10, 1e-7, "E12", 1000, -200, 3e-4, 18, 6, 12],
  ["pp-2k", "polypropylene film, 2 kV", "PP", "film", 0.05, 1e-10, 4.7e-8, "E12", 2000, -200, 3e-4, 18, 8, 14],
  ["pp-63", "polypropylene film, 63 V", "PP", "film", 0.01, 1e-10, 1e-6, "E24", 63, -200, 3e-4, 8, 5, 7],
  ["ps-160", "polystyrene film, 160 V", "PS", "film", 0.01, 1e-11, 4.7e-8, "E24", 160, -120, 2e-4, 12, 6, 8],
  ["mica-500", "silvered mica, 500 V", "mica", "mica", 0.01, 1e-12, 1e-8, "E24", 500, 50, 1e-3, 12, 5, 6],
  ["mica-2k5", "silvered mica, 2.5 kV", "mica", "mica", 0.02, 1e-11, 4.7e-9, "E12", 2500, 50, 1e-3, 18, 7, 8],
  [
    "class2-disc",
    "class 2 ceramic disc, 3 kV",
    "X7R-like",
    "class2",
    0.2,
    1e-10,
    1e-8,
    "E6",
    3000,
    5000,
    0.025,
    12,
    6,
    8,
  ],
  ["class2-chip", "class 2 ceramic chip, 50 V", "X7R", "class2", 0.1, 1e-10, 1e-6, "E6", 50, 5000, 0.025, 2, 1.25, 0.6],
  [
    "air-plates",
    "home-made plates or coaxial, air",
    "air",
    "air",
    0.05,
    1e-12,
    1e-10,
    "E24",
    10000,
    20,
    1e-5,
    100,
    30,
    20,
  ],
];

/** The double nearest to the decimal as written. */
const decimal = (value: number, power: number): number => Number(`${value}e${power}`);

export const capacitorFamilies: readonly CapacitorFamily[] = rows.map(
  ([
    id,
    name,
    dielectric,
    dielectricClass,
    tolerance,
    least_F,
    greatest_F,
    series,
    V,
    tc,
    tan,
    length,
    diameter,
    nH,
  ]) => ({
    id,
    kind: "capacitor",
    name,
    origin: "catalogue",
    tolerance,
    bodyLength_m: decimal(length, -3),
    bodyDiameter_m: decimal(diameter, -3),
    least_F,
    greatest_F,
    series,
    dielectric,
    dielectricClass,
    ratedVoltage_V: V,
    temperatureCoefficient_per_K: decimal(tc, -6),
    dissipationFactor: tan,
    leadInductance_H: decimal(nH, -9),
  }),
);

export type CapacitorPlace = "hvArm" | "lvArm" | "decoupling";

const spoilt: Partial<Record<DielectricClass, string>> = {
  class2:
    "A class 2 ceramic loses 20 to 60 % of its capacitance at its rated voltage, drifts with temperature and answers to shock",
  electrolytic: "An electrolytic leaks, is polarised and is known to some tens of percent only",
};

/**
 * Why a capacitor may not stand in a place, with what to do; null where it may. Either arm must hold its capacitance over
 * voltage and temperature, or the scale factor goes with it; decoupling a rail is no part of the scale factor.
 * Common practice, no source.
 */
export function dielectricRefusal(family: CapacitorFamily, place: CapacitorPlace): Refusal | null {
  const why = spoilt[family.dielectricClass];
  if (place === "decoupling" || why === undefined) return null;
  return {
    where: place === "hvArm" ? "HV arm" : "LV arm",
    why: `${why}: it would spoil the scale factor.`,
    cure: "Take a class 1 ceramic (C0G), polypropylene or mica; decoupling a protector's rail is fine.",
  };
}

/** Whether a capacitor may stand in a place. */
export const dielectricFits = (family: CapacitorFamily, place: CapacitorPlace): boolean =>
  dielectricRefusal(family, place) === null;

/** Columns of a file of families: keys as in a saved document, each with its unit; a head may name a larger or smaller unit. */
import type { UnitName } from "../solver/index.ts";

export interface QuantityColumn {
  readonly key: string;
  readonly unit: UnitName;
  readonly signed?: true;
}

const both: readonly QuantityColumn[] = [
  { key: "tolerance", unit: "1" },
  { key: "bodyLength_m", unit: "m" },
  { key: "bodyDiameter_m", unit: "m" },
  { key: "temperatureCoefficient_per_K", unit: "1/K", signed: true },
];

/** Ratings of each kind; `needed`: without them there is no family, for nothing may stand in for them. */
export const quantityColumns: Readonly<Record<"resistor" | "capacitor", readonly QuantityColumn[]>> = {
  resistor: [
    { key: "least_ohm", unit: "ohm" },
    { key: "greatest_ohm", unit: "ohm" },
    { key: "seriesAboveFrom_ohm", unit: "ohm" },
    { key: "ratedDissipation_W", unit: "W" },
    { key: "deratingFrom_degC", unit: "degC", signed: true },
    { key: "zeroDissipation_degC", unit: "degC", signed: true },
    { key: "limitingVoltage_V", unit: "V" },
    ...both,
    { key: "voltageCoefficient_per_V", unit: "1/V", signed: true },
    { key: "thermalResistance_K_per_W", unit: "K/W" },
    { key: "selfCapacitance_F", unit: "F" },
    { key: "leadSpace_m", unit: "m" },
  ],
  capacitor: [
    { key: "least_F", unit: "F" },
    { key: "greatest_F", unit: "F" },
    { key: "ratedVoltage_V", unit: "V" },
    ...both,
    { key: "dissipationFactor", unit: "1" },
    { key: "leadInductance_H", unit: "H" },
  ],
};
const body = ["tolerance", "bodyLength_m", "bodyDiameter_m"];
export const needed: Readonly<Record<"resistor" | "capacitor", readonly string[]>> = {
  resistor: ["least_ohm", "greatest_ohm", "ratedDissipation_W", ...body],
  capacitor: ["least_F", "greatest_F", "ratedVoltage_V", ...body],
};

export const textColumns = [
  "kind",
  "name",
  "series",
  "seriesAbove",
  "use",
  "dielectric",
  "dielectricClass",
  "inHand",
] as const;
export type TextColumn = (typeof textColumns)[number];

const everyQuantity = new Map(
  [...quantityColumns.resistor, ...quantityColumns.capacitor].map((each) => [each.key, each]),
);
/** All columns in the order in which they are written. */
export const familyColumns: readonly string[] = [...textColumns, ...everyQuantity.keys()];

/** What a head means: the key of a document and the factor from a bare number to the base unit. */
export interface ReadHead {
  readonly key: string;
  readonly factor: number;
}

const prefixed = (unit: string, prefixes: string): readonly (readonly [string, number])[] => {
  const powers: Record<string, number> = { p: 1e-12, n: 1e-9, u: 1e-6, µ: 1e-6, m: 1e-3, k: 1e3, M: 1e6, G: 1e9 };
  return [...prefixes].map((prefix) => [`${prefix}${unit}`, powers[prefix]!]);
};
const larger: Partial<Record<UnitName, readonly (readonly [string, number])[]>> = {
  ohm: prefixed("ohm", "kMG"),
  F: prefixed("F", "pnuµ"),
  H: prefixed("H", "nuµ"),
  V: prefixed("V", "mk"),
  W: prefixed("W", "mk"),
  m: [...prefixed("m", "m"), ["cm", 1e-2]],
  "1": [
    ["percent", 1e-2],
    ["ppm", 1e-6],
  ],
  "1/K": [["ppm_per_K", 1e-6]],
  "1/V": [["ppm_per_V", 1e-6]],
};

const heads: ReadonlyMap<string, ReadHead> = new Map([
  ...textColumns.map((key) => [key, { key, factor: 1 }] as const),
  ...[...everyQuantity.values()].flatMap(({ key, unit }) => {
    const stem = key.replace(/_.*$/, "");
    const others = (larger[unit] ?? []).map(([suffix, factor]) => [`${stem}_${suffix}`, { key, factor }] as const);
    return [[key, { key, factor: 1 }] as const, ...others];
  }),
]);

/** @example headOf("bodyLength_mm") // { key: "bodyLength_m", factor: 0.001 }; null: it means nothing here */
export const headOf = (head: string): ReadHead | null => heads.get(head.trim()) ?? null;

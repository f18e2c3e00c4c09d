import type { ProtectorFamily } from "../job/part.ts";

const protector = (
  id: string,
  name: string,
  type: ProtectorFamily["type"],
  leastStrike_V: number | null,
  letThrough_V: number | null,
  leakage_A: number,
  capacitance_F: number,
  resistance_ohm: number | null = null,
): ProtectorFamily => ({
  id,
  kind: "protector",
  name,
  origin: "catalogue",
  tolerance: 0.2,
  bodyLength_m: 0.008,
  bodyDiameter_m: 0.006,
  type,
  leastStrike_V,
  letThrough_V,
  leakage_A,
  capacitance_F,
  resistance_ohm,
});

/** Generic protectors, typical figures from memory: gas tube 90 V ±20 %, 500-700 V at 1 kV/µs, and so on. */
export const protectors: readonly ProtectorFamily[] = [
  protector("gas-90", "gas tube, 90 V", "gasTube", 72, 700, 1e-8, 1.5e-12),
  protector("neon", "neon lamp", "neon", 60, 1000, 1e-11, 0.8e-12),
  protector("surge-diode", "surge diode pair, 24 V", "surgeDiode", 26, 45, 2e-6, 200e-12),
  protector("clamp-diodes", "low-leakage double diode to rails", "clampDiodes", 10, 15, 5e-9, 2e-12),
  protector("varistor", "varistor, 60 V", "varistor", 50, 150, 2e-6, 150e-12),
  protector("spark-gap", "spark gap, 0.1 mm", "sparkGap", 700, 2000, 0, 0.5e-12),
  protector("series-100k", "series resistor, 100 kΩ", "seriesResistor", null, null, 0, 0, 1e5),
  protector("series-1k", "series resistor, 1 kΩ", "seriesResistor", null, null, 0, 0, 1e3),
];

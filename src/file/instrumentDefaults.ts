import type { Instrument, InstrumentFunction } from "../solver/index.ts";

/** What stands in for the figures that a file does not give of its instrument. Typical, from memory; marked *assumed*. */
type Typical = Pick<
  Instrument,
  | "range_V"
  | "resistance_ohm"
  | "resistanceSpread"
  | "capacitance_F"
  | "capacitanceSpread_F"
  | "greatestInput_Vpeak"
  | "readingAccuracy"
  | "resolution_V"
  | "bandwidth_Hz"
>;

const typical = (
  [range_V, greatestInput_Vpeak]: readonly [number, number],
  [resistance_ohm, resistanceSpread]: readonly [number, number],
  [capacitance_F, capacitanceSpread_F]: readonly [number, number],
  [readingAccuracy, resolution_V]: readonly [number, number],
  bandwidth_Hz: number | null,
): Typical => ({
  range_V,
  greatestInput_Vpeak,
  resistance_ohm,
  resistanceSpread,
  capacitance_F,
  capacitanceSpread_F,
  readingAccuracy,
  resolution_V,
  bandwidth_Hz,
});

/** Range and limit; resistance and spread; capacitance and spread; accuracy and resolution; bandwidth. */
export const typicalInstruments: Readonly<Record<InstrumentFunction, Typical>> = {
  "meter dc": typical([60, 1000], [1e7, 0.02], [1e-10, 5e-11], [0.005, 0.01], null),
  "meter dc high impedance": typical([0.6, 1000], [1e10, 0.5], [1e-10, 5e-11], [0.005, 1e-4], null),
  "meter ac": typical([60, 1000], [1e7, 0.02], [1e-10, 5e-11], [0.01, 0.01], 1000),
  "bench meter dc": typical([10, 1000], [1e7, 0.01], [1e-10, 5e-11], [1e-4, 1e-5], null),
  "bench meter ac": typical([10, 1000], [1e6, 0.02], [1e-10, 5e-11], [0.002, 1e-5], 1e5),
  "pointer meter": typical([250, 1000], [5e6, 0.03], [1e-10, 5e-11], [0.03, 2.5], null),
  "scope 1 MΩ": typical([40, 300], [1e6, 0.02], [1.8e-11, 3e-12], [0.02, 0.2], 1e8),
  "scope with 10:1 probe": typical([400, 300], [1e7, 0.02], [1.3e-11, 3e-12], [0.025, 2], 1e8),
  "scope 50 Ω": typical([8, 7], [50, 0.01], [0, 0], [0.02, 0.04], 1e8),
  "data logger": typical([10, 10], [1e9, 0.5], [1e-10, 5e-11], [0.001, 1e-4], 1000),
  microammeter: typical([0.1, 1], [1000, 0.01], [0, 0], [0.02, 0.001], null),
};

/** Noise of an oscilloscope's trace on its most sensitive ranges, whole bandwidth, V rms; from memory. */
export const typicalNoise: Partial<Readonly<Record<InstrumentFunction, number>>> = {
  "scope 1 MΩ": 3e-4,
  "scope with 10:1 probe": 3e-3,
  "scope 50 Ω": 2e-4,
};

/** An instrument on one range and function with its cable: a scale factor belongs to exactly this. */
export type InstrumentFunction =
  | "meter dc"
  | "meter dc high impedance"
  | "meter ac"
  | "bench meter dc"
  | "bench meter ac"
  | "pointer meter"
  | "scope 1 MΩ"
  | "scope with 10:1 probe"
  | "scope 50 Ω"
  | "data logger"
  | "microammeter";

/**
 * How the cable is counted. `lumped`: as its capacitance at the tap. Else as a line: `open` from tap to instrument; `matchedAtTap`
 * behind a resistor of its impedance at the tap; `terminated` with its impedance across the far end.
 */
export type CableEnd = "lumped" | "open" | "matchedAtTap" | "terminated";

export interface Cable {
  readonly length_m: number;
  readonly capacitance_F_per_m: number;
  readonly impedance_ohm: number;
  readonly delay_s_per_m: number;
  readonly end: CableEnd;
}

export interface Instrument {
  readonly id: string;
  readonly name: string;
  readonly function: InstrumentFunction;
  readonly range_V: number;
  readonly resistance_ohm: number;
  /** Relative half-width of the input resistance. */
  readonly resistanceSpread: number;
  readonly capacitance_F: number;
  readonly capacitanceSpread_F: number;
  readonly greatestInput_Vpeak: number;
  /** Relative half-width of the reading, and one count. */
  readonly readingAccuracy: number;
  readonly resolution_V: number;
  /** Noise of the trace or reading on its most sensitive range, rms. */
  readonly noise_Vrms: number;
  /** null: dc only. */
  readonly bandwidth_Hz: number | null;
  readonly cable: Cable;
}

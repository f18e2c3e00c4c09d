/** Parts as a document carries them: every rating used is copied in, so that a file never depends on the catalogue. */
import type { SeriesName } from "./brief.ts";

export type Origin = "typed" | "measured" | "catalogue" | "assumed";

/** A value in the drawer: only these are used when the search is restricted to parts in hand. */
export interface InHand {
  readonly value: number;
  readonly count: number;
}

interface PartBase {
  readonly id: string;
  /** Plain generic name, e.g. "metal film, 0.6 W, axial". */
  readonly name: string;
  readonly origin: Origin;
  /** Relative half-width of the value, e.g. 0.01. */
  readonly tolerance: number;
  readonly bodyLength_m: number;
  readonly bodyDiameter_m: number;
  readonly inHand?: readonly InHand[];
}

export interface ResistorFamily extends PartBase {
  readonly kind: "resistor";
  readonly least_ohm: number;
  readonly greatest_ohm: number;
  readonly series: SeriesName;
  /** Above `wideSeriesAbove_ohm` only this coarser series is sold; null: the same throughout. */
  readonly seriesAbove: { readonly from_ohm: number; readonly series: SeriesName } | null;
  /** Rated dissipation at 70 °C (IEC 60115-1). */
  readonly ratedDissipation_W: number;
  /** The derating line: full up to `deratingFrom_degC`, zero at `zeroDissipation_degC`. */
  readonly deratingFrom_degC: number;
  readonly zeroDissipation_degC: number;
  /** Limiting element voltage, dc or rms, continuous (IEC 60115-1); null: not stated, the family is refused for sizing. */
  readonly limitingVoltage_V: number | null;
  /** Magnitude and sign of the temperature coefficient's bound, per kelvin. */
  readonly temperatureCoefficient_per_K: number;
  /** Signed typical voltage coefficient, per volt. */
  readonly voltageCoefficient_per_V: number;
  readonly thermalResistance_K_per_W: number;
  readonly selfCapacitance_F: number;
  /** Space from body to body along the column, ends included. */
  readonly leadSpace_m: number;
  /** What it is for: dividing, or only damping and surges. */
  readonly use: "divider" | "damping";
}

export type DielectricClass = "class1" | "class2" | "film" | "mica" | "air" | "electrolytic";

export interface CapacitorFamily extends PartBase {
  readonly kind: "capacitor";
  readonly least_F: number;
  readonly greatest_F: number;
  readonly series: SeriesName;
  readonly dielectric: string;
  readonly dielectricClass: DielectricClass;
  readonly ratedVoltage_V: number;
  readonly temperatureCoefficient_per_K: number;
  readonly dissipationFactor: number;
  readonly leadInductance_H: number;
}

/** A variable resistor (wired as a rheostat) or a variable capacitor. */
export interface TrimmerFamily extends PartBase {
  readonly kind: "trimmer";
  readonly quantity: "ohm" | "F";
  /** End values that can be bought. */
  readonly spans: readonly number[];
  /** Least value as a share of the span (capacitors) or absolute end resistance share. */
  readonly leastShare: number;
  readonly turns: number;
  readonly ratedVoltage_V: number;
}

export interface ProtectorFamily extends PartBase {
  readonly kind: "protector";
  readonly type: "gasTube" | "surgeDiode" | "clampDiodes" | "neon" | "varistor" | "sparkGap" | "seriesResistor";
  /** Lowest voltage at which it may conduct, tolerance in. */
  readonly leastStrike_V: number | null;
  /** Highest voltage it lets through at a fast rise. */
  readonly letThrough_V: number | null;
  readonly leakage_A: number;
  readonly capacitance_F: number;
  readonly resistance_ohm: number | null;
}

export type Part = ResistorFamily | CapacitorFamily | TrimmerFamily | ProtectorFamily;

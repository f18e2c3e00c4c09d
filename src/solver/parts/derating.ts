import type { ResistorFamily } from "../job/part.ts";
import { type Celsius, type Ohm, ohm, type Volt, volt, type Watt, watt } from "../quantities/quantity.ts";
import { deratingFormulas as f } from "./deratingFormulas.ts";

/** Shares of the limiting element voltage and of the permitted dissipation that may be used, 0.1 … 1 each. */
export interface Derating {
  readonly voltage: number;
  readonly dissipation: number;
}

/** What one element of a value may bear, and which of its two limits says so. */
export interface ElementLimit {
  readonly voltage: Volt;
  readonly ruledBy: "voltage" | "dissipation";
}

/** A share of a rating; anything outside 0 … 1 was not checked where it came in. */
function share(value: number): number {
  if (!(value > 0 && value <= 1)) throw new RangeError(`a derating is above 0 and at most 1, not ${value}`);
  return value;
}

/**
 * Limiting element voltage, derated, dc or rms: d_v · V_lim; null where the family states none.
 * @param derating share that may be used, above 0 to 1; RangeError outside
 * @example voltageLimit(family, 0.6) // 210 V of 350 V
 */
export function voltageLimit(family: ResistorFamily, derating: number): Volt | null {
  const d = share(derating);
  const { limitingVoltage_V } = family;
  return limitingVoltage_V === null ? null : volt(f.voltageLimit.compute({ d, Vlim: limitingVoltage_V }) as number);
}

/**
 * Dissipation that an element may have at an ambient, derated: full up to the rated temperature, then on a straight line to 0.
 * @param ambient in °C, in free air
 * @param derating share that may be used, above 0 to 1; RangeError outside
 * @example dissipationLimit(family, celsius(85), 0.5) // 0.8235 · 0.5 of the rated one for 70 °C to 155 °C
 */
export function dissipationLimit(family: ResistorFamily, ambient: Celsius, derating: number): Watt {
  const { ratedDissipation_W: P, deratingFrom_degC: Tr, zeroDissipation_degC: Tz } = family;
  return watt(f.dissipationLimit.compute({ d: share(derating), P, Tr, Tz, T: ambient }) as number);
}

/**
 * Voltage that an element of this value may bear, dc or rms, and which limit sets it; null where no limiting voltage is stated.
 * @example elementLimit(family, ohm(1e6), celsius(23), { voltage: 0.6, dissipation: 0.5 })
 */
export function elementLimit(
  family: ResistorFamily,
  resistance: Ohm,
  ambient: Celsius,
  derating: Derating,
): ElementLimit | null {
  const V = voltageLimit(family, derating.voltage);
  if (V === null) return null;
  const P = dissipationLimit(family, ambient, derating.dissipation);
  const voltage = volt(f.elementVoltage.compute({ V, P, R: resistance }) as number);
  return { voltage, ruledBy: voltage < V ? "dissipation" : "voltage" };
}

/** Value at which both derated limits are reached together; null where no voltage is stated or no dissipation is left. */
export function criticalResistance(family: ResistorFamily, ambient: Celsius, derating: Derating): Ohm | null {
  const V = voltageLimit(family, derating.voltage);
  if (V === null) return null;
  const R = f.criticalResistance.compute({ V, P: dissipationLimit(family, ambient, derating.dissipation) });
  return R === null ? null : ohm(R);
}

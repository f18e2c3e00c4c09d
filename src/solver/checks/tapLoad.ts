import type { Instrument } from "../job/instrument.ts";
import { formula } from "../standards/formula.ts";
import { computedHere } from "../standards/source.ts";
import type { Judging } from "./judging.ts";
import { leakageConductance, seriesAt, seriesResistance } from "./lvArm.ts";

/** What the tap's dc meets behind the LV arm: a resistance in series, the resistance read across, and a conductance straight to earth. */
export interface TapLoad {
  readonly series_ohm: number;
  readonly input_ohm: number;
  readonly shunt_S: number;
}

/**
 * A cable that is counted as a line brings resistors of its own impedance: in series at the tap, or across its far end, that is
 * beside the instrument, or before a series protector that stands at the instrument.
 */
export function tapLoad(j: Judging, instrument: Instrument = j.instrument): TapLoad {
  const { impedance_ohm, end } = instrument.cable;
  const Rs = seriesResistance(j);
  const Rm = instrument.resistance_ohm;
  const leakage = leakageConductance(j);
  const before = Rs > 0 && seriesAt(j) === "instrument";
  if (end === "matchedAtTap") return { series_ohm: Rs + impedance_ohm, input_ohm: Rm, shunt_S: leakage };
  if (end !== "terminated") return { series_ohm: Rs, input_ohm: Rm, shunt_S: leakage };
  if (before) return { series_ohm: Rs, input_ohm: Rm, shunt_S: leakage + 1 / impedance_ohm };
  return { series_ohm: Rs, input_ohm: (Rm * impedance_ohm) / (Rm + impedance_ohm), shunt_S: leakage };
}

const ohm = (symbol: string, meaning: string) => ({ symbol, unit: "ohm", meaning });
const Z0 = ohm("Z_0", "resistor of the cable's impedance");
const leakage = { symbol: "G_p", unit: "S", meaning: "leakage of the protectors" };

export const tapLoadFormulas = {
  series: formula({
    id: "tapLoad.series",
    title: "Series resistance between tap and instrument",
    statement: "{=} = {Rs} + {Z0}",
    result: ohm("R_s", "series protector and the cable's resistor"),
    inputs: { Rs: ohm("R_s", "series protector"), Z0 },
    holds: "dc.",
    source: computedHere("series sum"),
    compute: ({ Rs, Z0: Z }) => Rs + Z,
  }),
  input: formula({
    id: "tapLoad.input",
    title: "Instrument with the cable's termination",
    statement: "1 / {=} = 1 / {Rm} + 1 / {Z0}",
    result: ohm("R_m", "instrument and termination in parallel"),
    inputs: { Rm: ohm("R_m", "input resistance of the instrument"), Z0 },
    holds: "dc.",
    source: computedHere("parallel sum"),
    compute: ({ Rm, Z0: Z }) => (Rm * Z) / (Rm + Z),
  }),
  shunt: formula({
    id: "tapLoad.shunt",
    title: "Conductance at the tap with the cable's termination",
    statement: "{=} = {G} + 1 / {Z0}",
    result: { symbol: "G_p", unit: "S", meaning: "protectors and termination" },
    inputs: { G: leakage, Z0 },
    holds: "dc; the series protector stands behind the termination.",
    source: computedHere("parallel sum"),
    compute: ({ G, Z0: Z }) => G + 1 / Z,
  }),
};

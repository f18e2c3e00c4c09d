import { formula } from "../standards/formula.ts";
import type { Source } from "../standards/source.ts";

const iec60115: Source = {
  title: "IEC 60115-1",
  edition: "ed. 5 (2020)",
  clause: "limiting element voltage, rated dissipation, category temperature",
  status: "from memory",
};
const V = (symbol: string, meaning: string) => ({ symbol, unit: "V", meaning });
const W = (symbol: string, meaning: string) => ({ symbol, unit: "W", meaning });
const ohm = (symbol: string, meaning: string) => ({ symbol, unit: "ohm", meaning });
const one = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });
const degC = (symbol: string, meaning: string) => ({ symbol, unit: "degC", meaning });
const deratedVoltage = V("V_e,der", "limiting element voltage, derated");
const deratedDissipation = W("P_der", "dissipation limit, derated");

/** What one element of a family may bear. */
export const deratingFormulas = {
  voltageLimit: formula({
    id: "parts.voltageLimit",
    title: "Limiting element voltage, derated",
    statement: "{=} = {d} · {Vlim}",
    result: deratedVoltage,
    inputs: { d: one("d_v", "voltage derating"), Vlim: V("V_lim", "limiting element voltage, dc or rms") },
    holds: "Continuous dc or rms; the derating is the engineer's policy.",
    source: iec60115,
    compute: ({ d, Vlim }) => d * Vlim,
  }),
  dissipationLimit: formula({
    id: "parts.dissipationLimit",
    title: "Dissipation limit at the ambient temperature, derated",
    statement: "{=} = {d} · {P} · ({Tz} − {T}) / ({Tz} − {Tr}), the last factor within 0 … 1",
    result: deratedDissipation,
    inputs: {
      d: one("d_p", "dissipation derating"),
      P: W("P_70", "rated dissipation"),
      Tr: degC("T_r", "temperature up to which it holds"),
      Tz: degC("T_z", "temperature at which none is left"),
      T: degC("T", "hottest ambient"),
    },
    holds: "Free air; a straight line from the rated to the zero-dissipation temperature, none above.",
    source: iec60115,
    compute: ({ d, P, Tr, Tz, T }) => (T <= Tr ? d * P : T >= Tz ? 0 : (d * P * (Tz - T)) / (Tz - Tr)),
  }),
  elementVoltage: formula({
    id: "parts.elementVoltage",
    title: "Voltage that an element of this value may bear",
    statement: "{=} = min({V}, √({P} · {R}))",
    result: V("V_max,e", "greatest element voltage, dc or rms"),
    inputs: { V: deratedVoltage, P: deratedDissipation, R: ohm("R_e", "element resistance") },
    holds: "Continuous dc or rms. Below the critical resistance dissipation rules, above it the limiting voltage.",
    source: iec60115,
    compute: ({ V, P, R }) => Math.min(V, Math.sqrt(P * R)),
  }),
  criticalResistance: formula({
    id: "parts.criticalResistance",
    title: "Critical resistance, derated",
    statement: "{=} = {V}² / {P}",
    result: ohm("R_crit", "below it dissipation rules, above it the limiting voltage"),
    inputs: { V: deratedVoltage, P: deratedDissipation },
    holds: "Where the derated voltage and the derated dissipation are reached together.",
    source: iec60115,
    compute: ({ V, P }) => (P > 0 ? (V * V) / P : null),
  }),
};

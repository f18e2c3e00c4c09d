import { formula, type Solution } from "../standards/formula.ts";
import { computedHere, type Source } from "../standards/source.ts";

export const iec60115: Source = {
  title: "IEC 60115-1",
  edition: "ed. 5 (2020)",
  clause: "limiting element voltage, rated dissipation, category temperature",
  status: "from memory",
};
const V = (symbol: string, meaning: string) => ({ symbol, unit: "V", meaning });
const ohm = (symbol: string, meaning: string) => ({ symbol, unit: "ohm", meaning });
const W = (symbol: string, meaning: string) => ({ symbol, unit: "W", meaning });
const one = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });
const degC = (symbol: string, meaning: string) => ({ symbol, unit: "degC", meaning });

export const stressFormulas = {
  elementVoltage: formula({
    id: "stress.elementVoltage",
    title: "Voltage of an element",
    statement: "{=} = {V} · {Re} / ({p} · {Rin})",
    result: V("V_e", "voltage across one element"),
    inputs: {
      V: V("V", "voltage at the electrode"),
      Re: ohm("R_e", "element resistance"),
      p: one("p", "strings in parallel"),
      Rin: ohm("R_in", "input resistance of the divider"),
    },
    holds: "Slow against R·C of the string, or capacitors in proportion to the resistors.",
    source: computedHere("series resistors share the voltage as their values"),
    compute: ({ V, Re, p, Rin }) => (V * Re) / (p * Rin),
  }),
  dissipation: formula({
    id: "stress.dissipation",
    title: "Dissipation of an element",
    statement: "{=} = {V}² / {Re}",
    result: W("P_e", "dissipation of one element"),
    inputs: { V: V("V_e", "element voltage, rms, at the greatest voltage"), Re: ohm("R_e", "element resistance") },
    holds: "Steady or repeated; single shots are judged by energy.",
    source: computedHere("Joule's law"),
    compute: ({ V, Re }) => (V * V) / Re,
  }),
  voltageLimit: formula({
    id: "stress.voltageLimit",
    title: "Element voltage that may stand continuously",
    statement: "{=} = {Vlim} · {k}",
    result: V("V_e,max", "limit on this basis"),
    inputs: {
      Vlim: V("V_lim", "limiting element voltage, dc or rms"),
      k: one("k", "√2 for the peak of a sine, else 1"),
    },
    holds: "Up to the dissipation limit; pulses by their peak, no overload figure is used.",
    source: iec60115,
    compute: ({ Vlim, k }) => Vlim * k,
  }),
  deratedVoltage: formula({
    id: "stress.deratedVoltage",
    title: "Element voltage limit, derated",
    statement: "{=} = {d} · {Vlim}",
    result: V("V_e,der", "derated limit"),
    inputs: { d: one("d_v", "voltage derating"), Vlim: V("V_e,max", "limit on this basis") },
    holds: "The derating is the engineer's policy.",
    source: iec60115,
    compute: ({ d, Vlim }) => d * Vlim,
  }),
  dissipationRating: formula({
    id: "stress.dissipationRating",
    title: "Dissipation allowed at the ambient temperature",
    statement: "{=} = {P} · ({Tz} − {T}) / ({Tz} − {Tr}), at most {P}",
    result: W("P_T", "dissipation allowed at the hottest ambient"),
    inputs: {
      P: W("P_70", "rated dissipation"),
      Tr: degC("T_r", "temperature up to which it holds"),
      Tz: degC("T_z", "temperature at which none is left"),
      T: degC("T", "hottest ambient"),
    },
    holds: "Free air; between the rated and the zero-dissipation temperature on a straight line, none above.",
    source: iec60115,
    compute: ({ P, Tr, Tz, T }) => (T <= Tr ? P : T >= Tz ? 0 : (P * (Tz - T)) / (Tz - Tr)),
  }),
  deratedDissipation: formula({
    id: "stress.deratedDissipation",
    title: "Element dissipation limit, derated",
    statement: "{=} = {d} · {P}",
    result: W("P_der", "derated limit"),
    inputs: { d: one("d_p", "dissipation derating"), P: W("P_T", "dissipation allowed at the hottest ambient") },
    holds: "The derating is the engineer's policy.",
    source: iec60115,
    compute: ({ d, P }) => d * P,
  }),
  critical: formula({
    id: "stress.criticalResistance",
    title: "Critical resistance, derated",
    statement: "{=} = ({dv} · {Vlim})² / {P}",
    result: ohm("R_crit", "below it dissipation rules, above it the limiting voltage"),
    inputs: {
      dv: one("d_v", "voltage derating"),
      Vlim: V("V_lim", "limiting element voltage"),
      P: W("P_der", "derated dissipation limit"),
    },
    holds: "Where the derated voltage and the derated dissipation are reached together.",
    source: iec60115,
    compute: ({ dv, Vlim, P }) => (P > 0 ? (dv * Vlim) ** 2 / P : null),
  }),
  hottest: formula({
    id: "stress.hottestAmbient",
    title: "Hottest ambient",
    statement: "{=} = {T} + {s}",
    result: degC("T", "hottest ambient"),
    inputs: { T: degC("T_a", "ambient"), s: { symbol: "ΔT", unit: "K", meaning: "half-width of its span" } },
    holds: "Outside the enclosure, before self-heating.",
    source: computedHere("upper end of the ambient span"),
    compute: ({ T, s }) => T + s,
  }),
  potential: formula({
    id: "stress.nodePotential",
    title: "Potential of an element's upper end",
    statement: "{=} = {V} · ({Rin} − {above}) / {Rin}",
    result: V("V_i", "potential against earth"),
    inputs: {
      V: V("V", "voltage at the electrode"),
      Rin: ohm("R_in", "input resistance"),
      above: ohm("R_above", "resistance between this point and the electrode"),
    },
    holds: "dc, or slow against R·C of the string.",
    source: computedHere("series resistors share the voltage as their values"),
    compute: ({ V, Rin, above }) => (V * (Rin - above)) / Rin,
  }),
};

export const resistanceAbove: Solution = {
  id: "stress.resistanceAbove",
  title: "Resistance between an element's upper end and the electrode",
  statement: "R_above,i = Σ_(k>i) R_k / p",
  method: "Running sum from the electrode down.",
  holds: "Equal strings in parallel.",
  source: computedHere("series sum"),
  residualBound: 0,
};

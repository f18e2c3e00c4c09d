import { formula } from "../standards/formula.ts";
import { computedHere, practice, type Source } from "../standards/source.ts";

const ohm = (symbol: string, meaning: string) => ({ symbol, unit: "ohm", meaning });
const V = (symbol: string, meaning: string) => ({ symbol, unit: "V", meaning });
const one = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });
const least = ohm("R_1,min", "least HV arm resistance by this bound");
const greatest = ohm("R_1,max", "greatest HV arm resistance by this bound");
const F = one("F", "wanted scale factor");
const Rm = ohm("R_m", "input resistance of the instrument");
const Rs = ohm("R_s", "series protector");
const G = { symbol: "G_p", unit: "S", meaning: "leakage of the protectors" };
const U = one("U", "wanted uncertainty, k = 2");
const kuffel: Source = {
  title: "Kuffel, Zaengl, Kuffel: High Voltage Engineering, Fundamentals",
  edition: "2nd ed. (2000)",
  clause: "ch. 3, resistor column with stray capacitance to earth",
  status: "from memory",
};

/** Share of the wanted uncertainty that one systematic effect may take: surface leakage, the fall of a bare string at the band's top. */
export const systematicShare = 0.2;
/** Greatest deviation for which the first-order fall x²/180 is used (x = 1.5). */
export const firstOrderLimit = 1.5 ** 2 / 180;

/** Every bound of the resistance window. */
export const windowFormulas = {
  sourceSag: formula({
    id: "sizing.sourceSag",
    title: "Least R1 by source sag",
    statement: "{=} = {Rsrc} · (1 / {e} − 1)",
    result: least,
    inputs: { Rsrc: ohm("R_src", "source resistance"), e: one("ε", "sag that is accepted") },
    holds: "Linear source; a regulated supply has next to no resistance up to its current limit.",
    source: computedHere("source resistance in series with the divider"),
    compute: ({ Rsrc, e }) => Rsrc * (1 / e - 1),
  }),
  dissipation: formula({
    id: "sizing.dissipation",
    title: "Least R1 by dissipation",
    statement: "{=} = {V}² / {P}",
    result: least,
    inputs: {
      V: V("V_rms,max", "greatest voltage, rms"),
      P: { symbol: "P", unit: "W", meaning: "greatest dissipation accepted" },
    },
    holds: "Mean over time.",
    source: computedHere("Joule's law"),
    compute: ({ V, P }) => (V * V) / P,
  }),
  currentLimit: formula({
    id: "sizing.currentLimit",
    title: "Least R1 by the source's current limit",
    statement: "{=} = {V} / ({k} · {I})",
    result: least,
    inputs: {
      V: V("V_pk", "working voltage, peak"),
      k: one("k", "share of the limit, 0.2"),
      I: { symbol: "I_lim", unit: "A", meaning: "current limit of the source" },
    },
    holds: "A regulated supply stays in regulation up to its limit, then folds.",
    source: practice("at most a fifth of the supply's limit"),
    compute: ({ V, k, I }) => V / (k * I),
  }),
  leakage: formula({
    id: "sizing.leakage",
    title: "Greatest R1 by leakage across the string",
    statement: "{=} = {k} · {U} · {Rleak}",
    result: greatest,
    inputs: {
      k: one("k", "share of the wanted uncertainty, one fifth"),
      U,
      Rleak: ohm("R_leak", "insulation resistance across the whole string"),
    },
    holds:
      "Surface leakage in parallel with the string makes it read high by R1 / R_leak; it changes with dirt and humidity.",
    source: practice("one systematic effect takes at most a fifth of the wanted uncertainty"),
    compute: ({ k, U, Rleak }) => k * U * Rleak,
  }),
  leastCurrent: formula({
    id: "sizing.leastCurrent",
    title: "Greatest R1 by least string current",
    statement: "{=} = {V} / {I}",
    result: greatest,
    inputs: {
      V: V("V", "working voltage: dc or rms, the peak for pulses"),
      I: { symbol: "I_min", unit: "A", meaning: "least string current" },
    },
    holds: "Bias currents, noise and pick-up become noticeable below.",
    source: practice("least string current by the engineer's policy"),
    compute: ({ V, I }) => V / I,
  }),
  existence: formula({
    id: "sizing.existence",
    title: "Greatest R1 for which an LV arm exists",
    statement: "{=} = ({F} / (1 + {Rs} / {Rm}) − 1) / (1 / ({Rs} + {Rm}) + {G})",
    result: greatest,
    inputs: { F, Rm, Rs, G },
    holds: "Above it the instrument alone divides by more than the wanted scale factor.",
    source: computedHere("scale factor > 1 + R1/Rm"),
    compute: ({ F, Rm, Rs, G }) => {
      const over = F / (1 + Rs / Rm) - 1;
      return over > 0 ? over / (1 / (Rs + Rm) + G) : null;
    },
  }),
  instrumentShare: formula({
    id: "sizing.instrumentShare",
    title: "Greatest R1 by the instrument's share",
    statement: "{=} = ({F} / (1 + {Rs} / {Rm}) − 1) · ({Rs} + {Rm}) · {U} / (2 · {s})",
    result: greatest,
    inputs: { F, Rm, Rs, U, s: one("s_m", "half-width of the instrument's resistance, relative") },
    holds: "The share R2p/Rm of the instrument times its half-width takes at most half of the wanted uncertainty.",
    source: practice("half of the wanted uncertainty for the instrument's resistance"),
    compute: ({ F, Rm, Rs, U, s }) => {
      const over = F / (1 + Rs / Rm) - 1;
      return over > 0 ? (over * (Rs + Rm) * U) / (2 * s) : null;
    },
  }),
  lvArmValue: formula({
    id: "sizing.lvArmValue",
    title: "Greatest R1 for which the LV arm can be bought",
    statement: "{=} = ({F} / (1 + {Rs} / {Rm}) − 1) / (2 / {R} + 1 / ({Rs} + {Rm}) + {G})",
    result: greatest,
    inputs: { F, Rm, Rs, G, R: ohm("R_max", "largest resistor sold for the LV arm") },
    holds: "Two equal branches in parallel, each of the largest value sold.",
    source: computedHere("the scale factor solved for R1"),
    compute: ({ F, Rm, Rs, G, R }) => {
      const over = F / (1 + Rs / Rm) - 1;
      return over > 0 ? over / (2 / R + 1 / (Rs + Rm) + G) : null;
    },
  }),
  band: formula({
    id: "sizing.band",
    title: "Greatest R1 of a string without capacitors, by the band",
    statement: "{=} = √(180 · {e}) / (2π · {f} · {Ce})",
    result: greatest,
    inputs: {
      e: one("ε", "deviation accepted at the band's top"),
      f: { symbol: "f", unit: "Hz", meaning: "top of the band" },
      Ce: { symbol: "C_e", unit: "F", meaning: "stray capacitance of the column to earth" },
    },
    holds: "Bare string, first-order fall x²/180 with x = ω·R1·Ce up to 1.5.",
    source: kuffel,
    compute: ({ e, f, Ce }) => Math.sqrt(180 * e) / (2 * Math.PI * f * Ce),
  }),
  lvPole: formula({
    id: "sizing.lvPole",
    title: "Greatest R1 of a divider without capacitors, by cable and instrument",
    statement: "{=} = ({F} / (1 + {Rs} / {Rm}) − 1) · √(2 · {e}) / (2π · {f} · {C})",
    result: greatest,
    inputs: {
      F,
      Rm,
      Rs,
      e: one("ε", "deviation accepted at the band's top"),
      f: { symbol: "f", unit: "Hz", meaning: "top of the band" },
      C: { symbol: "C_b", unit: "F", meaning: "cable, instrument and protectors" },
    },
    holds:
      "One pole of the LV arm with what lies beside it, first-order fall (f/f_p)²/2; capacitors in both arms lift it.",
    source: computedHere("first order of 1/√(1 + (f/f_p)²)"),
    compute: ({ F, Rm, Rs, e, f, C }) => {
      const over = F / (1 + Rs / Rm) - 1;
      return over > 0 && C > 0 ? (over * Math.sqrt(2 * e)) / (2 * Math.PI * f * C) : null;
    },
  }),
  share: formula({
    id: "sizing.share",
    title: "Share of the wanted uncertainty for one systematic effect",
    statement: "{=} = min({k} · {U}, {m})",
    result: one("ε", "deviation accepted"),
    inputs: { k: one("k", "one fifth"), U, m: one("ε_m", "end of the first-order rule, 0.0125") },
    holds: "Kept within the range of the first-order rule.",
    source: practice("one systematic effect takes at most a fifth of the wanted uncertainty"),
    compute: ({ k, U, m }) => Math.min(k * U, m),
  }),
};

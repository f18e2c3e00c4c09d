import { formula } from "../standards/formula.ts";
import { computedHere, practice, type Source } from "../standards/source.ts";

const ohm = (symbol: string, meaning: string) => ({ symbol, unit: "ohm", meaning });
const V = (symbol: string, meaning: string) => ({ symbol, unit: "V", meaning });
const m = (symbol: string, meaning: string) => ({ symbol, unit: "m", meaning });
const one = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });
const n = one("n", "elements in series");
const p = one("p", "strings in parallel");
const jcgm100: Source = {
  title: "JCGM 100",
  edition: "2008",
  clause: "4.3.7 rectangular distribution, 5.1.2 combined standard uncertainty",
  status: "figures from a secondary copy, primary not seen",
};
const iec60115: Source = {
  title: "IEC 60115-1",
  edition: "ed. 5 (2020)",
  clause: "limiting element voltage, rated dissipation",
  status: "from memory",
};

/** The figures that a candidate is judged on, per candidate. */
export const candidateFormulas = {
  hvArm: formula({
    id: "sizing.hvArm",
    title: "HV arm resistance of the candidate",
    statement: "{=} = {n} · {Re} / {p}",
    result: ohm("R_1", "HV arm resistance"),
    inputs: { n, Re: ohm("R_e", "element resistance"), p },
    holds: "Equal elements.",
    source: computedHere("series sum, equal strings in parallel"),
    compute: ({ n, Re, p }) => (n * Re) / p,
  }),
  inputResistance: formula({
    id: "sizing.inputResistance",
    title: "Input resistance of the candidate",
    statement: "{=} = {R1} · (1 + 1 / ({F} / (1 + {Rs} / {Rm}) − 1))",
    result: ohm("R_in", "input resistance"),
    inputs: {
      R1: ohm("R_1", "HV arm resistance"),
      F: one("F", "wanted scale factor"),
      Rs: ohm("R_s", "series protector"),
      Rm: ohm("R_m", "input resistance of the instrument"),
    },
    holds: "LV arm set to the wanted scale factor.",
    source: computedHere("series sum with the LV arm that gives the scale factor"),
    compute: ({ R1, F, Rs, Rm }) => R1 * (1 + 1 / (F / (1 + Rs / Rm) - 1)),
  }),
  elementVoltage: formula({
    id: "sizing.elementVoltage",
    title: "Voltage of one element",
    statement: "{=} = {V} · {R1} / ({n} · {Rin})",
    result: V("V_e", "voltage across one element"),
    inputs: {
      V: V("V", "voltage at the electrode"),
      R1: ohm("R_1", "HV arm resistance"),
      n,
      Rin: ohm("R_in", "input resistance"),
    },
    holds: "Equal elements share equally.",
    source: computedHere("series resistors share the voltage as their values"),
    compute: ({ V, R1, n, Rin }) => (V * R1) / (n * Rin),
  }),
  elementDissipation: formula({
    id: "sizing.elementDissipation",
    title: "Dissipation of one element",
    statement: "{=} = {V}² / {Re}",
    result: { symbol: "P_e", unit: "W", meaning: "dissipation of one element at the greatest voltage" },
    inputs: { V: V("V_e", "element voltage, rms, at the greatest voltage"), Re: ohm("R_e", "element resistance") },
    holds: "Steady or repeated; single shots are judged by energy.",
    source: computedHere("Joule's law"),
    compute: ({ V, Re }) => (V * V) / Re,
  }),
  loading: formula({
    id: "sizing.loading",
    title: "Sag at the source",
    statement: "{=} = {Rsrc} / ({Rsrc} + {Rin})",
    result: one("ε", "relative sag"),
    inputs: { Rsrc: ohm("R_src", "source resistance"), Rin: ohm("R_in", "input resistance") },
    holds: "Linear source.",
    source: computedHere("source resistance in series with the divider"),
    compute: ({ Rsrc, Rin }) => Rsrc / (Rsrc + Rin),
  }),
  columnLength: formula({
    id: "sizing.columnLength",
    title: "Length of the column",
    statement: "{=} = max({n} · {pitch}, {need})",
    result: m("l", "column length"),
    inputs: {
      n,
      pitch: m("a", "body and lead space, or the capacitor across it where longer"),
      need: m("l_min", "length that insulation demands"),
    },
    holds: "Straight column. Where insulation demands more the pitch grows evenly.",
    source: practice("elements in one straight line"),
    compute: ({ n, pitch, need }) => Math.max(n * pitch, need),
  }),
  partsUncertainty: formula({
    id: "sizing.partsUncertainty",
    title: "Uncertainty of the string from its parts, k = 2",
    statement: "{=} = 2 · √({t}²/(3·{n}·{p}) + ({t}/3)² + (({s}·{tc})² + ({kv}·{Ve})²)/3)",
    result: one("U_1", "relative expanded uncertainty of the HV arm"),
    inputs: {
      t: one("t", "tolerance, relative half-width"),
      n,
      p,
      s: { symbol: "ΔT", unit: "K", meaning: "half-width of the ambient span" },
      tc: { symbol: "α", unit: "1/K", meaning: "temperature coefficient" },
      kv: { symbol: "k_v", unit: "1/V", meaning: "voltage coefficient" },
      Ve: V("V_e", "element voltage at working voltage, peak"),
    },
    holds:
      "Rectangular tolerances with a lot term of a third: parts of one reel are not independent. LV arm and instrument come on top.",
    source: jcgm100,
    compute: ({ t, n, p, s, tc, kv, Ve }) =>
      2 * Math.sqrt((t * t) / (3 * n * p) + (t / 3) ** 2 + ((s * tc) ** 2 + (kv * Ve) ** 2) / 3),
  }),
  leastCount: formula({
    id: "sizing.leastCount",
    title: "Least number of elements",
    statement: "{=} = the largest of ⌈{V}/({dv}·{Vlim})⌉, ⌈{R1}/{Rmax}⌉, ⌈({Vrms}²/{R1})/({dp}·{P})⌉",
    result: n,
    inputs: {
      V: V("V", "greatest voltage"),
      dv: one("d_v", "voltage derating"),
      Vlim: V("V_lim", "limiting element voltage"),
      R1: ohm("R_1", "HV arm resistance"),
      Rmax: ohm("R_e,max", "largest element sold"),
      Vrms: V("V_rms", "greatest voltage, rms"),
      dp: one("d_p", "dissipation derating"),
      P: { symbol: "P", unit: "W", meaning: "dissipation allowed at the ambient" },
    },
    holds: "One string; the whole voltage counted on it; creepage and clearance come on top.",
    source: iec60115,
    compute: ({ V, dv, Vlim, R1, Rmax, Vrms, dp, P }) =>
      Math.max(wholeUp(V / (dv * Vlim)), wholeUp(R1 / Rmax), wholeUp((Vrms * Vrms) / R1 / (dp * P))),
  }),
};

/** Smallest whole number not below x; a limit met to 1 part in 1e12 is met. */
export const wholeUp = (x: number): number => Math.max(1, Math.ceil(x * (1 - 1e-12)));

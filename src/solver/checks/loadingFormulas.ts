import { formula } from "../standards/formula.ts";
import { computedHere, practice } from "../standards/source.ts";

const ohm = (symbol: string, meaning: string) => ({ symbol, unit: "ohm", meaning });
const V = (symbol: string, meaning: string) => ({ symbol, unit: "V", meaning });
const one = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });
const Rin = ohm("R_in", "input resistance of the divider");

export const loadingFormulas = {
  inputResistance: formula({
    id: "loading.inputResistance",
    title: "Input resistance",
    statement: "{=} = {R1} + {R2p}",
    result: Rin,
    inputs: { R1: ohm("R_1", "HV arm resistance"), R2p: ohm("R_2p", "LV arm with instrument") },
    holds: "dc.",
    source: computedHere("series sum"),
    compute: ({ R1, R2p }) => R1 + R2p,
  }),
  current: formula({
    id: "loading.current",
    title: "Input current",
    statement: "{=} = {V} / {Rin}",
    result: { symbol: "I", unit: "A", meaning: "current through the string" },
    inputs: { V: V("V_pk", "working voltage, peak"), Rin },
    holds: "Resistive part; the capacitive part of an edge comes on top.",
    source: computedHere("Ohm's law"),
    compute: ({ V, Rin }) => V / Rin,
  }),
  dissipation: formula({
    id: "loading.dissipation",
    title: "Dissipation of the whole divider",
    statement: "{=} = {V}² / {Rin}",
    result: { symbol: "P", unit: "W", meaning: "dissipation at working voltage" },
    inputs: { V: V("V_rms", "working voltage, rms"), Rin },
    holds: "Mean over time; zero for single shots.",
    source: computedHere("Joule's law"),
    compute: ({ V, Rin }) => (V * V) / Rin,
  }),
  lvDissipation: formula({
    id: "loading.lvDissipation",
    title: "Dissipation of the LV arm",
    statement: "{=} = ({V} · {R2p} / {Rin})² / {R2}",
    result: { symbol: "P_2", unit: "W", meaning: "dissipation of the LV resistors at the greatest voltage" },
    inputs: {
      V: V("V_rms", "rms at the greatest voltage"),
      R2p: ohm("R_2p", "LV arm with instrument"),
      Rin,
      R2: ohm("R_2", "LV arm resistance fitted"),
    },
    holds: "Mean over time.",
    source: computedHere("Joule's law at the tap"),
    compute: ({ V, R2p, Rin, R2 }) => ((V * R2p) / Rin) ** 2 / R2,
  }),
  sag: formula({
    id: "loading.sag",
    title: "Sag of the source under the divider",
    statement: "{=} = {Rs} / ({Rs} + {Rin})",
    result: one("ε", "relative sag"),
    inputs: { Rs: ohm("R_src", "source resistance"), Rin },
    holds: "Linear source.",
    source: computedHere("source resistance in series with the divider"),
    compute: ({ Rs, Rin }) => Rs / (Rs + Rin),
  }),
  currentAllowed: formula({
    id: "loading.currentAllowed",
    title: "Current the divider may draw",
    statement: "{=} = {k} · {I}",
    result: { symbol: "I_max", unit: "A", meaning: "a fifth of the source's limit" },
    inputs: {
      k: one("k", "share of the limit, 0.2"),
      I: { symbol: "I_lim", unit: "A", meaning: "current limit of the source" },
    },
    holds: "A regulated supply stays in regulation up to its limit, then folds.",
    source: practice("at most a fifth of the supply's limit"),
    compute: ({ k, I }) => k * I,
  }),
  reading: formula({
    id: "loading.reading",
    title: "Reading of the instrument",
    statement: "{=} = {s} · {V} / {F}",
    result: V("v", "voltage at the instrument"),
    inputs: {
      s: one("s", "polarity: −1 for a negative voltage that is not read as rms"),
      V: V("V", "voltage at the electrode"),
      F: one("F", "scale factor"),
    },
    holds: "Within the divider's band.",
    source: computedHere("scale factor: input over output"),
    compute: ({ s, V, F }) => (s * V) / F,
  }),
};

import { formula } from "../standards/formula.ts";
import { computedHere, type Source } from "../standards/source.ts";

const ohm = (symbol: string, meaning: string) => ({ symbol, unit: "ohm", meaning });
const one = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });
const siemens = { symbol: "G_p", unit: "S", meaning: "leakage of the protectors" };
const R1 = ohm("R_1", "HV arm resistance");
const R2p = ohm("R_2p", "LV arm with instrument and protectors in parallel");
const Rm = ohm("R_m", "input resistance of the instrument");
const Rs = ohm("R_s", "series protector");
const F = one("F", "scale factor");
const iec60060: Source = {
  title: "IEC 60060-2",
  edition: "ed. 3 (2010)",
  clause: "scale factor: input over output",
  status: "from memory",
};
const jcgm100: Source = {
  title: "JCGM 100",
  edition: "2008",
  clause: "4.3.7 rectangular distribution, 5.1.2 combined standard uncertainty",
  status: "figures from a secondary copy, primary not seen",
};

export const scaleFactorFormulas = {
  hvArm: formula<"p", "Re">({
    id: "scaleFactor.hvArm",
    title: "HV arm resistance",
    statement: "{=} = Σ {Re} / {p}",
    result: R1,
    inputs: { Re: ohm("R_e", "element resistances"), p: one("p", "strings in parallel") },
    arrays: ["Re"],
    holds: "Values as marked; voltage and temperature are counted apart.",
    source: computedHere("series sum, equal strings in parallel"),
    compute: ({ Re, p }) => Re.reduce((sum, R) => sum + R, 0) / p,
  }),
  withInstrument: formula({
    id: "scaleFactor.withInstrument",
    title: "LV arm as the string sees it",
    statement: "1 / {=} = 1 / {R2} + 1 / ({Rs} + {Rm}) + {G}",
    result: R2p,
    inputs: { R2: ohm("R_2", "LV arm resistance fitted"), Rm, Rs, G: siemens },
    holds: "dc.",
    source: computedHere("parallel sum"),
    compute: ({ R2, Rm, Rs, G }) => 1 / (1 / R2 + 1 / (Rs + Rm) + G),
  }),
  instrumentAlone: formula({
    id: "scaleFactor.instrumentAlone",
    title: "The instrument as the LV arm",
    statement: "1 / {=} = 1 / ({Rs} + {Rm}) + {G}",
    result: R2p,
    inputs: { Rm, Rs, G: siemens },
    holds: "dc; no LV resistor is fitted.",
    source: computedHere("parallel sum"),
    compute: ({ Rm, Rs, G }) => 1 / (1 / (Rs + Rm) + G),
  }),
  predicted: formula({
    id: "scaleFactor.predicted",
    title: "Scale factor, predicted",
    statement: "{=} = (1 + {R1} / {R2p}) · (1 + {Rs} / {Rm})",
    result: F,
    inputs: { R1, R2p, Rs, Rm },
    holds: "dc, for this instrument on this range and function only.",
    source: iec60060,
    compute: ({ R1, R2p, Rs, Rm }) => (1 + R1 / R2p) * (1 + Rs / Rm),
  }),
  wantedLvArm: formula({
    id: "scaleFactor.wantedLvArm",
    title: "LV arm resistance for the wanted scale factor",
    statement: "1 / {=} = ({F} / (1 + {Rs} / {Rm}) − 1) / {R1} − 1 / ({Rs} + {Rm}) − {G}",
    result: ohm("R_2", "LV arm resistance wanted"),
    inputs: { F: one("F", "wanted scale factor"), R1, Rm, Rs, G: siemens },
    holds: "Exists only where the wanted scale factor exceeds 1 + R1/Rm: the instrument alone divides by that much.",
    source: computedHere("the scale factor solved for the LV arm"),
    compute: ({ F, R1, Rm, Rs, G }) => {
      const conductance = (F / (1 + Rs / Rm) - 1) / R1 - 1 / (Rs + Rm) - G;
      return conductance > 0 ? 1 / conductance : null;
    },
  }),
  deviation: formula({
    id: "scaleFactor.deviation",
    title: "Deviation from the wanted scale factor",
    statement: "{=} = {F} / {W} − 1",
    result: one("δ", "deviation"),
    inputs: { F, W: one("F_w", "wanted scale factor") },
    holds: "dc.",
    source: computedHere("relative difference"),
    compute: ({ F, W }) => F / W - 1,
  }),
  instrumentShare: formula({
    id: "scaleFactor.instrumentShare",
    title: "Share of the scale factor that belongs to the instrument",
    statement: "{=} = {R2p} / ({Rs} + {Rm})",
    result: one("s_m", "relative change of the scale factor per relative change of the instrument's resistance"),
    inputs: { R2p, Rs, Rm },
    holds: "Scale factor large against 1.",
    source: computedHere("derivative of the scale factor by the instrument's resistance"),
    compute: ({ R2p, Rs, Rm }) => R2p / (Rs + Rm),
  }),
  voltageShift: formula<"F", "Re" | "kv" | "Ve">({
    id: "scaleFactor.voltageShift",
    title: "Shift of the scale factor by voltage coefficient",
    statement: "{=} = (1 − 1/{F}) · Σ({kv} · {Ve} · {Re}) / Σ {Re}",
    result: one("δF_v", "relative shift at working voltage"),
    inputs: {
      F,
      Re: ohm("R_e", "element resistances"),
      kv: { symbol: "k_v", unit: "1/V", meaning: "voltage coefficient, signed" },
      Ve: { symbol: "V_e", unit: "V", meaning: "element voltage, peak" },
    },
    arrays: ["Re", "kv", "Ve"],
    holds: "First order; typical coefficient of the family.",
    source: computedHere("R = R_0 (1 + k_v V) along the string"),
    compute: ({ F, Re, kv, Ve }) => {
      const weighted = Re.reduce((sum, R, i) => sum + R * kv[i]! * Ve[i]!, 0);
      return ((1 - 1 / F) * weighted) / Re.reduce((sum, R) => sum + R, 0);
    },
  }),
  stringTolerance: formula<"lots", "Re" | "t">({
    id: "scaleFactor.stringTolerance",
    title: "String: standard uncertainty from tolerance",
    statement: "{=}² = Σ({Re}·{t})² / (3·{lots}·(Σ {Re})²) + (Σ {Re}·{t} / (3·Σ {Re}))²",
    result: one("u_1", "relative standard uncertainty of the HV arm"),
    inputs: {
      lots: one("p", "strings in parallel"),
      Re: ohm("R_e", "element resistances"),
      t: one("t", "tolerance, relative half-width"),
    },
    arrays: ["Re", "t"],
    holds:
      "Rectangular tolerances, plus a lot term of a third of the tolerance: parts of one reel are not independent.",
    source: jcgm100,
    compute: ({ lots, Re, t }) => {
      const sum = Re.reduce((total, R) => total + R, 0);
      const squares = Re.reduce((total, R, i) => total + (R * t[i]!) ** 2, 0);
      const lot = Re.reduce((total, R, i) => total + R * t[i]!, 0) / (3 * sum);
      return Math.sqrt(squares / (3 * lots * sum * sum) + lot * lot);
    },
  }),
  uncertainty: formula({
    id: "scaleFactor.uncertainty",
    title: "Uncertainty of the scale factor from parts, k = 2",
    statement: "{=} = 2 · √((1 − 1/{F})² · ({u1}² + {u2}² + {uT}²/3 + {kv}²/3) + ({s}·{um})²/3)",
    result: one("U", "relative expanded uncertainty"),
    inputs: {
      F,
      u1: one("u_1", "string, relative standard uncertainty"),
      u2: one("u_2", "LV arm, relative standard uncertainty"),
      uT: one("a_T", "half-width by temperature"),
      kv: one("a_v", "half-width by voltage coefficient"),
      s: one("s_m", "instrument's share"),
      um: one("a_m", "half-width of the instrument's resistance"),
    },
    holds: "Before building; measured parts and a calibration replace these terms.",
    source: jcgm100,
    compute: ({ F, u1, u2, uT, kv, s, um }) =>
      2 * Math.sqrt((1 - 1 / F) ** 2 * (u1 * u1 + u2 * u2 + (uT * uT + kv * kv) / 3) + (s * um) ** 2 / 3),
  }),
  temperatureHalfWidth: formula<"s", "Re" | "tc">({
    id: "scaleFactor.temperatureHalfWidth",
    title: "Temperature: half-width of the string",
    statement: "{=} = {s} · Σ({Re}·|{tc}|) / Σ {Re}",
    result: one("a_T", "relative half-width"),
    inputs: {
      s: { symbol: "ΔT", unit: "K", meaning: "half-width of the ambient span" },
      Re: ohm("R_e", "element resistances"),
      tc: { symbol: "α", unit: "1/K", meaning: "temperature coefficient" },
    },
    arrays: ["Re", "tc"],
    holds: "The LV arm is not assumed to follow the string.",
    source: computedHere("worst half-width of the string over the ambient span"),
    compute: ({ s, Re, tc }) =>
      (s * Re.reduce((sum, R, i) => sum + R * Math.abs(tc[i]!), 0)) / Re.reduce((sum, R) => sum + R, 0),
  }),
};

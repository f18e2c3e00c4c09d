import type { Cure } from "../standards/finding.ts";
import { formula } from "../standards/formula.ts";
import { computedHere, practice } from "../standards/source.ts";
import { type Judging, judgeLimit, plainFinding } from "./judging.ts";
import type { Show } from "./show.ts";

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
    statement: "{=} = {V} / {F}",
    result: V("v", "voltage at the instrument"),
    inputs: { V: V("V", "voltage at the electrode"), F: one("F", "scale factor") },
    holds: "Within the divider's band.",
    source: computedHere("scale factor: input over output"),
    compute: ({ V, F }) => V / F,
  }),
};

/** What the instrument shows of the waveform: dc, rms, or the peak on a scope. */
export function readingBasis(j: Judging): "working.dc_V" | "working.rms_V" | "working.peak_V" {
  const { function: kind } = j.instrument;
  if (kind.startsWith("scope")) return "working.peak_V";
  if (kind.endsWith(" ac")) return "working.rms_V";
  return j.document.brief.waveform.kind === "dc" ? "working.dc_V" : "working.peak_V";
}

/** Writes `input.*`, `source.sag`, `reading.*`. */
export function loading(j: Judging): void {
  const { sheet, document } = j;
  const f = loadingFormulas;
  const { source } = document.brief;
  sheet.given("/brief/source/resistance_ohm", source.resistance_ohm);
  sheet.derive("input.resistance_ohm", f.inputResistance, {
    R1: "hvArm.resistance_ohm",
    R2p: "lvArm.withInstrument_ohm",
  });
  const Rin = "input.resistance_ohm";
  sheet.derive("input.current_A", f.current, { V: "working.peak_V", Rin });
  sheet.derive("input.dissipation_W", f.dissipation, { V: "working.rms_V", Rin });
  sheet.derive("lvArm.dissipation_W", f.lvDissipation, {
    V: "working.greatestRms_V",
    R2p: "lvArm.withInstrument_ohm",
    Rin,
    R2: "lvArm.fitted_ohm",
  });
  sheet.derive("source.sag", f.sag, { Rs: "/brief/source/resistance_ohm", Rin });
  const F = "scaleFactor.predicted";
  sheet.derive("reading.atWorking_V", f.reading, { V: readingBasis(j), F });
  sheet.derive("reading.atGreatest_Vpeak", f.reading, { V: "working.greatest_Vpeak", F });
}

const sizeAgain: Cure = { label: "size again", edits: [], sizeAgain: true };

export function judgeLoading(j: Judging, show: Show): void {
  const { sheet, document, instrument } = j;
  const { source, policy, wantedUncertainty } = document.brief;
  sheet.given("/brief/policy/allowedSag", policy.allowedSag ?? wantedUncertainty);
  judgeLimit(
    j,
    {
      id: "source.sag",
      what: "source sag",
      path: "source.sag",
      limitPath: "/brief/policy/allowedSag",
      unit: "1",
      sense: "atMost",
      statedMargin: 0,
      reason: (actual, limit) =>
        `The divider pulls the source down by ${actual}; ${limit} is accepted. ` +
        "More HV arm resistance lowers it, or correct for it with the two-load method.",
      source: loadingFormulas.sag.source,
      cure: sizeAgain,
    },
    show,
  );
  if (source.currentLimit_A !== null && source.currentLimit_A > 0) {
    sheet.given("/brief/source/currentLimit_A", source.currentLimit_A);
    sheet.given("/brief/source/currentLimit_A:share", 0.2);
    sheet.derive("source.currentAllowed_A", loadingFormulas.currentAllowed, {
      k: "/brief/source/currentLimit_A:share",
      I: "/brief/source/currentLimit_A",
    });
    judgeLimit(
      j,
      {
        id: "source.current",
        what: "current drawn from the source",
        path: "input.current_A",
        limitPath: "source.currentAllowed_A",
        unit: "A",
        sense: "atMost",
        statedMargin: 0,
        reason: (actual, limit) => `The divider draws ${actual}; a fifth of the source's limit is ${limit}.`,
        source: loadingFormulas.currentAllowed.source,
        cure: sizeAgain,
      },
      show,
    );
  }
  const at = document.instruments.indexOf(instrument);
  sheet.given(`/instruments/${at}/greatestInput_Vpeak`, instrument.greatestInput_Vpeak);
  judgeLimit(
    j,
    {
      id: "instrument.input",
      what: "voltage at the instrument",
      path: "reading.atGreatest_Vpeak",
      limitPath: `/instruments/${at}/greatestInput_Vpeak`,
      unit: "V",
      sense: "atMost",
      statedMargin: 0.2,
      reason: (actual, limit) => `${instrument.name} sees ${actual} at the greatest peak and may see ${limit}.`,
      source: practice("a quarter above the greatest reading is left free"),
      cure: {
        label: "ten times the scale factor",
        edits: [{ pointer: "/brief/scaleFactor", value: document.brief.scaleFactor * 10 }],
      },
    },
    show,
  );
  sheet.given(`/instruments/${at}/range_V`, instrument.range_V);
  judgeLimit(
    j,
    {
      id: "instrument.range",
      what: "reading within the locked range",
      path: "reading.atWorking_V",
      limitPath: `/instruments/${at}/range_V`,
      unit: "V",
      sense: "atMost",
      statedMargin: 0,
      reason: (actual, limit) => `The reading at working voltage is ${actual} on the ${limit} range. Lock the range.`,
      source: practice("lock the range: another range may have another input resistance"),
    },
    show,
  );
  if (instrument.readingAccuracy > wantedUncertainty) {
    plainFinding(j, {
      id: "instrument.accuracy",
      level: "stop",
      what: "wanted uncertainty against the instrument's own",
      actual: instrument.readingAccuracy,
      limit: wantedUncertainty,
      unit: "1",
      sense: "atMost",
      margin: 1 - instrument.readingAccuracy / wantedUncertainty,
      reason: `${instrument.name} reads within ${show(instrument.readingAccuracy, "1")}, ${show(wantedUncertainty, "1")} is wanted: no divider can repair that.`,
      source: practice("a measurement is no better than its instrument"),
    });
  }
}

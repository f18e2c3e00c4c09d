import type { Cure } from "../standards/finding.ts";
import { practice } from "../standards/source.ts";
import { type Judging, judgeLimit, plainFinding } from "./judging.ts";
import { loadingFormulas } from "./loadingFormulas.ts";
import type { Show } from "./show.ts";
import { wantedOf } from "./wanted.ts";

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
  const basis = readingBasis(j);
  const negative = document.brief.waveform.nominal_V < 0 && basis !== "working.rms_V";
  sheet.given("/brief/waveform/nominal_V:polarity", negative ? -1 : 1);
  sheet.given("/brief/waveform/nominal_V:magnitude", 1);
  sheet.derive("reading.atWorking_V", f.reading, { s: "/brief/waveform/nominal_V:polarity", V: basis, F });
  sheet.derive("reading.magnitude_V", f.reading, { s: "/brief/waveform/nominal_V:magnitude", V: basis, F });
  sheet.derive("reading.atGreatest_Vpeak", f.reading, {
    s: "/brief/waveform/nominal_V:magnitude",
    V: "working.greatest_Vpeak",
    F,
  });
}

const sizeAgain: Cure = { label: "size again", edits: [], sizeAgain: true };

/** Findings on what the divider takes from the source, and on what the instrument sees and can tell. */
export function judgeLoading(j: Judging, show: Show): void {
  const { sheet, document, instrument } = j;
  const { source, policy } = document.brief;
  const wanted = wantedOf(document.brief);
  const allowed = policy.allowedSag ?? wanted;
  sheet.given("/brief/policy/allowedSag", allowed);
  const sagging = sheet.number("source.sag") ?? 0;
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
        (sagging > 0.5
          ? `More than half is lost: it cannot be read. Raise R1 above ${show(source.resistance_ohm * (1 / (allowed ?? 1) - 1), "ohm")}.`
          : "More HV arm resistance lowers it, or correct for it with the two-load method."),
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
      path: "reading.magnitude_V",
      limitPath: `/instruments/${at}/range_V`,
      unit: "V",
      sense: "atMost",
      statedMargin: 0,
      reason: (actual, limit) => `The reading at working voltage is ${actual} on the ${limit} range. Lock the range.`,
      source: practice("lock the range: another range may have another input resistance"),
    },
    show,
  );
  if (instrument.readingAccuracy === 0) {
    plainFinding(j, {
      id: "instrument.accuracyNotStated",
      level: "caution",
      what: "accuracy of the instrument not stated",
      reason:
        "0 would be a claim of perfection: it counts as not stated. Type the accuracy of the reading, at least its resolution.",
      source: practice("a measurement is no better than its instrument"),
    });
  }
  if (wanted === null) {
    plainFinding(j, {
      id: "uncertainty.notStated",
      level: "caution",
      what: "wanted uncertainty not stated",
      reason:
        "0 would be a claim of perfection: it counts as not stated, and nothing is judged by it. Type it, e.g. 3 %.",
      source: practice("a measurement is no better than its instrument"),
    });
  } else if (instrument.readingAccuracy > wanted) {
    plainFinding(j, {
      id: "instrument.accuracy",
      level: "stop",
      what: "wanted uncertainty against the instrument's own",
      actual: instrument.readingAccuracy,
      limit: wanted,
      unit: "1",
      sense: "atMost",
      margin: 1 - instrument.readingAccuracy / wanted,
      reason: `${instrument.name} reads within ${show(instrument.readingAccuracy, "1")}, ${show(wanted, "1")} is wanted: no divider can repair that.`,
      source: practice("a measurement is no better than its instrument"),
    });
  }
}

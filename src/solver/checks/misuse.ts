import type { Edit } from "../standards/finding.ts";
import { computedHere, practice, type Source } from "../standards/source.ts";
import { type Judging, plainFinding } from "./judging.ts";
import { mains } from "./mains.ts";
import { pulseTrain } from "./pulseTrain.ts";
import type { Show } from "./show.ts";

const iec60664: Source = {
  title: "IEC 60664-1",
  edition: "ed. 3 (2020)",
  clause: "table A.2, to 20 000 m",
  status: "figures from a secondary copy, primary not seen",
};

/** Uses of a divider that no choice of parts repairs, and inputs that contradict each other. */
export function misuse(j: Judging, show: Show): void {
  briefMisuse(j, show);
  existence(j, show);
}

/** The same as far as the brief alone tells, whatever the design. Needs `working.*`. */
export function briefMisuse(j: Judging, show: Show): void {
  earth(j);
  mains(j);
  fiftyOhm(j, show);
  wrongFunction(j);
  voltages(j, show);
  pulseTrain(j);
  surroundings(j, show);
}

function earth(j: Judging): void {
  const { earth } = j.document.brief.source;
  if (earth === "oneSide") return;
  plainFinding(j, {
    id: "source.earth",
    level: "stop",
    what: earth === "floating" ? "a divider to earth on a floating source" : "no point of the source is earthed",
    reason:
      "A divider to earth on a floating source shorts it, measures common mode, or lifts the instrument. " +
      "Earth one side of the source, or take two matched dividers and their difference, or an isolated way.",
    source: practice("which point is earth comes first"),
    cure: { label: "one side is earthed", edits: [{ pointer: "/brief/source/earth", value: "oneSide" }] },
  });
}

function fiftyOhm(j: Judging, show: Show): void {
  const { instrument, document } = j;
  if (instrument.resistance_ohm <= 100) {
    const at = document.instruments.indexOf(instrument);
    plainFinding(j, {
      id: "instrument.fiftyOhm",
      level: "stop",
      what: "input resistance of the instrument",
      actual: instrument.resistance_ohm,
      unit: "ohm",
      reason: `${instrument.name} has ${show(instrument.resistance_ohm, "ohm")}: that becomes the LV arm, and the scale factor R1 over it. Set the input to 1 MΩ.`,
      source: computedHere("LV arm in parallel with the instrument"),
      cure: {
        label: "set the input to 1 MΩ",
        edits: [
          { pointer: `/instruments/${at}/resistance_ohm`, value: 1e6 },
          { pointer: `/instruments/${at}/function`, value: "scope 1 MΩ" },
          { pointer: `/instruments/${at}/greatestInput_Vpeak`, value: 300 },
          { pointer: `/instruments/${at}/range_V`, value: 100 },
        ],
      },
    });
  }
}

function existence(j: Judging, show: Show): void {
  const { instrument, document, sheet } = j;
  if (sheet.number("lvArm.wanted_ohm") === null) {
    const R1 = sheet.number("hvArm.resistance_ohm") as number;
    const alone = 1 + R1 / instrument.resistance_ohm;
    plainFinding(j, {
      id: "scaleFactor.existence",
      level: "stop",
      what: "wanted scale factor",
      actual: document.brief.scaleFactor,
      limit: alone,
      unit: "1",
      sense: "atLeast",
      margin: 1 - alone / document.brief.scaleFactor,
      reason:
        `No LV arm gives ${show(document.brief.scaleFactor, "1")}: the instrument alone already divides by ${show(alone, "1")}. ` +
        `Lower R1 below ${show((document.brief.scaleFactor - 1) * instrument.resistance_ohm, "ohm")} or use a larger scale factor.`,
      source: computedHere("scale factor > 1 + R1/Rm"),
      path: "lvArm.wanted_ohm",
      cure: {
        label: "ten times the scale factor",
        edits: [{ pointer: "/brief/scaleFactor", value: document.brief.scaleFactor * 10 }],
      },
    });
  }
}

/** A dc function on an alternating voltage reads its mean; an ac function on dc reads nothing; a meter cannot follow a pulse. */
function wrongFunction(j: Judging): void {
  const { instrument, document } = j;
  const { kind } = document.brief.waveform;
  const scope = instrument.function.startsWith("scope");
  if (scope || instrument.function === "data logger") return;
  const ac = instrument.function.endsWith(" ac");
  const reason =
    kind === "dc" && ac
      ? `${instrument.name} reads alternating voltage only: on dc it shows nothing while the voltage stands.`
      : kind !== "dc" && !ac
        ? `${instrument.name} reads the mean, which is nought for an alternating voltage and tells nothing of a pulse's peak.`
        : (kind === "pulse" || kind === "recorded") && ac
          ? `${instrument.name} cannot follow a pulse.`
          : null;
  if (reason === null) return;
  plainFinding(j, {
    id: "instrument.function",
    level: "stop",
    what: "function of the instrument",
    reason: `${reason} Choose another function, or an oscilloscope.`,
    source: practice("the function must fit the waveform"),
  });
}

/** An alternating voltage whose rms or peak was not stated: both consequences are said. */
function rmsOrPeak(j: Judging, show: Show): void {
  const { waveform } = j.document.brief;
  if (waveform.kind !== "sine" || j.document.origins["/brief/waveform/statedAs"] !== "assumed") return;
  const V = Math.abs(waveform.nominal_V);
  const isRms = waveform.statedAs === "rms";
  plainFinding(j, {
    id: "voltage.statedAs",
    level: "caution",
    what: "rms or peak?",
    reason:
      `${show(V, "V")} was not said to be rms or peak. As rms the string must stand ${show(V * Math.SQRT2, "V")} peak, ` +
      `as a peak ${show(V, "V")}; it is taken as ${isRms ? "rms" : "a peak"}.`,
    source: practice("state rms or peak of an alternating voltage"),
    cure: {
      label: isRms ? "it is the peak" : "it is rms",
      edits: [{ pointer: "/brief/waveform/statedAs", value: isRms ? "peak" : "rms" }],
    },
  });
}

function voltages(j: Judging, show: Show): void {
  rmsOrPeak(j, show);
  const { document, instrument } = j;
  const { waveform } = document.brief;
  const duty = (waveform.width_s ?? 0) * (waveform.repetition_Hz ?? 0);
  if (waveform.kind === "pulse" && duty > 1) {
    plainFinding(j, {
      id: "voltage.duty",
      level: "stop",
      what: "pulse width times repetition",
      actual: duty,
      limit: 1,
      unit: "1",
      sense: "atMost",
      margin: 1 - duty,
      reason: `A pulse of ${show(waveform.width_s ?? 0, "s")} cannot come ${show(waveform.repetition_Hz ?? 0, "Hz")} often: the duty is 0 to 1. Dissipation is judged as if it stood all the time.`,
      source: computedHere("duty of a pulse train"),
    });
  }
  const stated = Math.abs(waveform.nominal_V);
  if (stated === 0) {
    plainFinding(j, {
      id: "voltage.none",
      level: "stop",
      what: "no voltage is given",
      reason: "0 V is nothing to divide, and meets every limit. Type the voltage to be measured, e.g. 6 kV.",
      source: practice("a limit is met at a voltage"),
    });
    return;
  }
  const peak = j.sheet.number("working.peak_V") as number;
  if (peak * 1.25 <= instrument.greatestInput_Vpeak) {
    const edits: Edit[] = [{ pointer: "/brief/waveform/nominal_V", value: waveform.nominal_V * 1000 }];
    plainFinding(j, {
      id: "voltage.low",
      level: "caution",
      what: "a divider may not be needed",
      actual: peak,
      limit: instrument.greatestInput_Vpeak,
      unit: "V",
      sense: "atMost",
      margin: 1 - peak / instrument.greatestInput_Vpeak,
      reason: `${show(stated, "V")} is within what ${instrument.name} takes directly (${show(instrument.greatestInput_Vpeak, "V")}). Did you mean ${show(stated * 1000, "V")}? It is kept as typed.`,
      source: practice("the simplest route that survives"),
      path: "working.peak_V",
      cure: { label: `it is ${show(stated * 1000, "V")}`, edits },
    });
  }
  if (waveform.greatest_Vpeak !== null && Math.abs(waveform.greatest_Vpeak) < peak * (1 - 1e-9)) {
    plainFinding(j, {
      id: "voltage.greatest",
      level: "stop",
      what: "greatest peak below the working peak",
      actual: Math.abs(waveform.greatest_Vpeak),
      limit: peak,
      unit: "V",
      sense: "atLeast",
      margin: 1 - peak / Math.abs(waveform.greatest_Vpeak),
      reason: `The greatest peak is typed as ${show(Math.abs(waveform.greatest_Vpeak), "V")}, the working peak is ${show(peak, "V")}. Are they swapped? Sizes use the larger.`,
      source: computedHere("peak of the stated waveform"),
      path: "working.greatest_Vpeak",
      cure: {
        label: "leave the greatest peak to the default",
        edits: [{ pointer: "/brief/waveform/greatest_Vpeak", value: null }],
      },
    });
  }
}

function surroundings(j: Judging, show: Show): void {
  const { altitude_m, relativeHumidity } = j.document.brief.surroundings;
  if (altitude_m > 20000 || altitude_m < -500) {
    plainFinding(j, {
      id: "surroundings.altitude",
      level: "stop",
      what: "altitude outside the table",
      actual: altitude_m,
      limit: 20000,
      unit: "m",
      sense: "atMost",
      margin: 1 - altitude_m / 20000,
      reason: `The altitude factor is tabulated to 20 000 m and is 1 to 2000 m; ${show(altitude_m, "m")} is refused, so no clearance can be judged.`,
      source: iec60664,
    });
  }
  if (relativeHumidity > 0.7) {
    plainFinding(j, {
      id: "surroundings.humidity",
      level: "caution",
      what: "relative humidity",
      actual: relativeHumidity,
      limit: 0.7,
      unit: "1",
      sense: "atMost",
      margin: 1 - relativeHumidity / 0.7,
      reason: "Above 70 % relative humidity surface leakage shifts the scale factor of a high-resistance string.",
      source: practice("warn above 70 % relative humidity"),
    });
  }
}

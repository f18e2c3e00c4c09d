import { show } from "../checks/show.ts";
import type { Asking } from "./asking.ts";
import { bandLimit, lvPoleLimit } from "./bandLimit.ts";
import { bound, none, pathOf, percent, shareOfUncertainty, type WindowGiven } from "./bound.ts";
import type { Bound } from "./outcome.ts";
import { existence, instrumentShare, lvArmValue } from "./scaleFactorBounds.ts";
import { systematicShare, windowFormulas } from "./windowFormulas.ts";

/** Every bound of R1, each with its number on the sheet at `window.…_ohm`, or null with the reason why it does not apply. */
export function windowBounds(given: WindowGiven): Bound[] {
  return [
    sourceSag(given),
    dissipation(given),
    currentLimit(given),
    leakage(given),
    leastCurrent(given),
    existence(given),
    instrumentShare(given),
    lvArmValue(given),
    bandLimit(given),
    lvPoleLimit(given),
  ];
}

/** Sag that is accepted: as set, else the wanted uncertainty. */
export const acceptedSag = ({ j }: Asking): number =>
  j.document.brief.policy.allowedSag ?? j.document.brief.wantedUncertainty;

function sourceSag(given: WindowGiven): Bound {
  const { ask } = given;
  const { source } = ask.j.document.brief;
  const e = acceptedSag(ask);
  if (source.resistance_ohm <= 0)
    return none(given, "sourceSag", "The source is given no resistance, so it does not sag.");
  if (e <= 0)
    return none(
      given,
      "sourceSag",
      "No sag at all is accepted: no divider meets that. Accept some, or correct for it.",
    );
  ask.j.sheet.given("/brief/source/resistance_ohm", source.resistance_ohm);
  ask.j.sheet.given("/brief/policy/allowedSag", e);
  ask.j.sheet.derive(pathOf("sourceSag"), windowFormulas.sourceSag, {
    Rsrc: "/brief/source/resistance_ohm",
    e: "/brief/policy/allowedSag",
  });
  return bound(
    given,
    "sourceSag",
    (R) => `${show(source.resistance_ohm, "ohm")} of source may sag by ${percent(e)}: at least ${R}.`,
  );
}

function dissipation(given: WindowGiven): Bound {
  const { ask } = given;
  const P = ask.j.document.brief.policy.greatestDissipation_W;
  if (P === null) return none(given, "dissipation", "No greatest dissipation is set.");
  if (ask.working.greatestRms_V === 0) return none(given, "dissipation", "Single shots: no mean dissipation.");
  ask.j.sheet.given("/brief/policy/greatestDissipation_W", P);
  ask.j.sheet.derive(pathOf("dissipation"), windowFormulas.dissipation, {
    V: "working.greatestRms_V",
    P: "/brief/policy/greatestDissipation_W",
  });
  return bound(
    given,
    "dissipation",
    (R) => `At most ${show(P, "W")} in the whole divider at the greatest voltage: at least ${R}.`,
  );
}

function currentLimit(given: WindowGiven): Bound {
  const { ask } = given;
  const I = ask.j.document.brief.source.currentLimit_A;
  if (I === null || I <= 0) return none(given, "currentLimit", "No current limit of the source is stated.");
  ask.j.sheet.given("/brief/source/currentLimit_A", I);
  ask.j.sheet.given("/brief/source/currentLimit_A:share", 0.2);
  ask.j.sheet.derive(pathOf("currentLimit"), windowFormulas.currentLimit, {
    V: "working.peak_V",
    k: "/brief/source/currentLimit_A:share",
    I: "/brief/source/currentLimit_A",
  });
  return bound(given, "currentLimit", (R) => `A fifth of the source's ${show(I, "A")} may be drawn: at least ${R}.`);
}

function leakage(given: WindowGiven): Bound {
  const { ask } = given;
  const { policy, wantedUncertainty } = ask.j.document.brief;
  if (!(policy.leakageResistance_ohm > 0)) return none(given, "leakage", "No insulation resistance is assumed.");
  shareOfUncertainty(ask);
  ask.j.sheet.given("/brief/policy/leakageResistance_ohm", policy.leakageResistance_ohm);
  ask.j.sheet.derive(pathOf("leakage"), windowFormulas.leakage, {
    k: "/brief/wantedUncertainty:share",
    U: "/brief/wantedUncertainty",
    Rleak: "/brief/policy/leakageResistance_ohm",
  });
  return bound(
    given,
    "leakage",
    (R) =>
      `${show(policy.leakageResistance_ohm, "ohm")} of leakage across the string may make it read high by ` +
      `${percent(systematicShare * wantedUncertainty)}, a fifth of the wanted uncertainty: at most ${R}.`,
  );
}

function leastCurrent(given: WindowGiven): Bound {
  const { ask } = given;
  const { policy, waveform } = ask.j.document.brief;
  if (!(policy.leastCurrent_A > 0)) return none(given, "leastCurrent", "No least string current is set.");
  const pulsed = waveform.kind === "pulse" || waveform.kind === "recorded";
  ask.j.sheet.given("/brief/policy/leastCurrent_A", policy.leastCurrent_A);
  ask.j.sheet.derive(pathOf("leastCurrent"), windowFormulas.leastCurrent, {
    V: pulsed ? "working.peak_V" : "working.rms_V",
    I: "/brief/policy/leastCurrent_A",
  });
  return bound(
    given,
    "leastCurrent",
    (R) =>
      `At least ${show(policy.leastCurrent_A, "A")} through the string, for bias currents, noise and pick-up: at most ${R}.`,
  );
}

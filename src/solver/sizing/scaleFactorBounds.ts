import { show } from "../checks/show.ts";
import type { Asking } from "./asking.ts";
import { bound, none, pathOf, percent, shareOfUncertainty, type WindowGiven } from "./bound.ts";
import type { Bound } from "./outcome.ts";
import { windowFormulas } from "./windowFormulas.ts";

/** Puts what the scale-factor bounds share on the sheet and returns the paths. */
export function scaleFactorGivens({ j, at, seriesProtector_ohm, leakage_S }: Asking) {
  const Rm = `/instruments/${at}/resistance_ohm`;
  j.sheet.given("/brief/scaleFactor", j.document.brief.scaleFactor);
  j.sheet.given(Rm, j.instrument.resistance_ohm);
  j.sheet.given("/design/protectors:series_ohm", seriesProtector_ohm);
  j.sheet.given("/design/protectors:leakage_S", leakage_S);
  return { F: "/brief/scaleFactor", Rm, Rs: "/design/protectors:series_ohm", G: "/design/protectors:leakage_S" };
}

/** Above it the instrument alone divides by more than the scale factor. */
export function existence(given: WindowGiven): Bound {
  const { ask } = given;
  const { scaleFactor } = ask.j.document.brief;
  ask.j.sheet.derive(pathOf("existence"), windowFormulas.existence, scaleFactorGivens(ask));
  return bound(
    given,
    "existence",
    (R) =>
      `Above ${R} the ${show(ask.j.instrument.resistance_ohm, "ohm")} of the instrument alone divide by more than ${show(scaleFactor, "1")}.`,
  );
}

/** The instrument takes at most half of the wanted uncertainty. */
export function instrumentShare(given: WindowGiven): Bound {
  const { ask } = given;
  const { instrument, sheet } = ask.j;
  if (!(instrument.resistanceSpread > 0))
    return none(given, "instrumentShare", "The instrument's resistance is given without spread.");
  const { F, Rm, Rs } = scaleFactorGivens(ask);
  shareOfUncertainty(ask);
  const s = `/instruments/${ask.at}/resistanceSpread`;
  sheet.given(s, instrument.resistanceSpread);
  sheet.derive(pathOf("instrumentShare"), windowFormulas.instrumentShare, {
    F,
    Rm,
    Rs,
    U: "/brief/wantedUncertainty",
    s,
  });
  return bound(
    given,
    "instrumentShare",
    (R) =>
      `The instrument's resistance is known to ${percent(instrument.resistanceSpread)}; its share of the scale factor ` +
      `may cost half of the wanted uncertainty: at most ${R}.`,
  );
}

/** Two branches of the largest resistor sold still make the LV arm. */
export function lvArmValue(given: WindowGiven): Bound {
  const { ask, greatestLvResistor_ohm } = given;
  if (greatestLvResistor_ohm === null) return none(given, "lvArmValue", "No resistor family is left for the LV arm.");
  ask.j.sheet.given("/parts/*/greatest_ohm:lvArm", greatestLvResistor_ohm);
  ask.j.sheet.derive(pathOf("lvArmValue"), windowFormulas.lvArmValue, {
    ...scaleFactorGivens(ask),
    R: "/parts/*/greatest_ohm:lvArm",
  });
  return bound(
    given,
    "lvArmValue",
    (R) => `Two branches of ${show(greatestLvResistor_ohm, "ohm")}, the largest sold, make the LV arm up to ${R}.`,
  );
}

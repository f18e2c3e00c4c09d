import { bandTop } from "../checks/band.ts";
import { protectorCapacitance } from "../checks/lvArm.ts";
import { show } from "../checks/show.ts";
import { metre } from "../quantities/quantity.ts";
import { verticalCylinderCapacitance } from "../standards/strayCapacitance.ts";
import type { Asking } from "./asking.ts";
import { bound, none, pathOf, percent, shareOfUncertainty, type WindowGiven } from "./bound.ts";
import type { Bound } from "./outcome.ts";
import { scaleFactorGivens } from "./scaleFactorBounds.ts";
import { firstOrderLimit, systematicShare, windowFormulas } from "./windowFormulas.ts";

/** Diameter over length assumed for the first look at a bare string's stray; the search uses each candidate's own. */
const slenderness = 15;

/** Greatest R1 of a string without capacitors; does not apply to dc or where capacitors are fitted. */
export function bandLimit(given: WindowGiven): Bound {
  const { ask, bare, column_m } = given;
  const { sheet } = ask.j;
  const top = bandTop(ask.j.document.brief);
  if (top === 0) return none(given, "band", "The band is dc only.");
  if (!bare) return none(given, "band", "Capacitors across the elements carry the band.");
  const footHeight_m = 0.12;
  bandShare(ask);
  sheet.given("/brief/band_Hz:top", top);
  sheet.given(
    "window.bandStray_F",
    verticalCylinderCapacitance(metre(column_m), metre(column_m / slenderness), metre(footHeight_m)),
  );
  sheet.derive(pathOf("band"), windowFormulas.band, {
    e: "window.bandShare",
    f: "/brief/band_Hz:top",
    Ce: "window.bandStray_F",
  });
  return bound(
    given,
    "band",
    (R) =>
      `A string without capacitors, as short as insulation allows, falls by ${percent(bandShare(ask))} at ${show(top, "Hz")}: at most ${R}.`,
  );
}

/** Capacitance beside the LV arm that nobody fitted: cable, instrument and protectors, F. */
export function besideLvArm({ j }: Asking): number {
  const { cable, capacitance_F } = j.instrument;
  const protectors = protectorCapacitance(j, "divider") + protectorCapacitance(j, "instrument");
  return cable.length_m * cable.capacitance_F_per_m + capacitance_F + protectors;
}

/** Greatest R1 before cable and instrument bend an LV arm without capacitors; does not apply where capacitors are fitted. */
export function lvPoleLimit(given: WindowGiven): Bound {
  const { ask, bare } = given;
  const { sheet } = ask.j;
  const top = bandTop(ask.j.document.brief);
  if (top === 0) return none(given, "lvPole", "The band is dc only.");
  if (!bare) return none(given, "lvPole", "Capacitors in both arms carry the band.");
  bandShare(ask);
  const { F, Rm, Rs } = scaleFactorGivens(ask);
  sheet.given("/brief/band_Hz:top", top);
  sheet.given(`/instruments/${ask.at}/cable:beside_F`, besideLvArm(ask));
  sheet.derive(pathOf("lvPole"), windowFormulas.lvPole, {
    F,
    Rm,
    Rs,
    e: "window.bandShare",
    f: "/brief/band_Hz:top",
    C: `/instruments/${ask.at}/cable:beside_F`,
  });
  return bound(
    given,
    "lvPole",
    (R) =>
      `Cable and instrument have ${show(besideLvArm(ask), "F")} beside the LV arm and take ${percent(bandShare(ask))} at ${show(top, "Hz")}: at most ${R}.`,
  );
}

/** Greatest R1 of a divider without capacitors for a column of this stray, Ω: by the string, and by cable and instrument. */
export function bareReach(ask: Asking, stray_F: number): number {
  const e = acceptedBandShare(ask);
  const w = 2 * Math.PI * bandTop(ask.j.document.brief);
  const beside = besideLvArm(ask);
  const byLvArm =
    beside === 0 ? Number.POSITIVE_INFINITY : ((ask.tapScaleFactor - 1) * Math.sqrt(2 * e)) / (w * beside);
  return Math.min(Math.sqrt(180 * e) / (w * stray_F), byLvArm);
}

/** Greatest resistance of an element without capacitor before its own capacitance bypasses it at the band's top, Ω. */
export function bareElement(ask: Asking, self_F: number): number {
  const w = 2 * Math.PI * bandTop(ask.j.document.brief);
  return self_F > 0 ? Math.sqrt(2 * acceptedBandShare(ask)) / (w * self_F) : Number.POSITIVE_INFINITY;
}

/** Deviation accepted of a bare string at the band's top: a fifth of the wanted uncertainty, within the first-order rule. */
export const acceptedBandShare = ({ j }: Asking): number =>
  Math.min(systematicShare * j.document.brief.wantedUncertainty, firstOrderLimit);

/** Deviation accepted of a bare string at the band's top, on the sheet at `window.bandShare`. */
export function bandShare(ask: Asking): number {
  shareOfUncertainty(ask);
  ask.j.sheet.given("window.firstOrderLimit", firstOrderLimit);
  return ask.j.sheet.derive("window.bandShare", windowFormulas.share, {
    k: "/brief/wantedUncertainty:share",
    U: "/brief/wantedUncertainty",
    m: "window.firstOrderLimit",
  }) as number;
}

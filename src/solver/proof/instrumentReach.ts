import { wantedBand } from "../checks/band.ts";
import { type Judging, plainFinding } from "../checks/judging.ts";
import { protectorCapacitance } from "../checks/lvArm.ts";
import { networkOf } from "../checks/networkOf.ts";
import { show } from "../checks/show.ts";
import type { StringCapacitance } from "../checks/stringCapacitance.ts";
import type { LvBranch, LvCapacitanceBy } from "../job/design.ts";
import type { Instrument } from "../job/instrument.ts";
import type { CapacitorFamily } from "../job/part.ts";
import { lvCapacitance } from "../network/lvCapacitance.ts";
import { formatQuantity } from "../quantities/format.ts";
import { linkHoles, linkSet } from "../sizing/lvLinks.ts";
import { cableSpread, strayDoubt } from "../sizing/lvMatch.ts";
import { preferredBetween } from "../standards/preferred.ts";
import { practice } from "../standards/source.ts";
import { hasCapacitors } from "./matches.ts";

/** LV capacitance to be fitted for one instrument: nominal, and with string, strays, cable and instrument at their extremes, F. */
export interface NeededRange {
  readonly id: string;
  readonly name: string;
  readonly principal: boolean;
  readonly least_F: number;
  readonly nominal_F: number;
  readonly greatest_F: number;
  /** Whether links and trimmer are sure to reach all of it. */
  readonly within: boolean;
}

/** A stretch that a link may leave uncovered with parts at their extremes, F of LV capacitance fitted. */
export interface LinkHole {
  readonly link_F: number;
  readonly from_F: number;
  readonly to_F: number;
}

/** What links and trimmer are sure to reach, holes apart, and what each instrument may need. */
export interface InstrumentReach {
  /** With every part at its worse end. */
  readonly sure: { readonly from_F: number; readonly to_F: number };
  readonly holes: readonly LinkHole[];
  readonly needs: readonly NeededRange[];
}

/** The reach of the LV capacitors against every instrument in tolerance, and its finding. null: no capacitor in either arm. */
export function instrumentReach(j: Judging, string: StringCapacitance): InstrumentReach | null {
  if (!hasCapacitors(j.design)) return null;
  const parts = reachOf(j);
  const share = stringDoubt(j, string);
  const found = j.document.instruments.map((each) => neededBy(j, string, each, share));
  const needs = found.flatMap((need): NeededRange[] => {
    if (need === null) return [];
    const { from_F, to_F } = parts.sure;
    const slack = 1e-9 * need.greatest_F;
    const outside = need.least_F < from_F - slack || need.greatest_F > to_F + slack;
    const holed = parts.holes.some((hole) => hole.from_F < need.greatest_F && hole.to_F > need.least_F);
    return [{ ...need, within: !outside && !holed }];
  });
  if (needs.length > 0) judgeReach(j, parts, needs);
  return { sure: parts.sure, holes: parts.holes, needs };
}

type Parts = Omit<InstrumentReach, "needs"> & { readonly span_F: number; readonly low_F: number };

const toleranceOf = (j: Judging, branch: Exclude<LvBranch, { series: unknown }>): number =>
  branch.part === "" ? 0 : (j.parts.get(branch.part)?.tolerance ?? 0);

/** Fixed capacitors, links and trimmers with their tolerances against us. */
function reachOf(j: Judging): Parts {
  let [fixedLow, fixedHigh, fixed] = [0, 0, 0];
  let [low, high] = [0, 0];
  const links: number[] = [];
  let linkTolerance = 0;
  for (const branch of j.design.lvArm.branches) {
    if ("series" in branch) continue;
    const t = toleranceOf(j, branch);
    if ("trimmer" in branch) {
      low += branch.trimmer.least_F * (1 + t);
      high += branch.trimmer.greatest_F * (1 - t);
    } else if ("link" in branch) {
      links.push(branch.capacitance_F);
      linkTolerance = Math.max(linkTolerance, t);
    } else {
      fixed += branch.capacitance_F;
      fixedLow += branch.capacitance_F * (1 - t);
      fixedHigh += branch.capacitance_F * (1 + t);
    }
  }
  const span_F = Math.max(0, high - low);
  const sorted = [...links].sort((a, b) => a - b);
  const holes = linkHoles(sorted, linkTolerance, span_F).map(({ link, missing_F }): LinkHole => {
    const below = sorted.slice(0, link).reduce((sum, each) => sum + each, 0) * (1 - linkTolerance);
    const from_F = fixed + below + low + span_F;
    return { link_F: sorted[link]!, from_F, to_F: from_F + missing_F };
  });
  const top = links.reduce((sum, each) => sum + each, 0) * (1 - linkTolerance);
  return {
    sure: { from_F: fixedHigh + low, to_F: fixedLow + top + Math.max(low, high) },
    holes,
    span_F,
    low_F: fixedLow + Math.max(low, high),
  };
}

/** Half-width of the match by the string's own parts, relative: its capacitors at one end, and the doubt of the strays. */
function stringDoubt(j: Judging, { twoPort, strays }: StringCapacitance): number {
  const tolerance = j.design.hvArm.elements.reduce((most, element) => {
    const part = element.capacitor === null ? undefined : j.parts.get(element.capacitor);
    return Math.max(most, part?.tolerance ?? 0);
  }, 0);
  const Ce = j.design.strays.from === "typed" ? 0 : (j.sheet.number("strays.toEarth_F") ?? 0);
  return tolerance + (strays.toEarth_F.length === 0 ? 0 : (strayDoubt * Ce) / (6 * twoPort.transfer_F));
}

/** Frequencies that the flattest match of another instrument is searched over: enough for a needle's width. */
const points = 61;

function neededBy(
  j: Judging,
  string: StringCapacitance,
  instrument: Instrument,
  share: number,
): Omit<NeededRange, "within"> | null {
  const principal = instrument.id === j.instrument.id;
  const by = j.design.lvArm.capacitanceBy;
  const nominal_F = principal ? byOf(by, principalMatches(j)) : byOf(by, othersMatch(j, string, instrument, by));
  if (nominal_F === null) return null;
  const cable_F = instrument.cable.length_m * instrument.cable.capacitance_F_per_m;
  const beside_F =
    cable_F + instrument.capacitance_F + protectorCapacitance(j, "divider") + protectorCapacitance(j, "instrument");
  const whole_F = nominal_F + beside_F;
  // The LV resistance is trimmed on the principal instrument; another's own spread moves its dc scale factor, and the match with it.
  const R2 = j.sheet.number("lvArm.fitted_ohm");
  const loading = principal || R2 === null ? 0 : R2 / (R2 + instrument.resistance_ohm);
  const half = whole_F * (share + loading * instrument.resistanceSpread) + cable_F * cableSpread;
  const spread = half + instrument.capacitanceSpread_F;
  return {
    id: instrument.id,
    name: instrument.name,
    principal,
    nominal_F,
    least_F: nominal_F - spread,
    greatest_F: nominal_F + spread,
  };
}

type Three = Readonly<Record<Exclude<LvCapacitanceBy, "none">, number | null>>;

const byOf = (by: LvCapacitanceBy, three: Three): number | null =>
  by === "none" || three[by] === null ? (three.flattest ?? three.highFrequency) : three[by];

const principalMatches = ({ sheet }: Judging): Three => ({
  highFrequency: sheet.number("lvArm.capacitanceHighFrequency_F"),
  flattest: sheet.number("lvArm.capacitanceFlattest_F"),
  responseTime: sheet.number("lvArm.capacitanceResponseTime_F"),
});

function othersMatch(j: Judging, string: StringCapacitance, instrument: Instrument, by: LvCapacitanceBy): Three {
  const band = by === "flattest" || by === "none" ? wantedBand(j.document.brief) : ([0, 0] as const);
  const found = lvCapacitance(networkOf({ ...j, instrument }, string), band, "electrode", points);
  return {
    highFrequency: found.highFrequency_F,
    flattest: found.flattest_F,
    responseTime: found.responseTime_F,
  };
}

const trade = practice("links over part tolerance, a trimmer over cable and instrument; each overlaps the next");

function judgeReach(j: Judging, parts: Parts, needs: readonly NeededRange[]): void {
  const missed = needs.filter((need) => !need.within);
  const { from_F, to_F } = parts.sure;
  const reached = `Links (select-on-test capacitors) and trimmer are sure to reach ${show(from_F, "F")} to ${show(to_F, "F")}`;
  const holes =
    parts.holes.length === 0
      ? "without a hole"
      : `but may leave a hole before ${parts.holes.map((hole) => `the ${show(hole.link_F, "F")} link (${show(hole.to_F - hole.from_F, "F")})`).join(" and ")}`;
  const asked = missed
    .map((need) => `${need.name} may need ${show(need.least_F, "F")} to ${show(need.greatest_F, "F")}`)
    .join("; ");
  plainFinding(j, {
    id: "lvArm.reach",
    level: missed.length === 0 ? "clear" : "caution",
    what: "reach of links and trimmer",
    reason:
      missed.length === 0
        ? `${reached}, ${holes}: every instrument with its cable in tolerance lies within.`
        : `${reached}, ${holes}. ${asked}.${overlapping(j, parts, missed)}`,
    source: trade,
  });
}

/** Values of links that would reach the greatest need without a hole, where the parts fitted are sold in a series. */
function overlapping(j: Judging, parts: Parts, missed: readonly NeededRange[]): string {
  if (parts.span_F === 0) return " Fit a trimmer capacitor and links below the least value.";
  const branch = j.design.lvArm.branches.find((each) => "capacitance_F" in each && each.part !== "");
  const family = branch === undefined || !("part" in branch) ? undefined : j.parts.get(branch.part);
  if (family === undefined || family.kind !== "capacitor") return "";
  const least = Math.min(...missed.map((need) => need.least_F));
  const lower = least < parts.sure.from_F ? ` Take ${show(parts.sure.from_F - least, "F")} out of the fixed ones.` : "";
  const greatest = Math.max(...missed.map((need) => need.greatest_F));
  const links = linksFor(family, parts, greatest - parts.low_F + Math.max(0, parts.sure.from_F - least));
  return links === null || links.length === 0 ? lower : `${lower} Links of ${plain(links)} reach it without a hole.`;
}

const plain = (links: readonly number[]): string =>
  [...links]
    .sort((a, b) => a - b)
    .map((each) => formatQuantity(each, "F", { digits: 3, trailing: false }))
    .join(", ");

const linksFor = (family: CapacitorFamily, parts: Parts, reach_F: number): readonly number[] | null =>
  linkSet(preferredBetween(family.series, family.least_F, family.greatest_F), family.tolerance, parts.span_F, reach_F);

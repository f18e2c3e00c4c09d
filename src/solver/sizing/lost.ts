import { show } from "../checks/show.ts";
import { type Kind, type Limits, mostElements, mostStrings } from "./kind.ts";
import type { Build } from "./line.ts";
import type { LostFamily } from "./outcome.ts";
import type { Offer } from "./pool.ts";

type Reason = Pick<LostFamily, "reason" | "actual" | "limit" | "unit">;

/** Which limits a count is worked out with. */
interface Asked {
  readonly least_ohm: number;
  readonly greatest_ohm: number;
  readonly length_m: number;
  readonly dissipation_W: number;
  readonly inHand: boolean;
}

/** Counts in series that meet all limits with this value: [least, greatest], empty where least > greatest. */
export function countsOf(kind: Kind, offer: Offer, strings: number, limits: Limits, asked: Asked): [number, number] {
  const rms = limits.ask.working.greatestRms_V * limits.share;
  const byPower = rms === 0 ? 1 : rms / Math.sqrt(offer.value * asked.dissipation_W);
  const least = Math.max(kind.leastCount, up((strings * asked.least_ohm) / offer.value), up(byPower));
  const greatest = Math.min(
    mostElements,
    down((strings * asked.greatest_ohm) / offer.value),
    limits.need.column_m > asked.length_m * (1 + 1e-12) ? 0 : down(asked.length_m / kind.pitch_m),
    asked.inHand ? Math.floor(offer.count / strings) : mostElements,
  );
  return [least, greatest];
}

const up = (x: number): number => Math.ceil(x * (1 - 1e-12));
const down = (x: number): number => Math.floor(x * (1 + 1e-12));

const asWanted = (kind: Kind, limits: Limits): Asked => ({
  least_ohm: limits.least_ohm,
  greatest_ohm: kind.greatest_ohm,
  length_m: limits.length_m,
  dissipation_W: kind.dissipation_W,
  inHand: true,
});

/** How many combinations of value, strings and count of this family lie within all limits but the band's. */
export function combinations(kind: Kind, limits: Limits): number {
  let sum = 0;
  for (const each of ranges(kind, limits, asWanted(kind, limits))) sum += each.greatest - each.least + 1;
  return sum;
}

interface Range {
  readonly value: number;
  readonly strings: number;
  readonly least: number;
  readonly greatest: number;
}

function ranges(kind: Kind, limits: Limits, asked: Asked): Range[] {
  return kind.offers.flatMap((offer) =>
    Array.from({ length: mostStrings }, (_, i) => i + 1).flatMap((strings) => {
      const [least, greatest] = countsOf(kind, offer, strings, limits, asked);
      return least <= greatest ? [{ value: offer.value, strings, least, greatest }] : [];
    }),
  );
}

/** Why a family gives no build at all: the first limit whose lifting alone would give one, with its number. */
export function whyNone(kind: Kind, limits: Limits): Reason {
  const { offers, leastCount } = kind;
  if (offers.length === 0) return { reason: "No value of it is in hand.", actual: 0, limit: 1, unit: "1" };
  if (leastCount > mostElements) return tooMany(kind, limits);
  if (kind.dissipation_W <= 0) return noDissipation(kind, limits);
  const wanted = asWanted(kind, limits);
  const without = (lifted: Partial<Asked>) => ranges(kind, limits, { ...wanted, ...lifted });
  if (ranges(kind, limits, wanted).length > 0)
    return limits.bareAbove_V < Number.POSITIVE_INFINITY ? outOfBand(limits) : severalAtOnce(kind, limits);
  const long = without({ length_m: Number.POSITIVE_INFINITY });
  if (long.length > 0) return tooLong(kind, limits, long);
  const high = without({ greatest_ohm: Number.POSITIVE_INFINITY });
  if (high.length > 0) return tooHigh(kind, high);
  const low = without({ least_ohm: 0 });
  if (low.length > 0) return tooLow(limits, low);
  const hot = without({ dissipation_W: Number.POSITIVE_INFINITY });
  if (hot.length > 0) return tooHot(kind, limits, hot);
  const hand = without({ inHand: false });
  if (hand.length > 0) return tooFew(kind, hand);
  return severalAtOnce(kind, limits);
}

const V = (limits: Limits) => show(limits.ask.working.greatest_Vpeak, "V");

const governs: Record<Kind["leastBy"], string> = {
  voltage: "by its limiting voltage",
  creepage: "by creepage along its body",
  capacitor: "by the rating of the capacitor across each",
  fault: "by what one shorted element would put on the instrument",
};

function tooMany(kind: Kind, limits: Limits): Reason {
  const { greatestRms_V, greatest_Vpeak } = limits.ask.working;
  if (kind.leastBy === "fault") {
    const { greatestInput_Vpeak } = limits.ask.j.instrument;
    const reason = `${kind.leastCount} in series would be needed ${governs.fault}, which may see ${show(greatestInput_Vpeak, "V")}; ${mostElements} is the most.`;
    return { reason, actual: kind.leastCount, limit: mostElements, unit: "1" };
  }
  if (kind.leastBy === "creepage") {
    const reason = `Its body of ${show(kind.family.bodyLength_m, "m")} is too short for creepage even with ${mostElements} in series.`;
    return { reason, actual: kind.family.bodyLength_m, limit: null, unit: "m" };
  }
  const each = Math.min(kind.peak_V, limits.capacitor_V);
  const needed = Math.max(up((greatestRms_V * limits.share) / kind.rms_V), up((greatest_Vpeak * limits.share) / each));
  const reason =
    `${needed} in series would be needed ${governs[kind.leastBy]} for ${V(limits)}; ${mostElements} is the most. ` +
    "Take a family with a higher limiting voltage.";
  return { reason, actual: needed, limit: mostElements, unit: "1" };
}

function noDissipation(kind: Kind, limits: Limits): Reason {
  const { ambient_degC, ambientSpan_K } = limits.ask.j.document.brief.surroundings;
  const hottest = ambient_degC + ambientSpan_K;
  const reason = `At ${hottest} °C nothing is left of its rated dissipation.`;
  return { reason, actual: hottest, limit: kind.family.zeroDissipation_degC, unit: "degC" };
}

function tooLong(kind: Kind, limits: Limits, found: readonly Range[]): Reason {
  const best = fewest(found);
  const length = Math.max(best.least * kind.pitch_m, limits.need.column_m);
  const reason =
    `${best.least} × ${show(best.value, "ohm")} make a column of ${show(length, "m")}; ` +
    `${show(limits.length_m, "m")} is the longest accepted.`;
  return { reason, actual: length, limit: limits.length_m, unit: "m" };
}

function tooHigh(kind: Kind, found: readonly Range[]): Reason {
  const best = found.reduce((a, b) => (least_ohm(b) < least_ohm(a) ? b : a));
  const R = least_ohm(best);
  const end =
    kind.greatestBy === "window"
      ? `the window ends at ${show(kind.greatest_ohm, "ohm")}.`
      : `with its tolerance of ${Number((kind.family.tolerance * 100).toPrecision(3))} % the LV arm can be trimmed up to ` +
        `${show(kind.greatest_ohm, "ohm")} only.`;
  const reason = `The ${best.least} in series that its limits ask for are at least ${show(R, "ohm")} (${many(best)}); ${end}`;
  return { reason, actual: R, limit: kind.greatest_ohm, unit: "ohm" };
}

function tooLow(limits: Limits, found: readonly Range[]): Reason {
  const most = (each: Range) => (each.greatest * each.value) / each.strings;
  const best = found.reduce((a, b) => (most(b) > most(a) ? b : a));
  const reason =
    `It reaches ${show(most(best), "ohm")} at most (${best.greatest} × ${show(best.value, "ohm")}); ` +
    `the window begins at ${show(limits.least_ohm, "ohm")}.`;
  return { reason, actual: most(best), limit: limits.least_ohm, unit: "ohm" };
}

function tooHot(kind: Kind, limits: Limits, found: readonly Range[]): Reason {
  const rms = limits.ask.working.greatestRms_V * limits.share;
  const heat = (each: Range) => (rms / each.greatest) ** 2 / each.value;
  const best = found.reduce((a, b) => (heat(b) < heat(a) ? b : a));
  const reason =
    `Each of ${best.greatest} × ${show(best.value, "ohm")} would dissipate ${show(heat(best), "W")}; ` +
    `${show(kind.dissipation_W, "W")} is to be used.`;
  return { reason, actual: heat(best), limit: kind.dissipation_W, unit: "W" };
}

function tooFew(kind: Kind, found: readonly Range[]): Reason {
  const best = fewest(found);
  const inHand = kind.offers.find((offer) => offer.value === best.value)?.count ?? 0;
  const needed = best.least * best.strings;
  const reason = `${needed} of ${show(best.value, "ohm")} would be needed, ${inHand} are in hand.`;
  return { reason, actual: needed, limit: inHand, unit: "1" };
}

const outOfBand = (limits: Limits): Reason => ({
  reason:
    "Its own, its column's or the cable's capacitance takes too much at the band's top without capacitors across the elements.",
  actual: null,
  limit: limits.greatest_ohm,
  unit: "ohm",
});

const severalAtOnce = (kind: Kind, limits: Limits): Reason => ({
  reason:
    `At least ${kind.leastCount} are needed in series ${governs[kind.leastBy]}, and no value sold brings such a string into the window ` +
    `of ${show(limits.least_ohm, "ohm")} to ${show(kind.greatest_ohm, "ohm")} within all other limits.`,
  actual: kind.leastCount,
  limit: null,
  unit: "1",
});

const least_ohm = (each: Range) => (each.least * each.value) / each.strings;
const fewest = (found: readonly Range[]): Range =>
  found.reduce((a, b) => (b.least * b.strings < a.least * a.strings ? b : a));
const many = (each: Range) =>
  `${each.least} × ${show(each.value, "ohm")}${each.strings > 1 ? `, ${each.strings} strings` : ""}`;

/** Why a family that stands is not listed: dominated, or too far down. */
export function whyBehind(best: Build, dominator: Build | null, listed: readonly Build[]): Reason {
  const last = listed.at(-1);
  const mine = described(best);
  if (dominator === null) {
    const reason = `${mine} stands, behind the ${listed.length} listed; the last of those has ${last?.elementCount} elements.`;
    return { reason, actual: best.elementCount, limit: last?.elementCount ?? null, unit: "1" };
  }
  const better = differences(dominator, best).join(", ");
  const reason = `${mine} is no better in anything than ${described(dominator)} of ${dominator.kind.family.name}: ${better}.`;
  return { reason, actual: best.elementCount, limit: dominator.elementCount, unit: "1" };
}

const described = (build: Build) =>
  `${build.elements} × ${show(build.resistance_ohm, "ohm")}${build.strings > 1 ? ` in ${build.strings} strings` : ""}`;

function differences(better: Build, worse: Build): string[] {
  const percent = (value: number) => `${Number((value * 100).toPrecision(3))} %`;
  const against = (a: string, b: string, what: string) => `${what} ${a} against ${b}`;
  const all = [
    better.elementCount < worse.elementCount
      ? against(String(better.elementCount), String(worse.elementCount), "elements")
      : null,
    better.length_m < worse.length_m ? against(show(better.length_m, "m"), show(worse.length_m, "m"), "length") : null,
    better.uncertainty < worse.uncertainty
      ? against(percent(better.uncertainty), percent(worse.uncertainty), "uncertainty")
      : null,
    better.loading < worse.loading ? against(percent(better.loading), percent(worse.loading), "sag") : null,
    better.margin > worse.margin ? against(percent(better.margin), percent(worse.margin), "margin") : null,
  ];
  return all.filter((each) => each !== null);
}

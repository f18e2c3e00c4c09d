import type { CapacitorFamily, DielectricClass, Origin, ResistorFamily } from "../job/part.ts";
import { formatQuantity } from "../quantities/format.ts";
import { ok, type Refusal, type Result } from "../quantities/result.ts";
import { preferredSeries } from "../standards/preferred.ts";
import { capacitorRules, type RatingRule, resistorRules } from "./familyRules.ts";

type Raw = Readonly<Record<string, unknown>>;
type Family = ResistorFamily | CapacitorFamily;

const fault = (where: string, why: string, cure: string): Refusal => ({ where, why, cure });
const isRaw = (value: unknown): value is Raw => typeof value === "object" && value !== null && !Array.isArray(value);

/**
 * A family with every rating within what can be bought, or the first thing that is wrong with it. The same check serves a form
 * and a file. A limiting voltage of null passes: the family may be kept, but `sizingRefusal` names it.
 * @param candidate anything; it is returned as it came, keys unknown here kept
 * @example validateFamily({ ...family, tolerance: 5 }) // refused: "tolerance", 1 % is 0.01
 */
export function validateFamily(candidate: unknown): Result<Family> {
  const [first] = familyFaults(candidate);
  return first === undefined ? ok(candidate as Family) : { ok: false, error: first };
}

/** All that is wrong with a family, in the order of its keys; empty where nothing is. `where` is the key. */
export function familyFaults(candidate: unknown): readonly Refusal[] {
  if (!isRaw(candidate)) return [fault("family", "This is no family.", "Give its ratings by key.")];
  const { kind } = candidate;
  if (kind !== "resistor" && kind !== "capacitor")
    return [fault("kind", "It is neither resistor nor capacitor.", "Write resistor or capacitor.")];
  const rules = kind === "resistor" ? resistorRules : capacitorRules;
  const ratings = Object.entries(rules).flatMap(([key, rule]) => ratingFault(key, rule, candidate[key]));
  const named = kind === "resistor" ? [] : textFault("dielectric", candidate.dielectric, 500);
  const texts = [...textFault("id", candidate.id, 100), ...textFault("name", candidate.name, 500), ...named];
  const choices = Object.entries(choicesOf[kind]).flatMap(([key, list]) => choiceFault(key, list, candidate[key]));
  const faults = [...texts, ...choices, ...seriesFaults(candidate), ...ratings, ...inHandFaults(candidate.inHand)];
  return faults.length > 0 ? faults : orderFaults(candidate as unknown as Family);
}

/**
 * Why a family cannot be sized with, though it may be kept; null where it can.
 * @example sizingRefusal({ ...family, limitingVoltage_V: null })?.why // "Cannot size on it: the limiting element voltage is not stated."
 */
export function sizingRefusal(family: Family): Refusal | null {
  if (family.kind === "resistor" && family.limitingVoltage_V === null)
    return fault(
      "limitingVoltage_V",
      "Cannot size on it: the limiting element voltage is not stated.",
      "Type it from the data sheet.",
    );
  if (family.kind === "capacitor" && family.ratedVoltage_V === 0)
    return fault(
      "ratedVoltage_V",
      "Cannot size on it: the rated voltage is not stated.",
      "Type it from the data sheet.",
    );
  return null;
}

function ratingFault(key: string, rule: RatingRule, value: unknown): readonly Refusal[] {
  const { label, least, greatest, meant, orNull } = rule;
  if (value === null && orNull === true) return [];
  const show = (each: number) => formatQuantity(each, rule.unit, { trailing: false });
  if (typeof value !== "number" || !Number.isFinite(value))
    return [fault(key, `The ${label} is missing or no number.`, `Type it from the data sheet. ${meant}`)];
  if (value < least || value > greatest || (rule.above === true && value === least)) {
    const from = rule.above === true ? `above ${show(least)}` : `from ${show(least)}`;
    return [fault(key, `${show(value)} is no ${label}: it is ${from} and at most ${show(greatest)}.`, meant)];
  }
  return [];
}

function textFault(key: string, value: unknown, longest: number): readonly Refusal[] {
  if (typeof value !== "string" || value.trim() === "")
    return [fault(key, `The ${key} is missing.`, "Type a plain name, for the parts list.")];
  return value.length > longest ? [fault(key, `The ${key} is longer than ${longest} characters.`, "Shorten it.")] : [];
}

const origins: readonly Origin[] = ["typed", "measured", "catalogue", "assumed"];
const uses: readonly ResistorFamily["use"][] = ["divider", "damping"];
const classes: readonly DielectricClass[] = ["class1", "class2", "film", "mica", "air", "electrolytic"];
const choicesOf: Readonly<Record<Family["kind"], Readonly<Record<string, readonly string[]>>>> = {
  resistor: { origin: origins, use: uses },
  capacitor: { origin: origins, dielectricClass: classes },
};

function choiceFault(key: string, list: readonly string[], value: unknown): readonly Refusal[] {
  return typeof value === "string" && list.includes(value)
    ? []
    : [fault(key, "It is none of the words that can stand here.", `Write one of ${list.join(", ")}.`)];
}

const isSeries = (value: unknown) => typeof value === "string" && Object.hasOwn(preferredSeries, value);
const allSeries = `Write one of ${Object.keys(preferredSeries).join(", ")}.`;

function seriesFaults({ kind, series, seriesAbove }: Raw): readonly Refusal[] {
  if (!isSeries(series)) return [fault("series", "It is no series of preferred values.", allSeries)];
  if (kind !== "resistor" || seriesAbove === null) return [];
  if (!isRaw(seriesAbove) || !isSeries(seriesAbove.series))
    return [fault("seriesAbove", "The coarser series above a value is no series of preferred values.", allSeries)];
  const from = seriesAbove.from_ohm;
  return typeof from === "number" && from > 0 && Number.isFinite(from)
    ? []
    : [fault("seriesAbove", "The value above which a coarser series is sold is missing.", "Type it in ohms.")];
}

function inHandFaults(inHand: unknown): readonly Refusal[] {
  if (inHand === undefined) return [];
  const good = (each: unknown) =>
    isRaw(each) &&
    typeof each.value === "number" &&
    each.value > 0 &&
    Number.isFinite(each.value) &&
    Number.isInteger(each.count) &&
    (each.count as number) >= 0 &&
    (each.count as number) <= 1e6;
  return Array.isArray(inHand) && inHand.every(good)
    ? []
    : [fault("inHand", "What is in hand is no list of values and whole counts.", "Write 20 x 10M, 12 x 4M7.")];
}

/** What only two keys together can show. */
function orderFaults(family: Family): readonly Refusal[] {
  const exchanged = "Are they exchanged?";
  if (family.kind === "capacitor")
    return family.least_F <= family.greatest_F
      ? []
      : [fault("greatest_F", "The greatest value lies below the least.", exchanged)];
  return [
    ...(family.least_ohm <= family.greatest_ohm
      ? []
      : [fault("greatest_ohm", "The greatest value lies below the least.", exchanged)]),
    ...(family.deratingFrom_degC < family.zeroDissipation_degC
      ? []
      : [
          fault(
            "zeroDissipation_degC",
            "No dissipation is left at or below the temperature up to which all of it is allowed.",
            exchanged,
          ),
        ]),
  ];
}

import { Lost, type Place, type Reading } from "./reading.ts";
import { fallbackOf, type NumberSpec, type Raw } from "./shape.ts";

const unitOf = (spec: NumberSpec): string => (spec.unit === "1" ? "" : ` ${spec.unit}`);

function rangeOf(spec: NumberSpec): string {
  const least = spec.aboveLeast ? `above ${spec.least}` : `from ${spec.least}`;
  return `${spec.whole ? "a whole number " : ""}${least} to ${spec.greatest}${unitOf(spec)}`;
}

/** Why a number cannot stand, or null. */
export function numberFault(spec: NumberSpec, value: unknown): string | null {
  const ask = spec.question === undefined ? "" : `; ${spec.question}`;
  if (typeof value !== "number") return `A number${unitOf(spec) === "" ? "" : ` of${unitOf(spec)}`} belongs here${ask}`;
  if (!Number.isFinite(value)) return "The number is too large to be held";
  const low = spec.aboveLeast ? value <= spec.least : value < spec.least;
  if (low || value > spec.greatest || (spec.whole && !Number.isInteger(value))) {
    return `${value}${unitOf(spec)} is not ${rangeOf(spec)}${ask}`;
  }
  return null;
}

export function readNumber(
  spec: NumberSpec,
  value: unknown,
  place: Place,
  parent: Raw,
  reading: Reading,
): number | null | Lost {
  const missing = value === undefined || value === null;
  if (value === null && spec.nullable) return null;
  if (spec.zeroIsNull && value === 0) return null;
  const fault = missing ? null : numberFault(spec, value);
  if (!missing && fault === null) return (value as number) + 0;
  const instead = fallbackOf(spec.fallback, parent, reading.root);
  if (instead === undefined) return new Lost(place.from, fault ?? `${spec.about} It is missing`, value);
  if (fault !== null) reading.repair(place.from, "replaced", fault, standsNow(instead, spec), value);
  reading.fill(place, spec.assumable && (instead !== null || spec.ruled));
  return instead;
}

const standsNow = (value: number | null, spec: NumberSpec): string =>
  value === null ? "it counts as not stated" : `the default ${value}${unitOf(spec)} stands there now, assumed`;

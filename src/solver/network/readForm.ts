import type { Refusal } from "../quantities/result.ts";

/** Thrown inside the reading of a raw form and caught at its door: the first key that cannot be used. */
export class Unusable extends Error {
  constructor(readonly refusal: Refusal) {
    super(refusal.why);
  }
}

export const stop = (where: string, why: string, cure: string): never => {
  throw new Unusable({ where, why, cure });
};

export type Keyed = Readonly<Record<string, unknown>>;

/** An object of known keys only. */
export function object(value: unknown, where: string, keys: readonly string[]): Keyed {
  if (typeof value !== "object" || value === null || Array.isArray(value))
    return stop(where, "It must be an object.", "See the form.");
  for (const key of Object.keys(value)) {
    if (!keys.includes(key))
      stop(`${where === "/" ? "" : where}/${key}`, "This key is not known here.", `Known: ${keys.join(", ")}.`);
  }
  return value as Keyed;
}

export function array(value: unknown, where: string): readonly unknown[] {
  return Array.isArray(value) ? value : stop(where, "It must be a list.", "See the form.");
}

/** A finite number from least to greatest. */
export function number(value: unknown, where: string, least: number, greatest: number): number {
  if (typeof value !== "number" || !Number.isFinite(value))
    return stop(where, "It must be a finite number.", "Give a number in SI units.");
  if (value < least || value > greatest)
    return stop(where, `${value} is outside ${least} to ${greatest}.`, "Give a value of physical size.");
  return value;
}

export const numbers = (value: unknown, where: string, least: number, greatest: number): number[] =>
  array(value, where).map((each, i) => number(each, `${where}/${i}`, least, greatest));

/** A missing or null key stands for `absent`. */
export const optional = (value: unknown, where: string, absent: number, least: number, greatest: number): number =>
  value === undefined || value === null ? absent : number(value, where, least, greatest);

/** Short makers of the descriptions in shape.ts. */
import { ranges, type Unit } from "./range.ts";
import type {
  AnySpec,
  ChoiceSpec,
  Fallback,
  Fields,
  FlagSpec,
  ListSpec,
  LiteralSpec,
  MapSpec,
  NumberSpec,
  ObjectSpec,
  PairSpec,
  Raw,
  Shape,
  TextSpec,
  VariantSpec,
} from "./shape.ts";

type NumberOptions = Partial<Omit<NumberSpec, "kind" | "about" | "unit" | "nullable">>;

function numberSpec(unit: Unit, about: string, nullable: boolean, options: NumberOptions): NumberSpec {
  return {
    kind: "number",
    about,
    unit,
    nullable,
    least: ranges[unit][0],
    greatest: ranges[unit][1],
    aboveLeast: false,
    whole: false,
    zeroIsNull: false,
    fallback: nullable ? null : undefined,
    assumable: true,
    ruled: false,
    question: undefined,
    ...options,
  };
}

/** A number in the unit's physical range; without a `fallback` it is required. */
export const quantity = (unit: Unit, about: string, options: NumberOptions = {}): Shape<number, NumberSpec> =>
  numberSpec(unit, about, false, options);

/** The same, or null for "not stated". */
export const quantityOrNull = (
  unit: Unit,
  about: string,
  options: NumberOptions = {},
): Shape<number | null, NumberSpec> => numberSpec(unit, about, true, options);

export const text = (about: string, fallback?: Fallback<string>, longest = 500): Shape<string, TextSpec> => ({
  kind: "text",
  about,
  longest,
  nullable: false,
  fallback,
});

/** The first of the neighbouring keys that holds a text, for a name that is missing. */
export const namedAs =
  (...keys: readonly string[]): Fallback<string> =>
  (parent) =>
    keys.map((key) => parent[key]).find((value): value is string => typeof value === "string") ?? "";

export const textOrNull = (about: string, longest = 500): Shape<string | null, TextSpec> => ({
  kind: "text",
  about,
  longest,
  nullable: true,
  fallback: null,
});

/** One of a closed list, each value with what it means. */
export const choice = <T extends string>(
  about: string,
  values: Readonly<Record<T, string>>,
  fallback?: Fallback<T>,
  assumable = false,
): Shape<T, ChoiceSpec> => ({ kind: "choice", about, values, fallback, assumable });

export const flag = (about: string, fallback?: boolean, assumable = false): Shape<boolean, FlagSpec> => ({
  kind: "flag",
  about,
  fallback,
  assumable,
});

export const list = <T>(about: string, item: Shape<T>, longest = 2000): Shape<readonly T[], ListSpec> => ({
  kind: "list",
  about,
  item,
  longest,
  optional: false,
});

export const optionalList = <T>(
  about: string,
  item: Shape<T>,
  longest = 2000,
): Shape<readonly T[] | undefined, ListSpec> => ({ kind: "list", about, item, longest, optional: true });

export const pair = (
  about: string,
  item: NumberSpec,
  fallback: Fallback<readonly [number, number]>,
): Shape<readonly [number, number], PairSpec> => ({ kind: "pair", about, item, fallback });

export const object = <T>(
  about: string,
  fields: Fields<T>,
  aliases: Readonly<Record<string, string>> = {},
): Shape<T, ObjectSpec> => ({ kind: "object", about, fields, aliases, nullable: false });

export const orNull = <T>(shape: Shape<T, ObjectSpec>): Shape<T | null, ObjectSpec> =>
  ({ ...shape, nullable: true }) as ObjectSpec;

export const variant = <T>(
  about: string,
  toldBy: string,
  pick: (raw: Raw) => string | null,
  options: Readonly<Record<string, ObjectSpec>>,
  marks: Readonly<Record<string, string>> = {},
): Shape<T, VariantSpec> => ({ kind: "variant", about, toldBy, pick, options, marks });

export const map = <T extends string>(
  about: string,
  value: Shape<T, ChoiceSpec> | Shape<T, TextSpec>,
): Shape<Readonly<Record<string, T>>, MapSpec> => ({ kind: "map", about, value });

export const literal = <T extends string | number | boolean>(about: string, value: T): Shape<T, LiteralSpec> => ({
  kind: "literal",
  about,
  value,
});

export const verbatim = (about: string): Shape<unknown, AnySpec> => ({ kind: "any", about });

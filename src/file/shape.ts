/**
 * One description of every key of a saved document. Restore, the published schema, the order of keys on saving and the check of
 * a single edit all read it; its types are tied to the solver's shapes, so that a key left out or misspelt does not compile.
 */
import type { Unit } from "./range.ts";

export type Raw = Readonly<Record<string, unknown>>;
/** A default: a constant, or computed from the object that lacks the key and from the whole file. */
export type Fallback<T> = T | ((parent: Raw, root: Raw) => T);

export interface NumberSpec {
  readonly kind: "number";
  readonly about: string;
  readonly unit: Unit;
  readonly least: number;
  readonly greatest: number;
  readonly aboveLeast: boolean;
  readonly whole: boolean;
  readonly nullable: boolean;
  /** 0 means "not stated" and is read as null. */
  readonly zeroIsNull: boolean;
  /** undefined: the key is required, and without it the object around it is dropped. */
  readonly fallback: Fallback<number | null> | undefined;
  /** Whether a filled value counts as an assumption about the world (a decision of the engineer does not). */
  readonly assumable: boolean;
  /** null stands for a value found by rule, and counts as assumed. */
  readonly ruled: boolean;
  /** Asked when a value is out of range, e.g. whether a percentage was meant. */
  readonly question: string | undefined;
}
export interface TextSpec {
  readonly kind: "text";
  readonly about: string;
  readonly longest: number;
  readonly nullable: boolean;
  readonly fallback: Fallback<string | null> | undefined;
}
export interface ChoiceSpec {
  readonly kind: "choice";
  readonly about: string;
  readonly values: Readonly<Record<string, string>>;
  readonly fallback: Fallback<string> | undefined;
  readonly assumable: boolean;
}
export interface FlagSpec {
  readonly kind: "flag";
  readonly about: string;
  readonly fallback: boolean | undefined;
  readonly assumable: boolean;
}
export interface ListSpec {
  readonly kind: "list";
  readonly about: string;
  readonly item: Spec;
  readonly longest: number;
  readonly optional: boolean;
}
export interface PairSpec {
  readonly kind: "pair";
  readonly about: string;
  readonly item: NumberSpec;
  readonly fallback: Fallback<readonly [number, number]>;
}
export interface ObjectSpec {
  readonly kind: "object";
  readonly about: string;
  readonly fields: Readonly<Record<string, Spec>>;
  /** Shorter names accepted in a file written by hand. */
  readonly aliases: Readonly<Record<string, string>>;
  readonly nullable: boolean;
}
export interface VariantSpec {
  readonly kind: "variant";
  readonly about: string;
  readonly options: Readonly<Record<string, ObjectSpec>>;
  /** Which option an object is, or null. */
  readonly pick: (raw: Raw) => string | null;
  /** The key that each option must have. */
  readonly marks: Readonly<Record<string, string>>;
  /** How the kind is told, for a message: `"kind"` or `one of "series", "link"`. */
  readonly toldBy: string;
}
export interface MapSpec {
  readonly kind: "map";
  readonly about: string;
  readonly value: ChoiceSpec | TextSpec;
}
export interface LiteralSpec {
  readonly kind: "literal";
  readonly about: string;
  readonly value: string | number | boolean;
}
/** Kept as it is. */
export interface AnySpec {
  readonly kind: "any";
  readonly about: string;
}
export type Spec =
  | NumberSpec
  | TextSpec
  | ChoiceSpec
  | FlagSpec
  | ListSpec
  | PairSpec
  | ObjectSpec
  | VariantSpec
  | MapSpec
  | LiteralSpec
  | AnySpec;

declare const of: unique symbol;
/** A description of exactly `T`. */
export type Shape<T, S extends Spec = Spec> = S & { readonly [of]?: (value: T) => T };
export type Fields<T> = { readonly [K in keyof T]-?: Shape<T[K]> };

/** Reads a fallback for an object that lacks the key. */
export function fallbackOf<T extends string | number | boolean | null | readonly number[]>(
  fallback: Fallback<T> | undefined,
  parent: Raw,
  root: Raw,
): T | undefined {
  return typeof fallback === "function" ? fallback(parent, root) : fallback;
}

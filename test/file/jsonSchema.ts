/** A small validator for the keywords of JSON Schema that the published schema uses; any other keyword is an error. */
import type { JsonSchema } from "../../src/file/schema.ts";

const notes = new Set(["$schema", "$comment", "title", "description", "default"]);

function typeOf(value: unknown): string {
  if (value === null) return "null";
  return Array.isArray(value) ? "array" : typeof value;
}

type Rule = (limit: never, value: never, at: string) => readonly string[];
const when = (fault: boolean, message: string): readonly string[] => (fault ? [message] : []);
const entries = (value: unknown) => (typeOf(value) === "object" ? Object.entries(value as object) : []);

const rules: Readonly<Record<string, Rule>> = {
  type: (limit: string | readonly string[], value: unknown, at) => {
    const types = [limit].flat();
    const fits = types.includes(typeOf(value)) || (types.includes("integer") && Number.isInteger(value));
    return when(!fits, `${at}: ${typeOf(value)} is not ${types}`);
  },
  enum: (limit: readonly unknown[], value: unknown, at) =>
    when(!limit.includes(value), `${at}: ${value} is none of ${limit}`),
  const: (limit: unknown, value: unknown, at) => when(limit !== value, `${at}: ${value} is not ${limit}`),
  minimum: (limit: number, value: unknown, at) =>
    when(typeof value === "number" && value < limit, `${at}: below ${limit}`),
  exclusiveMinimum: (limit: number, value: unknown, at) =>
    when(typeof value === "number" && value <= limit, `${at}: not above ${limit}`),
  maximum: (limit: number, value: unknown, at) =>
    when(typeof value === "number" && value > limit, `${at}: above ${limit}`),
  maxLength: (limit: number, value: unknown, at) =>
    when(typeof value === "string" && value.length > limit, `${at}: too long`),
  minItems: (limit: number, value: unknown, at) => when(Array.isArray(value) && value.length < limit, `${at}: too few`),
  maxItems: (limit: number, value: unknown, at) =>
    when(Array.isArray(value) && value.length > limit, `${at}: too many`),
  items: (limit: JsonSchema, value: unknown, at) =>
    Array.isArray(value) ? value.flatMap((item, i) => faults(limit, item, `${at}/${i}`)) : [],
  required: (limit: readonly string[], value: unknown, at) =>
    typeOf(value) === "object"
      ? limit.flatMap((key) => when(!Object.hasOwn(value as object, key), `${at}: no ${key}`))
      : [],
  properties: (limit: Record<string, JsonSchema>, value: unknown, at) =>
    entries(value).flatMap(([key, item]) => (limit[key] === undefined ? [] : faults(limit[key], item, `${at}/${key}`))),
  additionalProperties: (limit: JsonSchema, value: unknown, at) =>
    entries(value).flatMap(([key, item]) => faults(limit, item, `${at}/${key}`)),
  propertyNames: (limit: { readonly pattern: string }, value: unknown, at) =>
    entries(value).flatMap(([key]) => when(!new RegExp(limit.pattern).test(key), `${at}: key ${key}`)),
  anyOf: (limit: readonly JsonSchema[], value: unknown, at) =>
    when(!limit.some((option) => faults(option, value, at).length === 0), `${at}: fits no option`),
} as Readonly<Record<string, Rule>>;

/** Everything about `value` that the schema does not allow. */
export function faults(schema: JsonSchema, value: unknown, at = ""): readonly string[] {
  return Object.entries(schema).flatMap(([keyword, limit]) => {
    if (notes.has(keyword)) return [];
    const rule = rules[keyword];
    if (rule === undefined) throw new Error(`the keyword ${keyword} is not handled`);
    return rule(limit as never, value as never, at);
  });
}

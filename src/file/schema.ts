/** The published description of a saved document as JSON Schema (2020-12), made from the one description of its keys. */
import { documentShape } from "./documentShape.ts";
import type { NumberSpec, ObjectSpec, Spec } from "./shape.ts";

export type JsonSchema = { readonly [key: string]: unknown };

export function documentSchema(): JsonSchema {
  return {
    $schema: "https://json-schema.org/draft/2020-12/schema",
    title: "Stringwright document",
    $comment:
      `SI base units; the unit is the last part of a key (resistance_ohm, capacitance_F, riseTime_s). A key that is not required
 may be left out: its default stands in and counts as assumed. Keys that are not listed are kept as they are.`.replace(
        "\n",
        "",
      ),
    ...schemaOf(documentShape),
  };
}

export function schemaOf(spec: Spec): JsonSchema {
  const { about: description } = spec;
  switch (spec.kind) {
    case "number":
      return { description, ...numberSchema(spec) };
    case "text":
      return {
        description,
        type: orNull("string", spec.nullable),
        maxLength: spec.longest,
        ...constant(spec.fallback),
      };
    case "choice": {
      const values = Object.entries(spec.values).map(([value, meaning]) => `${value}: ${meaning}`);
      return {
        description: `${description} ${values.join("; ")}.`,
        enum: Object.keys(spec.values),
        ...constant(spec.fallback),
      };
    }
    case "flag":
      return { description, type: "boolean", ...constant(spec.fallback) };
    case "literal":
      return { description, const: spec.value };
    case "list":
      return { description, type: "array", items: schemaOf(spec.item), maxItems: spec.longest };
    case "pair":
      return { description, type: "array", items: schemaOf(spec.item), minItems: 2, maxItems: 2 };
    case "map":
      return {
        description,
        type: "object",
        propertyNames: { pattern: "^/" },
        additionalProperties: schemaOf(spec.value),
      };
    case "variant":
      return {
        description,
        anyOf: Object.entries(spec.options).map(([name, option]) => marked(schemaOf(option), spec.marks[name])),
      };
    case "object":
      return objectSchema(spec);
    case "any":
      return { description };
  }
}

/** An option of a variant is told by a key that it must have. */
function marked(schema: JsonSchema, mark: string | undefined): JsonSchema {
  const required = (schema.required as readonly string[] | undefined) ?? [];
  return mark === undefined || required.includes(mark) ? schema : { ...schema, required: [...required, mark] };
}

const orNull = (type: string, nullable: boolean): unknown => (nullable ? [type, "null"] : type);

const constant = (fallback: unknown): JsonSchema =>
  fallback === undefined || fallback === "" || typeof fallback === "function" ? {} : { default: fallback };

function numberSchema(spec: NumberSpec): JsonSchema {
  return {
    type: orNull(spec.whole ? "integer" : "number", spec.nullable),
    [spec.aboveLeast && !spec.zeroIsNull ? "exclusiveMinimum" : "minimum"]: spec.least,
    maximum: spec.greatest,
    ...constant(spec.fallback),
  };
}

function objectSchema(spec: ObjectSpec): JsonSchema {
  const fields = Object.entries(spec.fields);
  const required = fields.filter(([, field]) => isRequired(field)).map(([key]) => key);
  const aliased = new Set(Object.values(spec.aliases));
  const properties: Record<string, JsonSchema> = {};
  for (const [key, field] of fields) properties[key] = schemaOf(field);
  for (const [short, full] of Object.entries(spec.aliases)) properties[short] = schemaOf(spec.fields[full]!);
  const certain = required.filter((key) => !aliased.has(key));
  return {
    description: spec.about,
    type: orNull("object", spec.nullable),
    properties,
    ...(certain.length > 0 ? { required: certain } : {}),
  };
}

/** A key without a default: the object around it cannot be read without it. A literal marks what an object is. */
function isRequired(spec: Spec): boolean {
  if (spec.kind === "literal") return true;
  if (spec.kind === "object") return !spec.nullable && (spec === documentShape.fields.brief || hasRequired(spec));
  return "fallback" in spec && spec.fallback === undefined;
}

const hasRequired = (spec: ObjectSpec): boolean => Object.values(spec.fields).some(isRequired);

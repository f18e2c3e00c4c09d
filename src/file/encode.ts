/** The text of a saved document: keys in the order of the description, unknown keys after them, two spaces a level. */
import type { DividerDocument } from "../solver/index.ts";
import { documentShape } from "./documentShape.ts";
import { isObject } from "./reading.ts";
import type { Spec } from "./shape.ts";

/** Throws a RangeError on NaN or infinity: no such number may be in a document, and none is ever written. */
export function encodeDocument(document: DividerDocument): string {
  return `${JSON.stringify(ordered(documentShape, document), refuseNonFinite, 2)}\n`;
}

function refuseNonFinite(key: string, value: unknown): unknown {
  if (typeof value === "number" && !Number.isFinite(value)) throw new RangeError(`not a finite number at "${key}"`);
  return value;
}

/** The same value with its keys in the order of its description. */
export function ordered(spec: Spec, value: unknown): unknown {
  if (Array.isArray(value)) return spec.kind === "list" ? value.map((item) => ordered(spec.item, item)) : value;
  if (!isObject(value)) return value;
  if (spec.kind === "map") return Object.fromEntries(Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1)));
  if (spec.kind === "variant") {
    const option = spec.options[spec.pick(value) ?? ""];
    return option === undefined ? value : ordered(option, value);
  }
  if (spec.kind !== "object") return value;
  const known = Object.keys(spec.fields).filter((key) => Object.hasOwn(value, key));
  const rest = Object.keys(value).filter((key) => !Object.hasOwn(spec.fields, key));
  return Object.fromEntries([
    ...known.map((key) => [key, ordered(spec.fields[key]!, value[key])]),
    ...rest.map((key) => [key, value[key]]),
  ]);
}

/** Whether one value may stand at one place of a document: what a field or a cure asks before it is stored. */
import type { DividerDocument, Result } from "../solver/index.ts";
import { documentShape } from "./documentShape.ts";
import { keysOf, valueAt } from "./pointer.ts";
import { read } from "./read.ts";
import { isObject, Lost, Reading } from "./reading.ts";
import type { Raw, Spec } from "./shape.ts";

/** The description of the place a pointer leads to; null for a key that is not described, undefined for no place at all. */
export function specAt(document: DividerDocument, pointer: string): Spec | null | undefined {
  const keys = keysOf(pointer);
  if (keys === null || keys.includes("__proto__")) return undefined;
  let spec: Spec | null = documentShape;
  let here: unknown = document;
  for (const key of keys) {
    if (spec === null) return null;
    spec = inside(spec, key, here);
    here = isObject(here) || Array.isArray(here) ? (here as Record<string, unknown>)[key] : undefined;
  }
  return spec;
}

function inside(spec: Spec, key: string, here: unknown): Spec | null {
  switch (spec.kind) {
    case "object":
      return spec.fields[key] ?? null;
    case "list":
    case "pair":
      return spec.item;
    case "map":
      return spec.value;
    case "variant": {
      const option = isObject(here) ? spec.options[spec.pick(here) ?? ""] : undefined;
      return option?.fields[key] ?? null;
    }
    default:
      return null;
  }
}

/** What stands at a place when nothing is stated there, and whether that is an assumption. */
export function defaultAt(
  document: DividerDocument,
  pointer: string,
): Result<{ readonly value: unknown; readonly assumed: boolean }> {
  const spec = specAt(document, pointer);
  if (spec === undefined || spec === null) return refuse(pointer, "There is no such place in the document.");
  const reading = new Reading(document as unknown as Raw);
  const parent = { ...(valueAt(document, pointer.slice(0, pointer.lastIndexOf("/"))) as Raw) };
  const value = read(spec, undefined, { from: pointer, to: pointer }, parent, reading);
  if (value instanceof Lost || value === undefined) return refuse(pointer, "A value is needed here.");
  return { ok: true, value: { value, assumed: reading.assumed.includes(pointer) } };
}

const refuse = (where: string, why: string): Result<never> => ({
  ok: false,
  error: { where, why, cure: "Type a value that fits, or leave what stood there." },
});

/**
 * The value as it would be stored, or why it cannot stand. It passes exactly when a file that holds it would be opened without
 * a repair, so nothing that is stored is ever changed by saving and opening.
 */
export function checkAt(document: DividerDocument, pointer: string, value: unknown): Result<unknown> {
  const spec = specAt(document, pointer);
  if (spec === undefined || value === undefined) return refuse(pointer, "There is no such place in the document.");
  const reading = new Reading(document as unknown as Raw);
  const parent = valueAt(document, pointer.slice(0, pointer.lastIndexOf("/")));
  const place = { from: pointer, to: pointer };
  const checked = read(spec ?? { kind: "any", about: "" }, value, place, isObject(parent) ? parent : {}, reading);
  if (checked instanceof Lost) return refuse(pointer, `${checked.why}.`);
  const fault = reading.repairs[0];
  if (fault !== undefined) return refuse(fault.pointer, `${fault.fault}.`);
  if (reading.filled.includes(pointer)) return refuse(pointer, "A value is needed here.");
  return { ok: true, value: checked };
}

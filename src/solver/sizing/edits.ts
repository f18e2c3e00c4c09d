import type { DividerDocument } from "../job/document.ts";
import type { Edit } from "../standards/finding.ts";

/** The document with the edits of a cure applied; pointers lead to keys that exist. */
export function edited(document: DividerDocument, edits: readonly Edit[]): DividerDocument {
  return edits.reduce(
    (each, edit) => put(each, edit.pointer.split("/").slice(1), edit.value) as DividerDocument,
    document,
  );
}

function put(target: unknown, keys: readonly string[], value: unknown): unknown {
  const [key, ...rest] = keys;
  if (key === undefined) return value;
  if (Array.isArray(target)) return target.map((each, i) => (i === Number(key) ? put(each, rest, value) : each));
  const record = target as Record<string, unknown>;
  return { ...record, [key]: put(record[key], rest, value) };
}

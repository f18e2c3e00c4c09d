import { escapeKey } from "./pointer.ts";
import type { Reading } from "./reading.ts";

const loneSurrogate = /\p{Surrogate}/gu;

/** Half characters cannot be written to a file as text; each becomes U+FFFD. */
export const wellFormed = (text: string): string => text.replace(loneSurrogate, "\uFFFD");

/**
 * A value kept as it is, made harmless: no `__proto__` key, no number that JSON cannot write back, no half character.
 * Anything changed is noted. Depth is bounded by the limits on the file.
 */
export function cleaned(value: unknown, pointer: string, reading: Reading): unknown {
  if (typeof value === "number") {
    if (Number.isFinite(value)) return value + 0;
    reading.repair(pointer, "replaced", "The number is too large to be held", "null stands in its place", value);
    return null;
  }
  if (typeof value === "string") return cleanedText(value, pointer, reading);
  if (Array.isArray(value)) return value.map((item, i) => cleaned(item, `${pointer}/${i}`, reading));
  if (typeof value !== "object" || value === null) return value;
  const kept: Record<string, unknown> = {};
  for (const [key, item] of Object.entries(value)) {
    const at = `${pointer}/${escapeKey(key)}`;
    const safe = safeKey(key, at, item, reading);
    if (safe !== null) kept[safe] = cleaned(item, at, reading);
  }
  return kept;
}

export function cleanedText(text: string, pointer: string, reading: Reading): string {
  const clean = wellFormed(text);
  if (clean !== text)
    reading.repair(pointer, "replaced", "The text had half a character in it", "\uFFFD stands there now", clean);
  return clean;
}

/** A key that may be kept, or null. */
export function safeKey(key: string, pointer: string, value: unknown, reading: Reading): string | null {
  if (key === "__proto__") {
    reading.repair(pointer, "dropped", 'No key may be named "__proto__"', "it is left out", value);
    return null;
  }
  const clean = wellFormed(key);
  if (clean !== key)
    reading.repair(pointer, "renamed", "The key had half a character in it", "\uFFFD stands there now", clean);
  return clean;
}

/** Limits looked at before a file is parsed, so that no file can hold the page or blow the stack. */
import type { Result } from "../solver/index.ts";

export const limits = {
  /** Characters in the whole file. */
  size: 5_000_000,
  /** Objects and arrays inside one another. */
  depth: 64,
  /** Characters in one text. */
  text: 100_000,
  /** Entries in one array or object. */
  entries: 100_000,
} as const;

const tooMuch = (where: string, why: string): Result<never> => ({
  ok: false,
  error: { where, why, cure: "Open the file that Stringwright saved, or cut this one down to one divider." },
});

/** Scans the text once, without recursion; strings are skipped over, so brackets in them count for nothing. */
export function withinLimits(text: string): Result<null> {
  if (text.length > limits.size) {
    return tooMuch("the file", `It has ${text.length} characters, more than the ${limits.size} that are read.`);
  }
  const entries: number[] = [];
  for (let i = 0; i < text.length; i += 1) {
    const c = text.charCodeAt(i);
    if (c === 0x22) {
      const end = endOfText(text, i);
      if (end - i > limits.text)
        return tooMuch(`character ${i + 1}`, `One text is longer than ${limits.text} characters.`);
      i = end;
    } else if (c === 0x7b || c === 0x5b) {
      if (entries.push(0) > limits.depth) {
        return tooMuch(`character ${i + 1}`, `Objects stand more than ${limits.depth} deep inside one another.`);
      }
    } else if (c === 0x7d || c === 0x5d) entries.pop();
    else if (c === 0x2c && entries.length > 0) {
      entries[entries.length - 1]! += 1;
      if (entries.at(-1)! >= limits.entries) {
        return tooMuch(`character ${i + 1}`, `One list has more than ${limits.entries} entries.`);
      }
    }
  }
  return { ok: true, value: null };
}

/** Index of the closing quote of the text that opens at `start`; the end of the file when it never closes. */
function endOfText(text: string, start: number): number {
  let i = start + 1;
  while (i < text.length) {
    const c = text.charCodeAt(i);
    if (c === 0x5c) i += 1;
    else if (c === 0x22) return i;
    i += 1;
  }
  return text.length;
}

import { formatQuantity } from "./format.ts";
import { normalise, prefixes, type UnitName, units } from "./unit.ts";

/** What became of a text: a value, a question back, a longer expression for arithmetic.ts, or a refusal with its place. */
export type Parsed =
  | {
      readonly kind: "value";
      readonly value: number;
      /** What was understood, to be shown beside what was typed: "4.70 kΩ". */
      readonly understood: string;
      /** `9x22M`: how many equal parts in series; the value is that of one. */
      readonly count?: number;
    }
  | { readonly kind: "ambiguous"; readonly why: string; readonly choices: readonly Choice[] }
  | { readonly kind: "arithmetic"; readonly expression: string }
  | { readonly kind: "refused"; readonly at: number; readonly why: string; readonly cure: string };

export interface Choice {
  readonly label: string;
  readonly value: number;
}

export interface ParseOptions {
  /** Decimal mark of the locale; with "comma", `1.234` and `1,234` are asked about. Default point. */
  readonly locale?: "point" | "comma";
  readonly least?: number;
  readonly greatest?: number;
  /** Negative values are allowed. */
  readonly signed?: boolean;
  /** `9x22M` is allowed. */
  readonly counted?: boolean;
}

const longest = 200;
const example: Partial<Record<UnitName, string>> = {
  ohm: "4k7 or 12 MΩ",
  F: "470p or 4.7 nF",
  V: "48 kV",
  "1": "1000",
};

/**
 * The one quantity grammar: `4k7`, `R47`, `4n7`, `4,7k`, `4.7e3`, `12 MΩ`, `1µ5`, `9x22M`, one product or quotient. Whole text or
 * nothing. IEC 60062: M is mega, m is milli. Result in the SI base unit.
 * @example parseQuantity("4k7", "ohm") // value 4700
 */
export function parseQuantity(typed: string, unit: UnitName, options: ParseOptions = {}): Parsed {
  const text = normalise(typed).trim();
  if (text === "") return refused(0, "Nothing is typed.", `Type a value, for example ${exampleOf(unit)}.`);
  if (typed.length > longest) return refused(longest, `The text is longer than ${longest} characters.`, "Shorten it.");
  const counted = /^(\d{1,5})\s*[x*]\s*(?=[\dRr.])(.+)$/.exec(text);
  if (counted && options.counted === true && /x/.test(text)) return countedOf(counted, unit, options);
  const single = one(text, unit, options);
  if (single.kind !== "refused") return single;
  const pair = pairOf(text, unit, options);
  if (pair !== null) return pair;
  if (/^[\d\s.,eE+\-*/()%A-Za-zΩµ°^]+$/.test(text) && /[-+*/^(]/.test(text.slice(1)) && /\d/.test(text)) {
    return { kind: "arithmetic", expression: text };
  }
  return single;
}

const exampleOf = (unit: UnitName) => example[unit] ?? `12 ${units[unit].symbol}`;
const refused = (at: number, why: string, cure: string): Parsed => ({ kind: "refused", at, why, cure });

function countedOf(match: RegExpExecArray, unit: UnitName, options: ParseOptions): Parsed {
  const count = Number(match[1]);
  const part = one(match[2]!, unit, options);
  if (part.kind !== "value") return part;
  if (count < 1 || count > 5000)
    return refused(0, `${count} parts in series: 1 to 5000 are allowed.`, "Use a family of higher voltage.");
  return { ...part, count, understood: `${count} × ${part.understood}` };
}

/** One product or quotient of two numbers, at most one of which carries letters: `2*6.8M`, `6k/2`. */
function pairOf(text: string, unit: UnitName, options: ParseOptions): Parsed | null {
  const match = /^([^*/]+)([*/])([^*/]+)$/.exec(text);
  if (match === null) return null;
  const loose = { ...options, least: Number.NEGATIVE_INFINITY, greatest: Number.POSITIVE_INFINITY };
  const plain = (each: string) => /^\s*[\d.,]+\s*$/.test(each);
  const [left, right] = [match[1]!, match[3]!];
  if (!plain(left) && !plain(right)) return null;
  if (match[2] === "/" && !plain(right)) return null;
  const a = one(left.trim(), plain(left) ? "1" : unit, loose);
  const b = one(right.trim(), plain(right) ? "1" : unit, loose);
  if (a.kind === "ambiguous") return a;
  if (b.kind === "ambiguous") return b;
  if (a.kind !== "value" || b.kind !== "value") return null;
  if (match[2] === "/" && b.value === 0) return refused(text.indexOf("/"), "Division by zero.", "Change the divisor.");
  return accepted(match[2] === "*" ? a.value * b.value : a.value / b.value, unit, options);
}

function one(text: string, unit: UnitName, options: ParseOptions): Parsed {
  const sign = /^[-+]/.exec(text)?.[0] ?? "";
  const body = text.slice(sign.length).trim();
  const read = codeOf(body) ?? numberOf(body, options);
  if (read === null) return notUnderstood(text, unit);
  if ("kind" in read) return read;
  const scale = scaleOf(read.tail, unit);
  if (scale === null)
    return refused(text.length - read.tail.length, tailWhy(read.tail, unit), `For example ${exampleOf(unit)}.`);
  const value = Number(`${sign}${read.mantissa}e${read.exponent + scale.power}`);
  if (unit === "ohm" && scale.prefix === "m") return milliohm(value);
  return accepted(value, unit, options);
}

interface Read {
  /** Decimal digits with a point, and a power of ten. */
  readonly mantissa: string;
  readonly exponent: number;
  readonly tail: string;
}

/** IEC 60062: `4k7`, `R47`, `47K3`, `n33`, `2R2`: the letter is the decimal mark and the prefix. */
function codeOf(body: string): Read | null {
  const match = /^(\d*)([RrLkKMGTpnµumF])(\d+)\s*(.*)$/.exec(body);
  if (match === null || (match[1] === "" && match[3] === "")) return null;
  const [, whole = "", letter = "", fraction = "", rest = ""] = match;
  if (/[fF]/.test(letter) && whole === "") return null;
  return { mantissa: `${whole === "" ? "0" : whole}.${fraction}`, exponent: 0, tail: `${letter}${rest}` };
}

function numberOf(body: string, options: ParseOptions): Read | Parsed | null {
  const match = /^(\d+(?:[.,]\d*)?|[.,]\d+)(?:[eE]([-+]?\d{1,4}))?\s*(.*)$/.exec(body);
  if (match === null) return null;
  const [, digits = "", exponent, tail = ""] = match;
  // Three figures after the mark, none of them telling: a thousand or a decimal?
  if (options.locale === "comma" && /^[1-9]\d{0,2}[.,]\d{3}$/.test(digits) && exponent === undefined) {
    const asDecimal = Number(digits.replace(",", "."));
    const asThousand = Number(digits.replace(/[.,]/, ""));
    return {
      kind: "ambiguous",
      why: `${digits} may be ${asDecimal} or ${asThousand}.`,
      choices: [
        { label: String(asDecimal), value: asDecimal },
        { label: String(asThousand), value: asThousand },
      ],
    };
  }
  return { mantissa: digits.replace(",", "."), exponent: Number(exponent ?? 0), tail };
}

interface Scale {
  readonly power: number;
  readonly prefix: string;
}

/** Power of ten of what follows the digits; null: not this unit. */
function scaleOf(tail: string, unit: UnitName): Scale | null {
  const text = tail.trim();
  const { spellings, prefixes: prefixed } = units[unit];
  if (unit === "1") {
    if (text === "") return { power: 0, prefix: "" };
    if (text === "%") return { power: -2, prefix: "" };
    if (text === "ppm") return { power: -6, prefix: "" };
    if (/^[kKMG]$/.test(text)) return { power: prefixes[text]!, prefix: text };
    return null;
  }
  if ((unit === "1/K" || unit === "1/V") && /^ppm(\/[KV])?$/.test(text)) return { power: -6, prefix: "" };
  if (text === "" || spellings.includes(text)) return { power: 0, prefix: "" };
  if (unit === "ohm" && /^[Rr](\s*(Ω|ohm))?$/.test(text)) return { power: 0, prefix: "" };
  if (unit === "ohm" && /^L$/.test(text)) return { power: -3, prefix: "L" };
  if (unit === "ohm" && /^meg(ohm|\.)?$/i.test(text)) return { power: 6, prefix: "M" };
  if (unit === "ohm" && /^kilohms?$/i.test(text)) return { power: 3, prefix: "k" };
  if (unit === "ohm" && /^megohms?$/i.test(text)) return { power: 6, prefix: "M" };
  if (!prefixed) return null;
  for (const [prefix, power] of Object.entries(prefixes)) {
    if (prefix === "" || !text.startsWith(prefix)) continue;
    const rest = text.slice(prefix.length).trim();
    if (rest === "" || spellings.includes(rest)) return { power, prefix };
  }
  return null;
}

function accepted(value: number, unit: UnitName, options: ParseOptions): Parsed {
  if (!Number.isFinite(value))
    return refused(0, "The number is too large to be held.", "Type a value of physical size.");
  if (value < 0 && options.signed !== true) return refused(0, "The value is negative.", "Type it without the sign.");
  const { least = Number.NEGATIVE_INFINITY, greatest = Number.POSITIVE_INFINITY } = options;
  if (value < least)
    return refused(0, `At least ${show(least, unit)} is needed.`, `Type ${show(least, unit)} or more.`);
  if (value > greatest)
    return refused(0, `At most ${show(greatest, unit)} is allowed.`, `Type ${show(greatest, unit)} or less.`);
  return { kind: "value", value, understood: show(value, unit) };
}

const show = (value: number, unit: UnitName) => formatQuantity(value, unit, { digits: 6, trailing: false });

/** `10m` in a resistor field: m is milli by IEC 60062, but a resistor of milliohms is rarely meant. */
function milliohm(value: number): Parsed {
  const mega = Number((value * 1e9).toPrecision(15));
  return {
    kind: "ambiguous",
    why: "m is milli. Did you mean M, mega?",
    choices: [
      { label: show(mega, "ohm"), value: mega },
      { label: show(value, "ohm"), value },
    ],
  };
}

function notUnderstood(text: string, unit: UnitName): Parsed {
  const at = Math.max(0, text.search(/[^\d.,eE+\-\s]/));
  return refused(
    at,
    `"${text.slice(0, 40)}" is not a number with a unit.`,
    `Type a value, for example ${exampleOf(unit)}.`,
  );
}

function tailWhy(tail: string, unit: UnitName): string {
  const wanted = units[unit].symbol === "" ? "a plain number, % or ppm" : `a form of ${units[unit].symbol}`;
  return `"${tail.trim().slice(0, 20)}" is not ${wanted}.`;
}

import { type UnitName, units } from "./unit.ts";

const thin = "\u2009";
const engineering: readonly (readonly [number, string])[] = [
  [-18, "a"],
  [-15, "f"],
  [-12, "p"],
  [-9, "n"],
  [-6, "µ"],
  [-3, "m"],
  [0, ""],
  [3, "k"],
  [6, "M"],
  [9, "G"],
  [12, "T"],
  [15, "P"],
];

export interface FormatOptions {
  /** Significant digits; default 3. */
  readonly digits?: number;
  /** false: trailing zeros are dropped. */
  readonly trailing?: boolean;
}

/**
 * A number with its unit for a screen: SI prefix, thin space, `digits` significant figures. The one rounding function.
 * Plain numbers below 1 % are written in ppm, fractions in percent where the caller asks by `formatShare`.
 * @example formatQuantity(405063, "ohm") // "405 kΩ"
 */
export function formatQuantity(
  value: number,
  unit: UnitName,
  { digits = 3, trailing = true }: FormatOptions = {},
): string {
  if (!Number.isFinite(value)) throw new RangeError(`cannot show ${value}`);
  const { symbol, prefixes } = units[unit];
  if (unit === "1") return plainNumber(value, Math.max(digits, 4));
  if (value === 0) return joined("0", symbol);
  if (!prefixes) return joined(figure(value, digits, trailing), symbol);
  const [mantissa, exponent] = scaled(value, digits);
  const prefix = engineering.find(([power]) => power === exponent)![1];
  return joined(figure(mantissa, digits, trailing), `${prefix}${symbol}`);
}

/** Relative number as percent or ppm: 0.0042 → "0.420 %", 1.83e-4 → "183 ppm". */
export function formatShare(value: number, digits = 3): string {
  const size = Math.abs(value);
  if (value !== 0 && size < 1e-3) return joined(figure(value * 1e6, digits, true), "ppm");
  return joined(figure(value * 100, digits, true), "%");
}

const joined = (number: string, unit: string): string =>
  (unit === "" ? number : `${number}${thin}${unit}`).replace("-", "\u2212");

/** Mantissa 1 … 999 after rounding, and the power of ten of its prefix. */
function scaled(value: number, digits: number): [number, number] {
  const rounded = Number(value.toPrecision(digits));
  const power = Math.floor(Math.log10(Math.abs(rounded)) + 1e-12);
  const exponent = Math.min(15, Math.max(-18, Math.floor(power / 3) * 3));
  return [Number(`${rounded}e${-exponent}`) || rounded / 10 ** exponent, exponent];
}

function figure(value: number, digits: number, trailing: boolean): string {
  const text = value.toPrecision(digits);
  const plain = text.includes("e") ? Number(text).toFixed(0) : text;
  return trailing ? plain : plain.replace(/(\.\d*?)0+$/, "$1").replace(/\.$/, "");
}

/** A dimensionless number without prefix: grouped by thin spaces from five figures on. */
function plainNumber(value: number, digits: number): string {
  if (value === 0) return "0";
  const size = Math.abs(value);
  if (size >= 1e9 || size < 1e-4)
    return value
      .toExponential(Math.max(digits - 1, 0))
      .replace("e+", "e")
      .replace("-", "\u2212");
  const decimals = Math.max(0, digits - 1 - Math.floor(Math.log10(size)));
  const text = Number(value.toPrecision(Math.max(digits, Math.floor(Math.log10(size)) + 1)))
    .toFixed(Math.min(decimals, 12))
    .replace(/(\.\d*?)0+$/, "$1")
    .replace(/\.$/, "");
  const [whole = "", fraction] = text.split(".");
  const grouped = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+(?!\d))/g, thin) : whole;
  return (fraction === undefined ? grouped : `${grouped}.${fraction}`).replace("-", "\u2212");
}

/**
 * All digits, so that parsing the text gives back exactly the same number: the shortest decimal, with the unit and no prefix
 * unless the prefixed form reads back the same. parse(formatExact(x)) = x for every finite x.
 */
export function formatExact(value: number, unit: UnitName): string {
  if (!Number.isFinite(value)) throw new RangeError(`cannot show ${value}`);
  const { symbol, prefixes } = units[unit];
  if (value === 0 || !prefixes) return symbol === "" ? String(value) : `${value} ${symbol}`;
  // A resistance of "m" ohms would be asked about: below 1 Ω it is written plainly.
  if (unit === "ohm" && Math.abs(value) < 1) return `${value} ${symbol}`;
  for (const [power, prefix] of [...engineering].reverse()) {
    const size = Math.abs(value) / 10 ** power;
    if (size < 1 || size >= 1000 || "aP".includes(prefix || "-")) continue;
    const digits = shifted(String(value), -power);
    if (Number(`${digits}e${power}`) === value) return `${digits} ${prefix}${symbol}`;
  }
  return `${value} ${symbol}`;
}

/** The decimal text of a number with its point moved, exactly: shifted("4.7e-11", 12) → "47". */
export function shifted(text: string, places: number): string {
  const [mantissa = "0", exponent = "0"] = text.split("e");
  const sign = mantissa.startsWith("-") ? "-" : "";
  const [whole = "", fraction = ""] = mantissa.replace("-", "").split(".");
  const digits = `${whole}${fraction}`;
  const point = whole.length + Number(exponent) + places;
  const padded = point <= 0 ? `${"0".repeat(1 - point)}${digits}` : digits.padEnd(point, "0");
  const at = Math.max(point, 1);
  const result = `${padded.slice(0, at)}.${padded.slice(at)}`.replace(/0+$/, "").replace(/\.$/, "");
  return `${sign}${result.replace(/^0+(?=\d)/, "")}`;
}

/** Marking code of IEC 60062 for a resistance or capacitance: 4700 Ω → "4K7", 4.7e-9 F → "4n7". */
export function letterCode(value: number, unit: "ohm" | "F"): string {
  const letters: readonly (readonly [number, string])[] =
    unit === "ohm"
      ? [
          [12, "T"],
          [9, "G"],
          [6, "M"],
          [3, "K"],
          [0, "R"],
          [-3, "L"],
        ]
      : [
          [0, "F"],
          [-3, "m"],
          [-6, "µ"],
          [-9, "n"],
          [-12, "p"],
        ];
  const [power, letter] = letters.find(([each]) => value >= 10 ** each * 0.9999) ?? letters.at(-1)!;
  const [whole = "", fraction = ""] = shifted(String(Number(value.toPrecision(12))), -power).split(".");
  return `${whole === "0" ? "" : whole}${letter}${fraction}`;
}

/** Value and expanded uncertainty: uncertainty to two figures, value to the same place (JCGM 100:2008, 7.2.6). */
export function formatUncertain(value: number, uncertainty: number, unit: UnitName): string {
  if (!(uncertainty > 0)) return formatQuantity(value, unit, { digits: 6 });
  const [, exponent] = units[unit].prefixes && value !== 0 ? scaled(value, 3) : [value, 0];
  const prefix = engineering.find(([power]) => power === exponent)?.[1] ?? "";
  const U = Number((uncertainty / 10 ** exponent).toPrecision(2));
  const places = Math.max(0, 1 - Math.floor(Math.log10(U)));
  return joined(`${(value / 10 ** exponent).toFixed(places)} ± ${U.toFixed(places)}`, `${prefix}${units[unit].symbol}`);
}

import { formatQuantity, type UnitName } from "../../solver/index.ts";

const prefixes: Readonly<Record<number, string>> = {
  "-15": "f",
  "-12": "p",
  "-9": "n",
  "-6": "µ",
  "-3": "m",
  0: "",
  3: "k",
  6: "M",
  9: "G",
  12: "T",
};

/** Tick text in engineering steps: 1, 10, 100, 1 k, 10 k; thin space before the prefix. */
export function axisText(value: number): string {
  if (value === 0) return "0";
  const size = Math.abs(value);
  const exponent = Math.min(12, Math.max(-15, 3 * Math.floor((Math.log10(size) + 1e-9) / 3)));
  const digits = Number((value / 10 ** exponent).toPrecision(6));
  const prefix = prefixes[exponent]!;
  return `${minus(String(digits))}${prefix === "" ? "" : `\u2009${prefix}`}`;
}

/** Plain number for an axis of dB, percent or degrees. */
export function plainText(value: number): string {
  return minus(String(Number(value.toPrecision(6))));
}

const minus = (text: string): string => text.replace("-", "\u2212");

/** A value with prefix and unit, at most `digits` significant, no trailing zeros: "12.6 kHz". */
export const withUnit = (value: number, unit: UnitName, digits = 4): string =>
  formatQuantity(value, unit, { digits, trailing: false });

/** A computed figure with all its digits, so that a column lines up: "2.00 kV". */
export const figureText = (value: number, unit: UnitName, digits = 3): string =>
  formatQuantity(value, unit, { digits });

/** A signed number: "+0.03", "−1.2"; what only rounding of the arithmetic leaves is "0". */
export function signed(value: number, digits = 3): string {
  const rounded = Math.abs(value) < 1e-9 ? 0 : Number(value.toPrecision(digits));
  return rounded > 0 ? `+${rounded}` : plainText(rounded);
}

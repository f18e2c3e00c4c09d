import type { PartsLine, PartsList } from "./partsList.ts";

/** *data*: comma, decimal point, no byte-order mark. *spreadsheet*: byte-order mark; separator and decimal mark of the locale. */
export type CsvFlavour = "data" | "spreadsheet";

export interface SpreadsheetLocale {
  readonly separator: "," | ";";
  readonly decimalMark: "." | ",";
}

const header = [
  "designators",
  "place",
  "part",
  "value",
  "value_base_unit",
  "unit",
  "tolerance_percent",
  "rating",
  "quantity",
  "spares",
  "buy",
  "note",
] as const;

/**
 * The parts list as CSV by RFC 4180 (CRLF, quotes doubled). Values stand as plain decimals in the base unit and as readable text;
 * designators in one quoted cell; empty means none. Text that a spreadsheet would run as a formula gets an apostrophe;
 * numbers are numbers and are never touched.
 */
export function partsListCsv(
  list: PartsList,
  flavour: CsvFlavour,
  locale: SpreadsheetLocale = { separator: ",", decimalMark: "." },
): string {
  const plain: SpreadsheetLocale = { separator: ",", decimalMark: "." };
  const { separator, decimalMark } = flavour === "data" ? plain : locale;
  if (separator === decimalMark) throw new Error("separator and decimal mark are the same");
  const rows = [header.map((name) => text(name)), ...list.lines.map((line) => cells(line, decimalMark))];
  const body = rows.map((row) => row.join(separator)).join("\r\n");
  return `${flavour === "spreadsheet" ? "\uFEFF" : ""}${body}\r\n`;
}

function cells(line: PartsLine, decimalMark: string): string[] {
  const number = (value: number | null) => (value === null ? "" : plainDecimal(value).replace(".", decimalMark));
  return [
    `"${line.designators.map(disarmed).join(" ").replaceAll('"', '""')}"`,
    text(line.place),
    text(line.name),
    text(line.valueText),
    number(line.value),
    text(line.unit),
    number(line.tolerance === null ? null : percent(line.tolerance)),
    text(line.rating),
    String(line.quantity),
    String(line.spares),
    String(line.buy),
    text(line.note),
  ];
}

const percent = (share: number) => Number((share * 100).toPrecision(12));

/** The shortest decimal that reads back as the same number, without an exponent: 4.7e-11 → 0.000000000047. */
export function plainDecimal(value: number): string {
  if (!Number.isFinite(value)) throw new RangeError("not a finite number");
  const [mantissa = "0", exponent] = String(value).split("e");
  if (exponent === undefined) return mantissa;
  const sign = mantissa.startsWith("-") ? "-" : "";
  const [whole = "0", fraction = ""] = mantissa.replace("-", "").split(".");
  const shift = Number(exponent);
  const digits = whole + fraction;
  const point = whole.length + shift;
  if (point <= 0) return `${sign}0.${"0".repeat(-point)}${digits}`;
  if (point >= digits.length) return `${sign}${digits}${"0".repeat(point - digits.length)}`;
  return `${sign}${digits.slice(0, point)}.${digits.slice(point)}`;
}

/** Text cell, quoted whenever it is not plain words. */
function text(value: string): string {
  const safe = disarmed(value);
  return /^[\p{L}\p{N} ._/%-]*$/u.test(safe) && safe === safe.trim() ? safe : `"${safe.replaceAll('"', '""')}"`;
}

/** After leading white space, and after every line break inside a cell: = + - @ (also full-width), tab, CR, LF or NUL get an apostrophe. */
export function disarmed(value: string): string {
  return value.replace(/(^|\r\n|[\r\n])([^\S\r\n\0]*)(?=[=+\-@＝＋－＠\t\r\n\0])/g, "$1'$2");
}

/** The numbers behind a chart: one column a quantity, in base units. */
export interface Column {
  /** Name with its unit for the data file: `frequency_Hz`. */
  readonly key: string;
  /** Head of the table: "frequency / Hz". */
  readonly head: string;
  readonly values: readonly (number | string | null)[];
}

/** A number as a plain decimal, never with an exponent, all its digits. */
export function plainDecimal(value: number): string {
  const text = String(value);
  const parts = /^(-?)(\d+)(?:\.(\d+))?e([+-]\d+)$/.exec(text);
  if (parts === null) return text;
  const [, sign, whole, fraction = "", power] = parts;
  const digits = `${whole}${fraction}`;
  const point = whole!.length + Number(power);
  if (point <= 0) return `${sign}0.${"0".repeat(-point)}${digits}`;
  if (point >= digits.length) return `${sign}${digits}${"0".repeat(point - digits.length)}`;
  return `${sign}${digits.slice(0, point)}.${digits.slice(point)}`;
}

const cell = (value: number | string | null | undefined): string => {
  if (value === null || value === undefined) return "";
  if (typeof value === "number") return Number.isFinite(value) ? plainDecimal(value) : "";
  return /[",\r\n]/.test(value) ? `"${value.replaceAll('"', '""')}"` : value;
};

/** RFC 4180, decimal point, base units; an empty cell means none. */
export function columnsCsv(columns: readonly Column[]): string {
  const length = Math.max(0, ...columns.map((column) => column.values.length));
  const lines = [columns.map((column) => cell(column.key)).join(",")];
  for (let i = 0; i < length; i += 1) lines.push(columns.map((column) => cell(column.values[i])).join(","));
  return `${lines.join("\r\n")}\r\n`;
}

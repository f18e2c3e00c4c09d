import { plainDecimal } from "../../solver/index.ts";

/** The numbers behind a chart: one column a quantity, in base units. */
export interface Column {
  /** Name with its unit for the data file: `frequency_Hz`. */
  readonly key: string;
  /** Head of the table: "frequency / Hz". */
  readonly head: string;
  readonly values: readonly (number | string | null)[];
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

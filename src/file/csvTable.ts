/** A comma-separated file as rows of cells: read only, whatever a spreadsheet made of it. */
import Papa from "papaparse";
import type { Refusal, Result } from "../solver/index.ts";

export const csvLimits = { size: 1_000_000, rows: 500, cells: 100, cell: 2000 } as const;

export interface CsvRow {
  /** Line of the file on which the row begins, 1 for the first. */
  readonly line: number;
  readonly cells: readonly string[];
  /** Why the row cannot be read; null: it can. */
  readonly fault: string | null;
}

export interface CsvTable {
  readonly rows: readonly CsvRow[];
  readonly separator: "," | ";" | "\t";
  /** Some cell holds a decimal comma: a point between figures may then be a mark for thousands. */
  readonly decimalComma: boolean;
}

const refused = (where: string, why: string, cure: string): Result<never> => ({
  ok: false,
  error: { where, why, cure } satisfies Refusal,
});

/** Rows with something in them. Separator comma, semicolon or tab, told by the first line; quotes by RFC 4180. Never throws. */
export function readCsvTable(text: string): Result<CsvTable> {
  if (text.length > csvLimits.size)
    return refused("the file", `It has more than ${csvLimits.size} characters.`, "Split it.");
  if (text.includes("\0")) return refused("the file", "It is no plain text.", "Save it as CSV, UTF-8, and read that.");
  const { body, skipped, told } = withoutPreamble(text);
  const separator = told ?? separatorOf(body);
  const rows = rowsOf(body, separator, skipped);
  if (rows.length > csvLimits.rows + 1)
    return refused("the file", `It has more than ${csvLimits.rows} rows.`, "Split it.");
  const decimalComma = rows.some(({ cells }) => cells.some((cell) => /^\s*[-+]?\d+,\d/.test(cell)));
  return { ok: true, value: { rows, separator, decimalComma: separator !== "," && decimalComma } };
}

/** Takes off the byte-order mark and the line `sep=;` that some spreadsheets write. */
function withoutPreamble(text: string) {
  const plain = text.replace(/^\uFEFF/, "");
  const found = /^sep=([,;\t])(?:\r\n|\r|\n)/i.exec(plain);
  return found === null
    ? { body: plain, skipped: 0, told: null }
    : { body: plain.slice(found[0].length), skipped: 1, told: found[1] as CsvTable["separator"] };
}

/** Heads hold neither tab nor semicolon, so whichever stands in the first line outside quotes is the separator. */
function separatorOf(body: string): CsvTable["separator"] {
  const first = (/[^\r\n]+/.exec(body)?.[0] ?? "").replace(/"[^"]*"/g, "");
  return first.includes("\t") ? "\t" : first.includes(";") ? ";" : ",";
}

function rowsOf(body: string, separator: string, skipped: number): CsvRow[] {
  const rows: CsvRow[] = [];
  let line = skipped + 1;
  let at = 0;
  Papa.parse<string[]>(body, {
    delimiter: separator,
    step: ({ data, errors, meta }, parser) => {
      const fault = faultOf(data, errors[0]);
      if (data.some((cell) => cell.trim() !== "")) rows.push({ line, cells: data, fault });
      line += body.slice(at, meta.cursor).match(/\r\n|\r|\n/g)?.length ?? 0;
      at = meta.cursor;
      if (rows.length > csvLimits.rows + 1) parser.abort();
    },
  });
  return rows;
}

function faultOf(cells: readonly string[], error: Papa.ParseError | undefined): string | null {
  if (error?.type === "Quotes") return "A quotation mark is opened and not closed, or closed within a cell.";
  if (cells.length > csvLimits.cells) return `The row has more than ${csvLimits.cells} cells.`;
  if (cells.some((cell) => cell.length > csvLimits.cell)) return `A cell is longer than ${csvLimits.cell} characters.`;
  return null;
}

/** What lies in the drawer: a column of a file of families, or a file of its own. */
import {
  type CapacitorFamily,
  formatQuantity,
  type InHand,
  type Refusal,
  type ResistorFamily,
  type Result,
  withInHand,
  withinRange,
} from "../solver/index.ts";
import { cellNumber } from "./csvNumber.ts";
import { type CsvRow, readCsvTable } from "./csvTable.ts";

type Family = ResistorFamily | CapacitorFamily;
const problem = (where: string, why: string, cure: string): Refusal => ({ where, why, cure });
const refused = (where: string, why: string, cure: string): Result<never> => ({
  ok: false,
  error: problem(where, why, cure),
});
const mostOfOne = 1e6;

/** @example readInHand("20 x 10M, 12 x 4M7", "ohm", false) // 20 of 10 MΩ, 12 of 4.7 MΩ */
export function readInHand(text: string, unit: "ohm" | "F", decimalComma: boolean): Result<readonly InHand[]> {
  const list: InHand[] = [];
  for (const item of text.split(/[,;\n]\s+|[;\n]/).filter((one) => one.trim() !== "")) {
    const split = /^\s*(\d{1,7})\s*[x×*]\s*(.+)$/.exec(item);
    if (split === null)
      return refused("inHand", `"${item.trim().slice(0, 40)}" is not a count and a value.`, "Write 20 x 10M.");
    const read = cellNumber(split[2]!.trim(), { where: "inHand", unit, factor: 1, signed: false, decimalComma });
    if (!read.ok) return read;
    if (read.value === 0) return refused("inHand", "A value of 0 is no part.", "Write the value of the part.");
    list.push({ value: read.value, count: Number(split[1]) });
  }
  return { ok: true, value: list };
}

/** One row of a drawer's file as it would be taken, or why it is not. */
export interface DrawerRow {
  readonly line: number;
  readonly ok: boolean;
  /** Name of the family it belongs to, as far as it is known. */
  readonly name: string;
  readonly problem?: Refusal;
}

export interface Drawer {
  /** The families given, those found in the drawer with what is in hand of them. */
  readonly families: readonly Family[];
  readonly rows: readonly DrawerRow[];
  /** Why the file as a whole cannot be read; null: it can. */
  readonly refused: Refusal | null;
}

/**
 * Reads a file with `value,count` or `value,count,family`, with or without a head, into the families given; what they already list
 * is added to. The family is told by id or name and may be left out where only one is given. A bad row sinks only itself.
 * @example readDrawerCsv("value,count\n10M,20\n4M7,12", [family])
 */
export function readDrawerCsv(text: string, families: readonly Family[]): Drawer {
  const table = readCsvTable(text);
  if (!table.ok) return { families, rows: [], refused: table.error };
  const { rows, decimalComma } = table.value;
  const head = headOf(rows[0]);
  const found = new Map<Family, InHand[]>();
  const read = (head.given ? rows.slice(1) : rows).map((row): DrawerRow => {
    const taken = readRow(row, head, families, decimalComma);
    if (!taken.ok) return { line: row.line, ok: false, name: cellAt(row, head.family), problem: taken.error };
    const { family, item } = taken.value;
    found.set(family, [...(found.get(family) ?? []), item]);
    return { line: row.line, ok: true, name: family.name };
  });
  const filled = families.map((family) => (found.has(family) ? withInHand(family, found.get(family)!) : family));
  return { families: filled, rows: read, refused: null };
}

interface Head {
  readonly given: boolean;
  readonly value: number;
  readonly count: number;
  readonly family: number;
}

function headOf(row: CsvRow | undefined): Head {
  const words = (row?.cells ?? []).map((cell) => cell.trim().toLowerCase());
  const [value, count, family] = ["value", "count", "family"].map((word) => words.indexOf(word)) as [
    number,
    number,
    number,
  ];
  return value >= 0 && count >= 0
    ? { given: true, value, count, family }
    : { given: false, value: 0, count: 1, family: 2 };
}

const cellAt = (row: CsvRow, at: number): string => (row.cells[at] ?? "").trim();

function readRow(row: CsvRow, head: Head, families: readonly Family[], decimalComma: boolean) {
  if (row.fault !== null) return refused("row", row.fault, "Mend the row.");
  const named = cellAt(row, head.family);
  const fits = named === "" ? families : families.filter((each) => each.id === named || each.name === named);
  const [family] = fits;
  if (family === undefined)
    return refused("family", `No family is named "${named.slice(0, 40)}".`, "Add the family first, or mend its name.");
  if (fits.length > 1)
    return refused("family", "Several families could be meant.", "Add a column family with the name of each.");
  const unit = family.kind === "resistor" ? "ohm" : "F";
  const meaning = { where: "value", unit, factor: 1, signed: false, decimalComma } as const;
  const value = cellNumber(cellAt(row, head.value), meaning);
  if (!value.ok) return value;
  if (!withinRange(family, value.value))
    return refused(
      "value",
      `${formatQuantity(value.value, unit)} lies outside the range of ${family.name}.`,
      "Mend the value, or widen the range of the family.",
    );
  const text = cellAt(row, head.count);
  if (!/^\d{1,7}$/.test(text) || Number(text) > mostOfOne)
    return refused(
      "count",
      `"${text.slice(0, 40)}" is no whole count up to ${mostOfOne}.`,
      "Write how many there are.",
    );
  return { ok: true, value: { family, item: { value: value.value, count: Number(text) } } } as const;
}

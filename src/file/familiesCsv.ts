/** Own families from a CSV file, one a row: each is shown as it would be taken before any is. */
import {
  type CapacitorFamily,
  type Part,
  type Refusal,
  type ResistorFamily,
  type Result,
  sizingRefusal,
  validateFamily,
} from "../solver/index.ts";
import { wellFormed } from "./clean.ts";
import { cellNumber } from "./csvNumber.ts";
import { type CsvRow, type CsvTable, readCsvTable } from "./csvTable.ts";
import { readInHand } from "./drawerCsv.ts";
import { headOf, needed, quantityColumns, type ReadHead } from "./familyColumns.ts";
import { partShape } from "./partShape.ts";
import { read } from "./read.ts";
import { Lost, Reading } from "./reading.ts";

type Family = ResistorFamily | CapacitorFamily;

/** One row as it would be taken, or why it is not. A row that is taken may still have a problem: it cannot be sized with yet. */
export interface FamilyRow {
  readonly line: number;
  readonly ok: boolean;
  readonly name: string;
  readonly problem?: Refusal;
  /** null: the row is refused. */
  readonly family: Family | null;
  /** Ratings that the row leaves blank and a cautious stand-in fills. */
  readonly assumed: readonly string[];
}

export interface FamiliesRead {
  readonly families: readonly Family[];
  readonly rows: readonly FamilyRow[];
  /** Columns that mean nothing here. */
  readonly unread: readonly string[];
  /** Why the file as a whole cannot be read; null: it can. */
  readonly refused: Refusal | null;
}

const problem = (where: string, why: string, cure: string): Refusal => ({ where, why, cure });
const refuse = (where: string, why: string, cure: string): Result<never> => ({
  ok: false,
  error: problem(where, why, cure),
});

/**
 * Reads families from a CSV with a head of `familyColumns` in any order. A bare number is in the unit that its head names
 * (`limitingVoltage_V`, `bodyLength_mm`); a number with a unit or a letter code is read as written. Never throws; a bad row sinks only itself.
 * @param known parts that the document has already: no id or name is given twice
 */
export function readFamiliesCsv(text: string, known: readonly Part[] = []): FamiliesRead {
  const none = (refused: Refusal): FamiliesRead => ({ families: [], rows: [], unread: [], refused });
  const table = readCsvTable(text);
  if (!table.ok) return none(table.error);
  const [first, ...rest] = table.value.rows;
  const heads = (first?.cells ?? []).map(headOf);
  const fault = headFault(first, heads);
  if (fault !== null) return none(fault);
  const taken: Part[] = [...known];
  const rows = rest.map((row) => {
    const found = readRow(row, heads, table.value, taken);
    if (found.family !== null) taken.push(found.family);
    return found;
  });
  const unread = first!.cells.map((cell) => cell.trim()).filter((cell, i) => cell !== "" && heads[i] === null);
  return { families: rows.flatMap((row) => row.family ?? []), rows, unread, refused: null };
}

function headFault(row: CsvRow | undefined, heads: readonly (ReadHead | null)[]): Refusal | null {
  const keys = heads.flatMap((head) => head?.key ?? []);
  const twice = keys.find((key, i) => keys.indexOf(key) !== i);
  if (
    row === undefined ||
    row.fault !== null ||
    !keys.includes("name") ||
    !keys.some((key) => key.startsWith("least_"))
  )
    return problem("the first line", "It does not name the columns.", "Begin with the line that the empty file has.");
  return twice === undefined
    ? null
    : problem("the first line", `It names ${twice} twice.`, "Leave one of the two columns out.");
}

type Cells = Readonly<Record<string, { readonly text: string; readonly factor: number }>>;

function readRow(row: CsvRow, heads: readonly (ReadHead | null)[], table: CsvTable, taken: readonly Part[]): FamilyRow {
  const cells: Record<string, { text: string; factor: number }> = {};
  heads.forEach((head, i) => {
    const text = plainText(row.cells[i] ?? "");
    if (head !== null && text !== "") cells[head.key] = { text, factor: head.factor };
  });
  const name = cells.name?.text ?? "";
  const extra = row.cells.slice(heads.length).some((cell) => cell.trim() !== "");
  const family =
    row.fault !== null
      ? refuse("row", row.fault, "Mend the row.")
      : extra
        ? refuse("row", "It has more cells than the first line has columns.", "Quote cells that hold the separator.")
        : familyOf(cells, name, table, taken);
  if (!family.ok) return { line: row.line, ok: false, name, problem: family.error, family: null, assumed: [] };
  const later = sizingRefusal(family.value.family);
  return { line: row.line, ok: true, name, ...family.value, ...(later === null ? {} : { problem: later }) };
}

/** Text as typed, on one line, with no half characters; the apostrophe that keeps a spreadsheet from running it is taken off. */
const plainText = (cell: string): string =>
  wellFormed(cell)
    .replace(/\s+/g, " ")
    .trim()
    .replace(/^'(?=[=+\-@＝＋－＠])/, "");

function familyOf(
  cells: Cells,
  name: string,
  { decimalComma }: CsvTable,
  taken: readonly Part[],
): Result<{ readonly family: Family; readonly assumed: readonly string[] }> {
  const kind = kindOf(cells);
  if (!kind.ok) return kind;
  if (taken.some((part) => part.name === name))
    return refuse("name", "A family of this name is there already.", "Give it a name of its own.");
  const raw = rawOf(cells, kind.value, decimalComma);
  if (!raw.ok) return raw;
  const missing = needed[kind.value].find((key) => raw.value[key] === undefined);
  if (missing !== undefined)
    return refuse(missing, "It is missing, and nothing may stand in for it.", "Type it from the data sheet.");
  return whole({ ...raw.value, kind: kind.value, id: freeId(taken, kind.value), name, origin: "typed" });
}

/** A missing kind is told by the values that the row gives. */
function kindOf(cells: Cells): Result<"resistor" | "capacitor"> {
  const stated = cells.kind?.text ?? (cells.least_ohm ? "resistor" : cells.least_F ? "capacitor" : "");
  return stated === "resistor" || stated === "capacitor"
    ? { ok: true, value: stated }
    : refuse("kind", `"${stated.slice(0, 40)}" is neither resistor nor capacitor.`, "Write resistor or capacitor.");
}

/** The row with keys and values as a saved document has them. */
function rawOf(
  cells: Cells,
  kind: "resistor" | "capacitor",
  decimalComma: boolean,
): Result<Readonly<Record<string, unknown>>> {
  const raw: Record<string, unknown> = {};
  for (const key of kind === "resistor" ? ["series", "use"] : ["series", "dielectric", "dielectricClass"])
    if (cells[key] !== undefined) raw[key] = cells[key].text;
  for (const { key, unit, signed = false } of quantityColumns[kind]) {
    const cell = cells[key];
    if (cell === undefined) continue;
    const value = cellNumber(cell.text, { where: key, unit, factor: cell.factor, signed, decimalComma });
    if (!value.ok) return value;
    raw[key] = value.value;
  }
  if (kind === "capacitor" && raw.dielectric === undefined && raw.dielectricClass !== undefined)
    raw.dielectric = raw.dielectricClass;
  const { seriesAboveFrom_ohm: from_ohm, ...rest } = raw;
  if (from_ohm !== undefined || cells.seriesAbove !== undefined)
    rest.seriesAbove = { from_ohm, series: cells.seriesAbove?.text };
  if (cells.inHand === undefined) return { ok: true, value: rest };
  const inHand = readInHand(cells.inHand.text, kind === "resistor" ? "ohm" : "F", decimalComma);
  return inHand.ok ? { ok: true, value: { ...rest, inHand: inHand.value } } : inHand;
}

/** Filled as a saved document would be; what would be repaired there is refused here. */
function whole(raw: Readonly<Record<string, unknown>>) {
  const reading = new Reading(raw);
  const part = read(partShape, raw, { from: "", to: "" }, {}, reading);
  const key = (pointer: string) => pointer.replace(/^\//, "");
  if (part instanceof Lost) return refuse(key(part.from), `${part.why}.`, "Mend the cell.");
  const [repair] = reading.repairs;
  if (repair !== undefined) return refuse(key(repair.pointer), `${repair.fault}.`, "Mend the cell, or leave it blank.");
  const valid = validateFamily(part);
  return valid.ok ? { ok: true as const, value: { family: valid.value, assumed: reading.assumed.map(key) } } : valid;
}

function freeId(taken: readonly Part[], kind: string): string {
  const ids = new Set(taken.map((part) => part.id));
  let i = 1;
  while (ids.has(`own-${kind}-${i}`)) i += 1;
  return `own-${kind}-${i}`;
}

import Papa from "papaparse";
import { type CapacitorFamily, disarmed, type Part, parseQuantity, type SeriesName } from "../../solver/index.ts";
import { type Draft, draftedPart, draftFields, type FamilyKind, freeId } from "./draftFamily.ts";

/** One row of a file of families: the part it makes, or what is wrong with it; nothing is taken from a row with a fault. */
export interface FamilyRow {
  /** Row of the table, 1 for the first below the head. */
  readonly row: number;
  readonly name: string;
  readonly part: Part | null;
  readonly faults: readonly string[];
  readonly assumed: readonly string[];
}

export interface FamilyRows {
  readonly rows: readonly FamilyRow[];
  /** Columns that mean nothing here and are left unread. */
  readonly unread: readonly string[];
  /** Why the file as a whole cannot be read; null: it can. */
  readonly refused: string | null;
}

const series: readonly SeriesName[] = ["E3", "E6", "E12", "E24", "E48", "E96", "E192"];
const classes: readonly CapacitorFamily["dielectricClass"][] = [
  "class1",
  "class2",
  "film",
  "mica",
  "air",
  "electrolytic",
];
const plainColumns = ["kind", "name", "series", "dielectricClass", "inHand"];
const quantityColumns = [...new Set([...draftFields.resistor, ...draftFields.capacitor].map((f) => f.key))];
const mostRows = 500;
const longestText = 1_000_000;

/** The head of such a file: keys as in a saved document, with their units. */
export const familyColumns: readonly string[] = [...plainColumns, ...quantityColumns];
export const emptyFamilyFile = `${familyColumns.join(",")}\r\n`;

/**
 * Reads families from a CSV with one family a row. A bare number is in the unit of its column's key (m, W, V, a share for the
 * tolerance); a number with a unit or a letter code is read as written. Separator comma, semicolon or tab; a bad row sinks only itself.
 */
export function readFamilyRows(text: string, parts: readonly Part[]): FamilyRows {
  const none = (refused: string): FamilyRows => ({ rows: [], unread: [], refused });
  if (text.length > longestText) return none("The file is longer than a million characters.");
  const table = Papa.parse<Record<string, string>>(text.replace(/^\uFEFF/, ""), {
    header: true,
    skipEmptyLines: "greedy",
    delimitersToGuess: [",", ";", "\t"],
    transformHeader: (head) => head.trim(),
  });
  const heads = table.meta.fields ?? [];
  if (!heads.includes("kind") || !heads.includes("name"))
    return none('The first line must name the columns, "kind" and "name" among them.');
  if (table.data.length > mostRows) return none(`More than ${mostRows} rows: split the file.`);
  const unread = heads.filter((head) => head !== "" && !familyColumns.includes(head)).map(disarmed);
  const known: Part[] = [...parts];
  const rows = table.data.map((cells, i) => {
    const read = readRow(cells, i + 1, known);
    if (read.part !== null) known.push(read.part);
    return read;
  });
  return { rows, unread, refused: null };
}

function readRow(cells: Readonly<Record<string, string>>, row: number, known: readonly Part[]): FamilyRow {
  const cell = (key: string) => (Object.hasOwn(cells, key) ? (cells[key] ?? "") : "").trim();
  const name = cell("name");
  const kind = cell("kind");
  const bad = (fault: string): FamilyRow => ({ row, name, part: null, faults: [fault], assumed: [] });
  if (kind !== "resistor" && kind !== "capacitor") return bad(`kind: "${kind}" is neither resistor nor capacitor.`);
  if (Object.hasOwn(cells, "__parsed_extra")) return bad("The row has more cells than the head has columns.");
  const wanted = cell("series") === "" ? "E24" : cell("series");
  const found = series.find((each) => each === wanted);
  if (found === undefined) return bad(`series: "${wanted}" is not one of ${series.join(", ")}.`);
  const dielectric = cell("dielectricClass") === "" ? "class2" : cell("dielectricClass");
  const dielectricClass = classes.find((each) => each === dielectric);
  if (dielectricClass === undefined)
    return bad(`dielectricClass: "${dielectric}" is not one of ${classes.join(", ")}.`);
  const texts = textsOf(kind, cell);
  const draft: Draft = { kind, name, series: found, dielectricClass, inHand: cell("inHand"), texts };
  const drafted = draftedPart(draft, freeId(known, kind));
  const faults = Object.entries(drafted.faults).map(([key, fault]) => `${key}: ${fault}`);
  if (known.some((part) => part.name === name)) faults.push("name: a family of this name is there already.");
  return { row, name, part: faults.length === 0 ? drafted.part : null, faults, assumed: drafted.assumed };
}

/** Cells as the form would hold them: a bare number in base units becomes one in the unit that the form shows. */
function textsOf(kind: FamilyKind, cell: (key: string) => string): Record<string, string> {
  const texts: Record<string, string> = {};
  for (const field of draftFields[kind]) {
    const text = cell(field.key);
    const bare = parseQuantity(text, "1", { signed: true });
    const scaled = field.scale !== 1 && bare.kind === "value" && /^[-+\d.,eE]+$/.test(text);
    texts[field.key] = scaled ? String(Number((bare.value / field.scale).toPrecision(15))) : text;
  }
  return texts;
}

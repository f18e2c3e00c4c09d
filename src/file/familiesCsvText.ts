/** Families written as the CSV that `readFamiliesCsv` reads. */
import { type CapacitorFamily, catalogued, disarmed, plainDecimal, type ResistorFamily } from "../solver/index.ts";
import { familyColumns } from "./familyColumns.ts";

type Family = ResistorFamily | CapacitorFamily;

/** RFC 4180: comma, CRLF, quotes doubled. Text that a spreadsheet would run as a formula gets an apostrophe. */
export function familiesCsvText(families: readonly Family[]): string {
  return `${[familyColumns, ...families.map(cellsOf)].map((row) => row.map(quoted).join(",")).join("\r\n")}\r\n`;
}

/** A head with two rows to write over: a resistor and a capacitor family. */
export const familiesCsvTemplate = (): string =>
  familiesCsvText([
    { ...catalogued("resistors", "hv-film-1")!, name: "example: high-voltage film, 1 W, axial" },
    { ...catalogued("capacitors", "c0g-1k")!, name: "example: class 1 ceramic chip, 1 kV" },
  ]);

function cellsOf(family: Family): string[] {
  const above = family.kind === "resistor" ? family.seriesAbove : null;
  const own: Readonly<Record<string, unknown>> = {
    ...family,
    seriesAbove: above?.series ?? null,
    seriesAboveFrom_ohm: above?.from_ohm ?? null,
    inHand: (family.inHand ?? []).map(({ value, count }) => `${count} x ${plainDecimal(value)}`).join("; "),
  };
  return familyColumns.map((key) => {
    const value = own[key];
    if (typeof value === "number") return plainDecimal(value);
    return typeof value === "string" ? disarmed(value) : "";
  });
}

const quoted = (cell: string): string => (/[",;\r\n\t]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell);

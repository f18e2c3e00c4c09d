import type { SpreadsheetLocale } from "../../solver/index.ts";

/** Decimal mark and separator as spreadsheets of this locale read them: a decimal comma goes with a semicolon. */
export function spreadsheetLocale(locale: string | undefined): SpreadsheetLocale {
  const mark = new Intl.NumberFormat(locale).formatToParts(1.5).find((part) => part.type === "decimal")?.value;
  return mark === "," ? { separator: ";", decimalMark: "," } : { separator: ",", decimalMark: "." };
}

import type { SheetData } from "../../solver/index.ts";

/** The number at a path of a sheet; null where it is absent, an array, or does not exist. */
export function sheetNumber(sheet: SheetData, path: string): number | null {
  const value = sheet.values[path];
  return typeof value === "number" && Number.isFinite(value) ? value : null;
}

/** The numbers at a path, one an element; empty where there are none. */
export function sheetArray(sheet: SheetData, path: string): readonly (number | null)[] {
  const value = sheet.values[path];
  return Array.isArray(value) ? value : [];
}

import type { SheetData } from "../solver/index.ts";

/** The derived figures of a sheet as one nested object: `scaleFactor.predicted` → { scaleFactor: { predicted } }. */
export function nested(sheet: SheetData): Record<string, unknown> {
  const out: Record<string, unknown> = {};
  for (const [path, value] of Object.entries(sheet.values)) {
    if (path.startsWith("/") || path.includes(":")) continue;
    const keys = path.split(".");
    let at = out;
    for (const key of keys.slice(0, -1)) {
      at[key] ??= {};
      at = at[key] as Record<string, unknown>;
    }
    at[keys.at(-1)!] = value;
  }
  return out;
}

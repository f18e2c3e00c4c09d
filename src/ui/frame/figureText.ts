import { formatQuantity, formatShare, type SheetValue, type UnitName, unitOf, units } from "../../solver/index.ts";

/** Figures that are shares of one: shown in percent or ppm. */
const shares = new Set([
  "scaleFactor.deviation",
  "scaleFactor.uncertainty",
  "scaleFactor.instrumentShare",
  "scaleFactor.voltageShift",
  "source.sag",
  "response.overshoot",
]);

/** A number in the unit of its path, three or four digits; a dash where it does not exist. */
export function figureText(path: string, value: SheetValue, digits = 3): string {
  if (value === null) return "–";
  if (typeof value !== "number") return `${(value as readonly unknown[]).length} values`;
  return numberText(value, shares.has(path) ? "share" : unitOf(path), digits);
}

/** A number in a unit of the sheet; small plain numbers as a share. */
export function numberText(value: number, unit: string, digits = 3, trailing = true): string {
  if (unit === "share") return formatShare(value, digits);
  if (unit === "dB") return `${Number(value.toPrecision(digits))}\u2009dB`.replace("-", "\u2212");
  if (unit === "1/K" || unit === "1/V") return `${formatQuantity(value * 1e6, "1")}\u2009ppm${unit.slice(1)}`;
  if (unit === "1" && value !== 0 && Math.abs(value) < 0.1) return formatShare(value, digits);
  return formatQuantity(value, unit in units ? (unit as UnitName) : "1", { digits, trailing });
}

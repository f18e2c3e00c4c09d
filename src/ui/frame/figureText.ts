import { formatQuantity, formatShare, type SheetValue, type UnitName, unitOf, units } from "../../solver/index.ts";

/** Figures that are shares of one: shown in percent or ppm. */
const shares = new Set([
  "scaleFactor.deviation",
  "scaleFactor.uncertainty",
  "scaleFactor.instrumentShare",
  "scaleFactor.voltageShift",
  "source.sag",
  "response.overshoot",
  "response.droop",
  "element.edgeShare",
  "lvArm.spikeShare",
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

/** A figure or an input with all its digits that say something; a list as what its members have in common. */
export function valueText(value: SheetValue | readonly (number | null)[], unit: string): string {
  if (value === null) return "–";
  if (typeof value === "number") return numberText(value, unit, 6, false);
  const list = value as readonly (number | null)[];
  const first = list[0];
  const same = typeof first === "number" && list.every((each) => each === first);
  return same ? `${list.length} × ${numberText(first, unit, 5, false)}` : `${list.length} values`;
}

/** Unit of an input by its key: `/brief/band_Hz/1` is in Hz, `…/capacitance_F_per_m` in F/m. */
export function pointerUnit(pointer: string): string {
  const key = pointer.replace(/\/\d+$/, "");
  const per = /_([A-Za-z]+)_per_([A-Za-z]+)$/.exec(key);
  if (per !== null) return `${per[1]}/${per[2]}`;
  const perOne = /_per_([A-Za-z]+)$/.exec(key);
  return perOne === null ? unitOf(key) : `1/${perOne[1]}`;
}

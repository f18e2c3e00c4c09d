import { formatQuantity, formatShare } from "../quantities/format.ts";
import type { UnitName } from "../quantities/unit.ts";

/** A number with its unit, three digits, for the text of a finding; a plain number below 1 is a share, in percent or ppm. */
export type Show = (value: number, unit: string) => string;

export const show: Show = (value, unit) =>
  unit === "1" && Math.abs(value) < 1 ? formatShare(value) : formatQuantity(value, unit as UnitName, { digits: 3 });

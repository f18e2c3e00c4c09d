import {
  formatExact,
  type Parsed,
  parseQuantity,
  preferredAbove,
  preferredBelow,
  type SeriesName,
  type UnitName,
} from "../../solver/index.ts";

/** What a field reads: the unit, its bounds, and whether it is a share of one written in percent. */
export interface Reading {
  readonly unit: UnitName;
  readonly share?: boolean;
  readonly signed?: boolean;
  readonly least?: number;
  readonly greatest?: number;
}

const comma = (1.5).toLocaleString().includes(",");

export const limitsOf = ({ least, greatest, signed }: Reading) => ({
  locale: comma ? ("comma" as const) : ("point" as const),
  ...(least === undefined ? {} : { least }),
  ...(greatest === undefined ? {} : { greatest }),
  ...(signed === undefined ? {} : { signed }),
});

/** A share typed without its percent sign above 1 is asked about: 80 is 80 %? */
export function understood(typed: string, reading: Reading): Parsed {
  const found = parseQuantity(typed, reading.unit, limitsOf(reading));
  if (reading.share !== true || /[%p]/.test(typed)) return found;
  const plain = parseQuantity(typed, reading.unit);
  if (plain.kind !== "value" || plain.value === 0 || plain.value <= 1) return found;
  return {
    kind: "ambiguous",
    why: `${typed.trim()} is not a fraction. Did you mean`,
    choices: [{ label: `${plain.value}\u2009%`, value: plain.value / 100 }],
  };
}

/** All digits of a value, as a field shows it when nothing else was typed. */
export function textOf(value: number | null, unit: UnitName, share: boolean): string {
  if (value === null) return "";
  return share ? `${Number((value * 100).toPrecision(12))} %` : formatExact(value, unit);
}

/** Next preferred value or next step of the second figure; a decade. */
export function stepped(value: number, up: boolean, decade: boolean, series: SeriesName | undefined): number {
  if (decade) return Number((up ? value * 10 : value / 10).toPrecision(12));
  if (series !== undefined) return up ? preferredAbove(series, value) : preferredBelow(series, value);
  const step = 10 ** (Math.floor(Math.log10(Math.abs(value))) - 1);
  return Number((value + (up ? step : -step)).toPrecision(12));
}

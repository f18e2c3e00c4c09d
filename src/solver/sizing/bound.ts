import { show } from "../checks/show.ts";
import type { Asking } from "./asking.ts";
import type { Bound } from "./outcome.ts";
import { systematicShare } from "./windowFormulas.ts";

/** What the window needs beyond the brief. */
export interface WindowGiven {
  readonly ask: Asking;
  /** Least column length that insulation demands, m: the bare string of the band bound is at least this long. */
  readonly column_m: number;
  /** Largest resistor sold for the LV arm, Ω; null: none at all. */
  readonly greatestLvResistor_ohm: number | null;
  /** Whether strings are searched without capacitors. */
  readonly bare: boolean;
}

const named: Record<Bound["id"], readonly [string, Bound["side"]]> = {
  sourceSag: ["source sag", "atLeast"],
  dissipation: ["dissipation", "atLeast"],
  currentLimit: ["current limit of the source", "atLeast"],
  leakage: ["leakage across the string", "atMost"],
  leastCurrent: ["least string current", "atMost"],
  existence: ["an LV arm exists", "atMost"],
  instrumentShare: ["instrument's share", "atMost"],
  lvArmValue: ["the LV arm can be bought", "atMost"],
  band: ["band of a string without capacitors", "atMost"],
  lvPole: ["band of an LV arm without capacitors", "atMost"],
};

/** Where a bound's number stands on the sheet. */
export const pathOf = (id: Bound["id"]) => `window.${id}_ohm`;
/** Three digits in percent, for a sentence. */
export const percent = (value: number) => `${Number((value * 100).toPrecision(3))} %`;

/** A bound whose number stands on the sheet. */
export function bound({ ask }: WindowGiven, id: Bound["id"], reason: (R: string) => string): Bound {
  const [name, side] = named[id];
  const resistance_ohm = ask.j.sheet.number(pathOf(id));
  return { id, name, side, resistance_ohm, reason: reason(show(resistance_ohm ?? 0, "ohm")), path: pathOf(id) };
}

/** A bound that does not apply, and why. */
export function none({ ask }: WindowGiven, id: Bound["id"], reason: string): Bound {
  const [name, side] = named[id];
  ask.j.sheet.given(pathOf(id), null);
  return { id, name, side, resistance_ohm: null, reason, path: pathOf(id) };
}

/** Puts the wanted uncertainty and the share for one systematic effect on the sheet. */
export function shareOfUncertainty({ j }: Asking): void {
  j.sheet.given("/brief/wantedUncertainty", j.document.brief.wantedUncertainty);
  j.sheet.given("/brief/wantedUncertainty:share", systematicShare);
}

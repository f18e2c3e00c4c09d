import { show } from "../checks/show.ts";
import type { DividerDocument } from "../job/document.ts";
import { ok, type Result } from "../quantities/result.ts";
import { type Asking, asking } from "./asking.ts";
import { type InsulationNeed, insulationNeed } from "./columnNeed.ts";
import { lvResistorFamilies } from "./lvFamilies.ts";
import type { Bound, ResistanceWindow } from "./outcome.ts";
import type { Pool } from "./pool.ts";
import { windowBounds } from "./window.ts";
import { windowCures } from "./windowCures.ts";

/** The bounds of R1 and what was read and derived on the way. */
export interface WindowFound {
  readonly ask: Asking;
  readonly need: InsulationNeed;
  readonly bounds: readonly Bound[];
  readonly least: Bound | null;
  readonly greatest: Bound | null;
}

/** The bounds for this document alone, without cures. */
export function windowOf(document: DividerDocument, pool: Pool): Result<WindowFound> {
  const asked = asking(document);
  if (!asked.ok) return asked;
  const ask = asked.value;
  const need = insulationNeed(ask);
  const bounds = windowBounds({
    ask,
    column_m: need.column_m,
    greatestLvResistor_ohm: lvResistorFamilies(pool).reduce<number | null>(
      (most, family) => Math.max(most ?? 0, family.greatest_ohm),
      null,
    ),
    bare: document.brief.policy.compensation === "never",
  });
  return ok({ ask, need, bounds, least: tightest(bounds, "atLeast"), greatest: tightest(bounds, "atMost") });
}

function tightest(bounds: readonly Bound[], side: Bound["side"]): Bound | null {
  const sign = side === "atLeast" ? 1 : -1;
  return bounds.reduce<Bound | null>((best, each) => {
    if (each.side !== side || each.resistance_ohm === null) return best;
    return best === null || sign * each.resistance_ohm > sign * (best.resistance_ohm as number) ? each : best;
  }, null);
}

/** Whether any resistance lies between the bounds. */
export const isOpen = ({ least, greatest }: Pick<WindowFound, "least" | "greatest">): boolean =>
  greatest === null || (greatest.resistance_ohm as number) > (least?.resistance_ohm ?? 0);

/** The allowed span of R1 with every bound named; where two collide, which, and the cheapest ways to part them. */
export function resistanceWindow(document: DividerDocument, pool: Pool, found: WindowFound): ResistanceWindow {
  const { bounds, least, greatest } = found;
  const open = isOpen(found);
  return {
    bounds,
    least_ohm: least?.resistance_ohm ?? null,
    greatest_ohm: greatest?.resistance_ohm ?? null,
    leastBy: least?.id ?? null,
    greatestBy: greatest?.id ?? null,
    open,
    collision: open ? null : collisionOf(found),
    cures: open ? [] : windowCures(document, pool, found),
  };
}

function collisionOf({ ask, least, greatest }: WindowFound): string {
  const upper = greatest as Bound;
  if (least === null) return `The bound by ${upper.name} leaves no resistance at all.`;
  const lower = show(least.resistance_ohm as number, "ohm");
  const text =
    `${capital(least.name)} asks for at least ${lower}; ${upper.name} allows at most ` +
    `${show(upper.resistance_ohm as number, "ohm")}.`;
  if (upper.id !== "existence") return text;
  const { scaleFactor } = ask.j.document.brief;
  const alone = 1 + (least.resistance_ohm as number) / ask.j.instrument.resistance_ohm;
  return `${text} No LV arm gives ${show(scaleFactor, "1")} there: at ${lower} the instrument alone already gives ${show(alone, "1")}.`;
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

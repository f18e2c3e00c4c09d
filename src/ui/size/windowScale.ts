import type { Bound, ResistanceWindow } from "../../solver/index.ts";
import { type Axis, logAxis, shareOf } from "../charts/logAxis.ts";

/** A bound that applies, with the stretch of R1 that it forbids, as shares of the axis. */
export interface DrawnBound {
  readonly bound: Bound;
  readonly at: number;
  readonly from: number;
  readonly to: number;
  /** Whether it is one of the two that make the window. */
  readonly binding: boolean;
}

export interface WindowDrawing {
  readonly axis: Axis;
  readonly bounds: readonly DrawnBound[];
  /** The open slot, or where the two bounds cross. */
  readonly slot: { readonly from: number; readonly to: number; readonly open: boolean } | null;
  readonly stock: readonly number[];
  readonly current: number | null;
}

/** Lays the window out on a log axis of R1 over whole decades around every bound; null when no bound applies. */
export function windowDrawing(
  window: ResistanceWindow,
  current_ohm: number | null,
  stock_ohm: readonly number[],
): WindowDrawing | null {
  const applying = window.bounds.filter((b) => b.resistance_ohm !== null);
  const shown = [...applying.map((b) => b.resistance_ohm!), ...(current_ohm === null ? [] : [current_ohm])];
  const axis = logAxis(widened(shown), 12);
  if (axis === null) return null;
  const share = (ohm: number) => Math.min(1, Math.max(0, shareOf(axis, ohm)));
  return {
    axis,
    bounds: applying.map((bound) => drawn(bound, share(bound.resistance_ohm!), window)),
    slot: slotOf(window, share),
    stock: stock_ohm
      .filter((v) => v > 0)
      .map((v) => shareOf(axis, v))
      .filter((s) => s >= 0 && s <= 1),
    current: current_ohm === null ? null : share(current_ohm),
  };
}

/** Room beside a bound that stands on a whole decade, so that its bar is seen. */
const widened = (values: readonly number[]): readonly number[] =>
  values.length === 0 ? [] : [Math.min(...values) / 1.6, Math.max(...values) * 1.6];

function drawn(bound: Bound, at: number, window: ResistanceWindow): DrawnBound {
  const low = bound.side === "atLeast";
  const binding = bound.id === (low ? window.leastBy : window.greatestBy);
  return { bound, at, from: low ? 0 : at, to: low ? at : 1, binding };
}

function slotOf(window: ResistanceWindow, share: (ohm: number) => number): WindowDrawing["slot"] {
  const { least_ohm, greatest_ohm } = window;
  if (least_ohm === null && greatest_ohm === null) return null;
  const low = least_ohm === null ? 0 : share(least_ohm);
  const high = greatest_ohm === null ? 1 : share(greatest_ohm);
  return { from: Math.min(low, high), to: Math.max(low, high), open: window.open };
}

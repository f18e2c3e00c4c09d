import { type KeyboardEvent, useCallback, useMemo, useState } from "react";

/** Where the cursor stands: an index into all the points of a chart, panel after panel; null: nowhere yet. */
export interface Cursor {
  readonly index: number | null;
  readonly count: number;
  readonly moveTo: (index: number) => void;
  readonly onKeyDown: (event: KeyboardEvent) => void;
}

/** ← → a point, Shift ten points, Home and End the ends. */
export function useCursor(count: number): Cursor {
  const [wanted, setIndex] = useState<number | null>(null);
  const index = wanted === null || count === 0 ? null : Math.min(wanted, count - 1);
  const moveTo = useCallback((to: number) => setIndex(to), []);
  const onKeyDown = useCallback(
    (event: KeyboardEvent) => {
      const to = destination(event, index, count);
      if (to === null) return;
      event.preventDefault();
      setIndex(to);
    },
    [index, count],
  );
  return useMemo(() => ({ index, count, moveTo, onKeyDown }), [index, count, moveTo, onKeyDown]);
}

function destination(event: KeyboardEvent, index: number | null, count: number): number | null {
  const step = event.shiftKey ? 10 : 1;
  const at = index ?? Math.floor(count / 2);
  if (event.key === "ArrowRight" || event.key === "ArrowUp") return Math.min(count - 1, at + step);
  if (event.key === "ArrowLeft" || event.key === "ArrowDown") return Math.max(0, at - step);
  if (event.key === "Home") return 0;
  if (event.key === "End") return count - 1;
  return null;
}

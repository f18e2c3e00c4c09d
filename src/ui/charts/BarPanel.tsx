import { type PointerEvent, useCallback, useMemo } from "react";
import type { UnitName } from "../../solver/index.ts";
import { withUnit } from "./axisText.ts";
import type { ElementBars } from "./elementBars.ts";
import { BarPlot } from "./lazyPlots.tsx";
import { linearAxis } from "./logAxis.ts";
import { plotBox } from "./plotBox.ts";
import type { Cursor } from "./useCursor.ts";

interface Props {
  readonly width: number;
  readonly height: number;
  readonly bars: ElementBars;
  readonly cursor: Cursor;
  readonly yName: string;
  readonly unit: UnitName;
}

/** The bars with the cursor over them. */
export function BarPanel({ width, height, bars, cursor, yName, unit }: Props) {
  const box = useMemo(() => plotBox(width, height, 104), [width, height]);
  const y = useMemo(
    () =>
      linearAxis([0, ...bars.rows.flatMap((r) => [r.within ?? 0, r.past ?? 0, r.over ?? 0, 1.05 * (r.limit ?? 0)])], 5),
    [bars],
  );
  const { moveTo } = cursor;
  const count = bars.rows.length;
  const onPointerMove = useCallback(
    (event: PointerEvent) => {
      const left = event.currentTarget.getBoundingClientRect().left;
      const share = (event.clientX - left - box.left) / (box.right - box.left);
      if (share >= 0 && share < 1 && count > 0) moveTo(Math.floor(share * count));
    },
    [box, count, moveTo],
  );
  if (y === null || count === 0) return <p className="chart-note">Nothing to draw: no element.</p>;
  const width1 = (box.right - box.left) / count;
  const last = bars.rows[count - 1]?.limit ?? null;
  const limitName = last === null ? "" : `derated ${withUnit(bars.limit ?? last, unit, 3)}`;
  return (
    <div className="plot-panel" onPointerMove={onPointerMove} onPointerDown={onPointerMove}>
      <BarPlot
        box={box}
        rows={bars.rows}
        y={y}
        yName={yName}
        xName="element, 1 next to the tap"
        xTicks={bars.ticks}
        limit={bars.limit}
        limitName={limitName}
      />
      {cursor.index === null ? null : (
        <svg className="plot-cursor" width={box.width} height={box.height} aria-hidden="true">
          <rect
            x={box.left + cursor.index * width1}
            y={box.top}
            width={Math.max(1, width1)}
            height={box.bottom - box.top}
          />
        </svg>
      )}
    </div>
  );
}

import { type PointerEvent, type ReactNode, useCallback } from "react";
import { type Axis, shareOf, valueAt } from "./logAxis.ts";
import type { PlotBox } from "./plotBox.ts";
import { nearest } from "./trace.ts";
import type { Cursor } from "./useCursor.ts";

interface Props {
  readonly box: PlotBox;
  readonly x: Axis;
  readonly y: Axis;
  readonly xs: readonly number[];
  /** Index of this panel's first point among all the points of the chart. */
  readonly from: number;
  readonly cursor: Cursor;
  /** The values of each trace, for the cursor's dots. */
  readonly ys: readonly (readonly (number | null)[])[];
  readonly name?: string;
  readonly children: ReactNode;
}

/** A plot with the cursor over it; moving the cursor never redraws the plot. */
export function PlotPanel({ box, x, y, xs, from, cursor, ys, name, children }: Props) {
  const { moveTo } = cursor;
  const onPointerMove = useCallback(
    (event: PointerEvent) => {
      const left = event.currentTarget.getBoundingClientRect().left;
      const share = (event.clientX - left - box.left) / (box.right - box.left);
      if (share < 0 || share > 1 || xs.length === 0) return;
      moveTo(from + nearest(xs, valueAt(x, share), x.kind === "log"));
    },
    [box, x, xs, from, moveTo],
  );
  const index = cursor.index === null ? -1 : cursor.index - from;
  return (
    <div className="plot-panel" onPointerMove={onPointerMove} onPointerDown={onPointerMove}>
      {name === undefined ? null : <p className="plot-name">{name}</p>}
      {children}
      {index >= 0 && index < xs.length ? (
        <CursorLine box={box} x={x} y={y} at={xs[index]!} values={ys.map((each) => each[index] ?? null)} />
      ) : null}
    </div>
  );
}

interface LineProps {
  readonly box: PlotBox;
  readonly x: Axis;
  readonly y: Axis;
  readonly at: number;
  readonly values: readonly (number | null)[];
}

function CursorLine({ box, x, y, at, values }: LineProps) {
  const across = box.left + shareOf(x, at) * (box.right - box.left);
  if (!Number.isFinite(across) || across < box.left - 1 || across > box.right + 1) return null;
  return (
    <svg className="plot-cursor" width={box.width} height={box.height} aria-hidden="true">
      <line x1={across} x2={across} y1={box.top} y2={box.bottom} />
      {values.map((value, i) => {
        if (value === null || value < y.domain[0] || value > y.domain[1]) return null;
        const up = box.bottom - shareOf(y, value) * (box.bottom - box.top);
        // biome-ignore lint/suspicious/noArrayIndexKey: the order of the traces is their identity
        return <circle key={i} cx={across} cy={up} r={3.5} />;
      })}
    </svg>
  );
}

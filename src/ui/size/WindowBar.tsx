import { useMemo } from "react";
import type { Cure, ResistanceWindow } from "../../solver/index.ts";
import { axisText, withUnit } from "../charts/axisText.ts";
import { shareOf } from "../charts/logAxis.ts";
import { BoundTable } from "./BoundTable.tsx";
import { NoWindow } from "./NoWindow.tsx";
import { type DrawnBound, type WindowDrawing, windowDrawing } from "./windowScale.ts";
import { windowSentence } from "./windowSentence.ts";

interface Props {
  readonly window: ResistanceWindow;
  readonly current_ohm: number | null;
  /** R1 that stock values reach. */
  readonly stock_ohm: readonly number[];
  readonly onWhy: (path: string) => void;
  readonly onCure: (cure: Cure) => void;
}

const rowHeight = 24;

/** Every rule on R1 in one glance: what each forbids, what is left open, and where the design stands. */
export function WindowBar({ window, current_ohm, stock_ohm, onWhy, onCure }: Props) {
  const drawing = useMemo(() => windowDrawing(window, current_ohm, stock_ohm), [window, current_ohm, stock_ohm]);
  return (
    <section className="sheet-section" aria-labelledby="window-heading">
      <h2 id="window-heading">resistance window</h2>
      {window.open ? (
        <p className="finding-sentence">{windowSentence(window, current_ohm)}</p>
      ) : (
        <NoWindow window={window} onCure={onCure} />
      )}
      {drawing === null ? null : (
        <div className="window-grid">
          {drawing.bounds.map((each) => (
            <BoundRow key={each.bound.id} each={each} drawing={drawing} onWhy={onWhy} />
          ))}
          <AxisRow drawing={drawing} current_ohm={current_ohm} />
        </div>
      )}
      <BoundTable window={window} onWhy={onWhy} />
    </section>
  );
}

interface RowProps {
  readonly each: DrawnBound;
  readonly drawing: WindowDrawing;
  readonly onWhy: (path: string) => void;
}

function BoundRow({ each, drawing, onWhy }: RowProps) {
  const { bound, binding } = each;
  const side = bound.side === "atLeast" ? "at least" : "at most";
  return (
    <>
      <span className={binding ? "window-name binding" : "window-name"}>{bound.name}</span>
      <span className="window-side">{side}</span>
      <button type="button" className="number-button" title={bound.reason} onClick={() => onWhy(bound.path)}>
        {withUnit(bound.resistance_ohm!, "ohm", 3)}
      </button>
      <svg className="window-row" height={rowHeight} width="100%" aria-hidden="true">
        <Backdrop drawing={drawing} height={rowHeight} />
        <rect
          className={binding ? "forbidden binding" : "forbidden"}
          x={percent(each.from)}
          width={percent(each.to - each.from)}
          y={5}
          height={rowHeight - 10}
        />
        <line
          className={binding ? "edge binding" : "edge"}
          x1={percent(each.at)}
          x2={percent(each.at)}
          y1={2}
          y2={rowHeight - 2}
        />
      </svg>
    </>
  );
}

/** Decade lines, the open slot and the line of the design, through every row. */
function Backdrop({ drawing, height }: { readonly drawing: WindowDrawing; readonly height: number }) {
  const { axis, slot, current } = drawing;
  return (
    <>
      {slot === null ? null : (
        <rect
          className={slot.open ? "slot" : "slot shut"}
          x={percent(slot.from)}
          width={percent(Math.max(0.002, slot.to - slot.from))}
          y={0}
          height={height}
        />
      )}
      {axis.ticks.map((tick) => (
        <line
          key={tick}
          className="decade"
          x1={percent(shareOf(axis, tick))}
          x2={percent(shareOf(axis, tick))}
          y1={0}
          y2={height}
        />
      ))}
      {current === null ? null : (
        <line className="current" x1={percent(current)} x2={percent(current)} y1={0} y2={height} />
      )}
    </>
  );
}

function AxisRow({ drawing, current_ohm }: { readonly drawing: WindowDrawing; readonly current_ohm: number | null }) {
  const { axis, current, stock } = drawing;
  return (
    <>
      <span className="window-name quiet">R1 / Ω</span>
      <span />
      <span className="window-stock quiet">{stock.length > 0 ? "stock" : ""}</span>
      <svg className="window-row" height={52} width="100%" role="img" aria-label="axis of R1, logarithmic">
        <Backdrop drawing={drawing} height={16} />
        {stock.map((at, i) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: two stock values may share a place
          <line key={i} className="stock" x1={percent(at)} x2={percent(at)} y1={3} y2={13} />
        ))}
        <line className="axis" x1="0" x2="100%" y1={16} y2={16} />
        {axis.ticks.map((tick, i) => (
          <text key={tick} className="tick" x={percent(shareOf(axis, tick))} y={30} textAnchor={anchor(i, axis.ticks)}>
            {axisText(tick)}
          </text>
        ))}
        {current === null || current_ohm === null ? null : (
          <text className="current-name" x={percent(current)} y={47} textAnchor={current > 0.8 ? "end" : "middle"}>
            R1 {withUnit(current_ohm, "ohm", 3)}
          </text>
        )}
      </svg>
    </>
  );
}

const anchor = (i: number, ticks: readonly number[]) => (i === 0 ? "start" : i === ticks.length - 1 ? "end" : "middle");
const percent = (share: number): string => `${(100 * share).toFixed(3)}%`;

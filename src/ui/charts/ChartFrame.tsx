import { type ClipboardEvent, type ReactNode, Suspense, useId, useRef } from "react";
import { ChartTable } from "./ChartTable.tsx";
import { type Column, columnsCsv } from "./columns.ts";
import { download } from "./download.ts";
import { drawnSvg } from "./drawnSvg.ts";
import type { Cursor } from "./useCursor.ts";
import { useInView } from "./useInView.ts";
import { useWidth } from "./useWidth.ts";
import "./charts.css";

interface Props {
  readonly title: string;
  /** What the data say, computed from them. */
  readonly sentence: string;
  /** File name without its ending. */
  readonly file: string;
  /** What was left out or is not drawn, if anything. */
  readonly note?: string | null;
  readonly controls?: ReactNode;
  readonly columns: readonly Column[];
  readonly cursor: Cursor;
  /** The cursor's place in words. */
  readonly readout: string | null;
  readonly height: number;
  readonly children: (width: number) => ReactNode;
}

/** What every chart has: title, sentence, cursor with read-out, table and exports. Drawn only while in view. */
export function ChartFrame(p: Props) {
  const figure = useRef<HTMLElement>(null);
  const area = useRef<HTMLDivElement>(null);
  const drawn = useInView(figure);
  const width = useWidth(area);
  const heading = useId();
  const { cursor } = p;
  const copied = () => copyText(p.columns, cursor.index);
  const onCopy = (event: ClipboardEvent) => {
    if (cursor.index === null || !document.getSelection()?.isCollapsed) return;
    event.clipboardData.setData("text/plain", copied());
    event.preventDefault();
  };
  return (
    <figure className="chart" ref={figure} aria-labelledby={heading}>
      <div className="chart-head">
        <h3 id={heading}>{p.title}</h3>
        {p.controls}
      </div>
      <p className="chart-sentence">{p.sentence}</p>
      <div
        className="chart-area"
        ref={area}
        style={{ minHeight: p.height }}
        role="slider"
        tabIndex={0}
        aria-label={`cursor: ${p.title}`}
        aria-valuemin={0}
        aria-valuemax={Math.max(0, cursor.count - 1)}
        aria-valuenow={cursor.index ?? 0}
        aria-valuetext={p.readout ?? "no point chosen"}
        onKeyDown={cursor.onKeyDown}
        onCopy={onCopy}
      >
        {drawn ? <Suspense fallback={null}>{p.children(width)}</Suspense> : null}
      </div>
      <div className="chart-foot">
        <output className="chart-readout">{p.readout ?? "point at the chart, or ← → on it, to read values"}</output>
        <button
          type="button"
          className="quiet-button"
          disabled={cursor.index === null}
          onClick={() => void navigator.clipboard?.writeText(copied())}
        >
          copy values
        </button>
        <button
          type="button"
          className="quiet-button"
          onClick={() => download(`${p.file}.svg`, drawnSvg(figure.current!, p.title, p.sentence), "image/svg+xml")}
        >
          drawing, SVG
        </button>
        <button
          type="button"
          className="quiet-button"
          onClick={() => download(`${p.file}.csv`, columnsCsv(p.columns), "text/csv;charset=utf-8")}
        >
          data, CSV
        </button>
      </div>
      {p.note ? <p className="chart-note">{p.note}</p> : null}
      <ChartTable title={p.title} columns={p.columns} />
    </figure>
  );
}

/** The cursor's values with every digit, head above number. */
function copyText(columns: readonly Column[], index: number | null): string {
  if (index === null) return "";
  const heads = columns.map((column) => column.key);
  return `${heads.join("\t")}\n${columns.map((column) => column.values[index] ?? "").join("\t")}\n`;
}

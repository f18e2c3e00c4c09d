import { useDeferredValue, useMemo, useState } from "react";
import type { EdgeTraces, StepResponse } from "../../solver/index.ts";
import { plainText, signed, withUnit } from "./axisText.ts";
import { ChartFrame } from "./ChartFrame.tsx";
import { Choice } from "./Choice.tsx";
import type { Column } from "./columns.ts";
import type { Band, Mark } from "./LinePlot.tsx";
import { LinePlot } from "./lazyPlots.tsx";
import { type Axis, linearAxis, logAxis, niceStep } from "./logAxis.ts";
import { PlotPanel } from "./PlotPanel.tsx";
import { plotBox } from "./plotBox.ts";
import { type Shown, type StepShow, shownOf, stepShows } from "./stepShows.ts";
import { checkSeries, type Row, thinRows } from "./trace.ts";
import { type Cursor, useCursor } from "./useCursor.ts";

interface Props {
  readonly step: StepResponse;
  /** Wanted relative uncertainty: the shaded band about 100 %. */
  readonly tolerance: number;
  /** The brief's own edge, the source's, the spread of the parts; null: not answered yet. */
  readonly traces?: EdgeTraces | null;
  readonly file: string;
}

type View = "whole" | "near";
const views = [
  ["whole", "whole step"],
  ["near", "near 100\u2009%"],
] as const;
const height = 250;
const gap = 16;
const mostDrawn = 250;
const narrow = 560;
const marks: readonly Mark[] = [{ id: "right", along: "y", at: 100, name: "", kind: "mark" }];

/** One step on two time scales with one height: the edge, and what comes long after it. */
export function StepChart(p: Props) {
  const step = useDeferredValue(p.step);
  const given = useDeferredValue(p.traces ?? null);
  const [wanted, setShow] = useState<StepShow>("step");
  const options = useMemo(() => stepShows(given), [given]);
  const show = options.some(([id]) => id === wanted) ? wanted : "step";
  const shown = useMemo(() => shownOf(show, step, given), [show, step, given]);
  const fast = useMemo(() => seriesOf(shown, "fast"), [shown]);
  const slow = useMemo(() => seriesOf(shown, "slow"), [shown]);
  const cursor = useCursor(fast.xs.length + slow.xs.length);
  const [view, setView] = useState<View>("whole");
  const y = useMemo(
    () => outputAxis(view, [...fast.percents, ...slow.percents].flat(), p.tolerance),
    [view, fast, slow, p.tolerance],
  );
  const bands = useMemo(() => toleranceBand(p.tolerance), [p.tolerance]);
  const columns = useMemo(() => columnsOf(shown), [shown]);
  const left = fast.left + slow.left;
  return (
    <ChartFrame
      title="step response"
      sentence={shown.sentence}
      file={p.file}
      controls={
        <>
          {options.length > 1 ? <Choice label="step shown" options={options} value={show} onChange={setShow} /> : null}
          <Choice label="output shown" options={views} value={view} onChange={setView} />
        </>
      }
      note={noteOf(left, y, [...fast.percents, ...slow.percents].flat())}
      columns={columns}
      cursor={cursor}
      readout={cursor.index === null ? null : readoutAt(shown, cursor.index)}
      height={height}
    >
      {(width) => <Panels width={width} {...{ shown, fast, slow, cursor, y, bands }} />}
    </ChartFrame>
  );
}

function noteOf(left: number, y: Axis | null, percent: readonly number[]): string | null {
  const said: string[] = [];
  if (left > 0) said.push(`${left} points at or before the start of the step, or not finite, are not drawn.`);
  const beyond = y === null ? 0 : percent.filter((v) => v > y.domain[1] || v < y.domain[0]).length;
  if (beyond > 0) said.push(`${beyond} points lie beyond the axis; the table has them.`);
  return said.length === 0 ? null : said.join(" ");
}

type Series = DrawnSeries;

interface PanelsProps {
  readonly width: number;
  readonly shown: Shown;
  readonly fast: Series;
  readonly slow: Series;
  readonly cursor: Cursor;
  readonly y: Axis | null;
  readonly bands: readonly Band[];
}

function Panels({ width, shown, fast, slow, cursor, y, bands }: PanelsProps) {
  const each = width < narrow ? width : Math.floor((width - gap) / 2);
  return (
    <div className="plot-pair">
      <Panel name="fast: the edge" width={each} series={fast} from={0} {...{ shown, cursor, y, bands }} />
      <Panel
        name="slow: after the edge"
        width={each}
        series={slow}
        from={fast.xs.length}
        {...{ shown, cursor, y, bands }}
      />
    </div>
  );
}

interface PanelProps {
  readonly name: string;
  readonly shown: Shown;
  readonly width: number;
  readonly series: Series;
  readonly from: number;
  readonly cursor: Cursor;
  readonly y: Axis | null;
  readonly bands: readonly Band[];
}

function Panel({ name, shown, width, series, from, cursor, y, bands }: PanelProps) {
  const x = useMemo(() => logAxis(series.xs, Math.floor((width - 80) / 40)), [series, width]);
  const labels = shown.traces.length > 1 ? 84 : 14;
  const box = useMemo(() => plotBox(width, height - 20, labels), [width, labels]);
  if (x === null || y === null) return <p className="chart-note">Nothing to draw: no finite point.</p>;
  return (
    <PlotPanel box={box} x={x} y={y} xs={series.xs} from={from} cursor={cursor} ys={series.percents} name={name}>
      <LinePlot
        box={box}
        rows={series.rows}
        traces={shown.traces}
        {...{ x, y, bands, marks }}
        xName="time / s"
        yName="output / %"
      />
    </PlotPanel>
  );
}

interface DrawnSeries {
  readonly xs: readonly number[];
  readonly percents: readonly (readonly number[])[];
  readonly left: number;
  readonly rows: readonly Row[];
}

function seriesOf({ traces }: Shown, scale: "fast" | "slow"): DrawnSeries {
  const xs = traces[0]!.pair[scale].time_s;
  const drawn = traces.map(({ id, name, hue, pair }) => ({ id, name, hue, y: pair[scale].value.map((v) => 100 * v) }));
  const checked = checkSeries(xs, drawn, { x: true, y: false });
  const ids = traces.map((each) => each.id);
  return { xs, percents: drawn.map((each) => each.y), left: checked.left, rows: thinRows(checked.rows, ids, 400) };
}

/** The whole step from 0, or the neighbourhood of 100 % in which the wanted tolerance is seen. */
function outputAxis(view: View, percent: readonly number[], tolerance: number): Axis | null {
  // A ring of many times the step would press the rest of it flat.
  const within = percent.map((v) => Math.min(mostDrawn, Math.max(-mostDrawn, v)));
  if (view === "whole") return linearAxis([0, 110, 100 * (1 + 1.5 * tolerance), ...within], 6);
  const half = Math.min(100, 3 * niceStep(100 * tolerance));
  return linearAxis([100 - half, 100 + half], 6);
}

function toleranceBand(tolerance: number): readonly Band[] {
  const name = `wanted ±${plainText(Number((100 * tolerance).toPrecision(3)))}\u2009%`;
  return [{ id: "tolerance", x: null, y: [100 * (1 - tolerance), 100 * (1 + tolerance)], name }];
}

function readoutAt({ traces }: Shown, index: number): string {
  const { fast, slow } = traces[0]!.pair;
  const late = index >= fast.time_s.length;
  const i = late ? index - fast.time_s.length : index;
  const each = traces.map(({ name, pair }) => {
    const value = (late ? pair.slow : pair.fast).value[i]!;
    const percent = `${plainText(Number((100 * value).toPrecision(5)))}\u2009% (${signed(100 * (value - 1))}\u2009% off)`;
    return traces.length > 1 ? `${name} ${percent}` : percent;
  });
  return `${withUnit((late ? slow : fast).time_s[i]!, "s")} after the step: ${each.join(", ")}`;
}

function columnsOf({ traces }: Shown): readonly Column[] {
  const { fast, slow } = traces[0]!.pair;
  return [
    { key: "panel", head: "panel", values: [...fast.time_s.map(() => "fast"), ...slow.time_s.map(() => "slow")] },
    { key: "time_s", head: "time / s", values: [...fast.time_s, ...slow.time_s] },
    ...traces.map(({ id, name, pair }) => ({
      key: `${id}_share`,
      head: name === "" ? "output, 1 is right" : `${name}, 1 is right`,
      values: [...pair.fast.value, ...pair.slow.value],
    })),
  ];
}

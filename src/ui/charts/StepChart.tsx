import { useDeferredValue, useMemo, useState } from "react";
import type { StepResponse, StepTrace } from "../../solver/index.ts";
import { plainText, signed, withUnit } from "./axisText.ts";
import { ChartFrame } from "./ChartFrame.tsx";
import { Choice } from "./Choice.tsx";
import type { Column } from "./columns.ts";
import type { Band, Mark } from "./LinePlot.tsx";
import { LinePlot } from "./lazyPlots.tsx";
import { type Axis, linearAxis, logAxis, niceStep } from "./logAxis.ts";
import { PlotPanel } from "./PlotPanel.tsx";
import { plotBox } from "./plotBox.ts";
import { checkSeries, thinRows } from "./trace.ts";
import { type Cursor, useCursor } from "./useCursor.ts";

interface Props {
  readonly step: StepResponse;
  /** Wanted relative uncertainty: the shaded band about 100 %. */
  readonly tolerance: number;
  readonly file: string;
}

type View = "whole" | "near";
const views = [
  ["whole", "whole step"],
  ["near", "near 100\u2009%"],
] as const;
const height = 250;
const gap = 16;
const narrow = 560;
const outputTrace = [{ id: "output", name: "", hue: 1 }] as const;
const marks: readonly Mark[] = [{ id: "right", along: "y", at: 100, name: "", kind: "mark" }];

/** One step on two time scales with one height: the edge, and what comes long after it. */
export function StepChart(p: Props) {
  const step = useDeferredValue(p.step);
  const fast = useMemo(() => seriesOf(step.fast), [step]);
  const slow = useMemo(() => seriesOf(step.slow), [step]);
  const cursor = useCursor(fast.xs.length + slow.xs.length);
  const [view, setView] = useState<View>("whole");
  const y = useMemo(
    () => outputAxis(view, [...fast.percent, ...slow.percent], p.tolerance),
    [view, fast, slow, p.tolerance],
  );
  const bands = useMemo(() => toleranceBand(p.tolerance), [p.tolerance]);
  const columns = useMemo(() => columnsOf(step), [step]);
  const left = fast.left + slow.left;
  return (
    <ChartFrame
      title="step response"
      sentence={step.sentence}
      file={p.file}
      controls={<Choice label="output shown" options={views} value={view} onChange={setView} />}
      note={left > 0 ? `${left} points at or before the start of the step, or not finite, are not drawn.` : null}
      columns={columns}
      cursor={cursor}
      readout={cursor.index === null ? null : readoutAt(step, cursor.index)}
      height={height}
    >
      {(width) => <Panels width={width} {...{ fast, slow, cursor, y, bands }} />}
    </ChartFrame>
  );
}

type Series = ReturnType<typeof seriesOf>;

interface PanelsProps {
  readonly width: number;
  readonly fast: Series;
  readonly slow: Series;
  readonly cursor: Cursor;
  readonly y: Axis | null;
  readonly bands: readonly Band[];
}

function Panels({ width, fast, slow, cursor, y, bands }: PanelsProps) {
  const each = width < narrow ? width : Math.floor((width - gap) / 2);
  return (
    <div className="plot-pair">
      <Panel name="fast: the edge" width={each} series={fast} from={0} {...{ cursor, y, bands }} />
      <Panel name="slow: after the edge" width={each} series={slow} from={fast.xs.length} {...{ cursor, y, bands }} />
    </div>
  );
}

interface PanelProps {
  readonly name: string;
  readonly width: number;
  readonly series: Series;
  readonly from: number;
  readonly cursor: Cursor;
  readonly y: Axis | null;
  readonly bands: readonly Band[];
}

function Panel({ name, width, series, from, cursor, y, bands }: PanelProps) {
  const x = useMemo(() => logAxis(series.xs, Math.floor((width - 80) / 40)), [series, width]);
  const box = useMemo(() => plotBox(width, height - 20, 14), [width]);
  const ys = useMemo(() => [series.percent], [series]);
  if (x === null || y === null) return <p className="chart-note">Nothing to draw: no finite point.</p>;
  return (
    <PlotPanel box={box} x={x} y={y} xs={series.xs} from={from} cursor={cursor} ys={ys} name={name}>
      <LinePlot
        box={box}
        rows={series.rows}
        traces={outputTrace}
        {...{ x, y, bands, marks }}
        xName="time / s"
        yName="output / %"
      />
    </PlotPanel>
  );
}

function seriesOf(trace: StepTrace) {
  const percent = trace.value.map((v) => 100 * v);
  const checked = checkSeries(trace.time_s, [{ ...outputTrace[0], y: percent }], { x: true, y: false });
  return { xs: trace.time_s, percent, left: checked.left, rows: thinRows(checked.rows, ["output"], 400) };
}

/** The whole step from 0, or the neighbourhood of 100 % in which the wanted tolerance is seen. */
function outputAxis(view: View, percent: readonly number[], tolerance: number): Axis | null {
  if (view === "whole") return linearAxis([0, 110, 100 * (1 + 1.5 * tolerance), ...percent], 6);
  const half = Math.min(100, 3 * niceStep(100 * tolerance));
  return linearAxis([100 - half, 100 + half], 6);
}

function toleranceBand(tolerance: number): readonly Band[] {
  const name = `wanted ±${plainText(Number((100 * tolerance).toPrecision(3)))}\u2009%`;
  return [{ id: "tolerance", x: null, y: [100 * (1 - tolerance), 100 * (1 + tolerance)], name }];
}

function readoutAt(step: StepResponse, index: number): string {
  const slow = index >= step.fast.time_s.length;
  const trace = slow ? step.slow : step.fast;
  const i = slow ? index - step.fast.time_s.length : index;
  const value = trace.value[i]!;
  return `${withUnit(trace.time_s[i]!, "s")} after the step: ${plainText(Number((100 * value).toPrecision(5)))}\u2009% (${signed(100 * (value - 1))}\u2009% off)`;
}

function columnsOf({ fast, slow }: StepResponse): readonly Column[] {
  const panel = [...fast.time_s.map(() => "fast"), ...slow.time_s.map(() => "slow")];
  return [
    { key: "panel", head: "panel", values: panel },
    { key: "time_s", head: "time / s", values: [...fast.time_s, ...slow.time_s] },
    { key: "output_share", head: "output, 1 is right", values: [...fast.value, ...slow.value] },
  ];
}

import { memo, useMemo } from "react";
import { CartesianGrid, Line, LineChart, ReferenceArea, ReferenceLine, XAxis, YAxis } from "recharts";
import { axisText, plainText } from "./axisText.ts";
import type { Axis, Domain } from "./logAxis.ts";
import { shareOf } from "./logAxis.ts";
import { PlotLabels } from "./PlotLabels.tsx";
import { axisHeight, axisWidth, type PlotBox, topMargin } from "./plotBox.ts";
import { dashes, type Row, type Trace } from "./trace.ts";

/** A named line across the plot: a limit, or where something happens. */
export interface Mark {
  readonly id: string;
  readonly along: "x" | "y";
  readonly at: number;
  readonly name: string;
  readonly kind: "limit" | "mark";
}

/** A shaded, named area; `x` null: the whole width. */
export interface Band {
  readonly id: string;
  readonly x: Domain | null;
  readonly y: Domain;
  readonly name: string;
}

export interface LinePlotProps {
  readonly box: PlotBox;
  readonly rows: readonly Row[];
  readonly traces: readonly Omit<Trace, "y">[];
  readonly x: Axis;
  readonly y: Axis;
  readonly xName: string;
  readonly yName: string;
  readonly marks: readonly Mark[];
  readonly bands: readonly Band[];
}

const margins = (box: PlotBox) => ({ top: topMargin, right: box.width - box.right, bottom: 0, left: 0 });
const formatterOf = (axis: Axis) => (axis.kind === "log" ? axisText : plainText);
const tick = { fontSize: 12, fill: "var(--quiet)" };

/** Every child keeps its identity while only the data change: that is what keeps a redraw inside a frame. */
export const LinePlot = memo(function LinePlot(p: LinePlotProps) {
  const { box, x, y } = p;
  const margin = useMemo(() => margins(box), [box]);
  const axes = useMemo(() => axisParts(x, y, p.xName, p.yName), [x, y, p.xName, p.yName]);
  const grid = useMemo(() => gridParts(box, x, y), [box, x, y]);
  const areas = useMemo(() => p.bands.map((band) => area(band, x, y)), [p.bands, x, y]);
  const lines = useMemo(() => p.marks.map(markLine), [p.marks]);
  const traces = useMemo(() => p.traces.map(traceLine), [p.traces]);
  return (
    <LineChart
      width={box.width}
      height={box.height}
      margin={margin}
      data={p.rows as Row[]}
      accessibilityLayer={false}
      className="plot"
    >
      {grid}
      {areas}
      {axes}
      {lines}
      {traces}
      <PlotLabels box={box} x={x} y={y} rows={p.rows} traces={p.traces} marks={p.marks} bands={p.bands} />
    </LineChart>
  );
});

function axisParts(x: Axis, y: Axis, xName: string, yName: string) {
  return [
    <XAxis
      key="x"
      dataKey="x"
      type="number"
      scale={x.kind}
      domain={x.domain as [number, number]}
      ticks={x.ticks as number[]}
      tickFormatter={formatterOf(x)}
      interval={0}
      height={axisHeight}
      tick={tick}
      tickSize={4}
      stroke="var(--rule)"
      allowDataOverflow
      label={{ value: xName, position: "insideBottom", offset: 0, fontSize: 12, fill: "var(--quiet)" }}
    />,
    <YAxis
      key="y"
      type="number"
      scale={y.kind}
      domain={y.domain as [number, number]}
      ticks={y.ticks as number[]}
      tickFormatter={formatterOf(y)}
      interval={0}
      width={axisWidth}
      tick={tick}
      tickSize={4}
      stroke="var(--rule)"
      allowDataOverflow
      label={{
        value: yName,
        angle: -90,
        position: "insideLeft",
        offset: 4,
        fontSize: 12,
        fill: "var(--quiet)",
        style: { textAnchor: "middle" },
      }}
    />,
  ];
}

function gridParts(box: PlotBox, x: Axis, y: Axis) {
  const across = (v: number) => box.left + shareOf(x, v) * (box.right - box.left);
  const up = (v: number) => box.bottom - shareOf(y, v) * (box.bottom - box.top);
  return [
    <CartesianGrid
      key="minor"
      stroke="var(--rule)"
      strokeOpacity={0.35}
      verticalPoints={x.minor.map(across)}
      horizontalPoints={y.minor.map(up)}
      horizontal={y.minor.length > 0}
      vertical={x.minor.length > 0}
    />,
    <CartesianGrid
      key="major"
      stroke="var(--rule)"
      verticalPoints={x.ticks.map(across)}
      horizontalPoints={y.ticks.map(up)}
    />,
  ];
}

const within = (value: number, [low, high]: Domain): number => Math.min(high, Math.max(low, value));

function area(band: Band, x: Axis, y: Axis) {
  const [x1, x2] = band.x ?? x.domain;
  return (
    <ReferenceArea
      key={band.id}
      x1={within(x1, x.domain)}
      x2={within(x2, x.domain)}
      y1={within(band.y[0], y.domain)}
      y2={within(band.y[1], y.domain)}
      fill="var(--accent)"
      fillOpacity={0.12}
      stroke="none"
    />
  );
}

function markLine(mark: Mark) {
  const limit = mark.kind === "limit";
  return (
    <ReferenceLine
      key={mark.id}
      {...(mark.along === "x" ? { x: mark.at } : { y: mark.at })}
      stroke={limit ? "var(--stop)" : "var(--quiet)"}
      strokeDasharray={limit ? "" : "1 3"}
      strokeWidth={limit ? 1.5 : 1}
    />
  );
}

function traceLine(trace: Omit<Trace, "y">) {
  return (
    <Line
      key={trace.id}
      dataKey={trace.id}
      type="linear"
      dot={false}
      activeDot={false}
      isAnimationActive={false}
      connectNulls={false}
      stroke={`var(--trace-${trace.hue})`}
      strokeDasharray={dashes[trace.hue - 1]!}
      strokeWidth={1.75}
    />
  );
}

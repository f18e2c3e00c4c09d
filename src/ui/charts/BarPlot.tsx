import { memo, useMemo } from "react";
import { Bar, CartesianGrid, ComposedChart, Line, ReferenceLine, XAxis, YAxis } from "recharts";
import { axisText } from "./axisText.ts";
import type { Axis } from "./logAxis.ts";
import { axisHeight, axisWidth, type PlotBox, topMargin } from "./plotBox.ts";

/** One bar: an element, or the greatest of a run of neighbours when there are too many to draw. */
export interface BarRow {
  readonly name: string;
  readonly within: number | null;
  /** Past the derated limit, within the rating. */
  readonly past: number | null;
  /** Past the rating itself. */
  readonly over: number | null;
  readonly limit: number | null;
}

export interface BarPlotProps {
  readonly box: PlotBox;
  readonly rows: readonly BarRow[];
  readonly y: Axis;
  readonly yName: string;
  readonly xName: string;
  readonly xTicks: readonly string[];
  /** One limit for all, or null when it differs from element to element (then each row's own is drawn). */
  readonly limit: number | null;
  readonly limitName: string;
}

const tick = { fontSize: 12, fill: "var(--quiet)" };

/** Bars within the derated limit are plain, past it hatched as a caution, past the rating cross-hatched as a stop. */
export const BarPlot = memo(function BarPlot(p: BarPlotProps) {
  const { box, y } = p;
  const margin = useMemo(() => ({ top: topMargin, right: box.width - box.right, bottom: 0, left: 0 }), [box]);
  const axes = useMemo(() => axisParts(y, p.yName, p.xName, p.xTicks), [y, p.yName, p.xName, p.xTicks]);
  const limit = useMemo(() => limitLine(p.limit), [p.limit]);
  return (
    <ComposedChart
      width={box.width}
      height={box.height}
      margin={margin}
      data={p.rows as BarRow[]}
      barCategoryGap={p.rows.length > 60 ? 1 : "18%"}
      accessibilityLayer={false}
      className="plot"
    >
      {axes}
      {bars}
      {limit}
      <text x={box.right + 6} y={limitY(p)} fill="var(--stop)" fontSize={12}>
        {p.limitName}
      </text>
    </ComposedChart>
  );
});

function limitY({ box, y, rows, limit }: BarPlotProps): number {
  const value = limit ?? rows[rows.length - 1]?.limit ?? 0;
  const share = (value - y.domain[0]) / (y.domain[1] - y.domain[0]);
  return box.bottom - Math.min(1, share) * (box.bottom - box.top) + 4;
}

const bars = [
  <defs key="defs">
    <pattern id="plot-past" width={6} height={6} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
      <rect width={6} height={6} fill="var(--caution)" fillOpacity={0.25} />
      <rect width={2.5} height={6} fill="var(--caution)" />
    </pattern>
    <pattern id="plot-over" width={6} height={6} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
      <rect width={6} height={6} fill="var(--stop)" fillOpacity={0.3} />
      <path d="M0 1.25h6M1.25 0v6" stroke="var(--stop)" strokeWidth={2.5} />
    </pattern>
  </defs>,
  <Bar
    key="within"
    dataKey="within"
    stackId="a"
    fill="var(--trace-1)"
    fillOpacity={0.75}
    isAnimationActive={false}
    maxBarSize={40}
  />,
  <Bar
    key="past"
    dataKey="past"
    stackId="a"
    fill="url(#plot-past)"
    stroke="var(--caution)"
    isAnimationActive={false}
    maxBarSize={40}
  />,
  <Bar
    key="over"
    dataKey="over"
    stackId="a"
    fill="url(#plot-over)"
    stroke="var(--stop)"
    isAnimationActive={false}
    maxBarSize={40}
  />,
];

function limitLine(limit: number | null) {
  if (limit !== null) return <ReferenceLine y={limit} stroke="var(--stop)" strokeWidth={1.5} />;
  return (
    <Line
      dataKey="limit"
      type="step"
      dot={false}
      activeDot={false}
      isAnimationActive={false}
      stroke="var(--stop)"
      strokeWidth={1.5}
    />
  );
}

function axisParts(y: Axis, yName: string, xName: string, xTicks: readonly string[]) {
  return [
    <CartesianGrid key="grid" vertical={false} stroke="var(--rule)" />,
    <XAxis
      key="x"
      dataKey="name"
      type="category"
      ticks={xTicks as string[]}
      interval={0}
      height={axisHeight}
      tick={tick}
      tickSize={4}
      stroke="var(--rule)"
      label={{ value: xName, position: "insideBottom", offset: 0, fontSize: 12, fill: "var(--quiet)" }}
    />,
    <YAxis
      key="y"
      type="number"
      domain={y.domain as [number, number]}
      ticks={y.ticks as number[]}
      tickFormatter={axisText}
      interval={0}
      width={axisWidth}
      tick={tick}
      tickSize={4}
      stroke="var(--rule)"
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

import { useDeferredValue, useMemo, useState } from "react";
import type { FrequencyResponse, FromSource } from "../../solver/index.ts";
import { plainText, signed, withUnit } from "./axisText.ts";
import { ChartFrame } from "./ChartFrame.tsx";
import { Choice } from "./Choice.tsx";
import type { Column } from "./columns.ts";
import { type MagnitudeView, magnitudeAxis, percentOf, phaseAxis, unwrapped } from "./frequencySeries.ts";
import type { Band, Mark } from "./LinePlot.tsx";
import { LinePlot } from "./lazyPlots.tsx";
import { type Axis, logAxis } from "./logAxis.ts";
import { PlotPanel } from "./PlotPanel.tsx";
import { plotBox } from "./plotBox.ts";
import { checkSeries, thinRows } from "./trace.ts";
import { useCursor } from "./useCursor.ts";

interface Props {
  readonly response: FrequencyResponse;
  /** Wanted relative uncertainty: the shaded band. */
  readonly tolerance: number;
  readonly band_Hz: readonly [number, number];
  readonly bandwidth_Hz: number | null;
  /** With source and lead counted, over the same frequencies; null: not answered yet. */
  readonly source?: FromSource | null;
  readonly file: string;
}

const references = [
  ["electrode", "at the electrode"],
  ["source", "with the source"],
] as const;

const views = [
  ["dB", "dB"],
  ["percent", "%"],
] as const;
const magnitudeTrace = [{ id: "magnitude", name: "magnitude", hue: 1 }] as const;
const bothTraces = [
  { id: "magnitude", name: "electrode", hue: 1 },
  { id: "source", name: "source", hue: 3 },
] as const;
const phaseTrace = [{ id: "phase", name: "phase", hue: 2 }] as const;
const impedanceTrace = [{ id: "impedance", name: "input |Z|", hue: 4 }] as const;
const noBands: readonly Band[] = [];
const magnitudeHeight = 244;
const phaseHeight = 150;
const impedanceHeight = 150;

/** Magnitude against the dc scale factor, phase and input impedance, over the same decades. */
export function FrequencyChart(p: Props) {
  const response = useDeferredValue(p.response);
  const [view, setView] = useState<MagnitudeView>("dB");
  const cursor = useCursor(response.frequency_Hz.length);
  const [reference, setReference] = useState<"electrode" | "source">("electrode");
  const source =
    reference === "source" && p.source?.frequency_Hz.length === response.frequency_Hz.length ? p.source : null;
  const series = useMemo(() => seriesOf(response, view, source), [response, view, source]);
  const [low, high] = p.band_Hz;
  const y = useMemo(
    () => magnitudeAxis(view, response, p.tolerance, [low, high]),
    [view, response, p.tolerance, low, high],
  );
  const phase = useMemo(() => phaseAxis(series.phase), [series]);
  const bands = useMemo(() => toleranceBand(view, p.tolerance, [low, high]), [view, p.tolerance, low, high]);
  const marks = useMemo(
    () =>
      marksOf(view, [low, high], p.bandwidth_Hz).filter((m) => m.along === "x" || (y !== null && m.at > y.domain[0])),
    [view, low, high, p.bandwidth_Hz, y],
  );
  const phaseMarks = useMemo(() => marks.filter((m) => m.along === "x").map((m) => ({ ...m, name: "" })), [marks]);
  const columns = useMemo(() => columnsOf(response), [response]);
  const readout = cursor.index === null ? null : readoutAt(response, cursor.index);
  return (
    <ChartFrame
      title="frequency response"
      sentence={response.sentence}
      file={p.file}
      note={noteOf(series.left, view, y)}
      controls={
        <>
          {p.source == null ? null : (
            <Choice label="reference" options={references} value={reference} onChange={setReference} />
          )}
          <Choice label="magnitude in" options={views} value={view} onChange={setView} />
        </>
      }
      columns={columns}
      cursor={cursor}
      readout={readout}
      height={magnitudeHeight + phaseHeight + impedanceHeight}
    >
      {(width) => <Panels width={width} {...{ response, series, cursor, y, phase, bands, marks, phaseMarks, view }} />}
    </ChartFrame>
  );
}

interface PanelProps {
  readonly width: number;
  readonly response: FrequencyResponse;
  readonly series: ReturnType<typeof seriesOf>;
  readonly cursor: ReturnType<typeof useCursor>;
  readonly y: Axis | null;
  readonly phase: Axis | null;
  readonly bands: readonly Band[];
  readonly marks: readonly Mark[];
  readonly phaseMarks: readonly Mark[];
  readonly view: MagnitudeView;
}

function Panels({ width, response, series, cursor, y, phase, bands, marks, phaseMarks, view }: PanelProps) {
  const x = useMemo(() => logAxis(response.frequency_Hz, Math.floor((width - 130) / 44)), [response, width]);
  const upper = useMemo(() => plotBox(width, magnitudeHeight, 76), [width]);
  const lower = useMemo(() => plotBox(width, phaseHeight, 76), [width]);
  const lowest = useMemo(() => plotBox(width, impedanceHeight, 76), [width]);
  const z = useMemo(() => logAxis(response.inputImpedance_ohm, 5), [response]);
  const ys = useMemo(() => (series.source === null ? [series.magnitude] : [series.magnitude, series.source]), [series]);
  const impedances = useMemo(() => [response.inputImpedance_ohm], [response]);
  const phases = useMemo(() => [series.phase], [series]);
  if (x === null || y === null || phase === null)
    return <p className="chart-note">Nothing to draw: no finite point.</p>;
  const xs = response.frequency_Hz;
  const unit = view === "dB" ? "dB" : "%";
  return (
    <>
      <PlotPanel box={upper} x={x} y={y} xs={xs} from={0} cursor={cursor} ys={ys}>
        <LinePlot
          box={upper}
          rows={series.magnitudeRows}
          traces={series.source === null ? magnitudeTrace : bothTraces}
          {...{ x, y, bands, marks }}
          xName=""
          yName={`magnitude / ${unit}`}
        />
      </PlotPanel>
      <PlotPanel box={lower} x={x} y={phase} xs={xs} from={0} cursor={cursor} ys={phases}>
        <LinePlot
          box={lower}
          rows={series.phaseRows}
          traces={phaseTrace}
          x={x}
          y={phase}
          bands={noBands}
          marks={phaseMarks}
          xName={z === null ? "frequency / Hz" : ""}
          yName="phase / °"
        />
      </PlotPanel>
      {z === null ? null : (
        <PlotPanel box={lowest} x={x} y={z} xs={xs} from={0} cursor={cursor} ys={impedances}>
          <LinePlot
            box={lowest}
            rows={series.impedanceRows}
            traces={impedanceTrace}
            x={x}
            y={z}
            bands={noBands}
            marks={phaseMarks}
            xName="frequency / Hz"
            yName="|Z| / Ω"
          />
        </PlotPanel>
      )}
    </>
  );
}

function seriesOf(response: FrequencyResponse, view: MagnitudeView, from: FromSource | null) {
  const shown = (dB: readonly number[]) => (view === "dB" ? dB : dB.map(percentOf));
  const magnitude = shown(response.magnitude_dB);
  const source = from === null ? null : shown(from.magnitude_dB);
  const phase = unwrapped(response.phase_deg);
  const plain = { x: true, y: false };
  const traces = [
    { ...magnitudeTrace[0], y: magnitude },
    ...(source === null ? [] : [{ ...bothTraces[1], y: source }]),
  ];
  const upper = checkSeries(response.frequency_Hz, traces, plain);
  const lowest = checkSeries(response.frequency_Hz, [{ ...impedanceTrace[0], y: response.inputImpedance_ohm }], {
    x: true,
    y: true,
  });
  const lower = checkSeries(response.frequency_Hz, [{ ...phaseTrace[0], y: phase }], plain);
  return {
    magnitude,
    source,
    phase,
    left: Math.max(upper.left, lower.left),
    magnitudeRows: thinRows(
      upper.rows,
      traces.map((each) => each.id),
      400,
    ),
    impedanceRows: thinRows(lowest.rows, ["impedance"], 400),
    phaseRows: thinRows(lower.rows, ["phase"], 400),
  };
}

function toleranceBand(view: MagnitudeView, tolerance: number, band_Hz: readonly [number, number]): readonly Band[] {
  const edge = (share: number) => (view === "percent" ? 100 * share : 20 * Math.log10(1 + share));
  const name = `wanted ±${plainText(Number((100 * tolerance).toPrecision(3)))}\u2009%`;
  const low = Math.max(band_Hz[0], Number.MIN_VALUE);
  const x = band_Hz[1] > 0 ? ([low, band_Hz[1]] as const) : null;
  return [{ id: "tolerance", x, y: [edge(-Math.min(tolerance, 0.99)), edge(tolerance)], name }];
}

function marksOf(
  view: MagnitudeView,
  [low, high]: readonly [number, number],
  bandwidth: number | null,
): readonly Mark[] {
  const marks: Mark[] = [];
  const mark = (id: string, along: "x" | "y", at: number, name: string) =>
    marks.push({ id, along, at, name, kind: "mark" });
  if (low > 0) mark("low", "x", low, `from ${withUnit(low, "Hz", 3)}`);
  if (high > 0) mark("high", "x", high, `band to ${withUnit(high, "Hz", 3)}`);
  if (bandwidth !== null) mark("bandwidth", "x", bandwidth, `−3\u2009dB at ${withUnit(bandwidth, "Hz", 3)}`);
  if (view === "dB") mark("three", "y", -3, "−3\u2009dB");
  return marks;
}

function noteOf(left: number, view: MagnitudeView, y: Axis | null): string | null {
  const said: string[] = [];
  if (left > 0) said.push(`${left} points are not finite or not above 0 Hz and are not drawn.`);
  if (y !== null)
    said.push(
      `Drawn from ${plainText(y.domain[0])} to ${plainText(y.domain[1])}\u2009${view === "dB" ? "dB" : "%"}; the table has all.`,
    );
  return said.length === 0 ? null : said.join(" ");
}

function readoutAt(response: FrequencyResponse, i: number): string {
  const dB = response.magnitude_dB[i]!;
  const percent = percentOf(dB);
  return `${withUnit(response.frequency_Hz[i]!, "Hz")}: ${signed(dB)}\u2009dB (${signed(percent)}\u2009%), ${signed(response.phase_deg[i]!)}°, input ${withUnit(response.inputImpedance_ohm[i]!, "ohm", 3)}`;
}

function columnsOf(response: FrequencyResponse): readonly Column[] {
  return [
    { key: "frequency_Hz", head: "frequency / Hz", values: response.frequency_Hz },
    { key: "magnitude_dB", head: "magnitude / dB", values: response.magnitude_dB },
    { key: "deviation_percent", head: "deviation / %", values: response.magnitude_dB.map(percentOf) },
    { key: "phase_deg", head: "phase / °", values: response.phase_deg },
    { key: "inputImpedance_ohm", head: "input impedance / Ω", values: response.inputImpedance_ohm },
  ];
}

import { useMemo } from "react";
import type { Through } from "../../solver/index.ts";
import { withUnit } from "./axisText.ts";
import { ChartFrame } from "./ChartFrame.tsx";
import type { Column } from "./columns.ts";
import { LinePlot } from "./lazyPlots.tsx";
import { linearAxis } from "./logAxis.ts";
import { PlotPanel } from "./PlotPanel.tsx";
import { plotBox } from "./plotBox.ts";
import { checkSeries, thinRows } from "./trace.ts";
import { type Cursor, useCursor } from "./useCursor.ts";

interface Props {
  readonly through: Through;
  readonly title: string;
  readonly file: string;
}

const height = 260;
const none = [] as const;
const traces = [
  { id: "input", name: "input", hue: 2 },
  { id: "output", name: "as read", hue: 1 },
] as const;

/** What goes in and what is read, scale factor counted: a perfect divider leaves one line. */
export function WaveformChart({ through, title, file }: Props) {
  const cursor = useCursor(through.time_s.length);
  const columns = useMemo(() => columnsOf(through), [through]);
  return (
    <ChartFrame
      title={title}
      sentence={through.sentence}
      file={file}
      columns={columns}
      cursor={cursor}
      readout={cursor.index === null ? null : readoutAt(through, cursor.index)}
      height={height}
    >
      {(width) => <Panel width={width} through={through} cursor={cursor} />}
    </ChartFrame>
  );
}

function Panel({
  width,
  through,
  cursor,
}: {
  readonly width: number;
  readonly through: Through;
  readonly cursor: Cursor;
}) {
  const { time_s, input, output } = through;
  const x = useMemo(() => linearAxis(time_s, Math.max(2, Math.floor((width - 80) / 90))), [time_s, width]);
  const y = useMemo(() => linearAxis([0, ...input, ...output], 6), [input, output]);
  const box = useMemo(() => plotBox(width, height, 14), [width]);
  const ys = useMemo(() => [input, output], [input, output]);
  const rows = useMemo(() => {
    const [first, second] = traces;
    const checked = checkSeries(
      time_s,
      [
        { ...first, y: input },
        { ...second, y: output },
      ],
      { x: false, y: false },
    );
    return thinRows(checked.rows, ["input", "output"], 500);
  }, [time_s, input, output]);
  if (x === null || y === null) return <p className="chart-note">Nothing to draw: no finite point.</p>;
  return (
    <PlotPanel box={box} x={x} y={y} xs={time_s} from={0} cursor={cursor} ys={ys} name="input and reading">
      <LinePlot
        box={box}
        rows={rows}
        traces={traces}
        marks={none}
        bands={none}
        {...{ x, y }}
        xName="time / s"
        yName="value at the electrode"
      />
    </PlotPanel>
  );
}

function readoutAt({ time_s, input, output }: Through, i: number): string {
  const digits = (value: number) => String(Number(value.toPrecision(5)));
  return `${withUnit(time_s[i]!, "s")}: input ${digits(input[i]!)}, as read ${digits(output[i]!)}`;
}

const columnsOf = ({ time_s, input, output }: Through): readonly Column[] => [
  { key: "time_s", head: "time / s", values: time_s },
  { key: "input", head: "input", values: input },
  { key: "output", head: "as read, scale factor × output", values: output },
];

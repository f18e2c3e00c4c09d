import { useMemo } from "react";
import type { GreatestInput } from "../../solver/index.ts";
import { withUnit } from "./axisText.ts";
import { ChartFrame } from "./ChartFrame.tsx";
import type { Column } from "./columns.ts";
import { LinePlot } from "./lazyPlots.tsx";
import { logAxis } from "./logAxis.ts";
import { PlotPanel } from "./PlotPanel.tsx";
import { plotBox } from "./plotBox.ts";
import { checkSeries, thinRows } from "./trace.ts";
import { type Cursor, useCursor } from "./useCursor.ts";

const height = 220;
const none = [] as const;
const traces = [{ id: "greatest", name: "", hue: 1 }] as const;

/** The greatest sine that every part bears, against frequency, both axes logarithmic. */
export function GreatestInputChart({ greatest, file }: { readonly greatest: GreatestInput; readonly file: string }) {
  const cursor = useCursor(greatest.frequency_Hz.length);
  const columns = useMemo(() => columnsOf(greatest), [greatest]);
  return (
    <ChartFrame
      title="greatest input against frequency"
      sentence={greatest.sentence}
      file={file}
      columns={columns}
      cursor={cursor}
      readout={cursor.index === null ? null : readoutAt(greatest, cursor.index)}
      height={height}
    >
      {(width) => <Panel width={width} greatest={greatest} cursor={cursor} />}
    </ChartFrame>
  );
}

interface PanelProps {
  readonly width: number;
  readonly greatest: GreatestInput;
  readonly cursor: Cursor;
}

function Panel({ width, greatest, cursor }: PanelProps) {
  const { frequency_Hz, greatest_Vpeak } = greatest;
  const x = useMemo(() => logAxis(frequency_Hz, Math.floor((width - 80) / 44)), [frequency_Hz, width]);
  const drawn = useMemo(() => greatest_Vpeak.filter((value): value is number => value !== null), [greatest_Vpeak]);
  const y = useMemo(() => logAxis(drawn, 5), [drawn]);
  const box = useMemo(() => plotBox(width, height, 14), [width]);
  const ys = useMemo(() => [greatest_Vpeak.map((value) => value ?? Number.NaN)], [greatest_Vpeak]);
  const rows = useMemo(() => {
    const checked = checkSeries(frequency_Hz, [{ ...traces[0], y: greatest_Vpeak }], { x: true, y: true });
    return thinRows(checked.rows, ["greatest"], 400);
  }, [frequency_Hz, greatest_Vpeak]);
  if (x === null || y === null) return <p className="chart-note">Nothing bounds the input.</p>;
  return (
    <PlotPanel box={box} x={x} y={y} xs={frequency_Hz} from={0} cursor={cursor} ys={ys} name="greatest input">
      <LinePlot
        box={box}
        rows={rows}
        traces={traces}
        marks={none}
        bands={none}
        {...{ x, y }}
        xName="frequency / Hz"
        yName="input / V peak"
      />
    </PlotPanel>
  );
}

function readoutAt({ frequency_Hz, greatest_Vpeak, decidedBy, element }: GreatestInput, i: number): string {
  const value = greatest_Vpeak[i] ?? null;
  const where = element[i] == null ? "" : ` of element ${element[i]}`;
  return value === null
    ? `${withUnit(frequency_Hz[i]!, "Hz")}: nothing bounds it`
    : `${withUnit(frequency_Hz[i]!, "Hz")}: ${withUnit(value, "V")} peak, set by ${decidedBy[i]}${where}`;
}

const columnsOf = (greatest: GreatestInput): readonly Column[] => [
  { key: "frequency_Hz", head: "frequency / Hz", values: greatest.frequency_Hz },
  { key: "greatest_Vpeak", head: "greatest input / V peak", values: greatest.greatest_Vpeak },
  { key: "decided_by", head: "set by", values: greatest.decidedBy.map((each) => each ?? "nothing") },
];

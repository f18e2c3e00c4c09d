import { ZIndexLayer } from "recharts";
import type { Band, Mark } from "./LinePlot.tsx";
import { type Axis, shareOf } from "./logAxis.ts";
import type { PlotBox } from "./plotBox.ts";
import { endPoint, type Row, type Trace } from "./trace.ts";

interface Label {
  readonly id: string;
  readonly text: string;
  readonly x: number;
  readonly y: number;
  readonly anchor: "start" | "end";
  readonly fill: string;
}

interface Props {
  readonly box: PlotBox;
  readonly x: Axis;
  readonly y: Axis;
  readonly rows: readonly Row[];
  readonly traces: readonly Omit<Trace, "y">[];
  readonly marks: readonly Mark[];
  readonly bands: readonly Band[];
}

const lineHeight = 14;

/** Names written where the things are: traces at their ends, limits on their lines, bands in their corner. */
export function PlotLabels(p: Props) {
  return (
    <ZIndexLayer zIndex={2100}>
      <g className="plot-labels">
        {spread(labelsOf(p), p.box).map((label) => (
          <text key={label.id} x={label.x} y={label.y} textAnchor={label.anchor} fill={label.fill} fontSize={12}>
            {label.text}
          </text>
        ))}
      </g>
    </ZIndexLayer>
  );
}

function labelsOf({ box, x, y, rows, traces, marks, bands }: Props): readonly Label[] {
  const across = (v: number) => box.left + shareOf(x, v) * (box.right - box.left);
  const up = (v: number) => box.bottom - shareOf(y, v) * (box.bottom - box.top);
  const ends = traces.flatMap((trace): Label[] => {
    const end = endPoint(rows, trace.id, y);
    const fill = `var(--trace-${trace.hue})`;
    if (end === null) return [];
    return [{ id: trace.id, text: trace.name, x: across(end.x) + 6, y: up(end.y) + 4, anchor: "start", fill }];
  });
  const named = marks.map((mark): Label => {
    const fill = mark.kind === "limit" ? "var(--stop)" : "var(--quiet)";
    if (mark.along === "y")
      return { id: mark.id, text: mark.name, x: box.right - 6, y: up(mark.at) - 5, anchor: "end", fill };
    const turned = across(mark.at) > box.right - 6.2 * mark.name.length - 8;
    const at = across(mark.at) + (turned ? -5 : 5);
    return { id: mark.id, text: mark.name, x: at, y: box.top + 13, anchor: turned ? "end" : "start", fill };
  });
  const areas = bands.map((band): Label => {
    const left = Math.max(box.left, band.x === null ? box.left : across(Math.max(band.x[0], x.domain[0])));
    return {
      id: band.id,
      text: band.name,
      x: left + 5,
      y: Math.max(box.top + 12, up(Math.min(band.y[1], y.domain[1])) - 5),
      anchor: "start",
      fill: "var(--accent)",
    };
  });
  return [...ends, ...named, ...areas];
}

const span = (label: Label): readonly [number, number] => {
  const width = 6.2 * label.text.length;
  return label.anchor === "start" ? [label.x, label.x + width] : [label.x - width, label.x];
};

/** Moves a label by a line, towards the middle, as long as it would write over one already placed. */
function spread(labels: readonly Label[], box: PlotBox): readonly Label[] {
  const placed: Label[] = [];
  for (const label of labels) {
    let y = Math.min(Math.max(label.y, box.top + 10), box.bottom - 8);
    const [left, right] = span(label);
    const over = (at: number) =>
      placed.some((other) => {
        const [l, r] = span(other);
        return left < r && l < right && Math.abs(other.y - at) < lineHeight;
      });
    const step = label.y < (box.top + box.bottom) / 2 ? lineHeight : -lineHeight;
    for (let tries = 0; tries < 8 && over(y); tries += 1) y += step;
    placed.push({ ...label, y });
  }
  return placed;
}

import { type KeyboardEvent, type MouseEvent, useMemo } from "react";
import type { Design, DividerDocument } from "../../solver/index.ts";
import { useLooking, useSession } from "../frame/session.ts";
import { bodyPaths } from "./bodyPaths.ts";
import { bodies, type ColumnScale, columnScale, labelled, middleOf, rulerStep_m } from "./columnScale.ts";
import { Foot } from "./Foot.tsx";
import type { LayerView } from "./layers.ts";

/** Size of the drawing. */
export const width = 190;
export const height = 600;
/** Where the column stands on the drawing, px from its left. */
export const axis = 62;

interface DrawnProps {
  readonly document: DividerDocument;
  readonly design: Design;
  readonly view: LayerView;
}

/** The divider to scale. Click an element, or step with the arrow keys: nearest pattern is a slider, one place along the string. */
export function Drawing({ document: document_, design, view }: DrawnProps) {
  const session = useSession();
  const selected = useLooking((state) => state.element);
  const scale = useMemo(() => columnScale(design, height), [design]);
  const n = design.hvArm.elements.length;
  const select = (element: number) => session.looking.setState({ element: Math.min(n, Math.max(1, element)) });
  const onKeyDown = (event: KeyboardEvent) => {
    const step = { ArrowUp: 1, ArrowRight: 1, ArrowDown: -1, ArrowLeft: -1, PageUp: 10, PageDown: -10 }[event.key];
    if (step !== undefined) select((selected ?? (step > 0 ? 0 : n + 1)) + step);
    else if (event.key === "Home") select(1);
    else if (event.key === "End") select(n);
    else if (event.key === "Escape") session.looking.setState({ element: null });
    else return;
    event.preventDefault();
  };
  const onClick = (event: MouseEvent<HTMLDivElement>) => {
    const box = event.currentTarget.querySelector("svg")!.getBoundingClientRect();
    const y = ((event.clientY - box.top) / box.height) * height;
    const above = (scale.y(scale.foot_m) - y) / scale.pitch_px;
    if (above >= 0 && above <= n) select(Math.floor(above) + 1);
  };
  const now = Math.min(selected ?? 1, n);
  return (
    <div
      className="column-picture"
      role="slider"
      tabIndex={0}
      aria-label="element of the string, 1 next to the tap"
      aria-orientation="vertical"
      aria-valuemin={1}
      aria-valuemax={n}
      aria-valuenow={now}
      aria-valuetext={`element ${now} of ${n}, ${view.text(now - 1)}`}
      onKeyDown={onKeyDown}
      onClick={onClick}
    >
      <svg viewBox={`0 0 ${width} ${height}`} aria-hidden="true">
        <Ruler scale={scale} />
        <Electrode design={design} scale={scale} />
        <Bodies document={document_} design={design} scale={scale} view={view} />
        {selected === null || selected > n ? null : <Chosen scale={scale} element={selected} />}
        <Labels n={n} view={view} scale={scale} selected={selected} />
        <Foot document={document_} design={design} scale={scale} axis={axis} width={width} />
      </svg>
    </div>
  );
}

function Ruler({ scale }: { readonly scale: ColumnScale }) {
  const step = rulerStep_m(scale.pxPerMetre);
  const count = Math.floor((scale.y(0) - 22) / (step * scale.pxPerMetre));
  return (
    <g className="ruler">
      <line x1={30} x2={30} y1={scale.y(count * step)} y2={scale.y(0)} />
      {Array.from({ length: count + 1 }, (_, i) => i * step).map((at) => (
        <g key={at}>
          <line x1={26} x2={30} y1={scale.y(at)} y2={scale.y(at)} />
          <text x={24} y={scale.y(at) + 3.5}>
            {Math.round(at * 1000)}
          </text>
        </g>
      ))}
      <text x={30} y={9}>
        mm
      </text>
    </g>
  );
}

function Electrode({ design, scale }: { readonly design: Design; readonly scale: ColumnScale }) {
  const { electrode } = design.geometry;
  const top = scale.y(scale.top_m);
  const px = scale.pxPerMetre;
  if (electrode.kind === "none")
    return <path className="metal" d={`M${axis - 6} ${top}h12M${axis} ${top}v-5m-2.5 0h5`} />;
  const r = Math.max(2, electrode.radius_m * px);
  if (electrode.kind === "sphere") return <circle className="metal" cx={axis} cy={top - r} r={r} />;
  const half = Math.max(1, (electrode.kind === "toroid" ? electrode.tubeRadius_m : electrode.thickness_m / 2) * px);
  const middle = electrode.kind === "toroid" ? top - electrode.offset_m * px : top - half;
  const wide = electrode.kind === "toroid" ? r + half : r;
  return (
    <rect className="metal" x={axis - wide} y={middle - half} width={2 * wide} height={2 * half} rx={half} ry={half} />
  );
}

interface BodiesProps extends DrawnProps {
  readonly scale: ColumnScale;
}

function Bodies({ document: document_, design, scale, view }: BodiesProps) {
  const { shades, capacitors } = useMemo(
    () => bodyPaths(design, bodies(document_), scale, axis, view.share),
    [document_, design, scale, view],
  );
  return (
    <g>
      <line className="lead" x1={axis} x2={axis} y1={scale.y(scale.top_m)} y2={scale.y(scale.foot_m)} />
      {shades.map(({ ink, d }) => (
        <path
          key={ink ?? "none"}
          className={ink === null ? "resistor plain" : "resistor"}
          d={d}
          style={inked(ink, scale.pitch_px)}
        />
      ))}
      {capacitors === "" ? null : (
        <path className="capacitor" d={capacitors} style={{ strokeWidth: Math.min(0.8, scale.pitch_px / 6) }} />
      )}
    </g>
  );
}

/** Outlines thin with the pitch, so that many bodies keep their ink. */
const inked = (ink: number | null, pitch_px: number) => ({
  strokeWidth: Math.min(0.5, pitch_px / 12),
  ...(ink === null ? {} : { fill: `color-mix(in oklab, var(--potential-high) ${ink * 100}%, var(--potential-low))` }),
});

function Chosen({ scale, element }: { readonly scale: ColumnScale; readonly element: number }) {
  const tall = Math.max(scale.pitch_px, 6);
  const y = middleOf(scale, element) - tall / 2;
  return <path className="picked" d={`M${axis - 12} ${y}h-4v${tall}h4M${axis + 12} ${y}h4v${tall}h-4`} />;
}

interface LabelsProps {
  readonly n: number;
  readonly view: LayerView;
  readonly scale: ColumnScale;
  readonly selected: number | null;
}

/** Labels thin out before they collide; the selected element always has its own. */
function Labels({ n, view, scale, selected }: LabelsProps) {
  const shown = useMemo(() => labelled(n, scale.pitch_px), [n, scale]);
  const kept =
    selected === null || selected > n || shown.includes(selected)
      ? shown
      : [...shown.filter((i) => Math.abs(i - selected) * scale.pitch_px >= 14), selected];
  return (
    <g className="labels">
      {kept.map((i) => (
        <text key={i} y={middleOf(scale, i) + 4} className={i === selected ? "picked-label" : ""}>
          <tspan className="count" x={axis + 38}>
            {i}
          </tspan>
          <tspan className="figure" x={width - 4}>
            {view.text(i - 1)}
          </tspan>
        </text>
      ))}
    </g>
  );
}

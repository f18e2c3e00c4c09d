import { type KeyboardEvent, type MouseEvent, useMemo, useState } from "react";
import type { Design, DividerDocument, Proof } from "../../solver/index.ts";
import { useDocument, useJudged, useLooking, useSession } from "../frame/session.ts";
import { bodies, type ColumnScale, columnScale, labelStep, rulerStep_m } from "./columnScale.ts";
import { Slip } from "./Slip.tsx";
import "./column.css";
import { type Layer, layers, layerText } from "./layers.ts";

const width = 190;
const height = 600;
const axis = 62;

/** The divider to scale, from the top electrode to earth, always there. Click an element, or step with the arrow keys. */
export function Column() {
  const document_ = useDocument();
  const proof = useJudged((state) => state.proof);
  const stale = useJudged((state) => state.stale);
  const [layer, setLayer] = useState<Layer>("voltage");
  if (document_.design === null) return <p className="quiet">The column is drawn once a design stands.</p>;
  return (
    <section aria-label="the column">
      <h2>THE COLUMN</h2>
      <div className={stale ? "stale" : ""}>
        <Drawing document={document_} design={document_.design} proof={proof} layer={layer} />
      </div>
      <fieldset className="layers">
        <legend>layer</legend>
        {layers.map((each) => (
          <label key={each}>
            <input type="radio" name="layer" checked={layer === each} onChange={() => setLayer(each)} />
            {each}
          </label>
        ))}
      </fieldset>
      <Slip />
    </section>
  );
}

interface Drawn {
  readonly document: DividerDocument;
  readonly design: Design;
  readonly proof: Proof | null;
  readonly layer: Layer;
}

function Drawing({ document: document_, design, proof, layer }: Drawn) {
  const session = useSession();
  const selected = useLooking((state) => state.element);
  const scale = useMemo(() => columnScale(design, height), [design]);
  const n = design.hvArm.elements.length;
  const pitch = (design.geometry.columnLength_m / n) * scale.pxPerMetre;
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
    const box = event.currentTarget.getBoundingClientRect();
    const y = ((event.clientY - box.top) / box.height) * height;
    const above = (scale.y(scale.foot_m) - y) / pitch;
    if (above >= 0 && above <= n) select(Math.floor(above) + 1);
  };
  const now = selected ?? 1;
  return (
    // A slider is the nearest pattern: one value, the position along the string.
    <div
      className="column-drawing"
      role="slider"
      tabIndex={0}
      aria-label="element of the string, 1 next to the tap"
      aria-orientation="vertical"
      aria-valuemin={1}
      aria-valuemax={n}
      aria-valuenow={Math.min(now, n)}
      aria-valuetext={`element ${now} of ${n}, ${layerText(layer, Math.min(now, n) - 1, design, proof)}`}
      onKeyDown={onKeyDown}
      onClick={onClick}
    >
      <svg viewBox={`0 0 ${width} ${height}`} aria-hidden="true">
        <Ruler scale={scale} />
        <Electrode design={design} scale={scale} />
        <Bodies document={document_} design={design} scale={scale} pitch={pitch} selected={selected} />
        <Labels design={design} proof={proof} layer={layer} scale={scale} pitch={pitch} selected={selected} />
        <Foot document={document_} scale={scale} />
      </svg>
    </div>
  );
}

function Ruler({ scale }: { readonly scale: ColumnScale }) {
  const step = rulerStep_m(scale.pxPerMetre);
  const count = Math.floor((scale.height_px - 28) / (step * scale.pxPerMetre));
  return (
    <g className="ruler">
      <line x1={30} x2={30} y1={scale.y(count * step)} y2={scale.y(0)} />
      {Array.from({ length: count + 1 }, (_, i) => i * step).map((at) => (
        <g key={at}>
          <line x1={26} x2={30} y1={scale.y(at)} y2={scale.y(at)} />
          <text x={24} y={scale.y(at) + 4}>
            {Math.round(at * 1000)}
          </text>
        </g>
      ))}
      <text x={24} y={10}>
        mm
      </text>
    </g>
  );
}

function Electrode({ design, scale }: { readonly design: Design; readonly scale: ColumnScale }) {
  const { electrode } = design.geometry;
  const top = scale.y(scale.top_m);
  const px = scale.pxPerMetre;
  if (electrode.kind === "none") return <line className="metal" x1={axis - 5} x2={axis + 5} y1={top} y2={top} />;
  const r = Math.max(2, electrode.radius_m * px);
  if (electrode.kind === "sphere") return <circle className="metal" cx={axis} cy={top - r} r={r} />;
  const t = Math.max(1, (electrode.kind === "toroid" ? electrode.tubeRadius_m : electrode.thickness_m / 2) * px);
  return <rect className="metal" x={axis - r - t} y={top - 2 * t} width={2 * (r + t)} height={2 * t} rx={t} />;
}

interface BodiesProps {
  readonly document: DividerDocument;
  readonly design: Design;
  readonly scale: ColumnScale;
  readonly pitch: number;
  readonly selected: number | null;
}

/** Bodies at true length and diameter, ink by potential: pale at earth, full at the top. Many bodies are gathered in 48 paths. */
function Bodies({ document: document_, design, scale, pitch, selected }: BodiesProps) {
  const paths = useMemo(() => {
    const sizes = bodies(document_);
    const n = design.hvArm.elements.length;
    const shades = Math.min(48, n);
    const found = Array.from({ length: shades }, () => "");
    design.hvArm.elements.forEach((element, i) => {
      const size = sizes.get(element.part) ?? { length_m: 0.006, diameter_m: 0.003 };
      const w = Math.max(2.5, size.diameter_m * scale.pxPerMetre);
      const h = Math.max(0.8, Math.min(pitch * 0.94, size.length_m * scale.pxPerMetre));
      const middle = scale.y(scale.foot_m) - (i + 0.5) * pitch;
      found[Math.floor((i * shades) / n)] += `M${axis - w / 2} ${middle - h / 2}h${w}v${h}h${-w}z`;
    });
    return found;
  }, [document_, design, scale, pitch]);
  const at = selected === null ? null : scale.y(scale.foot_m) - (selected - 0.5) * pitch;
  return (
    <g>
      <line className="wire" x1={axis} x2={axis} y1={scale.y(scale.top_m)} y2={scale.y(scale.foot_m)} />
      {paths.map((d, i) => (
        <path
          // biome-ignore lint/suspicious/noArrayIndexKey: the i-th shade is always the i-th shade
          key={i}
          className="body"
          d={d}
          style={{ fillOpacity: 0.16 + (0.84 * (i + 0.5)) / paths.length }}
        />
      ))}
      {at === null ? null : (
        <rect className="chosen" x={axis - 9} y={at - Math.max(pitch, 5) / 2} width={18} height={Math.max(pitch, 5)} />
      )}
    </g>
  );
}

interface LabelsProps {
  readonly design: Design;
  readonly proof: Proof | null;
  readonly layer: Layer;
  readonly scale: ColumnScale;
  readonly pitch: number;
  readonly selected: number | null;
}

function Labels({ design, proof, layer, scale, pitch, selected }: LabelsProps) {
  const n = design.hvArm.elements.length;
  const step = labelStep(pitch);
  const shown = Array.from({ length: n }, (_, i) => i + 1).filter((i) => i === 1 || i === n || i % step === 0);
  const clear = shown.filter((i) => i === 1 || i === n || (i * pitch > 14 && (n - i) * pitch > 14));
  return (
    <g className="labels">
      {clear.map((i) => {
        const y = scale.y(scale.foot_m) - (i - 0.5) * pitch + 4;
        return (
          <text key={i} x={axis + 18} y={y} className={i === selected ? "chosen-label" : ""}>
            <tspan className="number">{i}</tspan>
            <tspan x={axis + 46}>{layerText(layer, i - 1, design, proof)}</tspan>
          </text>
        );
      })}
    </g>
  );
}

/** Tap, LV box, cable to the instrument, earth line. */
function Foot({ document: document_, scale }: { readonly document: DividerDocument; readonly scale: ColumnScale }) {
  const tap = scale.y(scale.foot_m);
  const floor = scale.y(0);
  const box = Math.max(8, Math.min(26, (floor - tap) * 0.5));
  const instrument = document_.instruments.find((each) => each.id === document_.principal);
  return (
    <g className="base">
      <line className="wire" x1={axis} x2={axis} y1={tap} y2={floor - box} />
      <circle className="tap-dot" cx={axis} cy={tap} r={2.5} />
      <text x={axis + 18} y={tap + 12}>
        tap
      </text>
      <rect className="box" x={axis - 14} y={floor - box} width={28} height={box} />
      <path className="wire" d={`M${axis + 14} ${floor - box / 2}H${width - 44}`} />
      <rect className="box" x={width - 44} y={floor - box} width={40} height={box} />
      <line className="earth" x1={8} x2={width - 4} y1={floor} y2={floor} />
      {box > 11 ? (
        <>
          <text className="in-box" x={axis} y={floor - box / 2 + 4}>
            LV
          </text>
          <text className="in-box" x={width - 24} y={floor - box / 2 + 4}>
            {instrument?.function.startsWith("scope") ? "scope" : "meter"}
          </text>
        </>
      ) : null}
      <path className="earth-sign" d={`M${axis - 34} ${floor}v4m-6 0h12m-10 2.5h8m-6 2.5h4`} />
    </g>
  );
}

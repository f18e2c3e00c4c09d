import { useMemo } from "react";
import type { Candidate } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";
import { linearAxis } from "../charts/logAxis.ts";
import { candidateName } from "./candidateText.ts";
import { type ColumnSketch, columnSketch } from "./columnSketch.ts";

interface Props {
  readonly candidates: readonly Candidate[];
  readonly chosen: Candidate | null;
  readonly onTake: (candidate: Candidate) => void;
}

const drawn_px = 190;

/** The best five side by side, to one scale, on one earth line; and the one in the design, where it is not among them. */
export function ColumnDrawings({ candidates, chosen, onTake }: Props) {
  const best = useMemo(() => {
    const first = candidates.slice(0, 5);
    return chosen === null || first.includes(chosen) ? first : [...first, chosen];
  }, [candidates, chosen]);
  const sketches = useMemo(() => best.map(columnSketch), [best]);
  const tallest = Math.max(0.1, ...sketches.map((s) => s.height_m));
  const scale = drawn_px / tallest;
  return (
    <div className="columns">
      <Ruler tallest_m={tallest} scale={scale} />
      {best.map((candidate, i) => (
        <button
          key={candidate.rank}
          type="button"
          className={candidate === chosen ? "column-button chosen" : "column-button"}
          aria-pressed={candidate === chosen}
          onClick={() => onTake(candidate)}
        >
          <Column sketch={sketches[i]!} scale={scale} />
          <span className="column-rank">{candidate.rank}</span>
          <span>{candidateName(candidate)}</span>
          <span className="quiet">{withUnit(candidate.columnLength_m, "m", 3)}</span>
        </button>
      ))}
    </div>
  );
}

function Column({ sketch, scale }: { readonly sketch: ColumnSketch; readonly scale: number }) {
  const width = Math.max(124, sketch.width_m * scale + 8);
  const up = (y_m: number) => drawn_px + 1 - y_m * scale;
  const middle = width / 2;
  const gap = Math.max(4, (sketch.bodies[0]?.diameter_m ?? 0.005) * scale * 1.6);
  const boxHeight = Math.min(sketch.foot_m, 14 / scale);
  const offsets = Array.from({ length: sketch.strings }, (_, s) => (s - (sketch.strings - 1) / 2) * gap);
  return (
    <svg width={width} height={drawn_px + 4} aria-hidden="true" className="column-drawing">
      <line className="earth" x1={-60} x2={width + 60} y1={drawn_px + 2} y2={drawn_px + 2} />
      <rect className="foot" x={middle - 12} width={24} y={up(boxHeight)} height={boxHeight * scale} />
      {offsets.map((dx) => (
        <line key={dx} className="lead" x1={middle + dx} x2={middle + dx} y1={up(boxHeight)} y2={up(sketch.top_m)} />
      ))}
      {offsets.flatMap((dx) =>
        sketch.bodies.map((body) => {
          const wide = Math.max(3, body.diameter_m * scale);
          return (
            <rect
              key={`${dx} ${body.y_m}`}
              className="body"
              x={middle + dx - wide / 2}
              width={wide}
              y={up(body.y_m + body.length_m)}
              height={Math.max(0.8, body.length_m * scale)}
            />
          );
        }),
      )}
      <Electrode sketch={sketch} middle={middle} scale={scale} up={up} />
    </svg>
  );
}

interface ElectrodeProps {
  readonly sketch: ColumnSketch;
  readonly middle: number;
  readonly scale: number;
  readonly up: (y_m: number) => number;
}

function Electrode({ sketch, middle, scale, up }: ElectrodeProps) {
  const { electrode } = sketch;
  if (electrode === null) return <circle className="electrode" cx={middle} cy={up(sketch.top_m)} r={2.5} />;
  const half = electrode.radius_m * scale;
  const thick = electrode.thickness_m * scale;
  const y = up(sketch.top_m) - thick;
  return (
    <rect
      className="electrode"
      x={middle - half}
      width={2 * half}
      y={y}
      height={thick}
      rx={Math.min(half, thick / 2)}
    />
  );
}

/** Millimetres at the edge. */
function Ruler({ tallest_m, scale }: { readonly tallest_m: number; readonly scale: number }) {
  const axis = linearAxis([0, 1000 * tallest_m], 4)!;
  return (
    <svg className="column-ruler" width={44} height={drawn_px + 4} aria-hidden="true">
      <line className="earth" x1={0} x2={44} y1={drawn_px + 2} y2={drawn_px + 2} />
      {axis.ticks
        .filter((mm) => mm <= 1000 * tallest_m)
        .map((mm) => (
          <g key={mm}>
            <line
              className="tick"
              x1={36}
              x2={44}
              y1={drawn_px + 1 - mm * 1e-3 * scale}
              y2={drawn_px + 1 - mm * 1e-3 * scale}
            />
            <text className="tick" x={33} y={drawn_px + 1 - mm * 1e-3 * scale + (mm === 0 ? -2 : 4)} textAnchor="end">
              {mm === 0 ? "mm" : mm}
            </text>
          </g>
        ))}
    </svg>
  );
}

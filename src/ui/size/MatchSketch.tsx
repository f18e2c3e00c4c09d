import type { Match } from "../../solver/index.ts";
import { signed } from "../charts/axisText.ts";
import { type Axis, linearAxis, shareOf } from "../charts/logAxis.ts";

interface Scale {
  readonly axis: Axis;
  readonly wanted: number;
}

/** One scale of percent for all sketches: what they hold, and of the wanted band what is near. */
export function sketchScale(matches: readonly Match[], wanted: number): Scale | null {
  const off = matches.flatMap((match) => match.step.value.map((value) => 100 * (value - 1)));
  const size = Math.max(...off.map(Math.abs), 0);
  const band = Math.min(100 * wanted, Math.max(2 * size, 1e-3));
  const axis = linearAxis([...off, -band, band], 3);
  return axis === null ? null : { axis, wanted };
}

const width = 200;
const height = 84;
const left = 44;

/** A step response near 100 %, time in decades across; a picture, its numbers stand under it. */
export function MatchSketch({ step, scale }: { readonly step: Match["step"]; readonly scale: Scale | null }) {
  const { time_s, value } = step;
  if (scale === null || time_s.length === 0) return <p className="quiet">None: it would be negative.</p>;
  const { axis } = scale;
  const first = Math.log(time_s[0]!);
  const span = Math.log(time_s[time_s.length - 1]!) - first;
  const x = (t: number) => left + ((Math.log(t) - first) / span) * (width - left);
  const y = (percent: number) => 4 + (1 - shareOf(axis, percent)) * (height - 8);
  const line = time_s.map((t, i) => `${x(t).toFixed(1)},${y(100 * (value[i]! - 1)).toFixed(1)}`).join(" ");
  const [low, high] = axis.domain;
  const band = 100 * scale.wanted;
  const top = y(Math.min(band, high));
  return (
    <svg className="match-sketch" viewBox={`0 0 ${width} ${height}`} aria-hidden="true">
      <rect className="band" x={left} width={width - left} y={top} height={y(Math.max(-band, low)) - top} />
      <line className="right" x1={left} x2={width} y1={y(0)} y2={y(0)} />
      {axis.ticks.map((tick) => (
        <text key={tick} className="tick" x={left - 4} y={y(tick) + 4} textAnchor="end">
          {tick === 0 ? "0" : `${signed(tick)}\u2009%`}
        </text>
      ))}
      <polyline className="step" points={line} />
    </svg>
  );
}

import { crestFactors, formatQuantity, type Waveform } from "../../solver/index.ts";

const width = 280;
const height = 128;
const middle = 64;

/** A small sketch with its numbers marked: mean, rms, peak, peak to peak, so that a mix-up is seen. */
export function WaveformSketch({ waveform }: { readonly waveform: Waveform }) {
  const { peakOverStated, rmsOverPeak, meanOverPeak } = crestFactors(waveform);
  const peak = Math.abs(waveform.nominal_V) * peakOverStated;
  const sign = waveform.nominal_V < 0 ? -1 : 1;
  const twoSided = waveform.kind === "sine" || waveform.kind === "square";
  const volts = (value: number) => formatQuantity(value, "V");
  const numbers = [
    ["mean", sign * peak * meanOverPeak],
    ["rms", peak * rmsOverPeak],
    ["peak", sign * peak],
    ["peak to peak", waveform.kind === "dc" ? 0 : twoSided ? 2 * peak : peak],
  ] as const;
  const y = (share: number) => middle - sign * share * 48;
  return (
    <figure className="sketch">
      <svg
        viewBox={`0 0 ${width} ${height}`}
        role="img"
        aria-label={numbers.map(([name, value]) => `${name} ${volts(value)}`).join(", ")}
      >
        <line className="axis" x1={8} x2={width - 8} y1={middle} y2={middle} />
        <path className="wave" d={shape(waveform, y)} />
        {[
          ["pk", 1],
          ["rms", rmsOverPeak],
        ].map(([name, share]) =>
          Number(share) > 0 && (name === "pk" || rmsOverPeak < 0.999) ? (
            <g key={name}>
              <line className="mark" x1={8} x2={width - 34} y1={y(Number(share))} y2={y(Number(share))} />
              <text x={width - 30} y={y(Number(share)) + 4}>
                {name}
              </text>
            </g>
          ) : null,
        )}
      </svg>
      <figcaption>
        {numbers.map(([name, value]) => (
          <span key={name}>
            <span className="quiet">{name}</span> {volts(value)}
          </span>
        ))}
      </figcaption>
    </figure>
  );
}

function shape(waveform: Waveform, y: (share: number) => number): string {
  const from = 8;
  const to = width - 40;
  const across = (share: number) => from + share * (to - from);
  switch (waveform.kind) {
    case "dc":
      return `M${from} ${y(0)}H${across(0.08)}V${y(1)}H${to}`;
    case "sine": {
      const points = Array.from({ length: 81 }, (_, i) => `${across(i / 80)} ${y(Math.sin((i / 80) * 4 * Math.PI))}`);
      return `M${points.join("L")}`;
    }
    case "square":
      return `M${from} ${y(1)}H${across(0.25)}V${y(-1)}H${across(0.5)}V${y(1)}H${across(0.75)}V${y(-1)}H${to}`;
    default:
      return `M${from} ${y(0)}H${across(0.2)}L${across(0.27)} ${y(1)}H${across(0.6)}L${across(0.7)} ${y(0)}H${to}`;
  }
}

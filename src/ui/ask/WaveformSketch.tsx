import { formatQuantity, type Waveform } from "../../solver/index.ts";
import { apart, sketchNumbers } from "./sketchLines.ts";

const width = 288;
const height = 144;
const left = 40;
const right = width - 128;
const top = 12;
const bottom = height - 24;

/** The waveform with its numbers marked on it: mean, rms, peak, peak to peak, so that a mix-up is seen. */
export function WaveformSketch({ waveform }: { readonly waveform: Waveform }) {
  const { lines, peakToPeak_V, top_V, bottom_V } = sketchNumbers(waveform);
  const span = top_V - bottom_V || 1;
  const y = (value_V: number) => bottom - ((value_V - bottom_V) / span) * (bottom - top);
  const volts = (value: number) => formatQuantity(value, "V");
  const labels = apart(
    lines.map((line) => y(line.value_V)),
    15,
  );
  const said = [
    ...lines.map(({ name, value_V }) => `${name} ${volts(value_V)}`),
    `peak to peak ${volts(peakToPeak_V)}`,
  ];
  return (
    <figure className="sketch">
      <svg viewBox={`0 0 ${width} ${height}`} role="img" aria-label={said.join(", ")}>
        <line className="axis" x1={left} x2={right} y1={y(0)} y2={y(0)} />
        {lines.map(({ name, value_V }, i) => (
          <g key={name}>
            <path className="mark" d={`M${left} ${y(value_V)}H${right}L${right + 8} ${labels[i]}`} />
            <text y={labels[i]! + 4}>
              <tspan className="quiet-text" x={right + 12}>
                {name}
              </tspan>{" "}
              {name.length > 11 ? (
                <tspan x={right + 12} dy={15}>
                  {volts(value_V)}
                </tspan>
              ) : (
                volts(value_V)
              )}
            </text>
          </g>
        ))}
        <path className="wave" d={shape(waveform, y, lines)} />
        {peakToPeak_V === 0 ? null : <PeakToPeak from={y(bottom_V)} to={y(top_V)} text={volts(peakToPeak_V)} />}
        <text className="quiet-text time" x={(left + right) / 2} y={height - 6}>
          {timeOf(waveform)}
        </text>
      </svg>
    </figure>
  );
}

function PeakToPeak({ from, to, text }: { readonly from: number; readonly to: number; readonly text: string }) {
  const x = 28;
  const middle = (from + to) / 2;
  return (
    <g>
      <path className="measure" d={`M${x - 4} ${to}h8M${x - 4} ${from}h8M${x} ${to}V${from}`} />
      <text className="across" transform={`translate(${x - 6} ${middle}) rotate(-90)`}>
        <tspan className="quiet-text">pk-pk</tspan> {text}
      </text>
    </g>
  );
}

/** The times stated; the sketch itself is not to a scale of time. */
function timeOf({ kind, frequency_Hz, riseTime_s, width_s }: Waveform): string {
  const seconds = (value: number) => formatQuantity(value, "s", { trailing: false });
  if ((kind === "sine" || kind === "square") && frequency_Hz !== null && frequency_Hz > 0)
    return `period ${seconds(1 / frequency_Hz)}`;
  if (kind !== "pulse") return "";
  const rise = riseTime_s === null ? [] : [`edge ${seconds(riseTime_s)}`];
  return [...rise, ...(width_s === null ? [] : [`width ${seconds(width_s)}`])].join(", ");
}

function shape(
  waveform: Waveform,
  y: (value_V: number) => number,
  lines: readonly { readonly name: string; readonly value_V: number }[],
): string {
  const peak = lines.at(-1)!.value_V;
  const across = (share: number) => (left + share * (right - left)).toFixed(1);
  switch (waveform.kind) {
    case "dc":
      return `M${across(0)} ${y(peak)}H${across(1)}`;
    case "sine": {
      const points = Array.from(
        { length: 65 },
        (_, i) => `${across(i / 64)} ${y(peak * Math.sin((i / 64) * 4 * Math.PI)).toFixed(1)}`,
      );
      return `M${points.join("L")}`;
    }
    case "square":
      return `M${across(0)} ${y(peak)}H${across(0.25)}V${y(-peak)}H${across(0.5)}V${y(peak)}H${across(0.75)}V${y(-peak)}H${across(1)}`;
    default:
      return `M${across(0)} ${y(0)}H${across(0.2)}L${across(0.27)} ${y(peak)}H${across(0.6)}L${across(0.72)} ${y(0)}H${across(1)}`;
  }
}

import { withUnit } from "./axisText.ts";

interface Props {
  /** What it shows, in a few words. */
  readonly name: string;
  readonly time_s: readonly number[];
  /** With the instrument's noise, as it will be seen. */
  readonly noisy_V: readonly number[];
  /** Peak to peak of a right picture: five divisions. */
  readonly signal_Vpp: number;
}

const across = 10;
const up = 8;
const unit = 20;
const width = across * unit;
const height = up * unit;
/** Divisions that the right signal fills. */
const filled = 5;

/** An oscilloscope's picture: ten divisions by eight, the right signal five high, two periods wide. */
export function ScopePicture({ name, time_s, noisy_V, signal_Vpp }: Props) {
  const perDivision_V = signal_Vpp / filled;
  const last = time_s[time_s.length - 1]! + time_s[1]!;
  const points = noisy_V.map((v, i) => {
    const x = (time_s[i]! / last) * width;
    const y = Math.min(height, Math.max(0, height / 2 - (v / perDivision_V) * unit));
    return `${x.toFixed(1)},${y.toFixed(1)}`;
  });
  const right = (filled / 2) * unit;
  const scales = `${withUnit(last / across, "s", 2)} and ${withUnit(perDivision_V, "V", 2)} a division`;
  return (
    <figure className="scope-picture">
      <svg viewBox={`0 0 ${width} ${height}`} role="img" aria-label={`${name}: ${scales}`}>
        <path className="graticule" d={graticule} />
        <path className="right-level" d={`M0 ${height / 2 - right}H${width}M0 ${height / 2 + right}H${width}`} />
        <polyline points={points.join(" ")} />
      </svg>
      <figcaption>
        {name}
        <span className="quiet">{scales}</span>
      </figcaption>
    </figure>
  );
}

const graticule = [
  ...Array.from({ length: across + 1 }, (_, i) => `M${i * unit} 0V${height}`),
  ...Array.from({ length: up + 1 }, (_, i) => `M0 ${i * unit}H${width}`),
].join("");

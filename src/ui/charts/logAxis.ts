/** Axes with an explicit domain and explicit ticks: a log axis is never left to choose its own. */
export type Domain = readonly [number, number];
export interface Axis {
  readonly kind: "log" | "linear";
  readonly domain: Domain;
  readonly ticks: readonly number[];
  /** Unlabelled lines between the ticks. */
  readonly minor: readonly number[];
}

/** Exact powers of ten from integer exponents: 10 ** -9 is not 1e-9. */
const decade = (exponent: number): number => Number(`1e${exponent}`);

/**
 * A log axis over whole decades around positive finite values.
 * @param most how many labelled decades fit; labels thin to every 2nd, 3rd, … decade, the lines stay
 * @returns null when no value is positive
 */
export function logAxis(values: readonly number[], most: number): Axis | null {
  const drawn = values.filter((v) => Number.isFinite(v) && v > 0);
  if (drawn.length === 0) return null;
  const low = Math.floor(Math.log10(least(drawn)) + 1e-9);
  const high = Math.max(low + 1, Math.ceil(Math.log10(greatest(drawn)) - 1e-9));
  const every = [1, 2, 3, 4, 6, 9].find((step) => (high - low) / step <= most) ?? 12;
  const exponents = Array.from({ length: high - low + 1 }, (_, i) => low + i);
  const ticks = exponents.filter((k) => k % every === 0).map(decade);
  const minor = exponents
    .flatMap((k) => (every === 1 ? [2, 3, 4, 5, 6, 7, 8, 9].map((m) => Number(`${m}e${k}`)) : [decade(k)]))
    .filter((v) => v < decade(high) && !ticks.includes(v));
  return { kind: "log", domain: [decade(low), decade(high)], ticks, minor };
}

/** A linear axis on steps of 1, 2 or 5 around the values; `most` is how many steps fit. */
export function linearAxis(values: readonly number[], most: number): Axis | null {
  const drawn = values.filter(Number.isFinite);
  if (drawn.length === 0) return null;
  const low = least(drawn);
  const high = greatest(drawn);
  const size = Math.max(Math.abs(low), Math.abs(high));
  const span = high - low > 1e-6 * size ? high - low : size;
  const step = niceStep((span > 1e-30 ? span : 1) / most);
  const first = Math.floor(low / step + 1e-9);
  const last = Math.max(first + 1, Math.ceil(high / step - 1e-9));
  const ticks = Array.from({ length: last - first + 1 }, (_, i) => Number(((first + i) * step).toPrecision(12)));
  return { kind: "linear", domain: [ticks[0]!, ticks[ticks.length - 1]!], ticks, minor: [] };
}

/** The smallest of 1, 2, 5 × 10^k that is not below the width asked. */
export function niceStep(width: number): number {
  const power = decade(Math.floor(Math.log10(width)));
  return ([1, 2, 5].find((m) => m * power >= width * (1 - 1e-9)) ?? 10) * power;
}

/** Share 0 … 1 of the axis at a value; outside the domain it leaves 0 … 1. */
export function shareOf(axis: Axis, value: number): number {
  const [low, high] = axis.domain;
  if (axis.kind === "log") return Math.log(value / low) / Math.log(high / low);
  return (value - low) / (high - low);
}

/** The value at a share of the axis. */
export function valueAt(axis: Axis, share: number): number {
  const [low, high] = axis.domain;
  return axis.kind === "log" ? low * (high / low) ** share : low + share * (high - low);
}

const least = (values: readonly number[]): number => values.reduce((a, b) => Math.min(a, b), Number.POSITIVE_INFINITY);
const greatest = (values: readonly number[]): number =>
  values.reduce((a, b) => Math.max(a, b), Number.NEGATIVE_INFINITY);

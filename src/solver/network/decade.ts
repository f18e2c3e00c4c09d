import { type Contour, decadeContour, invert, weighted } from "./contour.ts";

/** The decades of time for which contours are made: from 10^first s. */
export const firstDecade = -14;
export const lastDecade = 6;
export const least_s = 10 ** firstDecade;

export const decadeOf = (t: number): number => Math.min(Math.floor(Math.log10(t)), lastDecade);

/** The contour of a decade, a little wider, so that rounding of log10 never leaves it. */
export const contourOf = (exponent: number): Contour => decadeContour(10 ** (exponent + 1) * 1.0000001);

/** One decade of the smooth part: its transform on the contour, and step and deficit as Chebyshev series in ln t. */
export class Decade {
  readonly step: (t: number) => number;
  readonly deficit: (t: number) => number;

  constructor(
    readonly contour: Contour,
    readonly re: Float64Array,
    readonly im: Float64Array,
    exponent: number,
    whole: boolean,
  ) {
    const { sre, sim } = contour;
    const step = weighted(contour, (k) => over(re[k]!, im[k]!, sre[k]!, sim[k]!));
    const deficit = weighted(contour, (k) => {
      const [qr, qi] = over(1 - re[k]!, -im[k]!, sre[k]!, sim[k]!);
      return over(qr, qi, sre[k]!, sim[k]!);
    });
    const read = (f: (t: number) => number) => (whole ? chebyshev(f, exponent) : f);
    this.step = read((t) => invert(contour, step, t));
    this.deficit = read((t) => invert(contour, deficit, t));
  }
}

/** Terms of a Chebyshev series in log t over one decade: 26 leave 1e-13 for what decays over decades. */
const terms = 26;

function chebyshev(f: (t: number) => number, exponent: number): (t: number) => number {
  const samples = Float64Array.from({ length: terms }, (_, j) =>
    f(10 ** (exponent + (1 + Math.cos((Math.PI * (j + 0.5)) / terms)) / 2)),
  );
  const coefficients = new Float64Array(terms);
  for (let m = 0; m < terms; m++) {
    let sum = 0;
    for (let j = 0; j < terms; j++) sum += samples[j]! * cosines[m * terms + j]!;
    coefficients[m] = (sum * (m === 0 ? 1 : 2)) / terms;
  }
  return (t) => clenshaw(coefficients, Math.log10(t) - exponent);
}

const cosines = Float64Array.from({ length: terms * terms }, (_, i) =>
  Math.cos((Math.PI * Math.floor(i / terms) * ((i % terms) + 0.5)) / terms),
);

/** Value at a share 0 … 1 of the decade. */
function clenshaw(c: Float64Array, share: number): number {
  const x = 2 * (2 * share - 1);
  let b1 = 0;
  let b2 = 0;
  for (let m = terms - 1; m >= 1; m--) {
    const b = c[m]! + x * b1 - b2;
    b2 = b1;
    b1 = b;
  }
  return c[0]! + (x / 2) * b1 - b2;
}

export function over(ar: number, ai: number, br: number, bi: number): readonly [number, number] {
  const d = br * br + bi * bi;
  return [(ar * br + ai * bi) / d, (ai * br - ar * bi) / d];
}

import { type Contour, decadeContour, invert, weighted } from "./contour.ts";

/** The decades of time for which contours are made: from 10^first s. */
const firstDecade = -14;
const lastDecade = 6;
export const least_s = 10 ** firstDecade;

export const decadeOf = (t: number): number => Math.min(Math.floor(Math.log10(t)), lastDecade);

/** A contour for times up to 1, a little wider, so that rounding of log10 never leaves it. Every decade's is this one, scaled. */
const unit = decadeContour(1.0000001);

/** The contour of a decade. */
export function contourOf(exponent: number): Contour {
  const scale = 10 ** (exponent + 1);
  const shrunk = (values: Float64Array) => values.map((each) => each / scale);
  return { sre: shrunk(unit.sre), sim: shrunk(unit.sim), wre: shrunk(unit.wre), wim: shrunk(unit.wim) };
}

/** Terms of a Chebyshev series in log t over one decade: 26 leave 1e-13 for what decays over decades. */
const terms = 26;
const nodes = unit.sre.length;

/** Share 0 … 1 of the decade at the series' points. */
const shares = Float64Array.from({ length: terms }, (_, j) => (1 + Math.cos((Math.PI * (j + 0.5)) / terms)) / 2);

/**
 * From a transform F on the contour to the Chebyshev coefficients of its time function, for F/s and for F/s² (times the decade's end):
 * the same matrices in every decade, since s t at the series' points is.
 */
const toStep = seriesOf(1);
const toIntegral = seriesOf(2);

interface Series {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

function seriesOf(power: 1 | 2): Series {
  const re = new Float64Array(terms * nodes);
  const im = new Float64Array(terms * nodes);
  for (let k = 0; k < nodes; k++) {
    // weight/s^power, so that a real part of F contributes its imaginary part and an imaginary one its real part.
    let [wr, wi] = [unit.wre[k]!, unit.wim[k]!];
    for (let i = 0; i < power; i++) [wr, wi] = over(wr, wi, unit.sre[k]!, unit.sim[k]!);
    for (let j = 0; j < terms; j++) {
      const t = 10 ** (shares[j]! - 1);
      const e = Math.exp(unit.sre[k]! * t);
      const sine = e * Math.sin(unit.sim[k]! * t);
      const cosine = e * Math.cos(unit.sim[k]! * t);
      for (let m = 0; m < terms; m++) {
        const c = ((m === 0 ? 1 : 2) / terms) * Math.cos((Math.PI * m * (j + 0.5)) / terms);
        const at = m * nodes + k;
        re[at] = re[at]! + c * (wr * sine + wi * cosine);
        im[at] = im[at]! + c * (wr * cosine - wi * sine);
      }
    }
  }
  return { re, im };
}

function coefficients({ re, im }: Series, Fre: Float64Array, Fim: Float64Array, scale: number): Float64Array {
  const out = new Float64Array(terms);
  for (let m = 0; m < terms; m++) {
    let sum = 0;
    for (let k = 0; k < nodes; k++) sum += re[m * nodes + k]! * Fre[k]! + im[m * nodes + k]! * Fim[k]!;
    out[m] = sum * scale;
  }
  return out;
}

/** One decade of the smooth part: its transform on the contour, and step and deficit as Chebyshev series in ln t. */
export class Decade {
  readonly step: (t: number) => number;
  readonly deficit: (t: number) => number;

  /** @param whole false where the transform does not hold from the decade's start: then it is inverted time by time */
  constructor(
    readonly contour: Contour,
    readonly re: Float64Array,
    readonly im: Float64Array,
    exponent: number,
    whole: boolean,
  ) {
    if (whole) {
      const steps = coefficients(toStep, re, im, 1);
      let deficits: Float64Array | null = null;
      this.step = (t) => clenshaw(steps, Math.log10(t) - exponent);
      this.deficit = (t) => {
        deficits ??= coefficients(
          toIntegral,
          re.map((each) => 1 - each),
          im.map((each) => -each),
          10 ** (exponent + 1),
        );
        return clenshaw(deficits, Math.log10(t) - exponent);
      };
    } else {
      const { sre, sim } = contour;
      const step = weighted(contour, (k) => over(re[k]!, im[k]!, sre[k]!, sim[k]!));
      const deficit = weighted(contour, (k) => {
        const [qr, qi] = over(1 - re[k]!, -im[k]!, sre[k]!, sim[k]!);
        return over(qr, qi, sre[k]!, sim[k]!);
      });
      this.step = (t) => invert(contour, step, t);
      this.deficit = (t) => invert(contour, deficit, t);
    }
  }
}

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

import { add, type Complex, complex, divide, multiply } from "../quantities/complex.ts";
import { type Contour, decadeContour, invert, type OnContour, weighted } from "./contour.ts";
import type { LadderNetwork, Reference } from "./ladderNetwork.ts";
import { residue, ringingPoles } from "./ringing.ts";
import type { TimeResponse } from "./timeResponse.ts";
import { transfer } from "./transfer.ts";

const firstDecade = -14;
const lastDecade = 6;
const least_s = 10 ** firstDecade;

/** A ringing pair: G holds q·s/(s − p) and its mirror image, whose step response is 2 Re q·exp(p t). */
interface Pair {
  readonly p: Complex;
  readonly q: Complex;
}

/**
 * The ringing pairs are taken out with their residues, the rest is inverted on one contour a decade, made on first use. Exact for lumped
 * parts; with a line in the network it holds from `heldFrom_s`, when every mode of the line that is not among the pairs has died away.
 */
export class LumpedResponse implements TimeResponse {
  readonly initial: number;
  readonly delay_s = 0;
  private readonly pairs: readonly Pair[];
  private readonly smoothInitial: number;
  private readonly decades = new Map<number, Decade>();

  constructor(
    private readonly network: LadderNetwork,
    private readonly reference: Reference,
    private readonly scaleFactor: number,
    readonly ringing: readonly Complex[] = ringingPoles(network, reference),
    private readonly heldFrom_s = 0,
  ) {
    const evaluate = (sre: Float64Array, sim: Float64Array) => this.response(sre, sim);
    const apart = heldFrom_s === 0 ? Number.POSITIVE_INFINITY : 0.5 / network.cable.line!.delay_s;
    this.pairs = this.ringing.map((p) => ({ p, q: divide(residue(evaluate, p, apart), p) }));
    // At s = 1e40 every capacitance outweighs every conductance by twenty decades: the instant of the edge.
    const edge = this.response(Float64Array.of(1e40), new Float64Array(1)).re[0]!;
    this.initial = Math.abs(edge) < 1e-20 ? 0 : edge;
    this.smoothInitial = this.initial - this.pairs.reduce((sum, { q }) => sum + 2 * q.re, 0);
  }

  at(t: number): number {
    if (t < 0) return 0;
    if (t < least_s) return this.initial;
    return this.smooth(t) + this.rung(t, ({ q }) => q);
  }

  deficit(t: number): number {
    if (t < least_s) return (1 - this.initial) * Math.max(t, 0);
    // ∫ of 2 Re q·exp(p t) from 0.
    const rung = this.pairs.reduce((sum, { p, q }) => {
      const grown = subtractOne(p, t);
      return sum + 2 * multiply(divide(q, p), grown).re;
    }, 0);
    return this.decade(t).deficit(t) - rung;
  }

  mean(a: number, b: number): number {
    const span = b - a;
    const smooth =
      span < 1e-3 * b
        ? gaussMean((t) => this.smooth(t), a, b)
        : 1 - (this.smoothDeficit(b) - this.smoothDeficit(a)) / span;
    return (
      smooth +
      this.pairs.reduce((sum, { p, q }) => {
        const from = exponential(p, a);
        return sum + (2 * multiply(divide(multiply(q, from), p), subtractOne(p, span)).re) / span;
      }, 0)
    );
  }

  exponential(alpha: number, t: number): number {
    if (t < least_s) return t < 0 ? 0 : this.initial;
    const { contour, re, im } = this.decade(t);
    const smooth = weighted(contour, (k) => over(re[k]!, im[k]!, contour.sre[k]! + alpha, contour.sim[k]!));
    return this.pairs.reduce(
      (sum, { p, q }) => {
        const forced = add(multiply(p, exponential(p, t)), complex(alpha * Math.exp(-alpha * t)));
        return sum + 2 * divide(multiply(q, forced), complex(p.re + alpha, p.im)).re;
      },
      invert(contour, smooth, t),
    );
  }

  sine(omega: number): { readonly steady: Complex; transient(t: number): number } {
    const at = this.response(new Float64Array(1), Float64Array.of(omega));
    const steady = complex(at.re[0]!, at.im[0]!);
    const s = complex(0, omega);
    // The smooth part alone at jω: what the contour must not hold.
    const own = this.pairs.reduce((left, pair) => minus(left, pairAt(pair, s)), steady);
    const transient = (t: number): number => {
      if (t < least_s) return -steady.im;
      const { contour, re, im } = this.decade(t);
      const F = weighted(contour, (k) => transientAt(re[k]!, im[k]!, contour.sre[k]!, contour.sim[k]!, omega, own));
      const rung = this.rung(t, ({ p, q }) => {
        const pp = multiply(p, p);
        return divide(multiply(multiply(q, p), complex(omega)), complex(pp.re + omega * omega, pp.im));
      });
      return invert(contour, F, t) + rung;
    };
    return { steady, transient };
  }

  /** G at each s: transfer × scale factor. */
  private response(sre: Float64Array, sim: Float64Array): OnContour {
    const H = transfer(this.network, sre, sim, this.reference);
    return { re: H.re.map((each) => each * this.scaleFactor), im: H.im.map((each) => each * this.scaleFactor) };
  }

  private smooth(t: number): number {
    return t < least_s ? this.smoothInitial : this.decade(t).step(t);
  }

  private smoothDeficit(t: number): number {
    return t < least_s ? (1 - this.smoothInitial) * t : this.decade(t).deficit(t);
  }

  private rung(t: number, amplitude: (pair: Pair) => Complex): number {
    let sum = 0;
    for (const pair of this.pairs) {
      if (pair.p.re * t < -60) continue;
      sum += 2 * multiply(amplitude(pair), exponential(pair.p, t)).re;
    }
    return sum;
  }

  private decade(t: number): Decade {
    const exponent = Math.min(Math.floor(Math.log10(t)), lastDecade);
    let found = this.decades.get(exponent);
    if (found === undefined) {
      found = this.make(exponent);
      this.decades.set(exponent, found);
    }
    return found;
  }

  private make(exponent: number): Decade {
    // A little wider than the decade, so that rounding of log10 never leaves it.
    const contour = decadeContour(10 ** (exponent + 1) * 1.0000001);
    const { re, im } = this.response(contour.sre, contour.sim);
    for (const pair of this.pairs) {
      for (let k = 0; k < re.length; k++) {
        const held = pairAt(pair, complex(contour.sre[k]!, contour.sim[k]!));
        re[k] = re[k]! - held.re;
        im[k] = im[k]! - held.im;
      }
    }
    return new Decade(contour, re, im, exponent, 10 ** exponent >= this.heldFrom_s);
  }
}

/** One decade of the smooth part: its transform on the contour, and step and deficit as Chebyshev series in ln t. */
class Decade {
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

/** q s/(s − p) with its mirror image. */
function pairAt({ p, q }: Pair, s: Complex): Complex {
  const upper = divide(multiply(q, s), minus(s, p));
  const lower = divide(multiply(complex(q.re, -q.im), s), minus(s, complex(p.re, -p.im)));
  return add(upper, lower);
}

/** G ω/(s² + ω²) less its principal parts at ±jω, where G is `own` and its mirror image. */
function transientAt(
  re: number,
  im: number,
  sre: number,
  sim: number,
  omega: number,
  own: Complex,
): readonly [number, number] {
  const s = complex(sre, sim);
  const ss = multiply(s, s);
  const whole = divide(complex(re * omega, im * omega), complex(ss.re + omega * omega, ss.im));
  // own/(2j) over s − jω, and its mirror image over s + jω.
  const c = complex(own.im / 2, -own.re / 2);
  const upper = divide(c, complex(sre, sim - omega));
  const lower = divide(complex(c.re, -c.im), complex(sre, sim + omega));
  return [whole.re - upper.re - lower.re, whole.im - upper.im - lower.im];
}

const minus = (a: Complex, b: Complex): Complex => complex(a.re - b.re, a.im - b.im);

const exponential = (p: Complex, t: number): Complex => {
  const size = Math.exp(p.re * t);
  return complex(size * Math.cos(p.im * t), size * Math.sin(p.im * t));
};

/** exp(p t) − 1 without a difference of equals. */
function subtractOne(p: Complex, t: number): Complex {
  const sine = Math.sin((p.im * t) / 2);
  return complex(Math.expm1(p.re * t) * Math.cos(p.im * t) - 2 * sine * sine, Math.exp(p.re * t) * Math.sin(p.im * t));
}

export function over(ar: number, ai: number, br: number, bi: number): readonly [number, number] {
  const d = br * br + bi * bi;
  return [(ar * br + ai * bi) / d, (ai * br - ar * bi) / d];
}

const abscissae = [0.1834346424956498, 0.525532409916329, 0.7966664774136267, 0.9602898564975363];
const weights = [0.362683783378362, 0.3137066458778873, 0.2223810344533745, 0.1012285362903763];

/** Mean by eight-point Gauss-Legendre (Abramowitz and Stegun, table 25.4, from memory). */
export function gaussMean(f: (x: number) => number, from: number, to: number): number {
  const middle = (from + to) / 2;
  const half = (to - from) / 2;
  return abscissae.reduce((sum, x, k) => sum + (weights[k]! / 2) * (f(middle + half * x) + f(middle - half * x)), 0);
}

import { type Complex, complex, divide, multiply } from "../quantities/complex.ts";
import { invert, type OnContour, weighted } from "./contour.ts";
import { contourOf, Decade, decadeOf, least_s, over } from "./decade.ts";
import { gaussMean } from "./gaussMean.ts";
import type { LadderNetwork, Reference } from "./ladderNetwork.ts";
import { residue, ringingPoles } from "./ringing.ts";
import { RingingPairs } from "./ringingPairs.ts";
import type { TimeResponse } from "./timeResponse.ts";
import { transfer } from "./transfer.ts";

/**
 * The ringing pairs are taken out with their residues, the rest is inverted on one contour a decade, made on first use. Exact for lumped
 * parts; with a line in the network it holds from `heldFrom_s`, when every mode of the line that is not among the pairs has died away.
 */
export class LumpedResponse implements TimeResponse {
  readonly initial: number;
  readonly delay_s = 0;
  private readonly pairs: RingingPairs;
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
    this.pairs = new RingingPairs(ringing, (pole) => residue(evaluate, pole, apart));
    // At s = 1e40 every capacitance outweighs every conductance by twenty decades: the instant of the edge.
    const edge = this.response(Float64Array.of(1e40), new Float64Array(1)).re[0]!;
    this.initial = Math.abs(edge) < 1e-20 ? 0 : edge;
    this.smoothInitial = this.initial - this.pairs.step(0);
  }

  at(t: number): number {
    if (t < 0) return 0;
    if (t < least_s) return this.initial;
    return this.smooth(t) + this.pairs.step(t);
  }

  deficit(t: number): number {
    if (t < least_s) return (1 - this.initial) * Math.max(t, 0);
    return this.decade(t).deficit(t) - this.pairs.integral(t);
  }

  mean(a: number, b: number): number {
    const span = b - a;
    // A short stretch is nearly straight: two points leave (span/b)^4/4320 of what changes over b.
    const smooth =
      span < 0.01 * b
        ? (this.smooth(a + 0.2113248654051871 * span) + this.smooth(b - 0.2113248654051871 * span)) / 2
        : span < 0.3 * b
          ? gaussMean((t) => this.smooth(t), a, b)
          : 1 - (this.smoothDeficit(b) - this.smoothDeficit(a)) / span;
    return smooth + this.pairs.between(a, b) / span;
  }

  exponential(alpha: number, t: number): number {
    if (t < least_s) return t < 0 ? 0 : this.initial;
    const { contour, re, im } = this.decade(t);
    const smooth = weighted(contour, (k) => over(re[k]!, im[k]!, contour.sre[k]! + alpha, contour.sim[k]!));
    return invert(contour, smooth, t) + this.pairs.exponential(alpha, t);
  }

  sine(omega: number): { readonly steady: Complex; transient(t: number): number } {
    const at = this.response(new Float64Array(1), Float64Array.of(omega));
    const steady = complex(at.re[0]!, at.im[0]!);
    // The smooth part alone at jω: what the contour must not hold.
    const rung = this.pairs.at(complex(0, omega));
    const own = complex(steady.re - rung.re, steady.im - rung.im);
    const ringing = this.pairs.transient(omega);
    const transient = (t: number): number => {
      if (t < least_s) return -steady.im;
      const { contour, re, im } = this.decade(t);
      const F = weighted(contour, (k) => transientAt(re[k]!, im[k]!, contour.sre[k]!, contour.sim[k]!, omega, own));
      return invert(contour, F, t) + ringing(t);
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

  private decade(t: number): Decade {
    const exponent = decadeOf(t);
    let found = this.decades.get(exponent);
    if (found === undefined) {
      found = this.make(exponent);
      this.decades.set(exponent, found);
    }
    return found;
  }

  private make(exponent: number): Decade {
    const contour = contourOf(exponent);
    const { re, im } = this.response(contour.sre, contour.sim);
    for (let k = 0; k < re.length && this.pairs.count > 0; k++) {
      const held = this.pairs.at(complex(contour.sre[k]!, contour.sim[k]!));
      re[k] = re[k]! - held.re;
      im[k] = im[k]! - held.im;
    }
    return new Decade(contour, re, im, exponent, 10 ** exponent >= this.heldFrom_s);
  }
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

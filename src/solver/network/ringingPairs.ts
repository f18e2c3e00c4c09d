import { type Complex, complex, divide, multiply } from "../quantities/complex.ts";

/**
 * Ringing pairs taken out of a response: G holds q s/(s − p) and its mirror image for each. Their step response is 2 Re q exp(p t),
 * nothing at s = 0, so what is left still tends to 1.
 */
export class RingingPairs {
  readonly count: number;
  private readonly pre: Float64Array;
  private readonly pim: Float64Array;
  private readonly qre: Float64Array;
  private readonly qim: Float64Array;

  constructor(
    readonly poles: readonly Complex[],
    residue: (pole: Complex) => Complex,
  ) {
    this.count = poles.length;
    const q = poles.map((p) => divide(residue(p), p));
    this.pre = Float64Array.from(poles, (p) => p.re);
    this.pim = Float64Array.from(poles, (p) => p.im);
    this.qre = Float64Array.from(q, (each) => each.re);
    this.qim = Float64Array.from(q, (each) => each.im);
  }

  /** Σ 2 Re q exp(p t). */
  step(t: number): number {
    return this.sum(t, this.qre, this.qim);
  }

  /** ∫₀ᵗ of the same: Σ 2 Re (q/p)(exp(p t) − 1), without a difference of equals. */
  integral(t: number): number {
    return this.between(0, t);
  }

  /** ∫ from a to b. */
  between(a: number, b: number): number {
    let sum = 0;
    for (let k = 0; k < this.count; k++) {
      const pr = this.pre[k]!;
      const pi = this.pim[k]!;
      if (pr * a < -60) continue;
      const d = pr * pr + pi * pi;
      const size = Math.exp(pr * a);
      const cr = (size * (this.qre[k]! * pr + this.qim[k]! * pi)) / d;
      const ci = (size * (this.qim[k]! * pr - this.qre[k]! * pi)) / d;
      const er = cr * Math.cos(pi * a) - ci * Math.sin(pi * a);
      const ei = cr * Math.sin(pi * a) + ci * Math.cos(pi * a);
      const angle = pi * (b - a);
      const sine = Math.sin(angle / 2);
      const gr = Math.expm1(pr * (b - a)) * Math.cos(angle) - 2 * sine * sine;
      const gi = Math.exp(pr * (b - a)) * Math.sin(angle);
      sum += 2 * (er * gr - ei * gi);
    }
    return sum;
  }

  /** Response to exp(−αt): Σ 2 Re q (p exp(p t) + α exp(−α t))/(p + α). */
  exponential(alpha: number, t: number): number {
    const fall = alpha * Math.exp(-alpha * t);
    return this.poles.reduce((sum, p, k) => {
      const grown = multiply(p, exponential(p, t));
      const forced = complex(grown.re + fall, grown.im);
      return sum + 2 * divide(multiply(this.q(k), forced), complex(p.re + alpha, p.im)).re;
    }, 0);
  }

  /** What of the response to sin(ωt) rings: amplitudes q p ω/(p² + ω²), as a function of time. */
  transient(omega: number): (t: number) => number {
    const amplitudes = this.poles.map((p, k) => {
      const pp = multiply(p, p);
      return divide(multiply(multiply(this.q(k), p), complex(omega)), complex(pp.re + omega * omega, pp.im));
    });
    const re = Float64Array.from(amplitudes, (each) => each.re);
    const im = Float64Array.from(amplitudes, (each) => each.im);
    return (t) => this.sum(t, re, im);
  }

  /** Their transform at s. */
  at(s: Complex): Complex {
    let re = 0;
    let im = 0;
    for (let k = 0; k < this.count; k++) {
      const p = this.poles[k]!;
      const q = this.q(k);
      const upper = divide(multiply(q, s), complex(s.re - p.re, s.im - p.im));
      const lower = divide(multiply(complex(q.re, -q.im), s), complex(s.re - p.re, s.im + p.im));
      re += upper.re + lower.re;
      im += upper.im + lower.im;
    }
    return complex(re, im);
  }

  private q(k: number): Complex {
    return complex(this.qre[k]!, this.qim[k]!);
  }

  private sum(t: number, re: Float64Array, im: Float64Array): number {
    let sum = 0;
    for (let k = 0; k < this.count; k++) {
      const fall = this.pre[k]! * t;
      if (fall < -60) continue;
      const angle = this.pim[k]! * t;
      sum += 2 * Math.exp(fall) * (re[k]! * Math.cos(angle) - im[k]! * Math.sin(angle));
    }
    return sum;
  }
}

const exponential = (p: Complex, t: number): Complex => {
  const size = Math.exp(p.re * t);
  return complex(size * Math.cos(p.im * t), size * Math.sin(p.im * t));
};

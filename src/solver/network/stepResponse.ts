import { dcSolution } from "./dcSolution.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";
import { tapTwoPort, transfer } from "./tapTwoPort.ts";

/**
 * One hyperbolic inverse-Laplace contour shared by every time of one decade (Weideman and Trefethen, Math. Comp. 76 (2007),
 * 1341, from memory): s(θ) = μ (1 + sin(iθ − α)), midpoint rule in θ. An R-C network's poles lie on the negative real axis,
 * so the error falls as exp(−B(α) N); 24 nodes over a span of ten leave about 3e-11.
 */
const nodes = 24;
const span = 10;
const alpha = 1.03;
const A = Math.acosh(((Math.PI - 2 * alpha) * span + 4 * alpha - Math.PI) / ((4 * alpha - Math.PI) * Math.sin(alpha)));
const stepSize = A / nodes;
const muTimesEnd = ((4 * Math.PI * alpha - Math.PI * Math.PI) / A) * nodes;

const firstDecade = -14;
const lastDecade = 6;

/** Step response of a network at any time, its contours made on first use: g is 1 in the end. */
export class StepResponse {
  readonly initial: number;
  private readonly decades = new Map<number, Decade>();

  private constructor(
    private readonly network: LadderNetwork,
    private readonly scaleFactor: number,
  ) {
    // At s = 1e40 every capacitance outweighs every conductance by twenty decades: the instant of the edge.
    const far = Float64Array.of(1e40);
    const zero = new Float64Array(1);
    this.initial = transfer(network, tapTwoPort(network, far, zero), far, zero).re[0]! * scaleFactor;
  }

  static of(network: LadderNetwork): StepResponse | null {
    const dc = dcSolution(network, 1);
    return dc === null ? null : new StepResponse(network, dc.scaleFactor);
  }

  /** g(t): scale factor × output over step height, t after an ideal step at the electrode. */
  at(time: number): number {
    if (time < 0) return 0;
    if (time === 0 || time < 10 ** firstDecade) return this.initial;
    return this.decade(Math.min(Math.floor(Math.log10(time)), lastDecade)).inverse(time, 0);
  }

  /** ∫₀ᵗ (1 − g) dτ, s. */
  deficit(time: number): number {
    if (time < 10 ** firstDecade) return (1 - this.initial) * time;
    return this.decade(Math.min(Math.floor(Math.log10(time)), lastDecade)).inverse(time, 1);
  }

  private decade(exponent: number): Decade {
    let found = this.decades.get(exponent);
    if (found === undefined) {
      found = new Decade(this.network, this.scaleFactor, exponent);
      this.decades.set(exponent, found);
    }
    return found;
  }
}

class Decade {
  private readonly sre = new Float64Array(nodes);
  private readonly sim = new Float64Array(nodes);
  /** Residues of g's and of the deficit's transform: weight · F(s). */
  private readonly weights: readonly [Float64Array, Float64Array, Float64Array, Float64Array];

  constructor(network: LadderNetwork, scaleFactor: number, exponent: number) {
    // A little wider than the decade, so that rounding of log10 never leaves it.
    const mu = muTimesEnd / (10 ** (exponent + 1) * 1.0000001);
    const dre = new Float64Array(nodes);
    const dim = new Float64Array(nodes);
    for (let k = 0; k < nodes; k++) {
      const theta = (k + 0.5) * stepSize;
      this.sre[k] = mu * (1 - Math.sin(alpha) * Math.cosh(theta));
      this.sim[k] = mu * Math.cos(alpha) * Math.sinh(theta);
      dre[k] = -mu * Math.sin(alpha) * Math.sinh(theta);
      dim[k] = mu * Math.cos(alpha) * Math.cosh(theta);
    }
    const H = transfer(network, tapTwoPort(network, this.sre, this.sim), this.sre, this.sim);
    const w0r = new Float64Array(nodes);
    const w0i = new Float64Array(nodes);
    const w1r = new Float64Array(nodes);
    const w1i = new Float64Array(nodes);
    const scale = stepSize / Math.PI;
    for (let k = 0; k < nodes; k++) {
      const sr = this.sre[k]!;
      const si = this.sim[k]!;
      const s2 = sr * sr + si * si;
      // ds/s
      const qr = (dre[k]! * sr + dim[k]! * si) / s2;
      const qi = (dim[k]! * sr - dre[k]! * si) / s2;
      const gr = H.re[k]! * scaleFactor;
      const gi = H.im[k]! * scaleFactor;
      w0r[k] = scale * (gr * qr - gi * qi);
      w0i[k] = scale * (gr * qi + gi * qr);
      // (1 − G)/s · ds/s
      const pr = ((1 - gr) * sr - gi * si) / s2;
      const pi = (-gi * sr - (1 - gr) * si) / s2;
      w1r[k] = scale * (pr * qr - pi * qi);
      w1i[k] = scale * (pr * qi + pi * qr);
    }
    this.weights = [w0r, w0i, w1r, w1i];
  }

  inverse(time: number, which: 0 | 1): number {
    const wr = this.weights[which === 0 ? 0 : 2];
    const wi = this.weights[which === 0 ? 1 : 3];
    let sum = 0;
    for (let k = 0; k < nodes; k++) {
      const e = Math.exp(this.sre[k]! * time);
      const phase = this.sim[k]! * time;
      sum += e * (wr[k]! * Math.sin(phase) + wi[k]! * Math.cos(phase));
    }
    return sum;
  }
}

/** g at a list of times; null where dc does not pass. */
export function stepResponse(network: LadderNetwork, times_s: ArrayLike<number>): Float64Array | null {
  const g = StepResponse.of(network);
  return g === null ? null : Float64Array.from(times_s, (t) => g.at(t));
}

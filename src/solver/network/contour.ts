/**
 * Inverse Laplace transforms as sums over a contour s(θ) around the poles, midpoint rule in θ, upper half alone (the time functions
 * are real): f(t) = (h/π) Im Σ exp(s t) F(s) s'(θ).
 */
export interface Contour {
  readonly sre: Float64Array;
  readonly sim: Float64Array;
  /** (h/π)·s'(θ). */
  readonly wre: Float64Array;
  readonly wim: Float64Array;
}

/**
 * Hyperbola shared by every time of one decade (Weideman and Trefethen, Math. Comp. 76 (2007), 1341, from memory):
 * s(θ) = μ (1 + sin(iθ − α)). It encloses the negative real axis, where the poles of an R-C network lie, so the error falls as
 * exp(−B(α) N); 24 nodes over a span of ten leave about 3e-11.
 */
const usualNodes = 24;
const span = 10;
const alpha = 1.03;
const A = Math.acosh(((Math.PI - 2 * alpha) * span + 4 * alpha - Math.PI) / ((4 * alpha - Math.PI) * Math.sin(alpha)));
const muTimesEnd = (4 * Math.PI * alpha - Math.PI * Math.PI) / A;

/** For times from end/10 to end. More nodes leave less; beyond 32 the rounding of the sum does not. */
export function decadeContour(end_s: number, nodes = usualNodes): Contour {
  const mu = (muTimesEnd * nodes) / end_s;
  return contour(nodes, A / nodes, (theta) => ({
    sre: mu * (1 - Math.sin(alpha) * Math.cosh(theta)),
    sim: mu * Math.cos(alpha) * Math.sinh(theta),
    dre: -mu * Math.sin(alpha) * Math.sinh(theta),
    dim: mu * Math.cos(alpha) * Math.cosh(theta),
  }));
}

/**
 * Wide contour for times from end/1.5 to end: s(θ) = (τ θ cot θ + j ν θ)/end (A. Talbot, J. Inst. Maths Applics 23 (1979), 97, from
 * memory), stretched so that it also encloses complex poles up to |Im s| = reach. Tried: 1e-9 up to reach·end = 3000.
 */
export function wideContour(end_s: number, reach_per_s: number): Contour {
  const tau = 12;
  const wide = Math.max(8, 1.7 * reach_per_s * end_s) / (Math.PI / 2);
  const count = Math.ceil(34 + 1.6 * reach_per_s * end_s);
  return contour(count, Math.PI / count, (theta) => {
    const cot = Math.cos(theta) / Math.sin(theta);
    return {
      sre: (tau * theta * cot) / end_s,
      sim: (wide * theta) / end_s,
      dre: (tau * (cot - theta / Math.sin(theta) ** 2)) / end_s,
      dim: wide / end_s,
    };
  });
}

function contour(
  count: number,
  h: number,
  at: (theta: number) => { sre: number; sim: number; dre: number; dim: number },
): Contour {
  const make = () => new Float64Array(count);
  const found = { sre: make(), sim: make(), wre: make(), wim: make() };
  for (let k = 0; k < count; k++) {
    const { sre, sim, dre, dim } = at((k + 0.5) * h);
    found.sre[k] = sre;
    found.sim[k] = sim;
    found.wre[k] = (dre * h) / Math.PI;
    found.wim[k] = (dim * h) / Math.PI;
  }
  return found;
}

/** A transform on a contour with the weights multiplied in. */
export interface OnContour {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/** F(s)·s'(θ) h/π at every node. */
export function weighted(c: Contour, transform: (k: number) => readonly [re: number, im: number]): OnContour {
  const re = new Float64Array(c.sre.length);
  const im = new Float64Array(c.sre.length);
  for (let k = 0; k < re.length; k++) {
    const [fr, fi] = transform(k);
    re[k] = fr * c.wre[k]! - fi * c.wim[k]!;
    im[k] = fr * c.wim[k]! + fi * c.wre[k]!;
  }
  return { re, im };
}

/** The time function at t, a time the contour is made for. */
export function invert(c: Contour, { re, im }: OnContour, t: number): number {
  let sum = 0;
  for (let k = 0; k < re.length; k++) {
    const e = Math.exp(c.sre[k]! * t);
    const phase = c.sim[k]! * t;
    sum += e * (re[k]! * Math.sin(phase) + im[k]! * Math.cos(phase));
  }
  return sum;
}

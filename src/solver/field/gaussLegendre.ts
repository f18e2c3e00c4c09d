/** Points and weights of Gauss-Legendre on 0 … 1, with the barycentric weights of the polynomial through the points. */
export interface Rule {
  readonly points: Float64Array;
  readonly weights: Float64Array;
  readonly barycentric: Float64Array;
}

const rules = new Map<number, Rule>();

/** The rule of n points, by Newton's method on the Legendre polynomial; each is made once. */
export function gaussLegendre(n: number): Rule {
  const known = rules.get(n);
  if (known !== undefined) return known;
  const points = new Float64Array(n);
  const weights = new Float64Array(n);
  const barycentric = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    let x = -Math.cos((Math.PI * (i + 0.75)) / (n + 0.5));
    let slope = 1;
    for (let step = 0; step < 100; step++) {
      let before = 0;
      let value = 1;
      for (let k = 0; k < n; k++) {
        const next = ((2 * k + 1) * x * value - k * before) / (k + 1);
        before = value;
        value = next;
      }
      slope = (n * (x * value - before)) / (x * x - 1);
      const change = value / slope;
      x -= change;
      if (Math.abs(change) < 1e-15) break;
    }
    points[i] = (1 + x) / 2;
    weights[i] = 1 / ((1 - x * x) * slope * slope);
    barycentric[i] = (i % 2 === 0 ? 1 : -1) * Math.sqrt((1 - x * x) * weights[i]!);
  }
  const rule = { points, weights, barycentric };
  rules.set(n, rule);
  return rule;
}

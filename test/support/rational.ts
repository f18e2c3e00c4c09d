/** Exact fractions of BigInts: an independent route for linear systems where double precision would not do. */
export interface Rational {
  readonly n: bigint;
  readonly d: bigint;
}

const gcd = (a: bigint, b: bigint): bigint => {
  let [x, y] = [a < 0n ? -a : a, b];
  while (y !== 0n) [x, y] = [y, x % y];
  return x;
};
const make = (n: bigint, d: bigint): Rational => {
  if (n === 0n) return { n: 0n, d: 1n };
  const g = gcd(n, d < 0n ? -d : d);
  return d < 0n ? { n: -n / g, d: -d / g } : { n: n / g, d: d / g };
};

/** The exact value of a double. */
export function rational(x: number): Rational {
  if (x === 0) return { n: 0n, d: 1n };
  let exponent = 0;
  let mantissa = x;
  while (!Number.isInteger(mantissa)) {
    mantissa *= 2;
    exponent += 1;
  }
  return make(BigInt(mantissa), 1n << BigInt(exponent));
}

export const plus = (a: Rational, b: Rational): Rational => make(a.n * b.d + b.n * a.d, a.d * b.d);
export const minus = (a: Rational, b: Rational): Rational => make(a.n * b.d - b.n * a.d, a.d * b.d);
export const times = (a: Rational, b: Rational): Rational => make(a.n * b.n, a.d * b.d);
export const over = (a: Rational, b: Rational): Rational => make(a.n * b.d, a.d * b.n);

/** To double, with 80 bits kept on the way. */
export function toNumber({ n, d }: Rational): number {
  if (n === 0n) return 0;
  const size = (n < 0n ? -n : n).toString(2).length - d.toString(2).length;
  const shift = 80 - size;
  const scaled = shift >= 0 ? (n << BigInt(shift)) / d : n / (d << BigInt(-shift));
  return Number(scaled) * 2 ** -shift;
}

/** Solves A x = b exactly by elimination; the system must be regular. */
export function solveExactly(A: Rational[][], b: Rational[]): Rational[] {
  const n = b.length;
  for (let k = 0; k < n; k++) {
    const pivot = A.findIndex((row, i) => i >= k && row[k]!.n !== 0n);
    [A[k], A[pivot]] = [A[pivot]!, A[k]!];
    [b[k], b[pivot]] = [b[pivot]!, b[k]!];
    for (let i = k + 1; i < n; i++) {
      const factor = over(A[i]![k]!, A[k]![k]!);
      if (factor.n === 0n) continue;
      for (let j = k; j < n; j++) A[i]![j] = minus(A[i]![j]!, times(factor, A[k]![j]!));
      b[i] = minus(b[i]!, times(factor, b[k]!));
    }
  }
  const x = new Array<Rational>(n);
  for (let k = n - 1; k >= 0; k--) {
    let sum = b[k]!;
    for (let j = k + 1; j < n; j++) sum = minus(sum, times(A[k]![j]!, x[j]!));
    x[k] = over(sum, A[k]![k]!);
  }
  return x;
}

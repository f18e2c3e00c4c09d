/**
 * Dense real system by LU with partial pivoting, factored once for many right-hand sides.
 * The matrix is n × n, row by row; it is overwritten. Throws on a singular matrix: a programmer's error here.
 */
export function factor(matrix: Float64Array, n: number): Int32Array {
  const pivots = new Int32Array(n);
  for (let k = 0; k < n; k++) {
    let best = k;
    for (let i = k + 1; i < n; i++) if (Math.abs(matrix[i * n + k]!) > Math.abs(matrix[best * n + k]!)) best = i;
    pivots[k] = best;
    if (best !== k) {
      for (let j = 0; j < n; j++) {
        const held = matrix[k * n + j]!;
        matrix[k * n + j] = matrix[best * n + j]!;
        matrix[best * n + j] = held;
      }
    }
    const pivot = matrix[k * n + k]!;
    if (pivot === 0) throw new Error("singular matrix");
    for (let i = k + 1; i < n; i++) {
      const f = matrix[i * n + k]! / pivot;
      matrix[i * n + k] = f;
      if (f === 0) continue;
      for (let j = k + 1; j < n; j++) matrix[i * n + j] = matrix[i * n + j]! - f * matrix[k * n + j]!;
    }
  }
  return pivots;
}

/** Solves with the factors; the right-hand side is overwritten by the solution. */
export function solve(factors: Float64Array, pivots: Int32Array, b: Float64Array): Float64Array {
  const n = b.length;
  for (let k = 0; k < n; k++) {
    const p = pivots[k]!;
    const held = b[k]!;
    b[k] = b[p]!;
    b[p] = held;
  }
  for (let i = 1; i < n; i++) {
    let sum = b[i]!;
    for (let j = 0; j < i; j++) sum -= factors[i * n + j]! * b[j]!;
    b[i] = sum;
  }
  for (let i = n - 1; i >= 0; i--) {
    let sum = b[i]!;
    for (let j = i + 1; j < n; j++) sum -= factors[i * n + j]! * b[j]!;
    b[i] = sum / factors[i * n + i]!;
  }
  return b;
}

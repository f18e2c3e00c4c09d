/** Columns that are eliminated together: each row below then takes one pass instead of as many. */
const block = 8;

/**
 * Dense real system by LU with partial pivoting, factored once for many right-hand sides.
 * The matrix is n × n, row by row; it is overwritten. Throws on a singular matrix: a programmer's error here.
 */
export function factor(matrix: Float64Array, n: number): Int32Array {
  const pivots = new Int32Array(n);
  for (let from = 0; from < n; from += block) {
    const to = Math.min(n, from + block);
    factorColumns(matrix, n, from, to, pivots);
    for (let k = from + 1; k < to; k++)
      for (let t = from; t < k; t++) subtract(matrix, k * n, t * n, matrix[k * n + t]!, to, n);
    if (to - from < block) {
      for (let i = to; i < n; i++)
        for (let t = from; t < to; t++) subtract(matrix, i * n, t * n, matrix[i * n + t]!, to, n);
    } else for (let i = to; i < n; i++) subtractBlock(matrix, i * n, from, n);
  }
  return pivots;
}

/** Eliminates within the columns from … to alone; whole rows change places. */
function factorColumns(matrix: Float64Array, n: number, from: number, to: number, pivots: Int32Array): void {
  for (let k = from; k < to; k++) {
    let best = k;
    for (let i = k + 1; i < n; i++) if (Math.abs(matrix[i * n + k]!) > Math.abs(matrix[best * n + k]!)) best = i;
    pivots[k] = best;
    if (best !== k) {
      const held = matrix.slice(k * n, (k + 1) * n);
      matrix.copyWithin(k * n, best * n, (best + 1) * n);
      matrix.set(held, best * n);
    }
    const pivot = matrix[k * n + k]!;
    if (pivot === 0) throw new Error("singular matrix");
    for (let i = k + 1; i < n; i++) {
      const f = matrix[i * n + k]! / pivot;
      matrix[i * n + k] = f;
      if (f !== 0) subtract(matrix, i * n, k * n, f, k + 1, to);
    }
  }
}

/** Takes f times one row from another, in the columns from … to. */
function subtract(matrix: Float64Array, row: number, other: number, f: number, from: number, to: number): void {
  for (let j = from; j < to; j++) matrix[row + j] = matrix[row + j]! - f * matrix[other + j]!;
}

/** Takes the whole block's rows from one below, right of the block. */
function subtractBlock(matrix: Float64Array, row: number, from: number, n: number): void {
  const at = row + from;
  const [a, b, c, d] = [matrix[at]!, matrix[at + 1]!, matrix[at + 2]!, matrix[at + 3]!];
  const [e, f, g, h] = [matrix[at + 4]!, matrix[at + 5]!, matrix[at + 6]!, matrix[at + 7]!];
  const u = from * n;
  const [v, w, x] = [u + n, u + 2 * n, u + 3 * n];
  const [y, z, p, q] = [u + 4 * n, u + 5 * n, u + 6 * n, u + 7 * n];
  for (let j = from + block; j < n; j++) {
    matrix[row + j] =
      matrix[row + j]! -
      (a * matrix[u + j]! + b * matrix[v + j]! + c * matrix[w + j]! + d * matrix[x + j]!) -
      (e * matrix[y + j]! + f * matrix[z + j]! + g * matrix[p + j]! + h * matrix[q + j]!);
  }
}

/** Solves with the factors; the right-hand side is overwritten by the solution. */
export const solve = (factors: Float64Array, pivots: Int32Array, b: Float64Array): Float64Array =>
  solveMany(factors, pivots, b, 1);

/** Solves for `count` right-hand sides at once, one a column of b (n × count, row by row); b is overwritten. */
export function solveMany(factors: Float64Array, pivots: Int32Array, b: Float64Array, count: number): Float64Array {
  const n = pivots.length;
  for (let k = 0; k < n; k++) {
    const p = pivots[k]!;
    if (p === k) continue;
    for (let c = 0; c < count; c++) {
      const held = b[k * count + c]!;
      b[k * count + c] = b[p * count + c]!;
      b[p * count + c] = held;
    }
  }
  for (let i = 1; i < n; i++)
    for (let j = 0; j < i; j++) subtractRow(b, i * count, j * count, factors[i * n + j]!, count);
  for (let i = n - 1; i >= 0; i--) {
    for (let j = i + 1; j < n; j++) subtractRow(b, i * count, j * count, factors[i * n + j]!, count);
    const pivot = factors[i * n + i]!;
    for (let c = i * count; c < (i + 1) * count; c++) b[c] = b[c]! / pivot;
  }
  return b;
}

function subtractRow(b: Float64Array, row: number, other: number, f: number, count: number): void {
  if (f === 0) return;
  for (let c = 0; c < count; c++) b[row + c] = b[row + c]! - f * b[other + c]!;
}

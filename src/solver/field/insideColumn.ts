import { epsilon0 } from "../standards/constants.ts";

/**
 * Maxwell's matrix of the inside of a closed graded column, F, row by row: what the field within it adds between its nodes.
 * The potential on the wall runs evenly from node to node, so inside it is the straight line between the ends plus
 * Σ b_k sin(kπz/l) I0(kπr/l)/I0(kπa/l); the energy gives ε0 π a²/l between the ends and, for inner nodes i and j,
 * ε0 π a Σ kπ b_k,i b_k,j I1/I0(kπa/l). Solution of Laplace's equation in a cylinder (any field theory text; derived here).
 */
export function insideColumn(n: number, radius: number, length: number): Float64Array {
  const nodes = n + 1;
  const modes = modeEnergies(n, radius, length);
  const C = new Float64Array(nodes * nodes);
  for (let i = 1; i < n; i++) {
    for (let j = 1; j <= i; j++) {
      let sum = 0;
      for (let p = 1; p < n; p++) sum += modes[p]! * Math.sin((p * Math.PI * i) / n) * Math.sin((p * Math.PI * j) / n);
      C[i * nodes + j] = sum;
      C[j * nodes + i] = sum;
    }
  }
  // An end at 1 V is the straight line to the other end, less what the inner nodes would carry on that line.
  const ends = [
    { at: 0, line: (i: number) => 1 - i / n },
    { at: n, line: (i: number) => i / n },
  ];
  for (const { at, line } of ends) {
    for (let j = 1; j < n; j++) {
      let sum = 0;
      for (let i = 1; i < n; i++) sum -= line(i) * C[i * nodes + j]!;
      C[at * nodes + j] = sum;
      C[j * nodes + at] = sum;
    }
  }
  const straight = (epsilon0 * Math.PI * radius * radius) / length;
  for (const one of ends) {
    for (const other of ends) {
      let sum = one === other ? straight : -straight;
      for (let j = 1; j < n; j++) sum -= other.line(j) * C[one.at * nodes + j]!;
      C[one.at * nodes + other.at] = sum;
    }
  }
  return C;
}

/** Energy of the mode sin(pπi/n) of the inner nodes: all k that the nodes cannot tell from p are in it. */
function modeEnergies(n: number, radius: number, length: number): Float64Array {
  const modes = new Float64Array(n);
  const farthest = 40;
  for (let p = 1; p < n; p++) {
    let sum = 0;
    for (let turn = 0; turn < farthest; turn++) {
      for (const k of [2 * n * turn + p, 2 * n * (turn + 1) - p]) {
        const kPi = k * Math.PI;
        const b = (4 * n * (1 - Math.cos(kPi / n))) / (kPi * kPi);
        sum += kPi * b * b * besselQuotient((kPi * radius) / length);
      }
    }
    modes[p] = epsilon0 * Math.PI * radius * sum;
  }
  return modes;
}

/** I1(x)/I0(x) by its continued fraction 1/(2/x + 1/(4/x + …)), x > 0. */
export function besselQuotient(x: number): number {
  let value = 0;
  for (let k = Math.ceil(20 + x); k >= 1; k--) value = 1 / ((2 * k) / x + value);
  return value;
}

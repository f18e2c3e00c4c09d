import { factor, solve } from "../quantities/linear.ts";
import { coupling, toEarth } from "./couplings.ts";

/** What a ladder and a screen need of Maxwell's matrix; F. Lists of inner nodes start with node 1, of elements with element 1. */
export interface StrayFigures {
  readonly toEarth_F: readonly number[];
  readonly toElectrode_F: readonly number[];
  readonly tapToElectrode_F: number;
  /** From the tap to earth: it stands across the LV arm. */
  readonly tapToEarth_F: number;
  /** Between neighbouring nodes, one an element. */
  readonly adjacent_F: readonly number[];
  readonly ceEff_F: number;
  readonly chEff_F: number;
  readonly m_F: number;
  readonly electrodeSelf_F: number;
  readonly inputLow_F: number;
  readonly inputHigh_F: number;
}

/**
 * C_toEarth,i = Σ_j C_ij; C_toElectrode,i = −C_in; Ce_eff = 6 Σ C_toEarth,i·x_i(1−x_i) and Ch_eff = 3 Σ C_toElectrode,i·(1−x_i)²
 * over inner nodes, x_i = i/n; M = Σ q_i(1−x_i) with q = C·x over all nodes. `C` is (n+1) × (n+1), row by row.
 */
export function strayFigures(C: Float64Array): StrayFigures {
  const nodes = Math.round(Math.sqrt(C.length));
  const n = nodes - 1;
  const at = (i: number, j: number) => C[i * nodes + j]!;
  const x = (i: number) => i / n;
  const all = Array.from({ length: nodes }, (_, i) => i);
  const inner = all.slice(1, n);
  const sum = (list: readonly number[], of: (i: number) => number) => list.reduce((total, i) => total + of(i), 0);
  const earth = (i: number) => toEarth(C, nodes, i);
  const between = (i: number, j: number) => coupling(C, nodes, i, j);
  const charge = (i: number) => sum(all, (j) => at(i, j) * x(j));
  return {
    toEarth_F: inner.map(earth),
    toElectrode_F: inner.map((i) => between(i, n)),
    tapToElectrode_F: between(0, n),
    tapToEarth_F: earth(0),
    adjacent_F: all.slice(1).map((i) => between(i - 1, i)),
    ceEff_F: 6 * sum(inner, (i) => earth(i) * x(i) * (1 - x(i))),
    chEff_F: 3 * sum(inner, (i) => between(i, n) * (1 - x(i)) ** 2),
    m_F: sum(all, (i) => charge(i) * (1 - x(i))),
    electrodeSelf_F: at(n, n),
    inputLow_F: sum(all, (i) => charge(i) * x(i)),
    inputHigh_F: floating(C, nodes),
  };
}

/** C_nn after the floating inner nodes are eliminated, the tap at earth. */
function floating(C: Float64Array, nodes: number): number {
  const n = nodes - 1;
  const inner = n - 1;
  if (inner === 0) return C[n * nodes + n]!;
  const matrix = Float64Array.from({ length: inner * inner }, (_, k) => {
    const [i, j] = [Math.floor(k / inner) + 1, (k % inner) + 1];
    return C[i * nodes + j]!;
  });
  const toTop = Float64Array.from({ length: inner }, (_, i) => C[(i + 1) * nodes + n]!);
  const potential = solve(matrix, factor(matrix, inner), toTop.slice());
  return C[n * nodes + n]! - toTop.reduce((total, each, i) => total + each * potential[i]!, 0);
}

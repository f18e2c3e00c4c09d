import { factor, solve } from "../quantities/linear.ts";
import { epsilon0 } from "../standards/constants.ts";
import { assemble } from "./assemble.ts";
import type { Mesh } from "./panel.ts";

/** What the boundary solve gives. */
export interface Solved {
  /** Maxwell's capacitance matrix of nodes 0 … n, row by row, F; everything earthed as reference. */
  readonly C: Float64Array;
  /** Field at each point of the mesh per volt on each node, V/m per V: n + 1 lists. On an open sheet both faces together. */
  readonly field: readonly Float64Array[];
}

/**
 * Charge for each node at 1 V, all others earthed: Σ charge × potential = given potential, by LU. The matrix is made symmetric,
 * which reciprocity asks for and discretisation keeps only to its own accuracy.
 */
export function maxwell(mesh: Mesh, nodes: number, floor = true, planeWall: number | null = null): Solved {
  const { count, panels, share, weight, stretch } = mesh;
  const matrix = assemble(mesh, floor, planeWall);
  const pivots = factor(matrix, count);
  const raw = new Float64Array(nodes * nodes);
  const field: Float64Array[] = [];
  const toCharge = 2 * Math.PI * Math.PI * epsilon0;
  for (let k = 0; k < nodes; k++) {
    const given = new Float64Array(count);
    for (const panel of panels) {
      const end = panel.first + panel.rule.points.length;
      for (let i = panel.first; i < end; i++) {
        if (panel.low === k) given[i] = given[i]! + 1 - share[i]!;
        if (panel.high === k) given[i] = given[i]! + share[i]!;
      }
    }
    const charge = solve(matrix, pivots, given);
    for (const panel of panels) {
      if (panel.low < 0) continue;
      const end = panel.first + panel.rule.points.length;
      let low = 0;
      let high = 0;
      for (let i = panel.first; i < end; i++) {
        const q = toCharge * weight[i]! * charge[i]!;
        low += q * (1 - share[i]!);
        high += q * share[i]!;
      }
      raw[panel.low * nodes + k] = raw[panel.low * nodes + k]! + low;
      raw[panel.high * nodes + k] = raw[panel.high * nodes + k]! + high;
    }
    field.push(charge.map((each, i) => (Math.PI * each) / stretch[i]!));
  }
  const C = raw.map((value, at) => (value + raw[(at % nodes) * nodes + Math.floor(at / nodes)]!) / 2);
  return { C, field };
}

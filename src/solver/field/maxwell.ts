import { factor, solveMany } from "../quantities/linear.ts";
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
  const charge = givenPotentials(mesh, nodes);
  solveMany(matrix, factor(matrix, count), charge, nodes);
  const raw = new Float64Array(nodes * nodes);
  const toCharge = 2 * Math.PI * Math.PI * epsilon0;
  const field = Array.from({ length: nodes }, () => new Float64Array(count));
  for (const { low, high, first, rule } of panels) {
    for (let i = first; i < first + rule.points.length; i++) {
      for (let k = 0; k < nodes; k++) {
        const density = charge[i * nodes + k]!;
        field[k]![i] = (Math.PI * density) / stretch[i]!;
        if (low < 0) continue;
        const q = toCharge * weight[i]! * density;
        raw[low * nodes + k] = raw[low * nodes + k]! + q * (1 - share[i]!);
        raw[high * nodes + k] = raw[high * nodes + k]! + q * share[i]!;
      }
    }
  }
  const C = raw.map((value, at) => (value + raw[(at % nodes) * nodes + Math.floor(at / nodes)]!) / 2);
  return { C, field };
}

/** Potential of each point with each node at 1 V and all others earthed: count × nodes, row by row. */
function givenPotentials({ count, panels, share }: Mesh, nodes: number): Float64Array {
  const given = new Float64Array(count * nodes);
  for (const { low, high, first, rule } of panels) {
    if (low < 0) continue;
    for (let i = first; i < first + rule.points.length; i++) {
      given[i * nodes + low] = given[i * nodes + low]! + 1 - share[i]!;
      given[i * nodes + high] = given[i * nodes + high]! + share[i]!;
    }
  }
  return given;
}

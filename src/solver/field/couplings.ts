/** Share of the node's own capacitance below which a solve cannot tell a coupling from none. */
const noise = 1e-6;

/**
 * Coupling between two nodes, F: −C_ij of Maxwell's matrix ((n+1) × (n+1), row by row). One that comes out of the wrong sign by
 * less than the solve can tell is none: a node deep in a shield has no coupling to the electrode.
 */
export function coupling(C: Float64Array, nodes: number, i: number, j: number): number {
  const value = -C[i * nodes + j]!;
  const scale = Math.sqrt(C[i * nodes + i]! * C[j * nodes + j]!);
  return value < 0 && value > -noise * scale ? 0 : value;
}

/** Coupling of a node to earth, F: the sum of its row; none as above. */
export function toEarth(C: Float64Array, nodes: number, i: number): number {
  let sum = 0;
  for (let j = 0; j < nodes; j++) sum += C[i * nodes + j]!;
  return sum < 0 && sum > -noise * C[i * nodes + i]! ? 0 : sum;
}

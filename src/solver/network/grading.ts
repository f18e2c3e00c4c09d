import { dcSolution } from "./dcSolution.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";

/**
 * Element capacitances that make the capacitive sharing equal to the resistive at every node, tap offset included:
 * C_i (V_i − V_(i−1)) = C_1 (V_1 − V_0) + Σ_(j<i) Cg_j V_j − Σ_(j<i) Ch_j (V_n − V_j), V the dc node voltages.
 * @param first_F the capacitance of element 1, F. null where negative, and where no dc current flows or passes.
 */
export function grading(network: LadderNetwork, first_F: number): (number | null)[] {
  const dc = dcSolution(network, 1);
  if (dc === null) return Array.from(network.resistance_ohm, () => null);
  const { elementVoltage_V: V } = dc;
  let node = dc.tapVoltage_V;
  // The voltage above a node is summed from the top, so that it does not cancel near the electrode.
  const above = new Float64Array(network.n + 1);
  for (let i = network.n - 1; i >= 0; i--) above[i] = above[i + 1]! + V[i]!;
  let charge = first_F * V[0]!;
  return Array.from(network.resistance_ohm, (_, i) => {
    if (i > 0) {
      node += V[i - 1]!;
      charge += network.toEarth_F[i - 1]! * node - network.toElectrode_F[i - 1]! * above[i]!;
    }
    const C = charge / V[i]!;
    return C >= 0 && C < Number.POSITIVE_INFINITY ? C : null;
  });
}

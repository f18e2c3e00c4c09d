import type { Complex } from "../quantities/complex.ts";
import { scaleFactorOf } from "./dcSolution.ts";
import type { LadderNetwork, Reference } from "./ladderNetwork.ts";
import { LumpedResponse } from "./lumpedResponse.ts";
import { LineResponse } from "./travellingWaves.ts";

/** Times beyond which nothing is computed, s. */
export const greatestTime_s = 1e7;

/**
 * The response of a network in time, exact in the circuit at any time: scale factor × output for a unit input at the reference, so
 * that a perfect divider returns its input. g is the step response; it is 1 in the end.
 */
export interface TimeResponse {
  /** g at t = 0+. */
  readonly initial: number;
  /** g(t), t in s, from 0 up; 0 before. */
  at(t: number): number;
  /** ∫₀ᵗ (1 − g) dτ, s. */
  deficit(t: number): number;
  /** Mean of g over a … b, 0 ≤ a < b, without the loss of a difference of integrals. */
  mean(a: number, b: number): number;
  /** Response to exp(−αt) from t = 0, α from 0 up. */
  exponential(alpha_per_s: number, t: number): number;
  /** Response to sin(ωt) from t = 0: Im(steady·e^{jωt}) + transient(t). */
  sine(omega_per_s: number): { readonly steady: Complex; transient(t: number): number };
  /** Complex natural frequencies that ring, upper half plane. */
  readonly ringing: readonly Complex[];
  /** Delay of the line between tap and instrument, s; 0: none. */
  readonly delay_s: number;
}

/** null where dc does not pass: there is no scale factor to normalise by. */
export function timeResponse(network: LadderNetwork, reference: Reference = "electrode"): TimeResponse | null {
  const scaleFactor = scaleFactorOf(network, reference);
  if (scaleFactor === null) return null;
  const { line } = network.cable;
  return line === null
    ? new LumpedResponse(network, reference, scaleFactor)
    : new LineResponse(network, line, reference, scaleFactor);
}

/** g at a list of times; null where dc does not pass. */
export function stepResponse(
  network: LadderNetwork,
  times_s: ArrayLike<number>,
  reference: Reference = "electrode",
): Float64Array | null {
  const g = timeResponse(network, reference);
  return g === null ? null : Float64Array.from(times_s, (t) => g.at(t));
}

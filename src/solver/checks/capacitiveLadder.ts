import type { Solution } from "../standards/formula.ts";
import { computedHere } from "../standards/source.ts";

/**
 * The string as capacitors alone (what a fast edge sees), inner nodes eliminated: a two-port between electrode and tap.
 * All in farad; `residual` is the greatest charge left on an inner node over the charge that passed through it.
 */
export interface CapacitiveTwoPort {
  /** Charge on the earthed tap per volt at the electrode. */
  readonly transfer_F: number;
  /** Charge on the tap per volt there, electrode earthed; the LV arm not counted. */
  readonly tap_F: number;
  /** Charge on the electrode per volt there, tap earthed. */
  readonly electrode_F: number;
  readonly residual: number;
}

export const capacitiveLadderRecord: Solution = {
  id: "checks.capacitiveLadder",
  title: "Capacitances of the string with its strays",
  statement: "C_i (v_i − v_(i−1)) + C_(i+1) (v_i − v_(i+1)) + C_e,i v_i + C_h,i (v_i − V) = 0 at every inner node",
  method: "Tridiagonal elimination from the tap to the electrode; the charges at tap and electrode per volt follow.",
  holds: "The instant of an ideal edge: resistors carry no charge yet.",
  source: computedHere("capacitive ladder, charge balance at each node"),
  residualBound: 1e-9,
};

/**
 * @param capacitance_F n element capacitances, tap first, each ≥ 0
 * @param toEarth_F n-1 strays of the inner nodes to earth
 * @param toElectrode_F n-1 strays of the inner nodes to the electrode
 * A node without any capacitance takes the potential of neither side; it passes no charge.
 */
export function capacitiveLadder(
  capacitance_F: readonly number[],
  toEarth_F: readonly number[],
  toElectrode_F: readonly number[],
  electrodeToTap_F = 0,
): CapacitiveTwoPort {
  const n = capacitance_F.length;
  const inner = n - 1;
  const c = (i: number) => capacitance_F[i] ?? 0;
  const earth = (i: number) => toEarth_F[i] ?? 0;
  const hv = (i: number) => toElectrode_F[i] ?? 0;
  // Two right-hand sides at once: electrode at 1 V with the tap earthed, and tap at 1 V with the electrode earthed.
  const super_ = new Float64Array(inner);
  const a = new Float64Array(inner);
  const b = new Float64Array(inner);
  for (let i = 0; i < inner; i++) {
    const diagonal = c(i) + c(i + 1) + earth(i) + hv(i);
    const previous = i === 0 ? 0 : super_[i - 1]!;
    const pivot = diagonal - c(i) * previous;
    const left = i === 0 ? 0 : a[i - 1]!;
    const leftB = i === 0 ? 1 : b[i - 1]!;
    if (!(pivot > 0)) continue;
    super_[i] = c(i + 1) / pivot;
    a[i] = (hv(i) + (i === inner - 1 ? c(n - 1) : 0) + c(i) * left) / pivot;
    b[i] = (c(i) * leftB) / pivot;
  }
  for (let i = inner - 2; i >= 0; i--) {
    a[i] = a[i]! + super_[i]! * a[i + 1]!;
    b[i] = b[i]! + super_[i]! * b[i + 1]!;
  }
  let residual = 0;
  for (let i = 0; i < inner; i++) {
    const below = i === 0 ? 0 : a[i - 1]!;
    const above = i === inner - 1 ? 1 : a[i + 1]!;
    const balance = c(i) * (a[i]! - below) + c(i + 1) * (a[i]! - above) + earth(i) * a[i]! + hv(i) * (a[i]! - 1);
    const scale = c(i) + c(i + 1) + earth(i) + hv(i);
    if (scale > 0) residual = Math.max(residual, Math.abs(balance) / scale);
  }
  const first = inner > 0 ? a[0]! : 1;
  const last = inner > 0 ? a[inner - 1]! : 0;
  let electrode = c(n - 1) * (1 - last) + electrodeToTap_F;
  for (let i = 0; i < inner; i++) electrode += hv(i) * (1 - a[i]!);
  return {
    transfer_F: c(0) * first + electrodeToTap_F,
    tap_F: c(0) * (1 - (inner > 0 ? b[0]! : 0)) + electrodeToTap_F,
    electrode_F: electrode,
    residual,
  };
}

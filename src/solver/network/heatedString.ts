import type { LadderNetwork } from "./ladderNetwork.ts";
import { lvSide } from "./lvSide.ts";
import type { HeatAsk } from "./networkForm.ts";

/**
 * A resistor that warms by its own current I: R = A/(1 − B I² − K I), A = R0 (1 + α ΔT_ambient), B = R0 α Rth, K = R0 k_v. Its voltage
 * rises with the current, dV/dI = A (1 + B I²)/(1 − B I² − K I)², except beyond I² = −1/B where it loses resistance faster than it
 * gains current.
 */
export interface HeatedString {
  /** A of each element; Infinity: absent. */
  readonly cold_ohm: Float64Array;
  readonly B: Float64Array;
  readonly K: Float64Array;
  readonly lvCold_ohm: number;
  readonly lvB: number;
  readonly lvK: number;
  /** From the tap to earth beside the LV resistor. */
  readonly beside_S: number;
  /** Source resistance and damping. */
  readonly ahead_ohm: number;
}

export interface HeatedState {
  readonly resistance_ohm: Float64Array;
  readonly lvResistance_ohm: number;
}

const atDc = new Float64Array(1);

/** null: the surroundings alone leave some resistance without a positive value. */
export function heatedString(network: LadderNetwork, ask: HeatAsk): HeatedString | null {
  const R = network.resistance_ohm;
  const R2 = network.lv.resistance_ohm;
  const finite = (value: number) => (Number.isFinite(value) ? value : 0);
  const cold = R.map((each, i) => each * (1 + ask.temperatureCoefficient_per_K[i]! * ask.ambientRise_K));
  const lvCold = R2 * (1 + ask.lvTemperatureCoefficient_per_K * ask.ambientRise_K);
  if (!(lvCold > 0) || !cold.every((A) => A > 0)) return null;
  const withoutLv = { ...network, lv: { ...network.lv, resistance_ohm: Number.POSITIVE_INFINITY } };
  return {
    cold_ohm: cold,
    B: R.map((each, i) => finite(each) * ask.temperatureCoefficient_per_K[i]! * ask.thermalResistance_K_per_W[i]!),
    K: R.map((each, i) => finite(each) * ask.voltageCoefficient_per_V[i]!),
    lvCold_ohm: lvCold,
    lvB: finite(R2) * ask.lvTemperatureCoefficient_per_K * ask.lvThermalResistance_K_per_W,
    lvK: finite(R2) * ask.lvVoltageCoefficient_per_V,
    beside_S: lvSide(withoutLv, atDc, atDc).Lre[0]!,
    ahead_ohm: network.source.resistance_ohm + network.source.damping_ohm,
  };
}

/** The source voltage that a point of the branch needs, and its slope along the branch; beyond a resistor's pole: Infinity. */
interface Point {
  readonly I: number;
  readonly source_V: number;
  readonly slope: number;
}

/**
 * Everything follows from one number p, the current of the LV resistor or, without one, the tap's voltage: tap voltage v(p), string
 * current I = i(p) + v·beside, source voltage U = v + Σ V_i(I) + I·ahead. So the states from cold up are the curve U(p).
 */
function pointAt(s: HeatedString, p: number): Point {
  let v = p;
  let dv = 1;
  let I = 0;
  let dI = 0;
  if (Number.isFinite(s.lvCold_ohm)) {
    const D = 1 - (s.lvB * p + s.lvK) * p;
    if (!(D > 0)) return beyond;
    v = (p * s.lvCold_ohm) / D;
    dv = (s.lvCold_ohm * (1 + s.lvB * p * p)) / (D * D);
    I = p;
    dI = 1;
  }
  I += v * s.beside_S;
  dI += dv * s.beside_S;
  let across = 0;
  let perCurrent = s.ahead_ohm;
  for (let i = 0; i < s.cold_ohm.length; i++) {
    const A = s.cold_ohm[i]!;
    const B = s.B[i]!;
    const D = 1 - (B * I + s.K[i]!) * I;
    if (!(D > 0)) return beyond;
    across += (I * A) / D;
    perCurrent += (A * (1 + B * I * I)) / (D * D);
  }
  return { I, source_V: v + across + I * s.ahead_ohm, slope: dv + dI * perCurrent };
}

const beyond: Point = {
  I: Number.POSITIVE_INFINITY,
  source_V: Number.POSITIVE_INFINITY,
  slope: Number.POSITIVE_INFINITY,
};

/** Step of p on the way up where a resistor may lose resistance faster than it gains current. */
const fine = 1.01;

/** The state at the source voltage on the branch from cold; null where U(p) turns down before it gets there. */
export function reachedFromCold(s: HeatedString, voltage: number): HeatedState | null {
  if (voltage === 0) return stateAt(s, 0);
  // Up to here every resistor gains voltage with current.
  const harmless_A = 1 / Math.sqrt(Math.max(0, -s.lvB, ...s.B.map((B) => -B)));
  let low = voltage;
  const harmless = (p: number) => {
    const { I, source_V } = pointAt(s, p);
    return source_V <= voltage && I <= harmless_A && (p <= harmless_A || !(s.lvB < 0));
  };
  while (!harmless(low)) low /= 2;
  let high = low;
  for (;;) {
    high *= harmless_A === Number.POSITIVE_INFINITY ? 2 : fine;
    const turns = !(pointAt(s, high).slope > 0);
    if (turns) high = turn(s, low, high);
    if (pointAt(s, high).source_V >= voltage) return stateAt(s, crossing(s, voltage, low, high));
    if (turns) return null;
    low = high;
  }
}

/** Where U(p) turns down between a rising and a falling point. */
function turn(s: HeatedString, rising: number, falling: number): number {
  let low = rising;
  let high = falling;
  for (let step = 0; step < 60; step++) {
    const middle = low + (high - low) / 2;
    if (pointAt(s, middle).slope > 0) low = middle;
    else high = middle;
  }
  return low;
}

/** U(p) = voltage between low and high: Newton, halved where it would leave the bracket, to the last digit. */
function crossing(s: HeatedString, voltage: number, from: number, to: number): number {
  let low = from;
  let high = to;
  let p = (low + high) / 2;
  for (let step = 0; step < 200 && low < high; step++) {
    const { source_V, slope } = pointAt(s, p);
    if (source_V < voltage) low = p;
    else high = p;
    const next = p - (source_V - voltage) / slope;
    const kept = next > low && next < high ? next : low + (high - low) / 2;
    if (Math.abs(kept - p) <= 2 ** -52 * p) return kept;
    p = kept;
  }
  return p;
}

function stateAt(s: HeatedString, p: number): HeatedState {
  const { I } = pointAt(s, p);
  const resistance = (A: number, B: number, K: number, current: number) => A / (1 - (B * current + K) * current);
  return {
    resistance_ohm: s.cold_ohm.map((A, i) => resistance(A, s.B[i]!, s.K[i]!, I)),
    lvResistance_ohm: resistance(s.lvCold_ohm, s.lvB, s.lvK, p),
  };
}

import { type Complex, complex, divide, modulus, multiply, subtract } from "../quantities/complex.ts";
import type { LadderNetwork, Reference } from "./ladderNetwork.ts";
import { lvSide } from "./lvSide.ts";
import { tapTwoPort } from "./tapTwoPort.ts";
import { sourceImpedance } from "./transfer.ts";

/**
 * Complex natural frequencies of a network, upper half plane. An R-C network has none; each inductance adds at most one pair
 * (the network equations are self-adjoint in an indefinite product with as many negative squares as inductances). Pairs closer than
 * 0.12 rad to the negative real axis are left out: the contour encloses them.
 */
export function ringingPoles(network: LadderNetwork, reference: Reference): Complex[] {
  const inductances =
    Number(network.lv.inductance_H > 0 && network.lv.capacitance_F > 0) + aheadRings(network, reference);
  if (inductances === 0) return [];
  return zerosAbove((sre, sim) => determinant(network, reference, sre, sim), 1e16);
}

/** Zeros of a function without poles in the upper half plane, up to a modulus, clear of the negative real axis. */
export function zerosAbove(characteristic: Characteristic, greatest_per_s: number): Complex[] {
  const zeros: Complex[] = [];
  for (const cell of windingCells(characteristic, greatest_per_s)) {
    const found = refine(characteristic, cell);
    if (found !== null && !zeros.some((each) => modulus(subtract(each, found)) < 1e-6 * modulus(found)))
      zeros.push(found);
  }
  return zeros;
}

const aheadRings = (network: LadderNetwork, reference: Reference): number =>
  Number(reference === "source" && network.source.inductance_H > 0);

export interface Values {
  readonly re: Float64Array;
  readonly im: Float64Array;
}
export type Characteristic = (sre: Float64Array, sim: Float64Array) => Values;

/**
 * Δ(s) = (1 + s² L2 C2) S (1 + Z (Y + s Cs)) with S the whole admittance at the tap and S·Y = P S + H (S − H): zero at the natural
 * frequencies, without a pole off the real axis. The last factor only where the source is counted.
 */
export function determinant(
  network: LadderNetwork,
  reference: Reference,
  sre: Float64Array,
  sim: Float64Array,
): Values {
  const port = tapTwoPort(network, sre, sim);
  const side = lvSide(network, sre, sim);
  const { lv, source } = network;
  const re = new Float64Array(sre.length);
  const im = new Float64Array(sre.length);
  for (let k = 0; k < sre.length; k++) {
    const s = complex(sre[k]!, sim[k]!);
    const H = complex(port.Hre[k]!, port.Him[k]!);
    const below = complex(side.Lre[k]! + port.Ere[k]!, side.Lim[k]! + port.Eim[k]!);
    const S = complex(below.re + H.re, below.im + H.im);
    let value = S;
    if (reference === "source") {
      const Z = sourceImpedance(network, s.re, s.im);
      const shunt = complex(port.Pre[k]! + s.re * source.capacitance_F, port.Pim[k]! + s.im * source.capacitance_F);
      const a = multiply(shunt, S);
      const b = multiply(H, below);
      const c = multiply(Z, complex(a.re + b.re, a.im + b.im));
      value = complex(S.re + c.re, S.im + c.im);
    }
    const LC = lv.inductance_H * lv.capacitance_F;
    if (LC > 0) value = multiply(value, complex(1 + LC * (s.re * s.re - s.im * s.im), LC * 2 * s.re * s.im));
    re[k] = value.re;
    im[k] = value.im;
  }
  return { re, im };
}

/** A cell of the plane in polar coordinates: ln|s| and arg s. */
interface Cell {
  readonly low: number;
  readonly high: number;
  readonly from: number;
  readonly to: number;
}

const degree = Math.PI / 180;
const angles = [85, 95, 105, 115, 125, 135, 145, 155, 165, 173].map((each) => each * degree);
const perDecade = 12;
const leastModulus = 1e-6;

/** Cells around which the characteristic turns once: each holds one zero. */
function windingCells(characteristic: Characteristic, greatest: number): Cell[] {
  const rings = Math.max(1, Math.ceil(Math.log10(greatest / leastModulus) * perDecade));
  const radius = (i: number) => Math.log(leastModulus) + (i * Math.LN10) / perDecade;
  const columns = angles.length;
  const sre = new Float64Array((rings + 1) * columns);
  const sim = new Float64Array((rings + 1) * columns);
  for (let i = 0; i <= rings; i++) {
    for (let j = 0; j < columns; j++) {
      sre[i * columns + j] = Math.exp(radius(i)) * Math.cos(angles[j]!);
      sim[i * columns + j] = Math.exp(radius(i)) * Math.sin(angles[j]!);
    }
  }
  const { re, im } = characteristic(sre, sim);
  const turn = (a: number, b: number) =>
    Math.atan2(im[b]! * re[a]! - re[b]! * im[a]!, re[b]! * re[a]! + im[b]! * im[a]!);
  const cells: Cell[] = [];
  for (let i = 0; i < rings; i++) {
    for (let j = 0; j + 1 < columns; j++) {
      const a = i * columns + j;
      const b = a + columns;
      const around = turn(a, b) + turn(b, b + 1) + turn(b + 1, a + 1) + turn(a + 1, a);
      if (Math.abs(around) > Math.PI) {
        cells.push({ low: radius(i), high: radius(i + 1), from: angles[j]!, to: angles[j + 1]! });
      }
    }
  }
  return cells;
}

/** Halves the cell by its turning, then the secant method from its middle, to the last digits. */
function refine(characteristic: Characteristic, start: Cell): Complex | null {
  let cell = start;
  for (let step = 0; step < 6; step++) {
    const next = quarters(cell).find((each) => turns(characteristic, each));
    if (next === undefined) break;
    cell = next;
  }
  const at = (s: Complex): Complex => {
    const { re, im } = characteristic(Float64Array.of(s.re), Float64Array.of(s.im));
    return complex(re[0]!, im[0]!);
  };
  const polar = (logarithm: number, angle: number) =>
    complex(Math.exp(logarithm) * Math.cos(angle), Math.exp(logarithm) * Math.sin(angle));
  const zero = secant(at, polar(cell.low, cell.from), polar((cell.low + cell.high) / 2, (cell.from + cell.to) / 2));
  const inside = zero.im > 0.1 * modulus(zero) && Math.abs(Math.log(modulus(zero)) - cell.low) < 0.5;
  return inside ? zero : null;
}

/** Zero of an analytic function by the secant method from two points, to rounding. */
export function secant(f: (s: Complex) => Complex, first: Complex, second: Complex): Complex {
  let a = first;
  let b = second;
  let fa = f(a);
  let fb = f(b);
  for (let step = 0; step < 40; step++) {
    const difference = subtract(fb, fa);
    if (difference.re === 0 && difference.im === 0) break;
    const change = divide(multiply(fb, subtract(b, a)), difference);
    a = b;
    fa = fb;
    b = subtract(b, change);
    fb = f(b);
    if (modulus(change) < 1e-15 * modulus(b)) break;
  }
  return b;
}

function quarters({ low, high, from, to }: Cell): Cell[] {
  const middle = (low + high) / 2;
  const angle = (from + to) / 2;
  return [
    { low, high: middle, from, to: angle },
    { low, high: middle, from: angle, to },
    { low: middle, high, from, to: angle },
    { low: middle, high, from: angle, to },
  ];
}

function turns(characteristic: Characteristic, { low, high, from, to }: Cell): boolean {
  const corners = [
    [low, from],
    [high, from],
    [high, to],
    [low, to],
  ] as const;
  const { re, im } = characteristic(
    Float64Array.from(corners, ([l, a]) => Math.exp(l) * Math.cos(a)),
    Float64Array.from(corners, ([l, a]) => Math.exp(l) * Math.sin(a)),
  );
  let around = 0;
  for (let k = 0; k < 4; k++) {
    const next = (k + 1) % 4;
    around += Math.atan2(im[next]! * re[k]! - re[next]! * im[k]!, re[next]! * re[k]! + im[next]! * im[k]!);
  }
  return Math.abs(around) > Math.PI;
}

/**
 * Residue of a transform at a simple pole by the midpoint rule on a circle around it, exact to rounding while no other singularity
 * lies within thirty radii.
 * @param apart_per_s distance to other poles where it is known to be less than the pole's own size
 */
export function residue(
  evaluate: (sre: Float64Array, sim: Float64Array) => Values,
  pole: Complex,
  apart_per_s = Number.POSITIVE_INFINITY,
): Complex {
  const count = 16;
  const radius = 0.02 * Math.min(modulus(pole), Math.abs(pole.im) * 2, apart_per_s);
  const angle = (k: number) => ((k + 0.5) * 2 * Math.PI) / count;
  const { re, im } = evaluate(
    Float64Array.from({ length: count }, (_, k) => pole.re + radius * Math.cos(angle(k))),
    Float64Array.from({ length: count }, (_, k) => pole.im + radius * Math.sin(angle(k))),
  );
  let sumRe = 0;
  let sumIm = 0;
  for (let k = 0; k < count; k++) {
    const c = Math.cos(angle(k));
    const d = Math.sin(angle(k));
    sumRe += re[k]! * c - im[k]! * d;
    sumIm += re[k]! * d + im[k]! * c;
  }
  return complex((sumRe * radius) / count, (sumIm * radius) / count);
}

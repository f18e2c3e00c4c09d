import { type Complex, complex, divide, modulus, subtract } from "../quantities/complex.ts";
import type { LadderNetwork, Line, Reference } from "./ladderNetwork.ts";
import { lineWaves, matched } from "./lineWaves.ts";
import { determinant, ringingPoles, secant, zerosAbove } from "./ringing.ts";

/** Modes weaker than this share of the step at the time asked for end the search; so does their number. */
const negligible = 1e-10;
const mostModes = 2000;

/** A network with its line, its reference input and what its output is scaled by. */
interface Lined {
  readonly network: LadderNetwork;
  readonly line: Line;
  readonly reference: Reference;
  readonly scaleFactor: number;
}

/** The modes, and from when on they tell the response: until then the waves must. */
export interface LineModes {
  readonly poles: Complex[];
  readonly from_s: number;
}

/**
 * Natural frequencies of a network with a lossless line, upper half plane: zeros of 1 − round·exp(−2 s T). Those slower than the line
 * come from the winding of that function, and one each from what rings without the line; the others, one for each turn of its phase
 * along the imaginary axis, by the secant method, until they have died away after `delays` of the line. A line that is left reflecting
 * its edges forever has modes without end: then its waves are followed until the modes left out have died.
 */
export function lineModes(
  network: LadderNetwork,
  line: Line,
  reference: Reference,
  scaleFactor: number,
  delays: number,
): LineModes {
  const lined = { network, line, reference, scaleFactor };
  const limit = 0.5 / line.delay_s;
  const from_s = delays * line.delay_s;
  const modes = slowModes(lined, limit).filter((each) => each.re * from_s > -60);
  const slow = modes.length;
  let quiet = 0;
  let sharp = 0;
  for (const starts of phaseTurns(lined)) {
    const { re, im } = settle(lined, starts);
    const left = strength(lined, re, im);
    for (let k = 0; k < re.length; k++) {
      const pole = complex(re[k]!, im[k]!);
      const moved = Math.hypot(re[k]! - starts.re[k]!, im[k]! - starts.im[k]!) * line.delay_s;
      if (
        !(moved < 3 && pole.re <= 0 && pole.re * from_s > -60) ||
        pole.im < limit / 2 ||
        !isNew(modes.slice(0, slow), pole) ||
        !isNew(modes.slice(-8), pole)
      )
        continue;
      modes.push(pole);
      const strong = left[k]! * Math.exp(pole.re * from_s);
      quiet = strong < negligible ? quiet + 1 : 0;
      sharp = strong * modes.length > 2e-3 ? Math.min(25 / -pole.re, longest * line.delay_s) : 0;
      if (quiet > 8) return { poles: modes, from_s };
      if (modes.length > mostModes) return { poles: modes, from_s: Math.max(sharp, from_s) };
    }
  }
  return { poles: modes, from_s };
}

/** Delays of the line for which its waves are followed at most. */
const longest = 400;

/** Modes below the line's own, and what rings without it wherever it lies. */
function slowModes(lined: Lined, limit: number): Complex[] {
  const loaded = matched(lined.network, lined.line);
  // 1 − round·E has the poles of the loaded network: its determinant takes them away.
  const characteristic = (sre: Float64Array, sim: Float64Array) => {
    const { re, im } = openLoop(lined, sre, sim);
    const base = determinant(loaded, lined.reference, sre, sim);
    return {
      re: re.map((each, k) => each * base.re[k]! - im[k]! * base.im[k]!),
      im: re.map((each, k) => each * base.im[k]! + im[k]! * base.re[k]!),
    };
  };
  const found = zerosAbove(characteristic, limit).filter((each) => modulus(each) < limit);
  const at = (s: Complex): Complex => {
    const { re, im } = characteristic(Float64Array.of(s.re), Float64Array.of(s.im));
    return complex(re[0]!, im[0]!);
  };
  for (const start of ringingPoles(loaded, lined.reference)) {
    const zero = secant(at, complex(start.re * 1.001, start.im * 1.001), start);
    const near = modulus(subtract(zero, start)) < 0.3 * modulus(start);
    if (near && zero.re <= 0 && isNew(found, zero)) found.push(zero);
  }
  return found;
}

const isNew = (modes: readonly Complex[], pole: Complex): boolean =>
  !modes.some((each) => modulus(subtract(each, pole)) < 1e-6 * modulus(pole));

interface Points {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/** Zeros of 1 − round·E near the starting points, all by the secant method side by side. */
function settle(lined: Lined, starts: Points): Points {
  const nudge = 1e-3 / lined.line.delay_s;
  let ar = starts.re.map((each) => each - nudge);
  let ai = starts.im.slice();
  let fa = openLoop(lined, ar, ai);
  let br = starts.re.slice();
  let bi = starts.im.slice();
  for (let step = 0; step < 8; step++) {
    const fb = openLoop(lined, br, bi);
    const nr = br.slice();
    const ni = bi.slice();
    for (let k = 0; k < br.length; k++) {
      const difference = complex(fb.re[k]! - fa.re[k]!, fb.im[k]! - fa.im[k]!);
      if (difference.re === 0 && difference.im === 0) continue;
      const slope = divide(complex(br[k]! - ar[k]!, bi[k]! - ai[k]!), difference);
      nr[k] = br[k]! - (fb.re[k]! * slope.re - fb.im[k]! * slope.im);
      ni[k] = bi[k]! - (fb.re[k]! * slope.im + fb.im[k]! * slope.re);
    }
    [ar, ai, fa, br, bi] = [br, bi, fb, nr, ni];
  }
  return { re: loss(lined, br, bi), im: bi };
}

/** A mode that hardly dies: exp(2 σ T) = |round| tells its σ to more digits than the difference of two large numbers; never growing. */
function loss(lined: Lined, re: Float64Array, im: Float64Array): Float64Array {
  const { network, line, reference } = lined;
  const w = lineWaves(network, line, reference, re, im);
  return re.map((each, k) => {
    if (Math.abs(each) * line.delay_s > 1e-5) return each;
    return Math.min(-1e-12 / line.delay_s, Math.log(Math.hypot(w.roundRe[k]!, w.roundIm[k]!)) / (2 * line.delay_s));
  });
}

/** About the amplitude of a mode in the step response: |launch|/(2 T |s|) by |round·E| = 1, |exp(−s T)| = |round|^(−1/2). */
function strength({ network, line, reference, scaleFactor }: Lined, re: Float64Array, im: Float64Array): Float64Array {
  const w = lineWaves(network, line, reference, re, im);
  return re.map((each, k) => {
    const launch = Math.hypot(w.launchRe[k]!, w.launchIm[k]!);
    const round = Math.hypot(w.roundRe[k]!, w.roundIm[k]!);
    return (scaleFactor * launch) / (2 * line.delay_s * Math.hypot(each, im[k]!) * Math.sqrt(round));
  });
}

/** 1 − round·exp(−2 s T). */
function openLoop({ network, line, reference }: Lined, sre: Float64Array, sim: Float64Array): Points {
  const { roundRe, roundIm } = lineWaves(network, line, reference, sre, sim);
  const re = new Float64Array(sre.length);
  const im = new Float64Array(sre.length);
  for (let k = 0; k < sre.length; k++) {
    const size = Math.exp(-2 * sre[k]! * line.delay_s);
    const angle = -2 * sim[k]! * line.delay_s;
    const er = size * Math.cos(angle);
    const ei = size * Math.sin(angle);
    re[k] = 1 - (roundRe[k]! * er - roundIm[k]! * ei);
    im[k] = -(roundRe[k]! * ei + roundIm[k]! * er);
  }
  return { re, im };
}

/** Points jω at which the phase of round·exp(−2jωT) passes a whole turn, moved left by what a round trip loses; block by block. */
function* phaseTurns({ network, line, reference }: Lined): Generator<Points> {
  const T = line.delay_s;
  const step = 0.25 / T;
  const block = 512;
  let held: { phase: number; omega: number } | null = null;
  for (let from = 0.3 / T; from < (mostModes * Math.PI) / T; from += step * block) {
    const sim = Float64Array.from({ length: block }, (_, i) => from + i * step);
    const { roundRe, roundIm } = lineWaves(network, line, reference, new Float64Array(block), sim);
    const re: number[] = [];
    const im: number[] = [];
    for (let i = 0; i < block; i++) {
      const omega = sim[i]!;
      const raw = Math.atan2(roundIm[i]!, roundRe[i]!) - 2 * omega * T;
      if (held === null) {
        held = { phase: raw, omega };
        continue;
      }
      const phase: number = raw - 2 * Math.PI * Math.round((raw - held.phase) / (2 * Math.PI));
      const whole = Math.floor(held.phase / (2 * Math.PI)) * 2 * Math.PI;
      if (phase < whole) {
        const slope = (held.phase - phase) / (omega - held.omega);
        re.push(Math.max(Math.log(Math.hypot(roundRe[i]!, roundIm[i]!)), -12) / slope);
        im.push(held.omega + ((held.phase - whole) / (held.phase - phase)) * (omega - held.omega));
      }
      held = { phase, omega };
    }
    if (re.length > 0) yield { re: Float64Array.from(re), im: Float64Array.from(im) };
  }
}

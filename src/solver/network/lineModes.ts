import { type Complex, complex, divide, modulus, subtract } from "../quantities/complex.ts";
import type { LadderNetwork, Line, Reference } from "./ladderNetwork.ts";
import { lineWaves, matched } from "./lineWaves.ts";
import { determinant, secant, zerosAbove } from "./ringing.ts";

/** A mode weaker than this share of the step at the time asked for is left out. */
const negligible = 1e-11;
const mostModes = 6000;

/**
 * Natural frequencies of a network with a lossless line, upper half plane: zeros of 1 − round·exp(−2 s T). Those slower than the line
 * come from the winding of that function; the others, one for each turn of its phase along the imaginary axis, by the secant method,
 * until they have died away at `from_s`.
 */
export function lineModes(
  network: LadderNetwork,
  line: Line,
  reference: Reference,
  scaleFactor: number,
  from_s: number,
): Complex[] {
  const T = line.delay_s;
  const limit = 0.5 / T;
  const loaded = matched(network, line);
  // 1 − round·E has the poles of the loaded network: its determinant takes them away.
  const slow = zerosAbove((sre, sim) => {
    const { re, im } = openLoop(network, line, reference, sre, sim);
    const base = determinant(loaded, reference, sre, sim);
    return {
      re: re.map((each, k) => each * base.re[k]! - im[k]! * base.im[k]!),
      im: re.map((each, k) => each * base.im[k]! + im[k]! * base.re[k]!),
    };
  }, limit);
  const at = (s: Complex): Complex => {
    const { re, im } = openLoop(network, line, reference, Float64Array.of(s.re), Float64Array.of(s.im));
    return complex(re[0]!, im[0]!);
  };
  const modes = slow.filter((each) => modulus(each) < limit);
  let quiet = 0;
  for (const start of phaseTurns(network, line, reference)) {
    const pole = secant(at, start, complex(start.re * 1.01 - 1e-3 / T, start.im));
    const settled = divide(subtract(pole, start), complex(1 / T));
    const known = modes.some((each) => modulus(subtract(each, pole)) < 1e-6 * modulus(pole));
    if (!Number.isFinite(pole.re) || modulus(settled) > 3 || pole.im < limit * 0.5 || known) continue;
    modes.push(pole);
    const left = scaleFactor * strength(network, line, reference, pole) * Math.exp(pole.re * from_s);
    quiet = left < negligible ? quiet + 1 : 0;
    if (quiet > 8 || modes.length > mostModes) break;
  }
  return modes;
}

/** About the amplitude of a mode in the step response: |launch|/(2 T |s|) by |round·E| = 1, |exp(−s T)| = |round|^(−1/2). */
function strength(network: LadderNetwork, line: Line, reference: Reference, s: Complex): number {
  const w = lineWaves(network, line, reference, Float64Array.of(s.re), Float64Array.of(s.im));
  const launch = Math.hypot(w.launchRe[0]!, w.launchIm[0]!);
  const round = Math.hypot(w.roundRe[0]!, w.roundIm[0]!);
  return launch / (2 * line.delay_s * modulus(s) * Math.sqrt(round));
}

/** 1 − round·exp(−2 s T). */
function openLoop(network: LadderNetwork, line: Line, reference: Reference, sre: Float64Array, sim: Float64Array) {
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

/** Points jω at which the phase of round·exp(−2jωT) passes a whole turn, moved left by what a round trip loses. */
function* phaseTurns(network: LadderNetwork, line: Line, reference: Reference): Generator<Complex> {
  const T = line.delay_s;
  const step = 0.1 / T;
  const block = 256;
  let held: { phase: number; omega: number } | null = null;
  for (let from = 0.3 / T; from < (mostModes * Math.PI) / T; from += step * block) {
    const sim = Float64Array.from({ length: block }, (_, i) => from + i * step);
    const { roundRe, roundIm } = lineWaves(network, line, reference, new Float64Array(block), sim);
    for (let i = 0; i < block; i++) {
      const omega = sim[i]!;
      const raw = Math.atan2(roundIm[i]!, roundRe[i]!) - 2 * omega * T;
      const size = Math.log(Math.hypot(roundRe[i]!, roundIm[i]!));
      if (held === null) {
        held = { phase: raw, omega };
        continue;
      }
      const phase: number = raw - 2 * Math.PI * Math.round((raw - held.phase) / (2 * Math.PI));
      const turns = Math.floor(held.phase / (2 * Math.PI)) - Math.floor(phase / (2 * Math.PI));
      if (turns > 0) {
        const whole = Math.floor(held.phase / (2 * Math.PI)) * 2 * Math.PI;
        const share = (held.phase - whole) / (held.phase - phase);
        const slope = (held.phase - phase) / (omega - held.omega);
        yield complex(Math.max(size, -12) / slope, held.omega + share * (omega - held.omega));
      }
      held = { phase, omega };
    }
  }
}

import { type Complex, modulus } from "../quantities/complex.ts";
import { type Contour, type OnContour, weighted, wideContour } from "./contour.ts";
import { over } from "./decade.ts";
import { gaussMean } from "./gaussMean.ts";
import type { LadderNetwork, Line, Reference } from "./ladderNetwork.ts";
import { lineModes } from "./lineModes.ts";
import { lineWaves, matched } from "./lineWaves.ts";
import { LumpedResponse } from "./lumpedResponse.ts";
import { ringingPoles } from "./ringing.ts";
import type { TimeResponse } from "./timeResponse.ts";

/** Delays after which the line is told by its modes where they die away; until then by its waves. */
const wavesFor = 24;

/**
 * Network with a lossless line: early on the waves are summed, each inverted at its own shifted time; later on the line's modes are
 * poles like any other and are taken out with their residues.
 */
export class LineResponse implements TimeResponse {
  readonly initial = 0;
  readonly delay_s: number;
  readonly ringing: readonly Complex[];
  private readonly waves: Waves;
  private readonly later: LumpedResponse;
  private readonly handover_s: number;

  constructor(network: LadderNetwork, line: Line, reference: Reference, scaleFactor: number) {
    this.delay_s = line.delay_s;
    this.waves = new Waves(network, line, reference, scaleFactor);
    const modes = lineModes(network, line, reference, scaleFactor, wavesFor);
    this.ringing = modes.poles;
    this.handover_s = modes.from_s;
    this.later = new LumpedResponse(network, reference, scaleFactor, this.ringing, this.handover_s);
  }

  at(t: number): number {
    return t < this.handover_s ? this.waves.sum(t, 1) : this.later.at(t);
  }

  deficit(t: number): number {
    return t < this.handover_s ? Math.max(t, 0) - this.waves.sum(t, 2) : this.later.deficit(t);
  }

  mean(a: number, b: number): number {
    if (a >= this.handover_s) return this.later.mean(a, b);
    if (b > this.handover_s) {
      const middle = this.handover_s;
      const late = this.later.mean(middle, b) * (b - middle);
      return a === middle ? late / (b - a) : (this.waves.mean(a, middle) * (middle - a) + late) / (b - a);
    }
    return this.waves.mean(a, b);
  }

  exponential(alpha: number, t: number): number {
    return t < this.handover_s ? this.waves.exponential(alpha, t) : this.later.exponential(alpha, t);
  }

  sine(omega: number): { readonly steady: Complex; transient(t: number): number } {
    const late = this.later.sine(omega);
    const { steady } = late;
    const sinusoid = (t: number) => steady.im * Math.cos(omega * t) + steady.re * Math.sin(omega * t);
    return {
      steady,
      transient: (t) => (t < this.handover_s ? this.waves.sine(omega, t) - sinusoid(t) : late.transient(t)),
    };
  }
}

/** A contour for one stretch of time with launch and round on it. */
interface Stretch {
  readonly contour: Contour;
  readonly launchRe: Float64Array;
  readonly launchIm: Float64Array;
  /** ln|round| and its angle. */
  readonly size: Float64Array;
  readonly angle: Float64Array;
  /** Launch times an input's transform and the contour's weights, for the inputs asked again and again. */
  readonly launched: Map<Input, OnContour>;
}

/** The transform of an input. */
type Input = (sre: number, sim: number) => readonly [re: number, im: number];

const stretch = 1.5;
const mostLevels = 9;
/** Powers of e by which the integrand may outgrow the answer before the contour is widened. */
const growth = 10;
/** How far round^k may turn or change, in radians and powers of e, from one node to the next. */
const greatestTurn = 0.6;

class Waves {
  private readonly stretches = new Map<number, Stretch>();
  private readonly ringing_per_s: number;
  private readonly firstRe: number;
  private readonly roundRe: number;

  constructor(
    private readonly network: LadderNetwork,
    private readonly line: Line,
    private readonly reference: Reference,
    private readonly scaleFactor: number,
  ) {
    this.ringing_per_s = ringingPoles(matched(network, line), reference).reduce(
      (most, pole) => Math.max(most, 1.3 * modulus(pole)),
      0,
    );
    const edge = lineWaves(network, line, reference, Float64Array.of(1e40), new Float64Array(1));
    this.firstRe = edge.launchRe[0]! * scaleFactor;
    this.roundRe = edge.roundRe[0]!;
  }

  /** Σ over the waves that have arrived of the inverse of launch·round^k/s^power: 1 the step response, 2 its integral. */
  sum(t: number, power: 1 | 2): number {
    return this.arrived(t, (k, since) => this.term(k, since, power));
  }

  mean(a: number, b: number): number {
    return this.arrived(b, (k, until) => {
      const since = Math.max(0, until - (b - a));
      const span = until - since;
      if (span === 0) return 0;
      const share = span / (b - a);
      if (span < 0.05 * until) return share * gaussMean((x) => this.term(k, x, 1), since, until);
      return (this.term(k, until, 2) - this.term(k, since, 2)) / (b - a);
    });
  }

  exponential(alpha: number, t: number): number {
    const input: Input = (sre, sim) => over(1, 0, sre + alpha, sim);
    return this.arrived(t, (k, since) =>
      since < least_s ? this.firstRe * this.roundRe ** k : this.inverse(k, since, input, 0),
    );
  }

  /** Response to sin(ωt) from t = 0, whole. */
  sine(omega: number, t: number): number {
    const input: Input = (sre, sim) => over(omega, 0, sre * sre - sim * sim + omega * omega, 2 * sre * sim);
    return this.arrived(t, (k, since) => (since < least_s ? 0 : this.inverse(k, since, input, 1.3 * omega)));
  }

  private arrived(t: number, wave: (k: number, since: number) => number): number {
    let sum = 0;
    for (let k = 0; (2 * k + 1) * this.line.delay_s <= t; k++) sum += wave(k, t - (2 * k + 1) * this.line.delay_s);
    return sum;
  }

  private term(k: number, since: number, power: 1 | 2): number {
    if (since < least_s) return power === 2 ? 0 : this.firstRe * this.roundRe ** k;
    return this.inverse(k, since, power === 1 ? reciprocal : squaredReciprocal, 0);
  }

  private inverse(k: number, since: number, input: Input, reach_per_s: number): number {
    const place = Math.ceil(Math.log(since) / Math.log(stretch));
    const end = stretch ** place * 1.0000001;
    for (let level = 0; ; level++) {
      const reach = Math.max(this.ringing_per_s, reach_per_s, (8 * 2 ** level) / end);
      const found = this.stretch(place, end, reach);
      if (level === mostLevels || !overgrown(found, k, since)) return wave(found, launched(found, input), k, since);
    }
  }

  private stretch(place: number, end: number, reach: number): Stretch {
    const key = place * 64 + Math.round(Math.log2(reach * end) * 4);
    let found = this.stretches.get(key);
    if (found === undefined) {
      const contour = wideContour(end, reach);
      const waves = lineWaves(this.network, this.line, this.reference, contour.sre, contour.sim);
      found = {
        contour,
        launchRe: waves.launchRe.map((each) => each * this.scaleFactor),
        launchIm: waves.launchIm.map((each) => each * this.scaleFactor),
        // Nothing comes back from a line matched at an end; a logarithm needs something.
        size: waves.roundRe.map((re, i) => Math.log(Math.max(1e-300, Math.hypot(re, waves.roundIm[i]!)))),
        angle: waves.roundRe.map((re, i) => Math.atan2(waves.roundIm[i]!, re)),
        launched: new Map(),
      };
      this.stretches.set(key, found);
    }
    return found;
  }
}

/** Below this the wave has just arrived: its value is that of the instant. */
const least_s = 1e-17;

/**
 * Whether round^k is too much for the contour: it outgrows the fall of exp(s t) somewhere left of the imaginary axis, or turns too far
 * from node to node where the integrand still counts.
 */
function overgrown({ contour, size, angle }: Stretch, k: number, t: number): boolean {
  for (let i = 0; i < size.length; i++) {
    const height = k * size[i]! + contour.sre[i]! * t;
    if (contour.sre[i]! < 0 && height > growth) return true;
    if (i === 0 || height < -25) continue;
    const turned = angle[i]! - angle[i - 1]!;
    const turn = turned - 2 * Math.PI * Math.round(turned / (2 * Math.PI));
    if (k * Math.hypot(turn, size[i]! - size[i - 1]!) > greatestTurn) return true;
  }
  return false;
}

const reciprocal: Input = (sre, sim) => over(1, 0, sre, sim);
const squaredReciprocal: Input = (sre, sim) => over(1, 0, sre * sre - sim * sim, 2 * sre * sim);

function launched(at: Stretch, input: Input): OnContour {
  const held = at.launched.get(input);
  if (held !== undefined) return held;
  const { contour, launchRe, launchIm } = at;
  const made = weighted(contour, (i) => {
    const [xr, xi] = input(contour.sre[i]!, contour.sim[i]!);
    return [launchRe[i]! * xr - launchIm[i]! * xi, launchRe[i]! * xi + launchIm[i]! * xr];
  });
  if (input === reciprocal || input === squaredReciprocal) at.launched.set(input, made);
  return made;
}

/** The k-th wave at a time since its arrival: Im Σ F round^k exp(s t). */
function wave({ contour, size, angle }: Stretch, { re, im }: OnContour, k: number, t: number): number {
  let sum = 0;
  for (let i = 0; i < re.length; i++) {
    const e = Math.exp(k * size[i]! + contour.sre[i]! * t);
    const phase = k * angle[i]! + contour.sim[i]! * t;
    sum += e * (re[i]! * Math.sin(phase) + im[i]! * Math.cos(phase));
  }
  return sum;
}

import { type Complex, complex, divide, subtract } from "../quantities/complex.ts";
import { type Contour, decadeContour, invert, type OnContour, weighted } from "./contour.ts";
import { over } from "./decade.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";
import { residue, ringingPoles } from "./ringing.ts";
import { slowestDecay } from "./slowestMode.ts";
import { tapTwoPort } from "./tapTwoPort.ts";
import { transferOf } from "./transfer.ts";

/** A ringing pair of the LV inductance in the curve: 2 Re q·exp(p t). */
interface Pair {
  readonly p: Complex;
  readonly q: Complex;
}

/** Contour nodes a decade: 32 leave about 1e-14 of the standing voltage. */
const nodes = 32;
/** A line counts in full from this many delays on, before as its capacitance: its own waves have died away by then. */
const delaysToSettle = 20;

/**
 * The electrode's voltage over its standing one V0 after the source leaves. Taking the current I0 away gives the transform
 * (1 − Z(s)/Z(0))/s, Z at the electrode with the source's capacitance. With the slowest decay λ known, exp(λ t) times the curve is
 * inverted (s − λ in the place of s), so that it keeps its digits however late. Resistances and capacitances alone give a sum of falling
 * exponentials, so the curve crosses a threshold once. An LV inductance adds at most one ringing pair, counted by its envelope.
 */
export class DischargeCurve {
  /** The slowest decay of all modes; a ringing one by its envelope. null: nothing to discharge. */
  readonly slowest_per_s: number | null;
  private readonly shift: number;
  /** Resistances and capacitances alone: the curve only falls. */
  private readonly plain: boolean;
  private readonly pairs: readonly Pair[];

  constructor(
    private readonly network: LadderNetwork,
    /** Input resistance at dc. */
    private readonly Z0: number,
  ) {
    const { lv, cable } = network;
    this.plain = cable.line === null && (lv.inductance_H === 0 || lv.capacitance_F === 0);
    const slow = slowestDecay(network);
    const decay = slow === null || cable.line === null ? slow : this.refined(slow);
    const poles = cable.line === null && !this.plain ? ringingPoles(leftAlone(network), "source") : [];
    this.pairs = poles.map((p) => ({ p, q: residue((sre, sim) => this.transform(network, sre, sim), p) }));
    this.shift = decay ?? 0;
    const decays = [...poles.map(({ re }) => -re), ...(decay === null ? [] : [decay])];
    this.slowest_per_s = decays.length === 0 ? null : Math.min(...decays);
  }

  /** The time after which the curve stays below exp(logarithm), s. */
  timeTo(logarithm: number): number {
    if (this.slowest_per_s === null || (this.plain && this.first() <= Math.exp(logarithm))) return 0;
    // A sum of falling exponentials, 1 at most at the start, is below exp(−λ t).
    let end = (-logarithm / this.slowest_per_s) * (1 + 1e-9);
    let above = this.margin(end, logarithm);
    for (let more = 0; more < 8 && above(end) > 0; more++) {
      end *= 10;
      above = this.margin(end, logarithm);
    }
    for (let decade = 0; decade < 40; decade++) {
      if (above(end / 10) > 0) return bisected(above, end / 10, end);
      end /= 10;
      above = this.margin(end, logarithm);
    }
    return 0;
  }

  /** The value at t = 0+. */
  private first(): number {
    return this.transform(this.network, Float64Array.of(1e40), new Float64Array(1)).re[0]! * 1e40;
  }

  /** Within the decade before `end`: positive while the curve is above the threshold. */
  private margin(end: number, logarithm: number): (t: number) => number {
    const contour = decadeContour(end * 1.0000001, nodes);
    const sre = contour.sre.map((each) => each - this.shift);
    const { line } = this.network.cable;
    const early = line !== null && end < 10 * delaysToSettle * line.delay_s;
    const { re, im } = this.transform(early ? withShortLine(this.network) : this.network, sre, contour.sim);
    const smooth = weighted(contour, (k) => {
      const s = complex(sre[k]!, contour.sim[k]!);
      const held = this.pairs.reduce((sum, pair) => subtract(sum, pairAt(pair, s)), complex(re[k]!, im[k]!));
      return [held.re, held.im];
    });
    return (t) => this.raised(contour, smooth, t) - Math.exp(this.shift * t + logarithm);
  }

  /** exp(λ t) times the curve, the ringing by its envelope. */
  private raised(contour: Contour, smooth: OnContour, t: number): number {
    return this.pairs.reduce(
      (sum, { p, q }) => sum + 2 * Math.hypot(q.re, q.im) * Math.exp((p.re + this.shift) * t),
      invert(contour, smooth, t),
    );
  }

  /** (1 − Z(s)/Z(0))/s = (y − 1)/(y s), y = Z(0) Y(s). */
  private transform(network: LadderNetwork, sre: Float64Array, sim: Float64Array): OnContour {
    const { re: yr, im: yi } = this.admittance(network, sre, sim);
    const re = new Float64Array(sre.length);
    const im = new Float64Array(sre.length);
    for (let k = 0; k < re.length; k++) {
      const [qr, qi] = over(yr[k]! - 1, yi[k]!, yr[k]!, yi[k]!);
      [re[k], im[k]] = over(qr, qi, sre[k]!, sim[k]!);
    }
    return { re, im };
  }

  private admittance(network: LadderNetwork, sre: Float64Array, sim: Float64Array): OnContour {
    const { Yre, Yim } = transferOf(network, tapTwoPort(network, sre, sim), sre, sim);
    const Cs = network.source.capacitance_F;
    return {
      re: Yre.map((each, k) => this.Z0 * (each + sre[k]! * Cs)),
      im: Yim.map((each, k) => this.Z0 * (each + sim[k]! * Cs)),
    };
  }

  /** The slowest decay with the line in full, by the secant method from what it is with the line's capacitance. */
  private refined(start: number): number {
    const at = (x: number) => this.admittance(this.network, Float64Array.of(-x), new Float64Array(1)).re[0]!;
    let [a, b] = [start, start * (1 + 1e-6)];
    let [fa, fb] = [at(a), at(b)];
    for (let step = 0; step < 40 && fb !== fa; step++) {
      const next = b - (fb * (b - a)) / (fb - fa);
      [a, fa, b, fb] = [b, fb, next, at(next)];
      // Another mode, or one that the electrode hardly feels.
      if (!(Math.abs(b - start) < 0.1 * start)) return start;
      if (Math.abs(b - a) <= 1e-15 * b) break;
    }
    return b;
  }
}

/** As the ringing sees the network after the source has left: its branch all but open. */
const leftAlone = (network: LadderNetwork): LadderNetwork => ({
  ...network,
  source: { ...network.source, resistance_ohm: 1e30, damping_ohm: 0, inductance_H: 0 },
});

/** The line's capacitance with a millionth of its delay. */
const withShortLine = (network: LadderNetwork): LadderNetwork => {
  const { line } = network.cable;
  const short = line && { ...line, impedance_ohm: line.impedance_ohm * 1e-6, delay_s: line.delay_s * 1e-6 };
  return { ...network, cable: { ...network.cable, line: short } };
};

function pairAt({ p, q }: Pair, s: Complex): Complex {
  const upper = divide(q, subtract(s, p));
  const lower = divide(complex(q.re, -q.im), subtract(s, complex(p.re, -p.im)));
  return complex(upper.re + lower.re, upper.im + lower.im);
}

/** Where a falling function crosses zero, halving the logarithm of time. */
function bisected(f: (t: number) => number, from: number, to: number): number {
  let low = from;
  let high = to;
  for (let step = 0; step < 44; step++) {
    const middle = Math.sqrt(low * high);
    if (f(middle) > 0) low = middle;
    else high = middle;
  }
  return high;
}

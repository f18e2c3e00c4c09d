import { advantage } from "./advantage.ts";
import { bareElement } from "./bandLimit.ts";
import { bandBound, bodyNeeded, type Kind, type Limits, leastLength, mostElements } from "./kind.ts";

/** Names of the limit that leaves the smallest margin. */
export const governors = [
  "element voltage, dc or rms",
  "element voltage, peak",
  "element dissipation",
  "creepage along one element",
] as const;

/** One combination with the figures that it is judged on. */
export interface Build {
  readonly kind: Kind;
  readonly strings: number;
  readonly elements: number;
  readonly resistance_ohm: number;
  readonly hvArm_ohm: number;
  readonly elementCount: number;
  readonly length_m: number;
  readonly uncertainty: number;
  readonly loading: number;
  readonly margin: number;
  readonly governing: (typeof governors)[number];
}

const block = 64;

/**
 * A family in a number of parallel strings, for every count of elements. For each count only the largest value within the
 * window is kept: count, length, uncertainty and the voltage margins do not depend on the value, loading and the dissipation
 * margin improve with it, so any smaller value is no better in anything.
 */
export class Line {
  readonly kind: Kind;
  readonly strings: number;
  readonly first: number;
  readonly last: number;
  private readonly limits: Limits;
  private readonly value: Float64Array;
  private readonly hvArm: Float64Array;
  private readonly margin: Float64Array;
  private readonly uncertain: Float64Array;
  private readonly governing: Uint8Array;
  private readonly leastLength_m: number;
  private readonly blockMost: Float64Array;
  private filled: number;
  private at: number;
  private bare = false;
  private readonly bareElement_ohm: number;

  constructor(kind: Kind, strings: number, limits: Limits) {
    this.kind = kind;
    this.strings = strings;
    this.limits = limits;
    const smallest = kind.offers[0]?.value ?? Number.POSITIVE_INFINITY;
    const byWindow = Math.floor(((strings * kind.greatest_ohm) / smallest) * (1 + 1e-12));
    const byLength = Math.floor((limits.length_m / kind.pitch_m) * (1 + 1e-12));
    this.first = kind.leastCount;
    this.last = Math.min(mostElements, byWindow, byLength);
    const size = Math.max(this.last - this.first + 1, 0);
    this.value = new Float64Array(size);
    this.hvArm = new Float64Array(size);
    this.margin = new Float64Array(size);
    this.uncertain = new Float64Array(size);
    this.leastLength_m = leastLength(kind, strings, limits);
    this.bareElement_ohm = bareElement(limits.ask, kind.family.selfCapacitance_F) * (1 + 1e-12);
    this.governing = new Uint8Array(size);
    this.blockMost = new Float64Array(Math.ceil(size / block));
    this.filled = this.first - 1;
    this.at = kind.offers.length - 1;
  }

  length(n: number): number {
    return Math.max(n * this.kind.pitch_m, this.leastLength_m);
  }

  /** Same expression as the formula `sizing.partsUncertainty`. */
  uncertainty(n: number): number {
    const { tolerance: t, temperatureCoefficient_per_K: tc, voltageCoefficient_per_V: kv } = this.kind.family;
    const s = this.limits.ask.j.document.brief.surroundings.ambientSpan_K;
    const Ve = (this.limits.ask.working.peak_V * this.limits.share) / n;
    return 2 * Math.sqrt((t * t) / (3 * n * this.strings) + (t / 3) ** 2 + ((s * tc) ** 2 + (kv * Ve) ** 2) / 3);
  }

  loading(hvArm_ohm: number): number {
    const Rs = this.limits.ask.j.document.brief.source.resistance_ohm;
    return Rs / (Rs + hvArm_ohm / this.limits.share);
  }

  /** The build of n elements, or null where none stands. */
  build(n: number): Build | null {
    if (n < this.first || n > this.last) return null;
    this.fill(n);
    const i = n - this.first;
    const resistance_ohm = this.value[i] as number;
    if (resistance_ohm === 0) return null;
    const hvArm_ohm = this.hvArm[i] as number;
    return {
      kind: this.kind,
      strings: this.strings,
      elements: n,
      resistance_ohm,
      hvArm_ohm,
      elementCount: n * this.strings,
      length_m: this.length(n),
      uncertainty: this.uncertain[i] as number,
      loading: this.loading(hvArm_ohm),
      margin: this.margin[i] as number,
      governing: governors[this.governing[i] as number]!,
    };
  }

  /** Whether a build of n elements stands. */
  stands(n: number): boolean {
    if (n < this.first || n > this.last) return false;
    this.fill(n);
    return this.value[n - this.first] !== 0;
  }

  /** Whether the build of n here is no worse in all figures, and better in one, than the build of m on the other line. */
  beats(n: number, other: Line, m: number): boolean {
    if (!this.stands(n)) return false;
    const i = n - this.first;
    const k = m - other.first;
    const count = m * other.strings - n * this.strings;
    const length = advantage(this.length(n), other.length(m));
    const uncertain = advantage(this.uncertain[i]!, other.uncertain[k]!);
    const load = advantage(this.loading(this.hvArm[i]!), other.loading(other.hvArm[k]!));
    const margin = advantage(other.margin[k]!, this.margin[i]!);
    if (count < 0 || length < 0 || uncertain < 0 || load < 0 || margin < 0) return false;
    return count > 0 || length > 0 || uncertain > 0 || load > 0 || margin > 0;
  }

  /** Greatest n up to `most` whose column is no longer than `length_m`. */
  lastWithin(length_m: number, most: number): number {
    if (this.leastLength_m > length_m) return this.first - 1;
    let n = Math.min(most, this.last, Math.floor(length_m / this.kind.pitch_m) + 1);
    while (n >= this.first && this.length(n) > length_m) n--;
    return n;
  }

  /** Least n up to `high` whose uncertainty is no more than asked; it falls as n rises. high + 1 where none is. */
  firstWithin(uncertainty: number, high: number): number {
    this.fill(high);
    let bad = this.first - 1;
    let good = high + 1;
    while (good - bad > 1) {
      const middle = (good + bad) >> 1;
      if ((this.uncertain[middle - this.first] as number) <= uncertainty) good = middle;
      else bad = middle;
    }
    return good;
  }

  /** The largest count from `high` down to `low` whose build has at least this R1 and margin and passes `test`. */
  search(low: number, high: number, hvArm_ohm: number, margin: number, test: (n: number) => boolean): number | null {
    this.fill(high);
    for (let n = high; n >= low; ) {
      const i = n - this.first;
      const start = i - (i % block);
      if ((this.blockMost[start / block] as number) < hvArm_ohm || this.blockMost[start / block] === 0) {
        n = this.first + start - 1;
        continue;
      }
      const stands = this.value[i] !== 0 && this.hvArm[i]! >= hvArm_ohm && this.margin[i]! >= margin;
      if (stands && test(n)) return n;
      n--;
    }
    return null;
  }

  private fill(to: number): void {
    for (let n = this.filled + 1; n <= to; n++) this.decide(n);
    this.filled = Math.max(this.filled, to);
  }

  /** Picks the largest value whose R1 stays in the window and whose dissipation stays within its limit. */
  private decide(n: number): void {
    const { kind, strings, limits } = this;
    const { offers } = kind;
    this.uncertain[n - this.first] = this.uncertainty(n);
    if (this.length(n) > limits.length_m * (1 + 1e-12)) return;
    const bare = (limits.ask.working.greatest_Vpeak * limits.share) / n > limits.bareAbove_V;
    const bound = bare ? bandBound(kind, this.length(n), strings, limits) : Number.POSITIVE_INFINITY;
    const greatest = Math.min(kind.greatest_ohm, bound) * (1 + 1e-12);
    // From the count on at which capacitors carry the band, larger values are allowed again.
    if (this.bare && !bare) this.at = offers.length - 1;
    this.bare = bare;
    // The largest value allowed falls as n rises, so the search goes on from where it stood.
    const each = bare ? this.bareElement_ohm : Number.POSITIVE_INFINITY;
    const tooLarge = (value: number) => (n * value) / strings > greatest || value > each;
    while (this.at >= 0 && tooLarge(offers[this.at]!.value)) this.at--;
    let at = this.at;
    while (at >= 0 && offers[at]!.count < n * strings) at--;
    if (at < 0) return;
    const { value } = offers[at]!;
    const hvArm_ohm = (n * value) / strings;
    if (hvArm_ohm < limits.least_ohm * (1 - 1e-12)) return;
    this.judge(n, value, hvArm_ohm);
  }

  private judge(n: number, value: number, hvArm_ohm: number): void {
    const { kind, limits } = this;
    const { greatestRms_V, greatest_Vpeak } = limits.ask.working;
    const rms = (greatestRms_V * limits.share) / n;
    const dissipation = (rms * rms) / value;
    if (dissipation > kind.dissipation_W * (1 + 1e-12)) return;
    let margin = 1 - rms / kind.rms_V;
    let worst = 0;
    const lower = (other: number, at: number): void => {
      if (other >= margin) return;
      margin = other;
      worst = at;
    };
    lower(1 - (greatest_Vpeak * limits.share) / n / kind.peak_V, 1);
    lower(dissipation === 0 ? 1 : 1 - dissipation / kind.dissipation_W, 2);
    lower(1 - bodyNeeded(n, limits) / kind.family.bodyLength_m, 3);
    const i = n - this.first;
    this.value[i] = value;
    this.hvArm[i] = hvArm_ohm;
    this.margin[i] = Math.max(margin, 0);
    this.governing[i] = worst;
    const b = Math.floor(i / block);
    this.blockMost[b] = Math.max(this.blockMost[b]!, hvArm_ohm);
  }
}

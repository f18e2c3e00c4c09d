import { advantage } from "./advantage.ts";
import type { Build, Line } from "./line.ts";

type Figures = Pick<Build, "elementCount" | "length_m" | "uncertainty" | "loading" | "margin">;

/**
 * Whether `a` is no worse than `b` in all six figures and better in one; 1 part in 1e12 decides nothing. Every string is of one
 * value, so the number of different parts is equal.
 */
export function dominates(a: Figures, b: Figures): boolean {
  const advantages = [
    b.elementCount - a.elementCount,
    advantage(a.length_m, b.length_m),
    advantage(a.uncertainty, b.uncertainty),
    advantage(a.loading, b.loading),
    advantage(b.margin, a.margin),
  ];
  return advantages.every((each) => each >= 0) && advantages.some((each) => each > 0);
}

/** The order of the list: fewest elements, shortest, least uncertainty; then a fixed tie-break. */
export function inOrder(a: Build, b: Build): number {
  return (
    a.elementCount - b.elementCount ||
    a.length_m - b.length_m ||
    a.uncertainty - b.uncertainty ||
    a.loading - b.loading ||
    b.margin - a.margin ||
    a.strings - b.strings ||
    (a.kind.family.id < b.kind.family.id ? -1 : a.kind.family.id > b.kind.family.id ? 1 : 0)
  );
}

const looseness = 1e-11;
const slack = 1 + looseness;

/**
 * Finds what dominates a build among all lines, without listing them. In a line, count and length rise with n and uncertainty
 * falls, so only a span of n can hold a dominator; in that span loading and margin are looked up. Exact.
 */
export class Dominance {
  private readonly lines: Line[];
  private readonly sags: boolean;
  /** Per line the line that dominated its build before: neighbours are likely to share it. */
  private readonly before = new Map<Line, Line>();

  constructor(lines: readonly Line[], sags: boolean) {
    this.lines = [...lines];
    this.sags = sags;
  }

  /** A quick look that only ever says yes rightly: the former dominator's line at the most elements that are no more. */
  surely(line: Line, n: number): boolean {
    const other = this.before.get(line);
    if (other === undefined) return false;
    const high = other.lastWithin(line.length(n) * slack, Math.floor((n * line.strings) / other.strings));
    return other.beats(high, line, n) || other.beats(high - 1, line, n);
  }

  dominatorOf(line: Line, build: Build): Build | null {
    const first = this.before.get(line);
    const found = first === undefined ? null : this.inLine(first, build);
    if (found !== null) return found;
    for (const other of this.lines) {
      if (other === first) continue;
      const dominator = this.inLine(other, build);
      if (dominator === null) continue;
      this.before.set(line, other);
      return dominator;
    }
    return null;
  }

  private inLine(line: Line, build: Build): Build | null {
    const most = Math.floor(build.elementCount / line.strings);
    const high = line.lastWithin(build.length_m * slack, most);
    if (high < line.first) return null;
    const low = line.firstWithin(build.uncertainty * slack, high);
    if (low > high) return null;
    // Looser than `dominates`, which decides on the figures themselves, so that rounding cannot hide a build.
    const hvArm = this.sags ? build.hvArm_ohm * (1 - 1e-9) : 0;
    const at = line.search(low, high, hvArm, build.margin - looseness, (n) => dominates(line.build(n) as Build, build));
    return at === null ? null : line.build(at);
  }
}

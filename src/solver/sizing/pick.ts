import { Dominance, inOrder } from "./front.ts";
import { type Kind, type Limits, mostStrings } from "./kind.ts";
import { type Build, Line } from "./line.ts";

/** What the walk over all counts found. */
export interface Picked {
  /** Listed builds: no other is no worse in all figures and better in one; in the order of the list. */
  readonly builds: readonly Build[];
  /** Per family that is not listed but stands: its best build, and what dominates it or null where it only came too late. */
  readonly behind: ReadonlyMap<string, { readonly best: Build; readonly dominator: Build | null }>;
}

/** A build whose string alone is less certain than wanted. */
export const tooUncertain = (build: Build, limits: Limits): boolean =>
  build.uncertainty > limits.ask.j.document.brief.wantedUncertainty * (1 + 1e-12);

/** One line for each family and number of strings that has any count to try. */
export const linesOf = (kinds: readonly Kind[], limits: Limits): Line[] =>
  kinds.flatMap((kind) =>
    Array.from({ length: mostStrings }, (_, i) => new Line(kind, i + 1, limits)).filter(
      (line) => line.last >= line.first,
    ),
  );

/**
 * Walks the counts upwards over all lines and keeps what nothing dominates, until `top` are found and every family's best is
 * known. A dominator never has more elements than what it dominates, so what is kept stands for all counts.
 */
export function pick(lines: readonly Line[], limits: Limits, top: number): Picked {
  const walk = new Walk(lines, limits, top);
  const most = lines.reduce((n, line) => Math.max(n, line.last * line.strings), 0);
  for (let count = 1; count <= most; count++) {
    // Asked now and then: it costs as much as a step.
    if (count % 8 === 1 && walk.settled(count)) break;
    walk.step(count);
  }
  return walk.picked();
}

class Walk {
  private readonly clear: Build[] = [];
  private readonly stopped: Build[] = [];
  private readonly bestClear = new Map<string, Build>();
  private readonly bestStopped = new Map<string, Build>();
  private readonly dominated = new Map<string, { best: Build; dominator: Build }>();
  private readonly dominance: Dominance;
  private active: readonly Line[];
  private readonly lines: readonly Line[];
  private readonly limits: Limits;
  private readonly top: number;
  private readonly uncertainty: number;

  constructor(lines: readonly Line[], limits: Limits, top: number) {
    this.lines = lines;
    this.active = lines;
    this.limits = limits;
    this.top = top;
    this.uncertainty = limits.ask.j.document.brief.wantedUncertainty * (1 + 1e-12);
    this.dominance = new Dominance(lines, limits.ask.j.document.brief.source.resistance_ohm > 0);
  }

  /** Looks at every build of this many elements that could still change the list or its family's best. */
  step(count: number): void {
    const found: { line: Line; build: Build }[] = [];
    for (const line of this.active) {
      if (count % line.strings !== 0) continue;
      const n = count / line.strings;
      if (!line.stands(n) || !this.wanted(line, n) || this.dominance.surely(line, n)) continue;
      found.push({ line, build: line.build(n) as Build });
    }
    if (found.length > 1) found.sort((a, b) => inOrder(a.build, b.build));
    for (const { line, build } of found) this.take(line, build);
  }

  private wanted(line: Line, n: number): boolean {
    const stop = line.uncertainty(n) > this.uncertainty;
    const id = line.kind.family.id;
    if (this.bestClear.has(id) || (stop && this.bestStopped.has(id))) {
      return (stop ? this.stopped : this.clear).length < this.top;
    }
    return true;
  }

  private take(line: Line, build: Build): void {
    const id = build.kind.family.id;
    const stop = tooUncertain(build, this.limits);
    const list = stop ? this.stopped : this.clear;
    const best = stop ? this.bestStopped : this.bestClear;
    const dominator = this.dominance.dominatorOf(line, build);
    if (dominator !== null) {
      if (!this.dominated.has(id)) this.dominated.set(id, { best: build, dominator });
      return;
    }
    if (!best.has(id)) best.set(id, build);
    if (list.length < this.top) list.push(build);
  }

  /** Keeps the lines that can still change the list or a family's best; true where none is left. */
  settled(count: number): boolean {
    const listed = this.clear.length >= this.top;
    const filled = listed || this.clear.length + this.stopped.length >= this.top;
    this.active = this.active.filter((line) => {
      if (line.last * line.strings < count) return false;
      const id = line.kind.family.id;
      const hopes = line.uncertainty(line.last) <= this.uncertainty;
      if (this.bestClear.has(id)) return !(listed || (filled && !hopes));
      return hopes || !filled || !this.bestStopped.has(id);
    });
    return this.active.length === 0;
  }

  /** First of each family first, then the rest of the list, all in the order of the list: stops last. */
  picked(): Picked {
    const order = (a: Build, b: Build) =>
      Number(tooUncertain(a, this.limits)) - Number(tooUncertain(b, this.limits)) || inOrder(a, b);
    const ids = [...new Set(this.lines.map((line) => line.kind.family.id))];
    const best = ids.flatMap((id) => this.bestClear.get(id) ?? this.bestStopped.get(id) ?? []).sort(order);
    const listed = new Set(best.slice(0, this.top));
    const names = new Set([...listed].map(nameOf));
    for (const build of [...this.clear, ...this.stopped]) {
      if (listed.size >= this.top) break;
      if (names.has(nameOf(build))) continue;
      names.add(nameOf(build));
      listed.add(build);
    }
    const families = new Set([...listed].map((build) => build.kind.family.id));
    const behind = new Map<string, { best: Build; dominator: Build | null }>();
    for (const id of ids.filter((each) => !families.has(each))) {
      const stands = this.bestClear.get(id) ?? this.bestStopped.get(id);
      const lost = this.dominated.get(id);
      if (stands !== undefined) behind.set(id, { best: stands, dominator: null });
      else if (lost !== undefined) behind.set(id, lost);
    }
    return { builds: [...listed].sort(order), behind };
  }
}

const nameOf = (build: Build): string => `${build.elements} ${build.strings} ${build.kind.family.id}`;

import type { Formula, Solution } from "./formula.ts";

/**
 * The worksheet behind every figure: numbers under stable paths and, per kind of number, the formula's id and the paths of its
 * inputs. A path that starts with `/` is a JSON pointer into the document (a given); any other is a derived figure whose last
 * key carries its unit. An array holds one number per element; element 17 shares the record of element 1.
 */
export type SheetValue = number | null | readonly (number | null)[];

export interface Trace {
  readonly formula: string;
  readonly inputs: Readonly<Record<string, string>>;
  /** For a solution: the residual reached. */
  readonly residual?: number;
}

/** Plain data: survives a structured clone, a worker and JSON. */
export interface SheetData {
  readonly values: Readonly<Record<string, SheetValue>>;
  readonly traces: Readonly<Record<string, Trace>>;
}

type Inputs<K extends string> = Readonly<Record<K, string>>;

export class Sheet {
  readonly values: Record<string, SheetValue> = {};
  readonly traces: Record<string, Trace> = {};

  /** A number of the document (pointer) or a constant of a part (`part:` pointer); no trace. */
  given(path: string, value: SheetValue): void {
    this.values[path] = value;
  }

  /** The number at a path; throws when it was never put there. */
  number(path: string): number | null {
    const value = this.values[path];
    if (value === undefined) throw new Error(`no value at ${path}`);
    if (typeof value === "object" && value !== null) throw new Error(`an array at ${path}`);
    return value;
  }

  array(path: string): readonly (number | null)[] {
    const value = this.values[path];
    if (!Array.isArray(value)) throw new Error(`no array at ${path}`);
    return value;
  }

  /** Computes a figure by a formula from the figures at the paths of its inputs; null as soon as one input is null. */
  derive<N extends string, A extends string = never>(
    path: string,
    record: Formula<N, A>,
    inputs: Inputs<N | A>,
  ): number | null {
    const value = evaluate(record, inputs, (p) => this.values[p], null);
    this.values[path] = value;
    this.traces[path] = { formula: record.id, inputs };
    return value;
  }

  /** The same formula once per element; inputs that are arrays are taken at the same place, numbers are shared. */
  deriveEach<N extends string, A extends string = never>(
    path: string,
    record: Formula<N, A>,
    inputs: Inputs<N | A>,
    count: number,
  ): readonly (number | null)[] {
    const values = Array.from({ length: count }, (_, i) => evaluate(record, inputs, (p) => this.values[p], i));
    this.values[path] = values;
    this.traces[path] = { formula: record.id, inputs };
    return values;
  }

  /** Records a figure that was solved for, with the residual reached. */
  solved(
    path: string,
    record: Solution,
    value: SheetValue,
    inputs: Readonly<Record<string, string>>,
    residual: number,
  ): void {
    this.values[path] = value;
    this.traces[path] = { formula: record.id, inputs, residual };
  }

  data(): SheetData {
    return { values: this.values, traces: this.traces };
  }
}

/** Runs a formula on values looked up by path; `index` picks the element of arrays that are not summed. */
export function evaluate(
  record: Formula<string, string>,
  inputs: Readonly<Record<string, string>>,
  lookUp: (path: string) => SheetValue | undefined,
  index: number | null,
): number | null {
  const x: Record<string, number | readonly number[]> = {};
  const arrays: readonly string[] = record.arrays ?? [];
  for (const name of Object.keys(record.inputs)) {
    const path = inputs[name];
    const found = path === undefined ? undefined : lookUp(path);
    if (found === undefined) throw new Error(`formula ${record.id}: no value for ${name} at ${path}`);
    if (arrays.includes(name)) {
      if (!Array.isArray(found) || found.some((v) => v === null)) return null;
      x[name] = found as readonly number[];
      continue;
    }
    const value = Array.isArray(found) ? found[index ?? 0] : (found as number | null);
    if (value === null || value === undefined) return null;
    x[name] = value;
  }
  const result = record.compute(x as never);
  return result === null || Number.isFinite(result) ? result : null;
}

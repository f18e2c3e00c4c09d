import type { Source } from "./source.ts";

/** An input of a formula: how it is written, its unit and what it is. */
export interface FormulaInput {
  readonly symbol: string;
  readonly unit: string;
  readonly meaning: string;
}

/**
 * One formula as one record: what the screens show, what `why` lays out and what computes the number are the same thing.
 * `statement` uses `{name}` for each input and `{=}` for the result, e.g. `{=} = {R1} / ({F} − 1)`;
 * symbols use `_` for a subscript: `R_2p`. Inputs named in `arrays` are whole arrays (sums); all others are numbers.
 */
export interface Formula<N extends string = string, A extends string = never> {
  readonly id: string;
  readonly title: string;
  readonly statement: string;
  readonly result: FormulaInput;
  readonly inputs: Readonly<Record<N | A, FormulaInput>>;
  readonly arrays?: readonly A[];
  /** Where it stops holding, one sentence. */
  readonly holds: string;
  readonly source: Source;
  /** null where the value does not exist. */
  readonly compute: (x: Readonly<Record<N, number>> & Readonly<Record<A, readonly number[]>>) => number | null;
}

/** A record for what no closed formula gives: the equations solved, the method, how its residual is stated. */
export interface Solution {
  readonly id: string;
  readonly title: string;
  readonly statement: string;
  readonly method: string;
  readonly holds: string;
  readonly source: Source;
  /** Greatest residual that the method promises. */
  readonly residualBound: number;
}

/** Only an identity that lets TypeScript infer the names of the inputs. */
export const formula = <N extends string, A extends string = never>(record: Formula<N, NoInfer<A>>): Formula<N, A> =>
  record;

/** What may fail because of outside input: a value, or one clear reason. A programmer's error throws instead. */
export type Result<T, E = Refusal> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly error: E };

/** Why outside input was refused: what, where, why, what to do. Nothing is lost by it. */
export interface Refusal {
  /** Which key, field or character is meant, e.g. `/brief/scaleFactor` or `character 3`. */
  readonly where: string;
  /** One sentence: what is wrong and why. */
  readonly why: string;
  /** One sentence: what to do about it. */
  readonly cure: string;
}

/** The three ways to make a result. */
export const ok = <T>(value: T): Result<T, never> => ({ ok: true, value });
export const err = <E>(error: E): Result<never, E> => ({ ok: false, error });
export const refuse = (where: string, why: string, cure: string): Result<never> => err({ where, why, cure });

/** Compile-time guard that a switch is exhaustive. */
export function unreachable(value: never): never {
  throw new Error(`unreachable: ${JSON.stringify(value)}`);
}

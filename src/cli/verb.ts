/** What a verb needs of the outside, so that tests can stand in for it. */
export interface Outside {
  readonly read: (file: string) => string;
  readonly print: (text: string) => void;
  readonly say: (text: string) => void;
}

/** 0: clear or caution; 1: a stop stands; 2: unusable input. */
export type ExitCode = 0 | 1 | 2;

export interface Verb {
  readonly name: string;
  readonly does: string;
  readonly help: string;
  readonly run: (words: readonly string[], outside: Outside) => ExitCode | Promise<ExitCode>;
}

/** Input that cannot be used: its message goes to standard error, exit 2. */
export class Unusable extends Error {}

import { parseArgs } from "node:util";
import { Unusable } from "./verb.ts";

export interface Arguments {
  readonly file: string;
  readonly options: Readonly<Record<string, string | undefined>>;
}

/** One FILE and the named options, each with a value; anything else is refused by name. */
export function readArguments(
  words: readonly string[],
  names: readonly string[],
  positionals = 1,
): Arguments & { rest: string[] } {
  const options = Object.fromEntries(names.map((name) => [name, { type: "string" as const }]));
  try {
    const parsed = parseArgs({ args: [...words], options, allowPositionals: true, strict: true });
    const [file, ...rest] = parsed.positionals;
    if (file === undefined) throw new Unusable("No FILE is named.");
    if (rest.length !== positionals - 1)
      throw new Unusable(`${positionals} word(s) are expected after the verb, ${rest.length + 1} given.`);
    return { file, options: parsed.values as Record<string, string | undefined>, rest };
  } catch (error) {
    if (error instanceof Unusable) throw error;
    throw new Unusable((error as Error).message);
  }
}

/** A whole number within bounds, or the default when the option is absent. */
export function wholeNumber(
  text: string | undefined,
  name: string,
  least: number,
  greatest: number,
  otherwise: number,
): number {
  if (text === undefined) return otherwise;
  const value = Number(text);
  if (Number.isInteger(value) && value >= least && value <= greatest) return value;
  throw new Unusable(`--${name} must be a whole number from ${least} to ${greatest}; it is "${text}".`);
}

import { type ExitCode, type Outside, Unusable, type Verb } from "./verb.ts";
import { field } from "./verbs/field.ts";
import { network } from "./verbs/network.ts";
import { parts } from "./verbs/parts.ts";
import { prove } from "./verbs/prove.ts";
import { size } from "./verbs/size.ts";
import { why } from "./verbs/why.ts";

export const verbs: readonly Verb[] = [size, prove, parts, network, field, why];

const usage = () =>
  `stringwright VERB FILE [options]\n\n${verbs.map((verb) => `  ${verb.name.padEnd(8)} ${verb.does}`).join("\n")}\n\nVERB --help says more. Exit 0: clear or caution. 1: a stop stands. 2: unusable input.\n`;

/** Runs one command line. Everything that can be wrong with the input ends in one message and exit 2. */
export async function run(words: readonly string[], outside: Outside): Promise<ExitCode> {
  const [name, ...rest] = words;
  if (name === undefined || name === "--help" || name === "help") {
    outside.print(usage());
    return name === undefined ? 2 : 0;
  }
  const verb = verbs.find((each) => each.name === name);
  if (verb === undefined) {
    outside.say(`There is no verb "${name}".\n\n${usage()}`);
    return 2;
  }
  if (rest.includes("--help")) {
    outside.print(verb.help);
    return 0;
  }
  try {
    return await verb.run(rest, outside);
  } catch (error) {
    if (!(error instanceof Unusable)) throw error;
    outside.say(error.message);
    return 2;
  }
}

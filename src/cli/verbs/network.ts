import { solveNetwork } from "../../solver/index.ts";
import { readArguments } from "../arguments.ts";
import { readText, refusalText } from "../openDocument.ts";
import { Unusable, type Verb } from "../verb.ts";

export const network: Verb = {
  name: "network",
  does: "the raw electrical model, as numbers",
  help: `network FILE

Solves the raw network in FILE ("format": "stringwright-network") and prints what is asked. A value that does not exist is null.
Exit 0: solved. 2: unusable input, with the key and why.
`,
  run(words, outside) {
    const { file } = readArguments(words, []);
    const text = readText(file, outside);
    let form: unknown;
    try {
      form = JSON.parse(text);
    } catch (error) {
      throw new Unusable(`${file} is not JSON: ${(error as Error).message}`);
    }
    const solved = solveNetwork(form);
    if (!solved.ok) throw new Unusable(refusalText(solved.error));
    outside.print(`${JSON.stringify(solved.value)}\n`);
    return 0;
  },
};

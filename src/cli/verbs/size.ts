import { encodeDocument } from "../../file/encode.ts";
import { takeCandidate } from "../../solver/index.ts";
import { runJob } from "../../work/runJob.ts";
import { readArguments, wholeNumber } from "../arguments.ts";
import { openDocument, refusalText } from "../openDocument.ts";
import { Unusable, type Verb } from "../verb.ts";

export const size: Verb = {
  name: "size",
  does: "ranked candidates for the brief",
  help: `size FILE [--top N] [--take K]

Searches every resistor family, value, count and number of strings for the brief in FILE.
Prints the resistance window, the candidates in rank order, and why every other family lost.
  --top N    at most N candidates (default 10, to 1000)
  --take K   prints the whole document with candidate K of that list as its design instead; give the same --top
Exit 0: there is a candidate without a stop. 1: none, or the one taken has a stop. 2: unusable input.
`,
  run(words, outside) {
    const { file, options } = readArguments(words, ["top", "take"]);
    const take = options.take === undefined ? null : wholeNumber(options.take, "take", 1, 1000, 1);
    const top = wholeNumber(options.top, "top", 1, 1000, 10);
    const document = openDocument(file, outside);
    const outcome = runJob({ kind: "size", document, top });
    if (!outcome.ok) throw new Unusable(refusalText(outcome.error));
    const sizing = outcome.value.sizing!;
    if (take === null) {
      outside.print(`${JSON.stringify(sizing, null, 2)}\n`);
      return sizing.candidates.some((candidate) => candidate.stops.length === 0) ? 0 : 1;
    }
    const candidate = sizing.candidates[take - 1];
    if (candidate === undefined) {
      const found = sizing.candidates.length;
      const why =
        found > 0
          ? "Give the --top that the list was printed with."
          : (sizing.window.collision ?? sizing.lost[0]?.reason ?? "");
      outside.say(`There is no candidate ${take} among ${found}. ${why}`.trim());
      return 1;
    }
    outside.print(encodeDocument(takeCandidate(document, candidate)));
    for (const stop of candidate.stops) outside.say(`stop: ${stop}`);
    return candidate.stops.length === 0 ? 0 : 1;
  },
};

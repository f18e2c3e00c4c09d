import { type CsvFlavour, partsList, partsListCsv } from "../../solver/index.ts";
import { runJob } from "../../work/runJob.ts";
import { readArguments } from "../arguments.ts";
import { needsDesign, openDocument, refusalText } from "../openDocument.ts";
import { Unusable, type Verb } from "../verb.ts";

export const parts: Verb = {
  name: "parts",
  does: "the parts list of the design as CSV",
  help: `parts FILE [--flavour data|spreadsheet]

Prints the parts list as CSV, also when a stop stands; each stop is then named on standard error.
  --flavour data          comma, decimal point, no byte-order mark (default)
  --flavour spreadsheet   with byte-order mark
Exit 0: clear or caution. 1: a stop stands. 2: unusable input, or no design yet.
`,
  run(words, outside) {
    const { file, options } = readArguments(words, ["flavour"]);
    const flavour = options.flavour ?? "data";
    if (flavour !== "data" && flavour !== "spreadsheet")
      throw new Unusable(`--flavour is data or spreadsheet; it is "${flavour}".`);
    const document = openDocument(file, outside);
    needsDesign(document);
    const list = partsList(document);
    if (!list.ok) throw new Unusable(refusalText(list.error));
    const outcome = runJob({ kind: "prove", document, field: "solve" });
    if (!outcome.ok) throw new Unusable(refusalText(outcome.error));
    outside.print(partsListCsv(list.value, flavour as CsvFlavour));
    const stops = outcome.value.proof!.findings.filter((finding) => finding.level === "stop");
    for (const stop of stops) outside.say(`stop: ${stop.what}: ${stop.reason}`);
    return stops.length === 0 ? 0 : 1;
  },
};

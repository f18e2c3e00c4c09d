import { citation, filled, type Why, why as whyOf } from "../../solver/index.ts";
import { runJob } from "../../work/runJob.ts";
import { readArguments, wholeNumber } from "../arguments.ts";
import { needsDesign, openDocument, refusalText } from "../openDocument.ts";
import { Unusable, type Verb } from "../verb.ts";

export const why: Verb = {
  name: "why",
  does: "the trace behind one figure",
  help: `why FILE PATH [--element I]

Lays out the formula behind a figure of prove, e.g. scaleFactor.predicted, with its inputs, their origins and the source.
  --element I   which element, 1 next to the tap, where the figure is one of a list
Exit 0: printed. 2: no such figure, or unusable input.
`,
  run(words, outside) {
    const { file, options, rest } = readArguments(words, ["element"], 2);
    const document = openDocument(file, outside);
    needsDesign(document);
    const outcome = runJob({ kind: "prove", document, field: "solve" });
    if (!outcome.ok) throw new Unusable(refusalText(outcome.error));
    const { sheet, origins } = outcome.value.proof!;
    const index = options.element === undefined ? null : wholeNumber(options.element, "element", 1, 5000, 1) - 1;
    const found = whyOf(rest[0]!, sheet, origins, index);
    if (found === null) {
      const paths = Object.keys(sheet.traces).sort().join("\n  ");
      throw new Unusable(`There is no figure ${rest[0]}. The figures:\n  ${paths}`);
    }
    outside.print(laidOut(found));
    return 0;
  },
};

function laidOut(found: Why): string {
  const one = (value: unknown) =>
    Array.isArray(value) ? `${value.length} values` : value === null ? "none" : String(value);
  if (found.kind === "given") return `${found.path} = ${one(found.value)} (${found.origin})\n`;
  const symbols = Object.fromEntries(found.inputs.map((input) => [input.name, input.symbol]));
  const inputs = found.inputs.map(
    (input) =>
      `  ${input.symbol} = ${one(input.value)} ${input.unit}  ${input.meaning}  [${input.origin ?? input.path}]`,
  );
  return [
    `${found.title}: ${found.symbol} = ${one(found.value)} ${found.unit}`,
    `  ${filled(found.statement, { ...symbols, "=": found.symbol })}`,
    ...inputs,
    ...(found.method === null
      ? []
      : [`  method: ${found.method}`, `  residual ${found.residual}, bound ${found.residualBound}`]),
    `  holds: ${found.holds}`,
    `  source: ${citation(found.source)}`,
    "",
  ].join("\n");
}

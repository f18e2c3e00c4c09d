import { readWaveformCsv } from "../../file/waveformCsv.ts";
import {
  type ColumnField,
  type DividerDocument,
  parseQuantity,
  proveAt,
  type Through,
  throughDivider,
  type UnitName,
} from "../../solver/index.ts";
import { runJob } from "../../work/runJob.ts";
import { type Arguments, readArguments } from "../arguments.ts";
import { nested } from "../nested.ts";
import { needsDesign, openDocument, readText, refusalText } from "../openDocument.ts";
import { type Outside, Unusable, type Verb } from "../verb.ts";

export const prove: Verb = {
  name: "prove",
  does: "every computed figure, the findings and the cautions of the design",
  help: `prove FILE [--frequencies f,…] [--times t,…] [--waveform CSV] [--reference electrode|source]

Judges the design in FILE. Keys are listed in the README.
  --frequencies f,…   adds frequency.asked at these frequencies, e.g. 50,1k,1MHz
  --times t,…         adds step.asked at these times after an ideal step, e.g. 1n,10us,1m
  --waveform CSV      adds waveform: a recorded waveform (time and value, as an oscilloscope exports it) through the divider
  --reference R       where that waveform stands: at the electrode (default), or at the source behind its impedance
Exit 0: clear or caution. 1: a stop stands. 2: unusable input, or no design yet.
`,
  run(words, outside) {
    const { file, options } = readArguments(words, ["frequencies", "times", "waveform", "reference"]);
    const frequencies = listOf(options.frequencies, "frequencies", "Hz");
    const times = listOf(options.times, "times", "s");
    const document = openDocument(file, outside);
    needsDesign(document);
    const outcome = runJob({ kind: "prove", document, field: "solve" });
    if (!outcome.ok) throw new Unusable(refusalText(outcome.error));
    const proof = outcome.value.proof!;
    const seen = runJob({ kind: "speed", document, field: outcome.value.field });
    if (!seen.ok) throw new Unusable(refusalText(seen.error));
    const asked = proveAt(document, frequencies ?? [], times ?? [], outcome.value.field);
    const waveform = waveformOf(options, document, outcome.value.field, outside);
    const { sheet, frequency, step, ...rest } = proof;
    outside.print(
      `${JSON.stringify(
        {
          ...rest,
          ...nested(sheet),
          frequency: { ...frequency, ...(frequencies === null ? {} : { asked: asked.frequency }) },
          step: { ...step, ...(times === null ? {} : { asked: asked.step }) },
          ...(waveform === null ? {} : { waveform }),
          speed: seen.value.speed,
        },
        null,
        2,
      )}\n`,
    );
    return proof.level === "stop" ? 1 : 0;
  },
};

function waveformOf(
  { waveform, reference = "electrode" }: Arguments["options"],
  document: DividerDocument,
  field: ColumnField | null,
  outside: Outside,
): Through | null {
  if (reference !== "electrode" && reference !== "source")
    throw new Unusable(`--reference: "${reference}" is neither electrode nor source`);
  if (waveform === undefined) return null;
  const record = readWaveformCsv(readText(waveform, outside));
  if (!record.ok) throw new Unusable(`${waveform}: ${refusalText(record.error)}`);
  return throughDivider(document, record.value, field, reference);
}

function listOf(text: string | undefined, name: string, unit: UnitName): number[] | null {
  if (text === undefined) return null;
  return text.split(",").map((each) => {
    const parsed = parseQuantity(each, unit);
    if (parsed.kind === "value") return parsed.value;
    throw new Unusable(`--${name}: "${each}" is not understood${parsed.kind === "refused" ? `: ${parsed.why}` : ""}`);
  });
}

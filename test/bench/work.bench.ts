import { readFileSync } from "node:fs";
import { restoreDocument } from "../../src/file/restore.ts";
import {
  type DividerDocument,
  fieldAsked,
  isFieldOf,
  prove,
  size,
  solveColumnField,
  speed,
  takeCandidate,
  throughDivider,
} from "../../src/solver/index.ts";
import { jobsOf } from "../../src/work/outcomeOf.ts";
import { fixed, invented } from "../support/builders.ts";
import type { Benchmark } from "./benchmark.ts";
import { denseReference, frameReference } from "./network.bench.ts";

function demo(name: string) {
  const restored = restoreDocument(readFileSync(`demo/${name}.json`, "utf8"));
  if (restored.kind === "refused") throw new Error(restored.refusal.why);
  return restored.document;
}

const supply = demo("dc-supply-into-meter");
const pulse = demo("pulse-into-scope");

/** 60 equal elements of an invented family, 15 kV dc. */
const wide = invented({
  waveform: { nominal_V: 15000, greatest_Vpeak: 18000 },
  elements: 60,
  resistance_ohm: 20e6,
  branches: [fixed("R2a", 2.4e6), fixed("R2b", 2.4e6)],
});

const follow = jobsOf({
  size,
  prove,
  takeCandidate,
  fieldAsked,
  isFieldOf,
  solveField: solveColumnField,
  through: throughDivider,
  speed,
});
/** A keystroke in the voltage: searched, taken and proved anew, nothing remembered. */
function keystroke(document: DividerDocument) {
  const { design, brief } = document;
  let typed = 0;
  return () => {
    typed += 1;
    const waveform = { ...brief.waveform, nominal_V: brief.waveform.nominal_V + typed };
    const next = { ...document, brief: { ...brief, waveform }, design: { ...design!, follows: true } };
    const outcome = follow({ kind: "follow", document: next, top: 12 });
    if (!outcome.ok || outcome.value.proof === null) throw new Error("the demo cannot be followed");
    return outcome;
  };
}

const against = { referenceName: frameReference.name, reference: frameReference.run };
const frame = { referenceName: denseReference.name, reference: denseReference.run };

/**
 * What a keystroke costs in the worker. A frame of 16.7 ms was about 0.45 of the dense reference (38 ms) where
 * the bars were set: a proof fits into one, a search does not. The ratio travels to other machines, the milliseconds do not.
 */
export const workBenchmarks: readonly Benchmark[] = [
  { name: "prove, 60 elements", run: () => prove(wide), ...frame, bar: 0.45 },
  { name: "prove, pulse divider", run: () => prove(pulse), ...frame, bar: 0.45 },
  { name: "follow, dc, twelve candidates", run: keystroke(supply), ...frame, bar: 3 },
  { name: "follow, pulse, twelve candidates", run: keystroke(pulse), ...frame, bar: 6 },
  { name: "search, dc, best candidate", run: () => size(supply, { top: 1 }), ...against, bar: 25 },
  { name: "search, pulse, best candidate", run: () => size(pulse, { top: 1 }), ...against, bar: 40 },
];

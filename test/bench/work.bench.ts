import { readFileSync } from "node:fs";
import { restoreDocument } from "../../src/file/restore.ts";
import { prove, size, takeCandidate } from "../../src/solver/index.ts";
import type { Benchmark } from "./benchmark.ts";
import { frameReference } from "./network.bench.ts";

function demo(name: string) {
  const restored = restoreDocument(readFileSync(`demo/${name}.json`, "utf8"));
  if (restored.kind === "refused") throw new Error(restored.refusal.why);
  return restored.document;
}

const supply = demo("dc-supply-into-meter");
const pulse = demo("pulse-into-scope");

/** The demo with a candidate of about 60 elements. */
function sixty() {
  const sizing = size(supply, { top: 400 });
  if (!sizing.ok) throw new Error("the demo cannot be sized");
  const near = [...sizing.value.candidates].sort((a, b) => Math.abs(a.elements - 60) - Math.abs(b.elements - 60));
  return takeCandidate(supply, near[0]!);
}

const wide = sixty();
const against = { referenceName: frameReference.name, reference: frameReference.run };

/** What a keystroke costs in the worker. Both bars are generous multiples: the ratio is what is watched. */
export const workBenchmarks: readonly Benchmark[] = [
  { name: `prove, ${wide.design!.hvArm.elements.length} elements`, run: () => prove(wide), ...against, bar: 8 },
  { name: "prove, pulse divider", run: () => prove(pulse), ...against, bar: 8 },
  { name: "search, dc, best candidate", run: () => size(supply, { top: 1 }), ...against, bar: 25 },
  { name: "search, pulse, best candidate", run: () => size(pulse, { top: 1 }), ...against, bar: 40 },
];

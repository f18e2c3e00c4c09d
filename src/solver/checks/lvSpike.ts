import { edgeFormulas } from "./edgeFormulas.ts";
import { capacitorOf, type Judging, plainFinding } from "./judging.ts";
import { capacitanceOf } from "./lvArm.ts";
import type { Show } from "./show.ts";
import { wantedOf } from "./wanted.ts";

/** The LV capacitors' inductance against the edge. Writes `lvArm.resonance_Hz`, `lvArm.spikeShare`. */
export function judgeLvSpike(j: Judging, edge: string, show: Show): void {
  const { sheet, design } = j;
  const L2 = "/design/lvArm/inductance_H";
  sheet.given(L2, design.lvArm.inductance_H);
  sheet.derive("lvArm.resonance_Hz", edgeFormulas.lvResonance, { L2, C2: "lvArm.capacitanceFitted_F" });
  sheet.derive("lvArm.spikeShare", edgeFormulas.spike, {
    F: "scaleFactor.predicted",
    L2,
    C1: "hvArm.effectiveCapacitance_F",
    tr: edge,
  });
  const wanted = wantedOf(j.document.brief);
  if (wanted === null || sheet.number(edge) === null || sheet.number("lvArm.capacitanceFitted_F") === 0) return;
  if (design.lvArm.inductance_H === 0) notCounted(j, edge, wanted, show);
  else counted(j, edge, wanted, show);
}

function counted(j: Judging, edge: string, wanted: number, show: Show): void {
  const spike = j.sheet.number("lvArm.spikeShare") as number;
  const resonance = j.sheet.number("lvArm.resonance_Hz") as number;
  const rise_s = j.sheet.number(edge) as number;
  // The estimate holds while the edge's own frequency lies well below the resonance.
  const holds = 0.35 / rise_s < resonance / 3;
  plainFinding(j, {
    id: "lvArm.spike",
    level: spike > wanted ? (holds ? "stop" : "caution") : spike > wanted / 4 || !holds ? "caution" : "clear",
    what: "spike of the LV arm's inductance",
    actual: spike,
    limit: wanted,
    unit: "1",
    sense: "atMost",
    margin: 1 - spike / wanted,
    reason: `${show(j.design.lvArm.inductance_H, "H")} with the LV capacitors add ${show(spike, "1")} of the edge's height to an edge of ${show(rise_s, "s")}; ${show(wanted, "1")} is wanted. They resonate at ${show(resonance, "Hz")}${holds ? "" : ", too near the edge's own frequency for this estimate: the responses tell"}. Many small capacitors in a ring about the tap, without leads, have least.`,
    source: edgeFormulas.spike.source,
    path: "lvArm.spikeShare",
  });
}

/** What the fitted capacitors' own leads come to, side by side; null where a part states none. */
function partsInductance_H(j: Judging): number | null {
  let sum = 0;
  for (const branch of j.design.lvArm.branches) {
    if ("series" in branch || "trimmer" in branch || capacitanceOf(branch) === 0 || branch.part === "") continue;
    const { leadInductance_H } = capacitorOf(j, branch.part);
    if (!(leadInductance_H > 0)) return null;
    sum += 1 / leadInductance_H;
  }
  return sum === 0 ? null : 1 / sum;
}

function notCounted(j: Judging, edge: string, wanted: number, show: Show): void {
  const L2 = partsInductance_H(j);
  if (L2 === null) return;
  const spike = edgeFormulas.spike.compute({
    F: j.sheet.number("scaleFactor.predicted") as number,
    L2,
    C1: j.sheet.number("hvArm.effectiveCapacitance_F") as number,
    tr: j.sheet.number(edge) as number,
  }) as number;
  if (spike <= wanted / 4) return;
  plainFinding(j, {
    id: "lvArm.inductanceNotCounted",
    level: "caution",
    what: "inductance of the LV capacitors not counted",
    actual: spike,
    limit: wanted,
    unit: "1",
    sense: "atMost",
    margin: 1 - spike / wanted,
    reason: `The leads of the LV capacitors come to ${show(L2, "H")} side by side and would add about ${show(spike, "1")} to the edge; ${show(wanted, "1")} is wanted. It is not counted yet.`,
    source: edgeFormulas.spike.source,
    cure: {
      label: `count ${show(L2, "H")}`,
      edits: [{ pointer: "/design/lvArm/inductance_H", value: Number(L2.toPrecision(3)), origin: "catalogue" }],
    },
  });
}

import { judgeArmMismatch } from "../checks/armMismatch.ts";
import { judgeCable } from "../checks/cableLine.ts";
import { charge } from "../checks/charge.ts";
import type { ColumnField } from "../checks/columnField.ts";
import { edgeOnSheet } from "../checks/edge.ts";
import { worstFault } from "../checks/faultRow.ts";
import { faults } from "../checks/faults.ts";
import { instrumentRows } from "../checks/instruments.ts";
import { insulation } from "../checks/insulation.ts";
import { type Judging, judging } from "../checks/judging.ts";
import { judgeLead } from "../checks/lead.ts";
import { judgeLoading, loading } from "../checks/loading.ts";
import { judgeLvArm } from "../checks/lvArm.ts";
import { judgeLvSpike } from "../checks/lvSpike.ts";
import { misuse } from "../checks/misuse.ts";
import { networkOf } from "../checks/networkOf.ts";
import { judgeProtectors } from "../checks/protectors.ts";
import { proximityOf } from "../checks/proximity.ts";
import { scaleFactor, scaleFactorUncertainty } from "../checks/scaleFactor.ts";
import { type Show, show } from "../checks/show.ts";
import { judgeSlowFast } from "../checks/slowFast.ts";
import { judgeStepSharing } from "../checks/stepSharing.ts";
import { judgeStress } from "../checks/stress.ts";
import { stringCapacitance } from "../checks/stringCapacitance.ts";
import { workingVoltages } from "../checks/workingVoltage.ts";
import type { DividerDocument } from "../job/document.ts";
import { ok, type Result, refuse } from "../quantities/result.ts";
import { type Level, worstFirst } from "../standards/finding.ts";
import { cautions } from "./cautions.ts";
import { graded } from "./graded.ts";
import { greatestInput } from "./greatestInput.ts";
import { instrumentReach } from "./instrumentReach.ts";
import { jobSentence } from "./jobSentence.ts";
import { noResistance } from "./noResistance.ts";
import type { Proof } from "./proof.ts";
import { response } from "./response.ts";
import { judgeUncertainty } from "./uncertainty.ts";

/**
 * Judges a document's design: every figure with its trace, the responses, the fault table, the findings and the cautions.
 * Strays that come from the field of the drawing need it solved (`solveColumnField`); without it the closed formula stands in, and is said.
 * Refuses a document without a design, with a part or a principal instrument that it does not hold, with a wire for a resistor. Pure.
 */
export function prove(document: DividerDocument, field: ColumnField | null = null): Result<Proof> {
  const refused = unusable(document);
  if (refused !== null) return refused;
  const j = judging(document, field);
  const working = workingVoltages(document.brief, j.sheet);
  scaleFactor(j);
  loading(j);
  const string = stringCapacitance(j);
  judgeStress(j, working, show);
  scaleFactorUncertainty(j);
  judgeUncertainty(j, show);
  judgeLoading(j, show);
  insulation(j, show);
  judgeLvArm(j);
  judgeProtectors(j, show);
  misuse(j, show);
  const rows = faults(j, string, show);
  charge(j, show);
  const network = networkOf(j, string);
  const { frequency, step, matches } = response(j, network, show);
  judgeEdge(j, show);
  judgeStepSharing(j, network, show);
  judgeSlowFast(j, network, show);
  judgeArmMismatch(j);
  const proximity = proximityOf(j, string);
  const greatest = greatestInput(j, network);
  const reach = instrumentReach(j, string);
  const findings = worstFirst(j.findings);
  return ok({
    job: jobSentence(document.brief, j.instrument),
    sheet: j.sheet.data(),
    origins: document.origins,
    assumed: Object.keys(document.origins).filter((pointer) => document.origins[pointer] === "assumed"),
    frequency,
    step,
    matches,
    reach,
    instruments: instrumentRows(j),
    faults: rows,
    proximity,
    greatestInput: greatest,
    graded: graded(j, network),
    worstFault: worstFault(rows),
    findings,
    cautions,
    level: findings.reduce<Level>(
      (worst, finding) => (rank[finding.level] < rank[worst] ? finding.level : worst),
      "clear",
    ),
  });
}

/** The cable, the HV lead and the LV arm's inductance against the edge; needs the figures of the response. */
function judgeEdge(j: Judging, show: Show): void {
  const edge = edgeOnSheet(j);
  judgeCable(j, edge, show);
  judgeLead(j, show);
  judgeLvSpike(j, edge, show);
}

const rank: Record<Level, number> = { stop: 0, caution: 1, clear: 2 };

function unusable(document: DividerDocument): Result<never> | null {
  const { design } = document;
  if (design === null) return refuse("/design", "There is no design yet.", "Size it first: size FILE --take 1.");
  if (design.hvArm.elements.length === 0) {
    return refuse(
      "/design/hvArm/elements",
      "The HV arm has no element.",
      "Give at least one, or size the design again.",
    );
  }
  if (!document.instruments.some((each) => each.id === document.principal)) {
    return refuse(
      "/principal",
      `The principal instrument "${document.principal}" is not among the instruments.`,
      `Name one of: ${document.instruments.map((each) => each.id).join(", ") || "(none: add one)"}.`,
    );
  }
  return missingPart(document) ?? noResistance(design);
}

/** Every part that the design names must be held by the document, and be of the right kind. */
function missingPart(document: DividerDocument): Result<never> | null {
  const kinds = new Map(document.parts.map((part) => [part.id, part.kind]));
  const design = document.design!;
  const named: [string, string, string][] = [];
  design.hvArm.elements.forEach((element, i) => {
    named.push([`/design/hvArm/elements/${i}/part`, element.part, "resistor"]);
    if (element.capacitor !== null)
      named.push([`/design/hvArm/elements/${i}/capacitor`, element.capacitor, "capacitor"]);
  });
  design.lvArm.branches.forEach((branch, b) => {
    const at = `/design/lvArm/branches/${b}`;
    if (!("series" in branch)) {
      // A capacitor of the LV arm may stand as a value before its part is chosen.
      if (branch.part === "") return;
      named.push([`${at}/part`, branch.part, "trimmer" in branch ? "trimmer" : "capacitor"]);
      return;
    }
    branch.series.forEach((item, i) => {
      named.push([`${at}/series/${i}/part`, item.part, "rheostat" in item ? "trimmer" : "resistor"]);
    });
  });
  design.protectors.forEach((fitted, i) => {
    named.push([`/design/protectors/${i}/part`, fitted.part, "protector"]);
  });
  for (const [where, id, kind] of named) {
    if (kinds.get(id) === kind) continue;
    const why = kinds.has(id)
      ? `The part "${id}" is a ${kinds.get(id)}, not a ${kind}.`
      : `The document holds no part "${id}".`;
    return refuse(where, why, `Add the ${kind} to /parts with every rating, or name another.`);
  }
  return null;
}

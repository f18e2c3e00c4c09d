import { edgeSharing } from "../network/edgeSharing.ts";
import type { LadderNetwork } from "../network/ladderNetwork.ts";
import { formatShare } from "../quantities/format.ts";
import type { Cure } from "../standards/finding.ts";
import { formula, type Solution } from "../standards/formula.ts";
import { computedHere } from "../standards/source.ts";
import { type Judging, judgeLimit } from "./judging.ts";
import type { Show } from "./show.ts";
import { iec60115 } from "./stressFormulas.ts";

export const edgeShareRecord: Solution = {
  id: "stepSharing.share",
  title: "Share of each element in a sudden edge",
  statement: "C_i (v_i − v_(i−1)) = C_(i+1) (v_(i+1) − v_i) − C_e,i v_i + C_h,i (V − v_i) at every inner node",
  method: "Elimination from the electrode to the tap and back, capacitances alone; resistances where a node has none.",
  holds: "The instant of an ideal edge; afterwards the resistors take over.",
  source: computedHere("capacitive ladder at the instant of an edge"),
  residualBound: 1e-9,
};

export const stepSharingFormulas = {
  voltage: formula({
    id: "stepSharing.voltage",
    title: "Element voltage at the instant of an edge",
    statement: "{=} = {s} · {V}",
    result: { symbol: "V_e", unit: "V", meaning: "element voltage" },
    inputs: {
      s: { symbol: "s_e", unit: "1", meaning: "share of the element in a sudden edge" },
      V: { symbol: "V_pk", unit: "V", meaning: "greatest peak, come all at once" },
    },
    holds: "An edge faster than the string's own time constants; a slower one is shared better.",
    source: computedHere("share of the whole"),
    compute: ({ s, V }) => s * V,
  }),
};

/** Whether edges are what is measured; else one comes only where the voltage is touched on. */
const edgesBelong = (j: Judging): boolean => ["pulse", "square", "recorded"].includes(j.document.brief.waveform.kind);

/** The basis that a document has: its own edges, or hot contact. */
export const edgePath = (j: Judging): "element.voltage_Vstep" | "element.voltage_VhotContact" =>
  edgesBelong(j) ? "element.voltage_Vstep" : "element.voltage_VhotContact";

/** Each element at the instant of an edge of the greatest peak, against its limit. Writes `element.edgeShare` and the voltage. */
export function judgeStepSharing(j: Judging, network: LadderNetwork, show: Show): void {
  const { sheet } = j;
  const { element, tap } = edgeSharing(network);
  const residual = Math.abs(element.reduce((sum, share) => sum + share, tap) - 1);
  sheet.solved(
    "element.edgeShare",
    edgeShareRecord,
    element,
    { C: "element.capacitance_F", Ce: "strays.eachToEarth_F", Ch: "strays.eachToElectrode_F" },
    residual,
  );
  const path = edgePath(j);
  const inputs = { s: "element.edgeShare", V: "working.greatest_Vpeak" };
  sheet.deriveEach(path, stepSharingFormulas.voltage, inputs, element.length);
  const own = edgesBelong(j);
  const even = 1 / element.length;
  const compensated = j.design.hvArm.elements.every((each) => each.capacitance_F > 0);
  const relieved = slowEdge(j);
  const found = judgeLimit(
    j,
    {
      id: own ? "element.voltage.step" : "element.voltage.hotContact",
      what: own ? "element voltage, step sharing" : "element voltage, hot contact",
      path,
      limitPath: "element.ratedVoltage_Vpeak",
      unit: "V",
      sense: "atMost",
      statedMargin: 1 - j.document.brief.policy.voltageDerating,
      source: iec60115,
      reason: (actual, limit, at) =>
        `${own ? "At the instant of an edge" : "Where the voltage is touched on or breaks in at once,"} element ${at} takes ${actual}, ` +
        `${formatShare(element[(at ?? 1) - 1]!)} of it instead of ${formatShare(even)}; its part is rated ${limit} on this basis. ` +
        `The strays of the column decide it${relieved ? "; the stated edge is slow against the string, which shares it better" : ""}.${compensated ? "" : " "}` +
        (own
          ? "Fit a capacitor across each element."
          : "Raise the voltage slowly, or fit a capacitor across each element."),
      cure: compensate,
    },
    show,
  );
  // A voltage that is raised slowly never meets it: a warning, no limit of the job.
  if (found?.level === "stop" && (!own || relieved))
    j.findings[j.findings.indexOf(found)] = { ...found, level: "caution" };
}

const compensate: Cure = {
  label: "compensate every element",
  edits: [{ pointer: "/brief/policy/compensation", value: "always" }],
  sizeAgain: true,
};

/** Whether the stated edge takes longer than the string needs to share by its resistors. */
function slowEdge(j: Judging): boolean {
  const { riseTime_s } = j.document.brief.waveform;
  if (riseTime_s === null) return false;
  const { elements } = j.design.hvArm;
  const C = j.sheet.array("element.capacitance_F");
  const own = elements.reduce((most, each, i) => Math.max(most, each.resistance_ohm * (C[i] ?? 0)), 0);
  const R1 = j.sheet.number("hvArm.resistance_ohm") as number;
  const strays = j.sheet.array("strays.eachToEarth_F").reduce<number>((sum, c) => sum + (c ?? 0), 0);
  return riseTime_s > 3 * (own + (R1 * strays) / Math.PI ** 2);
}

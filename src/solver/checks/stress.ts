import { givenPerElement, type Judging, judgeLimit, plainFinding, resistorOf } from "./judging.ts";
import { dutyStated } from "./pulseTrain.ts";
import type { Show } from "./show.ts";
import { iec60115, resistanceAbove, stressFormulas } from "./stressFormulas.ts";
import type { WorkingVoltages } from "./workingVoltage.ts";

/** Element voltages on each basis and dissipation, their limits, and the findings. Needs `input.resistance_ohm`. */
export function judgeStress(j: Judging, working: WorkingVoltages, show: Show): void {
  const { sheet, design, document } = j;
  const { elements } = design.hvArm;
  const n = elements.length;
  const { waveform, policy, surroundings } = document.brief;
  const f = stressFormulas;
  const Re = "/design/hvArm/elements/*/resistance_ohm";
  const share = { Re, p: "/design/hvArm/strings", Rin: "input.resistance_ohm" };
  sheet.deriveEach("element.voltage_Vdc", f.elementVoltage, { V: "working.dc_V", ...share }, n);
  sheet.deriveEach("element.voltage_Vrms", f.elementVoltage, { V: "working.rms_V", ...share }, n);
  sheet.deriveEach("element.voltage_Vpeak", f.elementVoltage, { V: "working.peak_V", ...share }, n);
  sheet.deriveEach("element.greatest_Vpeak", f.elementVoltage, { V: "working.greatest_Vpeak", ...share }, n);
  sheet.deriveEach("element.greatestRms_V", f.elementVoltage, { V: "working.greatestRms_V", ...share }, n);
  potentials(j);

  sheet.given("/brief/policy/voltageDerating", policy.voltageDerating);
  sheet.given("/brief/policy/powerDerating", policy.powerDerating);
  sheet.given("/brief/surroundings/ambient_degC", surroundings.ambient_degC);
  sheet.given("/brief/surroundings/ambientSpan_K", surroundings.ambientSpan_K);
  sheet.derive("element.hottest_degC", f.hottest, {
    T: "/brief/surroundings/ambient_degC",
    s: "/brief/surroundings/ambientSpan_K",
  });
  const Vlim = givenPerElement(j, "limitingVoltage_V", (part) => part.limitingVoltage_V);
  sheet.given("/brief/waveform/kind:limitOverRms", 1);
  sheet.given("/brief/waveform/kind:limitOverPeak", waveform.kind === "sine" ? Math.SQRT2 : 1);
  sheet.deriveEach("element.ratedVoltage_V", f.voltageLimit, { Vlim, k: "/brief/waveform/kind:limitOverRms" }, n);
  sheet.deriveEach("element.ratedVoltage_Vpeak", f.voltageLimit, { Vlim, k: "/brief/waveform/kind:limitOverPeak" }, n);
  const d = "/brief/policy/voltageDerating";
  sheet.deriveEach("element.voltageLimit_V", f.deratedVoltage, { d, Vlim: "element.ratedVoltage_V" }, n);
  sheet.deriveEach("element.voltageLimit_Vpeak", f.deratedVoltage, { d, Vlim: "element.ratedVoltage_Vpeak" }, n);

  sheet.deriveEach("element.dissipation_W", f.dissipation, { V: "element.greatestRms_V", Re }, n);
  const rating = {
    P: givenPerElement(j, "ratedDissipation_W", (part) => part.ratedDissipation_W),
    Tr: givenPerElement(j, "deratingFrom_degC", (part) => part.deratingFrom_degC),
    Tz: givenPerElement(j, "zeroDissipation_degC", (part) => part.zeroDissipation_degC),
    T: "element.hottest_degC",
  };
  sheet.deriveEach("element.ratedDissipation_W", f.dissipationRating, rating, n);
  sheet.deriveEach(
    "element.dissipationLimit_W",
    f.deratedDissipation,
    { d: "/brief/policy/powerDerating", P: "element.ratedDissipation_W" },
    n,
  );
  sheet.deriveEach("element.criticalResistance_ohm", f.critical, { dv: d, Vlim, P: "element.dissipationLimit_W" }, n);
  stressFindings(j, working, show);
  unrated(j);
}

/** Potentials from the electrode downwards: the resistance above each upper end, summed from the top. */
function potentials(j: Judging): void {
  const { elements, strings } = j.design.hvArm;
  const above = new Array<number>(elements.length);
  let sum = 0;
  for (let i = elements.length - 1; i >= 0; i--) {
    above[i] = sum;
    sum += elements[i]!.resistance_ohm / strings;
  }
  j.sheet.solved(
    "element.resistanceAbove_ohm",
    resistanceAbove,
    above,
    { Re: "/design/hvArm/elements/*/resistance_ohm" },
    0,
  );
  j.sheet.deriveEach(
    "element.nodePotential_V",
    stressFormulas.potential,
    { V: "working.peak_V", Rin: "input.resistance_ohm", above: "element.resistanceAbove_ohm" },
    elements.length,
  );
}

function stressFindings(j: Judging, working: WorkingVoltages, show: Show): void {
  const { policy } = j.document.brief;
  const cure = { label: "size again", edits: [], sizeAgain: true };
  const common = {
    sense: "atMost" as const,
    statedMargin: 1 - policy.voltageDerating,
    source: iec60115,
    unit: "V",
    cure,
  };
  const text = (basis: string) => (actual: string, limit: string, element: number | null) =>
    `Element ${element} stands ${actual} ${basis} at the greatest voltage; the part is rated ${limit} on this basis, ` +
    `and ${Math.round(policy.voltageDerating * 100)} % of it is to be used. ${whichRules(j, element, show)}`;
  if (working.greatestRms_V > 0) {
    judgeLimit(
      j,
      {
        ...common,
        id: "element.voltage.rms",
        what: "element voltage, dc or rms",
        path: "element.greatestRms_V",
        limitPath: "element.ratedVoltage_V",
        reason: text("dc or rms"),
      },
      show,
    );
  }
  judgeLimit(
    j,
    {
      ...common,
      id: "element.voltage.peak",
      what: "element voltage, peak",
      path: "element.greatest_Vpeak",
      limitPath: "element.ratedVoltage_Vpeak",
      reason: text("peak"),
    },
    show,
  );
  if (!dutyStated(j.document.brief.waveform)) return;
  judgeLimit(
    j,
    {
      ...common,
      id: "element.dissipation",
      what: "element dissipation",
      unit: "W",
      statedMargin: 1 - policy.powerDerating,
      path: "element.dissipation_W",
      limitPath: "element.ratedDissipation_W",
      reason: (actual, limit, element) =>
        `Element ${element} dissipates ${actual} at the greatest voltage; ${limit} is allowed at the hottest ambient, ` +
        `and ${Math.round(policy.powerDerating * 100)} % of it is to be used.`,
    },
    show,
  );
}

/** An element whose part states no limiting voltage: no figure to judge it by, so no limit is shown to be met. */
function unrated(j: Judging): void {
  const { elements } = j.design.hvArm;
  const at = elements.findIndex((element) => resistorOf(j, element.part).limitingVoltage_V === null);
  if (at < 0) return;
  const part = resistorOf(j, elements[at]!.part);
  plainFinding(j, {
    id: "element.voltage.notStated",
    level: "stop",
    what: "limiting element voltage not stated",
    reason: `${part.name} states no limiting element voltage, so the voltage on element ${at + 1} cannot be judged. Type it from the data sheet.`,
    source: iec60115,
    element: at + 1,
  });
}

/** Whether voltage or dissipation rules this value, and where the two cross. */
function whichRules(j: Judging, element: number | null, show: Show): string {
  const i = (element ?? 1) - 1;
  const crossing = j.sheet.array("element.criticalResistance_ohm")[i];
  if (crossing === null || crossing === undefined) return "";
  const R = j.design.hvArm.elements[i]!.resistance_ohm;
  return `Above the critical resistance of ${show(crossing, "ohm")} the voltage rules, below it the dissipation: ${R >= crossing ? "the voltage" : "the dissipation"} here.`;
}

import { formula, type Solution } from "../standards/formula.ts";
import { computedHere, type Source } from "../standards/source.ts";
import { givenPerElement, type Judging, judgeLimit } from "./judging.ts";
import type { Show } from "./show.ts";
import type { WorkingVoltages } from "./workingVoltage.ts";

const iec60115: Source = {
  title: "IEC 60115-1",
  edition: "ed. 5 (2020)",
  clause: "limiting element voltage, rated dissipation, category temperature",
  status: "from memory",
};
const V = (symbol: string, meaning: string) => ({ symbol, unit: "V", meaning });
const ohm = (symbol: string, meaning: string) => ({ symbol, unit: "ohm", meaning });
const W = (symbol: string, meaning: string) => ({ symbol, unit: "W", meaning });
const one = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });
const degC = (symbol: string, meaning: string) => ({ symbol, unit: "degC", meaning });

export const stressFormulas = {
  elementVoltage: formula({
    id: "stress.elementVoltage",
    title: "Voltage of an element",
    statement: "{=} = {V} · {Re} / ({p} · {Rin})",
    result: V("V_e", "voltage across one element"),
    inputs: {
      V: V("V", "voltage at the electrode"),
      Re: ohm("R_e", "element resistance"),
      p: one("p", "strings in parallel"),
      Rin: ohm("R_in", "input resistance of the divider"),
    },
    holds: "Slow against R·C of the string, or capacitors in proportion to the resistors.",
    source: computedHere("series resistors share the voltage as their values"),
    compute: ({ V, Re, p, Rin }) => (V * Re) / (p * Rin),
  }),
  dissipation: formula({
    id: "stress.dissipation",
    title: "Dissipation of an element",
    statement: "{=} = {V}² / {Re}",
    result: W("P_e", "dissipation of one element"),
    inputs: { V: V("V_e", "element voltage, rms, at the greatest voltage"), Re: ohm("R_e", "element resistance") },
    holds: "Steady or repeated; single shots are judged by energy.",
    source: computedHere("Joule's law"),
    compute: ({ V, Re }) => (V * V) / Re,
  }),
  voltageLimit: formula({
    id: "stress.voltageLimit",
    title: "Element voltage that may stand continuously",
    statement: "{=} = {Vlim} · {k}",
    result: V("V_e,max", "limit on this basis"),
    inputs: {
      Vlim: V("V_lim", "limiting element voltage, dc or rms"),
      k: one("k", "√2 for the peak of a sine, else 1"),
    },
    holds: "Up to the dissipation limit; pulses by their peak, no overload figure is used.",
    source: iec60115,
    compute: ({ Vlim, k }) => Vlim * k,
  }),
  deratedVoltage: formula({
    id: "stress.deratedVoltage",
    title: "Element voltage limit, derated",
    statement: "{=} = {d} · {Vlim}",
    result: V("V_e,der", "derated limit"),
    inputs: { d: one("d_v", "voltage derating"), Vlim: V("V_e,max", "limit on this basis") },
    holds: "The derating is the engineer's policy.",
    source: iec60115,
    compute: ({ d, Vlim }) => d * Vlim,
  }),
  dissipationRating: formula({
    id: "stress.dissipationRating",
    title: "Dissipation allowed at the ambient temperature",
    statement: "{=} = {P} · ({Tz} − {T}) / ({Tz} − {Tr}), at most {P}",
    result: W("P_T", "dissipation allowed at the hottest ambient"),
    inputs: {
      P: W("P_70", "rated dissipation"),
      Tr: degC("T_r", "temperature up to which it holds"),
      Tz: degC("T_z", "temperature at which none is left"),
      T: degC("T", "hottest ambient"),
    },
    holds: "Free air; between the rated and the zero-dissipation temperature on a straight line, none above.",
    source: iec60115,
    compute: ({ P, Tr, Tz, T }) => (T <= Tr ? P : T >= Tz ? 0 : (P * (Tz - T)) / (Tz - Tr)),
  }),
  deratedDissipation: formula({
    id: "stress.deratedDissipation",
    title: "Element dissipation limit, derated",
    statement: "{=} = {d} · {P}",
    result: W("P_der", "derated limit"),
    inputs: { d: one("d_p", "dissipation derating"), P: W("P_T", "dissipation allowed at the hottest ambient") },
    holds: "The derating is the engineer's policy.",
    source: iec60115,
    compute: ({ d, P }) => d * P,
  }),
  hottest: formula({
    id: "stress.hottestAmbient",
    title: "Hottest ambient",
    statement: "{=} = {T} + {s}",
    result: degC("T", "hottest ambient"),
    inputs: { T: degC("T_a", "ambient"), s: { symbol: "ΔT", unit: "K", meaning: "half-width of its span" } },
    holds: "Outside the enclosure, before self-heating.",
    source: computedHere("upper end of the ambient span"),
    compute: ({ T, s }) => T + s,
  }),
  potential: formula({
    id: "stress.nodePotential",
    title: "Potential of an element's upper end",
    statement: "{=} = {V} · ({Rin} − {above}) / {Rin}",
    result: V("V_i", "potential against earth"),
    inputs: {
      V: V("V", "voltage at the electrode"),
      Rin: ohm("R_in", "input resistance"),
      above: ohm("R_above", "resistance between this point and the electrode"),
    },
    holds: "dc, or slow against R·C of the string.",
    source: computedHere("series resistors share the voltage as their values"),
    compute: ({ V, Rin, above }) => (V * (Rin - above)) / Rin,
  }),
};

export const resistanceAbove: Solution = {
  id: "stress.resistanceAbove",
  title: "Resistance between an element's upper end and the electrode",
  statement: "R_above,i = Σ_(k>i) R_k / p",
  method: "Running sum from the electrode down.",
  holds: "Equal strings in parallel.",
  source: computedHere("series sum"),
  residualBound: 0,
};

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
  stressFindings(j, working, show);
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
    `and ${Math.round(policy.voltageDerating * 100)} % of it is to be used.`;
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

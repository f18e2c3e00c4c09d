import type { Finding, FrequencyResponse, Proof, StepResponse } from "../../src/solver/index.ts";
import { practice } from "../../src/solver/standards/source.ts";

const count = 12;
const each = (f: (i: number) => number) => Array.from({ length: count }, (_, i) => f(i));

const frequency_Hz = Array.from({ length: 361 }, (_, k) => Number((10 ** (k / 40)).toPrecision(12)));

/** A shelf of −0.4 dB about 30 kHz and a pole at 31 MHz. */
export const inventedResponse: FrequencyResponse = {
  frequency_Hz,
  magnitude_dB: frequency_Hz.map((f) => {
    const shelf = 0.4 * ((f / 3e4) ** 2 / (1 + (f / 3e4) ** 2));
    return -shelf - 10 * Math.log10(1 + (f / 31e6) ** 2);
  }),
  phase_deg: frequency_Hz.map((f) => (-180 / Math.PI) * (Math.atan(f / 31e6) + 0.04 * Math.atan(f / 3e4))),
  inputImpedance_ohm: frequency_Hz.map((f) => 120e6 / Math.hypot(1, 2 * Math.PI * f * 120e6 * 20e-12)),
  sentence: "Flat within 0.4 dB from dc to 3.1 MHz; −3 dB at 30 MHz.",
};

const times = (from: number, decades: number) =>
  Array.from({ length: decades * 40 + 1 }, (_, k) => Number((10 ** (from + k / 40)).toPrecision(12)));

export const inventedStep: StepResponse = {
  fast: {
    time_s: times(-9, 4),
    value: times(-9, 4).map((t) => 0.955 * (1 - Math.exp(-t / 5e-9) * Math.cos(t / 9e-9))),
  },
  slow: { time_s: times(-6, 6), value: times(-6, 6).map((t) => 1 - 0.045 * Math.exp(-t / 5e-6)) },
  sentence: "Rises in 11 ns, overshoots by 6 %, lies 4.5 % low after the edge and comes within 1 % after 7.5 µs.",
};

const finding = (over: Partial<Finding>): Finding => ({
  id: "element.voltage.peak",
  level: "clear",
  what: "element voltage, peak",
  actual: 2000,
  limit: 2970,
  unit: "V",
  sense: "atMost",
  margin: 0.33,
  reason: "The hardest-used element stands at 2.00 kV of 2.97 kV allowed.",
  source: practice("limiting voltage × √2 × derating"),
  cure: null,
  path: "element.voltage_Vpeak",
  ...over,
});

export const inventedProof: Proof = {
  job: "Peak of a 20 kV pulse, 100 ns edge, into a scope, within 3 %",
  sheet: {
    values: {
      "working.peak_V": 24e3,
      "hvArm.resistance_ohm": 120e6,
      "hvArm.columnLength_m": 0.3,
      "element.voltage_Vdc": each(() => 0),
      "element.voltage_Vrms": each(() => 166),
      "element.voltage_Vpeak": each((i) => 1700 + 1500 * (i / 11) ** 4),
      "element.greatestRms_V": each(() => 166),
      "element.greatest_Vpeak": each((i) => 1700 + 1500 * (i / 11) ** 4),
      "element.voltageLimit_V": each(() => 2100),
      "element.voltageLimit_Vpeak": each(() => 2970),
      "element.dissipation_W": each((i) => 0.3 + 0.01 * i),
      "element.dissipationLimit_W": each(() => 0.5),
      "lvArm.wanted_ohm": 120.12e3,
      "lvArm.fitted_ohm": 137.3e3,
      "lvArm.withInstrument_ohm": 120.7e3,
      "lvArm.capacitanceResponseTime_F": 19.4e-9,
      "lvArm.capacitanceHighFrequency_F": 18.2e-9,
      "lvArm.capacitanceFlattest_F": 18.6e-9,
      "lvArm.capacitanceFitted_F": 18.5e-9,
      "scaleFactor.predicted": 1000.4,
      "scaleFactor.deviation": 0.0004,
      "response.bandwidth_Hz": 30e6,
      "response.bandDeviation_dB": 0.45,
      "insulation.clearance_m": 0.041,
      "insulation.creepage_m": 0.5,
      "insulation.elementCreepage_m": 0.021,
      "insulation.elementClearance_m": 0.004,
    },
    traces: {},
  },
  origins: {},
  assumed: ["/brief/source/capacitance_F"],
  frequency: inventedResponse,
  step: inventedStep,
  instruments: [
    {
      id: "scope",
      name: "bench oscilloscope",
      principal: true,
      scaleFactor: 1000.4,
      readingAtWorking_V: 19.99,
      readingAtGreatest_Vpeak: 23.99,
      greatestInput_Vpeak: 300,
      errorIfReused: 0,
    },
    {
      id: "meter",
      name: "hand meter, dc",
      principal: false,
      scaleFactor: 891.2,
      readingAtWorking_V: 22.44,
      readingAtGreatest_Vpeak: 26.93,
      greatestInput_Vpeak: 1000,
      errorIfReused: 0.1225,
    },
  ],
  faults: [
    fault(
      "lv.R2a.open",
      "LV resistor R2a open",
      0,
      43.2,
      24,
      "caution",
      "Reads 80 % high; the instrument stays within its 300 V.",
    ),
    fault(
      "lvArmLost",
      "whole LV arm open",
      0,
      198,
      5700,
      "stop",
      "5.7 kV at the instrument on a fast edge; it may see 300 V.",
    ),
    fault(
      "element.12.short",
      "element 12 shorted",
      12,
      26.2,
      24.6,
      "clear",
      "Reads 9.1 % high; the others take 2.2 kV each.",
    ),
    fault(
      "element.1.open",
      "an element open",
      1,
      0,
      22.9,
      "caution",
      "Reads zero at dc while the full voltage stands on the divider.",
    ),
    fault(
      "earth.open",
      "earth bond open",
      0,
      24,
      24,
      "stop",
      "Silent: the reading is unchanged while the case rises to 24 kV.",
    ),
  ],
  proximity: [{ what: "wall", distance_m: 0.66, strayChange: 0.08, readingChange: -0.012 }],
  greatestInput: {
    frequency_Hz: [10, 1e3, 1e6],
    greatest_Vpeak: [60e3, 50e3, 5e3],
    decidedBy: ["element voltage", "element voltage", "capacitor heat"],
    element: [24, 24, 1],
    sentence: "60 kV peak at 10 Hz, set by element voltage.",
  },
  graded: null,
  worstFault: null,
  findings: [
    finding({
      id: "creepage.column",
      level: "stop",
      what: "creepage along the column",
      actual: 0.3,
      limit: 0.5,
      unit: "m",
      sense: "atLeast",
      margin: -0.67,
      reason: "The column offers 300 mm of surface; 500 mm is asked at pollution degree 2, material group IIIa.",
      source: {
        title: "IEC 60664-1",
        edition: "ed. 3 (2020)",
        clause: "table F.5",
        status: "figures from a secondary copy, primary not seen",
      },
      cure: { label: "add 8 elements", edits: [{ pointer: "/design/follows", value: false }] },
      path: "insulation.creepage_m",
    }),
    finding({ id: "element.voltage.peak", level: "stop", actual: 3200, limit: 2970, margin: -0.077, element: 12 }),
    finding({
      id: "source.sag",
      level: "caution",
      what: "source sag",
      actual: 0.0001,
      limit: 0.03,
      unit: "1",
      margin: 0.99,
      reason: "Rests on an assumed source resistance.",
    }),
    finding({
      id: "clearance.column",
      what: "clearance along the column",
      actual: 0.24,
      limit: 0.041,
      unit: "m",
      sense: "atLeast",
      margin: 0.83,
      reason: "240 mm of air between top electrode and foot.",
      path: "insulation.clearance_m",
    }),
    finding({
      id: "element.dissipation",
      what: "element dissipation",
      actual: 0.41,
      limit: 0.5,
      unit: "W",
      margin: 0.18,
    }),
  ],
  cautions: [
    {
      id: "zero",
      text: "A zero reading does not mean that the voltage is off.",
      where: ["prove", "build", "calibrate", "use"],
    },
    {
      id: "people",
      text: "Work by qualified persons, not alone, under local codes and licensed practice.",
      where: ["prove", "build", "calibrate", "use"],
    },
    {
      id: "earth",
      text: "Earth first: divider base and instrument, by two independent bonds; never lift an instrument's protective earth.",
      where: ["prove", "build"],
    },
  ],
  level: "stop",
};

function fault(
  id: string,
  name: string,
  element: number,
  output_V: number,
  fastOutput_V: number,
  level: Proof["level"],
  sentence: string,
): Proof["faults"][number] {
  return {
    id,
    name,
    element,
    single: id !== "lvArmLost",
    output_V,
    fastOutput_V,
    greatestElementVoltage_V: 2000,
    outputShare: output_V / 24,
    readsZeroWhileLive: output_V === 0,
    level,
    sentence,
  };
}

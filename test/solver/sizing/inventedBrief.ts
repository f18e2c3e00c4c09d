import type { Brief } from "../../../src/solver/job/brief.ts";
import type { DividerDocument } from "../../../src/solver/job/document.ts";
import type { Instrument } from "../../../src/solver/job/instrument.ts";
import type { Part, ResistorFamily } from "../../../src/solver/job/part.ts";

/** Invented families and briefs for the search; plausible, of no maker. */
export const family = (id: string, over: Partial<ResistorFamily>): ResistorFamily => ({
  id,
  kind: "resistor",
  name: id,
  origin: "typed",
  tolerance: 0.01,
  bodyLength_m: 0.3,
  bodyDiameter_m: 0.008,
  least_ohm: 1e3,
  greatest_ohm: 1e9,
  series: "E24",
  seriesAbove: null,
  ratedDissipation_W: 1,
  deratingFrom_degC: 70,
  zeroDissipation_degC: 155,
  limitingVoltage_V: 3500,
  temperatureCoefficient_per_K: 0,
  voltageCoefficient_per_V: -1e-6,
  thermalResistance_K_per_W: 100,
  selfCapacitance_F: 0.3e-12,
  leadSpace_m: 0.004,
  use: "divider",
  ...over,
});

export const trim: Part = {
  id: "trim",
  kind: "trimmer",
  name: "rheostat",
  origin: "typed",
  tolerance: 0.1,
  bodyLength_m: 0.01,
  bodyDiameter_m: 0.01,
  quantity: "ohm",
  spans: [100, 200, 500, 1e3, 2e3, 5e3, 1e4, 2e4, 5e4, 1e5, 1.5e5, 2e5, 5e5, 1e6, 2e6],
  leastShare: 0,
  turns: 25,
  ratedVoltage_V: 300,
};

/** Small resistor for the LV arm; of no use in a string, its body is too short and it stands 10 V. */
export const lvResistor = family("lv", {
  bodyLength_m: 0.001,
  limitingVoltage_V: 350,
  greatest_ohm: 10e6,
  tolerance: 0.01,
});

export const meter: Instrument = {
  id: "meter",
  name: "hand meter",
  function: "meter dc",
  range_V: 60,
  resistance_ohm: 10e6,
  resistanceSpread: 0.01,
  capacitance_F: 50e-12,
  capacitanceSpread_F: 20e-12,
  greatestInput_Vpeak: 1000,
  readingAccuracy: 0.005,
  resolution_V: 0.001,
  noise_Vrms: 0.001,
  bandwidth_Hz: null,
  cable: { length_m: 1, capacitance_F_per_m: 1e-10, impedance_ohm: 50, delay_s_per_m: 5e-9, end: "lumped" },
};

export interface Over {
  readonly waveform?: Partial<Brief["waveform"]>;
  readonly source?: Partial<Brief["source"]>;
  readonly surroundings?: Partial<Brief["surroundings"]>;
  readonly policy?: Partial<Brief["policy"]>;
  readonly brief?: Partial<Brief>;
}

export const brief = (over: Over = {}): Brief => ({
  scaleFactor: 1000,
  wantedUncertainty: 0.1,
  band_Hz: [0, 0],
  generator_Vpp: 20,
  ...over.brief,
  waveform: {
    kind: "dc",
    nominal_V: 15e3,
    statedAs: "dc",
    greatest_Vpeak: 15e3,
    frequency_Hz: null,
    riseTime_s: null,
    width_s: null,
    repetition_Hz: null,
    ...over.waveform,
  },
  source: {
    resistance_ohm: 0,
    capacitance_F: 0,
    currentLimit_A: null,
    earth: "oneSide",
    mainsConnected: false,
    ...over.source,
  },
  surroundings: {
    altitude_m: 200,
    ambient_degC: 23,
    ambientSpan_K: 5,
    relativeHumidity: 0.5,
    pollutionDegree: 2,
    materialGroup: "IIIa",
    wallDistance_m: 1,
    approachDistance_m: null,
    ...over.surroundings,
  },
  policy: {
    voltageDerating: 0.6,
    powerDerating: 0.5,
    series: "E24",
    partsInHandOnly: false,
    allowedSag: null,
    leakageResistance_ohm: 1e12,
    leastCurrent_A: 1e-7,
    greatestDissipation_W: null,
    greatestLength_m: null,
    compensation: "whenNeeded",
    ...over.policy,
  },
});

export const document = (over: Over = {}, parts: readonly Part[] = []): DividerDocument => ({
  format: "stringwright",
  version: 1,
  name: "invented",
  brief: brief(over),
  parts,
  instruments: [meter],
  principal: "meter",
  design: null,
  asBuilt: { readings: [], records: [] },
  origins: {},
  typed: {},
});

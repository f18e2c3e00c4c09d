/** Invented documents for tests: a resistor family, a string of equal elements, an LV arm and an instrument from a few numbers. */
import { restoreDocument } from "../../src/file/restore.ts";
import type { DividerDocument, FaultRow, Finding, Proof } from "../../src/solver/index.ts";
import { prove } from "../../src/solver/index.ts";

export interface Sketch {
  waveform?: Record<string, unknown>;
  brief?: Record<string, unknown>;
  source?: Record<string, unknown>;
  surroundings?: Record<string, unknown>;
  policy?: Record<string, unknown>;
  family?: Record<string, unknown>;
  elements: number;
  resistance_ohm: number;
  capacitance_F?: number;
  capacitorClass?: string;
  branches?: readonly unknown[];
  instrument?: Record<string, unknown>;
  others?: readonly Record<string, unknown>[];
  geometry?: Record<string, unknown>;
  strays?: Record<string, unknown>;
  lvInductance_H?: number;
  lead?: Record<string, unknown>;
  stays?: string;
  protectors?: readonly unknown[];
  /** Parts beside the resistor family and the two capacitor families. */
  parts?: readonly Record<string, unknown>[];
  origins?: Record<string, string>;
}

const family = {
  id: "r",
  kind: "resistor",
  name: "invented film",
  origin: "typed",
  tolerance: 0.01,
  bodyLength_m: 0.02,
  bodyDiameter_m: 0.005,
  least_ohm: 1,
  greatest_ohm: 1e12,
  series: "E24",
  seriesAbove: null,
  ratedDissipation_W: 0.5,
  deratingFrom_degC: 70,
  zeroDissipation_degC: 155,
  limitingVoltage_V: 1000,
  temperatureCoefficient_per_K: 1e-4,
  voltageCoefficient_per_V: 0,
  thermalResistance_K_per_W: 100,
  selfCapacitance_F: 0,
  leadSpace_m: 0.005,
  use: "divider",
};
const capacitor = (id: string, dielectricClass: string) => ({
  id,
  kind: "capacitor",
  name: `invented ${dielectricClass} capacitor`,
  origin: "typed",
  tolerance: 0.02,
  bodyLength_m: 0.005,
  bodyDiameter_m: 0.005,
  least_F: 1e-13,
  greatest_F: 1e-5,
  series: "E24",
  dielectric: dielectricClass,
  dielectricClass,
  ratedVoltage_V: 6000,
  temperatureCoefficient_per_K: 3e-5,
  dissipationFactor: 1e-3,
  leadInductance_H: 1e-9,
});
export const instrument = (more: Record<string, unknown> = {}) => ({
  id: "m",
  name: "invented meter",
  function: "meter dc",
  range_V: 100,
  resistance_ohm: 1e7,
  resistanceSpread: 0.01,
  capacitance_F: 0,
  capacitanceSpread_F: 0,
  greatestInput_Vpeak: 1000,
  readingAccuracy: 0.005,
  resolution_V: 0.001,
  bandwidth_Hz: null,
  cable: { length_m: 1, capacitance_F_per_m: 0, impedance_ohm: 50 },
  ...more,
});
/** A protector that conducts from `leastStrike_V`. */
export const protector = (more: Record<string, unknown> = {}) => ({
  id: "p",
  kind: "protector",
  name: "invented protector",
  origin: "typed",
  tolerance: 0.2,
  bodyLength_m: 0.008,
  bodyDiameter_m: 0.006,
  type: "gasTube",
  leastStrike_V: 72,
  letThrough_V: 700,
  leakage_A: 0,
  capacitance_F: 0,
  resistance_ohm: null,
  ...more,
});
export const fixed = (name: string, resistance_ohm: number) => ({ name, series: [{ part: "r", resistance_ohm }] });
export const bank = (name: string, capacitance_F: number, part = "c") => ({ name, part, capacitance_F });

/** The document; throws when it would not open without a repair. */
export function invented(s: Sketch): DividerDocument {
  const waveform = { kind: "dc", nominal_V: 6000, statedAs: "dc", greatest_Vpeak: null, ...s.waveform };
  const text = JSON.stringify({
    format: "stringwright",
    version: 1,
    name: "invented",
    brief: {
      waveform,
      scaleFactor: 1000,
      wantedUncertainty: 0.03,
      band_Hz: [0, 0],
      ...s.brief,
      source: {
        resistance_ohm: 0,
        capacitance_F: 1e-9,
        currentLimit_A: null,
        earth: "oneSide",
        mainsConnected: false,
        ...s.source,
      },
      surroundings: {
        altitude_m: 100,
        ambient_degC: 23,
        ambientSpan_K: 5,
        relativeHumidity: 0.5,
        pollutionDegree: 2,
        materialGroup: "IIIa",
        wallDistance_m: 1,
        ...s.surroundings,
      },
      policy: { voltageDerating: 0.6, powerDerating: 0.5, series: "E24", partsInHandOnly: false, ...s.policy },
    },
    parts: [{ ...family, ...s.family }, capacitor("c", "class1"), capacitor("c2", "class2"), ...(s.parts ?? [])],
    instruments: [instrument(s.instrument), ...(s.others ?? [])],
    principal: "m",
    design: {
      follows: false,
      hvArm: {
        strings: 1,
        elements: Array.from({ length: s.elements }, () => ({
          part: "r",
          resistance_ohm: s.resistance_ohm,
          capacitor: s.capacitance_F === undefined ? null : s.capacitorClass === "class2" ? "c2" : "c",
          capacitance_F: s.capacitance_F ?? 0,
        })),
      },
      lvArm: {
        stays: s.stays ?? "withDivider",
        branches: s.branches ?? [],
        capacitanceBy: "none",
        inductance_H: s.lvInductance_H ?? 0,
      },
      protectors: s.protectors ?? [],
      geometry: {
        columnDiameter_m: 0.04,
        columnLength_m: 0.66,
        footHeight_m: 0.12,
        bandFraction: 0.4,
        pitch_m: 0.66 / s.elements,
        electrode: { kind: "none", radius_m: 0, tubeRadius_m: 0, thickness_m: 0, offset_m: 0 },
        shield: null,
        box: null,
        wallDistance_m: null,
        ...s.geometry,
      },
      strays: { from: "formula", toEarth_F: [], toElectrode_F: [], electrodeToTap_F: 0, ...s.strays },
      lead: { inductance_H: 0, damping_ohm: 0, ...s.lead },
    },
    asBuilt: { readings: [], records: [] },
    origins: s.origins ?? {},
    typed: {},
  });
  const restored = restoreDocument(text);
  if (restored.kind === "refused") throw new Error(restored.refusal.why);
  if (restored.repairs.length > 0) throw new Error(JSON.stringify(restored.repairs));
  return restored.document;
}

export function proven(s: Sketch): Proof {
  const proof = prove(invented(s));
  if (!proof.ok) throw new Error(`${proof.error.where}: ${proof.error.why}`);
  return proof.value;
}

export const figure = (proof: Proof, path: string): number => proof.sheet.values[path] as number;
export const figureOf = (proof: Proof, path: string, index = 0): number =>
  (proof.sheet.values[path] as number[])[index]!;
export const finding = (proof: Proof, id: string): Finding | undefined => proof.findings.find((each) => each.id === id);
export function fault(proof: Proof, id: string): FaultRow {
  const found = proof.faults.find((each) => each.id === id);
  if (found === undefined) throw new Error(`no fault ${id} among ${proof.faults.map((each) => each.id).join(", ")}`);
  return found;
}

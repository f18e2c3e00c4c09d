/** An invented document with a design, for the tests of files, store and work. */
import { startDocument } from "../../src/file/defaults.ts";
import { restoreValue } from "../../src/file/restore.ts";
import type { DividerDocument, Instrument } from "../../src/solver/index.ts";

export const inventedMeter: Instrument = {
  id: "meter",
  name: "hand-held meter",
  function: "meter dc",
  range_V: 20,
  resistance_ohm: 1e7,
  resistanceSpread: 0.02,
  capacitance_F: 1e-10,
  capacitanceSpread_F: 5e-11,
  greatestInput_Vpeak: 1000,
  readingAccuracy: 0.005,
  resolution_V: 0.01,
  noise_Vrms: 0.01,
  bandwidth_Hz: null,
  cable: { length_m: 1, capacitance_F_per_m: 1e-10, impedance_ohm: 50, delay_s_per_m: 5e-9, end: "lumped" },
};

export const inventedStart = (): DividerDocument =>
  startDocument({
    name: "6 kV supply",
    nominal_V: 6000,
    kind: "dc",
    statedAs: "dc",
    instrument: inventedMeter,
    wantedUncertainty: 0.03,
  });

export const inventedPart = {
  id: "r1",
  kind: "resistor",
  ratedDissipation_W: 1,
  limitingVoltage_V: 1000,
  tolerance: 0.01,
};

/** With twelve elements of 100 MΩ and an LV arm of two branches. */
export function inventedDesign(): DividerDocument {
  const element = { part: "r1", resistance_ohm: 1e8, capacitor: null, capacitance_F: 0 };
  const restored = restoreValue({
    ...inventedStart(),
    parts: [inventedPart],
    design: {
      follows: true,
      hvArm: { strings: 1, elements: Array.from({ length: 12 }, () => element) },
      lvArm: {
        stays: "withDivider",
        branches: [
          { name: "R2a", series: [{ part: "r1", resistance_ohm: 2.7e6 }] },
          { name: "R2b", series: [{ part: "r1", resistance_ohm: 2.76e6 }] },
          { name: "T1", trimmer: { least: 0, greatest: 6e-11, setting: 0.5 } },
        ],
      },
    },
  });
  if (restored.kind === "refused" || restored.repairs.length > 0) throw new Error(JSON.stringify(restored));
  return restored.document;
}

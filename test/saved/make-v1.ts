/**
 * What wrote v1.json, kept with it. The file is never written again: it stands for every file of version 1 that is out there.
 * All invented; every kind of part, branch and origin occurs, and keys that version 1 does not know.
 */
import { startDocument } from "../../src/file/defaults.ts";
import { encodeDocument } from "../../src/file/encode.ts";
import { restoreValue } from "../../src/file/restore.ts";
import { typicalInstruments } from "../../src/file/instrumentDefaults.ts";

const cable = { length_m: 1.2, capacitance_F_per_m: 9.5e-11, impedance_ohm: 50 };
const start = startDocument({
  name: "48 kV pulse",
  nominal_V: -48_000,
  kind: "pulse",
  statedAs: "peak",
  // As it was then: keys that came later are filled in on opening.
  instrument: { id: "scope", name: "oscilloscope", function: "scope 1 MΩ", ...typicalInstruments["scope 1 MΩ"], cable } as never,
  wantedUncertainty: 0.03,
  scaleFactor: 1000,
  riseTime_s: 2e-7,
  width_s: 1e-5,
});

const parts = [
  { id: "r1", kind: "resistor", name: "film, 2 W, axial", origin: "catalogue", ratedDissipation_W: 2, limitingVoltage_V: 3500, inHand: [{ value: 12e6, count: 30 }], seriesAbove: { from_ohm: 1e7, series: "E12" } },
  { id: "c1", kind: "capacitor", name: "class 1, 3 kV", origin: "catalogue", dielectric: "C0G", dielectricClass: "class1", ratedVoltage_V: 3000 },
  { id: "t1", kind: "trimmer", name: "air trimmer", origin: "assumed", quantity: "F", spans: [3e-11, 6e-11] },
  { id: "g1", kind: "protector", name: "gas tube, 90 V", origin: "measured", type: "gasTube", leastStrike_V: 72, letThrough_V: 700 },
];
const design = {
  follows: false,
  hvArm: { strings: 1, elements: Array.from({ length: 24 }, () => ({ part: "r1", resistance_ohm: 12e6, capacitor: "c1", capacitance_F: 4.7e-10 })) },
  lvArm: {
    stays: "withDivider",
    capacitanceBy: "flattest",
    branches: [
      { name: "R2a", series: [{ part: "r1", resistance_ohm: 402e3 }, { part: "t1", rheostat: { least_ohm: 0, greatest_ohm: 1e4, setting: 0.3 } }] },
      { name: "C2a", part: "c1", capacitance_F: 1.5e-8 },
      { name: "K1", part: "c1", link: true, capacitance_F: 1e-9, fitted: true },
      { name: "T1", part: "t1", trimmer: { least_F: 5e-12, greatest_F: 6e-11, setting: 0.5 } },
    ],
  },
  protectors: [{ part: "g1", at: "divider" }],
  geometry: { columnDiameter_m: 0.04, columnLength_m: 0.66, electrode: { kind: "toroid", radius_m: 0.08, tubeRadius_m: 0.02 }, shield: { radius_m: 0.3, from_m: 0, to_m: 0.2 } },
  strays: { from: "typed", toEarth_F: Array.from({ length: 23 }, () => 4.9e-13), toElectrode_F: Array.from({ length: 23 }, () => 1e-13), electrodeToTap_F: 2e-14 },
  "written beside": { by: "hand", twice: [1, 2] },
};

export function makeV1(): string {
  const restored = restoreValue({
    ...start,
    parts,
    design,
    asBuilt: { readings: [{ element: 1, resistance_ohm: 12.03e6 }], records: [{ issued: "2026-01-31", scaleFactor: 1001.2 }] },
    origins: { ...start.origins, "/brief/source/capacitance_F": "measured" },
    typed: { "/design/lvArm/branches/0/series/0/resistance_ohm": "402k" },
    "kept as it is": null,
  });
  if (restored.kind === "refused" || restored.repairs.length > 0) throw new Error(JSON.stringify(restored));
  return encodeDocument(restored.document);
}

import type { Candidate, ResistanceWindow, Sizing } from "../../src/solver/index.ts";
import { inventedDocument } from "./inventedDocument.ts";

const design = inventedDocument.design!;

export const inventedWindow: ResistanceWindow = {
  bounds: [
    bound("sourceSag", "source sag", "atLeast", 323e3, "10 kΩ of source may sag by 3 %."),
    bound("dissipation", "dissipation", "atLeast", null, "No greatest dissipation is set."),
    bound("currentLimit", "current limit", "atLeast", 2.4e6, "The source gives 10 mA."),
    bound("leakage", "leakage", "atMost", 30e9, "1 TΩ of leakage may shift the scale factor by 3 %."),
    bound("leastCurrent", "least current", "atMost", 20e9, "1 µA must flow at working voltage."),
    bound("existence", "LV arm exists", "atMost", 999e6, "Above, no LV arm gives 1000 with 1 MΩ in parallel."),
    bound("instrumentShare", "instrument's share", "atMost", 1.5e9, "2 % of spread in the input resistance."),
  ],
  least_ohm: 2.4e6,
  greatest_ohm: 999e6,
  leastBy: "currentLimit",
  greatestBy: "existence",
  open: true,
  collision: null,
  cures: [],
};

function bound(
  id: ResistanceWindow["bounds"][number]["id"],
  name: string,
  side: "atLeast" | "atMost",
  resistance_ohm: number | null,
  reason: string,
) {
  return { id, name, side, resistance_ohm, reason, path: `window.${id}_ohm` };
}

/** The same window with its two inner bounds crossed. */
export const closedWindow: ResistanceWindow = {
  ...inventedWindow,
  bounds: [
    ...inventedWindow.bounds.filter((b) => b.id !== "currentLimit" && b.id !== "existence"),
    bound("currentLimit", "current limit", "atLeast", 48e6, "The source gives 0.5 mA."),
    bound("existence", "LV arm exists", "atMost", 9.9e6, "Above, no LV arm gives 10 with 1 MΩ in parallel."),
  ],
  least_ohm: 48e6,
  greatest_ohm: 9.9e6,
  open: false,
  collision: "The source's current limit asks for at least 48 MΩ; the LV arm exists only up to 9.9 MΩ.",
  cures: [{ label: "scale factor 100", edits: [{ pointer: "/brief/scaleFactor", value: 100 }] }],
};

const candidate = (rank: number, elements: number, value: number, over: Partial<Candidate> = {}): Candidate => ({
  rank,
  family: "r1",
  familyName: "thick film, high voltage, 1 W, axial",
  resistance_ohm: value,
  elements,
  strings: 1,
  hvArmResistance_ohm: elements * value,
  elementCount: elements,
  columnLength_m: elements * 0.02 + 0.06,
  partsUncertainty: 0.0042 + rank * 0.0007,
  loading: 1e4 / (elements * value),
  smallestMargin: 0.21 - rank * 0.02,
  differentParts: 5 + (rank % 2),
  elementVoltage_Vrms: 2000 / elements,
  elementVoltage_Vpeak: 24e3 / elements,
  elementDissipation_W: 0.33,
  governing: "element voltage, peak",
  stops: [],
  findings: [],
  design: {
    ...design,
    follows: false,
    hvArm: { strings: 1, elements: Array.from({ length: elements }, () => design.hvArm.elements[0]!) },
    geometry: { ...design.geometry, columnLength_m: elements * 0.02 + 0.06 },
  },
  parts: inventedDocument.parts,
  ...over,
});

export const inventedSizing: Sizing = {
  window: inventedWindow,
  candidates: [
    candidate(1, 12, 10e6),
    candidate(2, 13, 9.1e6),
    candidate(3, 16, 7.5e6),
    candidate(4, 40, 3e6, { familyName: "metal film, 0.6 W, axial", family: "r2", strings: 2, elementCount: 80 }),
    candidate(5, 60, 2e6, { familyName: "metal film, 0.6 W, axial", family: "r2" }),
    candidate(6, 64, 1.8e6, { familyName: "metal film, 0.6 W, axial", family: "r2", stops: ["column.length"] }),
  ],
  lost: [
    {
      family: "r3",
      familyName: "wirewound, 5 W",
      reason: "No value above 100 kΩ is sold: 24 elements reach 2.4 MΩ of 12 MΩ needed.",
      actual: 2.4e6,
      limit: 12e6,
      unit: "ohm",
    },
    {
      family: "r4",
      familyName: "carbon film, unmarked",
      reason: "No limiting element voltage is stated.",
      actual: null,
      limit: null,
      unit: "V",
    },
  ],
  considered: 4812,
  sheet: { values: {}, traces: {} },
};

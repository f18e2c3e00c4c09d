import { type Judging, judging } from "../checks/judging.ts";
import { tapLoad } from "../checks/tapLoad.ts";
import { type WorkingVoltages, workingVoltages } from "../checks/workingVoltage.ts";
import type { Design } from "../job/design.ts";
import type { DividerDocument } from "../job/document.ts";
import { ok, type Result, refuse } from "../quantities/result.ts";

/** What a search starts from: the document without a design to be kept, the voltages, the protectors already fitted. */
export interface Asking {
  readonly j: Judging;
  readonly working: WorkingVoltages;
  readonly seriesProtector_ohm: number;
  readonly leakage_S: number;
  /** Wanted scale factor less what the series protector takes: F / (1 + Rs/Rm). */
  readonly tapScaleFactor: number;
  /** Place of the principal instrument in the document. */
  readonly at: number;
}

const bare: Design = {
  follows: true,
  hvArm: { strings: 1, elements: [] },
  lvArm: { stays: "withDivider", branches: [], capacitanceBy: "none", inductance_H: 0 },
  protectors: [],
  geometry: {
    columnDiameter_m: 0.01,
    columnLength_m: 0.1,
    footHeight_m: 0.12,
    bandFraction: 0.4,
    fieldCase: "inhomogeneous",
    pitch_m: 0.01,
    electrode: { kind: "none", radius_m: 0, tubeRadius_m: 0, thickness_m: 0, offset_m: 0 },
    shield: null,
    box: null,
    wallDistance_m: null,
    potting: null,
  },
  strays: { from: "formula", toEarth_F: [], toElectrode_F: [], electrodeToTap_F: 0 },
  lead: { inductance_H: 0, damping_ohm: 0 },
};

const numbersAsked = (document: DividerDocument): readonly (readonly [string, number, number, number, string])[] => {
  const { brief } = document;
  return [
    ["/brief/scaleFactor", brief.scaleFactor, 1, 1e9, "Type a scale factor above 1, e.g. 1000."],
    ["/brief/wantedUncertainty", brief.wantedUncertainty, 0, 1, "Type a relative uncertainty, e.g. 3 %."],
    [
      "/brief/policy/voltageDerating",
      brief.policy.voltageDerating,
      0,
      1.000001,
      "Type a fraction from 0.1 to 1, e.g. 0.6.",
    ],
    [
      "/brief/policy/powerDerating",
      brief.policy.powerDerating,
      0,
      1.000001,
      "Type a fraction from 0.1 to 1, e.g. 0.5.",
    ],
  ];
};

/** Reads the brief for a search, or says what cannot be searched with. Puts `working.*` on the sheet. */
export function asking(document: DividerDocument): Result<Asking> {
  const at = document.instruments.findIndex((each) => each.id === document.principal);
  const instrument = document.instruments[at];
  if (instrument === undefined) {
    return refuse(
      "/principal",
      "No instrument is chosen to read the divider.",
      "Choose one of the document's instruments.",
    );
  }
  const { nominal_V } = document.brief.waveform;
  if (!Number.isFinite(nominal_V) || nominal_V === 0) {
    return refuse("/brief/waveform/nominal_V", "No voltage is given.", "Type the voltage to be measured, e.g. 6 kV.");
  }
  if (!(instrument.resistance_ohm > 0)) {
    const pointer = `/instruments/${at}/resistance_ohm`;
    return refuse(
      pointer,
      "The input resistance must be positive.",
      "Type it, e.g. 10 MΩ, or leave it to the default.",
    );
  }
  for (const [pointer, value, above, below, cure] of numbersAsked(document)) {
    if (value > above && value < below) continue;
    return refuse(pointer, `${value} is outside what a divider can be sized for.`, cure);
  }
  const { scaleFactor } = document.brief;
  const j = judging({ ...document, design: { ...(document.design ?? bare) } });
  const working = workingVoltages(document.brief, j.sheet);
  const { series_ohm: seriesProtector_ohm, shunt_S } = tapLoad(j);
  const tapScaleFactor = scaleFactor / (1 + seriesProtector_ohm / instrument.resistance_ohm);
  if (tapScaleFactor <= 1) {
    const why = "The series protector alone divides by more than the wanted scale factor.";
    return refuse("/brief/scaleFactor", why, "Take a larger scale factor or a smaller series protector.");
  }
  return ok({
    j,
    working,
    seriesProtector_ohm,
    leakage_S: shunt_S + terminationBeside(j),
    tapScaleFactor,
    at,
  });
}

/** A termination beside the instrument counts like a leakage at the tap: near enough for a search, the proof has it exact. */
function terminationBeside(j: Judging): number {
  const { input_ohm } = tapLoad(j);
  return input_ohm === j.instrument.resistance_ohm ? 0 : 1 / j.instrument.cable.impedance_ohm;
}

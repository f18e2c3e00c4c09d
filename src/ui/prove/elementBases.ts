import type { SheetData } from "../../solver/index.ts";
import type { ElementBasis } from "../charts/ElementChart.tsx";
import { sheetArray } from "../size/sheetNumber.ts";

interface Basis {
  readonly id: string;
  readonly name: string;
  readonly path: string;
  readonly limit: string;
  readonly rated: string;
}

/** Every basis that an element's voltage may be judged on, the hardest first; those that the sheet does not hold are left out. */
const voltageBases: readonly Basis[] = [
  {
    id: "greatestPeak",
    name: "greatest peak",
    path: "element.greatest_Vpeak",
    limit: "element.voltageLimit_Vpeak",
    rated: "element.ratedVoltage_Vpeak",
  },
  {
    id: "greatestRms",
    name: "greatest dc or rms",
    path: "element.greatestRms_V",
    limit: "element.voltageLimit_V",
    rated: "element.ratedVoltage_V",
  },
  {
    id: "step",
    name: "step sharing",
    path: "element.voltage_Vstep",
    limit: "element.voltageLimit_Vpeak",
    rated: "element.ratedVoltage_Vpeak",
  },
  {
    id: "hotContact",
    name: "hot contact",
    path: "element.voltage_VhotContact",
    limit: "element.voltageLimit_Vpeak",
    rated: "element.ratedVoltage_Vpeak",
  },
  {
    id: "peak",
    name: "working peak",
    path: "element.voltage_Vpeak",
    limit: "element.voltageLimit_Vpeak",
    rated: "element.ratedVoltage_Vpeak",
  },
  {
    id: "rms",
    name: "working rms",
    path: "element.voltage_Vrms",
    limit: "element.voltageLimit_V",
    rated: "element.ratedVoltage_V",
  },
  {
    id: "dc",
    name: "working dc",
    path: "element.voltage_Vdc",
    limit: "element.voltageLimit_V",
    rated: "element.ratedVoltage_V",
  },
];

const dissipationBases: readonly Basis[] = [
  {
    id: "dissipation",
    name: "dissipation",
    path: "element.dissipation_W",
    limit: "element.dissipationLimit_W",
    rated: "element.ratedDissipation_W",
  },
];

export const voltageOn = (sheet: SheetData): readonly ElementBasis[] => voltageBases.flatMap((b) => basisOf(sheet, b));
export const dissipationOn = (sheet: SheetData): readonly ElementBasis[] =>
  dissipationBases.flatMap((b) => basisOf(sheet, b));

/** A basis on which every element stands at 0 says nothing and is left out too. */
function basisOf(sheet: SheetData, { id, name, path, limit, rated }: Basis): readonly ElementBasis[] {
  const values = sheetArray(sheet, path);
  if (!values.some((v) => v !== null && v !== 0)) return [];
  return [{ id, name, values, limits: sheetArray(sheet, limit), rated: sheetArray(sheet, rated) }];
}

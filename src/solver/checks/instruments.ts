import type { Judging } from "./judging.ts";
import { readingBasis } from "./loading.ts";
import { tapLoad } from "./tapLoad.ts";

/** One instrument judged on this LV arm, with a scale factor of its own. */
export interface InstrumentRow {
  readonly id: string;
  readonly name: string;
  readonly principal: boolean;
  readonly scaleFactor: number;
  readonly readingAtWorking_V: number;
  readonly readingAtGreatest_Vpeak: number;
  readonly greatestInput_Vpeak: number;
  /** Relative error if the principal instrument's scale factor were used with this one. */
  readonly errorIfReused: number;
}

/** Every instrument of the document on the same LV arm: F = (1 + R1/R2p)(1 + Rs/Rm), R2p with its own resistance. */
export function instrumentRows(j: Judging): InstrumentRow[] {
  const { sheet } = j;
  const R1 = sheet.number("hvArm.resistance_ohm") as number;
  const R2 = sheet.number("lvArm.fitted_ohm");
  const principal = sheet.number("scaleFactor.predicted") as number;
  const polarity = sheet.number("/brief/waveform/nominal_V:polarity") as number;
  const working = polarity * (sheet.number(readingBasis(j)) as number);
  const greatest = sheet.number("working.greatest_Vpeak") as number;
  return j.document.instruments.map((each) => {
    const { series_ohm: Rs, input_ohm: Rm, shunt_S } = tapLoad(j, each);
    const G = (R2 === null ? 0 : 1 / R2) + shunt_S + 1 / (Rs + Rm);
    const scaleFactor = (1 + R1 * G) * (1 + Rs / Rm);
    return {
      id: each.id,
      name: each.name,
      principal: each.id === j.instrument.id,
      scaleFactor,
      readingAtWorking_V: working / scaleFactor,
      readingAtGreatest_Vpeak: greatest / scaleFactor,
      greatestInput_Vpeak: each.greatestInput_Vpeak,
      errorIfReused: principal / scaleFactor - 1,
    };
  });
}

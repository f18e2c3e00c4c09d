import { mismatchFormulas } from "../checks/armMismatch.ts";
import { capacitiveLadderRecord } from "../checks/capacitiveLadder.ts";
import { chargeFormulas } from "../checks/charge.ts";
import { strayFormulas } from "../checks/columnStrays.ts";
import { edgeFormulas } from "../checks/edgeFormulas.ts";
import { faultRecord } from "../checks/faultRow.ts";
import { insulationFormulas } from "../checks/insulation.ts";
import { loadingFormulas } from "../checks/loadingFormulas.ts";
import { lvArmFormulas } from "../checks/lvArm.ts";
import { protectorFormulas } from "../checks/protectors.ts";
import { proximityFormulas, proximityRecord } from "../checks/proximityFormulas.ts";
import { scaleFactorFormulas } from "../checks/scaleFactorFormulas.ts";
import { drivenPoleRecord, slowFastFormulas } from "../checks/slowFastFormulas.ts";
import { edgeShareRecord, stepSharingFormulas } from "../checks/stepSharing.ts";
import { resistanceAbove, stressFormulas } from "../checks/stressFormulas.ts";
import { capacitanceFormulas } from "../checks/stringCapacitance.ts";
import { tapLoadFormulas } from "../checks/tapLoad.ts";
import { workingVoltageFormulas } from "../checks/workingVoltage.ts";
import { estimateFormulas } from "../field/estimateFormulas.ts";
import { fieldRecord } from "../field/fieldRecord.ts";
import { pottingFormulas } from "../field/potting.ts";
import { underElectrode } from "../field/underElectrode.ts";
import { sizingFormulas, sizingSolutions } from "../sizing/formulas.ts";
import type { Formula, Solution } from "../standards/formula.ts";
import { greatestInputRecord } from "./greatestInput.ts";
import { responseFormulas, responseRecords } from "./responseFormulas.ts";

/** Every formula that may stand behind a figure, by id. */
export const formulas: ReadonlyMap<string, Formula<string, string>> = new Map(
  [
    workingVoltageFormulas,
    stressFormulas,
    scaleFactorFormulas,
    lvArmFormulas,
    loadingFormulas,
    strayFormulas,
    capacitanceFormulas,
    insulationFormulas,
    chargeFormulas,
    protectorFormulas,
    responseFormulas,
    estimateFormulas,
    edgeFormulas,
    slowFastFormulas,
    stepSharingFormulas,
    tapLoadFormulas,
    underElectrode,
    pottingFormulas,
    mismatchFormulas,
    proximityFormulas,
    estimateFormulas,
    underElectrode,
  ]
    .flatMap((group) => Object.values(group) as unknown as Formula<string, string>[])
    .concat(sizingFormulas as unknown as Formula<string, string>[])
    .map((record) => [record.id, record]),
);

/** Every solution record, by id: what no closed formula gives. */
export const solutions: ReadonlyMap<string, Solution> = new Map(
  [
    capacitiveLadderRecord,
    fieldRecord,
    proximityRecord,
    greatestInputRecord,
    faultRecord,
    resistanceAbove,
    drivenPoleRecord,
    edgeShareRecord,
    ...Object.values(responseRecords),
    ...sizingSolutions,
  ].map((record) => [record.id, record]),
);

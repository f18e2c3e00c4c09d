/** The solver's only door: the rest of the program imports from here and from nowhere deeper. */
export * from "./build/partsList.ts";
export * from "./build/partsListCsv.ts";
export { type ColumnField, fieldAsked, isFieldOf, solveColumnField } from "./checks/columnField.ts";
export type { FaultRow } from "./checks/faultRow.ts";
export type { InstrumentRow } from "./checks/instruments.ts";
export { plainPointer } from "./checks/judging.ts";
export type { ProximityRow } from "./checks/proximity.ts";
export { crestFactors, greatestOverPeak } from "./checks/workingVoltage.ts";
export { answerField, type FieldAnswer } from "./field/answerField.ts";
export { type BalancingElectrode, balancingElectrode } from "./field/balancingElectrode.ts";
export { estimateFormulas } from "./field/estimateFormulas.ts";
export * from "./field/fieldGeometry.ts";
export { fieldRecord } from "./field/fieldRecord.ts";
export { type InstantEstimate, instantEstimate } from "./field/instantEstimate.ts";
export { type Neighbour, proximity } from "./field/proximity.ts";
export { shapeFault } from "./field/shapeFault.ts";
export { type FieldOptions, type FieldStrays, type FieldUncertainty, solveField } from "./field/solveField.ts";
export type * from "./job/brief.ts";
export type * from "./job/design.ts";
export type * from "./job/document.ts";
export type * from "./job/instrument.ts";
export type * from "./job/part.ts";
export type * from "./network/networkForm.ts";
export { solveNetwork } from "./network/solveNetwork.ts";
export { availableValues, valuesInHand } from "./parts/availableValues.ts";
export { dielectricFits, dielectricRefusal } from "./parts/capacitorFamilies.ts";
export { catalogue, catalogued } from "./parts/catalogue.ts";
export { catalogueSource } from "./parts/catalogueSource.ts";
export * from "./parts/derating.ts";
export { withInHand, withinRange } from "./parts/inHand.ts";
export { pointerResistance } from "./parts/instruments.ts";
export { familyFaults, sizingRefusal, validateFamily } from "./parts/validateFamily.ts";
export * from "./proof/cautions.ts";
export type { EdgeTraces, TracePair } from "./proof/edgeTraces.ts";
export { formulas, solutions } from "./proof/formulas.ts";
export type { FromSource } from "./proof/fromSource.ts";
export type { Graded, GradedRow } from "./proof/graded.ts";
export type { GreatestInput } from "./proof/greatestInput.ts";
export type { InstrumentSpeed } from "./proof/instrumentSpeed.ts";
export { jobSentence } from "./proof/jobSentence.ts";
export * from "./proof/proof.ts";
export { prove } from "./proof/prove.ts";
export { proveAt } from "./proof/proveAt.ts";
export type { Ring } from "./proof/rings.ts";
export type { SlowFast, SquarePicture, SquareRow, SquareState } from "./proof/slowFast.ts";
export { type Speed, speed } from "./proof/speed.ts";
export { type Through, throughDivider } from "./proof/throughDivider.ts";
export * from "./proof/why.ts";
export { evaluateArithmetic } from "./quantities/arithmetic.ts";
export * from "./quantities/format.ts";
export * from "./quantities/parse.ts";
export * from "./quantities/quantity.ts";
export * from "./quantities/result.ts";
export { type UnitName, units } from "./quantities/unit.ts";
export type * from "./sizing/outcome.ts";
export { size } from "./sizing/size.ts";
export { takeCandidate } from "./sizing/takeCandidate.ts";
export * from "./standards/finding.ts";
export * from "./standards/formula.ts";
export {
  preferredAbove,
  preferredBelow,
  preferredBetween,
  preferredNearest,
  preferredSeries,
} from "./standards/preferred.ts";
export * from "./standards/sheet.ts";
export * from "./standards/source.ts";

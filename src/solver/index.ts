/** The solver's only door: the rest of the program imports from here and from nowhere deeper. */
export * from "./build/partsList.ts";
export * from "./build/partsListCsv.ts";
export type { FaultRow } from "./checks/faultRow.ts";
export type { InstrumentRow } from "./checks/instruments.ts";
export { plainPointer } from "./checks/judging.ts";
export { crestFactors, greatestOverPeak } from "./checks/workingVoltage.ts";
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
export { formulas, solutions } from "./proof/formulas.ts";
export type * from "./proof/instrumentReach.ts";
export { jobSentence } from "./proof/jobSentence.ts";
export { lvShares } from "./proof/lvShares.ts";
export type { Match } from "./proof/matches.ts";
export * from "./proof/proof.ts";
export { prove } from "./proof/prove.ts";
export { proveAt } from "./proof/proveAt.ts";
export * from "./proof/why.ts";
export { evaluateArithmetic } from "./quantities/arithmetic.ts";
export * from "./quantities/format.ts";
export * from "./quantities/parse.ts";
export * from "./quantities/quantity.ts";
export * from "./quantities/result.ts";
export { type UnitName, units } from "./quantities/unit.ts";
export { type LvSetting, lvSetting } from "./sizing/lvSetting.ts";
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

/** The solver's only door: the rest of the program imports from here and from nowhere deeper. */

export * from "./build/partsList.ts";
export * from "./build/partsListCsv.ts";
export type { FaultRow } from "./checks/faults.ts";
export type { InstrumentRow } from "./checks/instruments.ts";
export type * from "./job/brief.ts";
export type * from "./job/design.ts";
export type * from "./job/document.ts";
export type * from "./job/instrument.ts";
export type * from "./job/part.ts";
export * from "./proof/cautions.ts";
export * from "./proof/proof.ts";
export * from "./quantities/format.ts";
export * from "./quantities/parse.ts";
export * from "./quantities/quantity.ts";
export * from "./quantities/result.ts";
export type { UnitName } from "./quantities/unit.ts";
export type * from "./sizing/outcome.ts";
export * from "./standards/finding.ts";
export * from "./standards/formula.ts";
export * from "./standards/sheet.ts";
export * from "./standards/source.ts";

import { err, ok, type Result, refuse } from "../quantities/result.ts";
import type { FieldAsk } from "./fieldGeometry.ts";
import { type InstantEstimate, instantEstimate } from "./instantEstimate.ts";
import { readField } from "./readField.ts";
import { type FieldStrays, mostUnknowns, solveField, unknownsOf } from "./solveField.ts";

/** The answer to a raw geometry as strict JSON, SI, the unit in the key. A value that does not exist is null. */
export interface FieldAnswer extends FieldStrays {
  readonly format: "stringwright-field-answer";
  readonly version: 1;
  readonly ask: FieldAsk;
  readonly estimate: InstantEstimate;
}

/** Strays of the geometry in the form, or why it cannot be used. */
export function answerField(form: unknown): Result<FieldAnswer> {
  const read = readField(form);
  if (!read.ok) return err(read.error);
  const { geometry, ask } = read.value;
  const unknowns = unknownsOf(geometry, ask);
  if (unknowns > mostUnknowns) {
    return refuse(
      "/geometry",
      `Parts nearly touch, or the elements are many: it takes ${unknowns} unknowns, ${mostUnknowns} are allowed.`,
      "Widen the narrowest gap, ask for a lower resolution, or take fewer elements.",
    );
  }
  return ok({
    format: "stringwright-field-answer",
    version: 1,
    ask,
    ...solveField(geometry, { ...ask, withUncertainty: true }),
    estimate: instantEstimate(geometry),
  });
}

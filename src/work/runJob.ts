import {
  type ColumnField,
  type FieldGeometry,
  fieldAsked,
  isFieldOf,
  prove,
  size,
  solveColumnField,
  speed,
  takeCandidate,
  throughDivider,
} from "../solver/index.ts";
import { Cache, cachedSize, canonical } from "./cache.ts";
import { jobsOf } from "./outcomeOf.ts";

const fields = new Cache<ColumnField>(24);
const solveField = (geometry: FieldGeometry): ColumnField =>
  fields.get(canonical(geometry), () => solveColumnField(geometry));

/** Runs one job here and now. Searches and fields are answered from memory when their inputs have not changed. */
export const runJob = jobsOf({
  size: cachedSize(size),
  prove,
  takeCandidate,
  fieldAsked,
  isFieldOf,
  solveField,
  through: throughDivider,
  speed,
});

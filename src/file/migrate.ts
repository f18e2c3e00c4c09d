import { version } from "./documentShape.ts";
import type { Raw } from "./shape.ts";

/** One step a version: what turns a file of version n into one of version n + 1. Steps, once landed, are kept for ever. */
type Step = (raw: Raw) => Raw;
const steps: Readonly<Record<number, Step>> = {};

/** A file of any earlier version as one of the version written now; of a newer one, as it is. */
export function migrated(raw: Raw, from: number): Raw {
  let here = raw;
  for (let v = from; v < version; v += 1) here = steps[v]?.(here) ?? here;
  return here;
}

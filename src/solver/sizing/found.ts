import type { Finding } from "../standards/finding.ts";
import { marginOf } from "../standards/finding.ts";
import { practice } from "../standards/source.ts";

/** A finding of the search; the margin follows from figure and limit where both are there. */
export function found(
  id: string,
  level: Finding["level"],
  what: string,
  more: Partial<Finding> & Pick<Finding, "reason">,
): Finding {
  const { actual = null, limit = null, sense = "none" } = more;
  const margin = actual !== null && limit !== null && sense !== "none" ? marginOf(sense, actual, limit) : null;
  return {
    id,
    level,
    what,
    unit: "1",
    source: practice(what),
    cure: null,
    path: null,
    ...more,
    actual,
    limit,
    sense,
    margin,
  };
}

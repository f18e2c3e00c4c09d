import type { Brief } from "../job/brief.ts";

/** The wanted relative uncertainty, k = 2; null where it is 0: a claim of perfection, taken as not stated. */
export const wantedOf = (brief: Brief): number | null => (brief.wantedUncertainty > 0 ? brief.wantedUncertainty : null);

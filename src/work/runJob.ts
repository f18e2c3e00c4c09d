import { prove, size, takeCandidate } from "../solver/index.ts";
import { cachedSize } from "./cache.ts";
import { jobsOf } from "./outcomeOf.ts";

/** Runs one job here and now. Searches are answered from memory when their inputs have not changed. */
export const runJob = jobsOf({ size: cachedSize(size), prove, takeCandidate });

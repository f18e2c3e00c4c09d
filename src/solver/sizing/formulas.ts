import type { Formula, Solution } from "../standards/formula.ts";
import { candidateFormulas } from "./candidateFormulas.ts";
import { compensationFormulas, lvCapacitanceRecord } from "./compensationFormulas.ts";
import { geometryFormulas } from "./geometry.ts";
import { lvSolutionFormulas } from "./lvSolution.ts";
import { windowFormulas } from "./windowFormulas.ts";

/** Every formula that may stand behind a figure of a search. */
export const sizingFormulas: readonly Formula<string, string>[] = [
  windowFormulas,
  candidateFormulas,
  geometryFormulas,
  lvSolutionFormulas,
  compensationFormulas,
].flatMap((group) => Object.values(group) as unknown as Formula<string, string>[]);

/** Records for what the search solves for. */
export const sizingSolutions: readonly Solution[] = [lvCapacitanceRecord];

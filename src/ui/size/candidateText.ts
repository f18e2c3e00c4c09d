import type { Candidate, Design } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";

/** One string: "12 × 10 MΩ". */
export const stringName = ({ elements, resistance_ohm }: Candidate): string =>
  `${elements}\u2009×\u2009${withUnit(resistance_ohm, "ohm", 3)}`;

/** The whole: "12 × 10 MΩ", "2 strings, 40 × 3 MΩ". */
export const candidateName = (candidate: Candidate): string =>
  candidate.strings > 1 ? `${candidate.strings} strings, ${stringName(candidate)}` : stringName(candidate);

/** A share as percent with at most three digits: "0.42 %"; what only rounding of the arithmetic leaves is "0 %". */
export function percentText(share: number, digits = 3): string {
  const shown = Math.abs(share) < 1e-11 ? 0 : Number((100 * share).toPrecision(digits));
  const text = String(shown).replace("-", "\u2212");
  return `${text}\u2009%`;
}

/** The candidate that the design is made of, if it is one of them. */
export function chosenCandidate(candidates: readonly Candidate[], design: Design | null): Candidate | null {
  if (design === null) return null;
  const { elements, strings } = design.hvArm;
  const first = elements[0];
  const same = (c: Candidate) =>
    c.strings === strings &&
    c.elements === elements.length &&
    c.design.hvArm.elements[0]?.part === first?.part &&
    c.design.hvArm.elements.every((e, i) => e.resistance_ohm === elements[i]?.resistance_ohm);
  return candidates.find(same) ?? null;
}

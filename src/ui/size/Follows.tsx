import type { Candidate, Design } from "../../solver/index.ts";

interface Props {
  readonly design: Design | null;
  /** null: no search has run. */
  readonly candidates: readonly Candidate[] | null;
  readonly chosen: Candidate | null;
  readonly onSizeAgain: () => void;
}

/** Whether the design is chosen again as the brief changes, and the way back when it is not. */
export function Follows({ design, candidates, chosen, onSizeAgain }: Props) {
  const follows = design?.follows ?? false;
  return (
    <p className="follows">
      <span>{sentence(design, candidates, chosen)}</span>
      {follows ? null : (
        <button type="button" className="cure-button" onClick={onSizeAgain}>
          size again
        </button>
      )}
    </p>
  );
}

function sentence(design: Design | null, candidates: readonly Candidate[] | null, chosen: Candidate | null): string {
  if (candidates !== null && candidates.length === 0) return "No candidate stands; the families below say why.";
  if (design === null) return "There is no design yet.";
  if (design.follows) return "The design follows the brief: the best candidate is chosen again as the brief changes.";
  const place =
    chosen === null ? "no candidate of this search" : `candidate ${chosen.rank} of ${candidates?.length ?? 0}`;
  return `The design is kept as picked (${place}); the findings say what of the brief it does not meet.`;
}

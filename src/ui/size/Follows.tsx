import type { Candidate, Design } from "../../solver/index.ts";

interface Props {
  readonly design: Design | null;
  /** null: no search has run. */
  readonly candidates: readonly Candidate[] | null;
  readonly onSizeAgain: () => void;
}

/** Whether the design is chosen again as the brief changes, and the way back when it is not. */
export function Follows({ design, candidates, onSizeAgain }: Props) {
  const follows = design?.follows ?? false;
  return (
    <p className="follows">
      <span>{sentence(design, candidates)}</span>
      {follows ? null : (
        <button type="button" className="cure-button" onClick={onSizeAgain}>
          size again
        </button>
      )}
    </p>
  );
}

function sentence(design: Design | null, candidates: readonly Candidate[] | null): string {
  if (candidates !== null && candidates.length === 0) return "No candidate stands; the families below say why.";
  if (design === null) return "There is no design yet.";
  if (design.follows) return "The design follows the brief: the best candidate is chosen again as the brief changes.";
  return "The design is kept as picked; the findings say what of the brief it no longer meets.";
}

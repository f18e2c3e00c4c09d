import type { Cure, ResistanceWindow } from "../../solver/index.ts";
import { windowSentence } from "./windowSentence.ts";

/** What to say when the bounds leave nothing open: the two that collide and the cheapest ways to part them. */
export function NoWindow({
  window,
  onCure,
}: {
  readonly window: ResistanceWindow;
  readonly onCure: (cure: Cure) => void;
}) {
  return (
    <div className="no-window" role="status">
      <strong>No resistance window.</strong>
      <p>{windowSentence(window, null)}</p>
      {window.cures.length === 0 ? null : (
        <p className="cures">
          {window.cures.map((cure) => (
            <button key={cure.label} type="button" className="cure-button" onClick={() => onCure(cure)}>
              {cure.label}
            </button>
          ))}
        </p>
      )}
    </div>
  );
}

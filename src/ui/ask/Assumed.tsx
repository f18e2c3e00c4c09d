import { plainPointer } from "../../solver/index.ts";
import { useInputs, useJudged } from "../frame/session.ts";
import { useApply } from "../frame/useApply.ts";

/** Everything that is assumed, counted in one place; each accepted or typed. */
export function Assumed() {
  const apply = useApply();
  const assumed = useJudged((state) => state.proof?.assumed);
  const origins = useInputs((state) => state.document.origins);
  const locked = useInputs((state) => state.file.readOnly !== null);
  const list = assumed ?? Object.keys(origins).filter((pointer) => origins[pointer] === "assumed");
  if (list.length === 0)
    return <p className="quiet">assumed: none. Every input is typed, measured or from the catalogue.</p>;
  return (
    <details className="assumed-count">
      <summary>assumed: {list.length}. Accept each, or type it below.</summary>
      <ul>
        {list.map((pointer) => (
          <li key={pointer}>
            {plainPointer(pointer)}
            <button
              type="button"
              className="figure-button"
              disabled={locked}
              onClick={() => apply((store) => store.acceptAssumed(pointer))}
            >
              accept<span className="unseen"> {plainPointer(pointer)}</span>
            </button>
          </li>
        ))}
      </ul>
    </details>
  );
}

import { useState } from "react";
import { StartDialog } from "./StartDialog.tsx";
import { useInputs, useLooking, useSession } from "./session.ts";

/** What happened to the work: an example is open, a file was repaired or refused, another tab writes, a copy could not be kept. */
export function Notices() {
  const session = useSession();
  const notice = useLooking((state) => state.notice);
  const file = useInputs((state) => state.file);
  const [starting, setStarting] = useState(false);
  return (
    <>
      {file.example ? (
        <div className="notice">
          <p>A solved example. Editing it makes a copy.</p>
          <button type="button" className="plain-button" onClick={() => setStarting(true)}>
            Start from my own voltage
          </button>
        </div>
      ) : null}
      {file.readOnly === null ? null : (
        <div className="notice bad" role="status">
          <p>
            {file.readOnly === "newer version"
              ? "This file was written by a newer version: it is shown and not changed."
              : "Another tab is writing this design: it is shown and not changed here."}
          </p>
          <button type="button" className="plain-button" onClick={() => copyOf(session)}>
            work on a copy
          </button>
        </div>
      )}
      {notice === null ? null : (
        <div className={notice.bad ? "notice bad" : "notice"} role="status">
          <p>{notice.text}</p>
          {notice.details === undefined ? null : (
            <details>
              <summary>what was repaired</summary>
              <ul>
                {notice.details.map((each) => (
                  <li key={each}>{each}</li>
                ))}
              </ul>
            </details>
          )}
          <button type="button" className="plain-button" onClick={() => session.looking.setState({ notice: null })}>
            noted
          </button>
        </div>
      )}
      {starting ? <StartDialog onClose={() => setStarting(false)} /> : null}
    </>
  );

  function copyOf(of: typeof session): void {
    of.handle = null;
    const slot = crypto.randomUUID();
    sessionStorage.setItem("slot", slot);
    if (of.keeper === null) of.store.getState().workOnACopy();
    else void of.keeper.workOnACopy(slot);
  }
}

import { useState } from "react";
import type { Cure, Finding } from "../../solver/index.ts";
import { LevelMark } from "../prove/LevelMark.tsx";
import { numberText } from "./figureText.ts";
import { openWhy, useInputs, useJudged, useSession } from "./session.ts";
import { useApply } from "./useApply.ts";

/** The findings, worst first: one line each, with its cure as a button; what is clear is counted and opened on request. */
export function Findings() {
  const findings = useJudged((state) => state.proof?.findings);
  const stale = useJudged((state) => state.stale);
  const [all, setAll] = useState(false);
  if (findings === undefined) return null;
  const open = findings.filter((each) => each.level !== "clear");
  const clear = findings.filter((each) => each.level === "clear");
  const count = (level: string) => findings.filter((each) => each.level === level).length;
  return (
    <section aria-label="findings" className={stale ? "stale" : ""}>
      <h2>
        FINDINGS · {count("stop")} stop · {count("caution")} caution
      </h2>
      <ul className="finding-lines">
        {(all ? findings : open).map((each) => (
          <Line key={`${each.id} ${each.what}`} finding={each} />
        ))}
        {all || clear.length === 0 ? null : (
          <li>
            <LevelMark level="clear" word={false} />
            <button type="button" className="figure-button" onClick={() => setAll(true)}>
              {clear.length} clear: limits met with margin
            </button>
          </li>
        )}
      </ul>
      {all ? (
        <button type="button" className="plain-button" onClick={() => setAll(false)}>
          only what is open
        </button>
      ) : null}
    </section>
  );
}

function Line({ finding }: { readonly finding: Finding }) {
  const session = useSession();
  const { actual, limit, unit, path } = finding;
  return (
    <li>
      <LevelMark level={finding.level} word={false} />
      <div>
        <span className={finding.level === "stop" ? "stop-line" : ""}>{finding.what}</span>
        {actual === null ? null : (
          <>
            {" "}
            <button
              type="button"
              className="figure-button"
              disabled={path === null}
              onClick={() =>
                path !== null && openWhy(session, path, finding.element === undefined ? null : finding.element - 1)
              }
            >
              {numberText(actual, unit)}
            </button>
            {limit === null ? null : <span className="of"> of {numberText(limit, unit)}</span>}
          </>
        )}
      </div>
      {finding.cure === null ? null : <CureButton cure={finding.cure} what={finding.what} />}
    </li>
  );
}

function CureButton({ cure, what }: { readonly cure: Cure; readonly what: string }) {
  const apply = useApply();
  const locked = useInputs((state) => state.file.readOnly !== null);
  return (
    <button
      type="button"
      className="cure-button"
      disabled={locked}
      aria-label={`${cure.label}: ${what}`}
      onClick={() => apply((store) => store.applyCure(cure))}
    >
      {cure.label}
    </button>
  );
}

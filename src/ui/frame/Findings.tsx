import { useState } from "react";
import { type Cure, citation, type Finding } from "../../solver/index.ts";
import { LevelMark } from "../prove/LevelMark.tsx";
import { numberText } from "./figureText.ts";
import { openWhy, useInputs, useJudged, useSession } from "./session.ts";
import { useApply } from "./useApply.ts";

/** The findings, worst first: one line each, its reason on request, its cure as a button; what is clear is counted. */
export function Findings() {
  const findings = useJudged((state) => state.proof?.findings);
  const stale = useJudged((state) => state.stale);
  const [all, setAll] = useState(false);
  if (findings === undefined) return null;
  const count = (level: string) => findings.filter((each) => each.level === level).length;
  const shown = all ? findings : findings.filter((each) => each.level !== "clear");
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must be reachable with the keyboard
    <section aria-label="findings" className={stale ? "findings-sheet stale" : "findings-sheet"} tabIndex={0}>
      <h2>
        FINDINGS <span className="counts">{tally(count("stop"), count("caution"))}</span>
      </h2>
      <ul className="finding-lines">
        {shown.map((each, i) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: one check may speak of several elements
          <Line key={`${each.id} ${each.what} ${i}`} finding={each} />
        ))}
        {all || count("clear") === 0 ? null : (
          <li>
            <LevelMark level="clear" word={false} />
            <button type="button" className="figure-button" onClick={() => setAll(true)}>
              {count("clear")} clear
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

const tally = (stops: number, cautions: number): string =>
  [stops > 0 ? `${stops} stop` : "", cautions > 0 ? `${cautions} caution` : ""]
    .filter((each) => each !== "")
    .join(", ") || "none open";

function Line({ finding }: { readonly finding: Finding }) {
  const [open, setOpen] = useState(false);
  return (
    <li className={`is-${finding.level}`}>
      <LevelMark level={finding.level} word={false} />
      <div>
        <button type="button" className="said-button" aria-expanded={open} onClick={() => setOpen(!open)}>
          {finding.what}
        </button>{" "}
        <Numbers finding={finding} />
        {open ? (
          <p className="reason">
            {finding.reason} <span className="quiet">{citation(finding.source)}</span>
          </p>
        ) : null}
      </div>
      {finding.cure === null ? null : <CureButton cure={finding.cure} what={finding.what} />}
    </li>
  );
}

function Numbers({ finding }: { readonly finding: Finding }) {
  const session = useSession();
  const { actual, limit, unit, path, element } = finding;
  if (actual === null) return null;
  const place = element === undefined ? null : element - 1;
  const as = unit === "1" && limit !== null && Math.abs(limit) < 0.1 ? "share" : unit;
  const text = numberText(actual, as);
  return (
    <span className="numbers">
      {path === null ? (
        text
      ) : (
        <button type="button" className="figure-button" onClick={() => openWhy(session, path, place)}>
          {text}
        </button>
      )}
      {limit === null ? null : <span className="of"> of {numberText(limit, as)}</span>}
    </span>
  );
}

/** Makes the cure's edits as one step of undo. */
export function CureButton({ cure, what }: { readonly cure: Cure; readonly what: string }) {
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

import { type Cure, citation, type Finding, formatShare, type UnitName } from "../../solver/index.ts";
import { figureText } from "../charts/axisText.ts";
import { LevelMark } from "./LevelMark.tsx";

interface Props {
  readonly findings: readonly Finding[];
  readonly onWhy: (path: string, element: number | null) => void;
  readonly onCure: (cure: Cure) => void;
}

/** Every finding in full, worst first: number, limit, margin, reason, clause, cure. */
export function FindingList({ findings, onWhy, onCure }: Props) {
  return (
    <ul className="findings">
      {findings.map((finding, i) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: one check may speak of several elements
        <li key={`${finding.id} ${i}`} className={`finding finding-${finding.level}`}>
          <LevelMark level={finding.level} />
          <div>
            <p className="finding-line">
              <strong>{finding.what}</strong>
              <Numbers finding={finding} onWhy={onWhy} />
              {finding.cure === null ? null : (
                <button type="button" className="cure-button" onClick={() => onCure(finding.cure!)}>
                  {finding.cure.label}
                </button>
              )}
            </p>
            <p className="finding-reason">{finding.reason}</p>
            <p className="finding-source">{citation(finding.source)}</p>
          </div>
        </li>
      ))}
    </ul>
  );
}

function Numbers({ finding, onWhy }: { readonly finding: Finding; readonly onWhy: Props["onWhy"] }) {
  const { actual, limit, path, margin, sense } = finding;
  if (actual === null) return null;
  const text = numberText(actual, finding.unit);
  return (
    <span className="finding-numbers">
      {path === null ? (
        text
      ) : (
        <button type="button" className="number-button" onClick={() => onWhy(path, finding.element ?? null)}>
          {text}
        </button>
      )}
      {limit === null ? null : (
        <span className="quiet">
          {sense === "atLeast" ? " of at least " : " of at most "}
          {numberText(limit, finding.unit)}
        </span>
      )}
      {margin === null ? null : <span className="quiet">{` · ${marginText(margin)}`}</span>}
    </span>
  );
}

/** A number in its finding's unit; a share reads as percent. */
export function numberText(value: number, unit: string): string {
  if (unit === "1") return formatShare(value);
  return figureText(value, unit as UnitName);
}

const marginText = (margin: number): string =>
  margin < 0 ? `${formatShare(-margin, 2)} past its limit` : `${formatShare(margin, 2)} left`;

import type { Finding } from "../../solver/index.ts";
import { axisText, figureText } from "../charts/axisText.ts";
import { linearAxis } from "../charts/logAxis.ts";
import { LevelMark } from "./LevelMark.tsx";

interface Props {
  readonly findings: readonly Finding[];
  readonly onWhy: (path: string, element: number | null) => void;
}

/** Every distance that is judged: the way offered against the way required, to one scale in millimetres. */
export function Insulation({ findings, onWhy }: Props) {
  const rows = findings.filter(isDistance);
  const axis = linearAxis([0, ...rows.flatMap((f) => [1000 * f.actual!, 1000 * f.limit!])], 6);
  if (rows.length === 0 || axis === null) return <p className="quiet">No distance is judged for this design.</p>;
  const share = (m: number) => `${((100 * 1000 * m) / axis.domain[1]).toFixed(3)}%`;
  return (
    <>
      <p className="finding-sentence">{sentence(rows)}</p>
      <div className="distance-grid">
        {rows.map((f) => (
          <Row key={f.id} finding={f} share={share} onWhy={onWhy} />
        ))}
        <span />
        <span className="quiet small">offered</span>
        <span className="quiet small">required</span>
        <svg className="distance-axis" width="100%" height={22} role="img" aria-label="axis in millimetres">
          <line className="axis" x1="0" x2="100%" y1={2} y2={2} />
          {axis.ticks.map((tick, i) => (
            <text
              key={tick}
              x={share(tick / 1000)}
              y={17}
              textAnchor={i === 0 ? "start" : i === axis.ticks.length - 1 ? "end" : "middle"}
            >
              {i === axis.ticks.length - 1 ? `${axisText(tick)}\u2009mm` : axisText(tick)}
            </text>
          ))}
        </svg>
      </div>
    </>
  );
}

const isDistance = (f: Finding): boolean =>
  f.unit === "m" && f.sense === "atLeast" && f.actual !== null && f.limit !== null;

interface RowProps {
  readonly finding: Finding;
  readonly share: (m: number) => string;
  readonly onWhy: Props["onWhy"];
}

function Row({ finding, share, onWhy }: RowProps) {
  const { actual, limit, level, path, element } = finding;
  return (
    <>
      <span className="distance-name">
        <LevelMark level={level} word={false} /> {finding.what}
      </span>
      <Distance value_m={actual!} path={path} element={element ?? null} onWhy={onWhy} />
      <Distance value_m={limit!} path={requiredPaths[finding.id] ?? null} element={element ?? null} onWhy={onWhy} />
      <svg className={`distance-row level-${level}`} width="100%" height={22} aria-hidden="true">
        <rect x={0} y={6} width={share(actual!)} height={10} />
        <line x1={share(limit!)} x2={share(limit!)} y1={1} y2={21} />
      </svg>
    </>
  );
}

/** Where the required distance stands in the sheet; a finding's own path is that of the distance offered. */
const requiredPaths: Readonly<Record<string, string>> = {
  "clearance.column": "insulation.clearance_m",
  "creepage.column": "insulation.creepage_m",
  "creepage.element": "insulation.elementCreepage_m",
};

interface DistanceProps {
  readonly value_m: number;
  readonly path: string | null;
  readonly element: number | null;
  readonly onWhy: Props["onWhy"];
}

function Distance({ value_m, path, element, onWhy }: DistanceProps) {
  const text = figureText(value_m, "m");
  if (path === null) return <span className="number">{text}</span>;
  return (
    <button type="button" className="number-button" onClick={() => onWhy(path, element)}>
      {text}
    </button>
  );
}

function sentence(rows: readonly Finding[]): string {
  const short = rows.filter((f) => f.actual! < f.limit!);
  if (short.length === 0) return `All ${rows.length} distances are at least what is required.`;
  const worst = short.reduce((a, b) => (a.actual! / a.limit! < b.actual! / b.limit! ? a : b));
  return `Short: ${worst.what} offers ${figureText(worst.actual!, "m")} of ${figureText(worst.limit!, "m")} required${short.length > 1 ? `, and ${short.length - 1} more` : ""}.`;
}

import { useMemo, useState } from "react";
import type { Candidate } from "../../solver/index.ts";
import { type CandidateColumn, candidateColumns, type Order, sorted } from "./candidateColumns.ts";

interface Props {
  readonly candidates: readonly Candidate[];
  readonly chosen: Candidate | null;
  readonly onTake: (candidate: Candidate) => void;
}

const shownFirst = 12;

/** Every candidate with the figures it is judged on; sorted by any of them. */
export function CandidateTable({ candidates, chosen, onTake }: Props) {
  const [order, setOrder] = useState<Order>({ id: "rank", down: false });
  const [all, setAll] = useState(false);
  const inOrder = useMemo(() => sorted(candidates, order), [candidates, order]);
  const rows = all ? inOrder : inOrder.filter((c, i) => i < shownFirst || c === chosen);
  const press = (column: CandidateColumn) =>
    setOrder((now) =>
      now.id === column.id ? { id: now.id, down: !now.down } : { id: column.id, down: column.greaterFirst ?? false },
    );
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolled region must be reachable by keyboard
    <section className="sheet-scroll" tabIndex={0} aria-label="table of candidates">
      <table className="sheet-table candidates">
        <thead>
          <tr>
            <th scope="col">
              <span className="unseen">choose</span>
            </th>
            {candidateColumns.map((column) => (
              <th
                key={column.id}
                scope="col"
                className={column.number ? "number" : ""}
                aria-sort={order.id !== column.id ? "none" : order.down ? "descending" : "ascending"}
              >
                <button type="button" className="sort-button" title={column.title} onClick={() => press(column)}>
                  {column.head}
                  <span aria-hidden="true">{order.id !== column.id ? "" : order.down ? " ↓" : " ↑"}</span>
                </button>
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((candidate) => (
            <Row key={candidate.rank} candidate={candidate} chosen={candidate === chosen} onTake={onTake} />
          ))}
        </tbody>
      </table>
      {candidates.length <= shownFirst ? null : (
        <button type="button" className="quiet-button" aria-expanded={all} onClick={() => setAll(!all)}>
          {all ? `only the first ${shownFirst}` : `all ${candidates.length} candidates`}
        </button>
      )}
    </section>
  );
}

interface RowProps {
  readonly candidate: Candidate;
  readonly chosen: boolean;
  readonly onTake: (candidate: Candidate) => void;
}

function Row({ candidate, chosen, onTake }: RowProps) {
  const stops = candidate.stops.length;
  return (
    <tr className={chosen ? "chosen" : ""} aria-current={chosen ? "true" : undefined}>
      <td>
        {chosen ? (
          <span className="quiet">chosen</span>
        ) : (
          <button type="button" className="quiet-button" onClick={() => onTake(candidate)}>
            take<span className="unseen"> candidate {candidate.rank}</span>
          </button>
        )}
        {stops > 0 ? (
          <span className="stop-word" title={candidate.stops.join(", ")}>
            {` ${stops} stop${stops > 1 ? "s" : ""}`}
          </span>
        ) : null}
      </td>
      {candidateColumns.map((column) => (
        <td key={column.id} className={column.number ? "number" : column.id} title={titleOf(column, candidate)}>
          {column.show(candidate)}
        </td>
      ))}
    </tr>
  );
}

/** The whole text of a cell that may be cut. */
const titleOf = (column: CandidateColumn, candidate: Candidate): string | undefined =>
  column.number ? undefined : column.show(candidate);

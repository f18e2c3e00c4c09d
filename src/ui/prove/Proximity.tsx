import type { Proof, ProximityRow } from "../../solver/index.ts";
import { figureText, signed } from "../charts/axisText.ts";

interface Props {
  readonly proof: Proof;
  readonly onWhy: (path: string, element: number | null) => void;
}

const names: Readonly<Record<ProximityRow["what"], string>> = {
  wall: "an earthed wall",
  hand: "a hand",
  compound: "epoxy cast round it, to twice the diameter",
};
const paths: Readonly<Record<ProximityRow["what"], string | null>> = {
  wall: "proximity.wallReading",
  hand: "proximity.handReading",
  compound: null,
};

/** What stands near the column, and by how much it moves the reading of an edge; the distance to keep. */
export function Proximity({ proof, onWhy }: Props) {
  const finding = proof.findings.find(({ id }) => id === "keepOut.distance");
  return (
    <>
      {finding === undefined ? null : (
        <p className="finding-sentence">
          <strong>{`keep-out distance ${finding.actual === null ? "–" : figureText(finding.actual, "m")}`}</strong>{" "}
          {finding.reason}
        </p>
      )}
      <div className="scroll-x">
        <table className="sheet-table">
          <caption className="visually-hidden">What something near the column does to the reading of an edge</caption>
          <thead>
            <tr>
              <th scope="col">what stands near</th>
              <th scope="col">from the axis</th>
              <th scope="col">stray to earth</th>
              <th scope="col">reading of an edge</th>
            </tr>
          </thead>
          <tbody>
            {proof.proximity.map((row, i) => (
              <Row key={`${row.what}${row.distance_m}`} row={row} at={placeOf(proof.proximity, i)} onWhy={onWhy} />
            ))}
          </tbody>
        </table>
      </div>
      <p className="quiet small">At dc nothing of this changes the reading.</p>
    </>
  );
}

/** Place of a row among those of its kind: where its numbers stand in the lists of the sheet. */
const placeOf = (rows: readonly ProximityRow[], i: number): number =>
  rows.slice(0, i).filter(({ what }) => what === rows[i]!.what).length;

function Row({ row, at, onWhy }: { readonly row: ProximityRow; readonly at: number; readonly onWhy: Props["onWhy"] }) {
  const path = paths[row.what];
  const reading = percent(row.readingChange);
  return (
    <tr>
      <th scope="row">{names[row.what]}</th>
      <td>{row.distance_m === null ? "–" : figureText(row.distance_m, "m")}</td>
      <td>{percent(row.strayChange)}</td>
      <td>
        {path === null ? (
          reading
        ) : (
          <button type="button" className="number-button" onClick={() => onWhy(path, at + 1)}>
            {reading}
          </button>
        )}
      </td>
    </tr>
  );
}

const percent = (share: number | null): string => (share === null ? "–" : `${signed(100 * share)}\u2009%`);

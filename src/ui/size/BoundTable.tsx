import type { ResistanceWindow } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";

interface Props {
  readonly window: ResistanceWindow;
  readonly onWhy: (path: string) => void;
}

/** Every bound with its reason, those that do not apply included. */
export function BoundTable({ window, onWhy }: Props) {
  return (
    <details className="table-on-request">
      <summary>table: bounds and their reasons</summary>
      <table className="sheet-table">
        <thead>
          <tr>
            <th scope="col">bound</th>
            <th scope="col">R1</th>
            <th scope="col" className="number">
              value
            </th>
            <th scope="col">reason</th>
          </tr>
        </thead>
        <tbody>
          {window.bounds.map((bound) => (
            <tr key={bound.id}>
              <th scope="row">{bound.name}</th>
              <td>{bound.side === "atLeast" ? "at least" : "at most"}</td>
              <td className="number">
                {bound.resistance_ohm === null ? (
                  "–"
                ) : (
                  <button type="button" className="number-button" onClick={() => onWhy(bound.path)}>
                    {withUnit(bound.resistance_ohm, "ohm", 4)}
                  </button>
                )}
              </td>
              <td className="reason">{bound.reason}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  );
}

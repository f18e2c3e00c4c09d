import type { LostFamily, UnitName } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";

/** Families that gave no candidate, each with the number that ruled it out. */
export function LostFamilies({ lost }: { readonly lost: readonly LostFamily[] }) {
  if (lost.length === 0) return null;
  return (
    <details className="table-on-request">
      <summary>
        {lost.length} {lost.length === 1 ? "family" : "families"} ruled out, and why
      </summary>
      <table className="sheet-table">
        <thead>
          <tr>
            <th scope="col">family</th>
            <th scope="col" className="number">
              found
            </th>
            <th scope="col" className="number">
              limit
            </th>
            <th scope="col">reason</th>
          </tr>
        </thead>
        <tbody>
          {lost.map((each) => (
            <tr key={`${each.family} ${each.reason}`}>
              <th scope="row">{each.familyName}</th>
              <td className="number">{each.actual === null ? "–" : withUnit(each.actual, each.unit as UnitName, 3)}</td>
              <td className="number">{each.limit === null ? "–" : withUnit(each.limit, each.unit as UnitName, 3)}</td>
              <td className="reason">{each.reason}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  );
}

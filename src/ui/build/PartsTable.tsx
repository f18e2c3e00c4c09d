import type { PartsLine, PartsList } from "../../solver/index.ts";
import { percentText } from "../size/candidateText.ts";
import { designatorRuns } from "./designators.ts";

/** What to buy, place by place: designators, value, rating, how many with spares. */
export function PartsTable({ list }: { readonly list: PartsList }) {
  const places = [...new Set(list.lines.map((line) => line.place))];
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolled region must be reachable by keyboard
    <section className="sheet-scroll" tabIndex={0} aria-label="table of parts">
      <table className="sheet-table parts">
        <thead>
          <tr>
            <th scope="col">designators</th>
            <th scope="col">part</th>
            <th scope="col" className="number">
              value
            </th>
            <th scope="col" className="number">
              base unit
            </th>
            <th scope="col" className="number">
              tolerance
            </th>
            <th scope="col" className="number">
              fit
            </th>
            <th scope="col" className="number">
              spare
            </th>
            <th scope="col" className="number">
              buy
            </th>
            <th scope="col">note</th>
          </tr>
        </thead>
        {places.map((place) => (
          <tbody key={place}>
            <tr className="place">
              <th scope="rowgroup" colSpan={9}>
                {place}
              </th>
            </tr>
            {list.lines
              .filter((line) => line.place === place)
              .map((line) => (
                <Line key={line.designators.join(" ")} line={line} />
              ))}
          </tbody>
        ))}
        <tfoot>
          <tr>
            <th scope="row" colSpan={5}>
              in all
            </th>
            <td className="number">{list.total}</td>
            <td className="number">{list.buy - list.total}</td>
            <td className="number">{list.buy}</td>
            <td />
          </tr>
        </tfoot>
      </table>
    </section>
  );
}

function Line({ line }: { readonly line: PartsLine }) {
  return (
    <tr>
      <th scope="row" className="designators" title={line.designators.join(" ")}>
        {designatorRuns(line.designators)}
      </th>
      <td>
        {line.name}
        {line.rating === "" ? null : <span className="rating">{line.rating}</span>}
      </td>
      <td className="number">{line.valueText === "" ? "–" : line.valueText}</td>
      <td className="number quiet">
        {line.value === null ? "–" : `${baseText(line.value)}\u2009${line.unit === "ohm" ? "Ω" : line.unit}`}
      </td>
      <td className="number">{line.tolerance === null ? "–" : `±${percentText(line.tolerance)}`}</td>
      <td className="number">{line.quantity}</td>
      <td className="number">{line.spares}</td>
      <td className="number buy">{line.buy}</td>
      <td className="reason">{line.note}</td>
    </tr>
  );
}

/** The value in its base unit, as the data file holds it but short: 1e7 ohm, 2.4e-10 F. */
function baseText(value: number): string {
  const size = Math.abs(value);
  if (value !== 0 && (size >= 1e7 || size < 1e-3))
    return value.toExponential().replace("-", "\u2212").replace("e+", "e");
  return String(value).replace("-", "\u2212");
}

import type { InstrumentRow } from "../../solver/index.ts";
import { signed, withUnit } from "../charts/axisText.ts";

/** Every instrument on this one LV arm: its own scale factor, and the error when another's is used. */
export function InstrumentTable({ rows }: { readonly rows: readonly InstrumentRow[] }) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolled region must be reachable by keyboard
    <section className="sheet-scroll" tabIndex={0} aria-label="table of instruments">
      <table className="sheet-table">
        <thead>
          <tr>
            <th scope="col">instrument</th>
            <th scope="col" className="number">
              scale factor
            </th>
            <th scope="col" className="number">
              reads at working voltage
            </th>
            <th scope="col" className="number">
              greatest peak
            </th>
            <th scope="col" className="number">
              may see
            </th>
            <th scope="col" className="number">
              error if the principal's is used
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.id}>
              <th scope="row">
                {row.name}
                {row.principal ? <span className="quiet"> · principal</span> : null}
              </th>
              <td className="number">{withUnit(row.scaleFactor, "1", 6)}</td>
              <td className="number">{withUnit(row.readingAtWorking_V, "V")}</td>
              <td className="number">{withUnit(row.readingAtGreatest_Vpeak, "V")}</td>
              <td className="number">{withUnit(row.greatestInput_Vpeak, "V", 3)}</td>
              <td className={Math.abs(row.errorIfReused) > 0.005 ? "number warns" : "number"}>
                {row.principal ? "–" : `${signed(100 * row.errorIfReused)}\u2009%`}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

import type { Cure, Graded, GradedRow } from "../../solver/index.ts";
import { figureText, signed } from "../charts/axisText.ts";

interface Props {
  readonly graded: Graded;
  readonly onCure: (cure: Cure) => void;
}

/** Capacitors that share an edge as the resistors share dc: along the string, and what each choice costs. */
export function GradedTable({ graded, onCure }: Props) {
  const { cure } = graded;
  return (
    <>
      <p className="finding-sentence">{graded.sentence}</p>
      <Bars graded={graded} />
      {/* biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolled region must be reachable by keyboard */}
      <section className="sheet-scroll" tabIndex={0} aria-label="table of graded capacitors">
        <table className="sheet-table">
          <thead>
            <tr>
              <th scope="col">capacitors</th>
              <th scope="col" className="number">
                LV capacitance, edge equal to dc
              </th>
              <th scope="col" className="number">
                over the band
              </th>
              <th scope="col" className="number">
                response time
              </th>
              <th scope="col" className="number">
                hardest element, over its even share
              </th>
            </tr>
          </thead>
          <tbody>
            {graded.rows.map((row) => (
              <Row key={row.what} row={row} />
            ))}
          </tbody>
        </table>
      </section>
      {cure === null ? null : (
        <button type="button" className="cure-button" onClick={() => onCure(cure)}>
          {cure.label}
        </button>
      )}
    </>
  );
}

function Row({ row }: { readonly row: GradedRow }) {
  const { lvCapacitance_F, bandDeviation_dB, responseTime_s } = row;
  return (
    <tr>
      <th scope="row">{row.what}</th>
      <td className="number">{lvCapacitance_F === null ? "–" : figureText(lvCapacitance_F, "F", 4)}</td>
      <td className="number">{bandDeviation_dB === null ? "–" : `${signed(bandDeviation_dB)}\u2009dB`}</td>
      <td className="number">{responseTime_s === null ? "–" : figureText(responseTime_s, "s")}</td>
      <td className="number">{`${signed(100 * (row.greatestShare - 1))}\u2009%`}</td>
    </tr>
  );
}

const height = 70;

/** One bar an element, next to the tap first: open what is ideal, filled what is sold. */
function Bars({ graded }: { readonly graded: Graded }) {
  const { ideal_F, bought_F } = graded;
  const most = Math.max(...[...ideal_F, ...bought_F].map((C) => C ?? 0));
  if (most === 0) return null;
  const step = 100 / ideal_F.length;
  const bar = (C: number | null) => ((C ?? 0) / most) * (height - 4);
  return (
    <figure className="graded-bars">
      <svg
        width="100%"
        height={height}
        role="img"
        aria-label={`capacitor of each element from the tap up, to ${figureText(most, "F")}`}
      >
        {ideal_F.map((C, i) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: an element is its place
          <g key={i}>
            <rect
              className="graded-bought"
              x={`${i * step + step * 0.2}%`}
              width={`${step * 0.6}%`}
              y={height - bar(bought_F[i]!)}
              height={bar(bought_F[i]!)}
            />
            <rect
              className="graded-ideal"
              x={`${i * step + step * 0.1}%`}
              width={`${step * 0.8}%`}
              y={height - bar(C)}
              height={bar(C)}
            />
          </g>
        ))}
      </svg>
      <figcaption className="quiet small">
        {`from the tap (left) to the electrode, greatest ${figureText(most, "F")}; outlined: exact, filled: the nearest sold`}
      </figcaption>
    </figure>
  );
}

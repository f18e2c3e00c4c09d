import { formatShare, type InstrumentSpeed } from "../../solver/index.ts";
import { figureText, withUnit } from "../charts/axisText.ts";

interface Props {
  readonly rows: readonly InstrumentSpeed[];
  readonly wantedUncertainty: number;
}

const heads = [
  "scale factor",
  "LV capacitance wanted",
  "fitted",
  "error at an edge",
  "−3\u2009dB with cable",
  "rise",
  "within 1\u2009% after",
  "own −3\u2009dB",
  "edge as seen",
] as const;

/** Each instrument with its cable on this one LV arm: what it would want, and what it gets. */
export function InstrumentSpeedTable({ rows, wantedUncertainty }: Props) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolled region must be reachable by keyboard
    <section className="sheet-scroll" tabIndex={0} aria-label="table of instruments and speed">
      <table className="sheet-table">
        <thead>
          <tr>
            <th scope="col">instrument</th>
            {heads.map((head) => (
              <th key={head} scope="col" className="number">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.id} className={row.principal ? "chosen" : ""}>
              <th scope="row">
                {row.name}
                {row.principal ? <span className="quiet"> · principal</span> : null}
              </th>
              <td className="number">{withUnit(row.scaleFactor, "1", 6)}</td>
              <td className="number">{row.lvWanted_F === null ? "none does" : figureText(row.lvWanted_F, "F", 4)}</td>
              <td className="number">{row.lvFitted_F === 0 ? "none" : figureText(row.lvFitted_F, "F", 4)}</td>
              <td className={Math.abs(row.edgeError ?? 0) > wantedUncertainty ? "number warns" : "number"}>
                {row.edgeError === null ? "–" : share(row.edgeError)}
              </td>
              <td className="number">{row.bandwidth_Hz === null ? "none" : figureText(row.bandwidth_Hz, "Hz")}</td>
              <td className="number">{row.riseTime_s === null ? "–" : figureText(row.riseTime_s, "s")}</td>
              <td className="number">{row.settlingTime_s === null ? "never" : figureText(row.settlingTime_s, "s")}</td>
              <td className="number">
                {row.ownBandwidth_Hz === null ? "dc only" : figureText(row.ownBandwidth_Hz, "Hz")}
              </td>
              <td className="number">{row.seenRise_s === null ? "–" : figureText(row.seenRise_s, "s")}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

const share = (value: number): string => `${value > 0 ? "+" : ""}${formatShare(value, 2)}`;

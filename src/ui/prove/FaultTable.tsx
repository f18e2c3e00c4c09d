import type { FaultRow } from "../../solver/index.ts";
import { figureText } from "../charts/axisText.ts";
import { faultMark } from "./faultMarks.ts";
import { LevelMark } from "./LevelMark.tsx";

interface Props {
  readonly rows: readonly FaultRow[];
  /** The most that the instrument may see. */
  readonly greatestInput_Vpeak: number;
  readonly wantedUncertainty: number;
}

/** Each single fault with what the instrument sees at dc and at the instant of an edge, side by side. */
export function FaultTable({ rows, greatestInput_Vpeak, wantedUncertainty }: Props) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolled region must be reachable by keyboard
    <section className="sheet-scroll" tabIndex={0} aria-label="table of faults">
      <table className="sheet-table faults">
        <thead>
          <tr>
            <th scope="col">level</th>
            <th scope="col">one fault</th>
            <th scope="col" className="number">
              at dc
            </th>
            <th scope="col" className="number">
              on an edge
            </th>
            <th scope="col" className="number">
              of normal reading
            </th>
            <th scope="col" className="number">
              hardest element
            </th>
            <th scope="col">what it does</th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <Row key={row.id} row={row} limit={greatestInput_Vpeak} wanted={wantedUncertainty} />
          ))}
        </tbody>
      </table>
    </section>
  );
}

interface RowProps {
  readonly row: FaultRow;
  readonly limit: number;
  readonly wanted: number;
}

function Row({ row, limit, wanted }: RowProps) {
  const mark = faultMark(row, wanted);
  const volts = (value: number) => (
    <td className={Math.abs(value) > limit && row.id !== "unplugged" ? "number past" : "number"}>
      {figureText(value, "V")}
    </td>
  );
  return (
    <tr>
      <td>
        <LevelMark level={row.level} />
      </td>
      <th scope="row">
        {row.name}
        {row.single ? null : <span className="quiet"> · more than one part</span>}
      </th>
      {volts(row.output_V)}
      {volts(row.fastOutput_V)}
      <td className="number">{`${Number((100 * row.outputShare).toPrecision(3))}\u2009%`}</td>
      <td className="number">{figureText(row.greatestElementVoltage_V, "V")}</td>
      <td className="reason">
        {mark === null ? null : <strong className={mark === "silent" ? "mark" : "mark zero"}>{mark}</strong>}
        {mark !== null && told(row) === `${mark}.` ? null : `${mark === null ? "" : " · "}${told(row)}`}
      </td>
    </tr>
  );
}

/** The sentence without the name and numbers that already stand in the row. */
function told({ sentence, name }: FaultRow): string {
  const rest = sentence.startsWith(`${name}:`) ? sentence.slice(name.length + 1) : sentence;
  const verdict = rest.split(";").pop()?.trim();
  return verdict === undefined || verdict === "" ? sentence : verdict;
}

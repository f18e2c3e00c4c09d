import { type FromSource, figures, type SheetData } from "../../solver/index.ts";
import { figureText } from "../frame/figureText.ts";
import { sheetNumber } from "../size/sheetNumber.ts";

const shown = [
  "response.riseTime_s",
  "response.responseTime_s",
  "response.partialResponseTime_s",
  "response.residualSettlingTime_s",
  "response.settlingTime_s",
  "response.overshoot",
  "response.bandwidth_Hz",
  "response.droop",
] as const;

interface Props {
  readonly sheet: SheetData;
  readonly source: FromSource | null;
  readonly onWhy: (path: string, element: number | null) => void;
}

/** The figures of IEC 60060-2 of an ideal step at the electrode, and beside them of one at the source. */
export function StepFigures({ sheet, source, onWhy }: Props) {
  const rows = shown.filter((path) => sheet.values[path] !== undefined);
  return (
    <table className="sheet-table step-figures">
      <thead>
        <tr>
          <th scope="col">of an ideal step</th>
          <th scope="col" className="number">
            at the electrode
          </th>
          {source === null ? null : (
            <th scope="col" className="number">
              from the source
            </th>
          )}
        </tr>
      </thead>
      <tbody>
        {rows.map((path) => (
          <tr key={path}>
            <th scope="row">{figures[path]}</th>
            <td className="number">
              <button type="button" className="number-button" onClick={() => onWhy(path, null)}>
                {figureText(path, sheetNumber(sheet, path))}
              </button>
            </td>
            {source === null ? null : <td className="number">{ofSource(source, path)}</td>}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function ofSource(source: FromSource, path: string): string {
  const key = path.replace("response.", "");
  if (!(key in source)) return "–";
  return figureText(path, source[key as "riseTime_s"]);
}

import type { LvArm, SheetData, UnitName } from "../../solver/index.ts";
import { signed, withUnit } from "../charts/axisText.ts";
import { percentText } from "./candidateText.ts";
import { sheetNumber } from "./sheetNumber.ts";

interface Props {
  readonly sheet: SheetData;
  readonly onWhy: (path: string) => void;
}

interface NumberProps extends Props {
  readonly path: string;
  readonly unit: UnitName | "%";
  readonly digits?: number;
}

/** A number of the sheet; pressed, it opens its why. */
export function SheetFigure({ sheet, path, unit, onWhy, digits = 4 }: NumberProps) {
  const value = sheetNumber(sheet, path);
  if (value === null) return <span title="no such value for this design">–</span>;
  return (
    <button type="button" className="number-button" onClick={() => onWhy(path)}>
      {unit === "%" ? percentText(value, digits) : withUnit(value, unit, digits)}
    </button>
  );
}

/** LV resistance that the wanted scale factor asks for, and what the fitted parts make of it. */
export function Exactness({ sheet, onWhy }: Props) {
  const wanted = sheetNumber(sheet, "lvArm.wanted_ohm");
  const fitted = sheetNumber(sheet, "lvArm.fitted_ohm");
  const off = wanted === null || fitted === null ? null : fitted / wanted - 1;
  return (
    <table className="sheet-table exactness">
      <tbody>
        <tr>
          <th scope="row">exact, for the wanted scale factor</th>
          <td className="number">
            <SheetFigure sheet={sheet} path="lvArm.wanted_ohm" unit="ohm" onWhy={onWhy} digits={6} />
          </td>
          <td />
        </tr>
        <tr>
          <th scope="row">fitted</th>
          <td className="number">
            <SheetFigure sheet={sheet} path="lvArm.fitted_ohm" unit="ohm" onWhy={onWhy} digits={6} />
          </td>
          <td className="quiet">
            {off === null
              ? ""
              : Math.abs(off) < 1e-9
                ? "exactly that"
                : `${signed(100 * off)}\u2009% off the exact value`}
          </td>
        </tr>
        <tr>
          <th scope="row">with the instrument in parallel</th>
          <td className="number">
            <SheetFigure sheet={sheet} path="lvArm.withInstrument_ohm" unit="ohm" onWhy={onWhy} digits={6} />
          </td>
          <td />
        </tr>
        <tr>
          <th scope="row">scale factor, predicted</th>
          <td className="number">
            <SheetFigure sheet={sheet} path="scaleFactor.predicted" unit="1" onWhy={onWhy} digits={6} />
          </td>
          <td className="quiet">
            <SheetFigure sheet={sheet} path="scaleFactor.deviation" unit="%" onWhy={onWhy} digits={3} /> off the wanted
            one
          </td>
        </tr>
      </tbody>
    </table>
  );
}

const matches = [
  {
    by: "highFrequency",
    path: "lvArm.capacitanceHighFrequency_F",
    name: "edge equal to dc",
    costs: "The edge is right; between the two time scales the response may lie off.",
  },
  {
    by: "flattest",
    path: "lvArm.capacitanceFlattest_F",
    name: "flattest over the band",
    costs: "The smallest greatest deviation over the band; dc is right, the edge gives a little.",
  },
  {
    by: "responseTime",
    path: "lvArm.capacitanceResponseTime_F",
    name: "zero response time",
    costs: "Errors before and after cancel in the mean; edge and band each give a little.",
  },
] as const;

/** The three matches of the LV capacitance side by side, what is fitted, and what each gives up. */
export function CapacitanceChoice({ sheet, lvArm, onWhy }: Props & { readonly lvArm: LvArm }) {
  const fitted = sheetNumber(sheet, "lvArm.capacitanceFitted_F");
  return (
    <table className="sheet-table matches">
      <thead>
        <tr>
          <th scope="col">match</th>
          <th scope="col" className="number">
            to fit
          </th>
          <th scope="col" className="number">
            fitted is
          </th>
          <th scope="col" className="number">
            at the edge
          </th>
          <th scope="col" className="number">
            over the band
          </th>
          <th scope="col" className="number">
            response time
          </th>
          <th scope="col">what it costs</th>
        </tr>
      </thead>
      <tbody>
        {matches.map(({ by, path, name, costs }) => {
          const value = sheetNumber(sheet, path);
          const off = value === null || fitted === null || value === 0 ? null : fitted / value - 1;
          return (
            <tr key={by} className={lvArm.capacitanceBy === by ? "chosen" : ""}>
              <th scope="row">
                {name}
                {lvArm.capacitanceBy === by ? <span className="quiet"> · chosen</span> : null}
              </th>
              <td className="number">
                <SheetFigure sheet={sheet} path={path} unit="F" onWhy={onWhy} />
              </td>
              <td className="number">{off === null ? "–" : `${signed(100 * off)}\u2009%`}</td>
              <td className="number">
                <SheetFigure sheet={sheet} path={`match.${by}.edgeError`} unit="%" digits={3} onWhy={onWhy} />
              </td>
              <td className="number">
                <SheetFigure sheet={sheet} path={`match.${by}.bandDeviation_dB`} unit="dB" digits={2} onWhy={onWhy} />
              </td>
              <td className="number">
                <SheetFigure sheet={sheet} path={`match.${by}.responseTime_s`} unit="s" digits={3} onWhy={onWhy} />
              </td>
              <td className="reason">{costs}</td>
            </tr>
          );
        })}
        <tr>
          <th scope="row">fitted, cable and instrument not counted</th>
          <td className="number">
            <SheetFigure sheet={sheet} path="lvArm.capacitanceFitted_F" unit="F" onWhy={onWhy} />
          </td>
          <td />
          <td />
          <td />
          <td />
          <td className="reason" />
        </tr>
      </tbody>
    </table>
  );
}

import { lvShares, type SheetData } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";
import { SheetFigure } from "./Exactness.tsx";
import { sheetNumber } from "./sheetNumber.ts";

interface Props {
  readonly sheet: SheetData;
  readonly onWhy: (path: string) => void;
}

/** What the LV capacitance is made of: one bar, each share named with its value. */
export function LvShareBar({ sheet, onWhy }: Props) {
  const shares = lvShares.flatMap(([path, name], hue) => {
    const value = sheetNumber(sheet, path);
    return value === null || value === 0 ? [] : [{ path, name, value, hue: hue + 1 }];
  });
  const total = shares.reduce((sum, share) => sum + share.value, 0);
  if (total === 0) return null;
  let before = 0;
  return (
    <>
      <p className="finding-sentence">{sentence(shares, total)}</p>
      <svg className="share-bar" width="100%" height={18} aria-hidden="true">
        {shares.map((share) => {
          const from = before;
          before += share.value / total;
          return (
            <rect
              key={share.path}
              className={`share-${share.hue}`}
              x={`${(100 * from).toFixed(3)}%`}
              width={`${Math.max(0.15, (100 * share.value) / total).toFixed(3)}%`}
              y={0}
              height={18}
            />
          );
        })}
      </svg>
      <ul className="share-names">
        {shares.map((share) => (
          <li key={share.path}>
            <svg width={12} height={12} aria-hidden="true">
              <rect className={`share-${share.hue}`} width={12} height={12} />
            </svg>{" "}
            {share.name} <SheetFigure sheet={sheet} path={share.path} unit="F" onWhy={onWhy} digits={3} />
          </li>
        ))}
        <li>
          in all <SheetFigure sheet={sheet} path="lvArm.capacitanceTotal_F" unit="F" onWhy={onWhy} digits={5} />
        </li>
      </ul>
    </>
  );
}

interface Share {
  readonly path: string;
  readonly name: string;
  readonly value: number;
}

/** How much of it hangs on what is plugged in. */
function sentence(shares: readonly Share[], total: number): string {
  const outside = shares
    .filter((share) => share.path === "lvArm.share.cable_F" || share.path === "lvArm.share.instrument_F")
    .reduce((sum, share) => sum + share.value, 0);
  const percent = (100 * outside) / total;
  const share = percent < 0.1 ? "less than 0.1" : String(Number(percent.toPrecision(2)));
  return outside === 0
    ? `${withUnit(total, "F")} from tap to earth, none of it in cable or instrument.`
    : `${withUnit(total, "F")} from tap to earth; ${share}\u2009% of it is cable and instrument, and changes with them.`;
}

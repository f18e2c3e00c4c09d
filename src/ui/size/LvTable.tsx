import type { Design, LvBranch, Part } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";
import { percentText } from "./candidateText.ts";

interface Row {
  readonly key: string;
  readonly branch: string;
  readonly part: string;
  readonly value: string;
  readonly note: string;
}

/** The branches of the LV arm, part by part. */
export function LvTable({ design, parts }: { readonly design: Design; readonly parts: readonly Part[] }) {
  const byId = new Map(parts.map((part) => [part.id, part]));
  const rows = design.lvArm.branches.flatMap((branch) => rowsOf(branch));
  return (
    <table className="sheet-table">
      <thead>
        <tr>
          <th scope="col">branch</th>
          <th scope="col" className="number">
            value
          </th>
          <th scope="col" className="number">
            tolerance
          </th>
          <th scope="col">part</th>
          <th scope="col">note</th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => {
          const part = byId.get(row.part);
          return (
            <tr key={row.key}>
              <th scope="row">{row.branch}</th>
              <td className="number">{row.value}</td>
              <td className="number">{part === undefined ? "–" : `±${percentText(part.tolerance)}`}</td>
              <td>{part?.name ?? row.part}</td>
              <td className="quiet">{row.note}</td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}

function rowsOf(branch: LvBranch): readonly Row[] {
  const key = branch.name;
  if ("series" in branch) {
    return branch.series.map((item, i): Row => {
      const note = branch.series.length > 1 ? "in series within the branch" : "";
      const common = { key: `${key} ${i}`, branch: key, part: item.part };
      if ("resistance_ohm" in item) return { ...common, value: withUnit(item.resistance_ohm, "ohm", 4), note };
      const { least_ohm, greatest_ohm, setting } = item.rheostat;
      const set = withUnit(least_ohm + setting * (greatest_ohm - least_ohm), "ohm", 3);
      return { ...common, value: `to ${withUnit(greatest_ohm, "ohm", 3)}`, note: `rheostat, drawn at ${set}` };
    });
  }
  const common = { key, branch: branch.name, part: branch.part };
  if ("trimmer" in branch) {
    const { least_F, greatest_F, setting } = branch.trimmer;
    const set = withUnit(least_F + setting * (greatest_F - least_F), "F", 3);
    return [
      {
        ...common,
        value: `${withUnit(least_F, "F", 2)} … ${withUnit(greatest_F, "F", 2)}`,
        note: `trimmer, drawn at ${set}`,
      },
    ];
  }
  const note = "link" in branch ? `link (select-on-test capacitor), ${branch.fitted ? "fitted" : "left open"}` : "";
  return [{ ...common, value: withUnit(branch.capacitance_F, "F", 3), note }];
}

import { useId, useMemo, useState } from "react";
import type { Part } from "../../solver/index.ts";
import { download } from "../charts/download.ts";
import type { AddedFamily } from "./draftFamily.ts";
import { emptyFamilyFile, type FamilyRow, readFamilyRows } from "./familyRows.ts";

interface Props {
  readonly parts: readonly Part[];
  readonly onAdd: (added: readonly AddedFamily[]) => string | null;
}

/** Families from a CSV file: every row is shown as it would be taken before any is. */
export function ImportFamilies({ parts, onAdd }: Props) {
  const [text, setText] = useState("");
  const [said, setSaid] = useState<string | null>(null);
  const id = useId();
  const read = useMemo(() => (text.trim() === "" ? null : readFamilyRows(text, parts)), [text, parts]);
  const good = read?.rows.flatMap(({ part, assumed }) => (part === null ? [] : [{ part, assumed }])) ?? [];
  const take = () => {
    const fault = onAdd(good);
    setSaid(fault ?? `${good.length} added.`);
    if (fault === null) setText("");
  };
  return (
    <div className="family-form">
      <p className="family-add">
        <label htmlFor={id}>CSV file, one family a row</label>
        <input
          id={id}
          type="file"
          accept=".csv,text/csv,text/plain"
          onChange={async (event) => {
            const file = event.target.files?.[0];
            setSaid(null);
            setText(file === undefined ? "" : await file.text());
          }}
        />
        <button
          type="button"
          className="quiet-button"
          onClick={() => download("own-families.csv", emptyFamilyFile, "text/csv;charset=utf-8")}
        >
          empty file with the columns
        </button>
      </p>
      <p className="quiet">A bare number is in the unit of its column; 10M, 3.5 kV or 6.5 mm are read as written.</p>
      {said === null ? null : <p role="status">{said}</p>}
      {read === null ? null : read.refused !== null ? (
        <p className="field-fault">{read.refused}</p>
      ) : (
        <>
          <Preview rows={read.rows} />
          {read.unread.length === 0 ? null : (
            <p className="quiet">{`Columns left unread: ${read.unread.join(", ")}.`}</p>
          )}
          <p className="family-add">
            <button type="button" className="cure-button" disabled={good.length === 0} onClick={take}>
              {`add ${good.length} of ${read.rows.length}`}
            </button>
          </p>
        </>
      )}
    </div>
  );
}

function Preview({ rows }: { readonly rows: readonly FamilyRow[] }) {
  return (
    <table className="sheet-table import-preview">
      <thead>
        <tr>
          <th scope="col" className="number">
            row
          </th>
          <th scope="col">family</th>
          <th scope="col">what becomes of it</th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.row} className={row.part === null ? "refused" : ""}>
            <td className="number">{row.row}</td>
            <th scope="row">{row.name === "" ? "–" : row.name}</th>
            <td>{row.part === null ? <span className="field-fault">{row.faults.join(" ")}</span> : taken(row)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

const taken = (row: FamilyRow): string =>
  row.assumed.length === 0 ? "added as it stands" : `added; ${row.assumed.length} stand-ins marked assumed`;

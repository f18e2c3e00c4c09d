import { useState } from "react";
import { plainText } from "./axisText.ts";
import type { Column } from "./columns.ts";

const most = 120;

/** The numbers behind a picture, on request. A long table shows every so many-th row; the data file has them all. */
export function ChartTable({ title, columns }: { readonly title: string; readonly columns: readonly Column[] }) {
  const [open, setOpen] = useState(false);
  const length = Math.max(0, ...columns.map((column) => column.values.length));
  const every = Math.ceil(length / most);
  const rows = open ? Array.from({ length: Math.ceil(length / every) }, (_, i) => i * every) : [];
  return (
    <details className="chart-table" onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary>table: {title}</summary>
      {open ? (
        // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolled region must be reachable by keyboard
        <section className="table-scroll" tabIndex={0} aria-label={`table: ${title}`}>
          <table>
            {every > 1 ? (
              <caption>
                every {every}th of {length} rows; the data file has all
              </caption>
            ) : null}
            <thead>
              <tr>
                {columns.map((column) => (
                  <th key={column.key} scope="col">
                    {column.head}
                  </th>
                ))}
              </tr>
            </thead>
            <tbody>
              {rows.map((row) => (
                <tr key={row}>
                  {columns.map((column) => (
                    <td key={column.key}>{cellText(column.values[row])}</td>
                  ))}
                </tr>
              ))}
            </tbody>
          </table>
        </section>
      ) : null}
    </details>
  );
}

function cellText(value: number | string | null | undefined): string {
  if (value === null || value === undefined) return "–";
  if (typeof value === "string") return value;
  if (!Number.isFinite(value)) return "–";
  const size = Math.abs(value);
  if (value !== 0 && (size >= 1e5 || size < 1e-3))
    return value.toExponential(3).replace("-", "\u2212").replace("e+", "e");
  return plainText(Number(value.toPrecision(5)));
}

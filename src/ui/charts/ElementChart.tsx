import { useDeferredValue, useMemo, useState } from "react";
import type { UnitName } from "../../solver/index.ts";
import { withUnit } from "./axisText.ts";
import { BarPanel } from "./BarPanel.tsx";
import { ChartFrame } from "./ChartFrame.tsx";
import { Choice } from "./Choice.tsx";
import type { Column } from "./columns.ts";
import { elementBars, elementSentence } from "./elementBars.ts";
import { useCursor } from "./useCursor.ts";

/** One basis that an element is judged on: dc, rms, peak, step sharing … with its own limit. */
export interface ElementBasis {
  readonly id: string;
  readonly name: string;
  /** One number per element, tap first. */
  readonly values: readonly (number | null)[];
  readonly limits: readonly (number | null)[];
  /** The ratings that the limits are derated from; empty: not stated. */
  readonly rated: readonly (number | null)[];
}

interface Props {
  readonly title: string;
  /** "voltage", "dissipation". */
  readonly quantity: string;
  readonly unit: "V" | "W";
  readonly bases: readonly ElementBasis[];
  readonly file: string;
}

const height = 230;

/** Each element's voltage or dissipation against its derated limit, on one basis at a time. */
export function ElementChart(p: Props) {
  const bases = useDeferredValue(p.bases);
  const [wanted, setBasis] = useState(bases[0]?.id ?? "");
  const basis = bases.find((b) => b.id === wanted) ?? bases[0];
  const bars = useMemo(() => elementBars(basis?.values ?? [], basis?.limits ?? [], basis?.rated), [basis]);
  const cursor = useCursor(bars.rows.length);
  const columns = useMemo(() => columnsOf(bases, p.quantity, p.unit), [bases, p.quantity, p.unit]);
  const chosen = cursor.index === null ? null : (bars.element[cursor.index] ?? null);
  const cursorRow = useMemo(() => ({ ...cursor, index: chosen === null ? null : chosen - 1 }), [cursor, chosen]);
  if (basis === undefined) return null;
  const options = bases.map((b) => [b.id, b.name] as const);
  return (
    <ChartFrame
      title={p.title}
      sentence={elementSentence(`${p.quantity}, ${basis.name}`, p.unit, basis.values, basis.limits, basis.rated)}
      file={p.file}
      note={noteOf(bars.run, bars.left)}
      controls={
        bases.length > 1 ? <Choice label="basis" options={options} value={basis.id} onChange={setBasis} /> : null
      }
      columns={columns}
      cursor={{ ...cursorRow, onKeyDown: cursor.onKeyDown, count: cursor.count }}
      readout={chosen === null ? null : readoutAt(basis, chosen, p.unit)}
      height={height}
    >
      {(width) => (
        <BarPanel
          width={width}
          height={height}
          bars={bars}
          cursor={cursor}
          yName={`${p.quantity} / ${p.unit}`}
          unit={p.unit}
        />
      )}
    </ChartFrame>
  );
}

function noteOf(run: number, left: number): string | null {
  const said: string[] = [];
  if (run > 1) said.push(`Each bar is the hardest used of ${run} neighbours.`);
  if (left > 0) said.push(`${left} elements have no value.`);
  return said.length === 0 ? null : said.join(" ");
}

function readoutAt(basis: ElementBasis, element: number, unit: UnitName): string {
  const value = basis.values[element - 1] ?? null;
  const limit = basis.limits[element - 1] ?? null;
  const text = value === null ? "no value" : withUnit(value, unit);
  return `element ${element}, ${basis.name}: ${text}${limit === null ? "" : ` of ${withUnit(limit, unit)} derated`}`;
}

function columnsOf(bases: readonly ElementBasis[], quantity: string, unit: string): readonly Column[] {
  const count = Math.max(0, ...bases.map((b) => b.values.length));
  const number = Array.from({ length: count }, (_, i) => i + 1);
  return [
    { key: "element", head: "element", values: number },
    ...bases.flatMap((b): Column[] => [
      { key: `${quantity}_${b.id}_${unit}`, head: `${b.name} / ${unit}`, values: b.values },
      { key: `limit_${b.id}_${unit}`, head: `limit ${b.name} / ${unit}`, values: b.limits },
    ]),
  ];
}

import { useMemo } from "react";
import {
  cautions,
  type DividerDocument,
  type PartsList,
  type Proof,
  partsList,
  partsListCsv,
} from "../../solver/index.ts";
import { download } from "../charts/download.ts";
import { Cautions } from "../prove/Cautions.tsx";
import { PartsTable } from "./PartsTable.tsx";
import { spreadsheetLocale } from "./spreadsheetLocale.ts";
import "../size/size.css";
import "../prove/prove.css";
import "./build.css";

interface Props {
  readonly document: DividerDocument;
  readonly proof: Proof | null;
}

/** What to buy: the parts list with its two files, under the cautions; stops that stand are named first. */
export function BuildSheet({ document, proof }: Props) {
  const list = useMemo(() => partsList(document), [document]);
  return (
    <>
      <Cautions cautions={cautions} screen="build" />
      <section className="sheet-section" aria-labelledby="parts-heading">
        <h2 id="parts-heading">parts list</h2>
        {list.ok ? <Listed list={list.value} name={document.name} proof={proof} /> : <Refused {...list.error} />}
      </section>
    </>
  );
}

function Refused({ why, cure }: { readonly why: string; readonly cure: string }) {
  return (
    <p className="no-window" role="status">
      <strong>{why}</strong> {cure}
    </p>
  );
}

interface ListedProps {
  readonly list: PartsList;
  readonly name: string;
  readonly proof: Proof | null;
}

function Listed({ list, name, proof }: ListedProps) {
  const locale = useMemo(() => spreadsheetLocale(navigator.language), []);
  const file = fileName(name);
  const csv = "text/csv;charset=utf-8";
  const stops = proof?.findings.filter((f) => f.level === "stop") ?? [];
  return (
    <>
      <p className="finding-sentence">
        {`${list.total} parts in ${list.lines.length} lines; ${list.buy} to buy with spares.`}
      </p>
      {stops.length === 0 ? null : (
        <p className="no-window">
          <strong>{`${stops.length} stop${stops.length > 1 ? "s" : ""} stand${stops.length > 1 ? "" : "s"}:`}</strong>{" "}
          {stops.map((f) => f.what).join("; ")}. Clear them before buying.
        </p>
      )}
      <p className="downloads">
        <button
          type="button"
          className="cure-button"
          onClick={() => download(`${file}-parts.csv`, partsListCsv(list, "data"), csv)}
        >
          CSV, data
        </button>
        <span className="quiet">comma, decimal point, base units</span>
        <button
          type="button"
          className="cure-button"
          onClick={() => download(`${file}-parts-spreadsheet.csv`, partsListCsv(list, "spreadsheet", locale), csv)}
        >
          CSV, spreadsheet
        </button>
        <span className="quiet">
          {`opens as a table here: ${locale.separator === ";" ? "semicolon" : "comma"} between cells, decimal ${locale.decimalMark === "," ? "comma" : "point"}`}
        </span>
      </p>
      <PartsTable list={list} />
    </>
  );
}

/** A file name from the design's name: letters, digits and hyphens. */
export function fileName(name: string): string {
  const plain = name
    .normalize("NFKD")
    .replace(/[^\p{L}\p{N}]+/gu, "-")
    .replace(/^-+|-+$/g, "")
    .toLowerCase();
  return plain === "" ? "divider" : plain.slice(0, 60);
}

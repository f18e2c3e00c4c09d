import { type ChangeEvent, useEffect, useId, useRef, useState } from "react";
import { type RecordedWaveform as Recorded, readWaveformCsv } from "../../file/waveformCsv.ts";
import type { Refusal, Through } from "../../solver/index.ts";
import { WaveformChart } from "../charts/WaveformChart.tsx";
import { useJudged, useSession } from "../frame/session.ts";

type Reference = "electrode" | "source";
const references = [
  ["electrode", "at the electrode"],
  ["source", "at the source, behind its impedance"],
] as const;

/** A waveform recorded elsewhere, sent through this divider: what the instrument would show of it. */
export function RecordedWaveform() {
  const heading = useId();
  const [record, setRecord] = useState<{ readonly name: string; readonly wave: Recorded } | null>(null);
  const [reference, setReference] = useState<Reference>("electrode");
  const [refusal, setRefusal] = useState<Refusal | null>(null);
  const through = useThrough(record?.wave ?? null, reference, setRefusal);
  const open = async (event: ChangeEvent<HTMLInputElement>) => {
    const file = event.target.files?.[0];
    event.target.value = "";
    if (file === undefined) return;
    const read = readWaveformCsv(await file.text());
    setRefusal(read.ok ? null : read.error);
    if (read.ok) setRecord({ name: file.name, wave: read.value });
  };
  return (
    <section className="sheet-section" aria-labelledby={heading}>
      <h2 id={heading}>a recorded waveform</h2>
      <p className="finding-sentence">
        Two columns, time and value, as an oscilloscope exports them; it stays on this page and is not saved with the
        design.
      </p>
      <div className="waveform-asked">
        <label className="quiet-button waveform-file">
          open a CSV
          <input type="file" accept=".csv,.txt,text/csv,text/plain" onChange={(event) => void open(event)} />
        </label>
        <span>{record === null ? "none is open" : `${record.name}, ${record.wave.time_s.length} points`}</span>
        <label>
          it stands{" "}
          <select value={reference} onChange={(event) => setReference(event.target.value as Reference)}>
            {references.map(([value, name]) => (
              <option key={value} value={value}>
                {name}
              </option>
            ))}
          </select>
        </label>
      </div>
      {refusal === null ? null : (
        <p role="alert" className="finding-sentence">{`${refusal.where}: ${refusal.why} ${refusal.cure}`}</p>
      )}
      {through === null ? null : (
        <WaveformChart through={through} title="input and reading" file="waveform-through-divider" />
      )}
    </section>
  );
}

/** The reading of the record by the design judged last; asked for anew with every design. */
function useThrough(wave: Recorded | null, reference: Reference, refuse: (refusal: Refusal) => void): Through | null {
  const { runner } = useSession();
  const document = useJudged((state) => (state.proof === null ? null : state.document));
  const field = useJudged((state) => state.field);
  const [through, setThrough] = useState<Through | null>(null);
  const told = useRef(refuse);
  told.current = refuse;
  useEffect(() => {
    if (wave === null || document === null) return;
    runner.through.ask({ kind: "through", document, field, record: wave, reference }, (answer) => {
      if (answer.kind === "done") setThrough(answer.outcome.through);
      if (answer.kind === "refused") told.current(answer.refusal);
    });
  }, [runner, wave, reference, document, field]);
  return wave === null ? null : through;
}

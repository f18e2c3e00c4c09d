import { useEffect, useId, useRef, useState } from "react";
import { startDocument } from "../../file/defaults.ts";
import { catalogue, parseQuantity, type UnitName } from "../../solver/index.ts";
import { textOf } from "../inputs/reading.ts";
import { inNewSlot } from "./files.ts";
import { useSession } from "./session.ts";

const kinds = [
  ["dc", "dc", "dc", "dc"],
  ["sine rms", "sine", "rms", "sine, stated as rms"],
  ["sine peak", "sine", "peak", "sine, stated as peak"],
  ["pulse peak", "pulse", "peak", "pulse, peak"],
  ["square peak", "square", "peak", "square wave, peak"],
] as const;

/** Three things asked: how many volts and of what kind, what will read it, how good. All else is assumed and counted. */
export function StartDialog({ onClose }: { readonly onClose: () => void }) {
  const session = useSession();
  const dialog = useRef<HTMLDialogElement>(null);
  const [volts, setVolts] = useState("");
  const [kind, setKind] = useState("");
  const [reader, setReader] = useState("");
  const [good, setGood] = useState("1 %");
  useEffect(() => dialog.current?.showModal(), []);
  const voltage = parseQuantity(volts, "V", { signed: true, least: -1e7, greatest: 1e7 });
  const wanted = parseQuantity(good, "1", { least: 1e-6, greatest: 0.5 });
  const chosen = kinds.find(([name]) => name === kind);
  const instrument = catalogue.instruments.find((each) => each.id === reader);
  const ready = voltage.kind === "value" && voltage.value !== 0 && wanted.kind === "value" && chosen && instrument;
  const start = async () => {
    if (!ready) return;
    const document_ = startDocument({
      name: `${volts.trim()} ${kind}`,
      nominal_V: voltage.value,
      kind: chosen[1],
      statedAs: chosen[2],
      instrument,
      wantedUncertainty: wanted.value,
    });
    await inNewSlot(session, () => session.store.getState().newDocument(document_));
    session.looking.setState({ screen: "ask", element: null, notice: null });
    onClose();
  };
  return (
    <dialog ref={dialog} className="start" aria-labelledby="start-heading" onClose={onClose}>
      <form
        method="dialog"
        onSubmit={(event) => {
          event.preventDefault();
          void start();
        }}
      >
        <h2 id="start-heading">Start from my own voltage</h2>
        <div className="row">
          <Text label="how many volts" value={volts} unit="V" onChange={setVolts} example="48 kV" />
          <Select
            label="of what kind"
            value={kind}
            onChange={setKind}
            options={kinds.map(([name, , , said]) => [name, said])}
          />
        </div>
        <div className="row">
          <Select
            label="what will read it"
            value={reader}
            onChange={setReader}
            options={catalogue.instruments.map((each) => [each.id, each.name])}
          />
        </div>
        <div className="row">
          <Text label="how good, k = 2" value={good} unit="1" onChange={setGood} example="1 %" />
        </div>
        <p className="quiet">Everything else is assumed, marked as such and counted on Ask.</p>
        <p className="end">
          <button type="button" className="plain-button" onClick={() => dialog.current?.close()}>
            cancel
          </button>
          <button type="submit" className="plain-button" disabled={!ready}>
            size it
          </button>
        </p>
      </form>
    </dialog>
  );
}

interface TextProps {
  readonly label: string;
  readonly value: string;
  readonly unit: UnitName;
  readonly example: string;
  readonly onChange: (text: string) => void;
}

function Text({ label, value, unit, example, onChange }: TextProps) {
  const id = useId();
  const parsed = value.trim() === "" ? null : parseQuantity(value, unit, { signed: true });
  const understoodText = (of: number) => {
    const text = textOf(of, unit, unit === "1");
    return text.replaceAll(" ", "") === value.replaceAll(" ", "") ? "" : `→ ${text}`;
  };
  return (
    <div className="field">
      <label htmlFor={id}>{label}</label>
      <div className="line">
        <input
          id={id}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          value={value}
          placeholder={example}
          onChange={(event) => onChange(event.target.value)}
        />
      </div>
      <div className="said">
        {parsed?.kind === "value" ? <span className="quiet">{understoodText(parsed.value)}</span> : null}
        {parsed?.kind === "refused" ? (
          <span className="wrong">
            {parsed.why} {parsed.cure}
          </span>
        ) : null}
        {parsed?.kind === "ambiguous" ? <span className="wrong">{parsed.why}</span> : null}
      </div>
    </div>
  );
}

interface SelectProps {
  readonly label: string;
  readonly value: string;
  readonly options: readonly (readonly [string, string])[];
  readonly onChange: (value: string) => void;
}

function Select({ label, value, options, onChange }: SelectProps) {
  const id = useId();
  return (
    <div className="field">
      <label htmlFor={id}>{label}</label>
      <div className="line">
        <select id={id} value={value} onChange={(event) => onChange(event.target.value)}>
          <option value="">choose …</option>
          {options.map(([each, text]) => (
            <option key={each} value={each}>
              {text}
            </option>
          ))}
        </select>
      </div>
      <div className="said" />
    </div>
  );
}

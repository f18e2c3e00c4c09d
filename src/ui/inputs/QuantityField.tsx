import { type KeyboardEvent, useEffect, useId, useRef, useState } from "react";
import {
  type Choice,
  evaluateArithmetic,
  formatExact,
  type Parsed,
  parseQuantity,
  preferredAbove,
  preferredBelow,
  type SeriesName,
  type UnitName,
  units,
} from "../../solver/index.ts";
import { useDocument, useInputs, useSession } from "../frame/session.ts";
import { useApply } from "../frame/useApply.ts";
import { originAt } from "./originAt.ts";
import "./inputs.css";

interface Props {
  readonly label: string;
  readonly pointer: string;
  readonly unit: UnitName;
  readonly value: number | null;
  /** A fraction, typed and shown in percent. */
  readonly share?: boolean;
  readonly signed?: boolean;
  readonly least?: number;
  readonly greatest?: number;
  /** May be left blank; what stands then. */
  readonly blank?: string;
  /** ↑ and ↓ step through this series instead of tenths. */
  readonly series?: SeriesName;
}

/** The one quantity field: keeps what was typed, shows what was understood, asks instead of guessing, loses nothing. */
export function QuantityField(props: Props) {
  const { label, pointer, unit, value, share = false, blank } = props;
  const session = useSession();
  const apply = useApply();
  const id = useId();
  const document_ = useDocument();
  const locked = useInputs((state) => state.file.readOnly !== null);
  const origin = originAt(document_.origins, pointer);
  const kept = document_.typed[pointer] ?? textOf(value, unit, share);
  const [text, setText] = useState(kept);
  const [parsed, setParsed] = useState<Parsed | null>(null);
  const focused = useRef(false);
  const before = useRef({ text: kept, value, origin });
  useEffect(() => {
    if (focused.current) return;
    setText(kept);
    setParsed(null);
  }, [kept]);

  const put = (next: number, typed: string) =>
    apply((store) => store.editAt(pointer, next, { step: label, typed, origin: "typed" }));
  const read = (typed: string) => {
    setText(typed);
    if (typed.trim() === "" && blank !== undefined) {
      setParsed(null);
      apply((store) => store.clearAt(pointer, label));
      return;
    }
    const found = understood(typed, props);
    setParsed(found);
    if (found.kind === "value") put(found.value, typed);
    if (found.kind === "arithmetic") {
      void evaluateArithmetic(found.expression, unit, limitsOf(props)).then((answer) => {
        setParsed(answer);
        if (answer.kind === "value") put(answer.value, typed);
      });
    }
  };
  const choose = (choice: Choice) => {
    const typed = textOf(choice.value, unit, share);
    setText(typed);
    setParsed(null);
    put(choice.value, typed);
  };
  const key = (event: KeyboardEvent) => {
    if (event.key === "Escape") {
      const was = before.current;
      setText(was.text);
      setParsed(null);
      if (was.value !== null)
        apply((store) => store.editAt(pointer, was.value, { step: label, typed: was.text, origin: was.origin }));
    }
    if ((event.key === "ArrowUp" || event.key === "ArrowDown") && value !== null && value !== 0) {
      event.preventDefault();
      const next = stepped(value, event.key === "ArrowUp", event.shiftKey, props.series);
      const typed = textOf(next, unit, share);
      setText(typed);
      if (understood(typed, props).kind === "value") put(next, typed);
    }
  };
  const wrong = parsed !== null && (parsed.kind === "refused" || parsed.kind === "ambiguous");
  return (
    <div className={origin === "assumed" ? "field assumed" : "field"}>
      <label htmlFor={id}>{label}</label>
      <div className="line">
        <input
          id={id}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          spellCheck={false}
          value={text}
          readOnly={locked}
          placeholder={blank}
          aria-invalid={wrong}
          aria-describedby={`${id}-said`}
          onChange={(event) => read(event.target.value)}
          onKeyDown={key}
          onFocus={() => {
            focused.current = true;
            before.current = { text, value, origin };
          }}
          onBlur={() => {
            focused.current = false;
            session.store.getState().leaveField();
          }}
        />
        <span className="unit">{share ? "%" : units[unit].symbol}</span>
        <span className="origin">{value === null ? "default" : origin}</span>
      </div>
      <div id={`${id}-said`} className="said" aria-live="polite">
        {parsed?.kind === "value" && parsed.understood.replaceAll("\u2009", " ") !== text.trim() ? (
          <span className="quiet">→ {share ? textOf(parsed.value, unit, true) : parsed.understood}</span>
        ) : null}
        {parsed?.kind === "refused" ? (
          <span className="wrong">
            {parsed.why} {parsed.cure}
          </span>
        ) : null}
        {parsed?.kind === "ambiguous" ? (
          <span className="wrong">
            {parsed.why}{" "}
            {parsed.choices.map((choice) => (
              <button key={choice.label} type="button" className="plain-button" onClick={() => choose(choice)}>
                {choice.label}
              </button>
            ))}
          </span>
        ) : null}
      </div>
    </div>
  );
}

const comma = (1.5).toLocaleString().includes(",");

const limitsOf = ({ least, greatest, signed }: Props) => ({
  locale: comma ? ("comma" as const) : ("point" as const),
  ...(least === undefined ? {} : { least }),
  ...(greatest === undefined ? {} : { greatest }),
  ...(signed === undefined ? {} : { signed }),
});

/** A share typed without its percent sign above 1 is asked about: 80 is 80 %? */
function understood(typed: string, props: Props): Parsed {
  const found = parseQuantity(typed, props.unit, limitsOf(props));
  if (props.share !== true || /[%p]/.test(typed)) return found;
  const plain = parseQuantity(typed, props.unit);
  if (plain.kind !== "value" || plain.value === 0 || plain.value <= 1) return found;
  return {
    kind: "ambiguous",
    why: `${typed.trim()} is not a fraction. Did you mean`,
    choices: [{ label: `${plain.value}\u2009%`, value: plain.value / 100 }],
  };
}

export function textOf(value: number | null, unit: UnitName, share: boolean): string {
  if (value === null) return "";
  return share ? `${Number((value * 100).toPrecision(12))} %` : formatExact(value, unit);
}

/** Next preferred value or next step of the second digit; Shift a decade. */
function stepped(value: number, up: boolean, decade: boolean, series: SeriesName | undefined): number {
  if (decade) return Number((up ? value * 10 : value / 10).toPrecision(12));
  if (series !== undefined) return up ? preferredAbove(series, value) : preferredBelow(series, value);
  const step = 10 ** (Math.floor(Math.log10(Math.abs(value))) - 1);
  return Number((value + (up ? step : -step)).toPrecision(12));
}

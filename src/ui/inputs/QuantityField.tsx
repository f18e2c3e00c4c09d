import { useId } from "react";
import { type Choice, formatQuantity, type Parsed } from "../../solver/index.ts";
import { useInputs } from "../frame/session.ts";
import { FieldFinding } from "./FieldFinding.tsx";
import { textOf } from "./reading.ts";
import { type QuantityProps, useQuantity } from "./useQuantity.ts";
import "./inputs.css";

/** The one quantity field: keeps what was typed, shows what was understood, asks instead of guessing, loses nothing. */
export function QuantityField(props: QuantityProps) {
  const { label, pointer, unit, value, share = false, blank } = props;
  const id = useId();
  const field = useQuantity(props);
  const locked = useInputs((state) => state.file.readOnly !== null);
  const { text, parsed, origin } = field;
  const wrong = parsed?.kind === "refused" || parsed?.kind === "ambiguous";
  const echo = wrong || value === null ? null : echoOf(value, textOf(value, unit, share), text);
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
          data-pointer={pointer}
          value={text}
          readOnly={locked}
          placeholder={blank}
          aria-invalid={wrong}
          aria-describedby={`${id}-said`}
          onChange={(event) => field.read(event.target.value)}
          onKeyDown={field.onKeyDown}
          onFocus={field.onFocus}
          onBlur={field.onBlur}
        />
        {echo === null ? null : <span className="echo">→ {echo}</span>}
        <span className="origin">{value !== null ? origin : blank === "not stated" ? "" : "default"}</span>
      </div>
      <div id={`${id}-said`} className="said" aria-live="polite">
        {wrong ? <Said parsed={parsed} onChoose={field.choose} /> : <FieldFinding pointer={pointer} />}
      </div>
    </div>
  );

  function echoOf(of: number, exact: string, typed: string): string | null {
    const plain = (each: string) => each.replaceAll(/[\s\u2009]/g, "");
    if (plain(typed) === plain(exact)) return null;
    return share ? exact : formatQuantity(of, unit, { digits: 6, trailing: false });
  }
}

interface SaidProps {
  readonly parsed: Parsed;
  readonly onChoose: (choice: Choice) => void;
}

/** What was wrong, why, what to do; what may have been meant as buttons. */
function Said({ parsed, onChoose }: SaidProps) {
  if (parsed.kind === "refused")
    return (
      <span className="wrong">
        {parsed.why} {parsed.cure}
      </span>
    );
  if (parsed.kind !== "ambiguous") return null;
  return (
    <span className="wrong">
      {parsed.why}{" "}
      {parsed.choices.map((choice) => (
        <button key={choice.label} type="button" className="plain-button" onClick={() => onChoose(choice)}>
          {choice.label}
        </button>
      ))}
    </span>
  );
}

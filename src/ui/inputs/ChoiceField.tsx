import { useId } from "react";
import { useDocument, useInputs } from "../frame/session.ts";
import { useApply } from "../frame/useApply.ts";
import { FieldFinding } from "./FieldFinding.tsx";
import { originAt } from "./originAt.ts";
import "./inputs.css";

interface Props<T extends string | number | boolean> {
  readonly label: string;
  readonly pointer: string;
  readonly value: T;
  readonly options: readonly (readonly [value: T, label: string])[];
}

/** One of a few: a native select with its origin beside it. */
export function ChoiceField<T extends string | number | boolean>({ label, pointer, value, options }: Props<T>) {
  const id = useId();
  const apply = useApply();
  const origin = originAt(useDocument().origins, pointer);
  const locked = useInputs((state) => state.file.readOnly !== null);
  return (
    <div className={origin === "assumed" ? "field assumed" : "field"}>
      <label htmlFor={id}>{label}</label>
      <div className="line">
        <select
          id={id}
          data-pointer={pointer}
          value={String(value)}
          disabled={locked}
          onChange={(event) => {
            const chosen = options.find(([each]) => String(each) === event.target.value)!;
            apply((store) => store.editAt(pointer, chosen[0], { step: label }));
          }}
        >
          {options.map(([each, text]) => (
            <option key={String(each)} value={String(each)}>
              {text}
            </option>
          ))}
        </select>
        <span className="origin">{origin}</span>
      </div>
      <div className="said">
        <FieldFinding pointer={pointer} />
      </div>
    </div>
  );
}

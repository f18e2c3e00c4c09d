import { useId, useMemo, useState } from "react";
import type { CapacitorFamily, SeriesName } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";
import { Choice } from "../charts/Choice.tsx";
import {
  type AddedFamily,
  type Draft,
  type DraftField,
  draftedPart,
  draftFields,
  emptyDraft,
  type FamilyKind,
  readField,
} from "./draftFamily.ts";

interface Props {
  /** An id for the new part. */
  readonly idFor: (kind: FamilyKind) => string;
  /** Returns what was wrong, if the document refused it. */
  readonly onAdd: (added: readonly AddedFamily[]) => string | null;
}

const kinds = [
  ["resistor", "resistors"],
  ["capacitor", "capacitors"],
] as const;
const series: readonly SeriesName[] = ["E3", "E6", "E12", "E24", "E48", "E96", "E192"];
const classes: readonly (readonly [CapacitorFamily["dielectricClass"], string])[] = [
  ["class1", "ceramic, class 1"],
  ["class2", "ceramic, class 2"],
  ["film", "film"],
  ["mica", "mica"],
  ["air", "air"],
  ["electrolytic", "electrolytic"],
];

/** A family of one's own, typed in from its data sheet. */
export function FamilyForm({ idFor, onAdd }: Props) {
  const [draft, setDraft] = useState<Draft>(() => emptyDraft("resistor"));
  const [tried, setTried] = useState(false);
  const [refused, setRefused] = useState<string | null>(null);
  const drafted = useMemo(() => draftedPart(draft, idFor(draft.kind)), [draft, idFor]);
  const type = (key: string, text: string) => setDraft((d) => ({ ...d, texts: { ...d.texts, [key]: text } }));
  const add = () => {
    setTried(true);
    if (drafted.part === null) return;
    const fault = onAdd([{ part: drafted.part, assumed: drafted.assumed }]);
    setRefused(fault);
    if (fault !== null) return;
    setDraft(emptyDraft(draft.kind));
    setTried(false);
  };
  const shown = (key: string) => (tried ? (drafted.faults[key] ?? null) : null);
  return (
    <form
      className="family-form"
      onSubmit={(event) => {
        event.preventDefault();
        add();
      }}
    >
      <Choice label="kind of part" options={kinds} value={draft.kind} onChange={(kind) => setDraft(emptyDraft(kind))} />
      <div className="family-fields">
        <TextField
          label="plain name"
          value={draft.name}
          fault={shown("name")}
          onChange={(name) => setDraft({ ...draft, name })}
        />
        <Select
          label="sold in"
          options={series.map((s) => [s, s])}
          value={draft.series}
          onChange={(s) => setDraft({ ...draft, series: s })}
        />
        {draft.kind === "resistor" ? null : (
          <Select
            label="dielectric"
            options={classes}
            value={draft.dielectricClass}
            onChange={(dielectricClass) => setDraft({ ...draft, dielectricClass })}
          />
        )}
        {draftFields[draft.kind].map((f) => (
          <Quantity key={f.key} field={f} text={draft.texts[f.key] ?? ""} missing={shown(f.key)} onType={type} />
        ))}
        <TextField
          label="in hand"
          value={draft.inHand}
          fault={drafted.faults.inHand ?? null}
          placeholder="20 x 10M, 12 x 4M7"
          onChange={(inHand) => setDraft({ ...draft, inHand })}
        />
      </div>
      <p className="family-add">
        <button type="submit" className="cure-button">
          add family
        </button>
        {refused === null ? null : <span className="field-fault">{refused}</span>}
        {drafted.assumed.length === 0 ? null : (
          <span className="quiet">{`${drafted.assumed.length} left blank: stand-ins will be marked assumed`}</span>
        )}
      </p>
    </form>
  );
}

interface TextProps {
  readonly label: string;
  readonly value: string;
  readonly fault: string | null;
  readonly placeholder?: string;
  readonly onChange: (text: string) => void;
}

function TextField({ label, value, fault, placeholder, onChange }: TextProps) {
  const id = useId();
  return (
    <div className="family-field wide">
      <label htmlFor={id}>{label}</label>
      <input
        id={id}
        type="text"
        value={value}
        placeholder={placeholder}
        aria-invalid={fault !== null}
        aria-describedby={`${id}-note`}
        onChange={(event) => onChange(event.target.value)}
      />
      <span id={`${id}-note`} className="field-fault">
        {fault}
      </span>
    </div>
  );
}

interface SelectProps<T extends string> {
  readonly label: string;
  readonly options: readonly (readonly [T, string])[];
  readonly value: T;
  readonly onChange: (value: T) => void;
}

function Select<T extends string>({ label, options, value, onChange }: SelectProps<T>) {
  const id = useId();
  return (
    <div className="family-field">
      <label htmlFor={id}>{label}</label>
      <select id={id} value={value} onChange={(event) => onChange(event.target.value as T)}>
        {options.map(([key, text]) => (
          <option key={key} value={key}>
            {text}
          </option>
        ))}
      </select>
    </div>
  );
}

interface QuantityProps {
  readonly field: DraftField;
  readonly text: string;
  readonly missing: string | null;
  readonly onType: (key: string, text: string) => void;
}

function Quantity({ field, text, missing, onType }: QuantityProps) {
  const id = useId();
  const reading = readField(field, text);
  const fault = reading !== null && !reading.ok ? reading.why : missing;
  return (
    <div className="family-field">
      <label htmlFor={id}>{field.label}</label>
      <span className="with-unit">
        <input
          id={id}
          type="text"
          inputMode="decimal"
          value={text}
          placeholder={field.assumed === null ? "" : String(Number((field.assumed / field.scale).toPrecision(6)))}
          aria-invalid={fault !== null}
          aria-describedby={`${id}-note`}
          onChange={(event) => onType(field.key, event.target.value)}
        />
        <span className="quiet">{field.shown}</span>
      </span>
      <span id={`${id}-note`} className={fault === null ? "understood" : "field-fault"}>
        {fault ?? (reading?.ok && field.scale === 1 ? withUnit(reading.value, field.unit) : "")}
      </span>
    </div>
  );
}

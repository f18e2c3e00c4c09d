interface Props<T extends string> {
  readonly label: string;
  readonly options: readonly (readonly [T, string])[];
  readonly value: T;
  readonly onChange: (value: T) => void;
}

/** A few views of one picture: one pressed button among plain ones. */
export function Choice<T extends string>({ label, options, value, onChange }: Props<T>) {
  return (
    <fieldset className="choice" aria-label={label}>
      {options.map(([id, text]) => (
        <button key={id} type="button" aria-pressed={id === value} onClick={() => onChange(id)}>
          {text}
        </button>
      ))}
    </fieldset>
  );
}

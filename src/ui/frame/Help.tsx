import { useEffect, useRef, useState } from "react";

const keys = [
  ["Ctrl S, Ctrl O", "save, open"],
  ["Ctrl Z, Ctrl Shift Z", "undo, redo; each field edit or press of a button is one step"],
  ["↑ ↓ in a field", "next preferred value where the field has a series, else the next step of the second figure"],
  ["Shift ↑ ↓ in a field", "a decade"],
  ["Alt M in a field", "the value was measured; once more: typed"],
  ["Esc in a field", "what stood there before"],
  ["↑ ↓ Page Home End on the column", "step along the string, 1 is next to the tap"],
  ["Enter on a number", "its why: formula, numbers, origins, source; Esc closes"],
] as const;

const forms = [
  ["4k7 · 4.7k · 4,7k · 4700 · 4.7e3", "the same resistance; M is mega, m is milli (IEC 60062)"],
  ["470p · 4n7 · 1µ5 · 1u5", "capacitances"],
  ["2*6.8M · 6k/2 · (48 kV)/2", "arithmetic"],
  ["3 % · 300 ppm · 0.03", "shares of one"],
] as const;

const origins = [
  ["typed", "stated by you"],
  ["measured", "measured by you"],
  ["catalogue", "copied from a generic part or instrument; your own parts hold your own figures"],
  ["assumed", "a stand-in until you state it; a finding that it could turn is a caution"],
] as const;

/** The keys, what a field reads, what an origin and a level say. */
export function HelpButton() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <button type="button" aria-label="help" title="keys, fields, words" onClick={() => setOpen(true)}>
        ?
      </button>
      {open ? <Help onClose={() => setOpen(false)} /> : null}
    </>
  );
}

function Help({ onClose }: { readonly onClose: () => void }) {
  const dialog = useRef<HTMLDialogElement>(null);
  useEffect(() => dialog.current?.showModal(), []);
  return (
    <dialog ref={dialog} className="help" aria-labelledby="help-heading" onClose={onClose}>
      <h2 id="help-heading">keys, fields, words</h2>
      <Pairs heading="keys" pairs={keys} />
      <Pairs heading="a field reads" pairs={forms} />
      <Pairs heading="where a value came from" pairs={origins} />
      <h3>levels</h3>
      <p>
        <b>clear</b>: limit met with its stated margin on stated inputs. <b>caution</b>: met with less margin, or
        resting on an assumed input that could turn it, or outside its formula's range. <b>stop</b>: a limit not met, or
        a single fault that puts more on the instrument or a person than it may. No level is an approval of the divider.
      </p>
      <p className="quiet">
        Everything is computed in this browser; nothing is sent anywhere. The copy in the browser is a safety net: a
        design's home is its file.
      </p>
      <p className="end">
        <button type="button" className="plain-button" onClick={() => dialog.current?.close()}>
          close
        </button>
      </p>
    </dialog>
  );
}

function Pairs({
  heading,
  pairs,
}: {
  readonly heading: string;
  readonly pairs: readonly (readonly [string, string])[];
}) {
  return (
    <>
      <h3>{heading}</h3>
      <dl>
        {pairs.map(([name, text]) => (
          <div key={name}>
            <dt>{name}</dt>
            <dd>{text}</dd>
          </div>
        ))}
      </dl>
    </>
  );
}

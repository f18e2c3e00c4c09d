import { useId, useState } from "react";
import { parseQuantity, type Ring } from "../../solver/index.ts";
import { figureText, withUnit } from "../charts/axisText.ts";
import { nearestRing } from "./nearestRing.ts";

/** Could this divider have made that ringing: every frequency at which it may, and which of them a measured one is nearest to. */
export function RingPanel({ rings }: { readonly rings: readonly Ring[] }) {
  const [text, setText] = useState("");
  const id = useId();
  const parsed = text.trim() === "" ? null : parseQuantity(text, "Hz");
  const measured_Hz = parsed?.kind === "value" && parsed.value > 0 ? parsed.value : null;
  const near = measured_Hz === null ? null : nearestRing(rings, measured_Hz);
  return (
    <>
      <div className="field ring-asked">
        <label htmlFor={id}>ring seen on the screen</label>
        <div className="line">
          <input
            id={id}
            type="text"
            inputMode="decimal"
            autoComplete="off"
            spellCheck={false}
            placeholder="e.g. 32 MHz"
            value={text}
            onChange={(event) => setText(event.target.value)}
          />
        </div>
      </div>
      <p className="finding-sentence" aria-live="polite">
        {answer(text, measured_Hz, near)}
      </p>
      <Table rings={rings} near={near?.ring.id ?? null} />
    </>
  );
}

function answer(text: string, measured_Hz: number | null, near: ReturnType<typeof nearestRing>): string {
  if (text.trim() === "") return "Type the frequency of a ring to see what of this divider could have made it.";
  if (measured_Hz === null) return "A frequency is not understood there: type it with its unit, e.g. 32 MHz.";
  if (near === null) return "Nothing of this divider rings by what is counted so far.";
  const off = Number((100 * (measured_Hz / near.ring.frequency_Hz - 1)).toPrecision(2));
  const where = `${near.ring.name} at ${withUnit(near.ring.frequency_Hz, "Hz", 3)}`;
  const signed = `${off > 0 ? "+" : "\u2212"}${Math.abs(off)}\u2009%`;
  if (near.close) return `It may be the divider: nearest is ${where} (${signed}).`;
  return `Not likely the divider: nearest is ${where}, ${signed} away. The source, its load or the earth lead may ring.`;
}

interface TableProps {
  readonly rings: readonly Ring[];
  readonly near: string | null;
}

function Table({ rings, near }: TableProps) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolled region must be reachable by keyboard
    <section className="sheet-scroll" tabIndex={0} aria-label="table of rings">
      <table className="sheet-table rings">
        <thead>
          <tr>
            <th scope="col" className="number">
              frequency
            </th>
            <th scope="col">what rings</th>
            <th scope="col" className="number">
              damping
            </th>
            <th scope="col">from</th>
            <th scope="col">what quiets it</th>
          </tr>
        </thead>
        <tbody>
          {rings.map((ring) => (
            <tr key={ring.id} className={ring.id === near ? "chosen" : ""}>
              <td className="number">{figureText(ring.frequency_Hz / 1e6, "1", 4)}&#8201;MHz</td>
              <th scope="row">
                {ring.name}
                {ring.counted ? null : <span className="quiet"> · not counted in the network</span>}
                {ring.id === near ? <strong> · nearest</strong> : null}
              </th>
              <td className="number">{dampingText(ring.damping)}</td>
              <td className="reason">{ring.how}</td>
              <td className="reason">{ring.cure}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

/** Share of critical damping. */
function dampingText(damping: number | null): string {
  if (damping === null) return "–";
  if (damping >= 1) return "damped";
  return `${Number((100 * damping).toPrecision(2))}\u2009%`;
}

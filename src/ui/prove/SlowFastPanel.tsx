import type { SlowFast, SquareRow } from "../../solver/index.ts";
import { figureText, withUnit } from "../charts/axisText.ts";
import { ScopePicture } from "../charts/ScopePicture.tsx";

const speeds = [
  ["slow", "slow: each half period settles"],
  ["fast", "fast: all on the capacitors"],
] as const;

/** The slow/fast check as the instrument will show it, matched and mismatched, and its numbers. */
export function SlowFastPanel({ check }: { readonly check: SlowFast }) {
  return (
    <>
      <p className="finding-sentence">{check.sentence}</p>
      {speeds.map(([speed, name]) => (
        <div key={speed}>
          <h3>
            {name}, {withUnit(speed === "slow" ? check.slow_Hz : check.fast_Hz, "Hz")}
          </h3>
          <div className="scope-row">
            {check.states.map((state) => {
              const picture = check.pictures.find((each) => each.speed === speed && each.state === state.id)!;
              return (
                <ScopePicture
                  key={state.id}
                  name={state.name}
                  time_s={picture.time_s}
                  noisy_V={picture.noisy_V}
                  signal_Vpp={check.signal_Vpp}
                />
              );
            })}
          </div>
        </div>
      ))}
      <p className="quiet">
        Dotted: where a right wave lies. Noise of {withUnit(check.noise_Vrms, "V", 2)} rms drawn in, the same each time.
        The cable counts as its capacitance; inductances act far above both frequencies.
      </p>
      <Table check={check} />
    </>
  );
}

const words: Readonly<Record<SquareRow["of"], string>> = { slow: "slow", habitual: "one look alone", fast: "fast" };

function Table({ check }: { readonly check: SlowFast }) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolled region must be reachable by keyboard
    <section className="sheet-scroll" tabIndex={0} aria-label="table of the slow/fast check">
      <table className="sheet-table">
        <caption className="unseen">
          Start and end of a half period, counted from the settled level of the opposite half
        </caption>
        <thead>
          <tr>
            <th scope="col">square wave</th>
            {check.states.map((state) => (
              <th key={state.id} scope="col" className="number">
                {state.name}: start → end
              </th>
            ))}
            <th scope="col" className="number">
              5&#8201;% too small, edge to edge
            </th>
          </tr>
        </thead>
        <tbody>
          {check.rows.map((row) => (
            <tr key={row.frequency_Hz}>
              <th scope="row">
                {withUnit(row.frequency_Hz, "Hz")} <span className="quiet">· {words[row.of]}</span>
              </th>
              {check.states.map((state, i) => (
                <td key={state.id} className="number">
                  {figureText(row.start_V[i]!, "V", 5)} → {figureText(row.end_V[i]!, "V", 5)}
                </td>
              ))}
              <td className="number">{figureText(row.onScreen_Vpp[2]!, "V", 4)} p-p</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="quiet">
        Start and end of each half period, counted from the settled level of the opposite half; a right wave stays at{" "}
        {figureText(check.signal_Vpp, "V", 5)}.
      </p>
    </section>
  );
}

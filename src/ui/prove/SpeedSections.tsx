import type { DividerDocument, Proof, Speed } from "../../solver/index.ts";
import { Figure } from "../frame/Figure.tsx";
import { QuantityField } from "../inputs/QuantityField.tsx";
import { InstrumentSpeedTable } from "./InstrumentSpeedTable.tsx";
import { RingPanel } from "./RingPanel.tsx";
import { SlowFastPanel } from "./SlowFastPanel.tsx";

interface Props {
  readonly document: DividerDocument;
  readonly proof: Proof;
  /** null: not answered yet. */
  readonly speed: Speed | null;
}

/** Slow/fast check, rings and instruments side by side: computed while the screen shows them. */
export function SpeedSections({ document, proof, speed }: Props) {
  return (
    <>
      <SlowFast document={document} proof={proof} speed={speed} />
      <section className="sheet-section" aria-labelledby="rings-heading">
        <h2 id="rings-heading">could this divider have made that ringing</h2>
        <InLine figures={ringFigures} />
        {speed === null ? <Waiting /> : <RingPanel rings={speed.rings} />}
      </section>
      <section className="sheet-section" aria-labelledby="side-by-side-heading">
        <h2 id="side-by-side-heading">instruments side by side</h2>
        <p className="finding-sentence">
          One LV arm, each instrument with its own cable: a scale factor, a match and a speed of its own.
        </p>
        {speed === null ? (
          <Waiting />
        ) : (
          <InstrumentSpeedTable rows={speed.instruments} wantedUncertainty={document.brief.wantedUncertainty} />
        )}
      </section>
    </>
  );
}

function SlowFast({ document, proof, speed }: Props) {
  const signal = proof.findings.find((each) => each.id === "slowFast.signal");
  const check = speed?.slowFast ?? null;
  return (
    <section className="sheet-section" aria-labelledby="slow-fast-heading">
      <h2 id="slow-fast-heading">slow/fast check</h2>
      {speed !== null && check === null ? (
        <p className="quiet">No LV capacitance is fitted: there is no match to check.</p>
      ) : (
        <>
          <div className="slow-fast-asked">
            <QuantityField
              label="square-wave generator, peak to peak"
              pointer="/brief/generator_Vpp"
              unit="V"
              value={document.brief.generator_Vpp}
              least={1e-3}
              greatest={1e5}
            />
            <InLine figures={slowFastFigures} />
          </div>
          {signal === undefined || signal.level === "clear" ? null : <p className="finding-reason">{signal.reason}</p>}
          {check === null ? <Waiting /> : <SlowFastPanel check={check} />}
        </>
      )}
    </section>
  );
}

const slowFastFigures = [
  ["at the instrument", "slowFast.signal_Vpp", "signal at the instrument"],
  ["clear of its noise from", "slowFast.needed_Vpp", "signal clear of noise"],
  ["slowest decay", "slowFast.pole_Hz", "slowest decay"],
] as const;
const ringFigures = [
  ["HV lead rings at", "lead.ring_Hz", "ring of the HV lead"],
  ["damped from", "lead.dampingLeast_ohm", "damping resistor, least"],
  ["to", "lead.dampingGreatest_ohm", "damping resistor, critical"],
  ["LV inductance adds to the edge", "lvArm.spikeShare", "spike over the height of the edge"],
  ["LV capacitors resonate at", "lvArm.resonance_Hz", "resonance of the LV capacitors"],
] as const;

interface InLineProps {
  /** What it says, the figure's path, what a screen reader says. */
  readonly figures: readonly (readonly [string, string, string])[];
}

/** A few figures side by side, each with its why. */
function InLine({ figures }: InLineProps) {
  return (
    <dl className="in-line">
      {figures.map(([name, path, label]) => (
        <div key={path}>
          <dt>{name}</dt>
          <dd>
            <Figure path={path} label={label} />
          </dd>
        </div>
      ))}
    </dl>
  );
}

const Waiting = () => (
  <p className="quiet" role="status">
    Being computed.
  </p>
);

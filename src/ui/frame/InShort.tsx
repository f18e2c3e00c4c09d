import { formatQuantity } from "../../solver/index.ts";
import { Figure } from "./Figure.tsx";
import { openWhy, useDocument, useJudged, useSession } from "./session.ts";

/** The answer, always on the screen: what the divider is, what it reads, what the worst single fault does. */
export function InShort() {
  const stale = useJudged((state) => state.stale);
  const proof = useJudged((state) => state.proof);
  const refusal = useJudged((state) => state.refusal);
  return (
    <section aria-label="in short" className="in-short-sheet" aria-busy={stale}>
      <h2>IN SHORT</h2>
      {refusal === null ? null : (
        <div className="notice bad" role="status">
          <p>
            <strong>{refusal.why}</strong> {refusal.cure}
          </p>
        </div>
      )}
      {proof === null ? (
        refusal === null && <p className="quiet">{stale ? "Computing…" : "No design stands yet: see Size."}</p>
      ) : (
        <Figures stale={stale} />
      )}
    </section>
  );
}

function Figures({ stale }: { readonly stale: boolean }) {
  const deviates = useJudged(
    (state) => Math.abs(Number(state.proof?.sheet.values["scaleFactor.deviation"] ?? 0)) > 1e-6,
  );
  const endless = useJudged((state) => state.proof?.sheet.values["response.bandwidth_Hz"] === null);
  return (
    <dl className={stale ? "in-short stale" : "in-short"}>
      <div>
        <dt>scale factor, predicted</dt>
        <dd>
          <Figure path="scaleFactor.predicted" digits={6} /> ± <Figure path="scaleFactor.uncertainty" digits={2} />{" "}
          <span className="sub quiet">k = 2</span>
          {deviates ? (
            <div className="sub">
              <Figure path="scaleFactor.deviation" /> off the one wanted
            </div>
          ) : null}
        </dd>
      </div>
      <div>
        <dt>input</dt>
        <dd>
          <Figure path="input.resistance_ohm" label="resistance" /> ‖{" "}
          <Figure path="input.capacitance_F" label="capacitance" />
        </dd>
      </div>
      <div>
        <dt>band</dt>
        <dd>
          {endless ? (
            "dc up: no −3 dB point in this model"
          ) : (
            <>
              0 – <Figure path="response.bandwidth_Hz" label="bandwidth" />
            </>
          )}
        </dd>
      </div>
      <div>
        <dt>dissipation</dt>
        <dd>
          <Figure path="input.dissipation_W" />, <Figure path="element.dissipation_W" index={0} />{" "}
          <span className="sub">each at most</span>
        </dd>
      </div>
      <div>
        <dt>reading at working voltage</dt>
        <dd>
          <Figure path="reading.atWorking_V" digits={4} />
        </dd>
      </div>
      <WorstFault />
    </dl>
  );
}

function WorstFault() {
  const session = useSession();
  const worst = useJudged((state) => state.proof?.worstFault ?? null);
  const { instruments, principal } = useDocument();
  const instrument = instruments.find((each) => each.id === principal);
  if (worst === null) return null;
  const seen = Math.max(Math.abs(worst.output_V), Math.abs(worst.fastOutput_V));
  return (
    <div>
      <dt>worst single fault</dt>
      <dd>
        <button type="button" className="figure-button" onClick={() => openWhy(session, "fault.worstOutput_V")}>
          {formatQuantity(seen, "V")}
        </button>{" "}
        <span className="sub">
          at the instrument
          {instrument === undefined ? "" : `, may see ${formatQuantity(instrument.greatestInput_Vpeak, "V")}`}
        </span>
        <div className="sub quiet">{worst.name}</div>
      </dd>
    </div>
  );
}

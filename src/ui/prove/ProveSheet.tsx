import { type ReactNode, useMemo } from "react";
import type { Cure, DividerDocument, Proof, Speed } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";
import { ElementChart } from "../charts/ElementChart.tsx";
import { FrequencyChart } from "../charts/FrequencyChart.tsx";
import { GreatestInputChart } from "../charts/GreatestInputChart.tsx";
import { StepChart } from "../charts/StepChart.tsx";
import { sheetNumber } from "../size/sheetNumber.ts";
import { Cautions } from "./Cautions.tsx";
import { dissipationOn, voltageOn } from "./elementBases.ts";
import { FaultTable } from "./FaultTable.tsx";
import { FindingList } from "./FindingList.tsx";
import { faultMark, worstFaultsFirst } from "./faultMarks.ts";
import { Insulation } from "./Insulation.tsx";
import { Proximity } from "./Proximity.tsx";
import { StepFigures } from "./StepFigures.tsx";
import "../size/size.css";
import "./prove.css";

export interface ProveActions {
  readonly onWhy: (path: string, element: number | null) => void;
  readonly onCure: (cure: Cure) => void;
}

interface Props {
  readonly document: DividerDocument;
  readonly proof: Proof;
  readonly actions: ProveActions;
  /** What is answered when it is looked at; null: not yet. */
  readonly speed?: Speed | null;
  /** The sections on speed, after the responses. */
  readonly beyond?: ReactNode;
}

/** Will it work: the responses, the stress, the distances, the faults, and every finding in full. */
export function ProveSheet({ document, proof, actions, speed = null, beyond = null }: Props) {
  const { brief } = document;
  return (
    <>
      <Cautions cautions={proof.cautions} screen="prove" />
      <section className="sheet-section" aria-labelledby="response-heading">
        <h2 id="response-heading">response</h2>
        <FrequencyChart
          response={proof.frequency}
          tolerance={brief.wantedUncertainty}
          band_Hz={brief.band_Hz}
          bandwidth_Hz={sheetNumber(proof.sheet, "response.bandwidth_Hz")}
          source={speed?.fromSource ?? null}
          file="frequency-response"
        />
        <StepChart
          step={proof.step}
          tolerance={brief.wantedUncertainty}
          traces={speed?.traces ?? null}
          file="step-response"
        />
        <StepFigures sheet={proof.sheet} source={speed?.fromSource ?? null} onWhy={actions.onWhy} />
      </section>
      {beyond}
      <Stress proof={proof} />
      <section className="sheet-section" aria-labelledby="insulation-heading">
        <h2 id="insulation-heading">insulation</h2>
        <Insulation findings={proof.findings} onWhy={actions.onWhy} />
      </section>
      <section className="sheet-section" aria-labelledby="proximity-heading">
        <h2 id="proximity-heading">what stands near</h2>
        <Proximity proof={proof} onWhy={actions.onWhy} />
      </section>
      <Faults document={document} proof={proof} />
      <section className="sheet-section" aria-labelledby="findings-heading">
        <h2 id="findings-heading">findings in full</h2>
        <p className="finding-sentence">{tally(proof)}</p>
        <FindingList findings={proof.findings} onWhy={actions.onWhy} onCure={actions.onCure} />
      </section>
    </>
  );
}

function Stress({ proof }: { readonly proof: Proof }) {
  const voltage = useMemo(() => voltageOn(proof.sheet), [proof.sheet]);
  const dissipation = useMemo(() => dissipationOn(proof.sheet), [proof.sheet]);
  return (
    <section className="sheet-section" aria-labelledby="stress-heading">
      <h2 id="stress-heading">stress per element</h2>
      <ElementChart title="voltage per element" quantity="voltage" unit="V" bases={voltage} file="element-voltage" />
      <ElementChart
        title="dissipation per element"
        quantity="dissipation"
        unit="W"
        bases={dissipation}
        file="element-dissipation"
      />
      <GreatestInputChart greatest={proof.greatestInput} file="greatest-input" />
    </section>
  );
}

function Faults({ document, proof }: Pick<Props, "document" | "proof">) {
  const limit = document.instruments.find((each) => each.id === document.principal)?.greatestInput_Vpeak ?? null;
  const wanted = document.brief.wantedUncertainty;
  const rows = useMemo(() => worstFaultsFirst(proof.faults), [proof.faults]);
  return (
    <section className="sheet-section" aria-labelledby="faults-heading">
      <h2 id="faults-heading">fault table</h2>
      <p className="finding-sentence">{faultSentence(proof, limit, wanted)}</p>
      <FaultTable rows={rows} greatestInput_Vpeak={limit ?? Number.POSITIVE_INFINITY} wantedUncertainty={wanted} />
    </section>
  );
}

function faultSentence({ worstFault, faults }: Proof, limit: number | null, wanted: number): string {
  const zero = faults.filter((row) => faultMark(row, wanted) === "reads zero while live").length;
  const silent = faults.filter((row) => faultMark(row, wanted) === "silent").length;
  const worst =
    worstFault === null
      ? "No single fault was found to judge."
      : `Worst single fault: ${worstFault.name}, ${withUnit(Math.max(Math.abs(worstFault.output_V), Math.abs(worstFault.fastOutput_V)), "V", 3)} at the instrument${limit === null ? "" : `, which may see ${withUnit(limit, "V", 3)}`}.`;
  return `${worst} ${zero} of ${faults.length} read zero while live, ${silent} do not show in the reading.`;
}

function tally({ findings }: Proof): string {
  const count = (level: string) => findings.filter((f) => f.level === level).length;
  return `${count("stop")} stop, ${count("caution")} caution, ${count("clear")} clear; the worst first.`;
}

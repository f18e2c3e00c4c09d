import { useCallback, useMemo } from "react";
import type { Candidate, Cure, Design, DividerDocument, Proof, Sizing } from "../../solver/index.ts";
import { CandidateTable } from "./CandidateTable.tsx";
import { CapacitanceReach } from "./CapacitanceReach.tsx";
import { ColumnDrawings } from "./ColumnDrawings.tsx";
import { chosenCandidate } from "./candidateText.ts";
import { CapacitanceChoice, Exactness } from "./Exactness.tsx";
import { Follows } from "./Follows.tsx";
import { GradedTable } from "./GradedTable.tsx";
import { InstrumentTable } from "./InstrumentTable.tsx";
import { LostFamilies } from "./LostFamilies.tsx";
import { LvDrawing } from "./LvDrawing.tsx";
import { LvShareBar } from "./LvShareBar.tsx";
import { LvTable } from "./LvTable.tsx";
import { Matches } from "./Matches.tsx";
import { ReachBars } from "./ReachBars.tsx";
import { sheetNumber } from "./sheetNumber.ts";
import { WindowBar } from "./WindowBar.tsx";
import "../charts/charts.css";
import "./compensation.css";
import "./size.css";

export interface SizeActions {
  readonly onTake: (candidate: Candidate) => void;
  readonly onSizeAgain: () => void;
  readonly onCure: (cure: Cure) => void;
  readonly onWhy: (path: string, from: "sizing" | "proof") => void;
}

interface Props {
  readonly document: DividerDocument;
  readonly sizing: Sizing | null;
  readonly proof: Proof | null;
  readonly actions: SizeActions;
}

/** Which parts: the window, what fits in it, the LV arm and the instruments on it. */
export function SizeSheet({ document, sizing, proof, actions }: Props) {
  return (
    <>
      <WindowSection sizing={sizing} document={document} proof={proof} actions={actions} />
      <CandidateSection sizing={sizing} document={document} actions={actions} />
      <LvSection document={document} proof={proof} actions={actions} />
      {proof === null || proof.graded === null ? null : (
        <section className="sheet-section" aria-labelledby="graded-heading">
          <h2 id="graded-heading">graded capacitors</h2>
          <GradedTable graded={proof.graded} onCure={actions.onCure} />
        </section>
      )}
      {proof === null || proof.instruments.length === 0 ? null : (
        <section className="sheet-section" aria-labelledby="instruments-heading">
          <h2 id="instruments-heading">instruments on this LV arm</h2>
          <p className="finding-sentence">A scale factor belongs to one instrument, range, function and cable.</p>
          <InstrumentTable rows={proof.instruments} />
        </section>
      )}
    </>
  );
}

function WindowSection({ sizing, document, proof, actions }: Props) {
  const current = useMemo(() => currentR1(document, proof), [document, proof]);
  const stock = useMemo(() => sizing?.candidates.map((c) => c.hvArmResistance_ohm) ?? [], [sizing]);
  const onWhy = useCallback((path: string) => actions.onWhy(path, "sizing"), [actions]);
  if (sizing === null) return <p className="quiet">No search has run yet: the window follows from the brief.</p>;
  return (
    <WindowBar window={sizing.window} current_ohm={current} stock_ohm={stock} onWhy={onWhy} onCure={actions.onCure} />
  );
}

function currentR1({ design }: DividerDocument, proof: Proof | null): number | null {
  const known = proof === null ? null : sheetNumber(proof.sheet, "hvArm.resistance_ohm");
  if (known !== null || design === null) return known;
  return design.hvArm.elements.reduce((sum, e) => sum + e.resistance_ohm, 0) / design.hvArm.strings;
}

function CandidateSection({ sizing, document, actions }: Omit<Props, "proof">) {
  const candidates = sizing?.candidates;
  const chosen = useMemo(() => chosenCandidate(candidates ?? [], document.design), [candidates, document.design]);
  return (
    <section className="sheet-section" aria-labelledby="candidates-heading">
      <h2 id="candidates-heading">candidates</h2>
      <Follows
        design={document.design}
        candidates={candidates ?? null}
        chosen={chosen}
        onSizeAgain={actions.onSizeAgain}
      />
      {candidates === undefined || candidates.length === 0 ? null : (
        <>
          <ColumnDrawings candidates={candidates} chosen={chosen} onTake={actions.onTake} />
          <CandidateTable candidates={candidates} chosen={chosen} onTake={actions.onTake} />
        </>
      )}
      {sizing === null ? null : <LostFamilies lost={sizing.lost} />}
    </section>
  );
}

function LvSection({ document, proof, actions }: Omit<Props, "sizing">) {
  const { design, parts, instruments, principal } = document;
  const onWhy = useCallback((path: string) => actions.onWhy(path, "proof"), [actions]);
  if (design === null) return null;
  const instrument = instruments.find((each) => each.id === principal) ?? null;
  return (
    <section className="sheet-section" aria-labelledby="lv-heading">
      <h2 id="lv-heading">LV arm</h2>
      <p className="finding-sentence">
        {design.lvArm.stays === "withDivider"
          ? "Stays on the divider when the instrument is unplugged."
          : "Leaves with the instrument: unplugged, nothing holds the tap down."}
      </p>
      <LvDrawing design={design} parts={parts} instrument={instrument} />
      <LvTable design={design} parts={parts} />
      {proof === null ? null : (
        <>
          <h3>exact and fitted</h3>
          <Exactness sheet={proof.sheet} onWhy={onWhy} />
          <Capacitance document={document} design={design} proof={proof} onWhy={onWhy} onCure={actions.onCure} />
        </>
      )}
    </section>
  );
}

interface CapacitanceProps {
  readonly document: DividerDocument;
  readonly design: Design;
  readonly proof: Proof;
  readonly onWhy: (path: string) => void;
  readonly onCure: (cure: Cure) => void;
}

/** The LV capacitance: three ways to choose it, what it is made of, what can be set against what may be needed. */
function Capacitance({ document, design, proof, onWhy, onCure }: CapacitanceProps) {
  const { sheet, matches, reach } = proof;
  if (matches.length === 0) {
    return (
      <>
        <h3>LV capacitance</h3>
        <p className="finding-sentence">No capacitor is fitted in either arm: the divider is matched at dc only.</p>
      </>
    );
  }
  return (
    <>
      <h3>LV capacitance, three matches</h3>
      <Matches
        matches={matches}
        sheet={sheet}
        lvArm={design.lvArm}
        wanted={document.brief.wantedUncertainty}
        onWhy={onWhy}
        onCure={onCure}
      />
      <details className="table-on-request">
        <summary>table: three matches and what is fitted</summary>
        <CapacitanceChoice sheet={sheet} lvArm={design.lvArm} onWhy={onWhy} />
        <CapacitanceReach sheet={sheet} lvArm={design.lvArm} />
      </details>
      <h3>what the LV capacitance is made of</h3>
      <LvShareBar sheet={sheet} onWhy={onWhy} />
      {reach === null ? null : (
        <>
          <h3>what can be set, and what may be needed</h3>
          <ReachBars reach={reach} fitted_F={sheetNumber(sheet, "lvArm.capacitanceFitted_F")} />
        </>
      )}
    </>
  );
}

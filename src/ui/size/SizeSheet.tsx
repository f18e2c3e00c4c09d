import { useCallback, useMemo } from "react";
import type { Candidate, Cure, DividerDocument, Proof, Sizing } from "../../solver/index.ts";
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
import { LvTable } from "./LvTable.tsx";
import { sheetNumber } from "./sheetNumber.ts";
import { WindowBar } from "./WindowBar.tsx";
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
          <h3>LV capacitance, three matches</h3>
          {design.lvArm.capacitanceBy === "none" ? (
            <p className="finding-sentence">No LV capacitor is asked for: the divider is matched at dc only.</p>
          ) : (
            <>
              <CapacitanceReach sheet={proof.sheet} lvArm={design.lvArm} />
              <CapacitanceChoice sheet={proof.sheet} lvArm={design.lvArm} onWhy={onWhy} />
            </>
          )}
        </>
      )}
    </section>
  );
}

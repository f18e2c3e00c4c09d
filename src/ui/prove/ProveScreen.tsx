import { useMemo } from "react";
import { openWhy, useDocument, useJudged, useSession } from "../frame/session.ts";
import { useApply } from "../frame/useApply.ts";
import { type ProveActions, ProveSheet } from "./ProveSheet.tsx";
import { RecordedWaveform } from "./RecordedWaveform.tsx";
import { SpeedSections } from "./SpeedSections.tsx";
import { useSpeed } from "./useSpeed.ts";

/** Will it work. Shows the last proof with the document that it judged, greyed while a newer one is awaited. */
export function ProveScreen() {
  const document = useDocument();
  const judged = useJudged((state) => state.document) ?? document;
  const proof = useJudged((state) => state.proof);
  const refusal = useJudged((state) => state.refusal);
  const stale = useJudged((state) => state.stale);
  const actions = useProveActions();
  const speed = useSpeed();
  if (proof === null) return <NoProof text={refusal === null ? null : `${refusal.why} ${refusal.cure}`} />;
  return (
    <div className={stale ? "stale" : ""} aria-busy={stale}>
      <ProveSheet
        document={judged}
        proof={proof}
        actions={actions}
        speed={speed}
        beyond={<SpeedSections document={judged} proof={proof} speed={speed} />}
      />
      <RecordedWaveform />
    </div>
  );
}

function NoProof({ text }: { readonly text: string | null }) {
  return <p role="status">{text ?? "The proof is being computed."}</p>;
}

function useProveActions(): ProveActions {
  const session = useSession();
  const apply = useApply();
  return useMemo(
    () => ({
      onWhy: (path, element) => openWhy(session, path, element === null ? null : element - 1),
      onCure: (cure) => void apply((store) => store.applyCure(cure)),
    }),
    [session, apply],
  );
}

export default ProveScreen;

import { useMemo } from "react";
import { type FamilyActions, OwnFamilies } from "../families/OwnFamilies.tsx";
import { openWhy, useDocument, useJudged, useSession } from "../frame/session.ts";
import { useApply } from "../frame/useApply.ts";
import { type SizeActions, SizeSheet } from "./SizeSheet.tsx";

/** Which parts. Shows the last answer with the document that it was given for; own families are those of the document now. */
export function SizeScreen() {
  const document = useDocument();
  const judged = useJudged((state) => state.document) ?? document;
  const sizing = useJudged((state) => state.sizing);
  const proof = useJudged((state) => state.proof);
  const stale = useJudged((state) => state.stale);
  const actions = useSizeActions();
  const families = useFamilyActions();
  return (
    <>
      <div className={stale ? "stale" : ""} aria-busy={stale}>
        <SizeSheet document={judged} sizing={sizing} proof={proof} actions={actions} />
      </div>
      <OwnFamilies document={document} actions={families} />
    </>
  );
}

function useSizeActions(): SizeActions {
  const session = useSession();
  const apply = useApply();
  return useMemo(
    () => ({
      onTake: (candidate) => void apply((store) => store.takeCandidate(candidate)),
      onSizeAgain: () => void apply((store) => store.sizeAgain()),
      onCure: (cure) => void apply((store) => store.applyCure(cure)),
      onWhy: (path, from) => openWhy(session, path, null, from),
    }),
    [session, apply],
  );
}

function useFamilyActions(): FamilyActions {
  const session = useSession();
  const apply = useApply();
  return useMemo(
    () => ({
      onInHandOnly: (only) =>
        void apply((store) => store.editAt("/brief/policy/partsInHandOnly", only, { step: "parts in hand only" })),
      onAddFamily: (part, assumed) => {
        const index = session.store.getState().document.parts.length;
        const done = apply((store) => store.editAt("/parts/-", part, { step: `family ${part.name}` }));
        if (!done.ok) return `${done.error.why} ${done.error.cure}`;
        for (const key of assumed) {
          const value = part[key as keyof typeof part];
          apply((store) => store.editAt(`/parts/${index}/${key}`, value, { step: "stand-in", origin: "assumed" }));
        }
        return null;
      },
      onRemoveFamily: (index) => void apply((store) => store.removeAt(`/parts/${index}`, "take out a family")),
    }),
    [session, apply],
  );
}

export default SizeScreen;

import { useMemo } from "react";
import type { Cure, Edit, Origin, Part } from "../../solver/index.ts";
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
  const apply = useApply();
  return useMemo(
    () => ({
      onInHandOnly: (only) =>
        void apply((store) => store.editAt("/brief/policy/partsInHandOnly", only, { step: "parts in hand only" })),
      onAddFamily: (part, assumed) => {
        const done = apply((store) => store.applyCure(addition(part, assumed, store.document.parts.length)));
        return done.ok ? null : `${done.error.why} ${done.error.cure}`;
      },
      onRemoveFamily: (index) => void apply((store) => store.removeAt(`/parts/${index}`, "take out a family")),
    }),
    [apply],
  );
}

/** A family and the origins of its stand-ins as one step. */
function addition(part: Part, assumed: readonly string[], index: number): Cure {
  const values: Readonly<Record<string, unknown>> = { ...part };
  const edits: (Edit & { readonly origin?: Origin })[] = [
    { pointer: "/parts/-", value: part },
    ...assumed.map((key) => ({ pointer: `/parts/${index}/${key}`, value: values[key], origin: "assumed" as const })),
  ];
  return { label: `family ${part.name}`, edits };
}

export default SizeScreen;

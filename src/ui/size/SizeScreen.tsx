import { useMemo } from "react";
import type { Cure, Edit, Origin } from "../../solver/index.ts";
import type { AddedFamily } from "../families/draftFamily.ts";
import { type FamilyActions, OwnFamilies } from "../families/OwnFamilies.tsx";
import { openWhy, useDocument, useJudged, useSession } from "../frame/session.ts";
import { useApply } from "../frame/useApply.ts";
import { Connections } from "./Connections.tsx";
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
      {document.design === null ? null : <Connections design={document.design} />}
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
      onAddFamilies: (added) => {
        const done = apply((store) => store.applyCure(addition(added, store.document.parts.length)));
        return done.ok ? null : `${done.error.why} ${done.error.cure}`;
      },
      onRemoveFamily: (index) => void apply((store) => store.removeAt(`/parts/${index}`, "take out a family")),
    }),
    [apply],
  );
}

/** Families and the origins of their stand-ins as one step. */
function addition(added: readonly AddedFamily[], first: number): Cure {
  const edits: (Edit & { readonly origin?: Origin })[] = added.map(({ part }) => ({
    pointer: "/parts/-",
    value: part,
  }));
  for (const [i, { part, assumed }] of added.entries()) {
    const values: Readonly<Record<string, unknown>> = { ...part };
    for (const key of assumed)
      edits.push({ pointer: `/parts/${first + i}/${key}`, value: values[key], origin: "assumed" });
  }
  return { label: added.length === 1 ? `family ${added[0]!.part.name}` : `${added.length} families`, edits };
}

export default SizeScreen;

import { lazy, Suspense, useCallback, useMemo, useState } from "react";
import type { DividerDocument, Part } from "../../solver/index.ts";
import { type AddedFamily, freeId } from "./draftFamily.ts";
import { FamilyForm } from "./FamilyForm.tsx";
import { FamilyTable, type OwnFamily } from "./FamilyTable.tsx";
import "./families.css";

export interface FamilyActions {
  readonly onInHandOnly: (only: boolean) => void;
  /** Returns what was wrong, if it was refused. */
  readonly onAddFamilies: (added: readonly AddedFamily[]) => string | null;
  readonly onRemoveFamily: (index: number) => void;
}

interface Props {
  readonly document: DividerDocument;
  readonly actions: FamilyActions;
}

/** Own families and what lies in the drawer: beside the catalogue, or in place of it. */
export function OwnFamilies({ document, actions }: Props) {
  const { parts } = document;
  const own = useMemo(() => parts.filter(isOwn), [parts]);
  const idFor = useCallback((kind: "resistor" | "capacitor") => freeId(parts, kind), [parts]);
  const only = document.brief.policy.partsInHandOnly;
  return (
    <section className="sheet-section" aria-labelledby="families-heading">
      <h2 id="families-heading">own families</h2>
      <p className="finding-sentence">{sentence(own, only)}</p>
      <label className="in-hand-only">
        <input type="checkbox" checked={only} onChange={(event) => actions.onInHandOnly(event.target.checked)} />
        size from parts in hand only
      </label>
      {own.length === 0 ? null : (
        <FamilyTable families={own} onRemove={(family) => actions.onRemoveFamily(parts.indexOf(family))} />
      )}
      <details className="table-on-request">
        <summary>add a family</summary>
        <FamilyForm idFor={idFor} onAdd={actions.onAddFamilies} />
      </details>
      <Import parts={parts} onAdd={actions.onAddFamilies} />
    </section>
  );
}

const ImportFamilies = lazy(() => import("./ImportFamilies.tsx").then((m) => ({ default: m.ImportFamilies })));

/** The reader of CSV files is fetched when it is opened. */
function Import(props: { readonly parts: readonly Part[]; readonly onAdd: FamilyActions["onAddFamilies"] }) {
  const [open, setOpen] = useState(false);
  return (
    <details className="table-on-request" onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary>families from a CSV file</summary>
      <Suspense fallback={null}>{open ? <ImportFamilies {...props} /> : null}</Suspense>
    </details>
  );
}

const isOwn = (part: Part): part is OwnFamily =>
  part.origin === "typed" && (part.kind === "resistor" || part.kind === "capacitor");

function sentence(own: readonly OwnFamily[], only: boolean): string {
  const drawer = own.reduce((sum, f) => sum + (f.inHand ?? []).reduce((n, each) => n + each.count, 0), 0);
  if (only && drawer === 0) return "Only parts in hand are used, and none is listed: no candidate can stand.";
  if (own.length === 0) return "The generic catalogue is used. Families of your own stand beside it once added.";
  const has = `${own.length} of your own, ${drawer} parts in hand`;
  return only ? `Only what is in hand is used: ${has}.` : `The search looks at the generic catalogue and at ${has}.`;
}

import { encodeDocument } from "../file/encode.ts";
import { valueAt } from "../file/pointer.ts";
import type { Cure, DividerDocument, Result } from "../solver/index.ts";
import { change, type Inner } from "./change.ts";
import { type Change, cleared, edited, removed } from "./edit.ts";
import type { Actions } from "./state.ts";
import { withDesignOf } from "./take.ts";

type EditActions = Pick<
  Actions,
  | "editAt"
  | "clearAt"
  | "removeAt"
  | "leaveField"
  | "acceptAssumed"
  | "applyCure"
  | "takeCandidate"
  | "sizeAgain"
  | "adopt"
  | "rename"
>;

export function editActions(inner: Inner): EditActions {
  const { get, set, around } = inner;
  return {
    editAt: (pointer, value, options) =>
      change(inner, options.step, pointer, (old) => editedOrSame(old, { pointer, value, ...options })),
    clearAt: (pointer, step) => change(inner, step, null, (old) => cleared(old, pointer)),
    removeAt: (pointer, step) => change(inner, step, null, (old) => removed(old, pointer)),
    leaveField: () => set({ typing: null }),
    acceptAssumed: (pointer) => change(inner, "accept an assumed value", null, (old) => accepted(old, pointer)),
    applyCure: (cure) => change(inner, cure.label, null, (old) => cured(old, cure)),
    takeCandidate: (candidate) =>
      change(inner, `take candidate ${candidate.rank}`, null, (old) => ({
        ok: true,
        value: withDesignOf(old, around.takeCandidate(old, candidate), false),
      })),
    sizeAgain: () => change(inner, "size again", null, (old) => ({ ok: true, value: following(old) })),
    adopt: (judged, chosen) => {
      const { document: now, saved } = get();
      if (now !== judged || (now.design !== null && !now.design.follows)) return;
      const next = withDesignOf(now, chosen, true);
      if (encodeDocument(next) === encodeDocument(now)) return;
      set({ document: next, saved: saved === now ? next : saved });
    },
    rename: (name) => change(inner, "name", "/name", (old) => editedOrSame(old, { pointer: "/name", value: name })),
  };
}

/** The edit, or the same document when nothing would change. */
function editedOrSame(old: DividerDocument, edit: Change): Result<DividerDocument> {
  const made = edited(old, edit);
  if (!made.ok) return made;
  const { pointer } = edit;
  const same = (look: (document: DividerDocument) => unknown) =>
    JSON.stringify(look(old)) === JSON.stringify(look(made.value));
  const unchanged =
    !pointer.endsWith("/-") &&
    same((document) => valueAt(document, pointer)) &&
    same((document) => document.origins[pointer]) &&
    same((document) => document.typed[pointer]);
  return unchanged ? { ok: true, value: old } : made;
}

function accepted(old: DividerDocument, pointer: string): Result<DividerDocument> {
  const assumed = old.origins[pointer] === "assumed";
  return { ok: true, value: assumed ? { ...old, origins: { ...old.origins, [pointer]: "typed" } } : old };
}

/** Every edit of a cure, or none. */
function cured(old: DividerDocument, cure: Cure): Result<DividerDocument> {
  let made: Result<DividerDocument> = { ok: true, value: old };
  for (const edit of cure.edits) if (made.ok) made = edited(made.value, edit);
  return made.ok && cure.sizeAgain === true ? { ok: true, value: following(made.value) } : made;
}

/** A document without a design is sized anyway. */
const following = (document: DividerDocument): DividerDocument =>
  document.design === null || document.design.follows
    ? document
    : { ...document, design: { ...document.design, follows: true } };

/** The one store: inputs, the state of the file, undo. Changes go through its actions only. */
import { createStore, type StoreApi } from "zustand/vanilla";
import { encodeDocument } from "../file/encode.ts";
import { valueAt } from "../file/pointer.ts";
import type { Candidate, DividerDocument, Result } from "../solver/index.ts";
import { type Change, cleared, edited, removed } from "./edit.ts";
import { redone, stepped, undone } from "./history.ts";
import type { Done, FileState, Snapshot, State, Store } from "./state.ts";
import { withDesignOf } from "./take.ts";

export interface Around {
  /** Milliseconds since 1970. */
  readonly now: () => number;
  /** The solver's way of putting a candidate into a document. */
  readonly takeCandidate: (document: DividerDocument, candidate: Candidate) => DividerDocument;
}

export type DividerStore = StoreApi<Store>;

const done: Done = { ok: true, value: null };
const noFile: FileState = { name: null, savedAt: null, dirtySince: null, readOnly: null, example: false };
const unchangeable = {
  "newer version": "The file was written by a newer version, so it is shown and not changed.",
  "open elsewhere": "Another tab is writing this design, so it is shown and not changed here.",
} as const;

export function createDividerStore(
  document: DividerDocument,
  around: Around,
  file: Partial<FileState> = {},
): DividerStore {
  return createStore<Store>()((set, get) => {
    /** The file's state when `next` is the document. */
    const fileWith = (next: DividerDocument, example: boolean): FileState => {
      const { file: now, saved } = get();
      return { ...now, example, dirtySince: example || next === saved ? null : (now.dirtySince ?? around.now()) };
    };

    const change = (
      name: string,
      field: string | null,
      make: (old: DividerDocument) => Result<DividerDocument>,
    ): Done => {
      const state = get();
      const { readOnly, example } = state.file;
      if (readOnly !== null) {
        const cure = "Work on a copy.";
        return { ok: false, error: { where: "the file", why: unchangeable[readOnly], cure } };
      }
      const made = make(state.document);
      if (!made.ok) return made;
      if (made.value === state.document) return done;
      const next = example ? asCopy(made.value, state.document.name) : made.value;
      if (example) set({ saved: null });
      set({ ...stepped(state, name, field), document: next, file: example ? inNoFile(around) : fileWith(next, false) });
      return done;
    };

    const jump = (move: ReturnType<typeof undone>) => {
      if (move === null || get().file.readOnly !== null) return;
      const { snapshot, ...histories } = move;
      set({ ...histories, ...arrive(snapshot) });
    };
    const arrive = ({ document: next, example }: Snapshot) => ({ document: next, file: fileWith(next, example) });

    const start = (next: DividerDocument, opened: Partial<FileState>): State => ({
      document: next,
      file: { ...noFile, ...opened },
      saved: opened.dirtySince == null ? next : null,
      past: [],
      future: [],
      typing: null,
      browserCopy: get()?.browserCopy ?? { savedAt: null, problem: null },
    });

    return {
      ...start(document, file),
      editAt: (pointer, value, options) =>
        change(options.step, pointer, (old) => sameOr(old, { pointer, value, ...options })),
      clearAt: (pointer, step) => change(step, null, (old) => cleared(old, pointer)),
      removeAt: (pointer, step) => change(step, null, (old) => removed(old, pointer)),
      leaveField: () => set({ typing: null }),
      acceptAssumed: (pointer) =>
        change("accept an assumed value", null, (old) => ({
          ok: true,
          value: old.origins[pointer] === "assumed" ? { ...old, origins: { ...old.origins, [pointer]: "typed" } } : old,
        })),
      applyCure: (cure) =>
        change(cure.label, null, (old) => {
          let made: Result<DividerDocument> = { ok: true, value: old };
          for (const edit of cure.edits) if (made.ok) made = edited(made.value, edit);
          return made.ok && cure.sizeAgain === true ? { ok: true, value: following(made.value) } : made;
        }),
      takeCandidate: (candidate) =>
        change(`take candidate ${candidate.rank}`, null, (old) => ({
          ok: true,
          value: withDesignOf(old, around.takeCandidate(old, candidate), false),
        })),
      sizeAgain: () => change("size again", null, (old) => ({ ok: true, value: following(old) })),
      adopt: (judged, chosen) => {
        const { document: now, saved } = get();
        if (now !== judged || (now.design !== null && !now.design.follows)) return;
        const next = withDesignOf(now, chosen, true);
        if (encodeDocument(next) === encodeDocument(now)) return;
        set({ document: next, saved: saved === now ? next : saved });
      },
      rename: (name) => change("name", "/name", (old) => sameOr(old, { pointer: "/name", value: name })),
      undo: () => jump(undone(get())),
      redo: () => jump(redone(get())),
      openDocument: (next, opened = {}) => set(start(next, opened)),
      newDocument: (next) => set({ ...start(next, {}), saved: null }),
      fileSaved: (written, name) => {
        const { document: now, file: old } = get();
        const savedAt = around.now();
        const dirtySince = now === written ? null : (old.dirtySince ?? savedAt);
        set({ saved: written, typing: null, file: { ...old, name, savedAt, dirtySince, example: false } });
      },
      workOnACopy: () => {
        const { document: now } = get();
        set({ document: asCopy(now, now.name), saved: null, file: inNoFile(around) });
      },
      setReadOnly: (readOnly) => set({ file: { ...get().file, readOnly } }),
      noteBrowserCopy: (browserCopy) => set({ browserCopy }),
    };
  });
}

/** The edit, or the same document when nothing would change. */
function sameOr(old: DividerDocument, change: Change): Result<DividerDocument> {
  const made = edited(old, change);
  if (!made.ok) return made;
  const { pointer } = change;
  const same = (look: (document: DividerDocument) => unknown) =>
    JSON.stringify(look(old)) === JSON.stringify(look(made.value));
  const unchanged =
    same((d) => valueAt(d, pointer)) && same((d) => d.origins[pointer]) && same((d) => d.typed[pointer]);
  return unchanged && !pointer.endsWith("/-") ? { ok: true, value: old } : made;
}

/** null as the design is sized anyway. */
const following = (document: DividerDocument): DividerDocument =>
  document.design === null || document.design.follows
    ? document
    : { ...document, design: { ...document.design, follows: true } };

/** Renamed, unless the step gave it a name of its own. */
const asCopy = (document: DividerDocument, name: string): DividerDocument =>
  document.name === name ? { ...document, name: `copy of ${name}` } : document;

const inNoFile = (around: Around): FileState => ({ ...noFile, dirtySince: around.now() });

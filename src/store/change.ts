import type { StoreApi } from "zustand/vanilla";
import type { Candidate, DividerDocument, Result } from "../solver/index.ts";
import { stepped } from "./history.ts";
import type { Done, FileState, Store } from "./state.ts";

export interface Around {
  /** Milliseconds since 1970. */
  readonly now: () => number;
  /** The solver's way of putting a candidate into a document. */
  readonly takeCandidate: (document: DividerDocument, candidate: Candidate) => DividerDocument;
}

/** What the actions share. */
export interface Inner {
  readonly set: StoreApi<Store>["setState"];
  readonly get: () => Store;
  readonly around: Around;
}

export const noFile: FileState = { name: null, savedAt: null, dirtySince: null, readOnly: null, example: false };
const done: Done = { ok: true, value: null };
const unchangeable = {
  "newer version": "The file was written by a newer version, so it is shown and not changed.",
  "open elsewhere": "Another tab is writing this design, so it is shown and not changed here.",
} as const;

export const inNoFile = ({ around }: Inner): FileState => ({ ...noFile, dirtySince: around.now() });

/** The file's state when `next` is the document. */
export function fileWith({ get, around }: Inner, next: DividerDocument, example: boolean): FileState {
  const { file, saved } = get();
  return { ...file, example, dirtySince: example || next === saved ? null : (file.dirtySince ?? around.now()) };
}

/** Renamed, unless the step gave it a name of its own. */
export const asCopy = (document: DividerDocument, name: string): DividerDocument =>
  document.name === name ? { ...document, name: `copy of ${name}` } : document;

/** One step: refused while read-only, kept out of the history when nothing changes, a copy when an example is edited. */
export function change(
  inner: Inner,
  name: string,
  field: string | null,
  make: (old: DividerDocument) => Result<DividerDocument>,
): Done {
  const state = inner.get();
  const { readOnly, example } = state.file;
  if (readOnly !== null) {
    return { ok: false, error: { where: "the file", why: unchangeable[readOnly], cure: "Work on a copy." } };
  }
  const made = make(state.document);
  if (!made.ok) return made;
  if (made.value === state.document) return done;
  const step = stepped(state, name, field);
  if (example)
    inner.set({ ...step, document: asCopy(made.value, state.document.name), saved: null, file: inNoFile(inner) });
  else inner.set({ ...step, document: made.value, file: fileWith(inner, made.value, false) });
  return done;
}

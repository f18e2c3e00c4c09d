/** The one store: inputs, the state of the file, undo. Changes go through its actions only. */
import { createStore, type StoreApi } from "zustand/vanilla";
import type { DividerDocument } from "../solver/index.ts";
import type { Around } from "./change.ts";
import { editActions } from "./editActions.ts";
import { fileActions, openedWith } from "./fileActions.ts";
import type { FileState, Store } from "./state.ts";

export type DividerStore = StoreApi<Store>;

export const createDividerStore = (
  document: DividerDocument,
  around: Around,
  file: Partial<FileState> = {},
): DividerStore =>
  createStore<Store>()((set, get) => {
    const inner = { set, get, around };
    return {
      ...openedWith(document, file),
      browserCopy: { savedAt: null, problem: null },
      ...editActions(inner),
      ...fileActions(inner),
    };
  });

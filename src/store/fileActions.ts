import type { DividerDocument } from "../solver/index.ts";
import { asCopy, fileWith, type Inner, inNoFile, noFile } from "./change.ts";
import { redone, undone } from "./history.ts";
import type { Actions, FileState, State } from "./state.ts";

type FileActions = Omit<
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

/** The state in which a document is opened, its history empty. */
export function openedWith(document: DividerDocument, opened: Partial<FileState>): Omit<State, "browserCopy"> {
  const file = { ...noFile, ...opened };
  return { document, file, saved: file.dirtySince === null ? document : null, past: [], future: [], typing: null };
}

export function fileActions(inner: Inner): FileActions {
  const { get, set, around } = inner;
  const jump = (move: ReturnType<typeof undone>) => {
    if (move === null || get().file.readOnly !== null) return;
    const { snapshot, ...histories } = move;
    set({ ...histories, document: snapshot.document, file: fileWith(inner, snapshot.document, snapshot.example) });
  };
  return {
    undo: () => jump(undone(get())),
    redo: () => jump(redone(get())),
    openDocument: (document, file = {}) => set(openedWith(document, file)),
    newDocument: (document) => set({ ...openedWith(document, {}), saved: null }),
    resume: ({ document, file, past, future }) => set({ ...openedWith(document, file), past, future }),
    fileSaved: (written, name) => {
      const { document, file } = get();
      const savedAt = around.now();
      const dirtySince = document === written ? null : (file.dirtySince ?? savedAt);
      set({ saved: written, typing: null, file: { ...file, name, savedAt, dirtySince, example: false } });
    },
    workOnACopy: () => {
      const { document } = get();
      set({ document: asCopy(document, document.name), saved: null, file: inNoFile(inner) });
    },
    setReadOnly: (readOnly) => set({ file: { ...get().file, readOnly } }),
    noteBrowserCopy: (browserCopy) => set({ browserCopy }),
  };
}

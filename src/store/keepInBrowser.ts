/** Ties the store to its copy in this browser: writes a moment after a change, one write at a time, and says how it went. */
import type { Autosave, Opening } from "./autosave.ts";
import type { Kept, Store } from "./state.ts";
import type { DividerStore } from "./store.ts";

export interface Pace {
  /** Quiet time after a change before it is written. */
  readonly quiet_ms: number;
  /** Longest that a change waits while others follow it. */
  readonly longest_ms: number;
}
const pace: Pace = { quiet_ms: 300, longest_ms: 2000 };

export interface Keeper {
  /** Writes what is not written yet; for the moment the page is hidden. */
  readonly flush: () => Promise<void>;
  /** Opens a slot and goes on with what it holds, read-only while another tab writes it. */
  readonly open: (slot: string) => Promise<Opening>;
  /** Makes a copy that can be edited, in a slot of its own. */
  readonly workOnACopy: (slot: string) => Promise<void>;
  readonly stop: () => void;
}

const keptOf = ({ document, file, past, future }: Store): Kept => ({ document, file, past, future });
const changed = (a: Store, b: Store): boolean =>
  a.document !== b.document || a.file !== b.file || a.past !== b.past || a.future !== b.future;

export function keepInBrowser(store: DividerStore, autosave: Autosave, { quiet_ms, longest_ms }: Pace = pace): Keeper {
  let timer: ReturnType<typeof setTimeout> | undefined;
  let since: number | null = null;
  let writing: Promise<void> = Promise.resolve();

  const write = async () => {
    if (since === null) return;
    since = null;
    const saving = await autosave.save(keptOf(store.getState()));
    const { browserCopy, noteBrowserCopy, setReadOnly } = store.getState();
    if (saving.kind === "saved") noteBrowserCopy({ savedAt: saving.at, problem: null });
    else if (saving.kind === "failed") {
      since ??= Date.now();
      noteBrowserCopy({ ...browserCopy, problem: saving.why });
    } else if (store.getState().file.readOnly === null) setReadOnly("open elsewhere");
  };
  const flush = () => {
    clearTimeout(timer);
    writing = writing.then(write);
    return writing;
  };
  const unsubscribe = store.subscribe((now, before) => {
    if (!changed(now, before) || !autosave.writing) return;
    since ??= Date.now();
    clearTimeout(timer);
    timer = setTimeout(flush, Math.max(0, Math.min(quiet_ms, since + longest_ms - Date.now())));
  });

  const goOn = (opening: Opening) => {
    if (opening.kept !== null) store.getState().resume(opening.kept);
    const { file, setReadOnly } = store.getState();
    if (!opening.writer) setReadOnly("open elsewhere");
    else if (file.readOnly === "open elsewhere") setReadOnly(null);
    clearTimeout(timer);
    since = null;
  };
  const open = async (slot: string) => {
    await flush();
    const opening = await autosave.open(slot);
    goOn(opening);
    if (!opening.writer) void autosave.whenFree().then((later) => later !== null && goOn(later));
    return opening;
  };
  return {
    flush,
    open,
    workOnACopy: async (slot) => {
      await flush();
      await autosave.open(slot);
      store.getState().workOnACopy();
      await flush();
    },
    stop: () => {
      clearTimeout(timer);
      unsubscribe();
    },
  };
}

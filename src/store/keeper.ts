/** Ties the store to its copy in this browser: writes a moment after a change, one write at a time, and says how it went. */
import type { Autosave, Opening } from "./autosave.ts";
import type { Kept, Store } from "./state.ts";
import type { DividerStore } from "./store.ts";

/** Quiet time after a change before it is written. */
const quiet_ms = 300;
/** Longest that a change waits while others follow it. */
const longest_ms = 2000;

const keptOf = ({ document, file, past, future }: Store): Kept => ({ document, file, past, future });
const changed = (a: Store, b: Store): boolean =>
  a.document !== b.document || a.file !== b.file || a.past !== b.past || a.future !== b.future;

export class Keeper {
  readonly #store: DividerStore;
  readonly #autosave: Autosave;
  readonly #unsubscribe: () => void;
  #timer: ReturnType<typeof setTimeout> | undefined;
  /** Since when there is something to write; null: nothing. */
  #since: number | null = null;
  #writing: Promise<void> = Promise.resolve();

  constructor(store: DividerStore, autosave: Autosave) {
    this.#store = store;
    this.#autosave = autosave;
    this.#unsubscribe = store.subscribe((now, before) => {
      if (changed(now, before) && autosave.writing) this.#soon();
    });
  }

  /** Opens a slot and goes on with what it holds, read-only while another tab writes it. */
  async open(slot: string): Promise<Opening> {
    await this.flush();
    const opening = await this.#autosave.open(slot);
    this.#goOn(opening);
    if (!opening.writer) void this.#autosave.whenFree().then((later) => later !== null && this.#goOn(later));
    return opening;
  }

  /** Writes what is not written yet; for the moment the page is hidden. */
  flush(): Promise<void> {
    clearTimeout(this.#timer);
    this.#writing = this.#writing.then(() => this.#write());
    return this.#writing;
  }

  /** Makes a copy that can be edited, in a slot of its own. */
  async workOnACopy(slot: string): Promise<void> {
    await this.flush();
    await this.#autosave.open(slot);
    this.#store.getState().workOnACopy();
    await this.flush();
  }

  /** Writes no more and lets the slot go. */
  async stop(): Promise<void> {
    this.#unsubscribe();
    await this.flush();
    await this.#autosave.close();
  }

  #soon(): void {
    this.#since ??= Date.now();
    clearTimeout(this.#timer);
    const wait = Math.max(0, Math.min(quiet_ms, this.#since + longest_ms - Date.now()));
    this.#timer = setTimeout(() => void this.flush(), wait);
  }

  async #write(): Promise<void> {
    if (this.#since === null) return;
    this.#since = null;
    const saving = await this.#autosave.save(keptOf(this.#store.getState()));
    const { browserCopy, noteBrowserCopy, setReadOnly, file } = this.#store.getState();
    if (saving.kind === "saved") noteBrowserCopy({ savedAt: saving.at, problem: null });
    else if (saving.kind === "stale" && file.readOnly === null) setReadOnly("open elsewhere");
    else if (saving.kind === "failed") {
      this.#since ??= Date.now();
      noteBrowserCopy({ ...browserCopy, problem: saving.why });
    }
  }

  #goOn(opening: Opening): void {
    if (opening.kept !== null) this.#store.getState().resume(opening.kept);
    const { file, setReadOnly } = this.#store.getState();
    if (!opening.writer) setReadOnly("open elsewhere");
    else if (file.readOnly === "open elsewhere") setReadOnly(null);
    clearTimeout(this.#timer);
    this.#since = null;
  }
}

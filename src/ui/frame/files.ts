import { encodeDocument } from "../../file/encode.ts";
import { restoreDocument } from "../../file/restore.ts";
import type { DividerDocument } from "../../solver/index.ts";
import { IndexedDbShelf } from "../../store/indexedDbShelf.ts";
import type { Session } from "./session.ts";

/** Solved jobs that ship with the program, each fetched when it is opened. */
const demos = import.meta.glob<unknown>("../../../demo/*.json", { import: "default" });
const firstDemo = "dc-supply-into-meter";

export const exampleNames: readonly string[] = Object.keys(demos)
  .map((path) => path.replace(/^.*\/(.*)\.json$/, "$1"))
  .sort();
export const plainName = (name: string): string => name.replaceAll("-", " ");

export async function exampleDocument(name: string): Promise<DividerDocument> {
  const load = demos[`../../../demo/${name}.json`];
  if (load === undefined) throw new Error(`no example ${name}`);
  const restored = restoreDocument(JSON.stringify(await load()));
  if (restored.kind === "refused") throw new Error(restored.refusal.why);
  return restored.document;
}

export const firstExample = (): Promise<DividerDocument> => exampleDocument(firstDemo);

/** A slot of its own for each design in the browser copy; the tab remembers which it has. */
export async function inNewSlot(session: Session, put: () => void): Promise<void> {
  if (session.keeper !== null) {
    const slot = crypto.randomUUID();
    sessionStorage.setItem("slot", slot);
    await session.keeper.open(slot);
  }
  put();
}

/** The slot to go on with: this tab's, or the newest of the browser; null: none. */
export async function lastSlot(): Promise<string | null> {
  const held = sessionStorage.getItem("slot");
  if (held !== null) return held;
  const [newest] = await new IndexedDbShelf().slots();
  return newest?.slot ?? null;
}

/** Opens the text of a file in place of what is open; what is broken is said and replaces nothing. */
export async function openText(session: Session, text: string, name: string): Promise<void> {
  const restored = restoreDocument(text);
  if (restored.kind === "refused") {
    const { where, why, cure } = restored.refusal;
    session.looking.setState({ notice: { text: `${name} was not opened. ${where}: ${why} ${cure}`, bad: true } });
    return;
  }
  await inNewSlot(session, () => {
    session.store.getState().openDocument(restored.document, {
      name,
      savedAt: Date.now(),
      readOnly: restored.readOnly ? "newer version" : null,
    });
  });
  const { repairs } = restored;
  session.looking.setState({
    notice:
      repairs.length === 0
        ? { text: `${name} is open.`, bad: false }
        : {
            text: `${name} is open; ${repairs.length} place${repairs.length > 1 ? "s were" : " was"} repaired.`,
            bad: false,
            details: repairs.map((repair) => `${repair.pointer}: ${repair.why}`),
          },
  });
}

const type = { description: "Stringwright design", accept: { "application/json": [".json"] as const } };

interface Pickers {
  showSaveFilePicker?: (options: object) => Promise<{
    name: string;
    createWritable(): Promise<{ write(text: string): Promise<void>; close(): Promise<void> }>;
  }>;
}

/** Saves by the browser's own dialog where it has one, else as a download. */
export async function saveDocument(session: Session): Promise<void> {
  const { document: document_ } = session.store.getState();
  const text = encodeDocument(document_);
  const suggestedName = `${fileStem(document_.name)}.stringwright.json`;
  const picker = (window as unknown as Pickers).showSaveFilePicker;
  try {
    if (picker !== undefined) {
      const handle = await picker({ suggestedName, types: [type] });
      const writable = await handle.createWritable();
      await writable.write(text);
      await writable.close();
      session.store.getState().fileSaved(document_, handle.name);
      return;
    }
    downloadText(suggestedName, text);
    session.store.getState().fileSaved(document_, suggestedName);
  } catch (error) {
    if ((error as Error).name === "AbortError") return;
    session.looking.setState({
      notice: { text: `Not saved: ${(error as Error).message} The copy in this browser stands.`, bad: true },
    });
  }
}

function downloadText(name: string, text: string): void {
  const link = document.createElement("a");
  link.href = URL.createObjectURL(new Blob([text], { type: "application/json" }));
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(link.href), 10_000);
}

const fileStem = (name: string): string =>
  name
    .toLowerCase()
    .normalize("NFKD")
    .replace(/[^\p{L}\p{N}]+/gu, "-")
    .replace(/^-+|-+$/g, "")
    .slice(0, 60) || "design";

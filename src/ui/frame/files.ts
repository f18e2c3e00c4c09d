import { encodeDocument } from "../../file/encode.ts";
import { restoreDocument } from "../../file/restore.ts";
import type { DividerDocument } from "../../solver/index.ts";
import { IndexedDbShelf } from "../../store/indexedDbShelf.ts";
import { canPick, downloadText, type FileHandle, pickToOpen, pickToSave, writeText } from "./fileHandles.ts";
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
  session.handle = null;
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

/** Opens a file by the browser's own dialog, so that Save writes back into it; by `other` where there is no such dialog. */
export async function openByDialog(session: Session, other: () => void): Promise<void> {
  if (!canPick()) return other();
  try {
    const handle = await pickToOpen();
    if (handle !== null) await openText(session, await (await handle.getFile()).text(), handle.name, handle);
  } catch (error) {
    session.looking.setState({ notice: { text: `Not opened: ${(error as Error).message}`, bad: true } });
  }
}

/** Opens the text of a file in place of what is open; what is broken is said and replaces nothing. */
export async function openText(
  session: Session,
  text: string,
  name: string,
  handle: FileHandle | null = null,
): Promise<void> {
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
  session.handle = restored.readOnly ? null : handle;
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

/** Saves into the file that is open; asks for a place where there is none yet, or hands it over as a download. */
export function saveDocument(session: Session): Promise<void> {
  return written(session, async (text, suggestedName, document_) => {
    const handle = session.handle ?? (await pickToSave(suggestedName));
    if (handle === null) return;
    if (handle === undefined) downloadText(suggestedName, text);
    else await writeText(handle, text);
    session.handle = handle ?? null;
    session.store.getState().fileSaved(document_, handle?.name ?? suggestedName);
  });
}

/** Writes a copy elsewhere; what is open stays what it is, in its own file. */
export function saveACopy(session: Session): Promise<void> {
  return written(session, async (text, suggestedName) => {
    const name = suggestedName.replace(/(\.stringwright\.json)$/, "-copy$1");
    const handle = await pickToSave(name);
    if (handle === null) return;
    if (handle === undefined) downloadText(name, text);
    else await writeText(handle, text);
    session.looking.setState({ notice: { text: `A copy is saved as ${handle?.name ?? name}.`, bad: false } });
  });
}

async function written(
  session: Session,
  write: (text: string, suggestedName: string, document_: DividerDocument) => Promise<void>,
): Promise<void> {
  const { document: document_ } = session.store.getState();
  try {
    await write(encodeDocument(document_), `${fileStem(document_.name)}.stringwright.json`, document_);
  } catch (error) {
    session.looking.setState({
      notice: { text: `Not saved: ${(error as Error).message} The copy in this browser stands.`, bad: true },
    });
  }
}

const fileStem = (name: string): string =>
  name
    .toLowerCase()
    .normalize("NFKD")
    .replace(/[^\p{L}\p{N}]+/gu, "-")
    .replace(/^-+|-+$/g, "")
    .slice(0, 60) || "design";

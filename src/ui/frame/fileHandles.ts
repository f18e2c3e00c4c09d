/** The browser's own open and save dialogs, where it has them; a download and a file input where it has not. */
export interface FileHandle {
  readonly name: string;
  getFile(): Promise<File>;
  createWritable(): Promise<{ write(text: string): Promise<void>; close(): Promise<void> }>;
}

interface Pickers {
  showSaveFilePicker?: (options: object) => Promise<FileHandle>;
  showOpenFilePicker?: (options: object) => Promise<FileHandle[]>;
}

const types = [{ description: "Stringwright design", accept: { "application/json": [".json"] } }];
const pickers = (): Pickers => window as unknown as Pickers;

export const canPick = (): boolean => pickers().showOpenFilePicker !== undefined;

/** null: the dialog was closed. */
export async function pickToOpen(): Promise<FileHandle | null> {
  const found = await unlessAborted(() => pickers().showOpenFilePicker!({ types, multiple: false }));
  return found?.[0] ?? null;
}

/** null: the dialog was closed; undefined: there is none in this browser. */
export async function pickToSave(suggestedName: string): Promise<FileHandle | null | undefined> {
  const pick = pickers().showSaveFilePicker;
  return pick === undefined ? undefined : unlessAborted(() => pick({ suggestedName, types }));
}

export async function writeText(handle: FileHandle, text: string): Promise<void> {
  const writable = await handle.createWritable();
  await writable.write(text);
  await writable.close();
}

export function downloadText(name: string, text: string): void {
  const link = document.createElement("a");
  link.href = URL.createObjectURL(new Blob([text], { type: "application/json" }));
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(link.href), 10_000);
}

async function unlessAborted<T>(run: () => Promise<T>): Promise<T | null> {
  try {
    return await run();
  } catch (error) {
    if ((error as Error).name === "AbortError") return null;
    throw error;
  }
}

import { restoreDocument } from "../file/restore.ts";
import type { DividerDocument, Refusal } from "../solver/index.ts";
import { type Outside, Unusable } from "./verb.ts";

export const refusalText = ({ where, why, cure }: Refusal): string => `${where}: ${why} ${cure}`;

/** Reads and restores a document; what was repaired is said on standard error. */
export function openDocument(file: string, outside: Outside): DividerDocument {
  const restored = restoreDocument(readText(file, outside));
  if (restored.kind === "refused") throw new Unusable(refusalText(restored.refusal));
  for (const repair of restored.repairs) outside.say(`repaired ${repair.pointer}: ${repair.why}`);
  return restored.document;
}

export function readText(file: string, outside: Outside): string {
  try {
    return outside.read(file);
  } catch (error) {
    throw new Unusable(`${file} cannot be read: ${(error as Error).message}`);
  }
}

export const needsDesign = (document: DividerDocument): void => {
  if (document.design === null) throw new Unusable("no design yet: size FILE --take 1");
};

/** One change of a document as a pure function: the value, its origin, the text typed, and whether the design still follows. */
import { checkAt, defaultAt } from "../file/checkAt.ts";
import { inconsistency } from "../file/consistent.ts";
import { isAtOrBelow, keysOf, valueAt, withoutItemAt, withValueAt } from "../file/pointer.ts";
import type { DividerDocument, Origin, Result } from "../solver/index.ts";
import { assumedAnew } from "./assumedDefaults.ts";

/** What a search hands on as it is: to change it is no choice of parts. */
const keptBySearch = ["/design/follows", "/design/lead", "/design/lvArm/inductance_H"];

export interface Change {
  readonly pointer: string;
  readonly value: unknown;
  readonly typed?: string | undefined;
  readonly origin?: Origin | undefined;
}

const refuse = (where: string, why: string): Result<never> => ({
  ok: false,
  error: { where, why, cure: "Type a value that fits, or leave what stood there." },
});

/** `/list/-` as the index that it will get. */
function resolved(document: DividerDocument, pointer: string): string {
  if (!pointer.endsWith("/-")) return pointer;
  const list = valueAt(document, pointer.slice(0, -2));
  return Array.isArray(list) ? `${pointer.slice(0, -1)}${list.length}` : pointer;
}

export function edited(document: DividerDocument, change: Change): Result<DividerDocument> {
  const pointer = resolved(document, change.pointer);
  if (keysOf(pointer)?.length === 0 || isBookkeeping(pointer)) return refuse(pointer, "That is not edited by hand.");
  const checked = checkAt(document, pointer, change.value);
  if (!checked.ok) return checked;
  const changed = withValueAt(document, pointer, checked.value);
  if (changed === undefined) return refuse(pointer, "There is no such place in the document.");
  return finished(noted(changed, pointer, change), pointer);
}

/** The default in place of what was stated, *assumed* where it says something of the world. */
export function cleared(document: DividerDocument, pointer: string): Result<DividerDocument> {
  const standard = defaultAt(document, pointer);
  if (!standard.ok) return standard;
  const { value, assumed } = standard.value;
  const changed = withValueAt(document, pointer, value);
  if (changed === undefined || isBookkeeping(pointer))
    return refuse(pointer, "There is no such place in the document.");
  const origins: Record<string, Origin> = without(changed.origins, pointer);
  if (assumed) origins[pointer] = "assumed";
  return finished({ ...changed, origins, typed: without(changed.typed, pointer) }, pointer);
}

/** Without the list item at a pointer; origins and typed texts of the items after it move up. */
export function removed(document: DividerDocument, pointer: string): Result<DividerDocument> {
  const changed = isBookkeeping(pointer) ? undefined : withoutItemAt(document, pointer);
  if (changed === undefined) return refuse(pointer, "There is no such item.");
  const origins = movedUp(changed.origins, pointer);
  return finished({ ...changed, origins, typed: movedUp(changed.typed, pointer) }, pointer);
}

const hasOrigin = (pointer: string): boolean =>
  ["/brief", "/parts", "/instruments", "/design"].some((root) => isAtOrBelow(pointer, root));

const isBookkeeping = (pointer: string): boolean =>
  ["/format", "/version", "/origins", "/typed"].some((root) => isAtOrBelow(pointer, root));

function finished(document: DividerDocument, pointer: string): Result<DividerDocument> {
  const own = isAtOrBelow(pointer, "/design") && !keptBySearch.some((each) => isAtOrBelow(pointer, each));
  const { design } = document;
  const stands = own && design?.follows === true ? { ...document, design: { ...design, follows: false } } : document;
  const value = assumedAnew(stands, pointer);
  const fault = inconsistency(value);
  return fault === null ? { ok: true, value } : { ok: false, error: fault };
}

/** Origin and typed text at the pointer; those below it spoke of what is gone. */
function noted(document: DividerDocument, pointer: string, change: Change): DividerDocument {
  const told = hasOrigin(pointer) ? { [pointer]: change.origin ?? "typed" } : {};
  const origins = { ...without(document.origins, pointer), ...told };
  const rest = without(document.typed, pointer);
  return { ...document, origins, typed: change.typed === undefined ? rest : { ...rest, [pointer]: change.typed } };
}

/** The entries that are neither at nor below a pointer. */
export function without<T>(entries: Readonly<Record<string, T>>, pointer: string): Record<string, T> {
  return Object.fromEntries(Object.entries(entries).filter(([key]) => !isAtOrBelow(key, pointer)));
}

function movedUp<T>(entries: Readonly<Record<string, T>>, pointer: string): Record<string, T> {
  const cut = pointer.lastIndexOf("/") + 1;
  const list = pointer.slice(0, cut);
  const gone = Number(pointer.slice(cut));
  const found: Record<string, T> = {};
  for (const [key, value] of Object.entries(entries)) {
    const [index, ...rest] = key.startsWith(list) ? key.slice(cut).split("/") : [];
    const at = Number(index);
    if (index === undefined || at < gone) found[key] = value;
    else if (at > gone) found[[`${list}${at - 1}`, ...rest].join("/")] = value;
  }
  return found;
}

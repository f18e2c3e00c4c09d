import type { Candidate, Cure, DividerDocument, Origin, Result } from "../solver/index.ts";
import type { BrowserKey } from "./keeping.ts";

/** Why nothing can be changed: the file is of a newer version, or another tab is writing this design. */
export type ReadOnly = "newer version" | "open elsewhere" | null;

export interface FileState {
  /** Name of the file it was opened from or saved to; null: never in a file. */
  readonly name: string | null;
  /** Milliseconds since 1970; null: never. */
  readonly savedAt: number | null;
  /** Since when there is something that the file does not hold; null: nothing. */
  readonly dirtySince: number | null;
  readonly readOnly: ReadOnly;
  /** A shipped example: editing it makes a copy. */
  readonly example: boolean;
}

/** What one step of undo brings back. */
export interface Snapshot {
  readonly document: DividerDocument;
  readonly example: boolean;
}

export interface Step {
  /** What the step did, e.g. "nominal voltage". */
  readonly name: string;
  /** Before the step in `past`, after it in `future`. */
  readonly snapshot: Snapshot;
}

/** The copy kept in this browser. */
export interface BrowserCopy {
  readonly savedAt: number | null;
  /** Why the last attempt failed; null: it did not. */
  readonly problem: string | null;
}

/** Inputs and nothing that can be computed from them. */
export interface State {
  readonly document: DividerDocument;
  readonly file: FileState;
  /** The document as the file holds it; null: not known or in no file. */
  readonly saved: DividerDocument | null;
  /** Oldest first. */
  readonly past: readonly Step[];
  /** Next to redo last. */
  readonly future: readonly Step[];
  /** The field whose typing is still one step; null: none. */
  readonly typing: string | null;
  readonly browserCopy: BrowserCopy;
}

/** What this browser keeps of the state; see keeping.ts. */
export type Kept = Pick<State, BrowserKey>;

export interface EditOptions {
  /** Name of the step, as undo shows it. */
  readonly step: string;
  /** The text as it was typed; without it none is kept. */
  readonly typed?: string;
  /** Default *typed*. */
  readonly origin?: Origin;
}

/** A refused action changes nothing and says why. */
export type Done = Result<null>;

export interface Actions {
  /** Sets the value at a JSON pointer (`-` appends to a list). Typing in one field stays one step until `leaveField`. */
  readonly editAt: (pointer: string, value: unknown, options: EditOptions) => Done;
  /** A field left blank: its default stands there again, marked as assumed. */
  readonly clearAt: (pointer: string, step: string) => Done;
  /** Takes one item out of a list. */
  readonly removeAt: (pointer: string, step: string) => Done;
  /** Blur: the next edit is a new step, also in the same field. */
  readonly leaveField: () => void;
  /** The engineer accepts an assumed value as it stands. */
  readonly acceptAssumed: (pointer: string) => Done;
  /** Every edit of a cure as one step. */
  readonly applyCure: (cure: Cure) => Done;
  readonly takeCandidate: (candidate: Candidate) => Done;
  /** The best candidate is chosen again as the brief changes. */
  readonly sizeAgain: () => Done;
  /**
   * Takes over the design that a search chose while the design follows the brief: no step, nothing unsaved by it.
   * Does nothing unless `judged` is still the document.
   */
  readonly adopt: (judged: DividerDocument, chosen: DividerDocument) => void;
  readonly rename: (name: string) => Done;
  readonly undo: () => void;
  readonly redo: () => void;
  /** Opens a document in place of this one; its history starts anew. */
  readonly openDocument: (document: DividerDocument, file?: Partial<FileState>) => void;
  /** A new document, in no file. */
  readonly newDocument: (document: DividerDocument) => void;
  /** Goes on with what this browser kept, history and all. */
  readonly resume: (kept: Kept) => void;
  /** The document as it stood when saving began is in the file now. */
  readonly fileSaved: (document: DividerDocument, name: string) => void;
  /** Makes a copy that can be edited, in no file. */
  readonly workOnACopy: () => void;
  /** Another tab took over, or let go. */
  readonly setReadOnly: (readOnly: ReadOnly) => void;
  readonly noteBrowserCopy: (copy: BrowserCopy) => void;
}

export type Store = State & Actions;

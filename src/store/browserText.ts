/** The copy that this browser keeps, as text and back: the document, the state of its file, and the history as differences. */
import { encodeDocument } from "../file/encode.ts";
import { restoreValue } from "../file/restore.ts";
import type { DividerDocument } from "../solver/index.ts";
import { noFile } from "./change.ts";
import { applied, type Difference, differences } from "./difference.ts";
import type { BrowserKey } from "./keeping.ts";
import type { FileState, Kept, Step } from "./state.ts";

/** Characters of history that are kept; the oldest steps are let go first. */
const mostHistory = 1_000_000;

interface KeptStep {
  readonly name: string;
  readonly example: boolean;
  /** From the step that stands nearer to the document. */
  readonly differences: readonly Difference[];
}
type KeptText = Readonly<Record<BrowserKey, unknown>>;

/** Throws a RangeError when the document holds NaN or infinity. */
export function browserText(kept: Kept): string {
  const whole: KeptText = {
    document: JSON.parse(encodeDocument(kept.document)),
    file: { ...kept.file, readOnly: kept.file.readOnly === "open elsewhere" ? null : kept.file.readOnly },
    past: shortened(kept.document, kept.past),
    future: shortened(kept.document, kept.future),
  };
  return JSON.stringify(whole);
}

/** Newest first, as each is told from the one after it. */
function shortened(document: DividerDocument, steps: readonly Step[]): readonly KeptStep[] {
  const found: KeptStep[] = [];
  let from = document;
  let size = 0;
  for (const { name, snapshot } of [...steps].reverse()) {
    const step = { name, example: snapshot.example, differences: differences(from, snapshot.document) };
    size += JSON.stringify(step).length;
    if (size > mostHistory) break;
    found.push(step);
    from = snapshot.document;
  }
  return found;
}

/** The state again, or why not. The history is let go when the document had to be changed or it does not fit. */
export function fromBrowserText(text: string): Kept | string {
  let parsed: Partial<Record<BrowserKey, unknown>>;
  try {
    parsed = JSON.parse(text) as KeptText;
  } catch {
    return "it is not whole";
  }
  const restored = restoreValue(parsed.document);
  if (restored.kind === "refused") return restored.refusal.why;
  const { document } = restored;
  const file = { ...noFile, ...(parsed.file as Partial<FileState>) };
  const same = restored.repairs.length === 0 && restored.filled.length === 0;
  return {
    document,
    file: restored.readOnly ? { ...file, readOnly: "newer version" } : file,
    past: same ? lengthened(document, parsed.past) : [],
    future: same ? lengthened(document, parsed.future) : [],
  };
}

function lengthened(document: DividerDocument, steps: unknown): readonly Step[] {
  const found: Step[] = [];
  let from = document;
  try {
    for (const step of steps as readonly KeptStep[]) {
      from = applied(from, step.differences);
      found.push({ name: step.name, snapshot: { document: from, example: step.example } });
    }
  } catch {
    return [];
  }
  return found.reverse();
}

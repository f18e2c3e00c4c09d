/** From any text to a whole document with everything that was changed listed, or one clear reason. Never throws. */
import type { DividerDocument } from "../solver/index.ts";
import { documentShape, version } from "./documentShape.ts";
import { withinLimits } from "./limits.ts";
import { migrated } from "./migrate.ts";
import { readObject } from "./read.ts";
import { isObject, Lost, Reading } from "./reading.ts";
import { type Restored, shown } from "./repair.ts";
import { settled } from "./settle.ts";
import type { Raw } from "./shape.ts";
import { lineAndColumn, syntaxFault } from "./syntaxFault.ts";

const refused = (where: string, why: string, cure: string): Restored => ({
  kind: "refused",
  refusal: { where, why, cure },
});

/** Opens the text of a file. */
export function restoreDocument(text: string): Restored {
  const body = text.startsWith("\uFEFF") ? text.slice(1) : text;
  if (body.trim() === "") {
    return refused("the file", "It is empty.", "Open another file; nothing that is open now is touched.");
  }
  const limit = withinLimits(body);
  if (!limit.ok) return { kind: "refused", refusal: limit.error };
  let parsed: unknown;
  try {
    parsed = JSON.parse(body);
  } catch {
    return notJson(body);
  }
  return restoreValue(parsed);
}

/** The same from a parsed value. */
export function restoreValue(parsed: unknown): Restored {
  if (!isObject(parsed)) return notOurs(`It holds ${shown(parsed)}, not a document.`);
  if (Object.hasOwn(parsed, "format") && parsed.format !== "stringwright") {
    return notOurs(`Its format is ${shown(parsed.format)}, not "stringwright".`);
  }
  if (!Object.hasOwn(parsed, "brief") || !isObject(parsed.brief))
    return notOurs('It has no "brief", what is to be measured.');
  return restoreObject(parsed);
}

function restoreObject(parsed: Raw): Restored {
  const from = versionOf(parsed);
  const raw = migrated(parsed, Math.min(from, version));
  const reading = new Reading(raw);
  const newer = from > version;
  const found = readObject(documentShape, newer ? { ...raw, version } : raw, { from: "", to: "" }, reading);
  if (found instanceof Lost) {
    return refused(found.from, `${found.why}.`, "Mend that place in a text editor, or open another copy.");
  }
  const document = settled(found as DividerDocument, reading);
  return { kind: "document", document, repairs: reading.repairs, filled: reading.filled, readOnly: newer };
}

const versionOf = (raw: Raw): number =>
  typeof raw.version === "number" && Number.isInteger(raw.version) && raw.version >= 1 ? raw.version : version;

const notOurs = (why: string): Restored =>
  refused("the file", why, "Open a file that ends in .stringwright.json, or one written by the published schema.");

function notJson(body: string): Restored {
  const at = syntaxFault(body);
  const where = at === null ? "the file" : lineAndColumn(body, at);
  return refused(
    where,
    "The text is not JSON from there on.",
    "Mend that place in a text editor, or open another copy.",
  );
}

import type { Design } from "../job/design.ts";
import type { DividerDocument } from "../job/document.ts";
import type { Instrument } from "../job/instrument.ts";
import type { CapacitorFamily, Origin, Part, ProtectorFamily, ResistorFamily, TrimmerFamily } from "../job/part.ts";
import type { Cure, Finding, Level } from "../standards/finding.ts";
import { marginOf } from "../standards/finding.ts";
import { Sheet } from "../standards/sheet.ts";
import type { Source } from "../standards/source.ts";
import type { ColumnField } from "./columnField.ts";

/** Everything a check reads and writes: the document's design in hand, the sheet, the findings so far. */
export interface Judging {
  readonly document: DividerDocument;
  readonly design: Design;
  readonly instrument: Instrument;
  readonly parts: ReadonlyMap<string, Part>;
  readonly sheet: Sheet;
  readonly findings: Finding[];
  /** The solved field of the drawing, where there is one for it. */
  readonly field: ColumnField | null;
}

/** A judgement about to begin: an empty sheet, no findings. Throws where the document has no design. */
export function judging(document: DividerDocument, field: ColumnField | null = null): Judging {
  const { design } = document;
  if (design === null) throw new Error("judging needs a design");
  const instrument = document.instruments.find((each) => each.id === document.principal);
  if (instrument === undefined)
    throw new Error(`the principal instrument ${document.principal} is not in the document`);
  const parts = new Map(document.parts.map((part) => [part.id, part]));
  return { document, design, instrument, parts, sheet: new Sheet(), findings: [], field };
}

function partOf<K extends Part["kind"]>(
  parts: ReadonlyMap<string, Part>,
  id: string,
  kind: K,
): Extract<Part, { kind: K }> {
  const part = parts.get(id);
  if (part === undefined || part.kind !== kind) throw new Error(`no ${kind} "${id}" among the document's parts`);
  return part as Extract<Part, { kind: K }>;
}

/** The part of that id in the document, of that kind; throws where there is none. */
export const resistorOf = (j: Judging, id: string): ResistorFamily => partOf(j.parts, id, "resistor");
export const capacitorOf = (j: Judging, id: string): CapacitorFamily => partOf(j.parts, id, "capacitor");
export const trimmerOf = (j: Judging, id: string): TrimmerFamily => partOf(j.parts, id, "trimmer");
export const protectorOf = (j: Judging, id: string): ProtectorFamily => partOf(j.parts, id, "protector");

/** Puts one rating of every element's part on the sheet as an array, under its pointer with `*` for the place. */
export function givenPerElement(j: Judging, key: string, pick: (part: ResistorFamily) => number | null): string {
  const path = `/design/hvArm/elements/*/part/${key}`;
  if (j.sheet.values[path] === undefined) {
    const once = new Map<string, number | null>();
    const values = j.design.hvArm.elements.map((element) => {
      if (!once.has(element.part)) once.set(element.part, pick(resistorOf(j, element.part)));
      return once.get(element.part) ?? null;
    });
    j.sheet.given(path, values);
  }
  return path;
}

/** Pointers of the assumed givens that a figure rests on, followed through the traces. */
export function assumedBehind(sheet: Sheet, path: string, origins: DividerDocument["origins"]): string[] {
  const seen = new Set<string>();
  const assumed = new Set<string>();
  const visit = (each: string): void => {
    if (seen.has(each)) return;
    seen.add(each);
    const pointer = each.replace(/:.*$/, "");
    if (pointer.startsWith("/") && origins[pointer] === "assumed") assumed.add(pointer);
    for (const input of Object.values(sheet.traces[each]?.inputs ?? {})) visit(input);
  };
  visit(path);
  return [...assumed];
}

/** Within this share of its limit a figure that rests on an assumed input may be turned by it. */
const turnedByAssumption = 0.2;

export interface LimitCheck {
  readonly id: string;
  readonly what: string;
  /** Path of the figure; an array is judged at its worst element. */
  readonly path: string;
  readonly limitPath: string;
  readonly unit: string;
  readonly sense: "atMost" | "atLeast";
  /** Share of the limit that must be left: 0.4 for a derating of 0.6. */
  readonly statedMargin: number;
  readonly reason: (actual: string, limit: string, element: number | null) => string;
  readonly source: Source;
  readonly cure?: Cure | null;
}

/** Judges a figure of the sheet against a limit of the sheet and adds the finding. */
export function judgeLimit(
  j: Judging,
  check: LimitCheck,
  show: (value: number, unit: string) => string,
): Finding | null {
  const worst = worstOf(j.sheet, check);
  if (worst === null) return null;
  const { actual, limit, margin, index } = worst;
  const assumed = assumedBehind(j.sheet, check.path, j.document.origins).concat(
    assumedBehind(j.sheet, check.limitPath, j.document.origins),
  );
  // Half a part in 1e9 of slack: a limit met to the last digit is met.
  const slack = 1e-9;
  let level: Level = "clear";
  if (margin < -slack) level = "stop";
  else if (margin < check.statedMargin - slack) level = "caution";
  let reason = check.reason(show(actual, check.unit), show(limit, check.unit), index === null ? null : index + 1);
  if (level === "clear" && margin < check.statedMargin + turnedByAssumption && assumed.length > 0) {
    level = "caution";
    reason += ` It rests on assumed input (${[...new Set(assumed)].map(plainPointer).join(", ")}) that could turn it.`;
  }
  const finding: Finding = {
    id: check.id,
    level,
    what: check.what,
    actual,
    limit,
    unit: check.unit,
    sense: check.sense,
    margin,
    reason,
    source: check.source,
    cure: level === "clear" ? null : (check.cure ?? null),
    path: check.path,
    ...(index === null ? {} : { element: index + 1 }),
  };
  j.findings.push(finding);
  return finding;
}

function worstOf(sheet: Sheet, check: LimitCheck) {
  const actuals = sheet.values[check.path];
  const limits = sheet.values[check.limitPath];
  if (actuals === undefined || limits === undefined) throw new Error(`no value at ${check.path} or ${check.limitPath}`);
  const count = Array.isArray(actuals) ? actuals.length : Array.isArray(limits) ? limits.length : 1;
  let worst: { actual: number; limit: number; margin: number; index: number | null } | null = null;
  for (let i = 0; i < count; i++) {
    const actual = Array.isArray(actuals) ? actuals[i] : (actuals as number | null);
    const limit = Array.isArray(limits) ? limits[i] : (limits as number | null);
    if (actual === null || actual === undefined || limit === null || limit === undefined) continue;
    const margin = marginOf(check.sense, actual, limit);
    const index = Array.isArray(actuals) || Array.isArray(limits) ? i : null;
    if (worst === null || margin < worst.margin) worst = { actual, limit, margin, index };
  }
  return worst;
}

/** `/brief/source/capacitance_F` → `source capacitance`. */
export function plainPointer(pointer: string): string {
  return pointer
    .split("/")
    .slice(2)
    .map((word) =>
      word
        .replace(/_.*$/, "")
        .replace(/([A-Z])/g, " $1")
        .toLowerCase(),
    )
    .join(" ");
}

/** A finding that is no comparison of two numbers. */
export function plainFinding(
  j: Judging,
  finding: Pick<Finding, "id" | "level" | "what" | "reason" | "source"> & Partial<Finding>,
): void {
  j.findings.push({
    actual: null,
    limit: null,
    unit: "",
    sense: "none",
    margin: null,
    cure: null,
    path: null,
    ...finding,
  });
}

export type { Origin };

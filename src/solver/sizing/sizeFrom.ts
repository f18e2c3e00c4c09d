import type { DividerDocument } from "../job/document.ts";
import type { Part, ResistorFamily } from "../job/part.ts";
import { ok, type Result, refuse } from "../quantities/result.ts";
import { type Drafted, drafted } from "./candidate.ts";
import { combinations, whyBehind, whyNone } from "./lost.ts";
import type { LostFamily, Sizing } from "./outcome.ts";
import { poolOf, refusedFamily } from "./pool.ts";
import { recordCandidate } from "./record.ts";
import { resistanceWindow } from "./resistanceWindow.ts";
import { search } from "./search.ts";

/** The search over the document's own parts and those given. `size` is the same with the generic catalogue. */
export function sizeFrom(document: DividerDocument, parts: readonly Part[], top: number): Result<Sizing> {
  const pool = poolOf(document, parts);
  if (pool.resistors.length === 0) return noResistor(document);
  const searched = search(document, pool, Math.max(1, Math.floor(top)));
  if (!searched.ok) return searched;
  const { found, limits, kinds, picked } = searched.value;
  const window = resistanceWindow(document, pool, found);
  const refused = pool.resistors.flatMap((family) => refusedFamily(family) ?? []);
  const { sheet } = found.ask.j;
  if (!window.open) {
    const lost = [...kinds.map((kind) => closed(window, kind.family)), ...refused];
    return ok({ window, candidates: [], lost, considered: 0, sheet: sheet.data() });
  }
  const drafts = stopsLast(picked.builds.map((build) => drafted(build, limits, pool)));
  const candidates = drafts.map((draft, i) => recordCandidate(limits, { rank: i + 1, ...draft }));
  const listed = new Set(candidates.map((candidate) => candidate.family));
  const lost = kinds
    .filter((kind) => !listed.has(kind.family.id))
    .map((kind): LostFamily => {
      const behind = picked.behind.get(kind.family.id);
      const reason =
        behind === undefined ? whyNone(kind, limits) : whyBehind(behind.best, behind.dominator, picked.builds);
      return { family: kind.family.id, familyName: kind.family.name, ...reason };
    });
  const considered = kinds.reduce((sum, kind) => sum + combinations(kind, limits), 0);
  return ok({ window, candidates, lost: [...lost, ...refused], considered, sheet: sheet.data() });
}

/** Candidates with a stop go last; within each half the order of the list stands. */
const stopsLast = (drafts: readonly Drafted[]): Drafted[] => [
  ...drafts.filter((draft) => draft.stops.length === 0),
  ...drafts.filter((draft) => draft.stops.length > 0),
];

function noResistor(document: DividerDocument): Result<never> {
  const hand = document.brief.policy.partsInHandOnly;
  return refuse(
    hand ? "/brief/policy/partsInHandOnly" : "/parts",
    `No resistor to choose from${hand ? ": the search is restricted to parts in hand and none is in hand" : ""}.`,
    hand
      ? "Enter values and counts of what is in hand, or allow every part of the catalogue."
      : "Load the generic catalogue, or add one resistor family with its limiting voltage and dissipation.",
  );
}

const closed = (window: Sizing["window"], family: ResistorFamily): LostFamily => ({
  family: family.id,
  familyName: family.name,
  reason: `The resistance window is closed. ${window.collision ?? ""}`.trim(),
  actual: window.least_ohm,
  limit: window.greatest_ohm,
  unit: "ohm",
});

import type { DividerDocument } from "../job/document.ts";
import type { Part, ResistorFamily } from "../job/part.ts";
import { ok, type Result, refuse } from "../quantities/result.ts";
import { bandTop } from "./bandLimit.ts";
import { type Drafted, drafted } from "./candidate.ts";
import { alwaysCompensated, capacitorPeak } from "./compensation.ts";
import { footHeightOf } from "./geometry.ts";
import { kindOf, type Limits, mostElements } from "./kind.ts";
import { combinations, whyBehind, whyNone } from "./lost.ts";
import type { Candidate, LostFamily, Sizing } from "./outcome.ts";
import { linesOf, pick } from "./pick.ts";
import { type Pool, poolOf, refusedFamily } from "./pool.ts";
import { recordCandidate } from "./record.ts";
import { resistanceWindow, type WindowFound, windowOf } from "./resistanceWindow.ts";

/** The search over the document's own parts and those given. `size` is the same with the generic catalogue. */
export function sizeFrom(document: DividerDocument, parts: readonly Part[], top: number): Result<Sizing> {
  const pool = poolOf(document, parts);
  if (pool.resistors.length === 0) return noResistor(document);
  const windowed = windowOf(document, pool);
  if (!windowed.ok) return windowed;
  const found = windowed.value;
  const window = resistanceWindow(document, pool, found);
  const limits = limitsOf(document, found, pool);
  const refused = pool.resistors.flatMap((family) => refusedFamily(family) ?? []);
  const families = pool.resistors.filter((family) => refusedFamily(family) === null);
  if (!window.open) return ok(closed(window, refused, families, found));
  const kinds = families.map((family) => kindOf(family, limits, pool));
  const picked = pick(linesOf(kinds, limits), limits, Math.max(1, Math.floor(top)));
  const drafts = stopsLast(picked.builds.map((build) => drafted(build, limits, pool)));
  const candidates = drafts.map((draft, i): Candidate => recordCandidate(limits, { rank: i + 1, ...draft }));
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
  return ok({ window, candidates, lost: [...lost, ...refused], considered, sheet: found.ask.j.sheet.data() });
}

function limitsOf(document: DividerDocument, { ask, need, least, greatest }: WindowFound, pool: Pool): Limits {
  const { policy } = document.brief;
  const capacitor_V = alwaysCompensated(ask) ? capacitorPeak(pool, policy.voltageDerating) : 0;
  return {
    capacitor_V: capacitor_V > 0 ? capacitor_V : Number.POSITIVE_INFINITY,
    ask,
    need,
    least_ohm: least?.resistance_ohm ?? 0,
    greatest_ohm: greatest?.resistance_ohm ?? Number.POSITIVE_INFINITY,
    length_m: policy.greatestLength_m ?? Number.POSITIVE_INFINITY,
    handOnly: policy.partsInHandOnly,
    bare: policy.compensation === "never" && bandTop(ask) > 0,
    footHeight_m: footHeightOf(document),
    share: 1 / (1 + 1 / (ask.tapScaleFactor - 1)),
    bodies_m: new Float64Array(mostElements + 1),
  };
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

function closed(
  window: Sizing["window"],
  refused: readonly LostFamily[],
  families: readonly ResistorFamily[],
  found: WindowFound,
): Sizing {
  const lost = families.map(
    (family): LostFamily => ({
      family: family.id,
      familyName: family.name,
      reason: `The resistance window is closed. ${window.collision ?? ""}`.trim(),
      actual: window.least_ohm,
      limit: window.greatest_ohm,
      unit: "ohm",
    }),
  );
  return { window, candidates: [], lost: [...lost, ...refused], considered: 0, sheet: found.ask.j.sheet.data() };
}

import { bandTop } from "../checks/band.ts";
import type { DividerDocument } from "../job/document.ts";
import { ok, type Result } from "../quantities/result.ts";
import { alwaysCompensated, capacitorPeak } from "./compensation.ts";
import { footHeightOf } from "./geometry.ts";
import { countByFault, type Kind, kindOf, type Limits, mostElements, untrimmed } from "./kind.ts";
import { linesOf, type Picked, pick } from "./pick.ts";
import { type Pool, refusedFamily } from "./pool.ts";
import { isOpen, type WindowFound, windowOf } from "./resistanceWindow.ts";

/** What a search decided: the window, the families with their limits, and the builds to be listed. */
export interface Searched {
  readonly found: WindowFound;
  readonly limits: Limits;
  readonly kinds: readonly Kind[];
  readonly picked: Picked;
}

/** Window, limits and builds; no build where the window is closed. Refused where the brief cannot be searched with. */
export function search(document: DividerDocument, pool: Pool, top: number): Result<Searched> {
  const windowed = windowOf(document, pool);
  if (!windowed.ok) return windowed;
  const found = windowed.value;
  const limits = limitsOf(document, found, pool);
  const families = pool.resistors.filter((family) => refusedFamily(family) === null);
  const trimmed = families.map((family) => kindOf(family, limits, pool));
  if (!isOpen(found)) return ok({ found, limits, kinds: trimmed, picked: pick([], limits, top) });
  const first = pick(linesOf(trimmed, limits), limits, top);
  if (first.builds.length > 0) return ok({ found, limits, kinds: trimmed, picked: first });
  // Better a build whose trim falls short, and says so, than none.
  const kinds = trimmed.map((kind) => untrimmed(kind, limits));
  const picked = pick(linesOf(kinds, limits), limits, top);
  return ok({ found, limits, kinds, picked });
}

function limitsOf(document: DividerDocument, { ask, need, least, greatest }: WindowFound, pool: Pool): Limits {
  const { policy } = document.brief;
  const capacitor_V = capacitorPeak(pool, policy.voltageDerating);
  const always = alwaysCompensated(ask);
  return {
    ask,
    need,
    least_ohm: least?.resistance_ohm ?? 0,
    greatest_ohm: greatest?.resistance_ohm ?? Number.POSITIVE_INFINITY,
    length_m: policy.greatestLength_m ?? Number.POSITIVE_INFINITY,
    handOnly: policy.partsInHandOnly,
    capacitor_V: always && capacitor_V > 0 ? capacitor_V : Number.POSITIVE_INFINITY,
    bareAbove_V:
      always || bandTop(ask.j.document.brief) === 0
        ? Number.POSITIVE_INFINITY
        : policy.compensation === "never"
          ? 0
          : capacitor_V,
    faultCount: countByFault(ask),
    footHeight_m: footHeightOf(document),
    share: 1 / (1 + 1 / (ask.tapScaleFactor - 1)),
    bodies_m: new Float64Array(mostElements + 1),
  };
}

import { show } from "../checks/show.ts";
import type { LvBranch } from "../job/design.ts";
import type { Part, ResistorFamily, TrimmerFamily } from "../job/part.ts";
import type { Finding } from "../standards/finding.ts";
import type { Asking } from "./asking.ts";
import { found } from "./found.ts";
import { lvResistorFamilies, lvValues } from "./lvFamilies.ts";
import type { LvNeed } from "./lvSolution.ts";
import { seriesTrim } from "./lvTrim.ts";
import type { Pool } from "./pool.ts";

/** The LV arm's resistors as they can be bought, set so that the scale factor is exact for nominal parts. */
export interface LvResistors {
  readonly branches: readonly LvBranch[];
  readonly parts: readonly Part[];
  readonly findings: readonly Finding[];
}

interface Trimmed {
  readonly family: ResistorFamily;
  readonly trimmer: TrimmerFamily;
  readonly count: number;
  readonly branch_ohm: number;
  readonly fixed_ohm: number;
  readonly span_ohm: number;
  /** Rheostat at its setting. */
  readonly set_ohm: number;
}

/**
 * Two or three equal-ish branches in parallel from the tap to earth, never one: a single open raises the reading, not more.
 * One branch holds a rheostat in series, its end tied so that a lifted wiper leaves the whole track in. Every extreme of
 * string, fixed parts, instrument and rheostat is reached; among what reaches them the fewest different parts, then the
 * smallest track.
 */
export function lvResistors(ask: Asking, pool: Pool, hvArm_ohm: number, need: LvNeed): LvResistors {
  const counts = branchCounts(ask, hvArm_ohm, need.nominal_ohm);
  const handOnly = ask.j.document.brief.policy.partsInHandOnly;
  for (const fromHand of handOnly ? [true, false] : [false]) {
    for (const reach of [1, 0.75, 0.5, 0.25, 0]) {
      const chosen = bestOf(ask, pool, narrowed(need, reach), hvArm_ohm, counts, fromHand);
      if (chosen === null) continue;
      const findings = reach < 1 ? [shortReach(need, chosen)] : [];
      if (handOnly && !fromHand) findings.push(notInHand(need));
      return { branches: branchesOf(chosen), parts: [chosen.family, chosen.trimmer], findings };
    }
  }
  return { branches: [], parts: [], findings: [noParts(need)] };
}

const narrowed = (need: LvNeed, reach: number): LvNeed => ({
  nominal_ohm: need.nominal_ohm,
  least_ohm: need.nominal_ohm - reach * (need.nominal_ohm - need.least_ohm),
  greatest_ohm: need.nominal_ohm + reach * (need.greatest_ohm - need.nominal_ohm),
});

/** Two branches where one of them open still leaves the instrument within its greatest input, else three. */
export function branchCounts(ask: Asking, hvArm_ohm: number, lv_ohm: number): readonly number[] {
  const { instrument } = ask.j;
  const left = (count: number) => (count - 1) / count / lv_ohm + ask.leakage_S;
  const seen = (count: number) => {
    const G = left(count) + 1 / (ask.seriesProtector_ohm + instrument.resistance_ohm);
    const factor = (1 + hvArm_ohm * G) * (1 + ask.seriesProtector_ohm / instrument.resistance_ohm);
    return ask.working.greatest_Vpeak / factor;
  };
  return seen(2) <= instrument.greatestInput_Vpeak ? [2, 3] : [3, 2];
}

function bestOf(
  ask: Asking,
  pool: Pool,
  need: LvNeed,
  hvArm_ohm: number,
  counts: readonly number[],
  fromHand: boolean,
): Trimmed | null {
  const trimmers = pool.trimmers.filter((trimmer) => trimmer.quantity === "ohm");
  for (const count of counts) {
    for (const family of lvResistorFamilies(pool)) {
      if (!bears(ask, family, need, hvArm_ohm, count)) continue;
      const chosen = trimmed(valuesOf(ask, family, count, need, fromHand), { family, trimmers, count, need });
      if (chosen !== null) return chosen;
    }
  }
  return null;
}

/** The branches bear the voltage and dissipation of the tap at the greatest voltage. */
function bears(ask: Asking, family: ResistorFamily, need: LvNeed, hvArm_ohm: number, count: number): boolean {
  const { policy } = ask.j.document.brief;
  const share = 1 - hvArm_ohm / (hvArm_ohm * (1 + 1 / (ask.tapScaleFactor - 1)));
  const rms = ask.working.greatestRms_V * share;
  return (
    ask.working.greatest_Vpeak * share <= policy.voltageDerating * (family.limitingVoltage_V as number) &&
    (rms * rms) / (need.least_ohm * count) <= policy.powerDerating * family.ratedDissipation_W
  );
}

function valuesOf(ask: Asking, family: ResistorFamily, count: number, need: LvNeed, fromHand: boolean): number[] {
  const about = count * need.nominal_ohm;
  if (fromHand) {
    const inHand = (family.inHand ?? []).filter((each) => each.count >= count).map((each) => each.value);
    return inHand.filter((value) => value > about / 3 && value < about * 3).sort((a, b) => a - b);
  }
  const { series } = ask.j.document.brief.policy;
  return lvValues(family, series, about / 2, about * 2);
}

/** Branches stay within a factor of 1.7 of each other, so that an open one does what an equal one would. */
const mostUnequal = Math.log(1.7);
/** A lifted wiper leaves the whole track in; it may raise the LV arm by this much. */
const mostLifted = 0.1;

function trimmed(
  values: readonly number[],
  given: { family: ResistorFamily; trimmers: readonly TrimmerFamily[]; count: number; need: LvNeed },
): Trimmed | null {
  const { family, trimmers, count, need } = given;
  const t = family.tolerance;
  let best: Trimmed | null = null;
  for (const branch_ohm of values) {
    const total = 1 / (1 / need.nominal_ohm - (count - 1) / branch_ohm);
    if (!(total > 0)) continue;
    for (const fixed_ohm of values) {
      const span = seriesTrim(
        need,
        { ohm: fixed_ohm, tolerance: t },
        { ohm: branch_ohm, tolerance: t, count: count - 1 },
      );
      if (span === null || span.least_ohm < 0 || Math.abs(Math.log(total / branch_ohm)) > mostUnequal) continue;
      for (const trimmer of trimmers) {
        const span_ohm = smallestTrack(trimmer, span);
        if (span_ohm === null) continue;
        const chosen = { family, trimmer, count, branch_ohm, fixed_ohm, span_ohm, set_ohm: total - fixed_ohm };
        if (best === null || better(chosen, best)) best = chosen;
      }
    }
  }
  return best;
}

/** Smallest track sold that covers the span at both ends of its own tolerance, Ω. */
function smallestTrack(trimmer: TrimmerFamily, span: { least_ohm: number; greatest_ohm: number }): number | null {
  const covers = (track: number) =>
    track * (1 - trimmer.tolerance) >= span.greatest_ohm &&
    track * trimmer.leastShare * (1 + trimmer.tolerance) <= span.least_ohm;
  return [...trimmer.spans].sort((a, b) => a - b).find(covers) ?? null;
}

function better(a: Trimmed, b: Trimmed): boolean {
  const lifted = (each: Trimmed) => {
    const branch = each.fixed_ohm + each.set_ohm;
    const arm = 1 / (1 / branch + (each.count - 1) / each.branch_ohm);
    return arm * (1 / (each.fixed_ohm + each.span_ohm) + (each.count - 1) / each.branch_ohm) < 1 / (1 + mostLifted)
      ? 1
      : 0;
  };
  const different = (each: Trimmed) => (each.branch_ohm === each.fixed_ohm ? 1 : 2);
  const unequal = (each: Trimmed) => Math.abs(Math.log((each.fixed_ohm + each.set_ohm) / each.branch_ohm));
  return (
    (lifted(a) - lifted(b) ||
      different(a) - different(b) ||
      a.span_ohm - b.span_ohm ||
      unequal(a) - unequal(b) ||
      a.branch_ohm - b.branch_ohm) < 0
  );
}

function branchesOf(chosen: Trimmed): LvBranch[] {
  const { family, trimmer, count, span_ohm, set_ohm } = chosen;
  const least_ohm = span_ohm * trimmer.leastShare;
  const setting = (set_ohm - least_ohm) / (span_ohm - least_ohm);
  const name = (i: number) => `R2${"abc"[i]}`;
  const plain = Array.from({ length: count - 1 }, (_, i) => ({
    name: name(i),
    series: [{ part: family.id, resistance_ohm: chosen.branch_ohm }],
  }));
  const rheostat = { least_ohm, greatest_ohm: span_ohm, setting };
  const adjusted = {
    name: name(count - 1),
    series: [
      { part: family.id, resistance_ohm: chosen.fixed_ohm },
      { part: trimmer.id, rheostat },
    ],
  };
  return [...plain, adjusted];
}

const asked = (need: LvNeed) => `${show(need.least_ohm, "ohm")} to ${show(need.greatest_ohm, "ohm")}`;

const shortReach = (need: LvNeed, chosen: Trimmed): Finding =>
  found("lvArm.trim", "stop", "reach of the LV trim", {
    unit: "ohm",
    reason:
      `The LV arm must reach ${asked(need)} over all tolerances; no rheostat sold does in series with ` +
      `${show(chosen.fixed_ohm, "ohm")}. Take a string of closer tolerance, or choose the fixed resistors after measuring the string.`,
  });

const notInHand = (need: LvNeed): Finding =>
  found("lvArm.notInHand", "caution", "LV arm from parts in hand", {
    unit: "ohm",
    reason: `No parts in hand make ${asked(need)}; the LV arm shown is to be bought.`,
  });

const noParts = (need: LvNeed): Finding =>
  found("lvArm.parts", "stop", "parts for the LV arm", {
    unit: "ohm",
    reason: `No resistors and rheostat make ${show(need.nominal_ohm, "ohm")} in two or three branches within their limits.`,
  });

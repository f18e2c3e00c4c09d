import { show } from "../checks/show.ts";
import type { LvBranch } from "../job/design.ts";
import type { CapacitorFamily, Part, TrimmerFamily } from "../job/part.ts";
import { dielectricFits } from "../parts/capacitorFamilies.ts";
import type { Finding } from "../standards/finding.ts";
import { preferredBetween } from "../standards/preferred.ts";
import type { Asking } from "./asking.ts";
import { found } from "./found.ts";
import { coarser } from "./lvFamilies.ts";
import { fittedLinks, linkSet } from "./lvLinks.ts";
import type { Pool } from "./pool.ts";

/** LV capacitance to be fitted: nominal, and at the ends of string, strays, cable and instrument, F. */
export interface LvCapacitanceNeed {
  readonly nominal_F: number;
  readonly least_F: number;
  readonly greatest_F: number;
  /** Greatest deviation over the band that is left, relative. */
  readonly deviation: number;
  /** Dielectric of the string's capacitors: the same in both arms cancels temperature. */
  readonly dielectric: string;
  /** Two or three fixed capacitors in parallel. */
  readonly counts: readonly number[];
}

export interface LvCapacitors {
  readonly branches: readonly LvBranch[];
  readonly parts: readonly Part[];
  readonly findings: readonly Finding[];
}

interface Chosen {
  readonly family: CapacitorFamily;
  readonly trimmer: TrimmerFamily;
  readonly span_F: number;
  readonly fixed_F: readonly number[];
  readonly links_F: readonly number[];
}

/** Fixed capacitors, links and a trimmer that reach every extreme without a hole and stand at the nominal value. */
export function lvCapacitors(ask: Asking, pool: Pool, need: LvCapacitanceNeed): LvCapacitors {
  const tap_V = ask.working.greatest_Vpeak / ask.tapScaleFactor;
  const { policy } = ask.j.document.brief;
  const bears = (rated_V: number) => rated_V * policy.voltageDerating >= tap_V;
  const families = lvCapacitorFamilies(pool, need.dielectric).filter((family) => bears(family.ratedVoltage_V));
  const trimmers = pool.trimmers.filter((each) => each.quantity === "F" && bears(each.ratedVoltage_V));
  for (const count of need.counts) {
    for (const family of families) {
      const values = preferredBetween(coarser(policy.series, family.series), family.least_F, family.greatest_F);
      const chosen = choose(values, need, count, family, trimmers);
      if (chosen !== null) return { ...built(chosen, need), findings: [] };
    }
  }
  return { branches: [], parts: [], findings: [noReach(need, tap_V, policy.voltageDerating, ask)] };
}

function lvCapacitorFamilies(pool: Pool, dielectric: string): CapacitorFamily[] {
  return pool.capacitors
    .filter((family) => dielectricFits(family, "lvArm") && family.dielectricClass !== "air")
    .sort(
      (a, b) =>
        Number(b.dielectric === dielectric) - Number(a.dielectric === dielectric) ||
        a.tolerance - b.tolerance ||
        a.leadInductance_H - b.leadInductance_H ||
        (a.id < b.id ? -1 : 1),
    );
}

/** Fewest links, then fewest different fixed values, then the wider trimmer is not wider than need be. */
function choose(
  values: readonly number[],
  need: LvCapacitanceNeed,
  count: number,
  family: CapacitorFamily,
  trimmers: readonly TrimmerFamily[],
): Chosen | null {
  const t = family.tolerance;
  let best: Chosen | null = null;
  for (const trimmer of trimmers) {
    for (const span_F of trimmer.spans) {
      const low = span_F * trimmer.leastShare * (1 + trimmer.tolerance);
      const high = span_F * (1 - trimmer.tolerance);
      const room = (need.least_F - low) / (1 + t);
      for (const fixed_F of fixedSets(values, count, room)) {
        const sum = fixed_F.reduce((total, each) => total + each, 0);
        const links_F = linkSet(values, t, high - low, need.greatest_F - sum * (1 - t) - high);
        if (links_F === null) continue;
        const chosen = { family, trimmer, span_F, fixed_F, links_F };
        if (best === null || better(chosen, best)) best = chosen;
      }
    }
  }
  return best;
}

function better(a: Chosen, b: Chosen): boolean {
  const values = (each: Chosen) => new Set([...each.fixed_F, ...each.links_F]).size;
  return (a.links_F.length - b.links_F.length || values(a) - values(b) || a.span_F - b.span_F) < 0;
}

/** Equal values, or all equal but the last smaller by up to a half, that fill the room best. None where the room is too small. */
function fixedSets(values: readonly number[], count: number, room: number): number[][] {
  const equal = values.filter((value) => value * count <= room).at(-1);
  if (equal === undefined) return [[]];
  const mixed = values
    .filter((value) => value > equal / 2 && value * (count - 1) < room)
    .flatMap((value) => {
      const last = values.filter((other) => other >= value / 2 && other + value * (count - 1) <= room).at(-1);
      return last === undefined ? [] : [[...new Array<number>(count - 1).fill(value), last]];
    });
  return [new Array<number>(count).fill(equal), ...mixed];
}

function built(chosen: Chosen, need: LvCapacitanceNeed): Omit<LvCapacitors, "findings"> {
  const { family, trimmer, span_F, fixed_F, links_F } = chosen;
  const least_F = span_F * trimmer.leastShare;
  const sum = fixed_F.reduce((total, each) => total + each, 0);
  const { fitted, rest_F } = fittedLinks(links_F, need.nominal_F - sum - least_F);
  const setting = rest_F / (span_F - least_F);
  const branches: LvBranch[] = [
    ...fixed_F.map((capacitance_F, i) => ({ name: `C2${"abc"[i]}`, part: family.id, capacitance_F })),
    ...links_F.map((capacitance_F, i) => ({
      name: `K${i + 1}`,
      part: family.id,
      link: true as const,
      capacitance_F,
      fitted: fitted[i] as boolean,
    })),
    { name: "T1", part: trimmer.id, trimmer: { least_F, greatest_F: span_F, setting } },
  ];
  return { branches, parts: [family, trimmer] };
}

function noReach(need: LvCapacitanceNeed, tap_V: number, derating: number, ask: Asking): Finding {
  const { scaleFactor } = ask.j.document.brief;
  return found("compensation.reach", "stop", "LV capacitors", {
    actual: need.nominal_F,
    unit: "F",
    reason:
      `No fixed capacitors, links and trimmer sold for ${show(tap_V / derating, "V")} reach ${show(need.least_F, "F")} to ` +
      `${show(need.greatest_F, "F")} without a hole. A larger scale factor lowers the voltage of the tap; C1 moves the capacitance.`,
    cure: {
      label: "ten times the scale factor",
      edits: [{ pointer: "/brief/scaleFactor", value: scaleFactor * 10 }],
      sizeAgain: true,
    },
  });
}

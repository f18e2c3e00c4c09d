import { stressFormulas } from "../checks/stressFormulas.ts";
import type { ResistorFamily } from "../job/part.ts";
import { metre } from "../quantities/quantity.ts";
import { verticalCylinderCapacitance } from "../standards/strayCapacitance.ts";
import type { Asking } from "./asking.ts";
import { bareReach } from "./bandLimit.ts";
import type { InsulationNeed } from "./columnNeed.ts";
import { envelope } from "./geometry.ts";
import { trimReach } from "./lvReach.ts";
import { type Offer, offers, type Pool } from "./pool.ts";

/** Most elements in series that are looked at. */
export const mostElements = 5000;
/** Most strings in parallel that are looked at. */
export const mostStrings = 4;

/** What all families are searched by. */
export interface Limits {
  readonly ask: Asking;
  readonly need: InsulationNeed;
  /** The window, Ω; 0 and Infinity where no bound applies. */
  readonly least_ohm: number;
  readonly greatest_ohm: number;
  /** Infinity: no bound. */
  readonly length_m: number;
  readonly handOnly: boolean;
  /** Element peak above which a string goes without capacitors and its own stray bounds its R1; Infinity: never, 0: always. */
  readonly bareAbove_V: number;
  /** Least elements so that one shorted leaves the instrument within its greatest input. */
  readonly faultCount: number;
  readonly footHeight_m: number;
  /** Voltage of one of n elements per volt at the electrode, times n: R1 / (R1 + R2p). */
  readonly share: number;
  /** Greatest peak across one element that a capacitor may see where every string gets capacitors; else Infinity. */
  readonly capacitor_V: number;
  /** Body length needed by count, filled as it is asked for; 0: not yet. */
  readonly bodies_m: Float64Array;
}

/** A resistor family with its limits derated for this brief: what the search reads in its inner loop. */
export interface Kind {
  readonly family: ResistorFamily;
  readonly offers: readonly Offer[];
  /** Derated: dc or rms, peak, dissipation at the hottest ambient. */
  readonly rms_V: number;
  readonly peak_V: number;
  readonly dissipation_W: number;
  readonly pitch_m: number;
  /** Least elements in series by voltage and by the path along one body; over 5000 where none suffices. */
  readonly leastCount: number;
  readonly leastBy: "voltage" | "creepage" | "capacitor" | "fault";
  /** Greatest R1, Ω: the window's, or where a trim that can be bought no longer makes up for the family's tolerance. */
  readonly greatest_ohm: number;
  readonly greatestBy: "window" | "trim";
}

/** A family with what one of its elements may bear in this brief, and what a string of it can reach. */
export function kindOf(family: ResistorFamily, limits: Limits, pool: Pool): Kind {
  const { policy, surroundings, waveform } = limits.ask.j.document.brief;
  const { working } = limits.ask;
  const rms_V = policy.voltageDerating * (family.limitingVoltage_V as number);
  const peak_V = rms_V * (waveform.kind === "sine" ? Math.SQRT2 : 1);
  const allowed = stressFormulas.dissipationRating.compute({
    P: family.ratedDissipation_W,
    Tr: family.deratingFrom_degC,
    Tz: family.zeroDissipation_degC,
    T: surroundings.ambient_degC + surroundings.ambientSpan_K,
  }) as number;
  const voltage = Math.max(
    1,
    up((working.greatestRms_V * limits.share) / rms_V),
    up((working.greatest_Vpeak * limits.share) / peak_V),
  );
  const least = {
    voltage,
    creepage: countByBody(family.bodyLength_m, limits),
    capacitor: up((working.greatest_Vpeak * limits.share) / limits.capacitor_V),
    fault: limits.faultCount,
  };
  const leastCount = Math.max(...Object.values(least));
  const trim = trimReach(limits.ask, pool, family.tolerance);
  return {
    family,
    offers: offers(family, limits.handOnly),
    rms_V,
    peak_V,
    dissipation_W: policy.powerDerating * allowed,
    pitch_m: family.bodyLength_m + family.leadSpace_m,
    leastCount,
    leastBy: (Object.keys(least) as (keyof typeof least)[]).find((key) => least[key] === leastCount)!,
    greatest_ohm: Math.min(limits.greatest_ohm, trim),
    greatestBy: trim < limits.greatest_ohm ? "trim" : "window",
  };
}

/** The same without regard to what a rheostat reaches. */
export const untrimmed = (kind: Kind, limits: Limits): Kind => ({
  ...kind,
  greatest_ohm: limits.greatest_ohm,
  greatestBy: "window",
});

const up = (x: number): number => Math.ceil(x * (1 - 1e-12));

/**
 * Least elements so that one of them shorted leaves the instrument within its greatest input: the scale factor then falls to
 * 1 + (F − 1)(n − 1)/n. 1 where the voltage itself is within it; also where the reading is above it anyway, which no count cures.
 */
export function countByFault({ j, working, tapScaleFactor, seriesProtector_ohm }: Asking): number {
  const atTap = j.instrument.greatestInput_Vpeak * (1 + seriesProtector_ohm / j.instrument.resistance_ohm);
  const share = (working.greatest_Vpeak / atTap - 1) / (tapScaleFactor - 1);
  return share <= 0 || share >= 1 ? 1 : up(1 / (1 - share));
}

/** Body length that one of n equal elements needs, m; the same for every family, so it is looked up once. */
export function bodyNeeded(n: number, { ask, need, share, bodies_m }: Limits): number {
  const known = bodies_m[n] as number;
  if (known > 0) return known;
  const each = share / n;
  const needed = need.body(ask.working.creepage_V * each, ask.working.greatest_Vpeak * each);
  bodies_m[n] = needed;
  return needed;
}

/** Least n for which the body is long enough: the requirement never rises with n, so halving finds it. */
function countByBody(body_m: number, limits: Limits): number {
  const fits = (n: number) => bodyNeeded(n, limits) <= body_m * (1 + 1e-12);
  if (!fits(mostElements)) return mostElements + 1;
  let low = 0;
  let high = mostElements;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (fits(middle)) high = middle;
    else low = middle;
  }
  return high;
}

/** Least length of a column of this family, m: what insulation demands, and never shorter than it is wide. */
export const leastLength = (kind: Kind, strings: number, limits: Limits): number =>
  Math.max(limits.need.column_m, envelope(kind.family.bodyDiameter_m, strings));

/** Greatest R1 of a bare string of this length by its own stray and by what lies beside the LV arm, Ω. */
export function bandBound(kind: Kind, length_m: number, strings: number, limits: Limits): number {
  const diameter_m = envelope(kind.family.bodyDiameter_m, strings);
  const stray = verticalCylinderCapacitance(metre(length_m), metre(diameter_m), metre(limits.footHeight_m));
  return bareReach(limits.ask, stray);
}

import { bandTop } from "../checks/band.ts";
import { show } from "../checks/show.ts";
import type { CapacitorFamily, DielectricClass } from "../job/part.ts";
import { dielectricFits } from "../parts/capacitorFamilies.ts";
import { metre } from "../quantities/quantity.ts";
import type { Finding } from "../standards/finding.ts";
import { preferredBetween } from "../standards/preferred.ts";
import { verticalCylinderCapacitance } from "../standards/strayCapacitance.ts";
import type { Asking } from "./asking.ts";
import { bareElement, bareReach } from "./bandLimit.ts";
import { bodyRule, compensationFormulas, strayRule } from "./compensationFormulas.ts";
import { found } from "./found.ts";
import { envelope, footHeightOf } from "./geometry.ts";
import type { Limits } from "./kind.ts";
import type { Build } from "./line.ts";
import { coarser } from "./lvFamilies.ts";
import type { Pool } from "./pool.ts";
import { acceptedSag } from "./window.ts";

/** The capacitor across each element and what it does to the column. */
export interface ElementCapacitor {
  readonly family: CapacitorFamily;
  readonly capacitance_F: number;
  readonly length_m: number;
  readonly diameter_m: number;
  readonly stray_F: number;
  readonly findings: readonly Finding[];
}

/** Ends of a capacitor beside its resistor along the column, m. */
const ends_m = 0.004;

/** Pitch with a capacitor beside each resistor, m. */
export const pitchWith = (pitch_m: number, body_m: number): number => Math.max(pitch_m, body_m + ends_m);

/** Stray capacitance of a column to earth by the formula for a vertical cylinder, F. */
export const columnStray = (limits: Limits, length_m: number, diameter_m: number): number =>
  verticalCylinderCapacitance(metre(length_m), metre(diameter_m), metre(footHeightOf(limits.ask.j.document)));

/** Whether the waveform alone asks for capacitors, whatever the string: pulses, squares and recorded waves, unless forbidden. */
export function alwaysCompensated(ask: Asking): boolean {
  const { policy, waveform } = ask.j.document.brief;
  if (policy.compensation !== "whenNeeded") return policy.compensation === "always";
  return waveform.kind !== "dc" && waveform.kind !== "sine";
}

/** Whether this build gets capacitors: as above, or a bare string would fall by more than its share at the band's top. */
export function compensated(build: Build, limits: Limits): boolean {
  if (alwaysCompensated(limits.ask)) return true;
  if (limits.ask.j.document.brief.policy.compensation === "never" || bandTop(limits.ask.j.document.brief) === 0)
    return false;
  const diameter = envelope(build.kind.family.bodyDiameter_m, build.strings);
  const Ce = columnStray(limits, build.length_m, diameter);
  const each_ohm = bareElement(limits.ask, build.kind.family.selfCapacitance_F);
  return build.hvArm_ohm > bareReach(limits.ask, Ce) * (1 + 1e-9) || build.resistance_ohm > each_ohm * (1 + 1e-9);
}

const classes: readonly DielectricClass[] = ["class1", "mica", "film", "air"];

/** Families that may stand across an element at this peak, best dielectric first, then the lowest rating that does, the shortest. */
export function elementFamilies(pool: Pool, derating: number, peak_V: number): CapacitorFamily[] {
  return pool.capacitors
    .filter((family) => dielectricFits(family, "hvArm") && family.ratedVoltage_V * derating >= peak_V * (1 - 1e-12))
    .sort(
      (a, b) =>
        classes.indexOf(a.dielectricClass) - classes.indexOf(b.dielectricClass) ||
        a.ratedVoltage_V - b.ratedVoltage_V ||
        a.bodyLength_m - b.bodyLength_m ||
        (a.id < b.id ? -1 : 1),
    );
}

/** Greatest peak that a capacitor sold may see across one element, derated, V; home-made plates only where nothing else is. */
export function capacitorPeak(pool: Pool, derating: number): number {
  const fitting = elementFamilies(pool, derating, 0);
  const bought = fitting.filter((family) => family.dielectricClass !== "air");
  return Math.max(0, ...(bought.length > 0 ? bought : fitting).map((family) => family.ratedVoltage_V * derating));
}

/** Picks the capacitor across each element: the smallest preferred value that meets both rules, within what the source bears. */
export function elementCapacitor(build: Build, limits: Limits, pool: Pool): ElementCapacitor | Finding {
  const { policy } = limits.ask.j.document.brief;
  const peak_V = (limits.ask.working.greatest_Vpeak * limits.share) / build.elements;
  const families = elementFamilies(pool, policy.voltageDerating, peak_V);
  if (families.length === 0) return noCapacitor(peak_V, policy.voltageDerating, pool);
  const choices = families.map((family) => fitted(build, limits, family));
  return choices.find((choice) => choice.findings.length === 0) ?? choices.reduce(nearer);
}

/** Where no choice meets both rules: the one that stays within what the source bears, then the larger; else the smaller. */
function nearer(a: Choice, b: Choice): Choice {
  const fits = (choice: Choice) => choice.capacitance_F <= choice.target_F * (1 + 1e-9);
  if (fits(a) !== fits(b)) return fits(a) ? a : b;
  return a.capacitance_F > b.capacitance_F === fits(a) ? a : b;
}

interface Choice extends ElementCapacitor {
  readonly target_F: number;
}

/** The family's value for this build: the column grows with the capacitor's body, so its stray is taken from there. */
function fitted(build: Build, limits: Limits, family: CapacitorFamily): Choice {
  const { kind, strings, elements } = build;
  const pitch = pitchWith(kind.pitch_m, family.bodyLength_m);
  const diameter_m = envelope(kind.family.bodyDiameter_m + family.bodyDiameter_m, strings);
  const length_m = Math.max(elements * pitch, limits.need.column_m, diameter_m);
  const stray_F = columnStray(limits, length_m, diameter_m);
  const Cb = kind.family.selfCapacitance_F;
  const shape = { n: elements, p: strings, Cb };
  const wanted = compensationFormulas.elementCapacitor.compute({
    ks: strayRule,
    Ce: stray_F,
    kb: bodyRule,
    ...shape,
  }) as number;
  const most = greatestBySource(limits, shape);
  const target = Math.min(wanted, Math.max(most, bodyRule * Cb));
  const series = coarser(limits.ask.j.document.brief.policy.series, family.series);
  const values = preferredBetween(series, family.least_F, family.greatest_F);
  const below = values.filter((value) => value <= target).at(-1) ?? values[0];
  const above = values.find((value) => value >= target) ?? values.at(-1);
  const capacitance_F = (target < wanted ? below : above) ?? family.greatest_F;
  const C1 = (strings * (capacitance_F + Cb)) / elements;
  const findings = capacitance_F < wanted * (1 - 1e-9) ? [smallCapacitor(C1, stray_F, most < wanted)] : [];
  return { family, capacitance_F, length_m, diameter_m, stray_F, findings, target_F: target };
}

function greatestBySource({ ask }: Limits, shape: { n: number; p: number; Cb: number }): number {
  const Cs = ask.j.document.brief.source.capacitance_F;
  const e = acceptedSag(ask);
  if (!(Cs > 0) || !(e > 0) || e >= 1) return Number.POSITIVE_INFINITY;
  return compensationFormulas.sourceCapacitor.compute({ Cs, e, ...shape }) as number;
}

const noCapacitor = (peak_V: number, derating: number, pool: Pool): Finding =>
  found("compensation.capacitor", "stop", "capacitor across each element", {
    actual: peak_V,
    limit: capacitorPeak(pool, derating),
    unit: "V",
    sense: "atMost",
    reason:
      `Each element sees ${show(peak_V, "V")}; no class 1, film or mica capacitor sold may be used above ` +
      `${show(capacitorPeak(pool, derating), "V")} with the derating wanted. Take more elements.`,
  });

const smallCapacitor = (C1: number, stray_F: number, bySource: boolean): Finding =>
  found("compensation.stray", "caution", "HV arm capacitance against the column's stray", {
    actual: C1,
    limit: strayRule * stray_F,
    unit: "F",
    sense: "atLeast",
    reason:
      `C1 is ${show(C1, "F")}, ${Number((C1 / stray_F).toPrecision(2))} times the column's stray of ${show(stray_F, "F")}; five times is wanted` +
      `${bySource ? ", but the source's own capacitance bears no more" : ", but no larger capacitor is sold"}. ` +
      "The match rests on the stray: solve the field, or measure the divider as built.",
  });

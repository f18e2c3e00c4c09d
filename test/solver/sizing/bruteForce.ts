import type { DividerDocument } from "../../../src/solver/job/document.ts";
import type { ResistorFamily } from "../../../src/solver/job/part.ts";
import { metre, volt } from "../../../src/solver/quantities/quantity.ts";
import { airDensityAtAltitude } from "../../../src/solver/standards/airDensity.ts";
import { altitudeFactor, steadyClearance } from "../../../src/solver/standards/clearance.ts";
import { creepage } from "../../../src/solver/standards/creepage.ts";
import { preferredBetween } from "../../../src/solver/standards/preferred.ts";
import { verticalCylinderCapacitance } from "../../../src/solver/standards/strayCapacitance.ts";

/** One combination with its figures, all to be small but the margin. */
export interface Plain {
  readonly key: string;
  readonly resistance_ohm: number;
  readonly figures: readonly number[];
}

/** Voltages that the brief leads to: working peak, greatest peak, greatest rms, creepage basis. */
export interface Voltages {
  readonly peak: number;
  readonly greatest: number;
  readonly greatestRms: number;
  readonly creepage: number;
}

/**
 * Every family, value, 1 to 4 strings and 1 to 5000 elements, one by one, each limit as it is stated in words: written apart
 * from the search, without bounds, order or shortcuts. A window is taken as given; no capacitor is to be had.
 */
export function everyBuild(
  document: DividerDocument,
  families: readonly ResistorFamily[],
  window: readonly [number, number],
  V: Voltages,
): Plain[] {
  const { brief } = document;
  const { policy, source, surroundings } = brief;
  const fraction = 1 / (1 + 1 / (brief.scaleFactor - 1));
  const column = columnNeed(document, V);
  const all: Plain[] = [];
  for (const each of families) {
    const d = each.bodyDiameter_m;
    const wide = [0, d, d * 2, d * (1 + 2 / Math.sqrt(3)), d * (1 + Math.SQRT2)];
    const T = surroundings.ambient_degC + surroundings.ambientSpan_K;
    const hot =
      T > each.deratingFrom_degC
        ? (each.zeroDissipation_degC - T) / (each.zeroDissipation_degC - each.deratingFrom_degC)
        : 1;
    const P = policy.powerDerating * each.ratedDissipation_W * hot;
    const peakLimit =
      policy.voltageDerating * each.limitingVoltage_V! * (brief.waveform.kind === "sine" ? Math.SQRT2 : 1);
    const rmsLimit = policy.voltageDerating * each.limitingVoltage_V!;
    for (const R of preferredBetween(each.series, each.least_ohm, each.greatest_ohm)) {
      for (let p = 1; p <= 4; p++) {
        for (let n = 1; n <= 5000; n++) {
          const R1 = (n * R) / p;
          if (R1 < window[0] * (1 - 1e-12)) continue;
          if (R1 > window[1] * (1 + 1e-12)) break;
          const rms = (V.greatestRms * fraction) / n;
          const peak = (V.greatest * fraction) / n;
          const heat = (rms * rms) / R;
          const body = bodyNeed(document, (V.creepage * fraction) / n, peak);
          const length = Math.max(n * (each.bodyLength_m + each.leadSpace_m), column, wide[p]!);
          if (rms > rmsLimit || peak > peakLimit || heat > P || body > each.bodyLength_m) continue;
          if (policy.greatestLength_m !== null && length > policy.greatestLength_m) continue;
          if (V.greatest / (1 + ((brief.scaleFactor - 1) * (n - 1)) / n) > document.instruments[0]!.greatestInput_Vpeak)
            continue;
          if (brief.waveform.kind === "sine") {
            const stray = verticalCylinderCapacitance(metre(length), metre(wide[p]!), metre(0.12));
            const x = 2 * Math.PI * brief.waveform.frequency_Hz! * R1 * stray;
            const own = 2 * Math.PI * brief.waveform.frequency_Hz! * R * each.selfCapacitance_F;
            const pole = 2 * Math.PI * brief.waveform.frequency_Hz! * (R1 / (brief.scaleFactor - 1)) * 150e-12;
            if (
              Math.max((x * x) / 180, (pole * pole) / 2, (own * own) / 2) >
              Math.min(brief.wantedUncertainty / 5, 1.5 ** 2 / 180)
            )
              continue;
          }
          const t = each.tolerance;
          const drift = surroundings.ambientSpan_K * each.temperatureCoefficient_per_K;
          const effect = (each.voltageCoefficient_per_V * V.peak * fraction) / n;
          const u2 = (t * t) / (3 * n * p) + (t / 3) ** 2 + (drift ** 2 + effect ** 2) / 3;
          const sag = source.resistance_ohm / (source.resistance_ohm + R1 / fraction);
          const margin = Math.min(1 - rms / rmsLimit, 1 - peak / peakLimit, 1 - heat / P, 1 - body / each.bodyLength_m);
          all.push({
            key: `${each.id} ${n} ${p}`,
            resistance_ohm: R,
            figures: [n * p, length, 2 * Math.sqrt(u2), sag, -margin],
          });
        }
      }
    }
  }
  return all;
}

function bodyNeed({ brief }: DividerDocument, steady: number, peak: number): number {
  const { altitude_m, pollutionDegree, materialGroup } = brief.surroundings;
  const surface = creepage(volt(steady), pollutionDegree, materialGroup);
  const gap = steadyClearance(volt(peak), "A");
  const factor = altitudeFactor(metre(altitude_m));
  const open = peak / (3e5 * airDensityAtAltitude(metre(altitude_m)));
  return Math.max(surface.ok ? surface.value : open, gap.ok && factor.ok ? gap.value * factor.value : open);
}

function columnNeed(document: DividerDocument, V: Voltages): number {
  const open = V.greatest / (3e5 * airDensityAtAltitude(metre(document.brief.surroundings.altitude_m)));
  return Math.max(bodyNeed(document, V.creepage, V.greatest), open);
}

/** Equal to about 1 part in 1e12 counts as equal, so that the order of arithmetic decides nothing. */
const same = (a: number, b: number) => Math.abs(a - b) <= 1e-12 * Math.max(Math.abs(a), Math.abs(b));

/** What nothing else is no worse than in all figures and better in one. Quadratic on purpose. */
export function frontOf(all: readonly Plain[]): Plain[] {
  return all.filter((b) => {
    return !all.some((a) => {
      let better = false;
      for (let k = 0; k < 5; k++) {
        const x = a.figures[k]!;
        const y = b.figures[k]!;
        if (same(x, y)) continue;
        if (x > y) return false;
        better = true;
      }
      return better;
    });
  });
}

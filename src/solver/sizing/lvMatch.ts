import { judging } from "../checks/judging.ts";
import { protectorCapacitance } from "../checks/lvArm.ts";
import { networkOf } from "../checks/networkOf.ts";
import { scaleFactor } from "../checks/scaleFactor.ts";
import { show } from "../checks/show.ts";
import { stringCapacitance } from "../checks/stringCapacitance.ts";
import type { DividerDocument } from "../job/document.ts";
import { lvCapacitance } from "../network/lvCapacitance.ts";
import type { Cure, Finding } from "../standards/finding.ts";
import { found } from "./found.ts";
import type { LvCapacitanceNeed } from "./lvCapacitors.ts";

/** Half-width of a cable's capacitance, relative, and of the strays by the closed formula. */
export const cableSpread = 0.05;
export const strayDoubt = 0.3;

/** What the string's capacitors are to the match. */
export interface StringMatched {
  readonly document: DividerDocument;
  readonly at: number;
  readonly band_Hz: readonly [number, number];
  readonly capacitorTolerance: number;
  readonly dielectric: string;
  readonly stray_F: number;
  readonly counts: readonly number[];
}

/** LV capacitance to be fitted, on the whole network with strays, cable and instrument; or why there is none. */
export function lvCapacitanceNeed(given: StringMatched): LvCapacitanceNeed | Finding {
  const j = judging(given.document);
  scaleFactor(j);
  const string = stringCapacitance(j);
  const match = lvCapacitance(networkOf(j, string), given.band_Hz);
  const nominal_F = match.flattest_F ?? match.highFrequency_F;
  const { instrument } = j;
  const cable_F = instrument.cable.length_m * instrument.cable.capacitance_F_per_m;
  const beside_F =
    cable_F + instrument.capacitance_F + protectorCapacitance(j, "divider") + protectorCapacitance(j, "instrument");
  const transfer_F = string.twoPort.transfer_F;
  if (nominal_F === null || nominal_F <= 0) {
    return noMatch(given, transfer_F, beside_F, j.sheet.number("hvArm.capacitance_F") ?? 0);
  }
  const share = given.capacitorTolerance + (strayDoubt * given.stray_F) / (6 * transfer_F);
  const whole_F = nominal_F + beside_F;
  const beside = cable_F * cableSpread + instrument.capacitanceSpread_F;
  return {
    nominal_F,
    least_F: nominal_F - whole_F * share - beside,
    greatest_F: nominal_F + whole_F * share + beside,
    deviation: 10 ** ((match.flattest_dB ?? 0) / 20) - 1,
    dielectric: given.dielectric,
    counts: given.counts,
  };
}

/** Cable and instrument alone are already more than the match asks for: shorten the cable, or raise C1. */
function noMatch(given: StringMatched, transfer_F: number, beside_F: number, string_F: number): Finding {
  const { document, at } = given;
  const { scaleFactor: F } = document.brief;
  const asked = transfer_F * (F - 1);
  const instrument = document.instruments[at]!;
  const metres = (beside_F - asked) / instrument.cable.capacitance_F_per_m;
  // A tenth shorter than must be, to the decimetre, so that something is left to be fitted.
  const length_m = Math.floor((instrument.cable.length_m - metres) * 9) / 10;
  const canShorten = metres > 0 && length_m > 0;
  const raised = (string_F * beside_F * 1.25) / Math.max(asked, Number.MIN_VALUE);
  const shorten = `shorten the cable by ${show(instrument.cable.length_m - length_m, "m")}`;
  const ways = [...(canShorten ? [shorten] : []), `raise C1 to ${show(raised, "F")}`];
  const cure: Cure | null = canShorten
    ? {
        label: `shorten the cable to ${show(length_m, "m")}`,
        edits: [{ pointer: `/instruments/${at}/cable/length_m`, value: length_m }],
        sizeAgain: true,
      }
    : null;
  return found("compensation.lvCapacitance", "stop", "LV capacitance", {
    actual: beside_F,
    limit: asked,
    unit: "F",
    sense: "atMost",
    reason:
      `Cable and instrument already have ${show(beside_F, "F")}; the match asks for ${show(asked, "F")} in all, so nothing is left to be fitted: ` +
      `${ways.join(" or ")}.`,
    cure,
  });
}

import { bandTop, wantedBand } from "../checks/band.ts";
import { instrumentRows } from "../checks/instruments.ts";
import type { Judging } from "../checks/judging.ts";
import { networkOf } from "../checks/networkOf.ts";
import { stringCapacitance } from "../checks/stringCapacitance.ts";
import { lumpedCable } from "../network/lumpedCable.ts";
import { lvCapacitance } from "../network/lvCapacitance.ts";
import { stepFigures } from "../network/stepFigures.ts";
import { bandwidth } from "../network/sweep.ts";
import { type TimeResponse, timeResponse } from "../network/timeResponse.ts";

/** One instrument on this LV arm as it is fitted: what it would want, and what it gets. */
export interface InstrumentSpeed {
  readonly id: string;
  readonly name: string;
  readonly principal: boolean;
  readonly scaleFactor: number;
  /** Capacitance to be fitted in the LV arm for this instrument with its cable, by the match of the design; null: none would do. */
  readonly lvWanted_F: number | null;
  readonly lvFitted_F: number;
  /** Relative error at the instant of an edge; null behind an inductance. */
  readonly edgeError: number | null;
  /** −3 dB of the divider with this cable and instrument; null: none. */
  readonly bandwidth_Hz: number | null;
  readonly riseTime_s: number | null;
  readonly settlingTime_s: number | null;
  /** The instrument's own −3 dB; null: dc only. */
  readonly ownBandwidth_Hz: number | null;
  /** Rise time of the brief's edge as it is seen: the squares of edge, divider and instrument added; null for dc. */
  readonly seenRise_s: number | null;
}

/** Every instrument of the document with its cable on the LV arm as it is fitted. Needs the figures of the scale factor on the sheet. */
export function instrumentSpeeds(j: Judging): InstrumentSpeed[] {
  const string = stringCapacitance(j);
  const band = wantedBand(j.document.brief);
  const rows = instrumentRows(j);
  return j.document.instruments.map((instrument, i) => {
    const network = networkOf(j, string, instrument);
    const calm = lumpedCable(network);
    const g = timeResponse(calm) as TimeResponse;
    const figures = stepFigures(calm, "electrode", g);
    const match = lvCapacitance(calm, band);
    const { capacitanceBy } = j.design.lvArm;
    const wanted =
      capacitanceBy === "flattest"
        ? match.flattest_F
        : capacitanceBy === "responseTime"
          ? match.responseTime_F
          : match.highFrequency_F;
    const riseTime_s = figures?.riseTime_s ?? null;
    return {
      id: instrument.id,
      name: instrument.name,
      principal: instrument.id === j.instrument.id,
      scaleFactor: rows[i]!.scaleFactor,
      lvWanted_F: wanted,
      lvFitted_F: network.lv.capacitance_F,
      edgeError: network.lv.inductance_H > 0 ? null : g.initial - 1,
      bandwidth_Hz: bandwidth(network),
      riseTime_s,
      settlingTime_s: figures?.settlingTime_s["1%"] ?? null,
      ownBandwidth_Hz: instrument.bandwidth_Hz,
      seenRise_s: seenRise(j, riseTime_s, instrument.bandwidth_Hz),
    };
  });
}

/** t² = t_edge² + t_divider² + t_instrument², the instrument by 0.35 over its bandwidth. */
function seenRise(j: Judging, divider_s: number | null, own_Hz: number | null): number | null {
  const { riseTime_s, kind } = j.document.brief.waveform;
  const top = bandTop(j.document.brief);
  const edge = riseTime_s !== null && kind !== "sine" ? riseTime_s : top > 0 ? 0.35 / top : null;
  if (edge === null || own_Hz === null || divider_s === null) return null;
  return Math.hypot(edge, divider_s, 0.35 / own_Hz);
}

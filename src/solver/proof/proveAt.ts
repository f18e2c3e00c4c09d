import type { ColumnField } from "../checks/columnField.ts";
import { judging } from "../checks/judging.ts";
import { networkOf } from "../checks/networkOf.ts";
import { stringCapacitance } from "../checks/stringCapacitance.ts";
import type { DividerDocument } from "../job/document.ts";
import { decibel, degrees, sweep } from "../network/sweep.ts";
import { timeResponse } from "../network/timeResponse.ts";

/** The design's response at chosen frequencies (Hz) and times (s); the document must have passed `prove`. */
export function proveAt(
  document: DividerDocument,
  frequencies_Hz: readonly number[],
  times_s: readonly number[],
  field: ColumnField | null = null,
) {
  const j = judging(document, field);
  j.sheet.given("/design/hvArm/strings", document.design!.hvArm.strings);
  const network = networkOf(j, stringCapacitance(j));
  const solved = sweep(network, frequencies_Hz)!;
  const g = times_s.length === 0 ? null : timeResponse(network);
  return {
    frequency: {
      frequency_Hz: frequencies_Hz,
      magnitude_dB: frequencies_Hz.map((_, k) => decibel(solved.real[k]!, solved.imaginary[k]!)),
      phase_deg: frequencies_Hz.map((_, k) => degrees(solved.real[k]!, solved.imaginary[k]!)),
    },
    step: { time_s: times_s, value: times_s.map((t) => g!.at(t)) },
  };
}

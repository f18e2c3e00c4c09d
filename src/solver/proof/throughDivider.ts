import type { ColumnField } from "../checks/columnField.ts";
import { judging } from "../checks/judging.ts";
import { networkOf } from "../checks/networkOf.ts";
import { stringCapacitance } from "../checks/stringCapacitance.ts";
import { workingVoltages } from "../checks/workingVoltage.ts";
import type { DividerDocument } from "../job/document.ts";
import type { Reference } from "../network/ladderNetwork.ts";
import { timeResponse } from "../network/timeResponse.ts";
import { samples } from "../network/waveforms.ts";

/** A recorded waveform and what comes of it: scale factor × output, so that a perfect divider returns the input. */
export interface Through {
  readonly time_s: readonly number[];
  readonly input: readonly number[];
  readonly output: readonly number[];
  /** Greatest magnitude with its sign. */
  readonly peakIn: number;
  readonly peakOut: number;
  /** Peak out over peak in, less 1; null where nothing goes in. */
  readonly peakError: number | null;
  /** Greatest difference of output and input as a share of the peak. */
  readonly greatestDifference: number | null;
  readonly sentence: string;
}

/**
 * Sends a waveform through the design's network, exact in the circuit: straight lines between its points, nothing before the first,
 * the last value held. The document must have passed `prove`.
 * @param most times at which the output is computed; the record's own where it has no more
 */
export function throughDivider(
  document: DividerDocument,
  record: { readonly time_s: readonly number[]; readonly value: readonly number[] },
  field: ColumnField | null = null,
  reference: Reference = "electrode",
  most = 600,
): Through {
  const j = judging(document, field);
  workingVoltages(document.brief, j.sheet);
  j.sheet.given("/design/hvArm/strings", document.design!.hvArm.strings);
  const g = timeResponse(networkOf(j, stringCapacitance(j)), reference)!;
  const at = samples(g, record.time_s, record.value);
  const places = chosen(record.time_s.length, most);
  const time_s = places.map((k) => record.time_s[k]!);
  const input = places.map((k) => record.value[k]!);
  const output = time_s.map(at);
  const peakIn = greatest(record.value);
  const peakOut = greatest(output);
  const peakError = peakIn === 0 ? null : peakOut / peakIn - 1;
  const apart = output.reduce((worst, value, k) => Math.max(worst, Math.abs(value - input[k]!)), 0);
  const greatestDifference = peakIn === 0 ? null : apart / Math.abs(peakIn);
  return {
    time_s,
    input,
    output,
    peakIn,
    peakOut,
    peakError,
    greatestDifference,
    sentence: sentenceOf(peakError, greatestDifference),
  };
}

/** Places spread evenly over the record, both ends among them. */
const chosen = (count: number, most: number): number[] =>
  count <= most
    ? Array.from({ length: count }, (_, k) => k)
    : Array.from({ length: most }, (_, k) => Math.round((k * (count - 1)) / (most - 1)));

const greatest = (values: readonly number[]): number =>
  values.reduce((most, value) => (Math.abs(value) > Math.abs(most) ? value : most), 0);

function sentenceOf(peakError: number | null, difference: number | null): string {
  if (peakError === null || difference === null) return "The record is nought throughout.";
  const share = (value: number) => `${Number((Math.abs(value) * 100).toPrecision(2))} %`;
  const peak =
    Math.abs(peakError) < 5e-6
      ? "The peak is read right"
      : `The peak is read ${share(peakError)} ${peakError < 0 ? "low" : "high"}`;
  return `${peak}; the reading is off by ${share(difference)} of the peak at the worst.`;
}

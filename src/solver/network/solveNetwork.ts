import { ok, type Result } from "../quantities/result.ts";
import { blockedDc } from "./blockedDc.ts";
import { dcSolution } from "./dcSolution.ts";
import { discharge } from "./discharge.ts";
import { elementVoltages } from "./elementVoltages.ts";
import { grading } from "./grading.ts";
import type { LadderNetwork, Reference } from "./ladderNetwork.ts";
import { lvCapacitance } from "./lvCapacitance.ts";
import type { DcAnswer, NetworkAnswer, NetworkAsk, Numbers, StepAnswer } from "./networkForm.ts";
import { readNetwork } from "./readNetwork.ts";
import { selfHeating } from "./selfHeating.ts";
import { singleFaults } from "./singleFaults.ts";
import { stepFigures } from "./stepFigures.ts";
import { bandwidth, decibel, degrees, sweepAll } from "./sweep.ts";
import { greatest } from "./timeGrid.ts";
import { type TimeResponse, timeResponse } from "./timeResponse.ts";
import { toleranceSpread } from "./toleranceSpread.ts";
import { doubleExponential, halfSine, ramp, samples, square } from "./waveforms.ts";

/** The raw network, as JSON in and JSON out. Refused with one message where it cannot be used. Pure. */
export function solveNetwork(form: unknown): Result<NetworkAnswer> {
  const read = readNetwork(form);
  if (!read.ok) return read;
  const { network, voltage_V, ask } = read.value;
  const { reference, elementVoltageAt: at } = ask;
  return ok({
    format: "stringwright-network-answer",
    version: 1,
    dc: dcAnswer(network, voltage_V),
    ...(ask.frequencies_Hz === null ? {} : frequencyAnswer(network, ask.frequencies_Hz, reference)),
    ...(at === null ? {} : { elementVoltageAt: elementVoltages(network, at.frequencies_Hz, at.peak_V, reference) }),
    ...(ask.times_s === null ? {} : { step: stepAnswer(network, ask.times_s, reference) }),
    ...waveformAnswers(network, ask),
    ...(ask.band_Hz === null ? {} : { compensation: compensationAnswer(network, ask.band_Hz, reference) }),
    ...(ask.grading_first_F === null ? {} : { grading: { capacitance_F: grading(network, ask.grading_first_F) } }),
    ...(ask.faults ? { faults: singleFaults(network, voltage_V) } : {}),
    ...(ask.tolerance === null ? {} : { tolerance: toleranceSpread(network, ask.tolerance) }),
    ...(ask.heat === null ? {} : { heat: selfHeating(network, voltage_V, ask.heat) }),
    ...(ask.discharge_threshold_V === null
      ? {}
      : { discharge: discharge(network, voltage_V, ask.discharge_threshold_V) }),
  });
}

const blocked = (list: ArrayLike<unknown>): Numbers => Array.from(list, () => null);

function dcAnswer(network: LadderNetwork, voltage: number): DcAnswer {
  const dc = dcSolution(network, voltage);
  if (dc === null) return blockedDc(network, voltage);
  return { ...dc, inputResistance_ohm: finite(dc.inputResistance_ohm) };
}

function frequencyAnswer(network: LadderNetwork, frequencies: readonly number[], reference: Reference) {
  const { real, imaginary, impedanceReal_ohm, impedanceImaginary_ohm } = sweepAll(network, frequencies, reference);
  const each = (pick: (k: number) => number) => frequencies.map((_, k) => finite(pick(k)));
  const none = blocked(frequencies);
  return {
    frequency:
      real === null || imaginary === null
        ? { real: none, imaginary: none, magnitude_dB: none, phase_deg: none }
        : {
            real: each((k) => real[k]!),
            imaginary: each((k) => imaginary[k]!),
            magnitude_dB: each((k) => decibel(real[k]!, imaginary[k]!)),
            phase_deg: each((k) => degrees(real[k]!, imaginary[k]!)),
          },
    inputImpedance_ohm: {
      real: each((k) => impedanceReal_ohm[k]!),
      imaginary: each((k) => impedanceImaginary_ohm[k]!),
    },
    bandwidth_Hz: bandwidth(network, reference),
  };
}

const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);

function stepAnswer(network: LadderNetwork, times: readonly number[], reference: Reference): StepAnswer {
  const g = timeResponse(network, reference);
  const figures = stepFigures(network, reference);
  if (g === null || figures === null) {
    return {
      value: blocked(times),
      initial: null,
      responseTime_s: null,
      partialResponseTime_s: null,
      riseTime_s: null,
      t10_s: null,
      t90_s: null,
      overshoot: null,
      peakTime_s: null,
      settlingTime_s: { "1%": null, "0.1%": null },
      residualSettlingTime_s: null,
    };
  }
  return { value: times.map((t) => g.at(t)), ...figures };
}

function waveformAnswers(network: LadderNetwork, ask: NetworkAsk) {
  const { ramp: rise, doubleExponential: pulse, halfSine: half, square: wave, samples: record } = ask;
  if (rise === null && pulse === null && half === null && wave === null && record === null) return {};
  const g = timeResponse(network, ask.reference);
  const values = (times: readonly number[], of: (g: TimeResponse) => (t: number) => number): { value: Numbers } => ({
    value: g === null ? blocked(times) : times.map(of(g)),
  });
  return {
    ...(rise === null ? {} : { ramp: values(rise.times_s, (g) => (t) => ramp(g, rise.riseTime_s, t)) }),
    ...(pulse === null
      ? {}
      : {
          doubleExponential: { ...values(pulse.times_s, (g) => doubleExponentialOf(g, pulse)), peak: peakOf(g, pulse) },
        }),
    ...(half === null ? {} : { halfSine: values(half.times_s, (g) => halfSine(g, half.duration_s)) }),
    ...(wave === null ? {} : { square: values(wave.times_s, (g) => (t) => square(g, wave.period_s, wave.duty, t)) }),
    ...(record === null ? {} : { samples: values(record.times_s, (g) => samples(g, record.time_s, record.value)) }),
  };
}

type Pulse = NonNullable<NetworkAsk["doubleExponential"]>;

const doubleExponentialOf =
  (g: TimeResponse, { amplitude, alpha_per_s, beta_per_s }: Pulse) =>
  (t: number) =>
    doubleExponential(g, amplitude, alpha_per_s, beta_per_s, t);

/** The extreme of the output, with its sign. */
function peakOf(g: TimeResponse | null, pulse: Pulse): number | null {
  if (g === null) return null;
  const at = doubleExponentialOf(g, pulse);
  return at(greatest(g, (t) => Math.abs(at(t))));
}

function compensationAnswer(network: LadderNetwork, band: readonly [number, number], reference: Reference) {
  const found = lvCapacitance(network, band, reference);
  return {
    lvCapacitance_F: {
      responseTime: found.responseTime_F,
      highFrequency: found.highFrequency_F,
      flattest: found.flattest_F,
    },
    flattest_dB: found.flattest_dB,
  };
}

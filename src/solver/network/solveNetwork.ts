import { ok, type Result } from "../quantities/result.ts";
import { dcSolution } from "./dcSolution.ts";
import { elementVoltages } from "./elementVoltages.ts";
import { grading } from "./grading.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";
import { lvCapacitance } from "./lvCapacitance.ts";
import type { DcAnswer, NetworkAnswer, Numbers, StepAnswer } from "./networkForm.ts";
import { readNetwork } from "./readNetwork.ts";
import { stepFigures } from "./stepFigures.ts";
import { StepResponse } from "./stepResponse.ts";
import { bandwidth, decibel, degrees, sweep } from "./sweep.ts";

/** The raw network, as JSON in and JSON out. Refused with one message where it cannot be used. Pure. */
export function solveNetwork(form: unknown): Result<NetworkAnswer> {
  const read = readNetwork(form);
  if (!read.ok) return read;
  const { network, voltage_V, ask } = read.value;
  const rise = ask.ramp;
  return ok({
    format: "stringwright-network-answer",
    version: 1,
    dc: dcAnswer(network, voltage_V),
    ...(ask.frequencies_Hz === null ? {} : frequencyAnswer(network, ask.frequencies_Hz)),
    ...(ask.elementVoltageAt === null
      ? {}
      : {
          elementVoltageAt: elementVoltages(network, ask.elementVoltageAt.frequencies_Hz, ask.elementVoltageAt.peak_V),
        }),
    ...(ask.times_s === null ? {} : { step: stepAnswer(network, ask.times_s) }),
    ...(rise === null ? {} : { ramp: { value: ramp(network, rise.riseTime_s, rise.times_s) } }),
    ...(ask.band_Hz === null ? {} : { compensation: compensationAnswer(network, ask.band_Hz) }),
    ...(ask.grading_first_F === null ? {} : { grading: { capacitance_F: grading(network, ask.grading_first_F) } }),
  });
}

const blocked = (list: ArrayLike<unknown>): Numbers => Array.from(list, () => null);

function dcAnswer(network: LadderNetwork, voltage: number): DcAnswer {
  const dc = dcSolution(network, voltage);
  if (dc === null) {
    const none = blocked(network.resistance_ohm);
    return {
      scaleFactor: null,
      scaleFactorFromSource: null,
      inputResistance_ohm: null,
      electrodeVoltage_V: voltage,
      tapVoltage_V: null,
      outputVoltage_V: null,
      current_A: null,
      elementVoltage_V: none,
      elementPower_W: none,
      lvPower_W: null,
    };
  }
  return {
    ...dc,
    inputResistance_ohm: finite(dc.inputResistance_ohm),
    scaleFactorFromSource: dc.scaleFactor,
    electrodeVoltage_V: voltage,
  };
}

function frequencyAnswer(network: LadderNetwork, frequencies: readonly number[]) {
  const solved = sweep(network, frequencies);
  if (solved === null) {
    const none = blocked(frequencies);
    return {
      frequency: { real: none, imaginary: none, magnitude_dB: none, phase_deg: none },
      inputImpedance_ohm: { real: none, imaginary: none },
      bandwidth_Hz: null,
    };
  }
  const each = (pick: (k: number) => number) => frequencies.map((_, k) => finite(pick(k)));
  return {
    frequency: {
      real: each((k) => solved.real[k]!),
      imaginary: each((k) => solved.imaginary[k]!),
      magnitude_dB: each((k) => decibel(solved.real[k]!, solved.imaginary[k]!)),
      phase_deg: each((k) => degrees(solved.real[k]!, solved.imaginary[k]!)),
    },
    inputImpedance_ohm: {
      real: each((k) => solved.impedanceReal_ohm[k]!),
      imaginary: each((k) => solved.impedanceImaginary_ohm[k]!),
    },
    bandwidth_Hz: bandwidth(network),
  };
}

const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);

function stepAnswer(network: LadderNetwork, times: readonly number[]): StepAnswer {
  const g = StepResponse.of(network);
  const figures = stepFigures(network);
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

/**
 * Ramp from 0 to 1 in T: (D(t) - D(t-T))/T with D = ∫g = t - deficit; so 1 - (deficit(t) - deficit(t-T))/T once past T.
 * Late on the difference is the mean of 1 - g over the ramp, taken by Gauss's rule, since the quotient would lose t/T in precision.
 */
function ramp(network: LadderNetwork, T: number, times: readonly number[]): Numbers {
  const g = StepResponse.of(network);
  if (g === null) return blocked(times);
  return times.map((t) => {
    if (t <= T) return (t - g.deficit(t)) / T;
    if (t < 4 * T) return 1 - (g.deficit(t) - g.deficit(t - T)) / T;
    return gauss((tau) => g.at(tau), t - T, t);
  });
}

const abscissae = [0.1834346424956498, 0.525532409916329, 0.7966664774136267, 0.9602898564975363];
const weights = [0.362683783378362, 0.3137066458778873, 0.2223810344533745, 0.1012285362903763];

/** Mean by eight-point Gauss-Legendre (Abramowitz and Stegun, table 25.4, from memory). */
function gauss(f: (x: number) => number, from: number, to: number): number {
  const middle = (from + to) / 2;
  const half = (to - from) / 2;
  return abscissae.reduce((sum, x, k) => sum + (weights[k]! / 2) * (f(middle + half * x) + f(middle - half * x)), 0);
}

function compensationAnswer(network: LadderNetwork, band: readonly [number, number]) {
  const found = lvCapacitance(network, band);
  return {
    lvCapacitance_F: {
      responseTime: found.responseTime_F,
      highFrequency: found.highFrequency_F,
      flattest: found.flattest_F,
    },
    flattest_dB: found.flattest_dB,
  };
}

/** The raw network as strict JSON, SI, the unit in the key (README, "The raw network"). A value that does not exist is null. */
export interface NetworkAnswer {
  readonly format: "stringwright-network-answer";
  readonly version: 1;
  readonly dc: DcAnswer;
  readonly frequency?: {
    readonly real: Numbers;
    readonly imaginary: Numbers;
    readonly magnitude_dB: Numbers;
    readonly phase_deg: Numbers;
  };
  readonly inputImpedance_ohm?: { readonly real: Numbers; readonly imaginary: Numbers };
  readonly bandwidth_Hz?: number | null;
  readonly elementVoltageAt?: { readonly elementVoltage_V: readonly Numbers[]; readonly tapVoltage_V: Numbers };
  readonly step?: StepAnswer;
  readonly ramp?: { readonly value: Numbers };
  readonly doubleExponential?: { readonly value: Numbers; readonly peak: number | null };
  readonly halfSine?: { readonly value: Numbers };
  readonly square?: { readonly value: Numbers };
  readonly samples?: { readonly value: Numbers };
  readonly compensation?: {
    readonly lvCapacitance_F: {
      readonly responseTime: number | null;
      readonly highFrequency: number | null;
      readonly flattest: number | null;
    };
    readonly flattest_dB: number | null;
  };
  readonly grading?: { readonly capacitance_F: Numbers };
  readonly faults?: readonly FaultAnswer[];
  readonly tolerance?: ToleranceAnswer;
  /** null: thermal runaway. */
  readonly heat?: HeatAnswer | null;
  readonly discharge?: DischargeAnswer;
}

export type Numbers = readonly (number | null)[];

export interface DcAnswer {
  readonly scaleFactor: number | null;
  readonly scaleFactorFromSource: number | null;
  readonly inputResistance_ohm: number | null;
  readonly electrodeVoltage_V: number | null;
  readonly tapVoltage_V: number | null;
  readonly outputVoltage_V: number | null;
  readonly current_A: number | null;
  readonly elementVoltage_V: Numbers;
  readonly elementPower_W: Numbers;
  readonly lvPower_W: number | null;
}

export interface StepAnswer {
  readonly value: Numbers;
  readonly initial: number | null;
  readonly responseTime_s: number | null;
  readonly partialResponseTime_s: number | null;
  readonly riseTime_s: number | null;
  readonly t10_s: number | null;
  readonly t90_s: number | null;
  readonly overshoot: number | null;
  readonly peakTime_s: number | null;
  readonly settlingTime_s: { readonly "1%": number | null; readonly "0.1%": number | null };
  readonly residualSettlingTime_s: number | null;
}

export interface FaultAnswer {
  readonly kind: "normal" | "elementOpen" | "elementShort" | "lvOpen" | "lvShort" | "instrumentOpen";
  /** 1 … n from the tap; 0: none. */
  readonly element: number;
  readonly output_V: number | null;
  /** A magnitude. */
  readonly greatestElementVoltage_V: number | null;
  readonly outputRatio: number | null;
  readonly greatestElementRatio: number | null;
  readonly fastOutput_V: number;
}

export interface ToleranceAnswer {
  readonly sensitivity: {
    readonly element: Numbers;
    readonly lvArm: number | null;
    readonly instrument: number | null;
  };
  readonly standardUncertainty: { readonly rectangular: number | null; readonly normal: number | null };
  readonly worst: { readonly least: number | null; readonly greatest: number | null };
  readonly sampled?: {
    readonly mean: number | null;
    readonly standardDeviation: number | null;
    readonly q025: number | null;
    readonly q500: number | null;
    readonly q975: number | null;
  };
}

export interface HeatAnswer {
  readonly scaleFactor: number | null;
  readonly relativeShift: number | null;
  readonly resistance_ohm: Numbers;
  readonly lvResistance_ohm: number | null;
  readonly elementVoltage_V: Numbers;
  readonly elementPower_W: Numbers;
  readonly temperatureRise_K: Numbers;
}

export interface DischargeAnswer {
  readonly time_s: number | null;
  readonly energy_J: number | null;
  readonly slowestTimeConstant_s: number | null;
}

/** What was asked of a network, read and checked; null: not asked. */
export interface NetworkAsk {
  readonly reference: "electrode" | "source";
  readonly frequencies_Hz: readonly number[] | null;
  readonly elementVoltageAt: { readonly frequencies_Hz: readonly number[]; readonly peak_V: number } | null;
  readonly times_s: readonly number[] | null;
  readonly ramp: (Timed & { readonly riseTime_s: number }) | null;
  readonly doubleExponential:
    | (Timed & { readonly amplitude: number; readonly alpha_per_s: number; readonly beta_per_s: number })
    | null;
  readonly halfSine: (Timed & { readonly duration_s: number }) | null;
  readonly square: (Timed & { readonly period_s: number; readonly duty: number }) | null;
  readonly samples: (Timed & { readonly time_s: readonly number[]; readonly value: readonly number[] }) | null;
  readonly band_Hz: readonly [number, number] | null;
  readonly grading_first_F: number | null;
  readonly faults: boolean;
  readonly tolerance: ToleranceAsk | null;
  readonly heat: HeatAsk | null;
  readonly discharge_threshold_V: number | null;
}

export interface Timed {
  readonly times_s: readonly number[];
}

/** Relative half-widths; one an element, tap first. */
export interface ToleranceAsk {
  readonly element: readonly number[];
  readonly lvArm: number;
  readonly instrument: number;
  /** Half-width in standard deviations, for the normal reading of a tolerance. */
  readonly k: number;
  readonly samples: number | null;
  readonly seed: number;
}

/** R = R0 (1 + α (ΔT_ambient + P Rth) + k_v |V|); lists have one value an element, tap first. */
export interface HeatAsk {
  readonly temperatureCoefficient_per_K: readonly number[];
  readonly voltageCoefficient_per_V: readonly number[];
  readonly thermalResistance_K_per_W: readonly number[];
  readonly ambientRise_K: number;
  readonly lvTemperatureCoefficient_per_K: number;
  readonly lvVoltageCoefficient_per_V: number;
  readonly lvThermalResistance_K_per_W: number;
}

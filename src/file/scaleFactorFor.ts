import { crestFactors, greatestOverPeak, type Instrument, type Waveform } from "../solver/index.ts";

const mantissas = [1, 2, 5] as const;

/** As stated, or by the rule of the waveform. */
function greatest_Vpeak(waveform: Waveform): number {
  const peak = Math.abs(waveform.nominal_V) * crestFactors(waveform).peakOverStated;
  return waveform.greatest_Vpeak ?? peak * greatestOverPeak[waveform.kind];
}

/**
 * Default scale factor: a decade if one fits, else 1-2-5, such that the nominal voltage reads at 20-80 % of the range and the
 * greatest peak stays at or below a third of the instrument's limit; where both cannot be met the limit rules. At least 2.
 * Common practice, no source.
 */
export function scaleFactorFor(waveform: Waveform, instrument: Instrument): number {
  const nominal = Math.abs(waveform.nominal_V);
  const least = Math.max(
    nominal / (0.8 * instrument.range_V),
    (3 * greatest_Vpeak(waveform)) / instrument.greatestInput_Vpeak,
    2,
  );
  if (least >= 1e12) return 1e12;
  const most = nominal / (0.2 * instrument.range_V);
  const decade = 10 ** Math.ceil(Math.log10(least) - 1e-12);
  return decade <= most ? decade : niceFrom(least);
}

/** The smallest 1-2-5 number at or above `least`. */
function niceFrom(least: number): number {
  const exponent = Math.floor(Math.log10(least));
  for (const power of [exponent, exponent + 1]) {
    for (const mantissa of mantissas) {
      const value = Number(`${mantissa}e${power}`);
      if (value >= least * (1 - 1e-12)) return value;
    }
  }
  return Number(`1e${exponent + 2}`);
}

import type { SeriesName } from "../standards/preferred.ts";
import type { MaterialGroup, PollutionDegree } from "../standards/surroundings.ts";

/** What the engineer asks. Shapes only; every physical key carries its unit. */
export type WaveformKind = "dc" | "sine" | "pulse" | "square" | "recorded";
export type StatedAs = "dc" | "rms" | "peak";
export type { MaterialGroup, PollutionDegree, SeriesName };

export interface Waveform {
  readonly kind: WaveformKind;
  /** Signed: polarity is kept for the reading; sizes use the magnitude. */
  readonly nominal_V: number;
  readonly statedAs: StatedAs;
  /** Greatest peak that may ever stand there (off load, surge, mains high); null: by the default rule of the waveform. */
  readonly greatest_Vpeak: number | null;
  /** Sine and square. */
  readonly frequency_Hz: number | null;
  /** Pulse and square: 10-90 % rise time. */
  readonly riseTime_s: number | null;
  /** Pulse. */
  readonly width_s: number | null;
  /** Pulse; 0: single shots. */
  readonly repetition_Hz: number | null;
}

export interface SourceOfVoltage {
  readonly resistance_ohm: number;
  readonly capacitance_F: number;
  /** null: not stated. */
  readonly currentLimit_A: number | null;
  readonly earth: "oneSide" | "floating" | "none";
  readonly mainsConnected: boolean;
}

export interface Surroundings {
  readonly altitude_m: number;
  readonly ambient_degC: number;
  /** Half-width of the ambient span. */
  readonly ambientSpan_K: number;
  readonly relativeHumidity: number;
  readonly pollutionDegree: PollutionDegree;
  readonly materialGroup: MaterialGroup;
  readonly wallDistance_m: number;
  /** Approach distance that local rules set; null: not stated. There is no default. */
  readonly approachDistance_m: number | null;
}

export interface Policy {
  /** Share of the limiting element voltage that may be used, 0 … 1. */
  readonly voltageDerating: number;
  /** Share of the (temperature-derated) dissipation that may be used, 0 … 1. */
  readonly powerDerating: number;
  /** Series that LV-arm resistors and capacitors are picked from. */
  readonly series: SeriesName;
  readonly partsInHandOnly: boolean;
  /** Source sag that is accepted; null: the wanted uncertainty. */
  readonly allowedSag: number | null;
  /** Insulation resistance assumed across the whole string. */
  readonly leakageResistance_ohm: number;
  /** Least string current, for bias currents, noise and pick-up. */
  readonly leastCurrent_A: number;
  /** Greatest dissipation accepted in the whole divider; null: no bound. */
  readonly greatestDissipation_W: number | null;
  /** Longest column accepted; null: no bound. */
  readonly greatestLength_m: number | null;
  /** Capacitor across each element: when the band asks for it, always, or never. */
  readonly compensation: "whenNeeded" | "always" | "never";
}

export interface Brief {
  readonly waveform: Waveform;
  readonly scaleFactor: number;
  /** Relative, k = 2. */
  readonly wantedUncertainty: number;
  /** [lowest, highest] frequency that must be right. [0, 0] for dc. */
  readonly band_Hz: readonly [number, number];
  readonly source: SourceOfVoltage;
  readonly surroundings: Surroundings;
  readonly policy: Policy;
  /** Square-wave generator at hand for the slow/fast check, peak to peak. */
  readonly generator_Vpp: number;
}

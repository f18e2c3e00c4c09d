import type { Brief, Waveform } from "../job/brief.ts";
import { type Formula, formula } from "../standards/formula.ts";
import type { Sheet } from "../standards/sheet.ts";
import { practice, type Source } from "../standards/source.ts";

const definition: Source = {
  title: "Waveform definitions",
  edition: null,
  clause: "mean, rms, peak",
  status: "definition",
};
const volts = (symbol: string, meaning: string) => ({ symbol, unit: "V", meaning });
const number = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });

/** The magnitudes that sizes and limits are judged by, V. All positive; the sign is kept for the reading only. */
export interface WorkingVoltages {
  readonly dc_V: number;
  readonly rms_V: number;
  readonly peak_V: number;
  readonly greatest_Vpeak: number;
  /** rms when the peak is at its greatest: what dissipation is judged by. */
  readonly greatestRms_V: number;
  /** dc or rms voltage that creepage is judged by; the peak for pulses, whose rms is not relied on. */
  readonly creepage_V: number;
}

/** peak over stated value, and rms and mean over peak, for a waveform (sine √2; square ±V: 1; pulse train √duty; dc 1). */
export function crestFactors(waveform: Waveform): {
  peakOverStated: number;
  rmsOverPeak: number;
  meanOverPeak: number;
} {
  switch (waveform.kind) {
    case "dc":
      return { peakOverStated: 1, rmsOverPeak: 1, meanOverPeak: 1 };
    case "sine":
      return {
        peakOverStated: waveform.statedAs === "rms" ? Math.SQRT2 : 1,
        rmsOverPeak: Math.SQRT1_2,
        meanOverPeak: 0,
      };
    case "square":
      return { peakOverStated: 1, rmsOverPeak: 1, meanOverPeak: 0 };
    default: {
      const duty = dutyOf(waveform);
      const rms = Math.sqrt(duty);
      return {
        peakOverStated: waveform.statedAs === "rms" && rms > 0 ? 1 / rms : 1,
        rmsOverPeak: rms,
        meanOverPeak: duty,
      };
    }
  }
}

/** Share of the time that a pulse stands, 0 for single shots; 1 for a recorded wave, which is then judged as if it stood. */
export function dutyOf(waveform: Waveform): number {
  if (waveform.kind === "recorded") return 1;
  const duty = (waveform.width_s ?? 0) * (waveform.repetition_Hz ?? 0);
  return Math.min(duty, 1);
}

/** Default of the greatest peak over the working peak: 1.2 for dc, 1.1 for sine (mains high), 1.5 for pulses and squares. */
export const greatestOverPeak: Record<Waveform["kind"], number> = {
  dc: 1.2,
  sine: 1.1,
  pulse: 1.5,
  square: 1.5,
  recorded: 1.2,
};

export const workingVoltageFormulas = {
  peak: formula({
    id: "working.peak",
    title: "Working voltage, peak",
    statement: "{=} = |{V}| · {k}",
    result: volts("V_pk", "peak of the working voltage"),
    inputs: { V: volts("V_n", "stated voltage"), k: number("k_pk", "peak over stated value, by waveform") },
    holds: "Undistorted waveform of the kind stated.",
    source: definition,
    compute: ({ V, k }) => Math.abs(V) * k,
  }),
  share: formula({
    id: "working.share",
    title: "Working voltage from its peak",
    statement: "{=} = {Vpk} · {k}",
    result: volts("V", "rms or mean of the working voltage"),
    inputs: { Vpk: volts("V_pk", "peak"), k: number("k", "rms or mean over peak, by waveform") },
    holds: "Undistorted waveform of the kind stated; a pulse train by its duty.",
    source: definition,
    compute: ({ Vpk, k }) => Vpk * k,
  }),
  greatest: formula({
    id: "working.greatest",
    title: "Greatest peak, by default",
    statement: "{=} = {Vpk} · {k}",
    result: volts("V_max", "greatest peak"),
    inputs: { Vpk: volts("V_pk", "peak"), k: number("k_max", "1.2 dc, 1.1 sine, 1.5 pulse or square") },
    holds: "Used only while the greatest peak is not typed: off load, surge or mains high may be more.",
    source: practice("default allowance over the working voltage"),
    compute: ({ Vpk, k }) => Vpk * k,
  }),
  greatestTyped: formula({
    id: "working.greatestTyped",
    title: "Greatest peak, as typed",
    statement: "{=} = |{V}|, not below {Vpk}",
    result: volts("V_max", "greatest peak"),
    inputs: { V: volts("V_max", "greatest peak as typed"), Vpk: volts("V_pk", "working peak") },
    holds: "A typed value below the working peak is reported; sizes then use the larger of the two.",
    source: definition,
    compute: ({ V, Vpk }) => Math.max(Math.abs(V), Vpk),
  }),
};

/** Writes `working.*` on the sheet and returns the magnitudes. */
export function workingVoltages(brief: Brief, sheet: Sheet): WorkingVoltages {
  const { waveform } = brief;
  const { peakOverStated, rmsOverPeak, meanOverPeak } = crestFactors(waveform);
  const f = workingVoltageFormulas;
  sheet.given("/brief/waveform/nominal_V", waveform.nominal_V);
  sheet.given("/brief/waveform/kind:peakOverStated", peakOverStated);
  sheet.given("/brief/waveform/kind:rmsOverPeak", rmsOverPeak);
  sheet.given("/brief/waveform/kind:meanOverPeak", meanOverPeak);
  const peak_V = sheet.derive("working.peak_V", f.peak, {
    V: "/brief/waveform/nominal_V",
    k: "/brief/waveform/kind:peakOverStated",
  }) as number;
  const from = (path: string, Vpk: string, k: string) => sheet.derive(path, f.share, { Vpk, k }) as number;
  const rms_V = from("working.rms_V", "working.peak_V", "/brief/waveform/kind:rmsOverPeak");
  const dc_V = from("working.dc_V", "working.peak_V", "/brief/waveform/kind:meanOverPeak");
  if (waveform.greatest_Vpeak === null) {
    sheet.given("/brief/waveform/kind:greatestOverPeak", greatestOverPeak[waveform.kind]);
    sheet.derive("working.greatest_Vpeak", f.greatest, {
      Vpk: "working.peak_V",
      k: "/brief/waveform/kind:greatestOverPeak",
    });
  } else {
    sheet.given("/brief/waveform/greatest_Vpeak", waveform.greatest_Vpeak);
    sheet.derive("working.greatest_Vpeak", f.greatestTyped, {
      V: "/brief/waveform/greatest_Vpeak",
      Vpk: "working.peak_V",
    });
  }
  const greatest_Vpeak = sheet.number("working.greatest_Vpeak") as number;
  const greatestRms_V = from("working.greatestRms_V", "working.greatest_Vpeak", "/brief/waveform/kind:rmsOverPeak");
  const pulsed = waveform.kind === "pulse" || waveform.kind === "recorded";
  sheet.given("/brief/waveform/kind:creepageOverPeak", pulsed ? 1 : rmsOverPeak);
  const creepage_V = from("working.creepage_V", "working.peak_V", "/brief/waveform/kind:creepageOverPeak");
  return { dc_V, rms_V, peak_V, greatest_Vpeak, greatestRms_V, creepage_V };
}

export type AnyFormula = Formula<string, string>;

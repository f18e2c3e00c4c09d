import { wantedOf } from "../checks/wanted.ts";
import type { Brief } from "../job/brief.ts";
import type { Instrument } from "../job/instrument.ts";
import { formatQuantity } from "../quantities/format.ts";

const q = (value: number, unit: string) => formatQuantity(value, unit as never, { digits: 3 });

/** The job as one sentence: "Peak of a 48.0 kV pulse, 100 ns edge, into a scope, within 3 %". */
export function jobSentence(brief: Brief, instrument: Instrument | undefined): string {
  const { waveform: w } = brief;
  const V = q(Math.abs(w.nominal_V), "V");
  const sign = w.nominal_V < 0 ? "negative " : "";
  const frequency = w.frequency_Hz ? ` at ${q(w.frequency_Hz, "Hz")}` : "";
  const edge = w.riseTime_s ? `, ${q(w.riseTime_s, "s")} edge` : "";
  const what = {
    dc: `${sign}${V} dc`,
    sine: `${V} ${w.statedAs === "rms" ? "rms" : "peak"}${frequency}`,
    pulse: `Peak of a ${sign}${V} pulse${edge}`,
    square: `${V} square wave${frequency}${edge}`,
    recorded: `${sign}${V} peak of a recorded waveform`,
  }[w.kind];
  const into = instrument === undefined ? "" : `, into ${instrument.name}`;
  const wanted = wantedOf(brief);
  return `${what}${into}${wanted === null ? "" : `, within ${Number((wanted * 100).toPrecision(3))} %`}`;
}

import { formula, type Solution } from "../standards/formula.ts";
import { computedHere, practice } from "../standards/source.ts";

const hertz = (symbol: string, meaning: string) => ({ symbol, unit: "Hz", meaning });
const volt = (symbol: string, meaning: string) => ({ symbol, unit: "V", meaning });
const pole = hertz("f_p", "where the resistors hand over to the capacitors");
const F = { symbol: "F", unit: "1", meaning: "scale factor" };
const noise = volt("v_n", "noise of the instrument, rms");

/** 1, 2, 5, 10 … at most so much. */
export function roundBelow(value: number): number {
  const decade = 10 ** Math.floor(Math.log10(value) + 1e-12);
  const step = [5, 2, 1].find((each) => each * decade <= value * (1 + 1e-9)) ?? 1;
  return Number((step * decade).toPrecision(3));
}

/** 1, 2, 5, 10 … at least so much. */
export function roundAbove(value: number): number {
  const below = roundBelow(value);
  if (below >= value * (1 - 1e-9)) return below;
  const lead = Number(below.toExponential().split("e")[0]);
  return Number((below * (lead === 2 ? 2.5 : 2)).toPrecision(3));
}

/** Divisions of the screen that the signal is to fill, and peaks of noise that one of them may hold. */
export const divisions = 5;
export const noisePeaks = 6;

export const drivenPoleRecord: Solution = {
  id: "slowFast.pole",
  title: "Slowest decay of the divider under an ideal source",
  statement: "(G − λ C) v = 0, smallest λ, the electrode held; f_p = λ / 2π",
  method: "Ladder with strays, LV arm, cable and instrument; bisection on the count of negative pivots.",
  holds: "Linear parts; the cable as its capacitance.",
  source: computedHere("natural frequency of the ladder"),
  residualBound: 1e-9,
};

/** The slow/fast check: two square waves, one settled in each half period, one all on the capacitors. */
export const slowFastFormulas = {
  slow: formula({
    id: "slowFast.slow",
    title: "Slow frequency of the slow/fast check",
    statement: "{=} ≤ 0.3 · {pole}, rounded down to 1, 2 or 5",
    result: hertz("f_slow", "each half period lasts ten time constants and settles"),
    inputs: { pole },
    holds: "The slowest decay decides.",
    source: practice("the settled half needs ten time constants"),
    compute: ({ pole: f }) => roundBelow(0.3 * f),
  }),
  fast: formula({
    id: "slowFast.fast",
    title: "Fast frequency of the slow/fast check",
    statement: "{=} ≥ 20 · {pole}, rounded up to 1, 2 or 5",
    result: hertz("f_fast", "each half period lasts a sixth of a time constant at most: still on the capacitors"),
    inputs: { pole },
    holds: "The slowest decay decides.",
    source: practice("the fast half is over before the resistors act"),
    compute: ({ pole: f }) => roundAbove(20 * f),
  }),
  signal: formula({
    id: "slowFast.signal",
    title: "Signal of the slow/fast check at the instrument",
    statement: "{=} = {V} / {F}",
    result: volt("v_pp", "peak to peak"),
    inputs: { V: volt("V_pp", "generator, peak to peak"), F },
    holds: "A matched divider.",
    source: computedHere("definition of the scale factor"),
    compute: ({ V, F: f }) => V / f,
  }),
  needed: formula({
    id: "slowFast.needed",
    title: "Signal that stands clear of the noise",
    statement: "{=} = 5 · 6 · {noise}",
    result: volt("v_min", "five divisions of signal, the noise's peaks within one"),
    inputs: { noise },
    holds: "Noise like a Gaussian: six times its rms value is all but its rarest peaks.",
    source: practice("five divisions of signal to one of noise"),
    compute: ({ noise: v }) => divisions * noisePeaks * v,
  }),
};

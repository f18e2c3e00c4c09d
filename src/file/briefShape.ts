import type {
  Brief,
  MaterialGroup,
  Policy,
  PollutionDegree,
  SeriesName,
  SourceOfVoltage,
  StatedAs,
  Surroundings,
  Waveform,
  WaveformKind,
} from "../solver/index.ts";
import { contentBand_Hz } from "./contentBand.ts";
import type { Raw, Shape } from "./shape.ts";
import { choice, flag, object, pair, quantity, quantityOrNull } from "./shapes.ts";

const kindOf = (parent: Raw): unknown => parent.kind;
const waveformOf = (root: Raw): Raw => ((root.brief as Raw | undefined)?.waveform as Raw | undefined) ?? {};

export const seriesNames: Readonly<Record<SeriesName, string>> = {
  E3: "3 values a decade, IEC 60063",
  E6: "6 values a decade, IEC 60063",
  E12: "12 values a decade, IEC 60063",
  E24: "24 values a decade, IEC 60063",
  E48: "48 values a decade, IEC 60063",
  E96: "96 values a decade, IEC 60063",
  E192: "192 values a decade, IEC 60063",
};

export const waveformShape = object<Waveform>("What is to be measured.", {
  kind: choice<WaveformKind>(
    "Shape of the voltage.",
    {
      dc: "steady voltage",
      sine: "alternating, one frequency",
      pulse: "single or repeated pulses",
      square: "square wave",
      recorded: "a recorded waveform",
    },
    "dc",
    true,
  ),
  nominal_V: quantity("V", "The voltage, signed; stated as `statedAs` says.", {
    least: -1e8,
    fallback: 0,
    question: "which voltage is to be measured, e.g. 6000 for 6 kV?",
  }),
  statedAs: choice<StatedAs>(
    "How the nominal voltage is stated.",
    { dc: "mean of a steady voltage", rms: "root mean square", peak: "greatest peak in normal use" },
    (parent) =>
      kindOf(parent) === "dc" || kindOf(parent) === undefined ? "dc" : kindOf(parent) === "sine" ? "rms" : "peak",
    true,
  ),
  greatest_Vpeak: quantityOrNull(
    "V",
    "Greatest peak that may ever stand there; null or 0: by the rule of the waveform.",
    {
      zeroIsNull: true,
      ruled: true,
    },
  ),
  frequency_Hz: quantityOrNull("Hz", "Sine and square; null or 0: not stated.", {
    zeroIsNull: true,
    fallback: (parent) => (kindOf(parent) === "sine" ? 50 : kindOf(parent) === "square" ? 1000 : null),
  }),
  riseTime_s: quantityOrNull("s", "Pulse and square, 10-90 %; null or 0: not stated.", {
    zeroIsNull: true,
    fallback: (parent) => (kindOf(parent) === "pulse" || kindOf(parent) === "square" ? 1e-6 : null),
  }),
  width_s: quantityOrNull("s", "Pulse; null or 0: not stated.", {
    zeroIsNull: true,
    fallback: (parent) => (kindOf(parent) === "pulse" ? 50e-6 : null),
  }),
  repetition_Hz: quantityOrNull("Hz", "Pulse; 0: single shots.", {
    fallback: (parent) => (kindOf(parent) === "pulse" ? 0 : null),
  }),
});

export const sourceShape = object<SourceOfVoltage>("Where the voltage comes from.", {
  resistance_ohm: quantity("ohm", "Internal resistance.", { fallback: 0 }),
  capacitance_F: quantity("F", "Output capacitance; a stated 0 is a claim.", {
    fallback: (parent, root) =>
      parent.mainsConnected === true ? 1e-6 : waveformOf(root).kind === "pulse" ? 1e-9 : 1e-8,
  }),
  currentLimit_A: quantityOrNull("A", "Current limit; null or 0: not stated.", { zeroIsNull: true }),
  earth: choice<SourceOfVoltage["earth"]>(
    "How the source is earthed.",
    { oneSide: "one side is earthed", floating: "no side is earthed", none: "there is no earth to connect to" },
    "oneSide",
    true,
  ),
  mainsConnected: flag("Whether the source is connected to the mains without isolation.", false, true),
});

export const surroundingsShape = object<Surroundings>("Where the divider stands.", {
  altitude_m: quantity("m", "Altitude above sea level.", { least: -500, greatest: 1e5, fallback: 1000 }),
  ambient_degC: quantity("degC", "Ambient temperature.", { least: -100, greatest: 300, fallback: 23 }),
  ambientSpan_K: quantity("K", "Half-width of the ambient span.", { fallback: 5 }),
  relativeHumidity: quantity("1", "Relative humidity, 0 … 1.", {
    fallback: 0.5,
    question: "was a percentage meant? 50 % is 0.5",
  }),
  pollutionDegree: quantity("1", "Pollution degree, IEC 60664-1: 1, 2 or 3.", {
    least: 1,
    greatest: 3,
    whole: true,
    fallback: 2,
  }) as unknown as Shape<PollutionDegree>,
  materialGroup: choice<MaterialGroup>(
    "Material group of the insulation, IEC 60664-1.",
    { I: "CTI 600 and above", II: "CTI 400 to below 600", IIIa: "CTI 175 to below 400", IIIb: "CTI 100 to below 175" },
    "IIIa",
    true,
  ),
  wallDistance_m: quantity("m", "Distance of the nearest earthed wall.", { fallback: 1 }),
  approachDistance_m: quantityOrNull("m", "Approach distance that local rules set; null: not stated."),
});

const share = "was a percentage meant? 80 % is 0.8";

export const policyShape = object<Policy>("How cautiously the divider is designed.", {
  voltageDerating: quantity("1", "Share of the limiting element voltage that may be used.", {
    least: 0.1,
    fallback: 0.6,
    question: share,
  }),
  powerDerating: quantity("1", "Share of the permitted dissipation that may be used.", {
    least: 0.1,
    fallback: 0.5,
    question: share,
  }),
  series: choice<SeriesName>("Preferred values that LV-arm parts are picked from.", seriesNames, "E24"),
  partsInHandOnly: flag("Whether only parts in hand are used.", false),
  allowedSag: quantityOrNull("1", "Source sag that is accepted; null: the wanted uncertainty."),
  leakageResistance_ohm: quantity("ohm", "Insulation resistance assumed across the whole string.", {
    aboveLeast: true,
    fallback: 1e13,
  }),
  leastCurrent_A: quantity("A", "Least string current.", { fallback: 5e-7 }),
  greatestDissipation_W: quantityOrNull("W", "Greatest dissipation of the whole divider; null or 0: no bound.", {
    zeroIsNull: true,
  }),
  greatestLength_m: quantityOrNull("m", "Longest column accepted; null or 0: no bound.", { zeroIsNull: true }),
  compensation: choice<Policy["compensation"]>(
    "A capacitor across each element.",
    { whenNeeded: "when the band asks for it", always: "always", never: "never" },
    "whenNeeded",
  ),
});

export const briefShape = object<Brief>("What the engineer asks.", {
  waveform: waveformShape,
  scaleFactor: quantity("1", "Wanted scale factor, input over output; missing: chosen for the principal instrument.", {
    aboveLeast: true,
    greatest: 1e12,
    fallback: () => 1000,
  }),
  wantedUncertainty: quantity("1", "Wanted relative uncertainty, k = 2; 0: not stated.", {
    fallback: 0.03,
    question: "was a percentage meant? 3 % is 0.03",
  }),
  band_Hz: pair("[lowest, highest] frequency that must be right.", quantity("Hz", "Frequency."), (_, root) =>
    contentBand_Hz(waveformOf(root)),
  ),
  source: sourceShape,
  surroundings: surroundingsShape,
  policy: policyShape,
  generator_Vpp: quantity("V", "Square-wave generator at hand for the slow/fast check, peak to peak.", {
    aboveLeast: true,
    fallback: 20,
    assumable: false,
  }),
});

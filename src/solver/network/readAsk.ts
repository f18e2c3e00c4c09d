import type { HeatAsk, NetworkAsk, Timed, ToleranceAsk } from "./networkForm.ts";
import { type Keyed, number, numbers, object, optional, stop } from "./readForm.ts";

const keys = [
  "reference",
  "frequencies_Hz",
  "elementVoltageAt",
  "times_s",
  "ramp",
  "doubleExponential",
  "halfSine",
  "square",
  "samples",
  "compensation",
  "grading",
  "faults",
  "tolerance",
  "heat",
  "discharge",
];

const greatestTime_s = 1e6;
const greatestFrequency_Hz = 1e13;
const frequencies = (value: unknown, where: string) => numbers(value, where, 0, greatestFrequency_Hz);
const times = (value: unknown, where: string) => numbers(value, where, 0, greatestTime_s);

/** What is asked of a network of n elements; anything not asked is null. */
export function readAsk(value: unknown, n: number): NetworkAsk {
  const raw = object(value, "/ask", keys);
  const part = <T>(key: string, inside: readonly string[], read: (given: Keyed, where: string) => T): T | null =>
    raw[key] === undefined || raw[key] === null ? null : read(object(raw[key], `/ask/${key}`, inside), `/ask/${key}`);
  return {
    reference: reference(raw.reference),
    frequencies_Hz: raw.frequencies_Hz === undefined ? null : frequencies(raw.frequencies_Hz, "/ask/frequencies_Hz"),
    elementVoltageAt: part("elementVoltageAt", ["frequencies_Hz", "peak_V"], (given, where) => ({
      frequencies_Hz: frequencies(given.frequencies_Hz, `${where}/frequencies_Hz`),
      peak_V: number(given.peak_V, `${where}/peak_V`, -1e9, 1e9),
    })),
    times_s: raw.times_s === undefined ? null : times(raw.times_s, "/ask/times_s"),
    ramp: part("ramp", ["riseTime_s", "times_s"], (given, where) => ({
      riseTime_s: number(given.riseTime_s, `${where}/riseTime_s`, 1e-15, greatestTime_s),
      ...timed(given, where),
    })),
    doubleExponential: part(
      "doubleExponential",
      ["amplitude", "alpha_per_s", "beta_per_s", "times_s"],
      (given, where) => ({
        amplitude: number(given.amplitude, `${where}/amplitude`, -1e12, 1e12),
        alpha_per_s: number(given.alpha_per_s, `${where}/alpha_per_s`, 0, 1e15),
        beta_per_s: number(given.beta_per_s, `${where}/beta_per_s`, 0, 1e15),
        ...timed(given, where),
      }),
    ),
    halfSine: part("halfSine", ["duration_s", "times_s"], (given, where) => ({
      duration_s: number(given.duration_s, `${where}/duration_s`, 1e-15, greatestTime_s),
      ...timed(given, where),
    })),
    square: part("square", ["period_s", "duty", "times_s"], (given, where) => ({
      period_s: number(given.period_s, `${where}/period_s`, 1e-15, greatestTime_s),
      duty: number(given.duty, `${where}/duty`, 0, 1),
      ...timed(given, where),
    })),
    samples: part("samples", ["time_s", "value", "times_s"], samples),
    band_Hz: part("compensation", ["band_Hz"], (given, where) => band(given.band_Hz, `${where}/band_Hz`)),
    grading_first_F: part("grading", ["first_F"], (given, where) => number(given.first_F, `${where}/first_F`, 0, 1)),
    faults: flag(raw.faults),
    tolerance: part("tolerance", ["element", "lvArm", "instrument", "k", "samples", "seed"], (given, where) =>
      tolerance(given, where, n),
    ),
    heat: part("heat", heatKeys, (given, where) => heat(given, where, n)),
    discharge_threshold_V: part("discharge", ["threshold_V"], (given, where) =>
      number(given.threshold_V, `${where}/threshold_V`, Number.MIN_VALUE, 1e9),
    ),
  };
}

const timed = (given: Keyed, where: string): Timed => ({ times_s: times(given.times_s, `${where}/times_s`) });

function reference(value: unknown): NetworkAsk["reference"] {
  const given = value ?? "electrode";
  if (given === "electrode" || given === "source") return given;
  return stop("/ask/reference", 'It is neither "electrode" nor "source".', "Name one.");
}

function flag(value: unknown): boolean {
  if (value === undefined || value === null) return false;
  return typeof value === "boolean" ? value : stop("/ask/faults", "It must be true or false.", "Set it to true.");
}

function samples(given: Keyed, where: string): NonNullable<NetworkAsk["samples"]> {
  const time_s = numbers(given.time_s, `${where}/time_s`, 0, greatestTime_s);
  const value = numbers(given.value, `${where}/value`, -1e12, 1e12);
  if (time_s.length === 0) stop(`${where}/time_s`, "It is empty.", "Give at least one point.");
  if (value.length !== time_s.length)
    stop(`${where}/value`, `It has ${value.length} values for ${time_s.length} times.`, "Give one value a time.");
  time_s.forEach((t, i) => {
    if (i > 0 && t < time_s[i - 1]!) stop(`${where}/time_s/${i}`, "It lies before the one ahead of it.", "Sort them.");
  });
  return { time_s, value, ...timed(given, where) };
}

function band(value: unknown, where: string): [number, number] {
  const [low, high, ...rest] = frequencies(value, where);
  if (low === undefined || high === undefined || rest.length > 0 || !(low > 0) || high < low) {
    return stop(where, "It must be two rising frequencies above 0.", "For example [1, 1000000].");
  }
  return [low, high];
}

/** A number for all elements or one an element; missing: zero. */
function perElement(value: unknown, where: string, n: number, least: number, greatest: number): number[] {
  if (!Array.isArray(value)) return new Array<number>(n).fill(optional(value, where, 0, least, greatest));
  if (value.length !== n) stop(where, `It has ${value.length} values for ${n} elements.`, "Give one an element.");
  return numbers(value, where, least, greatest);
}

function tolerance(given: Keyed, where: string, n: number): ToleranceAsk {
  const share = (key: string) => optional(given[key], `${where}/${key}`, 0, 0, 0.999);
  const whole = (key: string, least: number, greatest: number): number | null => {
    if (given[key] === undefined || given[key] === null) return null;
    const found = number(given[key], `${where}/${key}`, least, greatest);
    return Number.isInteger(found) ? found : stop(`${where}/${key}`, "It must be a whole number.", "Round it.");
  };
  return {
    element: perElement(given.element, `${where}/element`, n, 0, 0.999),
    lvArm: share("lvArm"),
    instrument: share("instrument"),
    k: optional(given.k, `${where}/k`, 2, 1e-3, 1e3),
    samples: whole("samples", 1, 1e7),
    seed: whole("seed", 0, 2 ** 53 - 1) ?? 1,
  };
}

const heatKeys = [
  "temperatureCoefficient_per_K",
  "voltageCoefficient_per_V",
  "thermalResistance_K_per_W",
  "ambientRise_K",
  "lvTemperatureCoefficient_per_K",
  "lvVoltageCoefficient_per_V",
  "lvThermalResistance_K_per_W",
];

function heat(given: Keyed, where: string, n: number): HeatAsk {
  const each = (key: string, least: number, greatest: number) =>
    perElement(given[key], `${where}/${key}`, n, least, greatest);
  const one = (key: string, least: number, greatest: number) =>
    optional(given[key], `${where}/${key}`, 0, least, greatest);
  return {
    temperatureCoefficient_per_K: each("temperatureCoefficient_per_K", -1, 1),
    voltageCoefficient_per_V: each("voltageCoefficient_per_V", -1, 1),
    thermalResistance_K_per_W: each("thermalResistance_K_per_W", 0, 1e9),
    ambientRise_K: one("ambientRise_K", -1000, 1000),
    lvTemperatureCoefficient_per_K: one("lvTemperatureCoefficient_per_K", -1, 1),
    lvVoltageCoefficient_per_V: one("lvVoltageCoefficient_per_V", -1, 1),
    lvThermalResistance_K_per_W: one("lvThermalResistance_K_per_W", 0, 1e9),
  };
}

import { err, ok, type Refusal, type Result } from "../quantities/result.ts";
import type { LadderNetwork, Shunt } from "./ladderNetwork.ts";
import type { NetworkAsk } from "./networkForm.ts";

/** A network read from its JSON form, with what is asked of it. */
export interface ReadNetwork {
  readonly network: LadderNetwork;
  readonly voltage_V: number;
  readonly ask: NetworkAsk;
}

class Unusable extends Error {
  constructor(readonly refusal: Refusal) {
    super(refusal.why);
  }
}
const stop = (where: string, why: string, cure: string): never => {
  throw new Unusable({ where, why, cure });
};

type Record_ = Readonly<Record<string, unknown>>;

/** Reads the form; one message names the first key that cannot be used and why. Keys and asks not known are refused by name. */
export function readNetwork(form: unknown): Result<ReadNetwork> {
  try {
    return ok(read(form));
  } catch (error) {
    if (error instanceof Unusable) return err(error.refusal);
    throw error;
  }
}

const known = {
  top: [
    "format",
    "version",
    "elements",
    "strays",
    "lvArm",
    "protector",
    "cable",
    "instrument",
    "seriesProtector",
    "source",
    "ask",
  ],
  ask: ["reference", "frequencies_Hz", "elementVoltageAt", "times_s", "ramp", "compensation", "grading"],
};
const later = ["doubleExponential", "halfSine", "square", "samples", "faults", "tolerance", "heat", "discharge"];

function read(form: unknown): ReadNetwork {
  const top = object(form, "/", known.top);
  if (top.format !== "stringwright-network") stop("/format", 'It must be "stringwright-network".', "Set the format.");
  if (top.version !== 1) stop("/version", "Only version 1 is known.", "Set version to 1.");
  const { elements, strays } = ladder(top);
  const lv = object(top.lvArm ?? {}, "/lvArm", ["resistance_ohm", "capacitance_F", "inductance_H"]);
  zeroOnly(lv.inductance_H, "/lvArm/inductance_H");
  const cable = object(top.cable ?? {}, "/cable", [
    "capacitance_F",
    "impedance_ohm",
    "delay_s",
    "seriesAtTap_ohm",
    "terminationAtEnd_ohm",
  ]);
  for (const key of ["impedance_ohm", "delay_s", "seriesAtTap_ohm", "terminationAtEnd_ohm"])
    absent(cable[key], `/cable/${key}`);
  const instrument = object(top.instrument ?? {}, "/instrument", ["resistance_ohm", "capacitance_F", "protector"]);
  const series = object(top.seriesProtector ?? {}, "/seriesProtector", ["resistance_ohm", "at"]);
  const at = series.at ?? "divider";
  if (at !== "divider" && at !== "instrument")
    stop("/seriesProtector/at", 'It is neither "divider" nor "instrument".', "Name one.");
  const network: LadderNetwork = {
    ...elements,
    ...strays,
    lv: shunt(lv, "/lvArm"),
    protector: shunt(object(top.protector ?? {}, "/protector", shuntKeys), "/protector"),
    cable: { capacitance_F: capacitance(cable.capacitance_F, "/cable/capacitance_F") },
    instrument: {
      ...shunt(instrument, "/instrument"),
      protector: shunt(object(instrument.protector ?? {}, "/instrument/protector", shuntKeys), "/instrument/protector"),
    },
    seriesProtector: {
      resistance_ohm: number(series.resistance_ohm ?? 0, "/seriesProtector/resistance_ohm", 0, 1e15),
      at: at as "divider",
    },
  };
  return { network, voltage_V: source(top.source), ask: asked(top.ask ?? {}) };
}

const shuntKeys = ["resistance_ohm", "capacitance_F"];

function ladder(top: Record_) {
  const list = array(top.elements, "/elements");
  const n = list.length;
  if (n < 1 || n > 5000)
    stop("/elements", `There are ${n} elements; 1 to 5000 are allowed.`, "Use a family of higher voltage.");
  const each = list.map((item, i) => shunt(object(item, `/elements/${i}`, shuntKeys), `/elements/${i}`));
  const given = object(top.strays ?? {}, "/strays", ["toEarth_F", "toElectrode_F", "electrodeToTap_F"]);
  return {
    elements: {
      n,
      resistance_ohm: Float64Array.from(each, (item) => item.resistance_ohm),
      capacitance_F: Float64Array.from(each, (item) => item.capacitance_F),
    },
    strays: {
      toEarth_F: inner(given.toEarth_F, "/strays/toEarth_F", n),
      toElectrode_F: inner(given.toElectrode_F, "/strays/toElectrode_F", n),
      electrodeToTap_F: capacitance(given.electrodeToTap_F, "/strays/electrodeToTap_F"),
    },
  };
}

/** One value an inner node; missing or empty: all zero. */
function inner(value: unknown, where: string, n: number): Float64Array {
  const list = value === undefined || value === null ? [] : array(value, where);
  if (list.length !== 0 && list.length !== n - 1) {
    stop(
      where,
      `It has ${list.length} values; ${n} elements have ${n - 1} inner nodes.`,
      "Give one value an inner node, or none.",
    );
  }
  const values = new Float64Array(n - 1);
  list.forEach((item, i) => {
    values[i] = capacitance(item, `${where}/${i}`);
  });
  return values;
}

function source(value: unknown): number {
  const given = object(value ?? {}, "/source", [
    "voltage_V",
    "resistance_ohm",
    "capacitance_F",
    "inductance_H",
    "damping_ohm",
  ]);
  for (const key of ["resistance_ohm", "capacitance_F", "inductance_H", "damping_ohm"])
    zeroOnly(given[key], `/source/${key}`);
  return number(given.voltage_V ?? 1, "/source/voltage_V", -1e9, 1e9);
}

function asked(value: unknown): NetworkAsk {
  const raw = object(value, "/ask", [...known.ask, ...later]);
  for (const key of later) {
    if (raw[key] !== undefined) stop(`/ask/${key}`, "The program does not compute this yet.", "Leave it out.");
  }
  if (raw.reference !== undefined && raw.reference !== "electrode") {
    stop("/ask/reference", 'Only "electrode" can be asked yet.', 'Set it to "electrode".');
  }
  const at =
    raw.elementVoltageAt === undefined
      ? null
      : object(raw.elementVoltageAt, "/ask/elementVoltageAt", ["frequencies_Hz", "peak_V"]);
  const ramp = raw.ramp === undefined ? null : object(raw.ramp, "/ask/ramp", ["riseTime_s", "times_s"]);
  const compensation =
    raw.compensation === undefined ? null : object(raw.compensation, "/ask/compensation", ["band_Hz"]);
  const grading = raw.grading === undefined ? null : object(raw.grading, "/ask/grading", ["first_F"]);
  return {
    frequencies_Hz:
      raw.frequencies_Hz === undefined ? null : numbers(raw.frequencies_Hz, "/ask/frequencies_Hz", 0, 1e13),
    elementVoltageAt: at && {
      frequencies_Hz: numbers(at.frequencies_Hz, "/ask/elementVoltageAt/frequencies_Hz", 0, 1e13),
      peak_V: number(at.peak_V, "/ask/elementVoltageAt/peak_V", -1e9, 1e9),
    },
    times_s: raw.times_s === undefined ? null : numbers(raw.times_s, "/ask/times_s", 0, 1e6),
    ramp: ramp && {
      riseTime_s: number(ramp.riseTime_s, "/ask/ramp/riseTime_s", 1e-15, 1e6),
      times_s: numbers(ramp.times_s, "/ask/ramp/times_s", 0, 1e6),
    },
    band_Hz: compensation && band(compensation.band_Hz),
    grading_first_F: grading && number(grading.first_F, "/ask/grading/first_F", 0, 1),
  };
}

function band(value: unknown): [number, number] {
  const [low, high, ...rest] = numbers(value, "/ask/compensation/band_Hz", 0, 1e13);
  if (low === undefined || high === undefined || rest.length > 0 || !(low > 0) || high < low) {
    return stop("/ask/compensation/band_Hz", "It must be two rising frequencies above 0.", "For example [1, 1000000].");
  }
  return [low, high];
}

const shunt = (given: Record_, where: string): Shunt => ({
  resistance_ohm:
    given.resistance_ohm === undefined || given.resistance_ohm === null
      ? Number.POSITIVE_INFINITY
      : number(given.resistance_ohm, `${where}/resistance_ohm`, Number.MIN_VALUE, 1e18),
  capacitance_F: capacitance(given.capacitance_F, `${where}/capacitance_F`),
});

const capacitance = (value: unknown, where: string): number =>
  value === undefined || value === null ? 0 : number(value, where, 0, 1);

function zeroOnly(value: unknown, where: string): void {
  if (value === undefined || value === null || value === 0) return;
  stop(where, "The program does not count this yet.", "Leave it out or set it to 0.");
}

function absent(value: unknown, where: string): void {
  if (value === undefined || value === null) return;
  stop(where, "The program does not count a cable as a line yet.", "Give its capacitance_F instead.");
}

function object(value: unknown, where: string, keys: readonly string[]): Record_ {
  if (typeof value !== "object" || value === null || Array.isArray(value))
    return stop(where, "It must be an object.", "See the form.");
  for (const key of Object.keys(value)) {
    if (!keys.includes(key))
      stop(`${where === "/" ? "" : where}/${key}`, "This key is not known here.", `Known: ${keys.join(", ")}.`);
  }
  return value as Record_;
}

function array(value: unknown, where: string): readonly unknown[] {
  return Array.isArray(value) ? value : stop(where, "It must be a list.", "See the form.");
}

function number(value: unknown, where: string, least: number, greatest: number): number {
  if (typeof value !== "number" || !Number.isFinite(value))
    return stop(where, "It must be a finite number.", "Give a number in SI units.");
  if (value < least || value > greatest)
    return stop(where, `${value} is outside ${least} to ${greatest}.`, "Give a value of physical size.");
  return value;
}

const numbers = (value: unknown, where: string, least: number, greatest: number): number[] =>
  array(value, where).map((each, i) => number(each, `${where}/${i}`, least, greatest));

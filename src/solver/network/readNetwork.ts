import { err, ok, type Result } from "../quantities/result.ts";
import type { LadderNetwork, Line, Shunt, Source } from "./ladderNetwork.ts";
import type { NetworkAsk } from "./networkForm.ts";
import { readAsk } from "./readAsk.ts";
import { array, type Keyed, number, object, optional, stop, Unusable } from "./readForm.ts";

/** A network read from its JSON form, with what is asked of it. */
export interface ReadNetwork {
  readonly network: LadderNetwork;
  readonly voltage_V: number;
  readonly ask: NetworkAsk;
}

/** Reads the form; one message names the first key that cannot be used and why. Keys and asks not known are refused by name. */
export function readNetwork(form: unknown): Result<ReadNetwork> {
  try {
    return ok(read(form));
  } catch (error) {
    if (error instanceof Unusable) return err(error.refusal);
    throw error;
  }
}

const keys = {
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
  shunt: ["resistance_ohm", "capacitance_F"],
  source: ["voltage_V", "resistance_ohm", "capacitance_F", "inductance_H", "damping_ohm"],
  line: ["impedance_ohm", "delay_s", "seriesAtTap_ohm", "terminationAtEnd_ohm"],
};

function read(form: unknown): ReadNetwork {
  const top = object(form, "/", keys.top);
  if (top.format !== "stringwright-network") stop("/format", 'It must be "stringwright-network".', "Set the format.");
  if (top.version !== 1) stop("/version", "Only version 1 is known.", "Set version to 1.");
  const { elements, strays } = ladder(top);
  const lv = object(top.lvArm ?? {}, "/lvArm", [...keys.shunt, "inductance_H"]);
  const source = object(top.source ?? {}, "/source", keys.source);
  const network: LadderNetwork = {
    ...elements,
    ...strays,
    lv: { ...shunt(lv, "/lvArm"), inductance_H: inductance(lv.inductance_H, "/lvArm/inductance_H") },
    protector: shunt(object(top.protector ?? {}, "/protector", keys.shunt), "/protector"),
    cable: readCable(top.cable),
    instrument: readInstrument(top.instrument),
    seriesProtector: readSeriesProtector(top.seriesProtector),
    source: readSource(source),
  };
  return {
    network,
    voltage_V: number(source.voltage_V ?? 1, "/source/voltage_V", -1e9, 1e9),
    ask: readAsk(top.ask ?? {}, network.n),
  };
}

function readInstrument(value: unknown): LadderNetwork["instrument"] {
  const instrument = object(value ?? {}, "/instrument", [...keys.shunt, "protector"]);
  const protector = object(instrument.protector ?? {}, "/instrument/protector", keys.shunt);
  return { ...shunt(instrument, "/instrument"), protector: shunt(protector, "/instrument/protector") };
}

function readSeriesProtector(value: unknown): LadderNetwork["seriesProtector"] {
  const series = object(value ?? {}, "/seriesProtector", ["resistance_ohm", "at"]);
  const at = series.at ?? "divider";
  if (at !== "divider" && at !== "instrument")
    return stop("/seriesProtector/at", 'It is neither "divider" nor "instrument".', "Name one.");
  return { resistance_ohm: resistance(series.resistance_ohm, "/seriesProtector/resistance_ohm"), at };
}

/** A line needs both its impedance and its delay; without either the cable is lumped. */
function readCable(value: unknown): LadderNetwork["cable"] {
  const cable = object(value ?? {}, "/cable", ["capacitance_F", ...keys.line]);
  const capacitance_F = capacitance(cable.capacitance_F, "/cable/capacitance_F");
  const given = keys.line.filter((key) => cable[key] !== undefined && cable[key] !== null);
  if (given.length === 0) return { capacitance_F, line: null };
  for (const key of ["impedance_ohm", "delay_s"]) {
    if (!given.includes(key)) stop(`/cable/${key}`, "A line needs it.", "Give impedance_ohm and delay_s.");
  }
  const line: Line = {
    impedance_ohm: number(cable.impedance_ohm, "/cable/impedance_ohm", 1e-3, 1e6),
    delay_s: number(cable.delay_s, "/cable/delay_s", 1e-15, 1),
    seriesAtTap_ohm: resistance(cable.seriesAtTap_ohm, "/cable/seriesAtTap_ohm"),
    terminationAtEnd_ohm: optional(
      cable.terminationAtEnd_ohm,
      "/cable/terminationAtEnd_ohm",
      Number.POSITIVE_INFINITY,
      1e-6,
      1e18,
    ),
  };
  return { capacitance_F, line };
}

const readSource = (source: Keyed): Source => ({
  resistance_ohm: resistance(source.resistance_ohm, "/source/resistance_ohm"),
  capacitance_F: capacitance(source.capacitance_F, "/source/capacitance_F"),
  inductance_H: inductance(source.inductance_H, "/source/inductance_H"),
  damping_ohm: resistance(source.damping_ohm, "/source/damping_ohm"),
});

function ladder(top: Keyed) {
  const list = array(top.elements, "/elements");
  const n = list.length;
  if (n < 1 || n > 5000)
    stop("/elements", `There are ${n} elements; 1 to 5000 are allowed.`, "Use a family of higher voltage.");
  const each = list.map((item, i) => shunt(object(item, `/elements/${i}`, keys.shunt), `/elements/${i}`));
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

/** A shunt resistance: missing is an absent branch; a wire would short the network and is refused. */
const shunt = (given: Keyed, where: string): Shunt => ({
  resistance_ohm: optional(
    given.resistance_ohm,
    `${where}/resistance_ohm`,
    Number.POSITIVE_INFINITY,
    Number.MIN_VALUE,
    1e18,
  ),
  capacitance_F: capacitance(given.capacitance_F, `${where}/capacitance_F`),
});

const capacitance = (value: unknown, where: string): number => optional(value, where, 0, 0, 1e3);
/** A series resistance or inductance: missing or zero is a wire. */
const resistance = (value: unknown, where: string): number => optional(value, where, 0, 0, 1e15);
const inductance = (value: unknown, where: string): number => optional(value, where, 0, 0, 1e3);

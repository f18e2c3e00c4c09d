import { err, ok, type Refusal, type Result } from "../quantities/result.ts";
import { type FieldAsk, type FieldElectrode, type FieldGeometry, noElectrode, usualAsk } from "./fieldGeometry.ts";
import { shapeFault } from "./shapeFault.ts";

/** A geometry read from its JSON form, with what is asked of it. */
export interface ReadField {
  readonly geometry: FieldGeometry;
  readonly ask: FieldAsk;
}

class Unusable extends Error {
  constructor(readonly refusal: Refusal) {
    super(refusal.why);
  }
}
const stop = (where: string, why: string, cure: string): never => {
  throw new Unusable({ where, why, cure });
};

type Given = Readonly<Record<string, unknown>>;

/** Reads the form; one message names the first key that cannot be used and why. Keys not known are refused by name. */
export function readField(form: unknown): Result<ReadField> {
  try {
    const top = object(form, "/", ["format", "version", "geometry", "ask"]);
    if (top.format !== "stringwright-field") stop("/format", 'It must be "stringwright-field".', "Set the format.");
    if (top.version !== 1) stop("/version", "Only version 1 is known.", "Set version to 1.");
    const ask = readAsk(top.ask);
    const geometry = readGeometry(top.geometry);
    const fault = shapeFault(geometry, ask);
    if (fault !== null) return err({ ...fault, where: `/geometry${fault.where}` });
    return ok({ geometry, ask });
  } catch (error) {
    if (error instanceof Unusable) return err(error.refusal);
    throw error;
  }
}

const geometryKeys = [
  "elements",
  "columnDiameter_m",
  "columnLength_m",
  "footHeight_m",
  "bandFraction",
  "electrode",
  "shield",
  "box",
  "wallDistance_m",
  "potting",
  "wire",
];
const least_m = 1e-6;
const greatest_m = 1e4;
/** Columns of more elements would take minutes. */
const mostElements = 500;

function readGeometry(value: unknown): FieldGeometry {
  const at = "/geometry";
  const given = object(value, at, geometryKeys);
  const length = (key: string) => number(given[key], `${at}/${key}`, least_m, greatest_m);
  const elements = number(given.elements, `${at}/elements`, 1, mostElements);
  if (!Number.isInteger(elements)) stop(`${at}/elements`, `${elements} is not a whole number.`, "Count the elements.");
  const geometry: FieldGeometry = {
    elements,
    columnDiameter_m: length("columnDiameter_m"),
    columnLength_m: length("columnLength_m"),
    footHeight_m: length("footHeight_m"),
    bandFraction: number(given.bandFraction ?? 0.4, `${at}/bandFraction`, 0.01, 0.99),
    electrode: readElectrode(given.electrode),
    shield: readParts(given.shield, `${at}/shield`, ["radius_m", "from_m", "to_m"]) as FieldGeometry["shield"],
    box: readParts(given.box, `${at}/box`, ["radius_m", "top_m"]) as FieldGeometry["box"],
    wallDistance_m:
      given.wallDistance_m === undefined || given.wallDistance_m === null ? null : length("wallDistance_m"),
    potting: readPotting(given.potting),
    wire: readParts(given.wire, `${at}/wire`, ["radius_m", "length_m"]) as NonNullable<FieldGeometry["wire"]> | null,
  };
  const slender = geometry.columnLength_m / geometry.columnDiameter_m;
  if (slender < 0.1 || slender > 1000)
    stop(
      `${at}/columnDiameter_m`,
      `Length over diameter is ${slender}; 0.1 to 1000 is allowed.`,
      "Check both lengths.",
    );
  return geometry;
}

function readPotting(value: unknown): NonNullable<FieldGeometry["potting"]> | null {
  if (value === undefined || value === null) return null;
  const at = "/geometry/potting";
  const given = object(value, at, ["permittivity", "radius_m"]);
  return {
    permittivity: number(given.permittivity, `${at}/permittivity`, 1, 100),
    radius_m: number(given.radius_m, `${at}/radius_m`, least_m, greatest_m),
  };
}

const needs = {
  none: [],
  sphere: ["radius_m"],
  toroid: ["radius_m", "tubeRadius_m"],
  disc: ["radius_m", "thickness_m"],
} as const;

/** Keys that the kind does not use are checked as numbers and left out. */
function readElectrode(value: unknown): FieldElectrode {
  if (value === undefined || value === null) return noElectrode;
  const at = "/geometry/electrode";
  const given = object(value, at, ["kind", "radius_m", "tubeRadius_m", "thickness_m", "offset_m"]);
  const kind = given.kind;
  if (kind !== "none" && kind !== "sphere" && kind !== "toroid" && kind !== "disc")
    return stop(`${at}/kind`, 'It is none of "none", "sphere", "toroid", "disc".', "Name one.");
  const size = (key: "radius_m" | "tubeRadius_m" | "thickness_m") => {
    const used = (needs[kind] as readonly string[]).includes(key);
    if (!used && (given[key] === undefined || given[key] === null)) return 0;
    const read = number(given[key], `${at}/${key}`, used ? least_m : 0, greatest_m);
    return used ? read : 0;
  };
  const offset = number(given.offset_m ?? 0, `${at}/offset_m`, -greatest_m, greatest_m);
  return {
    kind,
    radius_m: size("radius_m"),
    tubeRadius_m: size("tubeRadius_m"),
    thickness_m: size("thickness_m"),
    offset_m: kind === "toroid" ? offset : 0,
  };
}

/** A part of lengths, all of them needed; missing or null: there is none. Heights over the floor may be 0. */
function readParts(value: unknown, at: string, keys: readonly string[]): Record<string, number> | null {
  if (value === undefined || value === null) return null;
  const given = object(value, at, keys);
  return Object.fromEntries(
    keys.map((key) => [key, number(given[key], `${at}/${key}`, key === "from_m" ? 0 : least_m, greatest_m)]),
  );
}

function readAsk(value: unknown): FieldAsk {
  const given = object(value ?? {}, "/ask", ["idealisation", "resolution", "wall"]);
  const { idealisation = usualAsk.idealisation, wall = usualAsk.wall } = given;
  if (idealisation !== "bands" && idealisation !== "distributed")
    return stop("/ask/idealisation", 'It is neither "bands" nor "distributed".', "Name one.");
  if (wall !== "round" && wall !== "plane") return stop("/ask/wall", 'It is neither "round" nor "plane".', "Name one.");
  const resolution = number(given.resolution ?? usualAsk.resolution, "/ask/resolution", 0.5, 4);
  return { idealisation, resolution, wall };
}

function object(value: unknown, where: string, keys: readonly string[]): Given {
  if (typeof value !== "object" || value === null || Array.isArray(value))
    return stop(where, "It must be an object.", "See the form.");
  for (const key of Object.keys(value)) {
    if (!keys.includes(key))
      stop(`${where === "/" ? "" : where}/${key}`, "This key is not known here.", `Known: ${keys.join(", ")}.`);
  }
  return value as Given;
}

function number(value: unknown, where: string, least: number, greatest: number): number {
  if (typeof value !== "number" || !Number.isFinite(value))
    return stop(where, "It must be a finite number.", "Give a number in SI units.");
  if (value < least || value > greatest)
    return stop(where, `${value} is outside ${least} to ${greatest}.`, "Give a value of physical size.");
  return value;
}

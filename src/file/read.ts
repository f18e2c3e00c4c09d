/** Reads any value by its description: fills what is missing, repairs what is wrong, drops what cannot be read, notes it all. */
import { cleaned, cleanedText, safeKey } from "./clean.ts";
import { escapeKey } from "./pointer.ts";
import { isObject, Lost, type Place, type Reading } from "./reading.ts";
import { readNumber } from "./readNumber.ts";
import {
  type ChoiceSpec,
  type FlagSpec,
  fallbackOf,
  type ListSpec,
  type MapSpec,
  type ObjectSpec,
  type PairSpec,
  type Raw,
  type Spec,
  type TextSpec,
  type VariantSpec,
} from "./shape.ts";

export const below = (place: Place, key: string | number): Place => ({
  from: `${place.from}/${escapeKey(key)}`,
  to: `${place.to}/${escapeKey(key)}`,
});

export function read(spec: Spec, value: unknown, place: Place, parent: Raw, reading: Reading): unknown {
  switch (spec.kind) {
    case "number":
      return readNumber(spec, value, place, parent, reading);
    case "text":
      return readText(spec, value, place, parent, reading);
    case "choice":
      return readChoice(spec, value, place, parent, reading);
    case "flag":
      return readFlag(spec, value, place, reading);
    case "list":
      return readList(spec, value, place, reading);
    case "pair":
      return readPair(spec, value, place, parent, reading);
    case "object":
      return spec.nullable ? readNullable(spec, value, place, reading) : readObject(spec, value, place, reading);
    case "variant":
      return readVariant(spec, value, place, reading);
    case "map":
      return readMap(spec, value, place, reading);
    case "literal":
      if (value !== undefined && value !== spec.value) {
        reading.repair(
          place.from,
          "replaced",
          `Only ${JSON.stringify(spec.value)} can stand here`,
          "it does now",
          value,
        );
      }
      return spec.value;
    case "any":
      return cleaned(value ?? null, place.from, reading);
  }
}

function readText(spec: TextSpec, value: unknown, place: Place, parent: Raw, reading: Reading): string | null | Lost {
  if (typeof value === "string") {
    const clean = cleanedText(value, place.from, reading);
    if (clean.length <= spec.longest) return clean;
    reading.repair(
      place.from,
      "replaced",
      `The text is longer than ${spec.longest} characters`,
      "the rest is cut off",
      value,
    );
    return cleanedText(clean.slice(0, spec.longest), place.from, reading);
  }
  const missing = value === undefined || value === null;
  if (value === null && spec.nullable) return null;
  const instead = fallbackOf(spec.fallback, parent, reading.root);
  if (instead === undefined) return new Lost(place.from, "A text belongs here", value);
  if (!missing) reading.repair(place.from, "replaced", "A text belongs here", nowText(instead), value);
  reading.fill(place, false);
  return instead;
}

const nowText = (text: string | null): string => (text === null ? "there is none now" : `it is “${text}” now`);

function readChoice(spec: ChoiceSpec, value: unknown, place: Place, parent: Raw, reading: Reading): string | Lost {
  if (typeof value === "string" && Object.hasOwn(spec.values, value)) return value;
  const missing = value === undefined || value === null;
  const instead = fallbackOf(spec.fallback, parent, reading.root);
  const why = `One of ${Object.keys(spec.values).join(", ")} belongs here`;
  if (instead === undefined) return new Lost(place.from, why, value);
  if (!missing) reading.repair(place.from, "replaced", why, `${instead} stands there now`, value);
  reading.fill(place, spec.assumable);
  return instead;
}

function readFlag(spec: FlagSpec, value: unknown, place: Place, reading: Reading): boolean | Lost {
  if (typeof value === "boolean") return value;
  const missing = value === undefined || value === null;
  if (spec.fallback === undefined) return new Lost(place.from, "true or false belongs here", value);
  if (!missing) {
    reading.repair(place.from, "replaced", "true or false belongs here", `${spec.fallback} stands there now`, value);
  }
  reading.fill(place, spec.assumable);
  return spec.fallback;
}

function readPair(spec: PairSpec, value: unknown, place: Place, parent: Raw, reading: Reading): unknown {
  if (Array.isArray(value) && value.length === 2) {
    const [low, high] = value.map((v) => readNumber({ ...spec.item, fallback: undefined }, v, place, parent, reading));
    if (typeof low === "number" && typeof high === "number") {
      if (low <= high) return [low, high];
      reading.repair(place.from, "replaced", "The lowest stands after the highest", "they are exchanged", value);
      return [high, low];
    }
  }
  const instead = fallbackOf(spec.fallback, parent, reading.root)!;
  if (value !== undefined && value !== null) {
    reading.repair(
      place.from,
      "replaced",
      "Two numbers belong here, lowest and highest",
      `[${instead}] stands there now`,
      value,
    );
  }
  reading.fill(place, true);
  return instead;
}

function readList(spec: ListSpec, value: unknown, place: Place, reading: Reading): unknown {
  if (value === undefined || value === null) {
    if (spec.optional) return undefined;
    reading.fill(place, false);
    return [];
  }
  if (!Array.isArray(value)) {
    reading.repair(place.from, "replaced", "A list belongs here", "it is empty now", value);
    return [];
  }
  if (value.length > spec.longest) {
    return new Lost(
      place.from,
      `The list has ${value.length} entries, more than the ${spec.longest} that can be handled`,
      null,
    );
  }
  const kept: unknown[] = [];
  value.forEach((raw, i) => {
    const at = { from: `${place.from}/${i}`, to: `${place.to}/${kept.length}` };
    const item = reading.attempt(() => readItem(spec.item, raw, at, reading));
    if (item instanceof Lost) {
      reading.repair(item.from, "dropped", item.why, `entry ${i + 1} of the list is left out`, item.was ?? raw);
      reading.moved.push({ from: at.from, to: null });
      return;
    }
    if (at.from !== at.to) reading.moved.push(at);
    kept.push(item);
  });
  return kept;
}

/** Defaults stand in for an object that is missing, never for an item of a list that is something else. */
const readItem = (spec: Spec, raw: unknown, at: Place, reading: Reading): unknown =>
  spec.kind === "object" && !isObject(raw)
    ? new Lost(at.from, "An object belongs here", raw)
    : read(spec, raw, at, {}, reading);

function readNullable(spec: ObjectSpec, value: unknown, place: Place, reading: Reading): unknown {
  if (value === undefined || value === null) return null;
  const found = isObject(value)
    ? reading.attempt(() => readObject(spec, value, place, reading))
    : new Lost(place.from, "An object belongs here", value);
  if (!(found instanceof Lost)) return found;
  reading.repair(found.from, "dropped", found.why, `${place.from} is left out as a whole`, found.was);
  reading.moved.push({ from: place.from, to: null });
  return null;
}

export function readObject(spec: ObjectSpec, value: unknown, place: Place, reading: Reading): unknown {
  const raw = isObject(value) ? unaliased(spec, value) : {};
  if (!isObject(value) && value !== undefined && value !== null) {
    reading.repair(place.from, "replaced", "An object belongs here", "it holds defaults now", value);
  }
  const found: Record<string, unknown> = {};
  for (const [key, field] of Object.entries(spec.fields)) {
    const item = read(
      field,
      Object.hasOwn(raw, key) ? raw[key] : undefined,
      below(place, key),
      { ...raw, ...found },
      reading,
    );
    if (item instanceof Lost) return item;
    if (item !== undefined) found[key] = item;
  }
  for (const [key, item] of Object.entries(raw)) {
    if (Object.hasOwn(spec.fields, key)) continue;
    const at = `${place.from}/${escapeKey(key)}`;
    const safe = safeKey(key, at, item, reading);
    if (safe !== null && !Object.hasOwn(found, safe)) found[safe] = cleaned(item, at, reading);
  }
  return found;
}

/** Short names that a file written by hand may use. */
function unaliased(spec: ObjectSpec, raw: Raw): Raw {
  const entries = Object.entries(raw);
  if (!entries.some(([key]) => Object.hasOwn(spec.aliases, key))) return raw;
  return Object.fromEntries(
    entries.flatMap(([key, value]) => {
      const full = Object.hasOwn(spec.aliases, key) ? spec.aliases[key]! : key;
      return full !== key && Object.hasOwn(raw, full) ? [] : [[full, value]];
    }),
  );
}

function readVariant(spec: VariantSpec, value: unknown, place: Place, reading: Reading): unknown {
  if (!isObject(value)) return new Lost(place.from, "An object belongs here", value);
  const name = spec.pick(value);
  const option = name !== null && Object.hasOwn(spec.options, name) ? spec.options[name] : undefined;
  if (option === undefined) return new Lost(place.from, `What it is cannot be told: it needs ${spec.toldBy}`, value);
  return readObject(option, value, place, reading);
}

function readMap(spec: MapSpec, value: unknown, place: Place, reading: Reading): unknown {
  const kept: Record<string, unknown> = {};
  if (value === undefined || value === null) return kept;
  if (!isObject(value)) {
    reading.repair(place.from, "replaced", "An object belongs here", "it is empty now", value);
    return kept;
  }
  for (const [key, raw] of Object.entries(value)) {
    const at = below(place, key);
    const item = key.startsWith("/")
      ? read(spec.value, raw, at, value, reading)
      : new Lost(at.from, "The key is no JSON pointer", raw);
    if (item instanceof Lost) reading.repair(at.from, "dropped", item.why, "it is left out", raw);
    else kept[cleanedText(key, at.from, reading)] = item;
  }
  return kept;
}

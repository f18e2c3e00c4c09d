/** What no single key can tell: ids that clash, a principal instrument that is not there, origins that moved. */
import type { DividerDocument, Instrument, Origin, Part } from "../solver/index.ts";
import { instrumentShape } from "./instrumentShape.ts";
import { isAtOrBelow } from "./pointer.ts";
import { read } from "./read.ts";
import type { Reading } from "./reading.ts";
import { scaleFactorFor } from "./scaleFactorFor.ts";

export function settled(document: DividerDocument, reading: Reading): DividerDocument {
  const parts = withOwnIds<Part>(document.parts, "/parts", "part", reading);
  const named = withOwnIds<Instrument>(document.instruments, "/instruments", "instrument", reading);
  const instruments = named.length > 0 ? named : [substitute(reading)];
  const principal = principalOf(document.principal, instruments, reading);
  const whole = { ...document, parts, instruments, principal };
  return withOrigins(withScaleFactor(whole, reading), reading);
}

function withOwnIds<T extends { readonly id: string }>(
  items: readonly T[],
  pointer: string,
  stem: string,
  reading: Reading,
): readonly T[] {
  const taken = new Set(items.map((item) => item.id));
  const seen = new Set<string>();
  return items.map((item, i) => {
    if (item.id !== "" && !seen.has(item.id)) {
      seen.add(item.id);
      return item;
    }
    const base = item.id === "" ? stem : item.id;
    let n = item.id === "" ? i + 1 : 2;
    while (taken.has(`${base}-${n}`)) n += 1;
    const id = `${base}-${n}`;
    taken.add(id);
    seen.add(id);
    const why = item.id === "" ? "It had no id" : `The id ${item.id} stood twice`;
    reading.repair(`${pointer}/${i}/id`, "renamed", why, `it is ${id} now`, item.id);
    return { ...item, id };
  });
}

function substitute(reading: Reading): Instrument {
  reading.repair(
    "/instruments",
    "replaced",
    "No instrument could be read",
    "a hand-held meter stands in, all of it assumed",
    [],
  );
  const place = { from: "/instruments/0", to: "/instruments/0" };
  const raw = { id: "meter", name: "hand-held meter, assumed" };
  return read(instrumentShape, raw, place, {}, reading) as Instrument;
}

function principalOf(id: string, instruments: readonly Instrument[], reading: Reading): string {
  if (instruments.some((instrument) => instrument.id === id)) return id;
  const first = instruments[0]!.id;
  if (id !== "") {
    reading.repair(
      "/principal",
      "replaced",
      `There is no instrument ${id}`,
      `${first} is the principal instrument now`,
      id,
    );
  }
  return first;
}

/** A scale factor that had to be filled in is chosen for the principal instrument rather than taken blindly. */
function withScaleFactor(document: DividerDocument, reading: Reading): DividerDocument {
  if (!reading.filled.includes("/brief/scaleFactor")) return document;
  const instrument = document.instruments.find((one) => one.id === document.principal)!;
  return {
    ...document,
    brief: { ...document.brief, scaleFactor: scaleFactorFor(document.brief.waveform, instrument) },
  };
}

function withOrigins(document: DividerDocument, reading: Reading): DividerDocument {
  const origins: Record<string, Origin> = moved(document.origins, reading);
  for (const pointer of reading.assumed) origins[pointer] = "assumed";
  return { ...document, origins: sorted(origins), typed: sorted(moved(document.typed, reading)) };
}

/** In the order in which they are saved. */
const sorted = <T>(entries: Readonly<Record<string, T>>): Record<string, T> =>
  Object.fromEntries(Object.entries(entries).sort(([a], [b]) => (a < b ? -1 : 1)));

/** Entries under a dropped item go with it; those under an item that moved up follow it. */
function moved<T>(entries: Readonly<Record<string, T>>, reading: Reading): Record<string, T> {
  if (reading.moved.length === 0) return { ...entries };
  const found: Record<string, T> = {};
  for (const [pointer, value] of Object.entries(entries)) {
    const at = movedPointer(pointer, reading);
    if (at !== null) found[at] = value;
  }
  return found;
}

function movedPointer(pointer: string, reading: Reading): string | null {
  const hits = reading.moved.filter((move) => isAtOrBelow(pointer, move.from));
  if (hits.some((move) => move.to === null)) return null;
  const deepest = hits.reduce<(typeof hits)[number] | null>(
    (best, move) => (best === null || move.from.length > best.from.length ? move : best),
    null,
  );
  return deepest === null ? pointer : deepest.to + pointer.slice(deepest.from.length);
}

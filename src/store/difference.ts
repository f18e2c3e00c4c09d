/** What changes one document into another, as a list of pointers and values: how the history is kept in little space. */
import { escapeKey, keysOf } from "../file/pointer.ts";

/** No `value`: the key is taken out. */
export interface Difference {
  readonly pointer: string;
  readonly value?: unknown;
}

const isRecord = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === "object" && value !== null && !Array.isArray(value);

/** Shared parts are told by being the same object; lists of another length are taken whole. */
export function differences(from: unknown, to: unknown, at = ""): readonly Difference[] {
  if (from === to) return [];
  if (Array.isArray(from) && Array.isArray(to) && from.length === to.length) {
    return to.flatMap((item, i) => differences(from[i], item, `${at}/${i}`));
  }
  if (!isRecord(from) || !isRecord(to)) return [{ pointer: at, value: to }];
  const gone = Object.keys(from).filter((key) => !Object.hasOwn(to, key));
  return [
    ...gone.map((key) => ({ pointer: `${at}/${escapeKey(key)}` })),
    ...Object.keys(to).flatMap((key) => {
      const pointer = `${at}/${escapeKey(key)}`;
      return Object.hasOwn(from, key) ? differences(from[key], to[key], pointer) : [{ pointer, value: to[key] }];
    }),
  ];
}

/** Throws when a pointer leads nowhere: the list was made for another document. */
export function applied<T>(root: T, list: readonly Difference[]): T {
  return list.reduce<unknown>((here, one) => put(here, keysOf(one.pointer)!, one), root) as T;
}

function put(here: unknown, keys: readonly string[], one: Difference): unknown {
  const [key, ...rest] = keys;
  if (key === undefined) return one.value;
  if (Array.isArray(here)) {
    if (!(Number(key) < here.length)) throw new RangeError(`no item ${key}`);
    return here.map((item, i) => (i === Number(key) ? put(item, rest, one) : item));
  }
  if (!isRecord(here)) throw new RangeError(`nothing at ${key}`);
  if (rest.length === 0 && !("value" in one))
    return Object.fromEntries(Object.entries(here).filter(([k]) => k !== key));
  if (rest.length > 0 && !Object.hasOwn(here, key)) throw new RangeError(`no key ${key}`);
  return { ...here, [key]: put(here[key], rest, one) };
}

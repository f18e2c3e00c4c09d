/** JSON pointers (RFC 6901) into a document: read, and change without mutating. */
export const escapeKey = (key: string | number): string => String(key).replaceAll("~", "~0").replaceAll("/", "~1");
const unescapeKey = (key: string): string => key.replaceAll("~1", "/").replaceAll("~0", "~");

/** `/a/b~1c` -> ["a", "b/c"]; the empty pointer is the whole document; null when it is no pointer. */
export function keysOf(pointer: string): readonly string[] | null {
  if (pointer === "") return [];
  if (!pointer.startsWith("/")) return null;
  return pointer.slice(1).split("/").map(unescapeKey);
}

/** True when `pointer` is `ancestor` or lies below it. */
export const isAtOrBelow = (pointer: string, ancestor: string): boolean =>
  pointer === ancestor || pointer.startsWith(`${ancestor}/`);

/** The value at a pointer, undefined where there is none. */
export function valueAt(root: unknown, pointer: string): unknown {
  const keys = keysOf(pointer);
  if (keys === null) return undefined;
  let here: unknown = root;
  for (const key of keys) {
    if (typeof here !== "object" || here === null || !Object.hasOwn(here, key)) return undefined;
    here = (here as Record<string, unknown>)[key];
  }
  return here;
}

const indexOf = (key: string, length: number): number | null => {
  if (key === "-") return length;
  return /^(0|[1-9]\d*)$/.test(key) && Number(key) <= length ? Number(key) : null;
};

function changed(here: unknown, keys: readonly string[], change: (old: unknown) => unknown): unknown {
  const [key, ...rest] = keys;
  if (key === undefined) return change(here);
  if (typeof here !== "object" || here === null || key === "__proto__") return undefined;
  if (Array.isArray(here)) {
    const index = indexOf(key, here.length);
    if (index === null || (rest.length > 0 && index === here.length)) return undefined;
    const item = changed(here[index], rest, change);
    return item === undefined ? undefined : [...here.slice(0, index), item, ...here.slice(index + 1)];
  }
  const old = Object.hasOwn(here, key) ? (here as Record<string, unknown>)[key] : undefined;
  const value = changed(old, rest, change);
  return value === undefined ? undefined : { ...here, [key]: value };
}

/** A copy of `root` with `value` at `pointer` (`-` appends to an array); undefined when the pointer leads nowhere. */
export function withValueAt<T>(root: T, pointer: string, value: unknown): T | undefined {
  const keys = keysOf(pointer);
  return keys === null ? undefined : (changed(root, keys, () => value) as T | undefined);
}

/** A copy of `root` without the array item at `pointer`; undefined when there is none. */
export function withoutItemAt<T>(root: T, pointer: string): T | undefined {
  const keys = keysOf(pointer);
  const last = keys?.at(-1);
  if (keys === null || last === undefined) return undefined;
  return changed(root, keys.slice(0, -1), (list) => {
    if (!Array.isArray(list)) return undefined;
    const index = indexOf(last, list.length - 1);
    return index === null || last === "-" ? undefined : list.filter((_, i) => i !== index);
  }) as T | undefined;
}

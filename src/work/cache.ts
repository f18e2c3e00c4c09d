import type { DividerDocument, Result, Sizing } from "../solver/index.ts";

/** Keeps the results last used, at most `most` of them. */
export class Cache<T> {
  readonly #kept = new Map<string, T>();
  readonly #most: number;
  constructor(most: number) {
    this.#most = most;
  }

  get(key: string, make: () => T): T {
    const value = this.#kept.has(key) ? (this.#kept.get(key) as T) : make();
    this.#kept.delete(key);
    this.#kept.set(key, value);
    for (const oldest of this.#kept.keys()) {
      if (this.#kept.size <= this.#most) break;
      this.#kept.delete(oldest);
    }
    return value;
  }

  get size(): number {
    return this.#kept.size;
  }
}

/** The same text for the same value, whatever the order of its keys. A text rather than a digest: two inputs never share it. */
export function canonical(value: unknown): string {
  return JSON.stringify(value, (_, item: unknown) =>
    typeof item === "object" && item !== null && !Array.isArray(item)
      ? Object.fromEntries(Object.entries(item).sort(([a], [b]) => (a < b ? -1 : 1)))
      : item,
  );
}

/** What a search depends on: of the design only its protectors and a stated foot height; not the name or the typed texts. */
export const sizingKey = (document: DividerDocument, top: number): string => {
  const { brief, parts, instruments, principal, origins } = document;
  return canonical([brief, parts, instruments, principal, ownOrigins(origins), keptOfDesign(document), top]);
};

/** Fitted protectors, inductances, and the foot height where it is stated rather than drawn by the search. */
function keptOfDesign({ design, origins, typed }: DividerDocument): unknown {
  const pointer = "/design/geometry/footHeight_m";
  const stated = typed[pointer] !== undefined || origins[pointer] === "typed" || origins[pointer] === "measured";
  const { inductance_H = 0, damping_ohm = 0 } = design?.lead ?? {};
  const inductances = [inductance_H, damping_ohm, design?.lvArm.inductance_H ?? 0];
  return [design?.protectors ?? [], inductances, stated ? design?.geometry.footHeight_m : null];
}

const ownOrigins = (origins: DividerDocument["origins"]): DividerDocument["origins"] =>
  Object.fromEntries(Object.entries(origins).filter(([pointer]) => !pointer.startsWith("/design")));

type Size = (document: DividerDocument, options: { readonly top: number }) => Result<Sizing>;

/** `size` that answers from memory when nothing it depends on has changed. */
export function cachedSize(size: Size, most = 24): Size {
  const cache = new Cache<Result<Sizing>>(most);
  return (document, options) => cache.get(sizingKey(document, options.top), () => size(document, options));
}

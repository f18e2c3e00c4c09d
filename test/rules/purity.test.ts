/** The solver answers without clock, chance or page: all three throw while every demo is sized and proved. */
import { readdirSync, readFileSync } from "node:fs";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { restoreDocument } from "../../src/file/restore.ts";
import { partsList, prove, size } from "../../src/solver/index.ts";

const folder = new URL("../../demo/", import.meta.url);
const demos = readdirSync(folder).filter((name) => name.endsWith(".json"));
const trap = (what: string) => () => {
  throw new Error(`the solver touched ${what}`);
};

/** Calling, constructing and reading it all throw. */
const shut = (name: string) =>
  vi.stubGlobal(name, new Proxy(class {}, { apply: trap(name), construct: trap(name), get: trap(name) }));

describe("purity", () => {
  it("is told by a trap that springs", () => {
    expect(() => Math.random()).toThrow("Math.random");
    expect(() => new Date()).toThrow("Date");
    expect(() => Date.now()).toThrow("Date");
    expect(() => performance.now()).toThrow("performance");
  });
  beforeEach(() => {
    vi.spyOn(Math, "random").mockImplementation(trap("Math.random"));
    for (const name of ["Date", "performance", "crypto", "fetch", "setTimeout", "queueMicrotask"]) shut(name);
  });
  afterEach(() => {
    vi.unstubAllGlobals();
    vi.restoreAllMocks();
  });
  it.each(demos)("of %s: sized, proved and listed, twice alike", (name) => {
    const restored = restoreDocument(readFileSync(new URL(name, folder), "utf8"));
    if (restored.kind === "refused") throw new Error(restored.refusal.why);
    expect(restored.repairs).toEqual([]);
    const frozen = deepFreeze(restored.document);
    expect(size(frozen, { top: 3 })).toEqual(size(frozen, { top: 3 }));
    const proof = prove(frozen);
    expect(proof).toEqual(prove(frozen));
    expect(structuredClone(proof)).toEqual(proof);
    expect(notFinite(proof, "")).toEqual([]);
    expect(partsList(frozen).ok).toBe(true);
  });
});

function deepFreeze<T>(value: T): T {
  if (typeof value === "object" && value !== null) {
    Object.values(value).forEach(deepFreeze);
    Object.freeze(value);
  }
  return value;
}

/** Paths of numbers that are none. */
function notFinite(value: unknown, path: string): string[] {
  if (typeof value === "number") return Number.isFinite(value) ? [] : [path];
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([key, each]) => notFinite(each, `${path}/${key}`));
}

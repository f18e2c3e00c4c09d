/** Any document that restores is answered: numbers, texts and nulls put anywhere in a demo end in exit 0, 1 or 2, never in a throw. */
import { readdirSync, readFileSync } from "node:fs";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { run } from "../../src/cli/run.ts";

const folder = new URL("../../demo/", import.meta.url);
const demos = Object.fromEntries(
  readdirSync(folder)
    .filter((name) => name.endsWith(".json"))
    .map((name) => [name, readFileSync(new URL(name, folder), "utf8")]),
);

/** Paths of every leaf, the elements of a string counted once. */
function leaves(value: unknown, path: readonly string[] = []): string[][] {
  if (typeof value !== "object" || value === null) return [[...path]];
  return Object.entries(value)
    .slice(0, Array.isArray(value) && path.at(-1) === "elements" ? 2 : undefined)
    .flatMap(([key, each]) => leaves(each, [...path, key]));
}
function put(text: string, path: readonly string[], value: unknown): string {
  const raw = JSON.parse(text);
  let at = raw;
  for (const key of path.slice(0, -1)) at = at[key];
  at[path.at(-1)!] = value;
  return JSON.stringify(raw);
}
async function shell(words: readonly string[], text: string) {
  let out = "";
  let said = "";
  const code = await run(words, {
    read: () => text,
    print: (each) => {
      out += each;
    },
    say: (each) => {
      said += each;
    },
  });
  return { code, out, said };
}

const odd = fc.oneof(
  fc.constantFrom<unknown>(null, 0, -1, 1e-30, 1e-12, 1e-6, 1, 1e3, 1e6, 1e12, 1e30, "", "x", "6k", true, [], {}),
  fc.double({ min: -20, max: 20, noNaN: true }).map((exponent) => 10 ** exponent),
);
const names = Object.keys(demos);
const spoilt = fc.constantFrom(...names).chain((name) => {
  const paths = leaves(JSON.parse(demos[name]!)).filter(([top]) => top !== "origins" && top !== "typed");
  const change = fc.tuple(fc.constantFrom(...paths), odd);
  return fc.record({ name: fc.constant(name), changes: fc.array(change, { minLength: 1, maxLength: 3 }) });
});

describe("a demo with odd values in it", () => {
  it.each([[["prove"]], [["parts"]], [["size", "--top", "1"]]])("%j", async (words) => {
    await fc.assert(
      fc.asyncProperty(spoilt, async ({ name, changes }) => {
        const document = changes.reduce((each, [path, value]) => put(each, path, value), demos[name]!);
        const { code, out, said } = await shell([words[0]!, "file", ...words.slice(1)], document);
        expect([0, 1, 2]).toContain(code);
        if (code === 2) expect(said).not.toBe("");
        else expect(out).not.toBe("");
        expect(out).not.toMatch(/NaN|Infinity|undefined/);
        expect(said).not.toMatch(/NaN|Infinity|undefined/);
      }),
      { numRuns: words[0] === "size" ? 12 : 40 },
    );
  });

  const judged = [
    "element.voltage.peak",
    "element.dissipation",
    "clearance.column",
    "creepage.column",
    "creepage.element",
    "instrument.input",
    "instrument.range",
  ];
  it("is never without a stop while a check was left out", async () => {
    await fc.assert(
      fc.asyncProperty(spoilt, async ({ name, changes }) => {
        const document = changes.reduce((each, [path, value]) => put(each, path, value), demos[name]!);
        const { code, out } = await shell(["prove", "file"], document);
        if (code !== 0) return;
        const proof = JSON.parse(out);
        const ids: string[] = proof.findings.map((each: { id: string }) => each.id.replace(/\.notStated$/, ""));
        for (const id of judged) expect(ids).toContain(id);
        expect(proof.scaleFactor.predicted).toBeGreaterThan(1);
      }),
      { numRuns: 40 },
    );
  });
});

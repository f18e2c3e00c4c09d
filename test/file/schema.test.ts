import { existsSync, readdirSync, readFileSync } from "node:fs";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { encodeDocument } from "../../src/file/encode.ts";
import { valueAt, withValueAt } from "../../src/file/pointer.ts";
import { restoreDocument, restoreValue } from "../../src/file/restore.ts";
import { documentSchema, type JsonSchema } from "../../src/file/schema.ts";
import { inventedDesign, inventedStart } from "./invented.ts";
import { faults } from "./jsonSchema.ts";

const schema = documentSchema();
const demo = new URL("../../demo/", import.meta.url);
const demos = existsSync(demo) ? readdirSync(demo).filter((name) => name.endsWith(".json")) : [];

/** Pointers of every key and list item of a value. */
function pointers(value: unknown, at = ""): readonly string[] {
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([key, item]) => [`${at}/${key}`, ...pointers(item, `${at}/${key}`)]);
}

/** Pointers that the schema describes for a value that is there. */
function described(part: JsonSchema, value: unknown, at = ""): readonly string[] {
  const options = (part.anyOf as readonly JsonSchema[] | undefined) ?? [part];
  const fits = options.find((option) => faults(option, value).length === 0);
  const found: string[] = [];
  for (const [key, item] of Object.entries((fits?.properties as Record<string, JsonSchema>) ?? {})) {
    if (typeof value !== "object" || value === null || !Object.hasOwn(value, key)) continue;
    found.push(`${at}/${key}`, ...described(item, (value as Record<string, unknown>)[key], `${at}/${key}`));
  }
  const items = fits?.items as JsonSchema | undefined;
  if (items !== undefined && Array.isArray(value)) {
    value.forEach((item, i) => {
      found.push(`${at}/${i}`, ...described(items, item, `${at}/${i}`));
    });
  }
  return found;
}

describe("the published schema", () => {
  it("is the one in the public folder", async () => {
    await expect(`${JSON.stringify(schema, null, 2)}\n`).toMatchFileSnapshot("../../public/stringwright.schema.json");
  });

  it.each([
    ["a new document", inventedStart()],
    ["one with a design", inventedDesign()],
  ])("describes every key of %s", (_, document) => {
    const saved = JSON.parse(encodeDocument(document));
    expect(faults(schema, saved)).toEqual([]);
    const kept = pointers(saved).filter((pointer) => !/^\/(origins|typed)\/./.test(pointer));
    expect(described(schema, saved).toSorted()).toEqual(kept.toSorted());
  });

  it("gives every key a description that says something", () => {
    const dull: string[] = [];
    JSON.stringify(schema, (key, value) => {
      if (
        typeof value === "object" &&
        value !== null &&
        "type" in value &&
        typeof value.type !== "object" &&
        !("description" in value)
      )
        dull.push(key);
      return value;
    });
    expect(dull).toEqual([]);
  });

  it.each(demos)("allows the demo %s, which opens without a repair", (name) => {
    const text = readFileSync(new URL(name, demo), "utf8");
    expect(faults(schema, JSON.parse(text))).toEqual([]);
    const restored = restoreDocument(text);
    expect(restored.kind === "document" && restored.repairs).toEqual([]);
    expect(restored.kind === "document" && restored.document.design).not.toBeNull();
  });

  it("refuses what restore repairs or drops, and allows what it takes as it is", () => {
    const saved = JSON.parse(encodeDocument(inventedDesign()));
    const places = pointers(saved).filter((pointer) => !/^\/(origins|typed|asBuilt|version|format)/.test(pointer));
    const spoil = fc.constantFrom<unknown>("text", true, -1e9, 1e30, 3, [], "dc", "E12");
    fc.assert(
      fc.property(fc.constantFrom(...places), spoil, (pointer, value) => {
        const changed = withValueAt(saved, pointer, value);
        const restored = restoreValue(changed);
        const taken = restored.kind === "document" && restored.repairs.length === 0;
        if (taken) expect(valueAt(restored.document, pointer) ?? null).toEqual(value);
        const crossChecked = /^\/(principal|brief\/band_Hz\/.|(parts|instruments)(\/\d+\/id)?)$/.test(pointer);
        if (!crossChecked) expect(faults(schema, changed).length === 0, `${pointer} = ${value}`).toBe(taken);
      }),
      { numRuns: 500 },
    );
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { documentShape } from "../../src/file/documentShape.ts";
import { encodeDocument } from "../../src/file/encode.ts";
import { escapeKey, valueAt } from "../../src/file/pointer.ts";
import { restoreDocument, restoreValue } from "../../src/file/restore.ts";
import type { ObjectSpec, Spec } from "../../src/file/shape.ts";
import { inventedDesign } from "./invented.ts";

/** Values that look like a document as far as the keys go, with anything in them. */
function like(spec: Spec, depth = 0): fc.Arbitrary<unknown> {
  const odd = fc.jsonValue({ maxDepth: 2 });
  const right = (): fc.Arbitrary<unknown> => {
    switch (spec.kind) {
      case "number":
        return fc.oneof(
          fc.double({ min: spec.least, max: spec.greatest, noNaN: true }),
          fc.constant(0),
          fc.constant(1e308 * 10),
        );
      case "choice":
        return fc.constantFrom(...Object.keys(spec.values));
      case "flag":
        return fc.boolean();
      case "literal":
        return fc.constant(spec.value);
      case "text":
        return fc.string({ unit: "binary", maxLength: 8 });
      case "list":
        return fc.array(like(spec.item, depth + 1), { maxLength: 3 });
      case "pair":
        return fc.tuple(like(spec.item, depth + 1), like(spec.item, depth + 1));
      case "map":
        return fc.dictionary(
          fc.constantFrom("/brief/scaleFactor", "/parts/1/tolerance", "x", "/design"),
          like(spec.value),
        );
      case "variant":
        return fc.oneof(...Object.values(spec.options).map((option) => fields(option, depth)));
      case "object":
        return fields(spec, depth);
      case "any":
        return odd;
    }
  };
  return fc.oneof({ weight: 8, arbitrary: right() }, { weight: 1, arbitrary: odd });
}

const fields = (spec: ObjectSpec, depth: number): fc.Arbitrary<unknown> =>
  fc
    .record(Object.fromEntries(Object.entries(spec.fields).map(([key, field]) => [key, like(field, depth + 1)])), {
      requiredKeys: depth === 0 ? ["brief"] : [],
    })
    .chain((known) =>
      fc.dictionary(fc.string({ maxLength: 4 }), odd, { maxKeys: 1 }).map((extra) => ({ ...extra, ...known })),
    );
const odd = fc.jsonValue({ maxDepth: 1 });

/** Every pair of pointer and value of unknown keys in an object tree that the description does not name. */
function unknownKeys(spec: Spec, value: unknown, at = ""): readonly string[] {
  if (typeof value !== "object" || value === null) return [];
  if (Array.isArray(value))
    return spec.kind === "list" ? value.flatMap((v, i) => unknownKeys(spec.item, v, `${at}/${i}`)) : [];
  const option = spec.kind === "variant" ? spec.options[spec.pick(value as never) ?? ""] : spec;
  if (option?.kind !== "object") return [];
  return Object.entries(value).flatMap(([key, item]) => {
    const pointer = `${at}/${escapeKey(key)}`;
    const field = option.fields[key];
    return field === undefined ? [pointer] : unknownKeys(field, item, pointer);
  });
}

describe("restore, whatever it is given", () => {
  it("never throws on any text", () => {
    fc.assert(fc.property(fc.string({ unit: "binary", maxLength: 200 }), (text) => void restoreDocument(text)));
    fc.assert(fc.property(fc.json(), (text) => void restoreDocument(text)));
    fc.assert(fc.property(fc.json(), (json) => void restoreDocument(`{"brief":${json},"format":"stringwright"}`)));
  });

  it("gives a document that saves and opens again without a repair and unchanged", () => {
    let documents = 0;
    fc.assert(
      fc.property(like(documentShape), (value) => {
        const first = restoreValue(value);
        if (first.kind === "refused") return;
        documents += 1;
        const text = encodeDocument(first.document);
        const second = restoreDocument(text);
        if (second.kind === "refused") throw new Error(second.refusal.why);
        expect(second.repairs).toEqual([]);
        expect(second.document).toEqual(first.document);
        expect(encodeDocument(second.document)).toBe(text);
      }),
      { numRuns: 300 },
    );
    expect(documents).toBeGreaterThan(50);
  });

  it("keeps unknown keys of every object as they were", () => {
    const raw = JSON.parse(encodeDocument(inventedDesign()));
    const put = (value: unknown): void => {
      if (typeof value !== "object" || value === null) return;
      for (const item of Object.values(value)) put(item);
      if (!Array.isArray(value)) Object.assign(value, { "my note": { a: [1, "two", null, { b: false }] } });
    };
    for (const key of ["brief", "parts", "instruments", "design", "asBuilt"]) put(raw[key]);
    Object.assign(raw, { "my note": [0.1] });
    const restored = restoreDocument(JSON.stringify(raw));
    if (restored.kind === "refused") throw new Error(restored.refusal.why);
    expect(restored.repairs).toEqual([]);
    const again = JSON.parse(encodeDocument(restored.document));
    expect(again).toEqual(raw);
    const pointers = unknownKeys(documentShape, raw);
    expect(pointers.length).toBeGreaterThan(20);
    for (const pointer of pointers) expect(valueAt(again, pointer)).toEqual(valueAt(raw, pointer));
  });

  it("leaves a text cut off anywhere refused or whole", () => {
    const text = encodeDocument(inventedDesign());
    fc.assert(
      fc.property(fc.nat({ max: text.length - 3 }), (end) => {
        expect(restoreDocument(text.slice(0, end)).kind).toBe("refused");
      }),
    );
  });
});

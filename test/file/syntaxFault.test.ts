import fc from "fast-check";
import { expect, it } from "vitest";
import { syntaxFault } from "../../src/file/syntaxFault.ts";

const parses = (text: string): boolean => {
  try {
    JSON.parse(text);
    return true;
  } catch {
    return false;
  }
};

it("finds a fault exactly where the engine's own parser finds one", () => {
  const damaged = fc
    .tuple(
      fc.json(),
      fc.nat(),
      fc.constantFrom("", "{", "}", "[", "]", ",", ":", '"', "\\", "1", "-", ".", "e", "t", " ", "\n", "\u0001"),
    )
    .map(([json, at, put]) => {
      const i = at % (json.length + 1);
      return json.slice(0, i) + put + json.slice(i + 1);
    });
  fc.assert(
    fc.property(fc.oneof(damaged, fc.json(), fc.string()), (text) => {
      const fault = syntaxFault(text);
      expect(fault === null).toBe(parses(text));
    }),
    { numRuns: 2000 },
  );
});

it.each([
  ['{"a" 1}', 5],
  ["[1,]", 3],
  ['{"a":1,}', 7],
  ["[1] 2", 4],
  ['{"a":01}', 6],
  ["", 0],
])("points at the first character that cannot stand: %s", (text, at) => {
  expect(syntaxFault(text)).toBe(at);
});

import fc from "fast-check";
import { expect, it } from "vitest";
import { applied, differences } from "../../src/store/difference.ts";

it("leads from any value to any other, and says nothing of what is shared", () => {
  const value = fc.jsonValue({ maxDepth: 3 }).filter((v) => !JSON.stringify(v).includes("__proto__"));
  fc.assert(
    fc.property(value, value, (from, to) => {
      expect(applied(from, JSON.parse(JSON.stringify(differences(from, to))))).toEqual(JSON.parse(JSON.stringify(to)));
    }),
  );
  const shared = { big: [1, 2, 3] };
  expect(differences({ shared, a: 1, gone: 0 }, { shared, a: 2, "n/w": 3 })).toEqual([
    { pointer: "/gone" },
    { pointer: "/a", value: 2 },
    { pointer: "/n~1w", value: 3 },
  ]);
});

it("throws when it was made for another value", () => {
  expect(() => applied({ a: 1 }, [{ pointer: "/b/c", value: 1 }])).toThrow(RangeError);
  expect(() => applied([1], [{ pointer: "/4", value: 1 }])).toThrow(RangeError);
});

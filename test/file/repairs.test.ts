import { describe, expect, it } from "vitest";
import { encodeDocument } from "../../src/file/encode.ts";
import { limits } from "../../src/file/limits.ts";
import { restoreDocument } from "../../src/file/restore.ts";
import { inventedDesign } from "./invented.ts";

type Loose = { [key: string]: Loose };
/** The invented design, changed, as text; `change` gets a deep copy. */
function spoilt(change: (raw: Loose) => void): string {
  const raw = JSON.parse(encodeDocument(inventedDesign()));
  change(raw);
  return JSON.stringify(raw);
}
function open(text: string) {
  const restored = restoreDocument(text);
  if (restored.kind === "refused") throw new Error(`${restored.refusal.where}: ${restored.refusal.why}`);
  return restored;
}
const refusal = (text: string) => {
  const restored = restoreDocument(text);
  if (restored.kind === "document") throw new Error("was opened");
  return restored.refusal;
};

describe("a file that cannot be read", () => {
  it.each([
    ["", "empty"],
    ["not json", "not JSON"],
    ["[1]", "not a document"],
    ["null", "not a document"],
    ["{}", "brief"],
    ['{"format":"other","brief":{}}', "format"],
    ['{"format":"stringwright","brief":3}', "brief"],
    ["[".repeat(1_000_000), "deep"],
    [`{"brief":"${"x".repeat(limits.text + 1)}"}`, "longer"],
    [`{"brief":[${"1,".repeat(limits.entries)}1]}`, "entries"],
    ["x".repeat(limits.size + 1), "characters"],
  ])("is refused with one reason: %#", (text, word) => {
    expect(refusal(text).why).toContain(word);
    expect(refusal(text).cure).not.toBe("");
  });

  it("names the line of a syntax error", () => {
    expect(refusal('{\n  "format": oops\n}').where).toBe("line 2, column 13");
  });
});

describe("a file with something wrong in it", () => {
  it("takes a number too large for the format as wrong, and says so", () => {
    const { document, repairs } = open(
      encodeDocument(inventedDesign()).replace('"ambient_degC": 23', '"ambient_degC": 1e400'),
    );
    expect(document.brief.surroundings.ambient_degC).toBe(23);
    expect(repairs[0]).toMatchObject({ pointer: "/brief/surroundings/ambient_degC", what: "replaced" });
    expect(document.origins["/brief/surroundings/ambient_degC"]).toBe("assumed");
  });

  it("asks whether a percentage was meant instead of scaling", () => {
    const { document, repairs } = open(spoilt((raw) => Object.assign(raw.brief!.policy!, { voltageDerating: 80 })));
    expect(document.brief.policy.voltageDerating).toBe(0.6);
    expect(repairs[0]?.why).toContain("80 % is 0.8");
    expect(repairs[0]?.was).toBe("80");
  });

  it("never reads a text as a number", () => {
    const { document, repairs } = open(spoilt((raw) => Object.assign(raw.brief!.source!, { resistance_ohm: "405k" })));
    expect(document.brief.source.resistance_ohm).toBe(0);
    expect(repairs[0]?.was).toBe('"405k"');
  });

  it("drops one bad part, instrument and branch and keeps the rest, with origins following", () => {
    const { document, repairs } = open(
      spoilt((raw) => {
        (raw.parts as unknown as unknown[]).unshift({ id: "x", kind: "lump" });
        (raw.instruments as unknown as unknown[]).push(7);
        (raw.design!.lvArm!.branches as unknown as unknown[]).unshift({ name: "odd" });
        Object.assign(raw.typed!, { "/design/lvArm/branches/1/series/0/resistance_ohm": "2M7" });
        Object.assign(raw.origins!, { "/design/lvArm/branches/0/name": "typed", "/parts/1/tolerance": "measured" });
      }),
    );
    expect(repairs.filter((r) => r.what === "dropped").map((r) => r.pointer)).toEqual([
      "/parts/0",
      "/instruments/1",
      "/design/lvArm/branches/0",
    ]);
    expect(document.parts.map((p) => p.id)).toEqual(["r1"]);
    expect(document.design?.lvArm.branches.map((b) => b.name)).toEqual(["R2a", "R2b", "T1"]);
    expect(document.typed).toEqual({ "/design/lvArm/branches/0/series/0/resistance_ohm": "2M7" });
    expect(document.origins["/parts/0/tolerance"]).toBe("measured");
    expect(document.origins["/design/lvArm/branches/0/name"]).toBeUndefined();
    expect(Object.keys(document.origins).filter((pointer) => !pointer.startsWith("/"))).toEqual([]);
  });

  it("leaves out a design that cannot be read, and says where", () => {
    const { document, repairs } = open(
      spoilt((raw) =>
        Object.assign(raw.design!.hvArm!, { elements: Array.from({ length: 5001 }, () => ({ resistance_ohm: 1 })) }),
      ),
    );
    expect(document.design).toBeNull();
    expect(repairs[0]).toMatchObject({ pointer: "/design/hvArm/elements", what: "dropped" });
  });

  it("renames an id that stands twice and finds a principal instrument", () => {
    const { document, repairs } = open(
      spoilt((raw) => {
        const parts = raw.parts as unknown as unknown[];
        parts.push(parts[0]);
        Object.assign(raw, { principal: "nobody" });
      }),
    );
    expect(document.parts.map((p) => p.id)).toEqual(["r1", "r1-2"]);
    expect(document.principal).toBe("meter");
    expect(repairs.map((r) => r.what)).toEqual(["renamed", "replaced"]);
  });

  it("takes __proto__, keys that stand twice and half characters without effect", () => {
    const text = encodeDocument(inventedDesign()).replace(
      '"name": "6 kV supply"',
      '"name": "first", "__proto__": { "polluted": 1 }, "note": { "__proto__": { "polluted": 1 }, "b": "\\ud800" }, "name": "second"',
    );
    const { document, repairs } = open(text);
    expect(document.name).toBe("second");
    expect((document as unknown as Loose).polluted).toBeUndefined();
    expect(({} as Loose).polluted).toBeUndefined();
    expect(Object.keys((document as unknown as Loose).note!)).toEqual(["b"]);
    expect(repairs).toHaveLength(3);
  });

  it("opens a file of a newer version read-only, unknown keys kept", () => {
    const restored = open(spoilt((raw) => Object.assign(raw, { version: 7, later: { deep: [1, null] } })));
    expect(restored.readOnly).toBe(true);
    expect(restored.repairs).toEqual([]);
    expect((restored.document as unknown as Loose).later).toEqual({ deep: [1, null] });
  });
});

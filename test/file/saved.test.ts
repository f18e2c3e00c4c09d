import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { encodeDocument } from "../../src/file/encode.ts";
import { restoreDocument } from "../../src/file/restore.ts";

const folder = new URL("../saved/", import.meta.url);
const read = (name: string) => readFileSync(new URL(name, folder), "utf8");
const open = (text: string) => {
  const restored = restoreDocument(text);
  if (restored.kind === "refused") throw new Error(restored.refusal.why);
  return restored;
};

describe("files of every release", () => {
  it.each(readdirSync(folder).filter((name) => name.endsWith(".json")))("%s opens without a repair", (name) => {
    const { document, repairs, readOnly } = open(read(name));
    expect([repairs, readOnly]).toEqual([[], false]);
    expect(document.design).not.toBeNull();
    expect(open(encodeDocument(document)).document).toEqual(document);
  });

  it("v1.json says what it always said", () => {
    const { document } = open(read("v1.json"));
    expect(document.name).toBe("48 kV pulse");
    expect(document.brief.waveform).toMatchObject({
      kind: "pulse",
      nominal_V: -48000,
      greatest_Vpeak: null,
      riseTime_s: 2e-7,
    });
    expect(document.parts.map((part) => part.kind)).toEqual(["resistor", "capacitor", "trimmer", "protector"]);
    expect(document.design?.hvArm.elements).toHaveLength(24);
    expect(document.design?.lvArm.branches.map((branch) => branch.name)).toEqual(["R2a", "C2a", "K1", "T1"]);
    expect(document.design?.strays).toMatchObject({ from: "typed", electrodeToTap_F: 2e-14 });
    expect(document.design).toHaveProperty(["written beside", "twice"], [1, 2]);
    expect(document).toHaveProperty("kept as it is", null);
    expect(document.origins["/brief/source/capacitance_F"]).toBe("measured");
    expect(document.origins["/brief/surroundings/ambient_degC"]).toBe("assumed");
    expect(document.typed).toEqual({ "/design/lvArm/branches/0/series/0/resistance_ohm": "402k" });
    expect(document.asBuilt.records).toEqual([{ issued: "2026-01-31", scaleFactor: 1001.2 }]);
  });
});

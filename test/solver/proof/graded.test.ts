import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { restoreDocument } from "../../../src/file/restore.ts";
import type { DividerDocument } from "../../../src/solver/job/document.ts";
import { prove } from "../../../src/solver/proof/prove.ts";
import { expectRelative } from "../../support/relative.ts";

const opened = restoreDocument(readFileSync("demo/pulse-into-scope.json", "utf8"));
if (!("document" in opened)) throw new Error("the demo opens");
const document = opened.document;
const gradedOf = (of: DividerDocument) => {
  const proof = prove(of);
  if (!proof.ok) throw new Error(proof.error.why);
  return proof.value.graded;
};

describe("graded element capacitors (the pulse demo, invented)", () => {
  const graded = gradedOf(document)!;
  const row = (what: string) => graded.rows.find((each) => each.what === what)!;
  it("share an edge evenly, keep the band flat and leave no response time: the definition of grading", () => {
    expect(row("graded").greatestShare).toBeLessThan(1 + 1e-3);
    expect(Math.abs(row("graded").bandDeviation_dB!)).toBeLessThan(1e-6);
    expect(Math.abs(row("graded").responseTime_s!)).toBeLessThan(1e-9 * 660e6 * 30e-12 * 1e3);
    expect(row("as fitted").greatestShare).toBeGreaterThan(row("graded").greatestShare);
  });
  it("grow from the tap to the electrode where strays go to earth alone, by what the strays take", () => {
    const bare: DividerDocument = {
      ...document,
      design: {
        ...document.design!,
        strays: {
          from: "typed",
          toEarth_F: document.design!.hvArm.elements.slice(1).map(() => 5e-13),
          toElectrode_F: [],
          electrodeToTap_F: 0,
        },
      },
    };
    const ideal = gradedOf(bare)!.ideal_F as number[];
    for (let i = 1; i < ideal.length; i++) expect(ideal[i]).toBeGreaterThan(ideal[i - 1]!);
    // Node i stands at about i/n of the voltage: C_(i+1) − C_i = Cg·i, small tap offset aside.
    expectRelative(ideal[5]! - ideal[4]!, 5e-13 * 5, 0.02, "the tap's own voltage is a thousandth");
  });
  it("rounding to what is sold costs something, less than grading gains or the table says so", () => {
    const bought = row("graded, bought");
    expect(bought.greatestShare).toBeGreaterThanOrEqual(row("graded").greatestShare);
    graded.bought_F.forEach((C, i) => {
      expect(Math.abs(Math.log(C! / graded.ideal_F[i]!))).toBeLessThan(0.2);
    });
  });
  it("an element that would need less than nothing is named", () => {
    const fed: DividerDocument = {
      ...document,
      design: {
        ...document.design!,
        strays: {
          from: "typed",
          toEarth_F: [],
          toElectrode_F: document.design!.hvArm.elements.slice(1).map(() => 1e-9),
          electrodeToTap_F: 0,
        },
      },
    };
    const found = gradedOf(fed)!;
    expect(found.sentence).toMatch(/^Element \d+ would need less than nothing across it/);
    expect(found.cure).toBeNull();
  });
  it("the cure fits what is sold, element by element", () => {
    for (const { pointer, value } of graded.cure?.edits ?? []) {
      const i = Number(/elements\/(\d+)\//.exec(pointer)![1]);
      expect(value).toBe(graded.bought_F[i]);
    }
  });
});

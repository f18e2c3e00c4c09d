import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Design } from "../../../src/solver/index.ts";
import { bodyPaths, stringsAt } from "../../../src/ui/column/bodyPaths.ts";
import { columnScale, labelled, middleOf } from "../../../src/ui/column/columnScale.ts";
import { inventedDocument } from "../../support/inventedDocument.ts";
import { expectRelative } from "../../support/relative.ts";

const design = inventedDocument.design as Design;
const arithmetic = "a few operations in double precision";

describe("the column's scale", () => {
  it("puts the floor, the foot and the column's top at their heights on one scale", () => {
    const scale = columnScale(design, 600);
    const { footHeight_m, columnLength_m } = design.geometry;
    expectRelative(scale.y(0) - scale.y(footHeight_m), footHeight_m * scale.pxPerMetre, 1e-12, arithmetic);
    const pitches = scale.pitch_px * design.hvArm.elements.length;
    expectRelative(pitches, columnLength_m * scale.pxPerMetre, 1e-12, arithmetic);
    expect(middleOf(scale, design.hvArm.elements.length)).toBeGreaterThan(scale.y(scale.top_m));
    expect(scale.y(scale.top_m)).toBeGreaterThan(0);
  });

  it("labels first and last and keeps every two labels apart, for any number of elements", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 5000 }), fc.double({ min: 0.01, max: 200, noNaN: true }), (n, pitch) => {
        const shown = labelled(n, pitch);
        expect(shown).toContain(n);
        expect(new Set(shown).size).toBe(shown.length);
        for (let k = 1; k < shown.length; k++)
          expect((shown[k]! - shown[k - 1]!) * pitch).toBeGreaterThanOrEqual(14 - 1e-9);
      }),
    );
  });
});

describe("the bodies", () => {
  const sizes = new Map([["r1", { length_m: 0.014, diameter_m: 0.005 }]]);
  it("are gathered into few paths whatever their number", () => {
    const one = design.hvArm.elements[0]!;
    const many: Design = {
      ...design,
      hvArm: { strings: 2, elements: Array.from({ length: 5000 }, () => ({ ...one, capacitor: null })) },
    };
    const { shades, capacitors } = bodyPaths(many, sizes, columnScale(many, 600), 62, (i) => (i + 1) / 5000);
    expect(shades.length).toBeLessThanOrEqual(33);
    expect(shades.reduce((sum, { d }) => sum + d.split("M").length - 1, 0)).toBe(10_000);
    expect(capacitors).toBe("");
  });

  it("stand symmetrically about the axis", () => {
    expect(stringsAt(1, 8)).toEqual([0]);
    expect(stringsAt(2, 8)).toEqual([-5.5, 5.5]);
    expect(stringsAt(3, 8)).toEqual([-11, 0, 11]);
  });
});

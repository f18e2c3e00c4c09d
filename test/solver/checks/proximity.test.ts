import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { restoreDocument } from "../../../src/file/restore.ts";
import { proximityFormulas } from "../../../src/solver/checks/proximityFormulas.ts";
import { noElectrode } from "../../../src/solver/field/fieldGeometry.ts";
import { solveField } from "../../../src/solver/field/solveField.ts";
import type { DividerDocument } from "../../../src/solver/job/document.ts";
import { prove } from "../../../src/solver/proof/prove.ts";
import { figure, finding } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

const demo = (name: string): DividerDocument => {
  const opened = restoreDocument(readFileSync(`demo/${name}.json`, "utf8"));
  if (!("document" in opened)) throw new Error("the demo opens");
  return opened.document;
};
const proven = (document: DividerDocument) => {
  const proof = prove(document);
  if (!proof.ok) throw new Error(proof.error.why);
  return proof.value;
};
const withApproach = (document: DividerDocument, approachDistance_m: number | null): DividerDocument => ({
  ...document,
  brief: { ...document.brief, surroundings: { ...document.brief.surroundings, approachDistance_m } },
});

describe("what a wall adds", () => {
  it.each([0.75, 1, 2])(
    "at %f lengths as the boundary-element solve of a plane wall says, to a quarter of itself",
    (k) => {
      const column = {
        elements: 20,
        columnDiameter_m: 0.03,
        columnLength_m: 0.5,
        footHeight_m: 0.5,
        bandFraction: 0.4,
      };
      const alone = { ...column, electrode: noElectrode, shield: null, box: null, wallDistance_m: null };
      const bare = solveField(alone).ceEff_F;
      const near = solveField({ ...alone, wallDistance_m: k * 0.5 }, { wall: "plane" }).ceEff_F;
      const formula = proximityFormulas.wall.compute({ l: 0.5, Ce: bare, h: 0.5, D: k * 0.5 }) as number;
      expectRelative(formula, near / bare - 1, 0.25, "evenly charged lines for a graded column");
    },
  );
  it("falls with distance for wall and hand", () => {
    const of = (kind: "wall" | "hand", D: number) =>
      proximityFormulas[kind].compute({ l: 1, Ce: 12e-12, h: 0.3, D, r: 0.1 } as never) as number;
    for (const kind of ["wall", "hand"] as const)
      for (const D of [0.5, 1, 2, 5]) expect(of(kind, D)).toBeGreaterThan(of(kind, 1.5 * D));
  });
});

describe("what something near does to the reading of an edge (the pulse demo, invented)", () => {
  const pulse = demo("pulse-into-scope");
  it("makes it smaller, the nearer the more, about as −ΔCe/(6 C1)", () => {
    const proof = proven(pulse);
    const C1 = figure(proof, "hvArm.capacitance_F");
    const Ce = figure(proof, "strays.toEarth_F");
    for (const { what, strayChange, readingChange } of proof.proximity.filter((row) => row.what !== "compound")) {
      expect(readingChange, what).toBeLessThan(0);
      expectRelative(readingChange!, (-strayChange! * Ce) / (6 * C1), 0.15, "first order in Ce/C1");
    }
    const walls = proof.proximity.filter(({ what }) => what === "wall").map((row) => row.readingChange!);
    expect(walls[1]).toBeLessThan(walls[0]!);
    expect(walls[2]).toBeLessThan(walls[1]!);
  });
  it("the proximity distance is where a wall takes a fifth of the wanted uncertainty", () => {
    const proof = proven(pulse);
    const D = figure(proof, "keepOut.proximity_m");
    const Ce = figure(proof, "strays.toEarth_F");
    const C1 = figure(proof, "hvArm.capacitance_F");
    const l = pulse.design!.geometry.columnLength_m;
    expect(D).toBeGreaterThanOrEqual(l / 4);
    if (D > l / 4) {
      const change =
        (proximityFormulas.wall.compute({ l, Ce, h: pulse.design!.geometry.footHeight_m, D })! * Ce) / (6 * C1);
      expectRelative(change, pulse.brief.wantedUncertainty / 5, 0.15, "first order in Ce/C1");
    }
  });
  it("an approach distance that is not stated is a caution; typed, the larger of the two is printed", () => {
    const none = finding(proven(withApproach(pulse, null)), "keepOut.distance");
    expect(none?.level).toBe("caution");
    expect(none?.reason).toMatch(/not stated: this alone keeps no person away/);
    const proof = proven(withApproach(pulse, 3));
    expect(finding(proof, "keepOut.distance")?.level).toBe("clear");
    expectRelative(figure(proof, "keepOut.distance_m"), 3, 1e-12, "larger than the proximity distance");
    expectRelative(
      figure(proven(withApproach(pulse, 1e-3)), "keepOut.distance_m"),
      figure(proof, "keepOut.proximity_m"),
      1e-12,
      "the proximity distance is the larger",
    );
  });
  it("at dc the typed distance stands alone", () => {
    const proof = proven(withApproach(demo("dc-supply-into-meter"), 0.5));
    expect(proof.sheet.values["keepOut.proximity_m"]).toBeNull();
    expectRelative(figure(proof, "keepOut.distance_m"), 0.5, 1e-12, "as typed");
  });
});

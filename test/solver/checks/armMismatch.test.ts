import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { restoreDocument } from "../../../src/file/restore.ts";
import type { DividerDocument } from "../../../src/solver/job/document.ts";
import { prove } from "../../../src/solver/proof/prove.ts";
import { figure, finding } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

const opened = restoreDocument(readFileSync("demo/pulse-into-scope.json", "utf8"));
if (!("document" in opened)) throw new Error("the demo opens");
const pulse = opened.document;
const proven = (document: DividerDocument) => {
  const proof = prove(document);
  if (!proof.ok) throw new Error(proof.error.why);
  return proof.value;
};
/** Every capacitor of the HV arm's part with this coefficient, of the LV arm's with that. */
const withCoefficients = (hv: number, lv: number): DividerDocument => {
  const own = new Set(pulse.design!.hvArm.elements.map(({ capacitor }) => capacitor));
  return {
    ...pulse,
    parts: pulse.parts.map((part) =>
      part.kind === "capacitor" ? { ...part, temperatureCoefficient_per_K: own.has(part.id) ? hv : lv } : part,
    ),
  };
};

describe("temperature mismatch of the two arms (the pulse demo, invented)", () => {
  const span = pulse.brief.surroundings.ambientSpan_K;
  it("is the difference of the coefficients over the ambient span, the LV arm's by its share", () => {
    const proof = proven(withCoefficients(-200e-6, 0));
    const F = figure(proof, "scaleFactor.predicted");
    expectRelative(figure(proof, "mismatch.edge"), (1 - 1 / F) * 200e-6 * span, 1e-9, "HV arm alone moves");
    const same = proven(withCoefficients(30e-6, 30e-6));
    const share = figure(same, "lvArm.capacitanceFitted_F") / figure(same, "lvArm.capacitanceTotal_F");
    expectRelative(
      figure(same, "mismatch.edge"),
      (1 - 1 / F) * 30e-6 * (1 - share) * span,
      1e-6,
      "one dielectric in both arms leaves the share of cable and instrument",
    );
  });
  it("is a caution where it takes more than a fifth of what is wanted, and silent below", () => {
    const wanted = pulse.brief.wantedUncertainty;
    const above = (0.25 * wanted) / span;
    expect(finding(proven(withCoefficients(above, 0)), "mismatch.edge")?.level).toBe("caution");
    expect(finding(proven(withCoefficients(above / 2, 0)), "mismatch.edge")).toBeUndefined();
  });
});

import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { restoreDocument } from "../../../src/file/restore.ts";
import { fieldAsked, ladderOf, solveColumnField } from "../../../src/solver/checks/columnField.ts";
import { noElectrode } from "../../../src/solver/field/fieldGeometry.ts";
import type { DividerDocument } from "../../../src/solver/job/document.ts";
import { responseTime } from "../../../src/solver/network/stepFigures.ts";
import { prove } from "../../../src/solver/proof/prove.ts";
import { figure, finding } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";
import { sketch } from "../network/invented.ts";

/** The pulse demo (invented), its strays from the field of its drawing. */
const document: DividerDocument = (() => {
  const restored = restoreDocument(readFileSync("demo/pulse-into-scope.json", "utf8"));
  if (!("document" in restored)) throw new Error("the demo opens");
  const pulse = restored.document;
  return { ...pulse, design: { ...pulse.design!, strays: { ...pulse.design!.strays, from: "field" } } };
})();
const geometry = (() => {
  const asked = fieldAsked(document);
  if (!asked.ok || asked.value === null) throw new Error("the demo's drawing stands");
  return asked.value;
})();
const proven = (field = solveColumnField(geometry)) => {
  const proof = prove(document, field);
  if (!proof.ok) throw new Error(proof.error.why);
  return proof.value;
};

describe("strays from the field of the drawing", () => {
  it("are those of the solve, with what the closed formula would have said beside them", () => {
    const field = solveColumnField(geometry);
    const proof = proven(field);
    expectRelative(figure(proof, "strays.toEarth_F"), field.strays.ceEff_F, 1e-12, "the same number");
    expectRelative(figure(proof, "strays.toElectrode_F"), field.strays.chEff_F, 1e-12, "the same number");
    const said = finding(proof, "strays.field")!;
    expect(said.level).toBe("clear");
    expect(said.reason).toMatch(/The closed formula of a bare column says .* (more|less)\./);
  });
  it("without the solve the closed formula stands in, and is said", () => {
    const proof = prove(document);
    if (!proof.ok) throw new Error(proof.error.why);
    const said = finding(proof.value, "strays.field")!;
    expect(said.level).toBe("caution");
    expect(said.reason).toMatch(/being solved/);
  });
  it("a field of another drawing is not taken", () => {
    const other = solveColumnField({ ...geometry, columnLength_m: geometry.columnLength_m * 1.1 });
    expect(finding(proven(other), "strays.field")?.level).toBe("caution");
  });
  it("a drawing that cannot stand is said, with the key that is meant", () => {
    const { design } = document;
    const sphere = { kind: "sphere", radius_m: 1e-4, tubeRadius_m: 0, thickness_m: 0, offset_m: 0 } as const;
    const wrong = { ...document, design: { ...design!, geometry: { ...design!.geometry, electrode: sphere } } };
    const asked = fieldAsked(wrong);
    expect(asked.ok).toBe(false);
    expect(!asked.ok && asked.error.where).toMatch(/^\/design\/geometry\/electrode\/radius_m/);
    const proof = prove(wrong);
    expect(proof.ok && finding(proof.value, "strays.field")?.reason).toMatch(/cannot be solved as drawn/);
  });
});

describe("the ladder of a solved column", () => {
  const column = { columnDiameter_m: 0.03, columnLength_m: 0.6, footHeight_m: 0.2, bandFraction: 0.4 };
  const alone = { ...column, electrode: noElectrode, shield: null, box: null, wallDistance_m: null };
  it("has the response time R·M into a low-ohmic tap (its definition)", () => {
    const field = solveColumnField({ ...alone, elements: 12 });
    const ladder = ladderOf(field, 12);
    const network = {
      ...sketch({ n: 12, R: 1e6, C: [...ladder.series_F], R2: 1e-3 }),
      toEarth_F: Float64Array.from(ladder.toEarth_F),
      toElectrode_F: Float64Array.from(ladder.toElectrode_F),
      electrodeToTap_F: ladder.electrodeToTap_F,
    };
    expectRelative(responseTime(network)!, 12e6 * field.strays.m_F, 1e-6, "charges of the linear profile are kept");
  });
  it("spread over more nodes keeps the sum of the strays and of the elements' voltages' charge", () => {
    const field = solveColumnField({ ...alone, elements: 80 });
    for (const n of [81, 160, 400]) {
      const ladder = ladderOf(field, n);
      const sum = (list: readonly number[]) => list.reduce((total, each) => total + each, 0);
      expect(ladder.toEarth_F).toHaveLength(n - 1);
      expectRelative(sum(ladder.toEarth_F), sum(field.strays.ladder.toEarth_F), 1e-12, "nothing lost");
      expectRelative(sum(ladder.toElectrode_F), sum(field.strays.ladder.toElectrode_F), 1e-12, "nothing lost");
      const series = (list: readonly number[]) => 1 / sum(list.map((each) => 1 / each));
      expectRelative(
        series(ladder.series_F),
        series(field.strays.ladder.series_F),
        0.02,
        "the column's own capacitance",
      );
    }
  });
});

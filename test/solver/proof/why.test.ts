import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { restoreDocument } from "../../../src/file/restore.ts";
import {
  figures,
  formulas,
  prove,
  recompute,
  type SheetData,
  size,
  solutions,
  why,
} from "../../../src/solver/index.ts";
import { expectRelative } from "../../support/relative.ts";

const folder = new URL("../../../demo/", import.meta.url);
const proofs = readdirSync(folder)
  .filter((name) => name.endsWith(".json"))
  .map((name) => {
    const restored = restoreDocument(readFileSync(new URL(name, folder), "utf8"));
    if (restored.kind === "refused") throw new Error(restored.refusal.why);
    const proof = prove(restored.document);
    const sizing = size(restored.document, { top: 5 });
    if (!proof.ok || !sizing.ok) throw new Error("a demo is not usable");
    return { name, proof: proof.value, sheets: [proof.value.sheet, sizing.value.sheet] };
  });

describe("why", () => {
  it.each(proofs)("recomputes every figure of $name from its inputs", ({ sheets }) => {
    for (const sheet of sheets) {
      for (const path of Object.keys(sheet.traces)) {
        const value = sheet.values[path]!;
        const list = Array.isArray(value) ? value : [value];
        list.forEach((each, i) => {
          const again = recompute(path, sheet, Array.isArray(value) ? i : null);
          if (formulas.has(sheet.traces[path]!.formula)) {
            if (each === null) expect(again).toBeNull();
            else
              expectRelative(
                again,
                each as number,
                1e-12,
                `recomputed ${path}`,
                Math.max(Math.abs(each as number), 1e-300),
              );
          }
        });
      }
    }
  });

  it.each(proofs)("keeps each solution's residual of $name within its bound", ({ sheets }) => {
    for (const [path, trace] of sheets.flatMap((sheet) => Object.entries(sheet.traces))) {
      const record = solutions.get(trace.formula);
      if (record === undefined) expect(formulas.has(trace.formula), `${path}: ${trace.formula}`).toBe(true);
      else {
        expect(trace.residual, `${path} states its residual`).toBeGreaterThanOrEqual(0);
        expect(trace.residual, path).toBeLessThanOrEqual(record.residualBound);
      }
    }
  });

  it.each(proofs)(
    "lays out every trace of $name down to what was given, the same after a trip through a worker",
    ({ proof, sheets }) => {
      for (const sheet of sheets) {
        const copy = structuredClone(sheet);
        for (const path of Object.keys(sheet.traces)) {
          const index = Array.isArray(sheet.values[path]) ? 0 : null;
          const laid = why(path, sheet, proof.origins, index);
          expect(laid, path).not.toBeNull();
          expect(why(path, copy, proof.origins, index), path).toEqual(laid);
          expect(ground(path, sheet, []), path).toBe(true);
        }
      }
    },
  );

  it.each(proofs)("lays out every figure that the screens of $name show", ({ proof }) => {
    for (const path of Object.keys(figures)) {
      const laid = why(path, proof.sheet, proof.origins);
      expect(laid, path).not.toBeNull();
      if (laid!.kind === "given") continue;
      expect(laid!.source.title.length, path).toBeGreaterThan(0);
      for (const input of laid!.inputs)
        expect(proof.sheet.values[input.path], `${path} <- ${input.path}`).toBeDefined();
    }
    for (const finding of proof.findings) {
      if (finding.path !== null) expect(why(finding.path, proof.sheet), finding.id).not.toBeNull();
    }
  });

  it("has a statement that names each input, and a source, for every formula", () => {
    for (const [id, formula] of formulas) {
      for (const name of Object.keys(formula.inputs))
        expect(formula.statement, `${id} names ${name}`).toContain(`{${name}}`);
      expect(formula.statement, id).toContain("{=}");
      expect(formula.holds.length * formula.source.title.length * formula.title.length, id).toBeGreaterThan(0);
    }
    for (const [id, record] of solutions)
      expect(record.method.length * record.holds.length * record.source.title.length, id).toBeGreaterThan(0);
  });

  it("is null for a figure that does not exist", () => {
    expect(why("nothing.like_this", proofs[0]!.proof.sheet)).toBeNull();
  });
});

/** Every input leads to givens; no figure stands on itself. */
function ground(path: string, sheet: SheetData, above: readonly string[]): boolean {
  if (above.includes(path)) throw new Error(`${[...above, path].join(" <- ")}: stands on itself`);
  if (sheet.values[path] === undefined) throw new Error(`${[...above, path].join(" <- ")}: is not on the sheet`);
  const inputs = Object.values(sheet.traces[path]?.inputs ?? {});
  return inputs.every((from) => ground(from, sheet, [...above, path]));
}

import type { Origin } from "../job/part.ts";
import type { FormulaInput } from "../standards/formula.ts";
import { evaluate, type SheetData, type SheetValue } from "../standards/sheet.ts";
import type { Source } from "../standards/source.ts";
import { formulas, solutions } from "./formulas.ts";

/** One input of a figure: how it is written, its value and where it came from. */
export interface WhyInput extends FormulaInput {
  readonly name: string;
  readonly path: string;
  readonly value: number | readonly (number | null)[] | null;
  /** Origin of a given; null for a figure that has a why of its own. */
  readonly origin: Origin | null;
}

/** The trace behind one figure, laid out: statement, numbers, result, origins, clause. */
export type Why =
  | { readonly kind: "given"; readonly path: string; readonly value: SheetValue; readonly origin: Origin }
  | {
      readonly kind: "formula" | "solution";
      readonly path: string;
      /** Place of the element, 0-based, where the figure is one of an array; else null. */
      readonly index: number | null;
      readonly id: string;
      readonly title: string;
      readonly statement: string;
      readonly symbol: string;
      readonly unit: string;
      readonly meaning: string;
      readonly value: SheetValue;
      readonly inputs: readonly WhyInput[];
      readonly holds: string;
      readonly source: Source;
      /** Solutions: how it was solved and how well. */
      readonly method: string | null;
      readonly residual: number | null;
      readonly residualBound: number | null;
    };

type Origins = Readonly<Record<string, Origin>>;

/** Lays out the why of the figure at `path`; null when the sheet has no such figure. Pure. */
export function why(path: string, sheet: SheetData, origins: Origins = {}, index: number | null = null): Why | null {
  const found = sheet.values[path];
  if (found === undefined) return null;
  const value = index !== null && Array.isArray(found) ? (found[index] ?? null) : found;
  const trace = sheet.traces[path];
  if (trace === undefined) return { kind: "given", path, value, origin: originOf(path, origins) };
  const formula = formulas.get(trace.formula);
  const solution = solutions.get(trace.formula);
  const record = formula ?? solution;
  if (record === undefined) throw new Error(`no record ${trace.formula} behind ${path}`);
  const arrays: readonly string[] = formula?.arrays ?? [];
  const inputs = Object.entries(trace.inputs).map(([name, from]): WhyInput => {
    const described = formula?.inputs[name] ?? { symbol: name, unit: unitOf(from), meaning: from };
    const all = sheet.values[from] ?? null;
    const one = Array.isArray(all) && !arrays.includes(name) && index !== null ? (all[index] ?? null) : all;
    return {
      ...described,
      name,
      path: from,
      value: one,
      origin: sheet.traces[from] === undefined ? originOf(from, origins) : null,
    };
  });
  return {
    kind: formula === undefined ? "solution" : "formula",
    path,
    index,
    id: record.id,
    title: record.title,
    statement: record.statement,
    symbol: formula?.result.symbol ?? path,
    unit: formula?.result.unit ?? unitOf(path),
    meaning: formula?.result.meaning ?? record.title,
    value,
    inputs,
    holds: record.holds,
    source: record.source,
    method: solution?.method ?? null,
    residual: trace.residual ?? null,
    residualBound: solution?.residualBound ?? null,
  };
}

/** A statement with each `{name}` replaced by its word: symbols, or numbers. */
export const filled = (statement: string, words: Readonly<Record<string, string>>): string =>
  statement.replace(/\{([^}]+)\}/g, (_, name: string) => words[name] ?? name);

/** Origin of a given: of the longest pointer in the map that covers it; a pointer not listed counts as typed. */
function originOf(path: string, origins: Origins): Origin {
  let pointer = path.replace(/:.*$/, "");
  if (pointer.includes("/part/")) return "catalogue";
  while (pointer.length > 1) {
    const found = origins[pointer];
    if (found !== undefined) return found;
    pointer = pointer.slice(0, pointer.lastIndexOf("/"));
  }
  return "typed";
}

/** The unit in a path's last key: `input.resistance_ohm` → `ohm`; none: a plain number. */
export function unitOf(path: string): string {
  const unit = /_([A-Za-z]+)$/.exec(path)?.[1];
  if (unit === undefined) return "1";
  return unit.replace(/^V(dc|rms|peak|pp|step|hotContact)$/, "V");
}

/** Recomputes a figure from its inputs; null for a given or a solution, which is judged by its residual. */
export function recompute(path: string, sheet: SheetData, index: number | null = null): number | null {
  const trace = sheet.traces[path];
  const formula = trace === undefined ? undefined : formulas.get(trace.formula);
  if (trace === undefined || formula === undefined) return null;
  return evaluate(formula, trace.inputs, (each) => sheet.values[each], index);
}

import { noElectrode, solveField } from "../../src/solver/index.ts";
import type { Benchmark } from "./benchmark.ts";

/** Invented columns. */
const bare = {
  elements: 20,
  columnDiameter_m: 0.03,
  columnLength_m: 0.5,
  footHeight_m: 0.15,
  bandFraction: 0.4,
  electrode: noElectrode,
  shield: null,
  box: null,
  wallDistance_m: null,
};
const sphere = { ...bare, electrode: { ...noElectrode, kind: "sphere" as const, radius_m: 0.1 } };
const toroid = {
  ...bare,
  elements: 60,
  electrode: { ...noElectrode, kind: "toroid" as const, radius_m: 0.1, tubeRadius_m: 0.03 },
  shield: { radius_m: 0.06, from_m: 0.1, to_m: 0.25 },
  box: { radius_m: 0.1, top_m: 0.12 },
};

/** Reference: plain elimination without pivoting of a dense matrix of n unknowns, as one would write it first. */
function plainElimination(n: number): () => number {
  const full = Float64Array.from({ length: n * n }, (_, at) => 1 / (1 + Math.abs((at % n) - Math.floor(at / n))));
  return () => {
    const A = full.slice();
    for (let k = 0; k < n; k++) {
      for (let i = k + 1; i < n; i++) {
        const f = A[i * n + k]! / A[k * n + k]!;
        for (let j = k; j < n; j++) A[i * n + j] = A[i * n + j]! - f * A[k * n + j]!;
      }
    }
    return A[n * n - 1]!;
  };
}

const against = (geometry: typeof sphere | typeof bare | typeof toroid) => {
  const { unknowns } = solveField(geometry);
  return { referenceName: `plain elimination of ${unknowns} unknowns`, reference: plainElimination(unknowns) };
};

/** Where the bars were set a sphere on 20 elements took 7 ms, 60 elements with toroid, shield and box 36 ms. */
export const fieldBenchmarks: readonly Benchmark[] = [
  { name: "field, 20 elements, bare", run: () => solveField(bare), ...against(bare), bar: 10 },
  { name: "field, 20 elements, sphere", run: () => solveField(sphere), ...against(sphere), bar: 10 },
  { name: "field, 60 elements, toroid, shield and box", run: () => solveField(toroid), ...against(toroid), bar: 5 },
];

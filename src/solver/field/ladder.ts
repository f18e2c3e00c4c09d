import { coupling, toEarth } from "./couplings.ts";

/** A ladder that stands for Maxwell's matrix; F. Inner nodes start with node 1, elements with element 1 next to the tap. */
export interface FoldedLadder {
  readonly toEarth_F: readonly number[];
  readonly toElectrode_F: readonly number[];
  /** Across each element. The last element's coupling to the electrode stands in `toElectrode_F`. */
  readonly series_F: readonly number[];
  /** Straight from the electrode to the tap. */
  readonly electrodeToTap_F: number;
}

/**
 * Couplings to earth and to the electrode stay where they are. Every other coupling c_ij, the tap's too, spans m elements and
 * becomes m · c_ij across each of them: charges, M and the input capacitance stay exact for the linear profile.
 * All parts are positive for bands. In a graded film nodes share the charge between them: where the pitch is long against the
 * diameter a series capacitance may come out negative, right for the linear profile and nothing else.
 * `C` is Maxwell's matrix, (n+1) × (n+1), row by row.
 */
export function foldedLadder(C: Float64Array): FoldedLadder {
  const nodes = Math.round(Math.sqrt(C.length));
  const n = nodes - 1;
  const inner = Array.from({ length: n - 1 }, (_, k) => k + 1);
  const series = new Array<number>(n).fill(0);
  for (let i = 0; i < n; i++) {
    for (let j = i + 1; j < n; j++) {
      const each = (j - i) * coupling(C, nodes, i, j);
      for (let element = i; element < j; element++) series[element] = series[element]! + each;
    }
  }
  return {
    toEarth_F: inner.map((i) => toEarth(C, nodes, i)),
    toElectrode_F: inner.map((i) => coupling(C, nodes, i, n)),
    series_F: series,
    electrodeToTap_F: coupling(C, nodes, 0, n),
  };
}

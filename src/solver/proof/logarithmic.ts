/** So many values from one to the other, evenly in their logarithm, both ends in. */
export const logarithmic = (from: number, to: number, count: number): number[] =>
  Array.from({ length: count }, (_, i) => from * (to / from) ** (i / (count - 1)));

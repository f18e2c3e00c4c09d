/** By how much `better` is below `worse`; 0 where they differ by no more than 1 part in 1e12, which is rounding. */
export function advantage(better: number, worse: number): number {
  const difference = worse - better;
  return Math.abs(difference) <= 1e-12 * Math.max(Math.abs(better), Math.abs(worse)) ? 0 : difference;
}

/** One benchmark: what is timed, and the reference that is timed in the same run. `bar`: the greatest ratio that is accepted. */
export interface Benchmark {
  readonly name: string;
  readonly run: () => unknown;
  readonly referenceName: string;
  readonly reference: () => unknown;
  readonly bar: number;
}

const median = (times: number[]): number => times.sort((a, b) => a - b)[Math.floor(times.length / 2)]!;

/** Medians of interleaved runs, so that both see the same machine. */
export function timed(benchmark: Benchmark, rounds = 15): { median_ms: number; reference_ms: number } {
  const own: number[] = [];
  const other: number[] = [];
  for (let i = 0; i < 3; i++) {
    benchmark.run();
    benchmark.reference();
  }
  for (let i = 0; i < rounds; i++) {
    let from = performance.now();
    benchmark.run();
    own.push(performance.now() - from);
    from = performance.now();
    benchmark.reference();
    other.push(performance.now() - from);
  }
  return { median_ms: median(own), reference_ms: median(other) };
}

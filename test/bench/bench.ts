import { timed } from "./benchmark.ts";
import { fieldBenchmarks } from "./field.bench.ts";
import { networkBenchmarks } from "./network.bench.ts";
import { workBenchmarks } from "./work.bench.ts";

/** One JSON line a benchmark; the reference is timed in the same run. Exit 1 where a ratio is past its bar. */
let past = 0;
for (const benchmark of [...networkBenchmarks, ...fieldBenchmarks, ...workBenchmarks]) {
  const { median_ms, reference_ms } = timed(benchmark);
  const ratio = median_ms / reference_ms;
  if (ratio > benchmark.bar) past += 1;
  const rounded = (value: number) => Number(value.toPrecision(3));
  process.stdout.write(
    `${JSON.stringify({ name: benchmark.name, median_ms: rounded(median_ms), reference: benchmark.referenceName, ratio: rounded(ratio), bar: benchmark.bar })}\n`,
  );
}
process.exitCode = past === 0 ? 0 : 1;

/** Counts a run for `npm test`'s plain closing line; a file that would not load, and a test skipped, count as failures. */
import { writeFileSync } from "node:fs";
import type { Reporter, TestModule } from "vitest/node";

export class PlainCount implements Reporter {
  onTestRunEnd(modules: readonly TestModule[], errors: readonly unknown[]): void {
    let passed = 0;
    let failed = errors.length;
    for (const module of modules) {
      if (module.errors().length > 0) failed += 1;
      for (const test of module.children.allTests()) {
        if (test.result().state === "passed") passed += 1;
        else failed += 1;
      }
    }
    const file = process.env.STRINGWRIGHT_COUNTS;
    if (file !== undefined) writeFileSync(file, JSON.stringify({ passed, failed }));
    else process.on("exit", () => process.stdout.write(`${passed} passed, ${failed} failed\n`));
  }
}

/** Closes a run with one plain line, `N passed, N failed`; a file that would not load counts as a failure. */
import type { Reporter, TestModule, TestRunEndReason } from "vitest/node";

export class PlainCount implements Reporter {
  onTestRunEnd(modules: readonly TestModule[], errors: readonly unknown[], reason: TestRunEndReason): void {
    let passed = 0;
    let failed = errors.length;
    let skipped = 0;
    for (const module of modules) {
      if (module.state() === "failed" && module.errors().length > 0) failed += 1;
      for (const test of module.children.allTests()) {
        const state = test.result().state;
        if (state === "passed") passed += 1;
        else if (state === "skipped") skipped += 1;
        else failed += 1;
      }
    }
    if (reason === "interrupted" && failed === 0) failed = 1;
    const tail = skipped > 0 ? `, ${skipped} skipped` : "";
    process.on("exit", () => process.stdout.write(`${passed} passed, ${failed} failed${tail}\n`));
  }
}

/**
 * `npm test`: types, lint, the built page and shell, then every test in node, page and browser. The last line is plain,
 * `N passed, N failed`: each stage counts as one test, and so does every file that would not load.
 */
import { spawnSync } from "node:child_process";
import { existsSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("../..", import.meta.url));
const bin = (path) => join(root, "node_modules", path);
const scratch = mkdtempSync(join(tmpdir(), "stringwright-"));
const counts = join(scratch, "counts.json");
let passed = 0;
let failed = 0;

stage("types", [join(root, "src/start/types.mjs")]);
stage("lint", [bin("@biomejs/biome/bin/biome"), "check", "--error-on-warnings", "."]);
stage("build of the page", [bin("vite/bin/vite.js"), "build", "--logLevel", "warn"]);
stage("build of the shell", [join(root, "src/start/setup.mjs"), "--cli"]);
tests();
rmSync(scratch, { recursive: true, force: true });
process.stdout.write(`\n${passed} passed, ${failed} failed\n`);
process.exit(failed === 0 ? 0 : 1);

function run(arguments_, env = {}) {
  const clean = { ...process.env, ...env };
  if (env.NODE_ENV === undefined) delete clean.NODE_ENV;
  return (
    spawnSync(process.execPath, arguments_, { cwd: root, stdio: ["ignore", "inherit", "inherit"], env: clean })
      .status === 0
  );
}

function stage(name, arguments_) {
  process.stdout.write(`— ${name}\n`);
  if (run(arguments_)) passed += 1;
  else {
    failed += 1;
    process.stdout.write(`failed: ${name}\n`);
  }
}

function tests() {
  process.stdout.write("— tests\n");
  const fine = run([bin("vitest/vitest.mjs"), "run"], { NODE_ENV: "test", STRINGWRIGHT_COUNTS: counts });
  const found = existsSync(counts) ? JSON.parse(readFileSync(counts, "utf8")) : { passed: 0, failed: 1 };
  passed += found.passed;
  failed += found.failed > 0 || fine ? found.failed : 1;
}

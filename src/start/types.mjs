/** Type checks everything: the whole project, then the rooms that must compile without a page. */
import { spawnSync } from "node:child_process";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("../..", import.meta.url));
const tsc = fileURLToPath(new URL("../../node_modules/typescript/bin/tsc", import.meta.url));
let failed = 0;
for (const project of [".", "src/solver", "src/work", "src/file"]) {
  const done = spawnSync(process.execPath, [tsc, "-p", project], { cwd: root, stdio: "inherit" });
  if (done.status !== 0) failed += 1;
}
process.exit(failed === 0 ? 0 : 1);

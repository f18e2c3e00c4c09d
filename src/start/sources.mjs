/** Hash of everything that a build is made of: sources, public files, demos, configuration and the lock. */
import { createHash } from "node:crypto";
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";

const made = ["src", "public", "demo", "index.html", "vite.config.ts", "package-lock.json", "tsconfig.json"];

export function hashOfSources(root, more = []) {
  const hash = createHash("sha256");
  for (const name of [...made, ...more]) add(join(root, name), hash);
  return hash.digest("hex");
}

function add(path, hash) {
  let entries;
  try {
    entries = readdirSync(path, { withFileTypes: true });
  } catch {
    try {
      hash.update(path.split(/[\\/]/).at(-1)).update(readFileSync(path));
    } catch {
      // Not there: nothing to count.
    }
    return;
  }
  for (const entry of entries.sort((a, b) => (a.name < b.name ? -1 : 1))) add(join(path, entry.name), hash);
}

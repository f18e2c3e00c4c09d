import { readFileSync } from "node:fs";
import { run } from "./run.ts";

process.exitCode = await run(process.argv.slice(2), {
  read: (file) => readFileSync(file, "utf8"),
  print: (text) => process.stdout.write(text),
  say: (text) => process.stderr.write(`${text}\n`),
});

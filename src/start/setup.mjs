/**
 * Set-up before `npm start`, `npm test` and the shell command, with Node's own modules only: installs from the lock when the lock
 * changed, builds the shell program when asked (--cli), finds or installs Chromium when asked (--browser).
 */
import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, mkdirSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import { delimiter, join } from "node:path";
import { fileURLToPath } from "node:url";
import { hashOfSources } from "./sources.mjs";

const root = fileURLToPath(new URL("../..", import.meta.url));
const asked = new Set(process.argv.slice(2));
const stop = (sentence) => {
  process.stderr.write(`${sentence}\n`);
  process.exit(1);
};

checkNode();
install();
if (asked.has("--cli")) buildShell();
if (asked.has("--browser")) findChromium();

function checkNode() {
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major > 20 || (major === 20 && minor >= 19)) return;
  stop(`Stringwright needs Node 20.19 or later; this is ${process.versions.node}.`);
}

function install() {
  const stamp = join(root, "node_modules", ".setup-lock-hash");
  const lock = readFileSync(join(root, "package-lock.json"));
  const wanted = createHash("sha256")
    .update(lock)
    .update(process.versions.modules + process.platform + process.arch)
    .digest("hex");
  const fresh = () => existsSync(stamp) && readFileSync(stamp, "utf8") === wanted;
  if (fresh()) return;
  const release = takeTurn();
  try {
    if (fresh()) return;
    process.stderr.write("Installing the packages of package-lock.json (once)…\n");
    const npm = process.env.npm_execpath;
    const arguments_ = ["ci", "--ignore-scripts", "--include=dev", "--no-audit", "--no-fund", "--prefer-offline"];
    const done = npm
      ? run(process.execPath, [npm, ...arguments_])
      : run(process.platform === "win32" ? "npm.cmd" : "npm", arguments_);
    if (done !== 0) stop("npm ci failed; its own message stands above.");
    writeFileSync(stamp, wanted);
  } finally {
    release();
  }
}

/** A folder as a lock keeps two set-ups apart; one older than ten minutes is taken over. */
function takeTurn() {
  const lock = join(root, ".setup-lock");
  for (let waited = 0; ; waited += 1) {
    try {
      mkdirSync(lock);
      return () => rmSync(lock, { recursive: true, force: true });
    } catch {
      if (existsSync(lock) && Date.now() - statSync(lock).mtimeMs > 600_000)
        rmSync(lock, { recursive: true, force: true });
      if (waited > 600) stop("Another set-up is still running; remove .setup-lock if it is not.");
      Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, 1000);
    }
  }
}

function buildShell() {
  const stamp = join(root, "dist-cli", ".sources");
  const hash = hashOfSources(root);
  if (existsSync(stamp) && readFileSync(stamp, "utf8") === hash) return;
  const vite = join(root, "node_modules", "vite", "bin", "vite.js");
  const done = spawnSync(process.execPath, [vite, "build", "--mode", "cli", "--logLevel", "warn"], {
    cwd: root,
    env: { ...process.env, NODE_ENV: "production", VITEST: "" },
    stdio: ["ignore", 2, 2],
  });
  if (done.status !== 0) stop("The shell program could not be built; the message stands above.");
  writeFileSync(stamp, hash);
}

function findChromium() {
  const named = process.env.CHROMIUM;
  if (named) {
    if (existsSync(named)) return;
    stop(`CHROMIUM names ${named}, which does not exist.`);
  }
  if (chromiumPath() !== null) return;
  if (process.platform === "linux" && process.getuid?.() === 0 && onPath("apt-get")) {
    process.stderr.write("Installing Chromium from Debian's packages (once)…\n");
    const wait = ["-o", "DPkg::Lock::Timeout=300"];
    run("apt-get", [...wait, "-qq", "update"]);
    run("apt-get", [...wait, "-qq", "install", "-y", "--no-install-recommends", "chromium"]);
    if (chromiumPath() !== null) return;
  }
  stop(
    "The browser tests need Chromium: install it (Debian: apt-get install chromium) or name it in the variable CHROMIUM.",
  );
}

function chromiumPath() {
  const places = [
    onPath("chromium"),
    onPath("chromium-browser"),
    onPath("google-chrome"),
    "/Applications/Chromium.app/Contents/MacOS/Chromium",
    "/Applications/Google Chrome.app/Contents/MacOS/Google Chrome",
    "C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe",
  ];
  return places.find((place) => place !== null && existsSync(place)) ?? null;
}

function onPath(name) {
  const folders = (process.env.PATH ?? "").split(delimiter);
  return folders.map((folder) => join(folder, name)).find((file) => existsSync(file)) ?? null;
}

function run(command, arguments_) {
  return spawnSync(command, arguments_, {
    cwd: root,
    stdio: ["ignore", 2, 2],
    env: { ...process.env, DEBIAN_FRONTEND: "noninteractive" },
  }).status;
}

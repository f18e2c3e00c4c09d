/** `npm start`: builds the page when its sources changed, then serves it on this machine only. Node's own modules only. */
import { spawn, spawnSync } from "node:child_process";
import { createReadStream, existsSync, readFileSync, statSync, writeFileSync } from "node:fs";
import { createServer } from "node:http";
import { extname, join, normalize, sep } from "node:path";
import { fileURLToPath } from "node:url";
import { hashOfSources } from "./sources.mjs";

const root = fileURLToPath(new URL("../..", import.meta.url));
const dist = join(root, "dist");
const types = {
  ".html": "text/html; charset=utf-8",
  ".js": "text/javascript; charset=utf-8",
  ".css": "text/css; charset=utf-8",
  ".json": "application/json",
  ".webmanifest": "application/manifest+json",
  ".svg": "image/svg+xml",
  ".png": "image/png",
  ".woff2": "font/woff2",
  ".txt": "text/plain; charset=utf-8",
};

build();
listen(Number(process.env.PORT ?? 4173), 20);

function build() {
  const stamp = join(dist, ".sources");
  const hash = hashOfSources(root);
  if (existsSync(stamp) && readFileSync(stamp, "utf8") === hash) return;
  process.stderr.write("Building the page…\n");
  const vite = join(root, "node_modules", "vite", "bin", "vite.js");
  const done = spawnSync(process.execPath, [vite, "build", "--logLevel", "warn"], {
    cwd: root,
    env: { ...process.env, NODE_ENV: "production", VITEST: "" },
    stdio: ["ignore", 2, 2],
  });
  if (done.status !== 0) process.exit(1);
  writeFileSync(stamp, hash);
}

function listen(port, tries) {
  const server = createServer(answer);
  server.once("error", (error) => {
    if (error.code === "EADDRINUSE" && tries > 0) return listen(port + 1, tries - 1);
    process.stderr.write(`The page cannot be served: ${error.message}\n`);
    process.exit(1);
  });
  server.listen(port, "127.0.0.1", () => {
    const address = `http://127.0.0.1:${port}/`;
    process.stdout.write(`Stringwright is ready at ${address}  (Ctrl+C stops it)\n`);
    openBrowser(address);
  });
  for (const signal of ["SIGINT", "SIGTERM"]) process.once(signal, () => process.exit(0));
}

function answer(request, response) {
  const path = decodeURIComponent(new URL(request.url, "http://local").pathname);
  const file = normalize(join(dist, path.endsWith("/") ? `${path}index.html` : path));
  const inside = file.startsWith(dist + sep) && existsSync(file) && statSync(file).isFile();
  if (!inside || (request.method !== "GET" && request.method !== "HEAD")) {
    response.writeHead(404, { "Content-Type": "text/plain" }).end("not here\n");
    return;
  }
  response.writeHead(200, {
    "Content-Type": types[extname(file)] ?? "application/octet-stream",
    "Cache-Control": "no-cache",
    "X-Content-Type-Options": "nosniff",
  });
  if (request.method === "HEAD") response.end();
  else createReadStream(file).pipe(response);
}

function openBrowser(address) {
  if (!process.stdout.isTTY || process.env.CI || process.env.SSH_CONNECTION) return;
  const opener = { darwin: ["open"], win32: ["cmd", "/c", "start"] }[process.platform] ?? ["xdg-open"];
  const child = spawn(opener[0], [...opener.slice(1), address], { stdio: "ignore", detached: true });
  child.on("error", () => {});
  child.unref();
}

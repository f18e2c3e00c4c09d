import { existsSync, readFileSync } from "node:fs";
import { createServer, type Server } from "node:http";
import { extname, join, normalize, sep } from "node:path";
import { fileURLToPath } from "node:url";
import { type Browser, type BrowserContextOptions, chromium, type Page } from "playwright-core";

const dist = fileURLToPath(new URL("../../dist", import.meta.url));
const types: Readonly<Record<string, string>> = {
  ".html": "text/html; charset=utf-8",
  ".js": "text/javascript; charset=utf-8",
  ".css": "text/css; charset=utf-8",
  ".svg": "image/svg+xml",
  ".json": "application/json",
  ".webmanifest": "application/manifest+json",
  ".woff2": "font/woff2",
};

/** The built page, served on this machine and opened in Chromium; errors of the page are collected. */
export interface BuiltPage {
  readonly open: (options?: BrowserContextOptions) => Promise<{ readonly page: Page; readonly faults: string[] }>;
  readonly close: () => Promise<void>;
}

export async function builtPage(): Promise<BuiltPage> {
  if (!existsSync(join(dist, "index.html"))) throw new Error("The page is not built: npx vite build.");
  const server = createServer((request, response) => {
    const path = decodeURIComponent(new URL(request.url ?? "/", "http://local").pathname);
    const file = normalize(join(dist, path.endsWith("/") ? `${path}index.html` : path));
    if (!file.startsWith(dist + sep) || !existsSync(file)) {
      response.writeHead(404).end();
      return;
    }
    response.writeHead(200, { "content-type": types[extname(file)] ?? "application/octet-stream" });
    response.end(readFileSync(file));
  });
  const port = await listening(server);
  const browser = await chromium.launch({ executablePath: executable(), args: ["--no-sandbox"] });
  return {
    open: (options) => openIn(browser, `http://127.0.0.1:${port}/`, options),
    close: async () => {
      await browser.close();
      server.close();
    },
  };
}

async function openIn(browser: Browser, address: string, options: BrowserContextOptions = {}) {
  const context = await browser.newContext({ viewport: { width: 1440, height: 900 }, ...options });
  const page = await context.newPage();
  const faults: string[] = [];
  page.on("pageerror", (error) => faults.push(error.message));
  page.on("console", (message) => {
    if (message.type() === "error") faults.push(message.text());
  });
  await page.goto(address);
  return { page, faults };
}

const listening = (server: Server): Promise<number> =>
  new Promise((resolve) => {
    server.listen(0, "127.0.0.1", () => {
      const address = server.address();
      resolve(typeof address === "object" && address !== null ? address.port : 0);
    });
  });

function executable(): string {
  const places = [process.env.CHROMIUM, "/usr/bin/chromium", "/usr/bin/chromium-browser", "/usr/bin/google-chrome"];
  const found = places.find((place) => place !== undefined && existsSync(place));
  if (found === undefined) throw new Error("No Chromium: name it in the variable CHROMIUM.");
  return found;
}

/** Chromium on the built page: one browser a file, a small server of its own, and an ear for anything the console says. */
import { spawn } from "node:child_process";
import { existsSync } from "node:fs";
import { delimiter, join } from "node:path";
import { fileURLToPath } from "node:url";
import { type Browser, type BrowserContextOptions, chromium, type Page } from "playwright-core";

const root = fileURLToPath(new URL("../..", import.meta.url));

function chromiumPath(): string {
  const names = ["chromium", "chromium-browser", "google-chrome"];
  const found = [
    process.env.CHROMIUM,
    ...(process.env.PATH ?? "").split(delimiter).flatMap((folder) => names.map((name) => join(folder, name))),
    "/Applications/Chromium.app/Contents/MacOS/Chromium",
    "/Applications/Google Chrome.app/Contents/MacOS/Google Chrome",
  ].find((path) => path !== undefined && existsSync(path));
  if (found === undefined) throw new Error("no Chromium: install it or name it in the variable CHROMIUM");
  return found;
}

export const startBrowser = (): Promise<Browser> =>
  chromium.launch({
    executablePath: chromiumPath(),
    chromiumSandbox: process.getuid?.() !== 0,
    args: [
      "--disable-background-networking",
      "--disable-component-update",
      "--disable-sync",
      "--no-first-run",
      "--disable-quic",
    ],
  });

export interface Served {
  readonly url: string;
  readonly stop: () => Promise<void>;
}

/** Serves the page as `npm start` does, building it when its sources changed. */
export function servePage(port: number): Promise<Served> {
  const env = { ...process.env, PORT: String(port), CI: "true" };
  const child = spawn(process.execPath, [join(root, "src/start/serve.mjs")], {
    cwd: root,
    env,
    stdio: ["ignore", "pipe", "inherit"],
  });
  const stop = () =>
    new Promise<void>((resolve) => {
      if (child.exitCode !== null || child.signalCode !== null) return resolve();
      child.once("exit", () => resolve());
      child.kill("SIGKILL");
    });
  return new Promise((resolve, reject) => {
    child.once("exit", () => reject(new Error("the server ended")));
    child.stdout.on("data", (data: Buffer) => {
      const url = /http:\/\/\S+/.exec(data.toString())?.[0];
      if (url !== undefined) resolve({ url, stop });
    });
  });
}

export interface Heard {
  /** Errors, warnings, policy reports and uncaught errors of the page. */
  readonly complaints: string[];
  /** Requests to anywhere but the page's own server. */
  readonly strangers: string[];
}

/** A page in a fresh context; everything it complains about is kept. */
export async function freshPage(
  browser: Browser,
  url: string,
  options: BrowserContextOptions = {},
): Promise<{ page: Page; heard: Heard }> {
  const context = await browser.newContext({
    viewport: { width: 1440, height: 900 },
    acceptDownloads: true,
    locale: "en-GB",
    ...options,
  });
  const page = await context.newPage();
  page.setDefaultTimeout(15_000);
  const heard: Heard = { complaints: [], strangers: [] };
  page.on("console", (message) => {
    if (message.type() === "error" || message.type() === "warning") heard.complaints.push(message.text());
  });
  page.on("pageerror", (error) => heard.complaints.push(String(error)));
  page.on("request", (request) => {
    const to = request.url();
    if (!to.startsWith(url) && !to.startsWith("blob:") && !to.startsWith("data:")) heard.strangers.push(to);
  });
  await page.goto(url);
  await page.getByText("IN SHORT").waitFor();
  await page.locator(".in-short dd").first().waitFor();
  return { page, heard };
}

/** Waits until the answer on the screen belongs to the inputs on the screen. */
export const settled = (page: Page): Promise<void> =>
  page.locator('section[aria-label="in short"][aria-busy="false"]').waitFor();

export const goTo = async (page: Page, screen: string): Promise<void> => {
  await page.locator(".strip button", { hasText: screen }).first().click();
};

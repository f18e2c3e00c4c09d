import { readdirSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { gzipSync } from "node:zlib";
import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { freshPage, goTo, type Served, servePage, settled, startBrowser } from "../support/browser.ts";

let served: Served;
let browser: Browser;
let page: Page;

beforeAll(async () => {
  served = await servePage(4350);
  browser = await startBrowser();
  ({ page } = await freshPage(browser, served.url));
});
afterAll(async () => {
  await browser?.close();
  await served?.stop();
});

const dist = fileURLToPath(new URL("../../dist", import.meta.url));

describe("speed", () => {
  it("paints first from less than 170 KiB of script, gzipped; charts and mathjs come later", async () => {
    const scripts = await page.evaluate(() =>
      performance
        .getEntriesByType("resource")
        .filter((entry) => entry.startTime < performance.getEntriesByName("first-contentful-paint")[0]!.startTime)
        .map((entry) => entry.name)
        .filter((name) => name.endsWith(".js")),
    );
    const names = new Set(scripts.map((url) => url.split("/").at(-1)!));
    const built = readdirSync(`${dist}/assets`).filter((name) => names.has(name) && !name.startsWith("worker"));
    const bytes = built.reduce(
      (sum, name) => sum + gzipSync(readFileSync(`${dist}/assets/${name}`), { level: 9 }).length,
      0,
    );
    expect(built.length).toBeGreaterThan(0);
    expect(bytes, `${built.join(", ")}: ${bytes} bytes`).toBeLessThan(170 * 1024);
    expect(built.some((name) => /CartesianChart|LinePlot|esm-/.test(name))).toBe(false);
  });

  it("answers every keystroke of a typed voltage and holds no task of the page for long once the charts stand", async () => {
    // Times depend on the machine: only what must hold anywhere is asserted; the figures are printed.
    await goTo(page, "Prove");
    await page.locator("svg.recharts-surface").first().waitFor();
    await goTo(page, "Ask");
    await settled(page);
    await page.evaluate(() => {
      const seen = { tasks: [] as number[] };
      new PerformanceObserver((list) => {
        for (const entry of list.getEntries()) seen.tasks.push(entry.duration);
      }).observe({ entryTypes: ["longtask"] });
      Object.assign(window, { seen });
    });
    const field = page.getByLabel("working voltage");
    const waits: number[] = [];
    for (const text of ["6.1 kV", "6.2 kV", "6.3 kV", "6.4 kV", "6.5 kV", "6.6 kV", "6.7 kV", "6.8 kV"]) {
      const from = Date.now();
      await field.fill(text);
      await expect
        .poll(() => page.locator(".in-short").innerText(), { interval: 5 })
        .toMatch(new RegExp(`${text[0]}\\.${text[2]}00\\s*V`));
      waits.push(Date.now() - from);
    }
    const { tasks } = await page.evaluate(() => (window as unknown as { seen: { tasks: number[] } }).seen);
    const median = waits.sort((a, b) => a - b)[4];
    process.stdout.write(
      `keystroke to new numbers, as seen from outside: median ${median} ms; page tasks over 50 ms: ${tasks.length}\n`,
    );
    expect(waits).toHaveLength(8);
  });
});

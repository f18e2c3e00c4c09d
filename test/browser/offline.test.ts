import type { Browser } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { freshPage, goTo, type Served, servePage, startBrowser } from "../support/browser.ts";

let served: Served;
let browser: Browser;

beforeAll(async () => {
  served = await servePage(4330);
  browser = await startBrowser();
});
afterAll(async () => {
  await browser?.close();
  await served?.stop();
});

describe("offline", () => {
  it("works with the server stopped once it says ready, and asks for nothing more", async () => {
    const { page, heard } = await freshPage(browser, served.url);
    await page.getByText("ready offline").waitFor({ timeout: 30_000 });
    const later: string[] = [];
    page.context().on("request", (request) => {
      if (request.serviceWorker() !== null) later.push(request.url());
    });
    for (const screen of ["Size", "Prove", "Build", "Ask"]) {
      await goTo(page, screen);
      await page.waitForTimeout(500);
    }
    expect(later).toEqual([]);
    await served.stop();
    await page.reload();
    await page.locator(".in-short dd").first().waitFor();
    await goTo(page, "Prove");
    await page.getByText("frequency response").first().waitFor();
    expect(await page.locator(".in-short").innerText()).toMatch(/1000/);
    expect(heard.complaints).toEqual([]);
    await page.context().close();
  });
});

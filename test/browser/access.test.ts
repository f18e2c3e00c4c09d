import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { violations } from "../support/axe.ts";
import { freshPage, goTo, type Heard, type Served, servePage, startBrowser } from "../support/browser.ts";

let served: Served;
let browser: Browser;
let page: Page;
let heard: Heard;

beforeAll(async () => {
  served = await servePage(4390);
  browser = await startBrowser();
  ({ page, heard } = await freshPage(browser, served.url));
});
afterAll(async () => {
  await browser?.close();
  await served?.stop();
});

describe("the page for everyone", () => {
  it("fits a tablet without scrolling sideways, the column in a drawer", async () => {
    await page.setViewportSize({ width: 820, height: 1180 });
    for (const screen of ["Ask", "Route", "Calibrate", "Use"]) {
      await goTo(page, screen);
      const over = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
      expect(over, screen).toBeLessThanOrEqual(0);
    }
    expect(await page.locator(".column-picture").isVisible()).toBe(false);
    await page.getByRole("button", { name: "column", exact: true }).click();
    expect(await page.locator(".column-picture").isVisible()).toBe(true);
    await page.locator(".side .drawer-button").click();
    await page.setViewportSize({ width: 1440, height: 900 });
  });

  it.each(["light", "dark"] as const)(
    "has no axe violation with slip, why, list and dialog open, %s",
    async (scheme) => {
      await page.emulateMedia({ colorScheme: scheme });
      await goTo(page, "Ask");
      await page.locator(".column-picture").focus();
      await page.keyboard.press("Home");
      await page.evaluate(() => {
        for (const details of document.querySelectorAll("details")) details.open = true;
      });
      await page.locator(".in-short .figure-button").nth(2).click();
      await page.locator(".why").waitFor();
      expect(await violations(page)).toEqual([]);
      await page.keyboard.press("Escape");
      await page.getByRole("button", { name: "help" }).click();
      expect(await violations(page)).toEqual([]);
      await page.keyboard.press("Escape");
      await page.locator(".slip").getByRole("button", { name: "close" }).click();
    },
  );

  it.each(["light", "dark"] as const)("has no axe violation on any screen, %s", async (scheme) => {
    await page.emulateMedia({ colorScheme: scheme });
    for (const screen of ["Ask", "Route", "Size", "Prove", "Build", "Calibrate", "Use"]) {
      await goTo(page, screen);
      await page.waitForTimeout(screen === "Prove" ? 1500 : 400);
      expect(await violations(page), `${screen}, ${scheme}`).toEqual([]);
    }
  });

  it("said nothing on the console, nor did the policy", () => expect(heard.complaints).toEqual([]));
});

import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { type DividerDocument, partsList, partsListCsv, takeCandidate } from "../../src/solver/index.ts";
import { size } from "../../src/solver/sizing/size.ts";
import { freshPage, goTo, type Heard, type Served, servePage, settled, startBrowser } from "../support/browser.ts";

let served: Served;
let browser: Browser;
let page: Page;
let heard: Heard;
const axe = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");
const example: DividerDocument = JSON.parse(
  readFileSync(new URL("../../demo/dc-supply-into-meter.json", import.meta.url), "utf8"),
);

beforeAll(async () => {
  served = await servePage(4330);
  browser = await startBrowser();
  ({ page, heard } = await freshPage(browser, served.url));
});
afterAll(async () => {
  await browser?.close();
  await served?.stop();
});

/** Presses a button that hands over a file and reads its bytes. */
async function downloaded(name: string, nth = 0): Promise<{ readonly file: string; readonly text: string }> {
  const waiting = page.waitForEvent("download");
  await page.getByRole("button", { name, exact: true }).nth(nth).click();
  const download = await waiting;
  return { file: download.suggestedFilename(), text: readFileSync(await download.path(), "utf8") };
}

/** What axe finds on the page as it stands, with everything unfolded. */
async function violations(): Promise<readonly string[]> {
  await page.evaluate(() => {
    for (const details of document.querySelectorAll("details")) details.open = true;
  });
  await page.evaluate(axe);
  return page.evaluate(async () => {
    const runner = (globalThis as unknown as { axe: { run: () => Promise<{ violations: { id: string }[] }> } }).axe;
    return (await runner.run()).violations.map((each) => each.id);
  });
}

const traces = () =>
  page.locator(".recharts-line-curve").evaluateAll((all) => all.map((path) => path.getAttribute("d")));

describe("Size", () => {
  it("shows window and candidates, and takes the one picked", async () => {
    await goTo(page, "Size");
    await page.getByRole("heading", { name: "resistance window" }).waitFor();
    await page.getByRole("button", { name: "take candidate 2", exact: true }).click();
    await settled(page);
    const chosen = page.locator("tr.chosen").first();
    await expect.poll(() => chosen.locator("td").nth(1).textContent()).toBe("2");
    const found = size(example, { top: 60 });
    const picked = found.ok ? found.value.candidates[1] : undefined;
    expect(await chosen.textContent()).toContain(picked?.familyName);
    expect(await page.getByText("The design is kept as picked (candidate 2 of").count()).toBe(1);
  });

  it("opens the why of a bound in place", async () => {
    await page.locator(".window-grid .number-button").first().click();
    await page.getByRole("region", { name: "why this number" }).waitFor();
    await page.keyboard.press("Escape");
  });

  it("sorts by a column from the keyboard", async () => {
    await page.getByRole("button", { name: "length", exact: true }).focus();
    await page.keyboard.press("Enter");
    expect(await page.locator('th[aria-sort="ascending"]').textContent()).toMatch(/^length/);
  });

  it("has nothing that axe objects to", async () => {
    expect(await violations()).toEqual([]);
  });
});

describe("Prove", () => {
  it("draws both traces of the frequency response once in view", async () => {
    await goTo(page, "Prove");
    await page.getByRole("heading", { name: "frequency response" }).scrollIntoViewIfNeeded();
    await expect.poll(async () => (await traces()).filter((d) => d?.startsWith("M")).length).toBeGreaterThanOrEqual(2);
  });

  it("reads values under a cursor moved by keyboard", async () => {
    const cursor = page.getByRole("slider", { name: /frequency response/ });
    await cursor.focus();
    await page.keyboard.press("Home");
    expect(await cursor.getAttribute("aria-valuetext")).toMatch(/Hz: .*dB/);
    const first = await cursor.getAttribute("aria-valuetext");
    await page.keyboard.press("ArrowRight");
    expect(await cursor.getAttribute("aria-valuetext")).not.toBe(first);
  });

  it("opens the table behind a picture", async () => {
    await page.getByText("table: frequency response").click();
    await page.getByRole("columnheader", { name: "magnitude / dB" }).waitFor();
  });

  it("hands over a drawing that stands alone, and its data in base units", async () => {
    const drawing = await downloaded("drawing, SVG");
    expect(drawing.file).toBe("frequency-response.svg");
    expect(drawing.text).toMatch(/^<svg xmlns="http:\/\/www.w3.org\/2000\/svg"/);
    expect(drawing.text).not.toMatch(/var\(|class=/);
    expect(drawing.text).toContain("magnitude / dB");
    const data = await downloaded("data, CSV");
    expect(data.text).toMatch(/^frequency_Hz,magnitude_dB,deviation_percent,phase_deg,inputImpedance_ohm\r\n/);
    expect(data.text).not.toMatch(/\de[+-]\d/);
  });

  it("has nothing that axe objects to, light and dark", async () => {
    expect(await violations()).toEqual([]);
    await page.emulateMedia({ colorScheme: "dark" });
    expect(await violations()).toEqual([]);
    await page.emulateMedia({ colorScheme: "light" });
  });
});

describe("Build", () => {
  it("hands over the parts list of the picked design, byte for byte", async () => {
    await goTo(page, "Build");
    const found = size(example, { top: 60 });
    if (!found.ok) throw new Error(found.error.why);
    const list = partsList(takeCandidate(example, found.value.candidates[1]!));
    if (!list.ok) throw new Error(list.error.why);
    const data = await downloaded("CSV, data");
    expect(data.text).toBe(partsListCsv(list.value, "data"));
    expect(data.file).toMatch(/-parts\.csv$/);
    const sheet = await downloaded("CSV, spreadsheet");
    expect(sheet.text).toBe(partsListCsv(list.value, "spreadsheet"));
  });

  it("stands under its cautions", async () => {
    expect(await page.getByRole("region", { name: "cautions" }).textContent()).toContain("zero reading");
  });

  it("has nothing that axe objects to", async () => {
    expect(await violations()).toEqual([]);
  });
});

describe("the three", () => {
  it("fit a tablet without scrolling sideways", async () => {
    await page.setViewportSize({ width: 820, height: 1180 });
    for (const screen of ["Size", "Prove", "Build"]) {
      await goTo(page, screen);
      const over = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
      expect(over, screen).toBeLessThanOrEqual(0);
    }
  });

  it("print every chart, also those out of view", async () => {
    await page.setViewportSize({ width: 1440, height: 900 });
    await goTo(page, "Prove");
    await page.getByRole("heading", { name: "frequency response" }).waitFor();
    await page.evaluate(() => window.dispatchEvent(new Event("beforeprint")));
    await expect.poll(() => page.locator(".recharts-surface").count()).toBe(6);
    await page.evaluate(() => window.dispatchEvent(new Event("afterprint")));
  });

  it("complain of nothing and ask nobody else", () => {
    expect(heard.complaints).toEqual([]);
    expect(heard.strangers).toEqual([]);
  });
});

import { readdirSync, readFileSync } from "node:fs";
import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { restoreDocument } from "../../src/file/restore.ts";
import { formatQuantity, formatShare, prove } from "../../src/solver/index.ts";
import { freshPage, goTo, type Heard, type Served, servePage, settled, startBrowser } from "../support/browser.ts";

const folder = new URL("../../demo/", import.meta.url);
const demos = readdirSync(folder)
  .filter((name) => name.endsWith(".json"))
  .map((name) => name.replace(".json", ""));
let served: Served;
let browser: Browser;
let page: Page;
let heard: Heard;

beforeAll(async () => {
  served = await servePage(4370);
  browser = await startBrowser();
  ({ page, heard } = await freshPage(browser, served.url));
});
afterAll(async () => {
  await browser?.close();
  await served?.stop();
});

const short = () => page.locator('section[aria-label="in short"]').innerText();

describe("every demo in the browser", () => {
  it.each(demos)("%s shows the digits of the shell", async (name) => {
    const restored = restoreDocument(readFileSync(new URL(`${name}.json`, folder), "utf8"));
    if (restored.kind === "refused") throw new Error(restored.refusal.why);
    const proof = prove(restored.document);
    if (!proof.ok) throw new Error(proof.error.why);
    const { values } = proof.value.sheet;
    await page.getByRole("button", { name: "file", exact: true }).click();
    await page.locator(".menu li button", { hasText: name.replaceAll("-", " ") }).click();
    const expected = [
      formatQuantity(values["scaleFactor.predicted"] as number, "1", { digits: 6 }),
      formatShare(values["scaleFactor.uncertainty"] as number, 2),
      formatQuantity(values["input.resistance_ohm"] as number, "ohm"),
      formatQuantity(values["input.capacitance_F"] as number, "F"),
      formatQuantity(values["reading.atWorking_V"] as number, "V", { digits: 4 }),
    ];
    await expect.poll(() => page.locator(".job").textContent()).toBe(proof.value.job);
    await settled(page);
    for (const text of expected) await expect.poll(short).toContain(text);
  });

  it("opens a file that is dropped on the page", async () => {
    const text = readFileSync(new URL(`${demos[0]}.json`, folder), "utf8").replace(
      /"name": "[^"]*"/,
      '"name": "dropped design"',
    );
    const data = await page.evaluateHandle((content) => {
      const transfer = new DataTransfer();
      transfer.items.add(new File([content], "dropped.json", { type: "application/json" }));
      return transfer;
    }, text);
    await page.dispatchEvent("body", "drop", { dataTransfer: data });
    await expect
      .poll(() => page.locator(".notice").allInnerTexts())
      .toContainEqual(expect.stringMatching(/dropped\.json is open/));
    expect(await page.locator(".example").count()).toBe(0);
  });

  it("saves what is open as a file that opens again without a repair", async () => {
    await page.evaluate(() => {
      delete (window as { showSaveFilePicker?: unknown }).showSaveFilePicker;
    });
    const waiting = page.waitForEvent("download");
    await page.keyboard.press("Control+S");
    const download = await waiting;
    expect(download.suggestedFilename()).toBe("dropped-design.stringwright.json");
    const restored = restoreDocument(readFileSync(await download.path(), "utf8"));
    expect(restored).toMatchObject({ kind: "document", repairs: [], readOnly: false });
  });

  it("lets one tab write and shows the other read-only, with a copy to work on", async () => {
    await goTo(page, "Ask");
    await page.getByLabel("working voltage").fill("6.5 kV");
    await page.waitForTimeout(900);
    const second = await page.context().newPage();
    await second.goto(served.url);
    await expect
      .poll(() => second.locator(".notice.bad").allInnerTexts())
      .toContainEqual(expect.stringMatching(/Another tab is writing/));
    await second.getByRole("button", { name: "work on a copy" }).click();
    await expect.poll(() => second.locator(".notice.bad").count()).toBe(0);
    await second.getByLabel("working voltage").fill("5 kV");
    await second.close();
    expect(await page.getByLabel("working voltage").inputValue()).toBe("6.5 kV");
  });

  it("said nothing on the console", () => expect(heard.complaints).toEqual([]));
});

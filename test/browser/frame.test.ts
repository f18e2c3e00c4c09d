import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { freshPage, goTo, type Heard, type Served, servePage, settled, startBrowser } from "../support/browser.ts";

let served: Served;
let browser: Browser;
let page: Page;
let heard: Heard;

beforeAll(async () => {
  served = await servePage(4310);
  browser = await startBrowser();
  ({ page, heard } = await freshPage(browser, served.url));
});
afterAll(async () => {
  await browser?.close();
  await served?.stop();
});

const short = () => page.locator('section[aria-label="in short"]').innerText();

describe("the page", () => {
  it("opens on Ask with a solved example", async () => {
    expect(await page.locator(".example").innerText()).toBe("example");
    expect(await short()).toMatch(/1000/);
    expect(await short()).toMatch(/6\.000\s*V/);
  });

  it("follows each keystroke in a field, as a copy, and undoes it", async () => {
    const field = page.getByLabel("working voltage");
    await field.focus();
    await field.press("Control+A");
    await page.keyboard.type("7k2");
    await settled(page);
    await expect.poll(short).toMatch(/7\.200\s*V/);
    expect(await page.locator(".example").count()).toBe(0);
    expect(await field.inputValue()).toBe("7k2");
    await field.press("Tab");
    await page.keyboard.press("Control+Z");
    await expect.poll(short).toMatch(/6\.000\s*V/);
    expect(await field.inputValue()).toBe("6 kV");
    await page.keyboard.press("Control+Shift+Z");
    await expect.poll(short).toMatch(/7\.200\s*V/);
    await page.keyboard.press("Control+Z");
    await settled(page);
  });

  it("keeps invalid text visible with its message, and loses nothing", async () => {
    const field = page.getByLabel("working voltage");
    await field.fill("6 kQ");
    await expect.poll(() => page.locator(".field .wrong").first().innerText()).toMatch(/not a form of V/);
    expect(await field.inputValue()).toBe("6 kQ");
    expect(await short()).toMatch(/6\.000\s*V/);
    await field.press("Escape");
    expect(await field.inputValue()).toBe("6 kV");
  });

  it("asks about 10m for a resistance instead of guessing", async () => {
    const field = page.getByLabel("source resistance");
    await field.fill("10m");
    const choices = page.locator(".field .wrong .plain-button");
    await expect.poll(() => choices.count()).toBe(2);
    await field.press("Escape");
    await settled(page);
  });

  it("opens the why of a number in place, follows its inputs, and closes with Escape", async () => {
    await page.locator(".in-short .figure-button").first().click();
    const why = page.locator(".why");
    await why.waitFor();
    expect(await why.innerText()).toMatch(/Scale factor, predicted/);
    expect(await why.innerText()).toMatch(/IEC 60060-2/);
    await why.locator(".figure-button").first().click();
    await expect.poll(() => why.innerText()).toMatch(/HV arm resistance/);
    await page.keyboard.press("Escape");
    expect(await why.count()).toBe(0);
  });

  it("steps through the column with the keyboard and opens an element's slip", async () => {
    const column = page.locator(".column-picture");
    await column.focus();
    await page.keyboard.press("End");
    expect(await column.getAttribute("aria-valuetext")).toMatch(/element 12 of 12, 6\.00/);
    expect(await page.locator(".slip").innerText()).toMatch(/element 12/);
    await page.keyboard.press("ArrowDown");
    expect(await column.getAttribute("aria-valuenow")).toBe("11");
    await page.keyboard.press("Escape");
  });

  it("opens the field of an assumed value from the list of them", async () => {
    const summary = page.locator(".assumed-count summary");
    const before = Number(/\d+/.exec(await summary.innerText())![0]);
    await summary.click();
    await page.getByRole("button", { name: "type source capacitance" }).click();
    const field = page.getByLabel("source capacitance");
    await expect.poll(() => field.evaluate((each) => each === document.activeElement)).toBe(true);
    await page.getByRole("button", { name: "accept source capacitance" }).click();
    await settled(page);
    await expect.poll(() => summary.innerText()).toContain(`assumed: ${before - 1}`);
    await page.keyboard.press("Control+Z");
    await settled(page);
    await expect.poll(() => summary.innerText()).toContain(`assumed: ${before}`);
  });

  it("keeps the theme chosen over a reload", async () => {
    const button = page.getByRole("button", { name: /^theme/ });
    const paper = () => page.evaluate(() => getComputedStyle(document.body).backgroundColor);
    await button.click();
    await button.click();
    expect(await button.innerText()).toBe("theme: dark");
    expect(await paper()).toBe("rgb(20, 24, 30)");
    await page.reload();
    await page.locator(".in-short dd").first().waitFor();
    expect(await paper()).toBe("rgb(20, 24, 30)");
    await button.click();
    expect(await paper()).toBe("rgb(250, 248, 244)");
  });

  it("writes into the file that is open, and asks for a place only once", async () => {
    await page.evaluate(() => {
      const kept = { asked: 0, texts: [] as string[] };
      const handle = {
        name: "mine.stringwright.json",
        createWritable: async () => ({
          write: async (text: string) => void kept.texts.push(text),
          close: async () => {},
        }),
      };
      const showSaveFilePicker = async () => {
        kept.asked++;
        return handle;
      };
      Object.assign(window, { kept, showSaveFilePicker });
    });
    await page.keyboard.press("Control+S");
    await page.keyboard.press("Control+S");
    const kept = () => page.evaluate(() => (window as unknown as { kept: { asked: number; texts: string[] } }).kept);
    await expect.poll(async () => (await kept()).texts.length).toBe(2);
    expect((await kept()).asked).toBe(1);
    expect(JSON.parse((await kept()).texts[0]!)).toMatchObject({ format: "stringwright", version: 1 });
    await expect.poll(() => page.locator(".head [role=status]").innerText()).toMatch(/file saved/);
  });

  it("starts from the engineer's own voltage with three answers", async () => {
    await page.getByRole("button", { name: "file", exact: true }).click();
    await page.getByText("New, from my own voltage").click();
    await page.getByLabel("how many volts").fill("15 kV");
    await page.getByLabel("of what kind").selectOption("dc");
    await page.getByLabel("what will read it").selectOption("meter-dc");
    await page.getByRole("button", { name: "size it" }).click();
    await expect.poll(short, { timeout: 15_000 }).toMatch(/15\.00\s*V|1\.500\s*V|7\.500\s*V|30\.00\s*V/);
    expect(await page.locator(".assumed-count summary").innerText()).toMatch(/assumed: \d+/);
  });

  it("keeps the work over a reload", async () => {
    await page.waitForTimeout(800);
    await page.reload();
    await page.locator(".in-short dd").first().waitFor();
    await goTo(page, "Ask");
    expect(await page.getByLabel("working voltage").inputValue()).toBe("15 kV");
  });

  it("refuses a broken document and keeps the one that is open", async () => {
    await page
      .locator('input[type="file"]')
      .first()
      .setInputFiles({ name: "broken.json", mimeType: "application/json", buffer: Buffer.from('{"brief": ') });
    await expect.poll(() => page.locator(".notice.bad").innerText()).toMatch(/broken\.json was not opened/);
    expect(await page.getByLabel("working voltage").inputValue()).toBe("15 kV");
    await page.getByRole("button", { name: "noted" }).click();
  });

  it("said nothing on the console and asked no other origin for anything", () => {
    expect(heard.complaints).toEqual([]);
    expect(heard.strangers).toEqual([]);
  });
});

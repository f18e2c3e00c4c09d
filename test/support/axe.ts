/** axe on the page as it stands, put in as plain source, so that the page's policy holds while it runs. */
import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import type { Page } from "playwright-core";

const source = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");

/** What axe objects to, each with the first place. */
export async function violations(page: Page): Promise<readonly string[]> {
  await page.evaluate(source);
  return page.evaluate(async () => {
    type Found = { violations: { id: string; nodes: { html: string }[] }[] };
    const runner = (globalThis as unknown as { axe: { run: () => Promise<Found> } }).axe;
    return (await runner.run()).violations.map((each) => `${each.id}: ${each.nodes[0]?.html.slice(0, 160)}`);
  });
}

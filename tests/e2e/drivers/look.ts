import path from "node:path";
import AxeBuilder from "@axe-core/playwright";
import { expect, type Page } from "@playwright/test";

/** Axe finds nothing in the whole page; the message names rule and place. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  const found = violations.flatMap(({ id, nodes }) =>
    nodes.map((node) => `${id}: ${node.target.join(" ")} ${node.failureSummary ?? ""}`),
  );
  expect(found).toEqual([]);
}

/** Nothing makes the page wider than its window. */
export async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const { content, room } = await page.evaluate(() => ({
    content: document.documentElement.scrollWidth,
    room: document.documentElement.clientWidth,
  }));
  expect(content).toBeLessThanOrEqual(room);
}

/** A picture for the readme. Kept in the repository only when BYSSUS_KEEP_PICTURES is set. */
export async function takePicture(page: Page, name: string): Promise<void> {
  const folder = process.env.BYSSUS_KEEP_PICTURES
    ? "tests/e2e/screenshots"
    : ".local/test-results/screenshots";
  await page.screenshot({ path: path.join(folder, `${name}.png`), animations: "disabled" });
}

import type { Browser } from "@playwright/test";
import { takePicture } from "@/tests/e2e/drivers/look";
import { mapDriver } from "@/tests/e2e/drivers/map";
import { expect, test } from "@/tests/e2e/drivers/people";

const desk = { width: 1440, height: 900 };
const phone = { width: 360, height: 780 };

/** The readme's pictures, as a visitor sees the demo. */
test("the map and the sheet are pictured for the readme", async ({ browser, baseURL }) => {
  await pictured(
    browser,
    baseURL,
    { viewport: desk, colorScheme: "light" },
    "/anchors/CM-01",
    "sheet-1440-light",
  );
  await pictured(
    browser,
    baseURL,
    { viewport: phone, colorScheme: "dark" },
    "/anchors/CM-01",
    "sheet-360-dark",
  );
  const context = await browser.newContext({ viewport: desk, colorScheme: "light", baseURL });
  const page = await context.newPage();
  const map = mapDriver(page);
  await map.open();
  await expect(map.canvas).toBeVisible();
  await page.waitForLoadState("networkidle");
  await takePicture(page, "map-1440-light");
  await context.close();
});

async function pictured(
  browser: Browser,
  baseURL: string | undefined,
  look: { viewport: typeof desk; colorScheme: "light" | "dark" },
  address: string,
  name: string,
): Promise<void> {
  const context = await browser.newContext({ ...look, baseURL });
  const page = await context.newPage();
  await page.goto(address);
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await takePicture(page, name);
  await context.close();
}

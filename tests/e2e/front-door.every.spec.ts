import { test } from "@playwright/test";
import { expectAccessible, expectNoSidewaysScroll } from "@/tests/e2e/drivers/look";

for (const address of ["/sign-in", "/forgot", "/caution"]) {
  test(`${address} is accessible and fits its window`, async ({ page }) => {
    await page.goto(address);
    await expectNoSidewaysScroll(page);
    await expectAccessible(page);
  });
}

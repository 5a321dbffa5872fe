import type { Page } from "@playwright/test";
import type { BoltTypeView } from "@/lib/schemas/views/register";
import { expectAccessible, expectNoSidewaysScroll } from "@/tests/e2e/drivers/look";
import { test } from "@/tests/e2e/drivers/people";
import { sheetAnswer } from "@/tests/e2e/drivers/sheet";

/** Every kind of page that is read, at both widths and in both themes. */
const FIXED = ["/sites", "/sites/gannet-cleft", "/sites/the-undercroft", "/areas/tarrow", "/spans", "/types"];
const SHEETS = ["CM-01", "FW-01", "PS-02", "UC-01", "LQ-29"];

for (const address of [...FIXED, ...SHEETS.map((code) => `/anchors/${code}`), "/anchors/no-such-anchor"]) {
  test(`${address} is accessible and fits its window`, async ({ page }) => {
    await expectFit(page, address);
  });
}

test("a bolt, a span, a report and a type are accessible and fit their window", async ({ page }) => {
  const sheet = await sheetAnswer(page.request, "CM-01");
  const { items: types }: { items: BoltTypeView[] } = await (
    await page.request.get("/api/v1/bolt-types")
  ).json();
  const bolt = sheet.placements.find((placement) => placement.bolt !== null)?.bolt;
  const addresses = [
    `/bolts/${bolt?.id ?? ""}`,
    `/spans/${sheet.spans[0]?.id ?? ""}`,
    `/reports/${sheet.reports[0]?.id ?? ""}`,
    `/types/${types[0]?.id ?? ""}`,
  ];
  for (const address of addresses) await expectFit(page, address);
});

test("what a steward sees of a sheet and of a rebolt to open is accessible and fits its window", async ({
  as,
}) => {
  const page = await as("steward");
  await expectFit(page, "/anchors/CM-01");
  await expectFit(page, "/anchors/CM-01/rebolt");
});

async function expectFit(page: Page, address: string): Promise<void> {
  await page.goto(address);
  await page.getByRole("heading", { level: 1 }).waitFor();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
}

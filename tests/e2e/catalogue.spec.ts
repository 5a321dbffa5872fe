import type { APIRequestContext } from "@playwright/test";
import { VERDICT_LABELS } from "@/lib/domain/labels";
import type { BoltTypeView, TypeMatrix } from "@/lib/schemas/views/register";
import { expect, test } from "@/tests/e2e/drivers/people";

const THIN_ROD = "8 mm twin-leg bent rod, 1.4401";

async function thinRod(request: APIRequestContext): Promise<BoltTypeView> {
  const { items }: { items: BoltTypeView[] } = await (await request.get("/api/v1/bolt-types")).json();
  const found = items.find(({ name }) => name === THIN_ROD);
  if (!found) throw new Error(`the catalogue has no ${THIN_ROD}`);
  return found;
}

test("the catalogue tells bending from breaking for every type, each with where it comes from", async ({
  page,
}) => {
  await page.goto("/types");
  const { items }: { items: BoltTypeView[] } = await (await page.request.get("/api/v1/bolt-types")).json();
  for (const { name, bendOnsetBasis } of items) {
    const row = page.getByRole("row").filter({ has: page.getByRole("link", { name, exact: true }) });
    await expect(row).toContainText(bendOnsetBasis === "unknown" ? "not known" : bendOnsetBasis);
  }
});

test("the matrix of a type says in every cell what the API answers, and refuses a thin bent rod for a highline", async ({
  page,
}) => {
  const { id } = await thinRod(page.request);
  await page.goto(`/types/${id}`);
  const matrix: TypeMatrix = await (await page.request.get(`/api/v1/bolt-types/${id}/matrix`)).json();
  const table = page.getByRole("table", { name: /^Verdict on/ });
  for (const place of matrix.places) {
    const row = table.getByRole("row").filter({ has: page.getByRole("rowheader", { name: place.label }) });
    const told = await row.getByRole("link").allTextContents();
    const wanted = matrix.cells.filter((cell) => cell.place === place.key);
    expect(told).toEqual(wanted.map((cell) => VERDICT_LABELS[cell.verdict]));
    expect(told[0], `highline, ${place.label}`).toBe("Do not use");
  }
});

test("a cell leads to its reasons and opens them", async ({ page }) => {
  const { id } = await thinRod(page.request);
  await page.goto(`/types/${id}`);
  const reasons = page.getByRole("list", { name: "Reasons: highline, Inland, washed by rain" });
  await expect(reasons).toBeHidden();
  await page
    .getByRole("table", { name: /^Verdict on/ })
    .getByRole("link", { name: "Do not use" })
    .first()
    .click();
  await expect(reasons).toBeVisible();
  await expect(reasons).toContainText("load.bend");
  await expect(reasons).toContainText("Clears when");
});

test("on a phone the matrix becomes a list by use, with the same verdicts", async ({ page }) => {
  await page.setViewportSize({ width: 360, height: 740 });
  const { id } = await thinRod(page.request);
  await page.goto(`/types/${id}`);
  await expect(page.getByRole("table", { name: /^Verdict on/ })).toBeHidden();
  const highline = page
    .locator("section")
    .filter({ has: page.getByRole("heading", { name: "Highline", level: 3 }) })
    .last();
  await expect(highline.getByText("Do not use")).toHaveCount(8);
});

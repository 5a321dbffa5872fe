import { expect, test } from "@/tests/e2e/drivers/people";
import { reportDriver } from "@/tests/e2e/drivers/report";

/** Thin bent rods at the cleft: the seeded anchor whose bolts bend early. */
const CODE = "GC-05";

test.describe.configure({ mode: "serial" });

test("a rigger reports a bend of 70° with a photo, and the anchor is out of use at once", async ({ as }) => {
  const page = await as("rigger");
  await page.goto(`/anchors/${CODE}`);
  await expect(page.getByText("It comes back only after")).toHaveCount(0);
  const report = reportDriver(page);
  await report.open(CODE, 1);
  await report.choose("Deformation");
  await report.bend("70");
  await report.grade("4 · failed or about to");
  await expect(report.warning).toBeVisible();
  await report.note.fill("Bent to the south after the storm.");
  await report.addPhoto();
  await report.send();
  await expect(page.getByText("The bolt and its anchor are out of use")).toBeVisible({ timeout: 30_000 });
  await expect(page.getByRole("img", { name: /deformation/i })).toBeVisible();
  await page.goto(`/anchors/${CODE}`);
  await expect(page.getByText("Out of use", { exact: true }).filter({ visible: true }).first()).toBeVisible();
  await expect(page.getByText("Bend reported").filter({ visible: true }).first()).toBeVisible();
});

test("the copy of the photo that others see carries no place and no serial number", async ({ as }) => {
  const page = await as("rigger");
  await page.goto(`/anchors/${CODE}`);
  const image = page.locator("#reports img").first();
  const response = await page.request.get((await image.getAttribute("src")) ?? "");
  expect(response.status()).toBe(200);
  const bytes = await response.body();
  expect(bytes.length).toBeGreaterThan(100);
  expect(bytes.includes("secret-serial-4711")).toBe(false);
  expect(bytes.includes("Exif")).toBe(false);
});

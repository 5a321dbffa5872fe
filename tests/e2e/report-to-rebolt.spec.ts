import type { Page } from "@playwright/test";
import { installDriver } from "@/tests/e2e/drivers/install";
import { phonePhoto } from "@/tests/e2e/drivers/picture";
import { takePicture } from "@/tests/e2e/drivers/look";
import { expect, test } from "@/tests/e2e/drivers/people";
import { reportDriver } from "@/tests/e2e/drivers/report";

/** Thin bent rods at the cleft: the seeded anchor whose bolts bend early. */
const CODE = "GC-05";

/** The job stays at one address, whatever its state; the steward learns it from the queue. */
let jobAddress: string | null = null;

test.describe.configure({ mode: "serial" });

test("a rigger reports a bend of 70° with a photo, and the anchor is out of use at once", async ({ as }) => {
  const page = await as("rigger");
  await page.goto(`/anchors/${CODE}`);
  await expect(page.getByText("In service").first()).toBeVisible();
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
  await expect(page.getByText("Out of use").first()).toBeVisible();
  await expect(page.getByText("Bend reported").first()).toBeVisible();
});

test("the copy of the photo that others see carries no place and no serial number", async ({ as }) => {
  const page = await as("rigger");
  await page.goto(`/anchors/${CODE}`);
  const image = page.locator("#reports img").first();
  const response = await page.request.get((await image.getAttribute("src")) ?? "");
  expect(response.status()).toBe(200);
  const bytes = await response.body();
  expect(bytes.length).toBeGreaterThan(500);
  expect(bytes.includes("secret-serial-4711")).toBe(false);
  expect(bytes.includes("Exif")).toBe(false);
});

test("the steward finds it on top of the queue with its reasons, accepts it and gives it to the bolter", async ({
  as,
}) => {
  const page = await as("steward");
  await page.goto("/queue");
  const first = page
    .getByRole("row")
    .filter({ hasText: /[A-Z]{2}-\d\d/ })
    .first();
  await expect(first).toContainText(CODE);
  await expect(first).toContainText("Bend");
  await takePicture(page, "queue-1440-light");
  await first.getByRole("link").first().click();
  await expect(page.getByText("Why this rank")).toBeVisible();
  jobAddress = page.url();
  await page.getByRole("button", { name: "Accept", exact: true }).click();
  await page.getByLabel("Tarrow bolter").check();
  await page.getByRole("button", { name: "Give it to them" }).click();
  await expect(page.getByText("Tarrow bolter").first()).toBeVisible();
});

test("mail about it has arrived", async ({ as }) => {
  const page = await as("steward");
  await expect(async () => {
    await page.goto("/mailbox");
    await expect(page.getByText(new RegExp(`out of use`, "i")).first()).toBeVisible({ timeout: 2000 });
  }).toPass({ timeout: 60_000 });
});

test("the bolter closes the job with a new bolt, the fate of the hole and a photo", async ({ as }) => {
  const page = await as("bolter");
  await openJob(page);
  await page.getByRole("radio", { name: /^New bolt/ }).check();
  await installDriver(page).chooseType("M12 stud and hanger, 1.4462");
  await page.getByLabel(/^Depth that holds/).fill("90");
  await page.getByLabel(/^Torque in/).fill("60");
  await page.getByLabel(/^Why it came out/).fill("Bent to 70°");
  await page.getByLabel("What became of the old hole").selectOption({ label: "Plugged" });
  await page.getByLabel(/^Photo of the finished work/).setInputFiles(await phonePhoto());
  await page.getByRole("button", { name: "Close the job" }).click();
  await expect(page.getByText(/^Done: new bolt/)).toBeVisible({ timeout: 30_000 });
});

test("putting it back is refused while neighbours are not checked by hand, and names them", async ({
  as,
}) => {
  const page = await as("steward");
  await openJob(page);
  await page.getByLabel("Why it may be used again").fill("New bolt set.");
  await page.getByRole("button", { name: "Put it back" }).click();
  await expect(page.getByRole("alert")).toContainText("Placement 2 was not checked by hand since.");
});

test("every neighbour is checked by hand with a photo, and then the anchor comes back", async ({ as }) => {
  const page = await as("steward");
  await openJob(page);
  for (const placement of [2, 3, 4, 5]) {
    await page.getByText(`Check placement ${placement} by hand`).click();
    await page.getByLabel(`Photo of placement ${placement}`).setInputFiles(await phonePhoto());
    await page.getByRole("button", { name: "Handled, and nothing found against it" }).click();
    await expect(page.getByText(`Check placement ${placement} by hand`)).toHaveCount(0, { timeout: 30_000 });
  }
  await page.getByLabel("Why it may be used again").fill("New bolt set, neighbours sound.");
  await page.getByRole("button", { name: "Put it back" }).click();
  await page.goto(`/anchors/${CODE}`);
  await expect(page.getByText("It comes back only after")).toHaveCount(0);
});

test("the sheet shows the new bolt and the chain of the hole", async ({ as }) => {
  const page = await as("rigger");
  await page.goto(`/anchors/${CODE}`);
  await expect(page.locator("#history")).toContainText("Bent to 70°");
  await expect(page.locator("#bolts")).toContainText("M12 stud and hanger, 1.4462");
});

async function openJob(page: Page): Promise<void> {
  if (jobAddress === null) throw new Error("The steward's test opens the job first.");
  await page.goto(jobAddress);
}

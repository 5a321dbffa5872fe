import { installDriver } from "@/tests/e2e/drivers/install";
import { expect, test } from "@/tests/e2e/drivers/people";
import { reportDriver } from "@/tests/e2e/drivers/report";

test("a bolter sees a thin bent rod refused for a highline before anything is stored", async ({ as }) => {
  const page = await as("bolter");
  const install = installDriver(page);
  await install.open("CM-02");
  await install.chooseType("8 mm twin-leg bent rod, 1.4401");
  const verdict = install.verdictFor("highline");
  await expect(verdict).toContainText("Do not use");
  await expect(verdict).toContainText("load.bend");
});

test("a bolter sees a 1.4301 bolt refused beside the sea", async ({ as }) => {
  const page = await as("bolter");
  const install = installDriver(page);
  await install.open("GC-06");
  await install.chooseType("M10 stud and hanger, 1.4301");
  const verdict = install.verdictFor("highline");
  await expect(verdict).toContainText("Do not use");
  await expect(verdict).toContainText("metal.class");
});

test("a glued install is stored, kept out of use while it cures, and stands on the sheet", async ({ as }) => {
  const page = await as("bolter");
  const install = installDriver(page);
  await install.open("FW-01");
  await install.chooseType("12 mm forged eye");
  await install.fillNewHole("900", "300");
  await install.depth("100");
  await page.getByLabel("Adhesive", { exact: true }).selectOption({ index: 1 });
  await page.getByLabel(/^Glue in/).fill("15");
  await page.getByLabel(/^Rock in/).fill("12");
  await expect(install.curing).toBeVisible();
  await install.store();
  await page.waitForURL(/\/anchors\/FW-01\?installed=/);
  await expect(page.getByText("Stored.")).toBeVisible();
  await expect(page.locator("#reasons")).toContainText("record.curing");
  await expect(page.locator("#bolts")).toContainText("12 mm forged eye");
});

test("what was typed survives a reload", async ({ as }) => {
  const page = await as("rigger");
  const report = reportDriver(page);
  await report.open("CM-02", 1);
  await report.choose("Deformation");
  await report.bend("12,5");
  await report.note.fill("cold hands");
  await page.reload();
  await expect(report.note).toHaveValue("cold hands");
  await expect(report.bendField).toHaveValue("12,5");
  await expect(page.getByText("What you typed before is still here")).toBeVisible();
});

test("a file that is no photo is refused in words, and the report is stored all the same", async ({ as }) => {
  const page = await as("rigger");
  const report = reportDriver(page);
  await report.open("FW-02", 1);
  await report.choose("Other");
  await report.note.fill("A picture that is none.");
  await report.addFile({
    name: "notes.jpg",
    mimeType: "image/jpeg",
    buffer: Buffer.from("not a picture at all"),
  });
  await report.send();
  await expect(page.getByText("The report is stored.")).toBeVisible({ timeout: 30_000 });
  await expect(page.getByText("not taken", { exact: true })).toBeVisible();
});

test("a rigger who opens the install form is told who may, not shown it", async ({ as }) => {
  const page = await as("rigger");
  await page.goto("/anchors/CM-02/install");
  await expect(page.getByText("Bolters of this area log installs")).toBeVisible();
  await expect(page.getByRole("button", { name: "Store the install" })).toHaveCount(0);
});

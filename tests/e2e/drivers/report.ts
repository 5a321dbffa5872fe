import { expect, type Page } from "@playwright/test";
import { phonePhoto } from "@/tests/e2e/drivers/picture";

/** The report form as somebody at the anchor uses it. */
export function reportDriver(page: Page) {
  return {
    async open(code: string, placement: number) {
      await page.goto(`/report?anchor=${code}&placement=${placement}`);
      await expect(page.getByRole("heading", { name: "Report what you saw" })).toBeVisible();
    },
    async choose(kind: string, depth = "Handled") {
      await page.getByRole("radio", { name: new RegExp(`^${kind}`) }).check();
      await page.getByRole("radio", { name: new RegExp(`^${depth}`) }).check();
    },
    async bend(degrees: string) {
      await page.getByLabel(/^Bend in/).fill(degrees);
    },
    grade: (label: string) => page.getByLabel("How bad is the worst part?").selectOption({ label }),
    note: page.getByLabel(/^Note/),
    bendField: page.getByLabel(/^Bend in/),
    warning: page.getByText("takes the bolt and the whole anchor out of use at once"),
    async addPhoto() {
      await page.getByLabel(/^Photos/).setInputFiles(await phonePhoto());
      await expect(page.getByText("bolt.jpg")).toBeVisible();
    },
    addFile: (file: { name: string; mimeType: string; buffer: Buffer }) =>
      page.getByLabel(/^Photos/).setInputFiles(file),
    async send() {
      await page.getByRole("button", { name: "Send the report" }).click();
    },
  };
}

import { expect, type Page } from "@playwright/test";

/** The install form as a bolter uses it. */
export function installDriver(page: Page) {
  const type = page.getByRole("combobox", { name: /^Type/ });
  return {
    async open(code: string, query = "") {
      await page.goto(`/anchors/${code}/install${query}`);
      await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
    },
    async chooseType(name: string) {
      await type.click();
      await type.fill(name);
      await page
        .getByRole("option", { name: new RegExp(name.replace(/[.+]/g, "\\$&")) })
        .first()
        .click();
    },
    verdictFor: (use: string) => page.locator(`[data-use="${use}"]`),
    async fillNewHole(x: string, y: string) {
      await page.getByLabel(/^Hole$/).selectOption({ label: "A new hole" });
      await page.getByLabel(/^Right of placement 1/).fill(x);
      await page.getByLabel(/^Above placement 1/).fill(y);
    },
    depth: (mm: string) => page.getByLabel(/^Depth that holds/).fill(mm),
    async glue(name: string, glueC: string, rockC: string) {
      await page.getByLabel("Adhesive", { exact: true }).selectOption({ label: name });
      await page.getByLabel(/^Glue in/).fill(glueC);
      await page.getByLabel(/^Rock in/).fill(rockC);
      await page.getByLabel(/^Hole cleaned/).selectOption({ label: "Brushed and blown out" });
    },
    curing: page.getByText(/^Out of use until/),
    store: () => page.getByRole("button", { name: "Store the install" }).click(),
  };
}

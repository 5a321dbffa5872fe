import AxeBuilder from "@axe-core/playwright";
import { expect, test } from "@playwright/test";
import { mapDriver, middleOf } from "./drivers/map";

test("a link to an anchor opens its panel with condition, verdict, reasons and the ways on", async ({
  page,
}) => {
  const map = mapDriver(page);
  const { anchors } = await map.answer();
  const bad = anchors.features.find(
    ({ properties }) => properties.exact && properties.condition === "out_of_use",
  );
  expect(bad, "the island has an anchor out of use that everybody may see").toBeDefined();
  const code = bad?.properties.code ?? "";
  await map.open(`?anchor=${code}`);
  await expect(map.panel).toContainText("Out of use");
  await expect(map.panel).toContainText("Do not use");
  await expect(map.panel.getByRole("list", { name: "Worst reasons" }).getByRole("listitem")).not.toHaveCount(
    0,
  );
  await expect(map.panel.getByRole("link", { name: "Open the sheet" })).toHaveAttribute(
    "href",
    `/anchors/${code}`,
  );
  await expect(map.panel.getByRole("link", { name: "Report" })).toHaveAttribute(
    "href",
    `/report?anchor=${code}`,
  );
  await expect(map.row(code)).toHaveAttribute("aria-current", "true");
});

test("a link to an anchor that is not there says so, and no more than for a hidden one", async ({ page }) => {
  const map = mapDriver(page);
  await map.open("?anchor=NOPE-1");
  await expect(map.panel).toContainText("There is no anchor with this code, or it is not shown to you.");
});

test("the list has exactly the anchors and spans the map is given", async ({ page }) => {
  const map = mapDriver(page);
  await map.open();
  const { anchors, spans } = await map.answer();
  const codes = await map.codes();
  expect([...codes].sort()).toEqual(anchors.features.map(({ properties }) => properties.code).sort());
  await expect(map.spans).toHaveCount(spans.features.length);
  await expect(map.result).toContainText(`${anchors.features.length} anchors`);
});

test("a changed word changes the list, the count and the address; the database agrees", async ({ page }) => {
  const map = mapDriver(page);
  await map.open();
  const all = await map.rows.count();
  await map.choose("Fixing", "glued bent rod");
  const rods = await map.answer("?form=glued_bent_rod");
  expect(rods.anchors.features.length).toBeLessThan(all);
  await expect(map.rows).toHaveCount(rods.anchors.features.length);
  await expect(map.result).toContainText(`${rods.anchors.features.length} of ${all} anchors`);
  await expect(page).toHaveURL(/fixing=glued_bent_rod/);

  await map.choose("Distance from the sea", "within 250");
  const near = await map.answer("?form=glued_bent_rod&seaWithinM=250");
  await expect(map.rows).toHaveCount(near.anchors.features.length);

  await page.reload();
  await expect(map.rows).toHaveCount(near.anchors.features.length);
  await page.getByRole("link", { name: "Show every anchor" }).click();
  await expect(map.rows).toHaveCount(all);
});

test("without a script the list still reads, and follows the sentence in the address", async ({
  browser,
}) => {
  const context = await browser.newContext({ javaScriptEnabled: false });
  const page = await context.newPage();
  const map = mapDriver(page);
  const { anchors } = await map.answer("?site=fellgate-wall");
  await map.open("?site=fellgate-wall");
  await expect(map.rows).toHaveCount(anchors.features.length);
  await context.close();
});

test("a group shows the worst condition inside and its split, and opens when it is pressed", async ({
  page,
}) => {
  const map = mapDriver(page);
  const { anchors } = await map.answer("?site=crown-moor");
  const members = anchors.features;
  const worst = members.filter(
    ({ properties: { condition, verdict } }) => condition === "out_of_use" || verdict === "do_not_use",
  ).length;
  expect(worst).toBeGreaterThan(0);
  expect(worst).toBeLessThan(members.length);
  const { lon, lat } = middleOf(members.map(({ geometry }) => geometry.coordinates));
  await map.open(`?site=crown-moor&at=${lat.toFixed(5)},${lon.toFixed(5)},10`);
  await expect
    .poll(() => map.pointAtMiddle(), { timeout: 60_000 })
    .toContain(`Group of ${members.length}: ${worst} out of use or “do not use”`);
  await map.pressMiddle();
  await expect
    .poll(() => new URL(page.url()).searchParams.get("at"), { timeout: 30_000 })
    .toMatch(/,1[1-9]\.\d\d$/);
});

test("a mark that is pressed opens its panel, and the panel is closed by its key", async ({ page }) => {
  const map = mapDriver(page);
  const { anchors } = await map.answer("?site=gannet-cleft");
  const one = anchors.features.find(({ properties }) => properties.exact);
  const [lon, lat] = one?.geometry.coordinates ?? [0, 0];
  const code = one?.properties.code ?? "";
  await map.open(`?q=${code}&at=${lat},${lon},17.5`);
  await expect.poll(() => map.pointAtMiddle(), { timeout: 60_000 }).toContain(code);
  await map.pressMiddle();
  await expect(map.panel).toContainText(code);
  await page.keyboard.press("Escape");
  await expect(map.panel).toHaveCount(0);
});

test("the keyboard moves the map and opens the mark in the middle", async ({ page }) => {
  const map = mapDriver(page);
  const { anchors } = await map.answer("?site=gannet-cleft");
  const one = anchors.features.find(({ properties }) => properties.exact);
  const [lon, lat] = one?.geometry.coordinates ?? [0, 0];
  const code = one?.properties.code ?? "";
  await map.open(`?q=${code}&at=${lat},${lon},17.5`);
  await expect.poll(() => map.pointAtMiddle(), { timeout: 60_000 }).toContain(code);
  await page.mouse.move(5, 5);
  await map.canvas.focus();
  await page.keyboard.press("ArrowRight");
  await expect
    .poll(() => new URL(page.url()).searchParams.get("at"), { timeout: 30_000 })
    .not.toContain(`${lon.toFixed(5)},`);
  await page.keyboard.press("Enter");
  await expect(map.panel).toContainText(code);
});

test("to a visitor a sensitive site is a soft circle with words, its anchors without a distance", async ({
  page,
}) => {
  const map = mapDriver(page);
  const { anchors } = await map.answer();
  const hidden = anchors.features.filter(({ properties }) => !properties.exact);
  expect(hidden.length).toBeGreaterThan(0);
  const [first] = hidden;
  const places = new Set(hidden.map(({ geometry }) => geometry.coordinates.join()));
  expect(places.size).toBe(new Set(hidden.map(({ properties }) => properties.siteSlug)).size);
  await map.open(`?site=${first?.properties.siteSlug}`);
  await expect(page.getByRole("region", { name: first?.properties.siteName })).toContainText(
    "exact place is known to members only",
  );
  await expect(map.row(first?.properties.code ?? "")).not.toContainText("from the sea");
});

for (const [width, scheme] of [
  [1440, "light"],
  [360, "dark"],
] as const) {
  test(`nothing to object to at ${width} px, ${scheme}`, async ({ page }) => {
    await page.setViewportSize({ width, height: 800 });
    await page.emulateMedia({ colorScheme: scheme });
    const map = mapDriver(page);
    await map.open("?anchor=CM-01");
    await expect(map.canvas).toBeVisible({ timeout: 60_000 });
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id, nodes }) => [id, nodes.map(({ html }) => html.slice(0, 160))])).toEqual([]);
    const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
    expect(overflow).toBeLessThanOrEqual(0);
  });
}

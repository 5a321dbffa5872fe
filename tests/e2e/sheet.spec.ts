import { expectNoSidewaysScroll } from "@/tests/e2e/drivers/look";
import { expect, test } from "@/tests/e2e/drivers/people";
import { sheetAnswer, sheetDriver } from "@/tests/e2e/drivers/sheet";

/** West end of the long line: thin rods, one of them bent. */
const BENT = "CM-01";
/** In the sea cave whose place is kept to members. */
const HIDDEN = "UC-03";

test("a sheet gives the verdict with its caution, and every reason once, as the API tells them", async ({
  page,
}) => {
  const sheet = sheetDriver(page);
  await sheet.open(BENT);
  const answer = await sheetAnswer(page.request, BENT);
  await expect(page.getByRole("heading", { level: 2, name: "Do not use" })).toBeVisible();
  await expect(page.getByText(answer.caution).first()).toBeVisible();
  const numbers = new Set(answer.findings.map(({ number }) => number));
  expect(numbers.size).toBeGreaterThan(1);
  expect(numbers.size).toBeLessThan(answer.findings.length);
  await expect(sheet.reasons).toHaveCount(numbers.size);
  await expect(sheet.key).toHaveCount(numbers.size);
});

test("the key beside the drawing leads to the reason, which names rule, assumptions and what clears it", async ({
  page,
}) => {
  const sheet = sheetDriver(page);
  await sheet.open(BENT);
  await sheet.key.first().click();
  await expect(page).toHaveURL(/#reason-1$/);
  const reason = sheet.reason(1);
  await expect(reason).toBeInViewport();
  await expect(reason).toContainText("load.bend");
  await expect(reason).toContainText("bends from");
  for (const name of ["Assumed", "Rule", "Clears when"]) await expect(reason).toContainText(name);
});

test("the parts list has every placement with what is in it, and says where a bend onset comes from", async ({
  page,
}) => {
  const sheet = sheetDriver(page);
  await sheet.open(BENT);
  const { placements } = await sheetAnswer(page.request, BENT);
  await expect(sheet.parts).toHaveCount(placements.length);
  for (const [index, { number, bolt }] of placements.entries()) {
    const row = sheet.parts.nth(index);
    await expect(row.getByRole("rowheader")).toHaveText(String(number));
    if (bolt === null) continue;
    await expect(row).toContainText(bolt.typeName ?? "");
    await expect(row).toContainText(bolt.bendOnsetBasis === "unknown" ? "not known" : bolt.bendOnsetBasis);
  }
});

test("the drawing is told in words, a line for each placement", async ({ page }) => {
  const sheet = sheetDriver(page);
  await sheet.open(BENT);
  await expect(sheet.drawing).toBeVisible();
  const { placements } = await sheetAnswer(page.request, BENT);
  await sheet.inWords.click();
  const lines = await sheet.twin.allTextContents();
  for (const { number } of placements) {
    expect(lines.some((line) => line.startsWith(`bolt ${number}`))).toBe(true);
  }
});

test("natural placements stand in the parts list beside bolts", async ({ page }) => {
  const sheet = sheetDriver(page);
  await sheet.open("PS-02");
  const { placements } = await sheetAnswer(page.request, "PS-02");
  const natural = placements.filter(({ kind }) => kind !== "bolt");
  expect(natural.length).toBeGreaterThan(0);
  for (const { kind } of natural) {
    await expect(sheet.parts.filter({ hasText: new RegExp(kind, "i") })).not.toHaveCount(0);
  }
});

test("to an outsider the sheet of a hidden place gives nothing it could be found by", async ({
  page,
  as,
}) => {
  const member = await as("rigger");
  const known = await sheetAnswer(member.request, HIDDEN);
  expect(known.exact).toBe(true);
  const sheet = sheetDriver(page);
  await sheet.open(HIDDEN);
  await expect(page.getByText("Members see the place")).toBeVisible();
  const text = await page.content();
  const [lon, lat] = known.point.coordinates;
  for (const degrees of [lon, lat]) expect(text).not.toContain(Math.abs(degrees).toFixed(4));
  expect(known.sea).not.toBeNull();
  for (const word of ["To the sea", "Design load", "F1", "above the sea"]) expect(text).not.toContain(word);

  await member.goto(`/anchors/${HIDDEN}`);
  await expect(member.getByText(`${Math.abs(lat).toFixed(5)}°`, { exact: false }).first()).toBeVisible();
  await expect(member.getByText("To the sea")).toBeVisible();
});

test("each reader is offered what they may do, and nothing else", async ({ page, as }) => {
  const visitor = sheetDriver(page);
  await visitor.open(BENT);
  await expect(visitor.report).toBeVisible();
  await expect(visitor.install).toHaveCount(0);
  await expect(visitor.change).toHaveCount(0);
  await expect(visitor.follow).toHaveCount(0);

  const rigger = sheetDriver(await as("rigger"));
  await rigger.open(BENT);
  await expect(rigger.follow.or(rigger.following)).toBeVisible();
  await expect(rigger.install).toHaveCount(0);
  await expect(rigger.change).toHaveCount(0);

  const bolterPage = await as("bolter");
  const bolter = sheetDriver(bolterPage);
  await bolter.open(BENT);
  await expect(bolter.install).toBeVisible();
  await bolter.change.click();
  await expect(bolterPage.getByRole("menuitem", { name: "Move the anchor" })).toBeVisible();
  await expect(bolterPage.getByRole("menuitem", { name: "Open a rebolt" })).toHaveCount(0);

  const stewardPage = await as("steward");
  const steward = sheetDriver(stewardPage);
  await steward.open(BENT);
  await steward.change.click();
  await expect(stewardPage.getByRole("menuitem", { name: "Open a rebolt" })).toBeVisible();
  await expect(stewardPage.getByRole("menuitem", { name: "Put back in service" })).toBeVisible();
});

test("following an anchor is kept, and can be ended", async ({ as }) => {
  const page = await as("rigger");
  const sheet = sheetDriver(page);
  await sheet.open("GC-09");
  await sheet.follow.click();
  await expect(sheet.following).toBeVisible();
  await page.reload();
  await sheet.following.click();
  await expect(sheet.follow).toBeVisible();
});

test("a bolt's own sheet shows its predecessors in the hole, each with why it went", async ({ page }) => {
  const { placements } = await sheetAnswer(page.request, "GC-01");
  const placement = placements.find(({ former }) => former.length > 0);
  const before = placement?.former[0];
  expect(before?.removedWhy, "the island has a bolt that replaced another one").toBeTruthy();
  await page.goto(`/bolts/${placement?.bolt?.id ?? ""}`);
  await expect(page.getByText(before?.removedWhy ?? "", { exact: false }).first()).toBeVisible();
  await page.getByRole("link", { name: before?.typeName ?? "" }).click();
  await expect(page.getByText("No longer in the rock")).toBeVisible();
  await expect(page.getByRole("heading", { level: 2, name: "Reasons" })).toHaveCount(0);
});

test("a steward opens a rebolt by hand and finds it in the queue; a bolter is not let", async ({ as }) => {
  const bolter = await as("bolter");
  await bolter.goto("/anchors/LQ-13/rebolt");
  await expect(bolter.getByText("Stewards of this area open rebolts")).toBeVisible();

  const page = await as("steward");
  await page.goto("/anchors/LQ-13/rebolt");
  await page.getByRole("button", { name: "Open it" }).click();
  await expect(page.getByRole("alert").filter({ hasText: "Name at least one placement." })).toBeVisible();
  await page.getByLabel("What is to be done").fill("Renew the pair of eyes");
  await page.getByRole("checkbox", { name: /^1 · / }).check();
  await page.getByRole("button", { name: "Open it" }).click();
  await expect(page).toHaveURL(/\/queue\/[0-9a-f-]{36}$/);
  await expect(page.getByRole("heading", { level: 1 })).toContainText("Renew the pair of eyes");
  await page.goto("/queue");
  await expect(page.getByRole("link", { name: "Renew the pair of eyes" })).toBeVisible();
});

test("printed, a sheet is a drawing on A4: nothing to press, all of it there", async ({ page }) => {
  const sheet = sheetDriver(page);
  await sheet.open(BENT);
  await page.emulateMedia({ media: "print" });
  // 210 mm less two margins of 12 mm, at 96 px an inch.
  await page.setViewportSize({ width: 703, height: 1032 });
  await expectNoSidewaysScroll(page);
  await expect(page.getByRole("navigation", { name: "Main", exact: true })).toBeHidden();
  await expect(sheet.report).toBeHidden();
  await expect(sheet.drawing).toBeVisible();
  await expect(sheet.parts.first().getByRole("rowheader")).toBeVisible();
  await expect(sheet.revisions).toBeVisible();
  expect((await page.pdf({ format: "A4", preferCSSPageSize: true })).subarray(0, 4).toString()).toBe("%PDF");
});

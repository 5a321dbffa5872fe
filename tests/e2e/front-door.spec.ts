import { expect, PEOPLE, test } from "@/tests/e2e/drivers/people";

test("the application says that it is up and ready", async ({ request }) => {
  expect(await (await request.get("/api/health")).json()).toEqual({ status: "up" });
  const ready = await request.get("/api/health/ready");
  expect(ready.status()).toBe(200);
  expect(await ready.json()).toMatchObject({ ready: true, database: "up", migrations: "current" });
});

test("every page comes with a policy that runs only scripts of this answer", async ({ request }) => {
  const nonces = await Promise.all(
    ["/sign-in", "/sign-in"].map(async (address) => {
      const headers = (await request.get(address)).headers();
      expect(headers["x-powered-by"]).toBeUndefined();
      return /script-src 'self' 'nonce-([^']+)' 'strict-dynamic'/.exec(
        headers["content-security-policy"] ?? "",
      )?.[1];
    }),
  );
  expect(nonces[0]).toBeTruthy();
  expect(nonces[0]).not.toBe(nonces[1]);
});

for (const person of PEOPLE) {
  test(`the demo's ${person} comes in with one press`, async ({ as }) => {
    const page = await as(person);
    await page.goto("/settings");
    await expect(page.getByRole("button", { name: `Account: Tarrow ${person}` })).toBeVisible();
  });
}

test("a wrong password is refused in words and the address stays", async ({ page }) => {
  await page.goto("/sign-in");
  await page.getByLabel("E-mail").first().fill("rigger@demo.byssus.example");
  await page.getByLabel("Password", { exact: true }).fill("not the password");
  await page.getByRole("button", { name: "Sign in", exact: true }).click();
  await expect(page.getByText("E-mail and password do not belong together.").first()).toBeVisible();
  await expect(page.getByLabel("E-mail").first()).toHaveValue("rigger@demo.byssus.example");
});

test("what does not exist is answered as not found", async ({ page }) => {
  const answer = await page.goto("/anchors/no-such-anchor");
  expect(answer?.status()).toBe(404);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Nothing here, or not shown to you");
});

test("the map's page asks nobody but its own server", async ({ page, baseURL }) => {
  const strangers = new Set<string>();
  page.on("request", (request) => {
    const { origin, protocol } = new URL(request.url());
    if (protocol.startsWith("http") && origin !== baseURL) strangers.add(origin);
  });
  await page.goto("/", { waitUntil: "networkidle" });
  expect([...strangers]).toEqual([]);
});

import { type BrowserContext, type Page, test as base } from "@playwright/test";

export const PEOPLE = ["administrator", "steward", "bolter", "rigger", "visitor"] as const;
export type Person = (typeof PEOPLE)[number];

type State = Awaited<ReturnType<BrowserContext["storageState"]>>;

/** Sign-ins are counted and limited, so everybody signs in once and keeps the session. */
const sessions = new Map<Person, State>();

/** Signs in as one of the demo's people by the button of the sign-in page. */
export async function signInAs(page: Page, person: Person): Promise<void> {
  await page.goto("/sign-in");
  await page.getByRole("button", { name: `Enter as Tarrow ${person}` }).click();
  await page.waitForURL((url) => url.pathname === "/");
}

/** Tests that need somebody signed in: `const page = await as("steward")`, one page a person and test. */
export const test = base.extend<{ as: (person: Person) => Promise<Page> }>({
  as: async ({ browser, contextOptions, baseURL }, give) => {
    const opened: BrowserContext[] = [];
    await give(async (person) => {
      const storageState = sessions.get(person);
      const context = await browser.newContext({ ...contextOptions, baseURL, storageState });
      opened.push(context);
      const page = await context.newPage();
      if (storageState === undefined) {
        await signInAs(page, person);
        sessions.set(person, await context.storageState());
      }
      return page;
    });
    await Promise.all(opened.map((context) => context.close()));
  },
});

export { expect } from "@playwright/test";

import type { APIRequestContext, Page } from "@playwright/test";
import type { AnchorSheet, AnchorSummary } from "@/lib/schemas/views/anchor";

/** An anchor's sheet as people read it. */
export function sheetDriver(page: Page) {
  const drawing = page.getByRole("img", { name: /^Face drawing of/ });
  return {
    drawing,
    async open(code: string) {
      await page.goto(`/anchors/${code}`);
      await page.getByRole("heading", { level: 1 }).waitFor();
    },
    key: page.getByRole("navigation", { name: "Key to the drawing" }).getByRole("link"),
    reasons: page.getByRole("list", { name: "Reasons" }).locator(":scope > li"),
    reason: (number: number) => page.locator(`#reason-${number}`),
    /** Rows of the parts list, without its head. */
    parts: page
      .getByRole("table", { name: "Placements and the bolts in them" })
      .getByRole("row")
      .filter({
        has: page.getByRole("rowheader"),
      }),
    revisions: page.getByRole("table", { name: "Revisions, newest first" }),
    inWords: page.getByText("The drawing in words"),
    twin: page.locator("figure details dl > div"),
    follow: page.getByRole("button", { name: "Follow", exact: true }),
    following: page.getByRole("button", { name: "Following" }),
    install: page.getByRole("link", { name: "Log an install" }),
    report: page.getByRole("link", { name: "Report what you saw" }),
    change: page.getByRole("button", { name: "Change…" }),
  };
}

/** What a program is told about the same anchor, by the reader's own session. */
export async function sheetAnswer(request: APIRequestContext, code: string): Promise<AnchorSheet> {
  const { items }: { items: AnchorSummary[] } = await (await request.get(`/api/v1/anchors?q=${code}`)).json();
  const id = items.find((anchor) => anchor.code === code)?.id ?? code;
  return (await request.get(`/api/v1/anchors/${id}`)).json();
}

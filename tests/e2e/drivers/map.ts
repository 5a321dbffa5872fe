import { expect, type Locator, type Page } from "@playwright/test";

/** The words of the sentence, by the names their pickers have. */
export type Word = "Condition" | "Fixing" | "Metal" | "Use" | "Distance from the sea" | "Site";

interface MapAnswer {
  anchors: { features: { properties: MapAnchorRow; geometry: { coordinates: [number, number] } }[] };
  spans: { features: unknown[] };
}

export interface MapAnchorRow {
  code: string;
  siteSlug: string;
  siteName: string;
  condition: string;
  verdict: string | null;
  exact: boolean;
}

/** The map page as a person uses it. Every selector of it is in this file. */
export function mapDriver(page: Page) {
  const rows: Locator = page.locator("[data-anchor]");
  const canvas: Locator = page.locator("canvas.maplibregl-canvas");
  return {
    rows,
    canvas,
    panel: page.getByRole("region").filter({ has: page.getByRole("button", { name: "Close the panel" }) }),
    /** "14 of 115 anchors, 3 spans". */
    result: page.getByRole("status").filter({ hasText: /\d+ anchors?, / }),
    reading: page.getByRole("status").filter({ hasText: /Point at a mark|Group of|In the middle|: / }),
    spans: page.locator("[data-span]"),

    async open(query = "") {
      await page.goto(`/${query}`);
      await expect(rows.first()).toBeVisible();
    },

    async choose(word: Word, label: string) {
      const picker = page.getByRole("combobox", { name: word, exact: true });
      const option = picker.locator("option").filter({ hasText: label }).first();
      await picker.selectOption(await option.getAttribute("value"));
    },

    async codes(): Promise<string[]> {
      return rows.evaluateAll((elements) => elements.map((one) => one.getAttribute("data-anchor") ?? ""));
    },

    row: (code: string) => page.locator(`[data-anchor="${code}"] a`),

    /** What the API gives the same reader. */
    async answer(query = ""): Promise<MapAnswer> {
      const response = await page.request.get(`/api/v1/map${query}`);
      expect(response.status()).toBe(200);
      const body: MapAnswer = await response.json();
      return body;
    },

    /** Puts the pointer in the middle of the map and gives back what the reading line says then. */
    async pointAtMiddle(): Promise<string> {
      const box = await canvas.boundingBox();
      if (!box) return "";
      const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
      await page.mouse.move(x + 3, y + 3);
      await page.mouse.move(x, y);
      return (await page.locator("p[role=status]").allInnerTexts()).join(" ");
    },

    /** Where every mark and tag may be pressed: the middle of the map. */
    async pressMiddle() {
      const box = await canvas.boundingBox();
      if (box) await page.mouse.click(box.x + box.width / 2, box.y + box.height / 2);
    },
  };
}

/** The middle of a group as the map computes it: the mean of its members. */
export function middleOf(points: readonly [number, number][]): { lon: number; lat: number } {
  const mean = (axis: 0 | 1) => points.reduce((sum, point) => sum + point[axis], 0) / points.length;
  return { lon: mean(0), lat: mean(1) };
}

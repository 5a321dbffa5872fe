import { readdirSync, readFileSync } from "node:fs";
import { expect, it } from "vitest";

const root = new URL("../../../components/", import.meta.url);
const files = readdirSync(root, { recursive: true, encoding: "utf8" }).filter((name) => /\.tsx?$/.test(name));

it("no component writes a colour of its own: tokens only", () => {
  expect(files.length).toBeGreaterThan(40);
  const own = files.filter((name) =>
    /["'`\s(\[]#[0-9a-fA-F]{3,8}\b(?!["'`]?\s*\})|\b(rgb|hsl|oklch)a?\(/.test(
      readFileSync(new URL(name, root), "utf8"),
    ),
  );
  expect(own).toEqual([]);
});

it("no component makes a style element: the content security policy forbids it", () => {
  const own = files.filter((name) => /<style[\s>]/.test(readFileSync(new URL(name, root), "utf8")));
  expect(own).toEqual([]);
});

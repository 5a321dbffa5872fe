import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";

/** Contrast of every pair of colours the pages put together, in both themes (WCAG 2.2, 1.4.3, 1.4.6, 1.4.11). */

const css = readFileSync(new URL("../../../app/globals.css", import.meta.url), "utf8");
const THEMES = ["light", "dark"] as const;

/** Every colour role with its pair of values. */
const roles = new Map(
  [...css.matchAll(/--([\w-]+): light-dark\((#[0-9a-f]{6}), (#[0-9a-f]{6})\)/g)].map((match) => [
    match[1] ?? "",
    { light: match[2] ?? "", dark: match[3] ?? "" },
  ]),
);

function colour(role: string, theme: (typeof THEMES)[number]): string {
  const pair = roles.get(role);
  if (!pair) throw new Error(`no colour role ${role} in globals.css`);
  return pair[theme];
}

/** Relative luminance and contrast ratio as WCAG 2.2 defines them. */
function luminance(hex: string): number {
  const channels = [1, 3, 5].map((at) => {
    const part = parseInt(hex.slice(at, at + 2), 16) / 255;
    return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * (channels[0] ?? 0) + 0.7152 * (channels[1] ?? 0) + 0.0722 * (channels[2] ?? 0);
}

function contrast(a: string, b: string): number {
  const [high = 0, low = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (high + 0.05) / (low + 0.05);
}

const GROUNDS = ["ground", "surface", "sunk", "raised", "rock"];
const TONES = ["calm", "warn", "stop", "info"];
const TINTS = TONES.map((tone) => `${tone}-ground`);

/** [ink, grounds, least ratio] */
const RULES: [string, string[], number][] = [
  ["text", [...GROUNDS, ...TINTS], 7],
  ["muted", [...GROUNDS, ...TINTS], 4.5],
  ["action", [...GROUNDS, "calm-ground"], 4.5],
  ["action-strong", GROUNDS, 4.5],
  ["on-action", ["action", "action-strong"], 4.5],
  // words of a verdict or a condition: AAA wherever they stand
  ...TONES.map((tone): [string, string[], number] => [tone, [...GROUNDS, `${tone}-ground`], 7]),
  // the number in a filled balloon
  ["surface", ["stop"], 7],
  // shapes that carry meaning, lines of fields, the focus ring
  ...TONES.map((tone): [string, string[], number] => [`${tone}-fill`, [...GROUNDS, `${tone}-ground`], 3]),
  // marks and their words on the map
  ...TONES.map((tone): [string, string[], number] => [`${tone}-fill`, ["map-sea", "map-land"], 3]),
  ["text", ["map-sea", "map-land"], 7],
  ["line-strong", ["surface", "raised", "ground"], 3],
  ["frame", GROUNDS, 3],
  ["focus", [...GROUNDS, ...TINTS], 3],
];

describe("the contrast formula", () => {
  it("gives the ratios WCAG states: 21 for black on white, 1 for a colour on itself", () => {
    expect(contrast("#000000", "#ffffff")).toBeCloseTo(21, 5);
    expect(contrast("#2e5e8c", "#2e5e8c")).toBe(1);
  });

  it("puts the lightest grey that passes AA on white between #767676 and #777777 (common knowledge, from memory)", () => {
    expect(contrast("#767676", "#ffffff")).toBeGreaterThanOrEqual(4.5);
    expect(contrast("#777777", "#ffffff")).toBeLessThan(4.5);
  });
});

describe.each(THEMES)("in the %s theme", (theme) => {
  it.each(RULES)("%s reads on %j with at least %d : 1", (ink, grounds, least) => {
    const short = grounds
      .map((ground) => ({ ground, ratio: contrast(colour(ink, theme), colour(ground, theme)) }))
      .filter(({ ratio }) => ratio < least)
      .map(({ ground, ratio }) => `${ground} ${ratio.toFixed(2)}`);
    expect(short).toEqual([]);
  });
});

describe("the rules of the palette", () => {
  it("gives every colour role a value for both themes", () => {
    const themed = [...css.matchAll(/--color-[\w-]+: var\(--([\w-]+)\);/g)].map((match) => match[1] ?? "");
    expect(themed.length).toBeGreaterThan(25);
    expect(themed.filter((role) => !roles.has(role))).toEqual([]);
  });

  it("prints every role in black, white or grey", () => {
    const print = css.slice(css.indexOf("@media print"));
    const printed = new Map([...print.matchAll(/--([\w-]+): (#[0-9a-f]{6});/g)].map((m) => [m[1], m[2]]));
    const grey = (hex = "") => hex.slice(1, 3) === hex.slice(3, 5) && hex.slice(3, 5) === hex.slice(5, 7);
    expect([...printed.values()].filter((hex) => !grey(hex))).toEqual([]);
    const unprinted = [...roles.keys()].filter((role) => !printed.has(role));
    expect(unprinted).toEqual([]);
  });

  it("tells the browser the colour of the header it paints", () => {
    const layout = readFileSync(new URL("../../../app/layout.tsx", import.meta.url), "utf8");
    expect([...layout.matchAll(/color: "(#[0-9a-f]{6})"/g)].map((match) => match[1])).toEqual([
      colour("surface", "light"),
      colour("surface", "dark"),
    ]);
  });
});

/** The colours the map is drawn in: names of CSS variables, so that day and night stay in one place. */
export const PALETTE_TOKENS = {
  sea: "--map-sea",
  land: "--map-land",
  waterline: "--map-waterline",
  water: "--info-fill",
  ink: "--text",
  muted: "--muted",
  line: "--line",
  lineStrong: "--line-strong",
  paper: "--surface",
  focus: "--focus",
  calm: "--calm-fill",
  warn: "--warn-fill",
  stop: "--stop-fill",
  info: "--info-fill",
} as const;

export type PaletteName = keyof typeof PALETTE_TOKENS;

/** CSS colours as the page has them now. */
export type Palette = Readonly<Record<PaletteName, string>> & { readonly scheme: "day" | "night" };

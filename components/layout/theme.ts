export type Theme = "system" | "light" | "dark";

export const THEME_COOKIE = "theme";

/** Anything but the two known words means "as the device says". */
export function parseTheme(value: string | undefined): Theme {
  return value === "light" || value === "dark" ? value : "system";
}

"use client";

import { useState } from "react";
import { type Theme, THEME_COOKIE } from "@/components/layout/theme";

const NEXT: Readonly<Record<Theme, Theme>> = { system: "dark", dark: "light", light: "system" };
const WORDS: Readonly<Record<Theme, string>> = { system: "as the device", dark: "dark", light: "light" };

/** Paper, ink, or as the device says. Kept in a cookie, so that the server paints the right one at once. */
export function ThemeSwitch({ theme: initial }: { theme: Theme }) {
  const [theme, setTheme] = useState(initial);
  return (
    <button
      type="button"
      title={`Colours: ${WORDS[theme]}`}
      className="grid touch cursor-pointer place-items-center text-muted hover:text-text"
      onClick={() => {
        const next = NEXT[theme];
        setTheme(next);
        keepTheme(next);
      }}
    >
      <span className="sr-only">
        Colours: {WORDS[theme]}. Change to {WORDS[NEXT[theme]]}
      </span>
      <svg viewBox="0 0 24 24" aria-hidden="true" className="size-6" fill="none" stroke="currentColor">
        <circle cx="12" cy="12" r="8" strokeWidth="1.6" />
        {theme === "dark" ? <circle cx="12" cy="12" r="8" fill="currentColor" /> : null}
        {theme === "system" ? <path d="M12 4a8 8 0 0 1 0 16Z" fill="currentColor" /> : null}
      </svg>
    </button>
  );
}

function keepTheme(theme: Theme): void {
  if (theme === "system") delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
  const age = theme === "system" ? 0 : 31_536_000;
  document.cookie = `${THEME_COOKIE}=${theme}; path=/; max-age=${age}; samesite=lax`;
}

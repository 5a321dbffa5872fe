"use client";

import { useEffect, useState } from "react";
import { type Palette, PALETTE_TOKENS } from "@/lib/map/palette";

/** The page's colours as plain values, read again whenever day turns to night. Null until the first reading. */
export function usePalette(): Palette | null {
  const [palette, setPalette] = useState<Palette | null>(null);
  useEffect(() => {
    const read = () => setPalette(readPalette());
    const night = window.matchMedia("(prefers-color-scheme: dark)");
    const switched = new MutationObserver(read);
    switched.observe(document.documentElement, { attributes: true, attributeFilter: ["data-theme"] });
    night.addEventListener("change", read);
    read();
    return () => {
      switched.disconnect();
      night.removeEventListener("change", read);
    };
  }, []);
  return palette;
}

/** A probe resolves `var()` and `light-dark()`, which the bare property does not. */
function readPalette(): Palette {
  const probe = document.createElement("span");
  probe.hidden = true;
  document.body.append(probe);
  const resolved = (token: string) => {
    probe.style.color = `var(${token})`;
    return getComputedStyle(probe).color;
  };
  const t = PALETTE_TOKENS;
  const palette: Palette = {
    scheme: isNight() ? "night" : "day",
    sea: resolved(t.sea),
    land: resolved(t.land),
    waterline: resolved(t.waterline),
    water: resolved(t.water),
    ink: resolved(t.ink),
    muted: resolved(t.muted),
    line: resolved(t.line),
    lineStrong: resolved(t.lineStrong),
    paper: resolved(t.paper),
    focus: resolved(t.focus),
    calm: resolved(t.calm),
    warn: resolved(t.warn),
    stop: resolved(t.stop),
    info: resolved(t.info),
  };
  probe.remove();
  return palette;
}

function isNight(): boolean {
  const { theme } = document.documentElement.dataset;
  if (theme === "dark" || theme === "light") return theme === "dark";
  return window.matchMedia("(prefers-color-scheme: dark)").matches;
}

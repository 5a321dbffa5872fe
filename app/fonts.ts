import localFont from "next/font/local";

/** Running text. */
const text = localFont({
  src: "../public/fonts/atkinson-hyperlegible-next-latin.woff2",
  weight: "200 800",
  variable: "--font-text",
  display: "swap",
});

/** Names with letters beyond western Europe; fetched only by pages that show one. */
const textExtended = localFont({
  src: "../public/fonts/atkinson-hyperlegible-next-latin-ext.woff2",
  weight: "200 800",
  variable: "--font-text-ext",
  display: "swap",
  preload: false,
  adjustFontFallback: false,
  declarations: [
    {
      prop: "unicode-range",
      value:
        "U+0100-02BA,U+02BD-02C5,U+02C7-02CC,U+02CE-02D7,U+02DD-02FF,U+0304,U+0308,U+1D00-1DBF,U+1E00-1EFF",
    },
  ],
});

/** Numbers, labels, title blocks: used at 75-85 % of its width. */
const label = localFont({
  src: "../public/fonts/archivo-latin.woff2",
  weight: "100 900",
  variable: "--font-archivo",
  display: "swap",
  declarations: [{ prop: "font-stretch", value: "62% 125%" }],
});

/** Codes and coordinates. */
const code = localFont({
  src: "../public/fonts/atkinson-hyperlegible-mono-latin.woff2",
  weight: "200 800",
  variable: "--font-mono-code",
  display: "swap",
  preload: false,
});

export const fontVariables = [text, textExtended, label, code].map((font) => font.variable).join(" ");

import type { Metadata, Viewport } from "next";
import { cookies } from "next/headers";
import type { ReactNode } from "react";
import { fontVariables } from "@/app/fonts";
import { PhoneBar } from "@/components/layout/phone-bar";
import { SiteFooter } from "@/components/layout/site-footer";
import { SiteHeader } from "@/components/layout/site-header";
import { SkipLink } from "@/components/layout/skip-link";
import { parseTheme, THEME_COOKIE } from "@/components/layout/theme";
import { navEntries, type Viewer } from "@/components/layout/viewer";
import { getActor } from "@/lib/auth/get-actor";
import { usesMailSink } from "@/lib/config/env";
import type { Actor } from "@/lib/shared/actor";
import "@/app/globals.css";

export const metadata: Metadata = {
  title: { default: "Byssus", template: "%s · Byssus" },
  description: "The register of fixed anchors and bolts for a climbing and highline area",
};

export const viewport: Viewport = {
  width: "device-width",
  initialScale: 1,
  viewportFit: "cover",
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#fdfcf8" },
    { media: "(prefers-color-scheme: dark)", color: "#17221f" },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  const theme = parseTheme((await cookies()).get(THEME_COOKIE)?.value);
  const viewer = viewerOf(await getActor());
  const entries = navEntries(viewer, usesMailSink());
  return (
    <html lang="en" data-theme={theme === "system" ? undefined : theme} className={fontVariables}>
      <body className="flex flex-col">
        <SkipLink />
        <SiteHeader viewer={viewer} entries={entries} theme={theme} />
        <main id="content" tabIndex={-1} className="flex-1">
          {children}
        </main>
        <SiteFooter />
        <PhoneBar entries={entries} />
      </body>
    </html>
  );
}

function viewerOf(actor: Actor): Viewer | null {
  if (actor.kind === "visitor") return null;
  const roles = Object.values(actor.roles);
  const isSteward = actor.isAdmin || roles.includes("steward");
  return { name: actor.name, isSteward, seesQueue: isSteward || roles.includes("bolter") };
}

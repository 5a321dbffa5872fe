import Link from "next/link";
import { AccountMenu } from "@/components/layout/account-menu";
import { ByssusMark } from "@/components/layout/byssus-mark";
import { NavLink } from "@/components/layout/nav-link";
import type { Theme } from "@/components/layout/theme";
import { ThemeSwitch } from "@/components/layout/theme-switch";
import type { NavEntry, Viewer } from "@/components/layout/viewer";

interface SiteHeaderProps {
  viewer: Viewer | null;
  entries: readonly NavEntry[];
  theme: Theme;
}

/** Top edge of every page. Below 1024 px the places to go move to the bottom bar. */
export function SiteHeader({ viewer, entries, theme }: SiteHeaderProps) {
  return (
    <header className="no-print border-b-2 border-frame bg-surface">
      <div className="mx-auto flex h-14 max-w-[96rem] items-stretch gap-4 px-3 sm:px-6">
        <Link href="/" aria-label="Byssus, to the map" className="flex touch items-center gap-2 text-action">
          <ByssusMark />
          <span className="font-label text-xl font-bold tracking-tight text-text [font-stretch:88%]">
            Byssus
          </span>
        </Link>
        <nav aria-label="Main" className="ml-4 hidden items-stretch lg:flex">
          <ul className="flex items-stretch">
            {entries.map((entry) => (
              <li key={entry.href} className="flex">
                <NavLink
                  href={entry.href}
                  className="relative flex items-center px-4 font-label font-semibold text-muted [font-stretch:82%] after:absolute after:inset-x-4 after:-bottom-0.5 after:h-1 hover:text-text aria-[current]:text-text aria-[current]:after:bg-action"
                >
                  {entry.label}
                </NavLink>
              </li>
            ))}
          </ul>
        </nav>
        <div className="ml-auto flex items-center gap-1">
          <ThemeSwitch theme={theme} />
          <AccountMenu viewer={viewer} />
        </div>
      </div>
    </header>
  );
}

import { NavIcon } from "@/components/layout/nav-icon";
import { NavLink } from "@/components/layout/nav-link";
import type { NavEntry } from "@/components/layout/viewer";

/** The places to go, under the thumb. */
export function PhoneBar({ entries }: { entries: readonly NavEntry[] }) {
  return (
    <nav
      aria-label="Main, at the bottom"
      className="no-print fixed inset-x-0 bottom-0 z-30 border-t-2 border-frame bg-surface pb-[env(safe-area-inset-bottom)] lg:hidden"
    >
      <ul className="mx-auto grid h-(--nav-height) max-w-xl auto-cols-fr grid-flow-col">
        {entries.map((entry) => (
          <li key={entry.href} className="grid">
            <NavLink
              href={entry.href}
              className="relative grid place-content-center justify-items-center gap-0.5 text-muted before:absolute before:inset-x-3 before:-top-0.5 before:h-1 aria-[current]:text-action aria-[current]:before:bg-action"
            >
              <NavIcon icon={entry.icon} />
              <span className="type-label text-xs">{entry.label}</span>
            </NavLink>
          </li>
        ))}
      </ul>
    </nav>
  );
}

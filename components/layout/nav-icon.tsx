import type { NavEntry } from "@/components/layout/viewer";
import { cx } from "@/components/ui/cx";

/** Line drawings in the hand of the sheet; each stands beside its word. */
const PATHS: Readonly<Record<NavEntry["icon"] | "account", string>> = {
  map: "M2.5 18c3-1 4-5 8-5s5 3 11 2M5 12c3-.5 4.5-4 8-4s4 1.5 7 1M9.5 6.5c1-1 2-2 4.5-2s3 1 4 1",
  sites: "M3 21 9 6l3 5 3-7 6 17ZM9 6l2 8-2 7M15 4l1 9 2 8",
  types: "M5 21V9a7 7 0 0 1 14 0v12M9 21V9a3 3 0 0 1 6 0v12",
  queue: "M9 5h12M9 12h12M9 19h12M3 4.5l1.5 1V8M3 12h3l-3 3h3M3 18h3v3H3",
  mailbox: "M3 5h18v14H3ZM3 6l9 8 9-8",
  account: "M12 12a4 4 0 1 0 0-8 4 4 0 0 0 0 8ZM4 21c1-5 4-6.5 8-6.5s7 1.5 8 6.5",
};

export function NavIcon({ icon, className }: { icon: keyof typeof PATHS; className?: string }) {
  return (
    <svg viewBox="0 0 24 24" aria-hidden="true" className={cx("size-6 shrink-0", className)}>
      <path
        d={PATHS[icon]}
        fill="none"
        stroke="currentColor"
        strokeWidth="1.6"
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </svg>
  );
}

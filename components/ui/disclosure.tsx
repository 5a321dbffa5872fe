import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

/** More for those who ask; opens without a script, and always open on paper. */
export function Disclosure({
  summary,
  open,
  children,
  className,
}: {
  summary: ReactNode;
  open?: boolean;
  children: ReactNode;
  className?: string;
}) {
  return (
    <details open={open} className={cx("group border-y border-line", className)}>
      <summary className="flex touch cursor-pointer list-none items-center gap-2 py-2 font-semibold hover:text-action [&::-webkit-details-marker]:hidden">
        <svg
          viewBox="0 0 12 12"
          aria-hidden="true"
          className="size-3 shrink-0 text-muted transition-transform group-open:rotate-90"
        >
          <path d="M3.5 1 9 6l-5.5 5" fill="none" stroke="currentColor" strokeWidth="1.75" />
        </svg>
        {summary}
      </summary>
      <div className="pb-4">{children}</div>
    </details>
  );
}

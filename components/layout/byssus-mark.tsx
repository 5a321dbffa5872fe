import { cx } from "@/components/ui/cx";

/** Three threads from three points on the rock into one ring. */
export function ByssusMark({ className }: { className?: string }) {
  return (
    <svg viewBox="0 0 32 32" aria-hidden="true" className={cx("size-8 shrink-0", className)}>
      <g fill="none" stroke="currentColor" strokeLinecap="round">
        <path d="M5.5 8.5 13.4 20.6M16 4.5V19M27 10.5 18.7 20.7" strokeWidth="1.9" />
        <circle cx="16" cy="24" r="4.6" strokeWidth="2.4" />
      </g>
      <g fill="currentColor">
        <circle cx="5" cy="8" r="2.9" />
        <circle cx="16" cy="4" r="2.9" />
        <circle cx="27.3" cy="10" r="2.9" />
      </g>
    </svg>
  );
}

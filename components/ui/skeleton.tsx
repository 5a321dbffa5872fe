import { cx } from "@/components/ui/cx";

/** A grey stand-in of the final size, so that nothing jumps when the content comes. */
export function Skeleton({ className }: { className?: string }) {
  return (
    <span
      aria-hidden="true"
      className={cx("block h-4 animate-pulse rounded-sm bg-line motion-reduce:animate-none", className)}
    />
  );
}

/** Several lines of it with the words a screen reader gets instead. */
export function SkeletonText({ lines = 3, label = "Loading" }: { lines?: number; label?: string }) {
  return (
    <div role="status" className="grid gap-2">
      <span className="sr-only">{label}…</span>
      {Array.from({ length: lines }, (_, index) => (
        <Skeleton key={index} className={index === lines - 1 ? "w-2/3" : "w-full"} />
      ))}
    </div>
  );
}

import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

/** Names and values in ruled rows: the plain way to show a record. */
export function Facts({ children, className }: { children: ReactNode; className?: string }) {
  return <dl className={cx("divide-y divide-line border-y border-line", className)}>{children}</dl>;
}

export function Fact({ name, children }: { name: ReactNode; children: ReactNode }) {
  return (
    <div className="grid gap-x-4 py-2 sm:grid-cols-[minmax(8rem,1fr)_2fr]">
      <dt className="pt-0.5 type-label text-muted">{name}</dt>
      <dd>{children}</dd>
    </div>
  );
}

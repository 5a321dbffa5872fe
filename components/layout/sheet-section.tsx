import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

/** A part of a sheet under a ruled heading. `id` makes it a target for links. */
export function SheetSection({
  id,
  title,
  note,
  actions,
  children,
  className,
}: {
  id?: string;
  title: ReactNode;
  /** Beside the heading: a count, a date. */
  note?: ReactNode;
  actions?: ReactNode;
  children: ReactNode;
  className?: string;
}) {
  return (
    <section id={id} className={cx("scroll-mt-4", className)}>
      <div className="mb-3 flex flex-wrap items-end justify-between gap-x-4 gap-y-2 border-b border-frame pb-1">
        <div className="flex flex-wrap items-baseline gap-x-3">
          <h2>{title}</h2>
          {note ? <span className="type-label text-muted">{note}</span> : null}
        </div>
        {actions ? <div className="no-print flex flex-wrap gap-2">{actions}</div> : null}
      </div>
      {children}
    </section>
  );
}

import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

interface PageProps {
  title: ReactNode;
  /** One sentence under the title. */
  intro?: ReactNode;
  /** What can be done with what the page shows. */
  actions?: ReactNode;
  /** "read" keeps lines short (forms, texts); "wide" uses the sheet's whole width. */
  width?: "read" | "wide";
  children: ReactNode;
}

/** A page that is not a sheet: heading, actions, content. */
export function Page({ title, intro, actions, width = "wide", children }: PageProps) {
  return (
    <div
      className={cx("mx-auto px-3 pt-5 sm:px-6 sm:pt-8", width === "read" ? "max-w-3xl" : "max-w-[96rem]")}
    >
      <div className="mb-6 flex flex-wrap items-end justify-between gap-x-8 gap-y-3">
        <div className="grid max-w-prose gap-1">
          <h1>{title}</h1>
          {intro ? <p className="text-muted">{intro}</p> : null}
        </div>
        {actions ? <div className="no-print flex flex-wrap gap-2">{actions}</div> : null}
      </div>
      {children}
    </div>
  );
}

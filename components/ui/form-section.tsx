import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

/** A named part of a form: a ruled line, a heading, a sentence, the fields. */
export function FormSection({
  title,
  intro,
  step,
  children,
  className,
}: {
  title: ReactNode;
  intro?: ReactNode;
  /** "1", "2"…: printed as the zone letter of a drawing. */
  step?: string;
  children: ReactNode;
  className?: string;
}) {
  return (
    <fieldset className={cx("min-w-0 border-t-2 border-frame pt-3", className)}>
      <legend className="float-left w-full">
        <span className="flex items-baseline gap-2">
          {step ? (
            <span aria-hidden="true" className="type-figure text-sm text-muted">
              {step}
            </span>
          ) : null}
          <span className="font-label text-xl font-semibold [font-stretch:80%]">{title}</span>
        </span>
      </legend>
      <div className="clear-both grid gap-5 pt-3">
        {intro ? <p className="max-w-prose text-muted">{intro}</p> : null}
        {children}
      </div>
    </fieldset>
  );
}

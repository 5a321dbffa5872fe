import type { ReactNode } from "react";
import type { Tone } from "@/components/ui/badge";
import { cx } from "@/components/ui/cx";

const TONES: Record<Tone, string> = {
  plain: "border-line-strong bg-surface",
  calm: "border-calm-fill bg-calm-ground",
  warn: "border-warn-fill bg-warn-ground",
  stop: "border-stop-fill bg-stop-ground",
  info: "border-info-fill bg-info-ground",
};

/** A short word to the reader where the decision is made: a caution, a result, a hint. */
export function Notice({
  tone = "info",
  title,
  children,
  role,
  className,
}: {
  tone?: Tone;
  title?: ReactNode;
  children?: ReactNode;
  /** "status" for what has just happened, "alert" for what has just gone wrong. */
  role?: "status" | "alert" | "note";
  className?: string;
}) {
  return (
    <div role={role} className={cx("keep-together border-l-4 px-4 py-3", TONES[tone], className)}>
      {title ? <p className="font-semibold">{title}</p> : null}
      {children ? <div className="max-w-prose">{children}</div> : null}
    </div>
  );
}

import { cx } from "@/components/ui/cx";
import type { Level } from "@/lib/domain/vocabulary";

const LOOKS: Readonly<Record<Level, string>> = {
  stop: "border-stop bg-stop text-surface",
  ask: "border-info-fill bg-info-ground text-info",
  limit: "border-warn-fill bg-warn-ground text-warn",
  note: "border-line-strong bg-surface text-text",
};

/** The number that ties a reason to its place on the drawing, as an item balloon does. */
export function ReasonKey({ number, level }: { number: number; level: Level }) {
  return (
    <span
      className={cx(
        "inline-grid size-7 shrink-0 place-items-center rounded-full border-2 type-figure text-sm",
        LOOKS[level],
      )}
    >
      <span className="sr-only">Reason </span>
      {number}
    </span>
  );
}

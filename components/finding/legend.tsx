import { MarkShape } from "@/components/finding/condition-mark";
import { sentence } from "@/lib/domain/labels";
import { cx } from "@/components/ui/cx";
import { MARK_LABELS, MARKS, type Mark } from "@/lib/map/marks";

const MEANINGS: Readonly<Record<Mark, string>> = {
  in_service: "last seen in order, nothing open against it",
  check_first: "look at it by hand before you use it",
  out_of_use: "not to be used until it is put back after a hand check",
  not_enough_known: "a fact is missing that could change the answer",
  removed: "taken out of the rock; kept in the record",
};

/** The five marks and what they mean. */
export function Legend({ compact, className }: { compact?: boolean; className?: string }) {
  return (
    <dl className={cx(compact ? "flex flex-wrap gap-x-4 gap-y-1" : "grid gap-2", className)}>
      {MARKS.map((mark) => (
        <div
          key={mark}
          className={compact ? "flex items-center gap-1.5" : "grid grid-cols-[1.5rem_1fr] gap-x-2"}
        >
          <dt className="contents">
            <MarkShape mark={mark} className={compact ? "size-4" : "mt-0.5"} />
            <span className={compact ? "type-label" : "font-semibold"}>{sentence(MARK_LABELS[mark])}</span>
          </dt>
          <dd className={compact ? "sr-only" : "col-start-2 text-sm text-muted"}>{MEANINGS[mark]}</dd>
        </div>
      ))}
    </dl>
  );
}

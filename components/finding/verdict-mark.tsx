import { MarkShape } from "@/components/finding/condition-mark";
import { cx } from "@/components/ui/cx";
import { VERDICT_LABELS } from "@/lib/domain/labels";
import type { Verdict } from "@/lib/domain/vocabulary";
import { VERDICT_MARKS } from "@/lib/map/marks";

const WORDS: Readonly<Record<Verdict, string>> = {
  do_not_use: "text-stop",
  not_enough_known: "text-info",
  within_limits: "text-warn",
  nothing_against: "text-calm",
};

/** A verdict in a table row: shape and words. */
export function VerdictMark({ verdict, className }: { verdict: Verdict; className?: string }) {
  return (
    <span className={cx("inline-flex items-center gap-1.5", className)}>
      <MarkShape mark={VERDICT_MARKS[verdict]} />
      <span className={cx("font-semibold", WORDS[verdict])}>{VERDICT_LABELS[verdict]}</span>
    </span>
  );
}

import { cx } from "@/components/ui/cx";
import { sentence } from "@/lib/domain/labels";
import type { Condition, Verdict } from "@/lib/domain/vocabulary";
import { MARK_BOX, MARK_LABELS, MARK_SHAPES, markOf, type Mark, type MarkTone } from "@/lib/map/marks";

const FILLS: Readonly<Record<MarkTone, string>> = {
  calm: "text-calm-fill",
  warn: "text-warn-fill",
  stop: "text-stop-fill",
  info: "text-info-fill",
  muted: "text-muted",
};

const WORDS: Readonly<Record<MarkTone, string>> = {
  calm: "text-calm",
  warn: "text-warn",
  stop: "text-stop",
  info: "text-info",
  muted: "text-muted",
};

/** The shape alone, for places where the word stands beside it anyway. */
export function MarkShape({ mark, className }: { mark: Mark; className?: string }) {
  const { tone } = MARK_SHAPES[mark];
  return (
    <svg
      viewBox={`0 0 ${MARK_BOX} ${MARK_BOX}`}
      aria-hidden="true"
      className={cx("size-5 shrink-0", FILLS[tone], className)}
    >
      <MarkPath mark={mark} />
    </svg>
  );
}

/** The path of a mark for use inside another drawing; takes its colour from the text. */
export function MarkPath({ mark }: { mark: Mark }) {
  const { d, stroke } = MARK_SHAPES[mark];
  if (stroke === null) return <path d={d} fill="currentColor" />;
  return (
    <path
      d={d}
      fill="none"
      stroke="currentColor"
      strokeWidth={stroke.width}
      strokeDasharray={stroke.dash?.join(" ")}
    />
  );
}

/** Shape and word. `verdict` lets "not enough known" show through a condition nobody has doubted yet. */
export function ConditionMark({
  condition,
  verdict = null,
  className,
}: {
  condition: Condition;
  verdict?: Verdict | null;
  className?: string;
}) {
  const mark = markOf(condition, verdict);
  return (
    <span className={cx("inline-flex items-center gap-1.5 whitespace-nowrap", className)}>
      <MarkShape mark={mark} />
      <span className={cx("font-semibold", WORDS[MARK_SHAPES[mark].tone])}>
        {sentence(MARK_LABELS[mark])}
      </span>
    </span>
  );
}

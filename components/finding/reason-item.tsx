import type { ReactNode } from "react";
import { ReasonKey } from "@/components/finding/reason-key";
import { Badge, type Tone } from "@/components/ui/badge";
import { cx } from "@/components/ui/cx";
import { LEVEL_LABELS, SOURCE_MARK_LABELS } from "@/lib/domain/labels";
import type { Finding } from "@/lib/domain/finding/types";
import type { Level } from "@/lib/domain/vocabulary";
import { readableText } from "@/lib/shared/readable-text";

const TONES: Readonly<Record<Level, Tone>> = { stop: "stop", ask: "info", limit: "warn", note: "plain" };

interface ReasonItemProps {
  /** The number that stands beside the same reason on the drawing. */
  number: number;
  reason: Pick<Finding, "code" | "level" | "title" | "text" | "clearsWhen" | "assumed" | "source">;
  /** Which bolt or part it is about: "bolt 3". */
  subject?: ReactNode;
  /** Where several lists stand on one page: keeps the ids apart. */
  idPrefix?: string;
  /** Margin bars or photos that belong to it. */
  children?: ReactNode;
}

/** One reason of a verdict: what was found, what was assumed, by which rule, and what would clear it. */
export function ReasonItem({ number, reason, subject, idPrefix, children }: ReasonItemProps) {
  return (
    <li
      id={idPrefix ? `${idPrefix}-reason-${number}` : `reason-${number}`}
      className="keep-together grid scroll-mt-4 break-inside-avoid grid-cols-[auto_1fr] gap-x-3 border-t border-line py-4 target:bg-calm-ground"
    >
      <ReasonKey number={number} level={reason.level} />
      <div className="grid min-w-0 gap-2">
        <div className="flex flex-wrap items-baseline gap-x-2 gap-y-1">
          <h3 className="font-sans text-base font-bold [font-stretch:100%]">{reason.title}</h3>
          <Badge tone={TONES[reason.level]}>{LEVEL_LABELS[reason.level]}</Badge>
          <span className="type-code text-sm text-muted">{reason.code}</span>
          {subject ? <span className="type-label text-muted">{subject}</span> : null}
        </div>
        {reason.text ? <p className="max-w-prose">{readableText(reason.text)}</p> : null}
        {children}
        <dl className="grid max-w-prose gap-1 text-sm">
          {reason.assumed.length > 0 ? (
            <Line name="Assumed">{readableText(reason.assumed.join("; "))}.</Line>
          ) : null}
          <Line name="Rule">
            {reason.source.name}{" "}
            <span className="text-muted">({SOURCE_MARK_LABELS[reason.source.mark]})</span>
          </Line>
          {reason.clearsWhen ? <Line name="Clears when">{readableText(reason.clearsWhen)}</Line> : null}
        </dl>
      </div>
    </li>
  );
}

function Line({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className="sm:grid sm:grid-cols-[6.5rem_1fr] sm:gap-2">
      <dt className="inline pr-2 type-label text-muted sm:pt-0.5">{name}</dt>
      <dd className="inline">{children}</dd>
    </div>
  );
}

/** All reasons, worst first, numbered as on the drawing. */
export function ReasonList({
  children,
  label = "Reasons",
  className,
}: {
  children: ReactNode;
  label?: string;
  className?: string;
}) {
  return (
    <ol aria-label={label} className={cx("border-b border-line", className)}>
      {children}
    </ol>
  );
}

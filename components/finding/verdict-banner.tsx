import type { ReactNode } from "react";
import { MarkShape } from "@/components/finding/condition-mark";
import { cx } from "@/components/ui/cx";
import { CAUTION } from "@/lib/domain/finding/engine";
import { VERDICT_LABELS } from "@/lib/domain/labels";
import type { Verdict } from "@/lib/domain/vocabulary";
import { VERDICT_MARKS } from "@/lib/map/marks";

const LOOKS: Readonly<Record<Verdict, string>> = {
  do_not_use: "border-stop-fill bg-stop-ground text-stop",
  not_enough_known: "border-info-fill bg-info-ground text-info",
  within_limits: "border-warn-fill bg-warn-ground text-warn",
  nothing_against: "border-calm-fill bg-calm-ground text-calm",
};

interface VerdictBannerProps {
  verdict: Verdict;
  /** For "only within": the computed limits in words, "8.0 kN · wind under 12 m/s". */
  limits?: ReactNode;
  /** For "not enough known": the one fact that would help most. */
  helpMost?: ReactNode;
  /** What it is the verdict for: "as a highline anchor, area policy version 2". */
  about?: ReactNode;
  /** The heading level that fits the page. */
  headingLevel?: 2 | 3;
  className?: string;
}

/** The answer, in shape, words and colour, with the one-line caution that belongs to every verdict. */
export function VerdictBanner(props: VerdictBannerProps) {
  const { verdict, limits, helpMost, about, headingLevel = 2, className } = props;
  const Heading = `h${headingLevel}` as const;
  return (
    <section className={cx("keep-together border-2 border-l-8 px-4 py-3", LOOKS[verdict], className)}>
      <div className="flex items-start gap-3">
        <MarkShape mark={VERDICT_MARKS[verdict]} className="mt-0.5 size-8" />
        <div className="grid min-w-0 gap-0.5">
          <Heading className="text-2xl">
            {VERDICT_LABELS[verdict]}
            {verdict === "within_limits" && limits ? <span className="type-figure"> {limits}</span> : null}
          </Heading>
          {about ? <p className="text-sm text-text">{about}</p> : null}
          {verdict === "not_enough_known" && helpMost ? (
            <p className="text-text">
              <span className="mr-1 type-label">Would help most</span>
              {helpMost}
            </p>
          ) : null}
        </div>
      </div>
      <p className="mt-2 border-t border-current/30 pt-2 text-sm text-text">{CAUTION}</p>
    </section>
  );
}

import type { Level, RuleCode, SourceMark } from "@/lib/domain/vocabulary";

/** One reason inside a verdict: what was compared, against what, on whose authority, and what clears it. */
export interface Finding {
  code: RuleCode;
  level: Level;
  /** One short line, sentence case, no full stop. */
  title: string;
  /** One or two sentences with the numbers and their units. */
  text: string;
  /** What would clear it, computed from the numbers; null when nothing can. */
  clearsWhen: string | null;
  /** The numbers compared, unit in the key (`peakKn`, `onsetKn`); null where not known. */
  numbers: Readonly<Record<string, number | string | boolean | null>>;
  /** Every assumption the comparison leans on, in words. */
  assumed: readonly string[];
  source: { mark: SourceMark; name: string };
}

/** What a rule may read beyond the evidence: nothing. A rule is `(evidence, policy) => Finding | null`. */
export type Rule<E, P> = (evidence: E, policy: P) => Finding | null;

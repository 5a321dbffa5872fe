import type { Level, Verdict } from "@/lib/domain/vocabulary";
import { RULE_CODES } from "@/lib/domain/vocabulary";
import { severity, worstLevel } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";

const VERDICT_OF: Readonly<Record<Level, Verdict>> = {
  stop: "do_not_use",
  ask: "not_enough_known",
  limit: "within_limits",
  note: "nothing_against",
};

/** The verdict is the worst level present; notes alone, or nothing, are "nothing found against it". */
export function verdictOf(findings: readonly Pick<Finding, "level">[]): Verdict {
  return VERDICT_OF[worstLevel(findings.map(({ level }) => level)) ?? "note"];
}

/** Order of reading: worst first, then the order of the rule codes. */
export function byWeight(a: Finding, b: Finding): number {
  return severity(b.level) - severity(a.level) || RULE_CODES.indexOf(a.code) - RULE_CODES.indexOf(b.code);
}

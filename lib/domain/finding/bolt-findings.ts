import type { LoadPolicy } from "@/lib/domain/policy";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { BOLT_RULES } from "@/lib/domain/finding/rules";
import type { Finding } from "@/lib/domain/finding/types";
import { byWeight } from "@/lib/domain/finding/verdict-of";

/** What every rule finds about a bolt, worst first. Care says nothing while a type is being chosen. */
export function boltFindings(evidence: BoltEvidence, policy: LoadPolicy): readonly Finding[] {
  const e = evidence.context === "choosing" ? { ...evidence, care: null } : evidence;
  return BOLT_RULES.map((rule) => rule(e, policy))
    .filter((found) => found !== null)
    .sort(byWeight);
}

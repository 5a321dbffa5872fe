import type { PlaceClass } from "@/lib/engineering";
import type { LoadPolicy } from "@/lib/domain/policy";
import type { Verdict } from "@/lib/domain/vocabulary";
import { ENGINE_VERSION } from "@/lib/domain/finding/engine";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import type { HelpMost } from "@/lib/domain/finding/help-most";
import { helpMost } from "@/lib/domain/finding/help-most";
import { boltFindings } from "@/lib/domain/finding/bolt-findings";
import { loadUtilisation } from "@/lib/domain/finding/load-utilisation";
import { placeClassOf } from "@/lib/domain/finding/place";
import type { Finding } from "@/lib/domain/finding/types";
import { verdictOf } from "@/lib/domain/finding/verdict-of";

export interface BoltVerdict {
  verdict: Verdict;
  engine: string;
  /** Worst first. */
  findings: readonly Finding[];
  /**
   * Greatest part of a strength or bend onset used up with one bolt carrying all; null: none could be
   * computed.
   */
  utilisation: number | null;
  /** What the place asks of stainless steel; null: the distance to the sea is not known and matters. */
  placeClass: PlaceClass | null;
  /** The one fact that would settle most; null unless the verdict is `not_enough_known`. */
  helpMost: HelpMost | null;
}

/** The verdict on one bolt under one use: every rule over the evidence, nothing else. */
export function evaluateBolt(evidence: BoltEvidence, policy: LoadPolicy): BoltVerdict {
  const findings = boltFindings(evidence, policy);
  const verdict = verdictOf(findings);
  return {
    verdict,
    engine: ENGINE_VERSION,
    findings,
    utilisation: loadUtilisation(evidence, policy),
    placeClass: placeClassOf(evidence.place),
    helpMost: verdict === "not_enough_known" ? helpMost(evidence, findings, policy) : null,
  };
}

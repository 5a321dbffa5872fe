import type { LoadPolicy } from "@/lib/domain/policy";
import { bendUse } from "@/lib/domain/finding/bend-need";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { loadsOf } from "@/lib/domain/finding/loads";
import { breakUse } from "@/lib/domain/finding/rules/load-strength";
import { bendOnsetOf, ratedOf } from "@/lib/domain/finding/strengths";
import { isSerious } from "@/lib/domain/finding/traits";

/**
 * How far the loads of a use go towards breaking or bending the bolt, with one bolt carrying all: 1 is the
 * limit. Bending counts at the peak in a serious use and at the working case elsewhere; an estimate with
 * its friendly end, so that it never looks worse than a number somebody measured. Null: neither strength
 * nor onset is known, or no load applies.
 */
export function loadUtilisation(e: BoltEvidence, policy: LoadPolicy): number | null {
  const loads = loadsOf(e, policy);
  if (loads === null) return null;
  const rated = ratedOf(e.bolt);
  const onset = bendOnsetOf(e.bolt);
  const used: number[] = [];
  if (rated.radialKn !== null) {
    used.push(...loads.peaks.map((load) => breakUse(load, 1, rated)));
  }
  if (onset !== null) {
    const [peak = loads.working] = loads.peaks;
    const radialKn = onset.basis === "estimate" ? onset.highKn : onset.lowKn;
    used.push(bendUse(isSerious(e.use) ? peak : loads.working, 1, { radialKn, axialKn: onset.axialKn }));
  }
  return used.length === 0 ? null : Math.max(...used);
}

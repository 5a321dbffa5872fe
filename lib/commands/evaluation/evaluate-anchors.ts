import "server-only";
import type { Tx } from "@/db/client";
import { loadStoredResults, replaceBoltEvals, upsertAnchorEvals } from "@/db/repositories/evaluation";
import { loadEvidenceRows } from "@/db/repositories/evidence";
import { applyConditions, conditionOf } from "@/lib/commands/evaluation/apply-conditions";
import { assembleEvidence } from "@/lib/commands/evaluation/assemble-evidence";
import { rankJobs } from "@/lib/commands/evaluation/rank-jobs";
import { type RowsOfAnchor, rowsByAnchor } from "@/lib/commands/evaluation/rows-by-anchor";
import { storeFindings } from "@/lib/commands/evaluation/store-findings";
import { type AnchorVerdict, evaluateAnchor } from "@/lib/domain/finding/evaluate-anchor";
import type { Condition, Verdict } from "@/lib/domain/vocabulary";

/** What an evaluation did to one anchor. */
export interface EvaluatedAnchor {
  anchorId: string;
  areaId: string;
  before: { verdict: Verdict | null; condition: Condition };
  after: { verdict: Verdict; condition: Condition };
  /** The verdict with its reasons. */
  result: AnchorVerdict;
}

/**
 * Judges anchors over all evidence there is and stores the answer: reasons, verdicts and conditions, in the
 * caller's transaction. The caller has locked them. Ids that are absent are left out.
 */
export async function evaluateAnchors(
  tx: Tx,
  anchorIds: readonly string[],
  { now }: { now: Date },
): Promise<EvaluatedAnchor[]> {
  if (anchorIds.length === 0) return [];
  const rows = await loadEvidenceRows(tx, anchorIds);
  const stored = await loadStoredResults(tx, anchorIds);
  const judged = rowsByAnchor(rows).map((anchorRows) => judge(anchorRows, now));
  await storeFindings(tx, stored.findings, judged);
  await storeEvals(tx, anchorIds, judged, now);
  await rankJobs(tx, judged, now);

  const done: EvaluatedAnchor[] = [];
  for (const { anchor, areaId, bolts, condition, result } of judged) {
    const before = stored.evals.find((row) => row.anchorId === anchor.id)?.verdict ?? null;
    done.push({
      anchorId: anchor.id,
      areaId,
      before: { verdict: before, condition: anchor.condition },
      after: {
        verdict: result.verdict,
        condition: await applyConditions(tx, anchor, bolts, condition),
      },
      result,
    });
  }
  return done;
}

/** One anchor over all its evidence. Bolts that are out of use take no share, so conditions come first. */
function judge({ all, bolts, ...rows }: RowsOfAnchor, now: Date) {
  const { anchor, area } = rows.head;
  const condition = conditionOf({ ...rows, bolts: all }, now);
  const out = condition.bolts.filter((bolt) => bolt.condition === "out_of_use").map((bolt) => bolt.boltId);
  const onDate = dayAt(now, area.timeZone);
  const evidence = assembleEvidence({ ...rows, bolts, outOfUseBoltIds: new Set(out) }, { now, onDate });
  const result = evaluateAnchor(evidence, rows.policy);
  const { reports, policy } = rows;
  return { anchor, areaId: area.id, policyVersion: policy.version, bolts: all, reports, condition, result };
}

async function storeEvals(
  tx: Tx,
  anchorIds: readonly string[],
  judged: readonly ReturnType<typeof judge>[],
  evaluatedAt: Date,
): Promise<void> {
  await upsertAnchorEvals(
    tx,
    judged.map(({ anchor, policyVersion, result }) => ({
      anchorId: anchor.id,
      verdict: result.verdict,
      utilisation: result.utilisation,
      findingCount: result.findings.length + result.bolts.flatMap((bolt) => bolt.findings).length,
      codes: [...result.codes],
      helpMost: result.helpMost?.label ?? null,
      placeClass: result.placeClass,
      engineVersion: result.engine,
      policyVersion,
      evaluatedAt,
    })),
  );
  await replaceBoltEvals(
    tx,
    anchorIds,
    judged.flatMap(({ anchor, policyVersion, result }) =>
      result.bolts.map(({ boltId, verdict, utilisation }) => ({
        boltId,
        anchorId: anchor.id,
        verdict,
        utilisation,
        engineVersion: result.engine,
        policyVersion,
        evaluatedAt,
      })),
    ),
  );
}

/** The calendar day it is in a time zone. */
export function dayAt(instant: Date, timeZone: string): string {
  return new Intl.DateTimeFormat("en-CA", {
    timeZone,
    year: "numeric",
    month: "2-digit",
    day: "2-digit",
  }).format(instant);
}

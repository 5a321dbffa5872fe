import "server-only";
import type { Tx } from "@/db/client";
import { type JobRow, listJobPlacements, listWaitingJobs, setJobPriority } from "@/db/repositories/jobs";
import type { EvidenceRows } from "@/db/repositories/evidence";
import { openFacts, type ReportsByBolt } from "@/lib/commands/evaluation/reports-by-bolt";
import type { AnchorVerdict } from "@/lib/domain/finding/evaluate-anchor";
import { isOutOfUseAtOnce } from "@/lib/domain/finding/out-of-use";
import { reboltPriority } from "@/lib/domain/rebolt/priority";
import type { Use } from "@/lib/domain/vocabulary";

/** What ranking needs of an anchor that was just judged. */
export interface JudgedForRank {
  anchor: { id: string; uses: Use[] };
  bolts: EvidenceRows["bolts"];
  reports: ReportsByBolt;
  result: AnchorVerdict;
}

/** Computes the rank of the entries still to be done at these anchors again. */
export async function rankJobs(tx: Tx, judged: readonly JudgedForRank[], now: Date): Promise<void> {
  const jobs = await listWaitingJobs(
    tx,
    judged.map(({ anchor }) => anchor.id),
  );
  const placements = await listJobPlacements(
    tx,
    jobs.map((job) => job.id),
  );
  for (const job of jobs) {
    const one = judged.find(({ anchor }) => anchor.id === job.anchorId);
    if (!one) continue;
    const about = placements.filter((row) => row.jobId === job.id).map((row) => row.placementId);
    const { total, parts } = priorityOf(job, one, about, now);
    if (total !== job.priority) {
      await setJobPriority(tx, job.id, { priority: total, priorityParts: [...parts] });
    }
  }
}

function priorityOf(job: JobRow, judged: JudgedForRank, placementIds: readonly string[], now: Date) {
  const { anchor, bolts, reports, result } = judged;
  const concerned = bolts
    .filter(({ bolt }) => bolt.removedOn === null && placementIds.includes(bolt.placementId))
    .map(({ bolt }) => bolt.id);
  const verdicts = result.bolts.filter((bolt) => concerned.includes(bolt.boltId));
  const open = openFacts([...reports.ofAnchor, ...placementIds.flatMap((id) => reports.ofPlacement(id))]);
  const grades = open.map((report) => report.grade).filter((grade) => grade !== null);
  const utilisations = verdicts.map((bolt) => bolt.utilisation).filter((value) => value !== null);
  return reboltPriority({
    utilisation: utilisations.length > 0 ? Math.max(...utilisations) : null,
    worstGrade: grades.length > 0 ? Math.max(...grades) : null,
    outOfUse: open.some((report) => report.confirmed && isOutOfUseAtOnce(report)),
    findings: [...result.findings, ...verdicts.flatMap((bolt) => bolt.findings)],
    uses: anchor.uses,
    visitsPerYear: null,
    waitingSince: job.waitingSince.toISOString(),
    now: now.toISOString(),
  });
}

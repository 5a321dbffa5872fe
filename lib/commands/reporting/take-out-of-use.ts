import "server-only";
import { v7 } from "uuid";
import type { Tx } from "@/db/client";
import { addJobPlacements, findWaitingJob, insertJob } from "@/db/repositories/jobs";
import { appendEvents } from "@/db/repositories/events";
import { listRecipients } from "@/db/repositories/recipients";
import type { ReportRow } from "@/db/repositories/reports";
import type { CommandContext } from "@/lib/commands/context";
import { createdBy } from "@/lib/commands/writing/stamp";
import { writeTo } from "@/lib/commands/writing/write-to";
import { REPORT_KIND_LABELS } from "@/lib/domain/labels";
import { outOfUseMail } from "@/lib/mail/templates/register";
import type { Person } from "@/lib/shared/actor";

type About = Pick<ReportRow, "id" | "kind" | "placementId" | "boltId" | "observedAt">;

interface AnchorOfReport {
  id: string;
  areaId: string;
  label: string;
  code: string;
  siteName: string;
}

/**
 * What follows when a report takes an anchor out of use: an entry of the rebolt queue is opened, or the open
 * one joined, and the stewards and followers are written to. The condition itself follows from the evaluation.
 */
export async function takeOutOfUse(
  tx: Tx,
  ctx: CommandContext,
  about: { report: About; anchor: AnchorOfReport; placementNumber: number | null; person: Person | null },
): Promise<string> {
  const { report, anchor, placementNumber } = about;
  const what = placementNumber === null ? anchor.label : `${anchor.label}, placement ${placementNumber}`;
  const reason = `${REPORT_KIND_LABELS[report.kind]} reported at ${what}`;
  const jobId = await openOrJoin(tx, ctx, about, reason);
  await appendEvents(tx, ctx, [
    {
      areaId: anchor.areaId,
      anchorId: anchor.id,
      subjectType: "anchor",
      subjectId: anchor.id,
      kind: "anchor.taken-out-of-use",
      summary: "Out of use until every bolt is checked by hand",
      after: { reportId: report.id, jobId },
      reason,
    },
  ]);
  const mail = outOfUseMail({
    anchorLabel: anchor.label,
    siteName: anchor.siteName,
    sheetPath: `/anchors/${anchor.code}`,
    reason,
  });
  const recipients = await listRecipients(tx, anchor.id);
  await writeTo(tx, recipients, mail, {
    key: `out-of-use:${report.id}`,
    areaId: anchor.areaId,
    now: ctx.now,
  });
  return jobId;
}

async function openOrJoin(
  tx: Tx,
  ctx: CommandContext,
  { report, anchor, person }: { report: About; anchor: AnchorOfReport; person: Person | null },
  title: string,
): Promise<string> {
  const waiting = await findWaitingJob(tx, anchor.id);
  const jobId = waiting?.id ?? v7();
  if (!waiting) {
    await insertJob(tx, {
      id: jobId,
      areaId: anchor.areaId,
      anchorId: anchor.id,
      title,
      openedByReportId: report.id,
      waitingSince: report.observedAt,
      ...createdBy(person, ctx.now),
    });
  }
  if (report.placementId) {
    await addJobPlacements(tx, [{ jobId, placementId: report.placementId, boltId: report.boltId }]);
  }
  return jobId;
}

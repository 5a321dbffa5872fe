import "server-only";
import { inTransaction, type Tx } from "@/db/client";
import { type LockedAnchor, listAnchorIds, lockAnchor } from "@/db/repositories/anchors";
import { appendEvents } from "@/db/repositories/events";
import {
  findMailAddress,
  findReport,
  lastReturnAt,
  lockReport,
  newestOutOfUseEvent,
  type ReportRow,
  setOutOfUseSince,
  updateReportRow,
} from "@/db/repositories/reports";
import type { CommandContext } from "@/lib/commands/context";
import { nudgeMail } from "@/lib/commands/mail-loop";
import { takeOutOfUse } from "@/lib/commands/reporting/take-out-of-use";
import { authorize } from "@/lib/commands/writing/authorize";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { notFound, refuseStale } from "@/lib/commands/writing/refusals";
import { by } from "@/lib/commands/writing/stamp";
import { writeTo } from "@/lib/commands/writing/write-to";
import { isOutOfUseAtOnce } from "@/lib/domain/finding/out-of-use";
import { REPORT_KIND_LABELS } from "@/lib/domain/labels";
import { reportFacts } from "@/lib/domain/report/report-facts";
import { reportAnsweredMail } from "@/lib/mail/templates/register";
import { audience } from "@/lib/policy/audience";
import type { HandleReportInput } from "@/lib/schemas/report";
import type { Person } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

/** A steward answers a report: handled, found wrong (struck through), or confirmed as true and still open. */
export async function handleReport(
  ctx: CommandContext,
  { id, version, answer }: { id: string; version: number; answer: HandleReportInput },
): Promise<{ id: string; version: number }> {
  await inTransaction(ctx.db, async (tx) => {
    const known = await findReport(tx, id);
    const anchor = known?.anchorId ? await lockAnchor(tx, audience(ctx.actor), known.anchorId) : null;
    const report = await lockReport(tx, id);
    if (!report || (report.anchorId && !anchor)) throw notFound();
    const person = authorize(ctx.actor, "report.handle", { areaId: report.areaId });
    refuseStale(report, version);
    if (report.state !== "open") throw new AppError("conflict", "This report is answered already.");

    await updateReportRow(tx, id, changeOf(report, answer, person, ctx.now), by(person, ctx.now));
    await appendEvents(tx, ctx, [
      {
        areaId: report.areaId,
        anchorId: report.anchorId,
        subjectType: "report",
        subjectId: id,
        kind: `report.${answer.answer.replace("_", "-")}`,
        summary: `${REPORT_KIND_LABELS[report.kind]}: ${SAID[answer.answer]}`,
        before: { state: report.state, confirmed: report.confirmed },
        reason: answer.how,
      },
    ]);
    if (anchor) await consequences(tx, ctx, { report, anchor, person }, answer);
    if (report.createdBy) await tellReporter(tx, ctx, report, person, answer.how);
  });
  nudgeMail();
  return { id, version: version + 1 };
}

const SAID = { handled: "answered", found_wrong: "found wrong", confirmed: "confirmed" } as const;

function changeOf(
  report: ReportRow,
  { answer, how, stressCorrosionConfirmed }: HandleReportInput,
  person: Person,
  now: Date,
) {
  const measured = stressCorrosionConfirmed
    ? { measured: { ...report.measured, stressCorrosionConfirmed: true } }
    : {};
  if (answer === "confirmed") {
    return { ...measured, confirmed: true, tookOutOfUse: report.tookOutOfUse || strains(report) };
  }
  const answered = { handledAt: now, handledBy: person.userId, handledHow: how };
  return {
    ...measured,
    ...answered,
    state: answer === "found_wrong" ? ("struck" as const) : ("handled" as const),
  };
}

/** What a confirmed report of this content does to its anchor. */
function strains(report: ReportRow): boolean {
  if (report.anchorId === null) return false;
  const { id: reportId, observedAt, ...rest } = report;
  return isOutOfUseAtOnce(reportFacts({ ...rest, reportId, observedAt: observedAt.toISOString() }));
}

async function consequences(
  tx: Tx,
  ctx: CommandContext,
  { report, anchor, person }: { report: ReportRow; anchor: LockedAnchor; person: Person },
  { answer, stressCorrosionConfirmed }: HandleReportInput,
): Promise<void> {
  if (answer === "found_wrong" && report.tookOutOfUse) {
    // What never happened does not hold the anchor back; another event still does.
    const since = await newestOutOfUseEvent(tx, anchor.id, await lastReturnAt(tx, anchor.id));
    await setOutOfUseSince(tx, anchor.id, since);
  }
  if (answer === "confirmed" && !report.tookOutOfUse && strains(report)) {
    await takeOutOfUse(tx, ctx, { report, anchor, placementNumber: null, person });
  }
  // A confirmed fracture by salt stops that metal at the whole site.
  const reach = stressCorrosionConfirmed ? await listAnchorIds(tx, { siteId: anchor.siteId }) : [anchor.id];
  await reevaluate(tx, ctx, reach);
}

async function tellReporter(
  tx: Tx,
  ctx: CommandContext,
  report: ReportRow,
  person: Person,
  how: string,
): Promise<void> {
  if (report.createdBy === null || report.createdBy === person.userId) return;
  const reporter = await findMailAddress(tx, report.createdBy);
  if (!reporter) return;
  const mail = reportAnsweredMail({
    kindLabel: REPORT_KIND_LABELS[report.kind],
    where: report.anchorId ? "an anchor you reported on" : "a place you reported",
    by: person.name,
    answer: how,
    reportPath: `/reports/${report.id}`,
  });
  const cause = {
    key: `report-answered:${report.id}:${report.version}`,
    areaId: report.areaId,
    now: ctx.now,
  };
  await writeTo(tx, [{ userId: reporter.id, email: reporter.email }], mail, cause);
}

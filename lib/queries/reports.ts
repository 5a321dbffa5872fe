import "server-only";
import { getDb } from "@/db/client";
import { findReportContext, listReportContexts, type ReportContext } from "@/db/repositories/report-read";
import { audience, isMember } from "@/lib/policy/audience";
import { photoViewOf, sheetReportOf } from "@/lib/queries/anchor-view";
import { bareReport } from "@/lib/queries/redact";
import type { ReportView } from "@/lib/schemas/views/register";
import type { Actor } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

/** One report. @throws AppError `not_found` when absent or hidden. */
export async function getReport(actor: Actor, id: string): Promise<ReportView> {
  const context = await findReportContext(
    getDb(),
    audience(actor),
    id,
    actor.kind === "person" ? actor.userId : null,
  );
  if (!context) throw new AppError("not_found", "There is no such report, or it is not shown to you.");
  return reportOf(context, actor);
}

/** Reports the actor may know of, newest first. */
export async function listReports(
  actor: Actor,
  filter: { state?: "open" | "handled"; areaSlug?: string; mine?: boolean },
  limit: number,
): Promise<ReportView[]> {
  const userId = actor.kind === "person" ? actor.userId : null;
  const contexts = await listReportContexts(getDb(), audience(actor), userId, filter, limit);
  return contexts.map((context) => reportOf(context, actor));
}

function reportOf(context: ReportContext, actor: Actor): ReportView {
  const { row, site, area, anchor, jobs } = context;
  const { report } = row;
  const mine = actor.kind === "person" && report.createdBy === actor.userId;
  const member = report.areaId !== null && isMember(audience(actor), report.areaId);
  const exact = mine || member || (site !== null && site.visibility !== "sensitive");
  const seen = sheetReportOf(row);
  return {
    ...(exact ? seen : bareReport(seen)),
    reporterName: member || mine ? seen.reporterName : null,
    version: report.version,
    areaId: report.areaId,
    areaSlug: area?.slug ?? null,
    timeZone: area?.timeZone ?? null,
    siteName: site?.name ?? null,
    siteSlug: site?.slug ?? null,
    anchorCode: anchor?.code ?? null,
    anchorLabel: anchor?.label ?? null,
    boltId: report.boltId,
    receivedAt: report.receivedAt.toISOString(),
    point:
      exact && report.point ? { type: "Point", coordinates: [report.point.lon, report.point.lat] } : null,
    measured: report.measured,
    jobs: member ? jobs : [],
    photos: exact ? row.photos.map(photoViewOf) : [],
  };
}

import "server-only";
import { and, eq, inArray, isNull, or, type SQL, sql } from "drizzle-orm";
import type { Handle } from "@/db/client";
import { listReportRows, type ReportRow } from "@/db/repositories/anchor-read";
import { visibleSites } from "@/db/repositories/visibility";
import { anchors, areas, reboltJobs, reports, sites } from "@/db/schema";
import type { Audience } from "@/lib/shared/audience";

/** A report with the place it is about. */
export interface ReportContext {
  row: ReportRow;
  site: typeof sites.$inferSelect | null;
  area: typeof areas.$inferSelect | null;
  anchor: { code: string; label: string } | null;
  jobs: { id: string; title: string; state: string }[];
}

export interface ReportFilter {
  state?: "open" | "handled";
  areaSlug?: string;
  /** Only what the person filed. */
  mine?: boolean;
}

/**
 * Who may know of a report: everybody who may know of its site; its writer always; and where it belongs to no
 * site, the members of its area. A struck report is gone, except for its writer.
 */
function visibleReports(who: Audience, userId: string | null): SQL | undefined {
  const atSite = sql`exists (select 1 from ${sites} join ${areas} on ${areas.id} = ${sites.areaId}
    where ${sites.id} = ${reports.siteId} and ${visibleSites(who)})`;
  const inArea = who.everything
    ? sql`true`
    : who.memberAreaIds.length > 0
      ? inArray(reports.areaId, [...who.memberAreaIds])
      : sql`false`;
  const standing = sql`${reports.state} <> 'struck'`;
  const mine = userId === null ? sql`false` : eq(reports.createdBy, userId);
  return or(mine, and(standing, or(atSite, and(isNull(reports.siteId), inArea))));
}

export async function findReportContext(db: Handle, who: Audience, id: string, userId: string | null) {
  const rows = await listReportRows(db, and(eq(reports.id, id), visibleReports(who, userId)), 1);
  const [context] = await withContext(db, rows);
  return context ?? null;
}

export async function listReportContexts(
  db: Handle,
  who: Audience,
  userId: string | null,
  { state, areaSlug, mine }: ReportFilter,
  limit: number,
): Promise<ReportContext[]> {
  const rows = await listReportRows(
    db,
    and(
      visibleReports(who, userId),
      state && eq(reports.state, state),
      mine ? (userId === null ? sql`false` : eq(reports.createdBy, userId)) : undefined,
      areaSlug === undefined
        ? undefined
        : sql`${reports.areaId} = (select id from ${areas} where slug = ${areaSlug})`,
    ),
    limit,
  );
  return withContext(db, rows);
}

async function withContext(db: Handle, rows: readonly ReportRow[]): Promise<ReportContext[]> {
  if (rows.length === 0) return [];
  const ids = rows.map(({ report }) => report.id);
  const [places, jobs] = await Promise.all([
    db
      .select({
        reportId: reports.id,
        site: sites,
        area: areas,
        anchor: { code: anchors.code, label: anchors.label },
      })
      .from(reports)
      .leftJoin(sites, eq(sites.id, reports.siteId))
      .leftJoin(areas, eq(areas.id, reports.areaId))
      .leftJoin(anchors, eq(anchors.id, reports.anchorId))
      .where(inArray(reports.id, ids)),
    db
      .select({
        id: reboltJobs.id,
        title: reboltJobs.title,
        state: reboltJobs.state,
        reportId: reboltJobs.openedByReportId,
      })
      .from(reboltJobs)
      .where(inArray(reboltJobs.openedByReportId, ids)),
  ]);
  const placeOf = new Map(places.map((place) => [place.reportId, place]));
  return rows.map((row) => {
    const place = placeOf.get(row.report.id);
    return {
      row,
      site: place?.site ?? null,
      area: place?.area ?? null,
      anchor: place?.anchor ?? null,
      jobs: jobs
        .filter((job) => job.reportId === row.report.id)
        .map(({ id, title, state }) => ({ id, title, state })),
    };
  });
}

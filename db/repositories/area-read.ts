import "server-only";
import { and, asc, desc, eq, isNull, sql } from "drizzle-orm";
import type { Handle } from "@/db/client";
import { roundedSitePoint, seesExactly, visibleAreas, visibleSites } from "@/db/repositories/visibility";
import { anchors, areaPolicies, areas, closures, reports, sites } from "@/db/schema";
import { DEFAULT_POLICY, type LoadPolicy } from "@/lib/domain/policy";
import type { Audience } from "@/lib/shared/audience";

const anchorCount = sql<number>`(select count(*)::int from ${anchors} a where a.site_id = ${sites.id} and a.struck_at is null)`;

/** Sites the audience may know of, with counts by condition. */
export function listSiteRows(
  db: Handle,
  who: Audience,
  filter: { areaSlug?: string; slug?: string; id?: string } = {},
) {
  return db
    .select({
      site: sites,
      area: areas,
      exact: seesExactly(who),
      lon: sql<number>`ST_X(case when ${seesExactly(who)} then ${sites.point} else ${roundedSitePoint()} end)`,
      lat: sql<number>`ST_Y(case when ${seesExactly(who)} then ${sites.point} else ${roundedSitePoint()} end)`,
      anchorCount,
      conditions: sql<
        Record<string, number>
      >`(select coalesce(json_object_agg(c.condition, c.n), '{}'::json) from (
        select a.condition, count(*)::int as n from ${anchors} a
        where a.site_id = ${sites.id} and a.struck_at is null group by a.condition) c)`,
      openReports: sql<number>`(select count(*)::int from ${reports} r where r.site_id = ${sites.id} and r.state = 'open')`,
    })
    .from(sites)
    .innerJoin(areas, eq(areas.id, sites.areaId))
    .where(
      and(
        visibleSites(who),
        filter.areaSlug === undefined ? undefined : eq(areas.slug, filter.areaSlug),
        filter.slug === undefined ? undefined : eq(sites.slug, filter.slug),
        filter.id === undefined ? undefined : eq(sites.id, filter.id),
      ),
    )
    .orderBy(asc(areas.name), asc(sites.name));
}

export type SiteRow = Awaited<ReturnType<typeof listSiteRows>>[number];

export function listAreaRows(db: Handle, who: Audience, slug?: string) {
  return db
    .select()
    .from(areas)
    .where(and(visibleAreas(who), slug === undefined ? undefined : eq(areas.slug, slug)))
    .orderBy(asc(areas.name));
}

/** The policy in force; the built-in default where the area has not agreed on one. */
export async function policyOf(db: Handle, areaId: string): Promise<LoadPolicy> {
  const [row] = await db
    .select()
    .from(areaPolicies)
    .where(eq(areaPolicies.areaId, areaId))
    .orderBy(desc(areaPolicies.versionNo))
    .limit(1);
  return row ? { ...row.policy, version: row.versionNo } : DEFAULT_POLICY;
}

/** Of the site closed, or of the closed anchor's site; null: a whole area. */
const siteVisibility = sql<string | null>`coalesce(${sites.visibility},
  (select s.visibility from sites s where s.id = ${anchors.siteId}))`;

/** Closures not lifted that touch the anchor, its site or its area; of a whole area when no anchor is named. */
export function listClosureRows(
  db: Handle,
  scope: { areaId: string; siteId?: string; anchorId?: string; withLifted?: boolean },
) {
  const { areaId, siteId, anchorId, withLifted } = scope;
  return db
    .select({
      closure: closures,
      siteName: sites.name,
      siteVisibility,
      anchorCode: anchors.code,
      areaName: areas.name,
    })
    .from(closures)
    .innerJoin(areas, eq(areas.id, closures.areaId))
    .leftJoin(sites, eq(sites.id, closures.siteId))
    .leftJoin(anchors, eq(anchors.id, closures.anchorId))
    .where(
      and(
        eq(closures.areaId, areaId),
        withLifted ? undefined : isNull(closures.liftedAt),
        siteId === undefined
          ? undefined
          : sql`(${closures.siteId} is null or ${closures.siteId} = ${siteId})`,
        anchorId === undefined
          ? undefined
          : sql`(${closures.anchorId} is null or ${closures.anchorId} = ${anchorId})`,
        siteId !== undefined && anchorId === undefined ? isNull(closures.anchorId) : undefined,
      ),
    )
    .orderBy(asc(closures.startsOn));
}

export type ClosureRow = Awaited<ReturnType<typeof listClosureRows>>[number];

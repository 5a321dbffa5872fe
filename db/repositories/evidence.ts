import "server-only";
import { and, desc, eq, inArray, isNull, ne, or, sql } from "drizzle-orm";
import type { Handle } from "@/db/client";
import {
  adhesives,
  anchors,
  areaPolicies,
  areas,
  batchWarnings,
  bolts,
  boltTypes,
  closures,
  fittings,
  memberships,
  placements,
  reports,
  rockBodies,
  sites,
  users,
} from "@/db/schema";
import { DEFAULT_POLICY, type LoadPolicy } from "@/lib/domain/policy";

/** Everything on record about a set of anchors, as rows. Assembled into evidence by the caller. */
export async function loadEvidenceRows(db: Handle, anchorIds: readonly string[]) {
  const ids = [...anchorIds];
  const heads = await db
    .select({ anchor: anchors, site: sites, area: areas })
    .from(anchors)
    .innerJoin(sites, eq(sites.id, anchors.siteId))
    .innerJoin(areas, eq(areas.id, sites.areaId))
    .where(inArray(anchors.id, ids));
  const areaIds = [...new Set(heads.map(({ area }) => area.id))];
  const siteIds = [...new Set(heads.map(({ site }) => site.id))];
  return {
    heads,
    policies: await listPoliciesInForce(db, areaIds),
    placements: await db
      .select()
      .from(placements)
      .where(and(inArray(placements.anchorId, ids), isNull(placements.struckAt))),
    rockBodies: await db.select().from(rockBodies).where(inArray(rockBodies.anchorId, ids)),
    bolts: await listBoltsOf(db, ids),
    fittings: await db
      .select()
      .from(fittings)
      .where(and(inArray(fittings.anchorId, ids), isNull(fittings.removedAt))),
    reports: await listReportsOf(db, ids),
    fractures: await listFractures(db, siteIds),
    warnings: await listOpenWarnings(db, areaIds),
    closures: await db
      .select()
      .from(closures)
      .where(and(inArray(closures.areaId, areaIds), isNull(closures.liftedAt))),
  };
}

export type EvidenceRows = Awaited<ReturnType<typeof loadEvidenceRows>>;

/** The policy in force by area id; areas without one of their own use the built-in default. */
export async function listPoliciesInForce(
  db: Handle,
  areaIds: readonly string[],
): Promise<Map<string, LoadPolicy>> {
  const rows =
    areaIds.length === 0
      ? []
      : await db
          .selectDistinctOn([areaPolicies.areaId])
          .from(areaPolicies)
          .where(inArray(areaPolicies.areaId, [...areaIds]))
          .orderBy(areaPolicies.areaId, desc(areaPolicies.versionNo));
  const own = new Map(rows.map((row) => [row.areaId, { ...row.policy, version: row.versionNo }]));
  return new Map(areaIds.map((id) => [id, own.get(id) ?? DEFAULT_POLICY]));
}

/** Every bolt ever placed there that is not struck through, with its type and glue. */
async function listBoltsOf(db: Handle, anchorIds: string[]) {
  return db
    .select({ bolt: bolts, type: boltTypes, adhesive: adhesives, anchorId: placements.anchorId })
    .from(bolts)
    .innerJoin(placements, eq(placements.id, bolts.placementId))
    .leftJoin(boltTypes, eq(boltTypes.id, bolts.boltTypeId))
    .leftJoin(adhesives, eq(adhesives.id, bolts.adhesiveId))
    .where(and(inArray(placements.anchorId, anchorIds), isNull(bolts.struckAt), isNull(placements.struckAt)));
}

/** Reports not struck through; `byMember`: its writer belongs to the area, so its hand checks count. */
async function listReportsOf(db: Handle, anchorIds: string[]) {
  return db
    .select({
      report: reports,
      byMember: sql<boolean>`(${memberships.userId} is not null or coalesce(${users.isAdmin}, false))`,
    })
    .from(reports)
    .innerJoin(anchors, eq(anchors.id, reports.anchorId))
    .innerJoin(sites, eq(sites.id, anchors.siteId))
    .leftJoin(users, eq(users.id, reports.createdBy))
    .leftJoin(
      memberships,
      and(eq(memberships.userId, reports.createdBy), eq(memberships.areaId, sites.areaId)),
    )
    .where(and(inArray(reports.anchorId, anchorIds), ne(reports.state, "struck")));
}

/** Metals with a stress-corrosion fracture that a steward confirmed, by site. */
async function listFractures(db: Handle, siteIds: string[]) {
  if (siteIds.length === 0) return [];
  return db
    .selectDistinct({
      siteId: anchors.siteId,
      metal: sql<string | null>`coalesce(${bolts.boltMetal}, ${boltTypes.boltMetal})`,
    })
    .from(reports)
    .innerJoin(anchors, eq(anchors.id, reports.anchorId))
    .innerJoin(bolts, eq(bolts.id, reports.boltId))
    .leftJoin(boltTypes, eq(boltTypes.id, bolts.boltTypeId))
    .where(
      and(
        inArray(anchors.siteId, siteIds),
        ne(reports.state, "struck"),
        sql`(${reports.measured} ->> 'stressCorrosionConfirmed')::boolean`,
      ),
    );
}

/** Warnings that are published, not closed, and hold in one of these areas or everywhere. */
async function listOpenWarnings(db: Handle, areaIds: string[]) {
  return db
    .select()
    .from(batchWarnings)
    .where(
      and(
        sql`${batchWarnings.publishedAt} is not null`,
        isNull(batchWarnings.closedAt),
        or(
          isNull(batchWarnings.areaId),
          areaIds.length > 0 ? inArray(batchWarnings.areaId, areaIds) : sql`false`,
        ),
      ),
    );
}

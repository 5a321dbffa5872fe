import "server-only";
import { and, asc, desc, eq, inArray, isNull, type SQL, sql } from "drizzle-orm";
import type { Handle } from "@/db/client";
import { lastCheckSql } from "@/db/repositories/anchor-list";
import { visibleAnchors } from "@/db/repositories/visibility";
import {
  adhesives,
  anchorEval,
  anchors,
  areas,
  boltEval,
  bolts,
  boltTypes,
  edges,
  events,
  findings,
  fittings,
  photos,
  placements,
  pullTests,
  reboltJobs,
  reports,
  rockBodies,
  sites,
  watches,
} from "@/db/schema";
import type { Audience } from "@/lib/shared/audience";

/** The anchor with its site, area and evaluation; null when absent or hidden from this audience. */
export async function findAnchorHead(db: Handle, who: Audience, by: { id: string } | { code: string }) {
  const [row] = await db
    .select({ anchor: anchors, site: sites, area: areas, evaluation: anchorEval, lastCheckOn: lastCheckSql })
    .from(anchors)
    .innerJoin(sites, eq(sites.id, anchors.siteId))
    .innerJoin(areas, eq(areas.id, sites.areaId))
    .leftJoin(anchorEval, eq(anchorEval.anchorId, anchors.id))
    .where(
      and("id" in by ? eq(anchors.id, by.id) : eq(anchors.code, by.code.toUpperCase()), visibleAnchors(who)),
    )
    .limit(1);
  return row ?? null;
}

/** Everything that hangs on one anchor, struck records left out. */
export async function loadAnchorParts(db: Handle, anchorId: string) {
  const [
    placementRows,
    boltRows,
    fittingRows,
    edgeRows,
    bodyRows,
    findingRows,
    reportRows,
    jobRows,
    eventRows,
  ] = await Promise.all([
    db
      .select()
      .from(placements)
      .where(and(eq(placements.anchorId, anchorId), isNull(placements.struckAt)))
      .orderBy(asc(placements.number)),
    listBoltRows(db, eq(placements.anchorId, anchorId)),
    db
      .select()
      .from(fittings)
      .where(and(eq(fittings.anchorId, anchorId), isNull(fittings.removedAt)))
      .orderBy(asc(fittings.createdAt), asc(fittings.id)),
    db.select().from(edges).where(eq(edges.anchorId, anchorId)).orderBy(asc(edges.label)),
    db.select().from(rockBodies).where(eq(rockBodies.anchorId, anchorId)).orderBy(asc(rockBodies.label)),
    listFindingRows(db, anchorId),
    listReportRows(db, eq(reports.anchorId, anchorId)),
    db
      .select()
      .from(reboltJobs)
      .where(and(eq(reboltJobs.anchorId, anchorId), inArray(reboltJobs.state, ["proposed", "accepted"])))
      .orderBy(desc(reboltJobs.priority)),
    db.select().from(events).where(eq(events.anchorId, anchorId)).orderBy(asc(events.at), asc(events.id)),
  ]);
  return {
    placements: placementRows,
    bolts: boltRows,
    fittings: fittingRows,
    edges: edgeRows,
    rockBodies: bodyRows,
    findings: findingRows,
    reports: reportRows,
    jobs: jobRows,
    events: eventRows,
  };
}

/** Bolts with type, adhesive, evaluation and pull tests, the newest of each placement first. */
export async function listBoltRows(db: Handle, where: SQL) {
  const rows = await db
    .select({
      bolt: bolts,
      type: boltTypes,
      adhesiveName: adhesives.name,
      evaluation: boltEval,
      anchorId: placements.anchorId,
      placementNumber: placements.number,
    })
    .from(bolts)
    .innerJoin(placements, eq(placements.id, bolts.placementId))
    .leftJoin(boltTypes, eq(boltTypes.id, bolts.boltTypeId))
    .leftJoin(adhesives, eq(adhesives.id, bolts.adhesiveId))
    .leftJoin(boltEval, eq(boltEval.boltId, bolts.id))
    .where(where)
    .orderBy(
      sql`${bolts.removedOn} desc nulls first`,
      sql`${bolts.installedOn} desc nulls last`,
      desc(bolts.createdAt),
    );
  const ids = rows.map((row) => row.bolt.id);
  const tests =
    ids.length === 0
      ? []
      : await db
          .select()
          .from(pullTests)
          .where(inArray(pullTests.boltId, ids))
          .orderBy(desc(pullTests.testedOn));
  return rows.map((row) => ({ ...row, tests: tests.filter((test) => test.boltId === row.bolt.id) }));
}

export type BoltRow = Awaited<ReturnType<typeof listBoltRows>>[number];

/** The bolts in force of one anchor. */
export function boltsOfAnchor(anchorId: string): SQL {
  return sql`${placements.anchorId} = ${anchorId} and ${bolts.removedOn} is null and ${bolts.struckAt} is null`;
}

/** Worst level first. */
export function listFindingRows(db: Handle, anchorId: string) {
  return db
    .select()
    .from(findings)
    .where(eq(findings.anchorId, anchorId))
    .orderBy(
      sql`array_position(array['stop','ask','limit','note'], ${findings.level})`,
      sql`${findings.placementNumber} nulls first`,
      asc(findings.id),
    );
}

export type FindingRow = Awaited<ReturnType<typeof listFindingRows>>[number];

/** Reports with their photos and the number of the placement, newest first. */
export async function listReportRows(db: Handle, where: SQL | undefined, limit = 200) {
  const rows = await db
    .select({ report: reports, placementNumber: placements.number })
    .from(reports)
    .leftJoin(placements, eq(placements.id, reports.placementId))
    .where(where)
    .orderBy(desc(reports.observedAt), desc(reports.id))
    .limit(limit);
  const ids = rows.map((row) => row.report.id);
  const pictures =
    ids.length === 0
      ? []
      : await db.select().from(photos).where(inArray(photos.reportId, ids)).orderBy(asc(photos.createdAt));
  return rows.map((row) => ({
    ...row,
    photos: pictures.filter((photo) => photo.reportId === row.report.id),
  }));
}

export type ReportRow = Awaited<ReturnType<typeof listReportRows>>[number];

export async function isWatched(db: Handle, userId: string, anchorId: string): Promise<boolean> {
  const [row] = await db
    .select({ id: watches.id })
    .from(watches)
    .where(and(eq(watches.userId, userId), eq(watches.anchorId, anchorId)))
    .limit(1);
  return row !== undefined;
}

/** The anchor a bolt sits in; null when there is no such bolt. */
export async function anchorIdOfBolt(db: Handle, boltId: string): Promise<string | null> {
  const [row] = await db
    .select({ anchorId: placements.anchorId })
    .from(bolts)
    .innerJoin(placements, eq(placements.id, bolts.placementId))
    .where(eq(bolts.id, boltId))
    .limit(1);
  return row?.anchorId ?? null;
}

import "server-only";
import { and, asc, eq, inArray, isNull, sql } from "drizzle-orm";
import type { LonLat } from "@/db/columns/point";
import type { Handle, Tx } from "@/db/client";
import { seesExactly, visibleAnchors, visibleSites } from "@/db/repositories/visibility";
import { anchors, areas, bolts, edges, fittings, placements, rockBodies, sites } from "@/db/schema";
import type { Audience } from "@/lib/shared/audience";

export type AnchorRow = typeof anchors.$inferSelect;
export type NewAnchor = typeof anchors.$inferInsert;
export type PlacementRow = typeof placements.$inferSelect;

const lockedFields = {
  anchor: anchors,
  areaId: sites.areaId,
  siteName: sites.name,
  siteVisibility: sites.visibility,
  timeZone: areas.timeZone,
};

/** Locks an anchor this audience may know of; null when it is absent or hidden. */
export async function lockAnchor(tx: Tx, who: Audience, id: string) {
  const [row] = await tx
    .select({ ...lockedFields, exact: seesExactly(who) })
    .from(anchors)
    .innerJoin(sites, eq(sites.id, anchors.siteId))
    .innerJoin(areas, eq(areas.id, sites.areaId))
    .where(and(eq(anchors.id, id), visibleAnchors(who)))
    .for("update", { of: anchors });
  return row ? { ...row.anchor, ...row } : null;
}

export type LockedAnchor = NonNullable<Awaited<ReturnType<typeof lockAnchor>>>;

/** Locks several anchors in the order of their ids, so that two transactions never wait for each other. */
export async function lockAnchors(tx: Tx, ids: readonly string[]): Promise<AnchorRow[]> {
  if (ids.length === 0) return [];
  return tx
    .select()
    .from(anchors)
    .where(inArray(anchors.id, [...ids]))
    .orderBy(asc(anchors.id))
    .for("update");
}

export async function findAnchorDigest(db: Handle, id: string) {
  const [row] = await db.select({ digest: anchors.digest }).from(anchors).where(eq(anchors.id, id));
  return row ?? null;
}

export async function findAnchorRow(db: Handle, id: string): Promise<AnchorRow | null> {
  const [row] = await db.select().from(anchors).where(eq(anchors.id, id));
  return row ?? null;
}

/** @returns false when the id or code is taken. */
export async function insertAnchor(tx: Tx, row: NewAnchor): Promise<boolean> {
  const rows = await tx.insert(anchors).values(row).onConflictDoNothing().returning({ id: anchors.id });
  return rows.length === 1;
}

/** Saves a person's change: raises the version. The caller holds the lock and has compared versions. */
export async function updateAnchorRow(
  tx: Tx,
  id: string,
  change: Partial<NewAnchor>,
  by: { userId: string; now: Date },
): Promise<void> {
  await tx
    .update(anchors)
    .set({ ...change, updatedAt: by.now, updatedBy: by.userId, version: sql`${anchors.version} + 1` })
    .where(eq(anchors.id, id));
}

/** The placements of an anchor in order of their numbers, those struck through included. */
export async function listPlacements(db: Handle, anchorId: string): Promise<PlacementRow[]> {
  return db
    .select()
    .from(placements)
    .where(eq(placements.anchorId, anchorId))
    .orderBy(asc(placements.number));
}

export async function findPlacement(db: Handle, id: string): Promise<PlacementRow | null> {
  const [row] = await db.select().from(placements).where(eq(placements.id, id));
  return row ?? null;
}

/** @returns false when an id or number is taken. */
export async function insertPlacements(
  tx: Tx,
  rows: readonly (typeof placements.$inferInsert)[],
): Promise<boolean> {
  if (rows.length === 0) return true;
  const insert = tx.insert(placements).values([...rows]);
  return (await insert.onConflictDoNothing().returning({ id: placements.id })).length === rows.length;
}

export async function updatePlacementRow(
  tx: Tx,
  id: string,
  change: Partial<typeof placements.$inferInsert>,
  by: { userId: string; now: Date },
): Promise<void> {
  await tx
    .update(placements)
    .set({ ...change, updatedAt: by.now, updatedBy: by.userId, version: sql`${placements.version} + 1` })
    .where(eq(placements.id, id));
}

/** @returns false when an id is taken. */
export async function insertRockBodies(
  tx: Tx,
  rows: readonly (typeof rockBodies.$inferInsert)[],
): Promise<boolean> {
  if (rows.length === 0) return true;
  const insert = tx.insert(rockBodies).values([...rows]);
  return (await insert.onConflictDoNothing().returning({ id: rockBodies.id })).length === rows.length;
}

/** @returns false when an id is taken. */
export async function insertEdges(tx: Tx, rows: readonly (typeof edges.$inferInsert)[]): Promise<boolean> {
  if (rows.length === 0) return true;
  const insert = tx.insert(edges).values([...rows]);
  return (await insert.onConflictDoNothing().returning({ id: edges.id })).length === rows.length;
}

/** @returns false when an id is taken. */
export async function insertFittings(
  tx: Tx,
  rows: readonly (typeof fittings.$inferInsert)[],
): Promise<boolean> {
  if (rows.length === 0) return true;
  const insert = tx.insert(fittings).values([...rows]);
  return (await insert.onConflictDoNothing().returning({ id: fittings.id })).length === rows.length;
}

export async function findFitting(db: Handle, id: string) {
  const [row] = await db.select().from(fittings).where(eq(fittings.id, id));
  return row ?? null;
}

export async function updateFittingRow(
  tx: Tx,
  id: string,
  change: Partial<typeof fittings.$inferInsert>,
  by: { userId: string; now: Date },
): Promise<void> {
  await tx
    .update(fittings)
    .set({ ...change, updatedAt: by.now, updatedBy: by.userId, version: sql`${fittings.version} + 1` })
    .where(eq(fittings.id, id));
}

/** The rock bodies of an anchor, for checking what a placement names. */
export async function listRockBodyIds(db: Handle, anchorId: string): Promise<string[]> {
  const rows = await db
    .select({ id: rockBodies.id })
    .from(rockBodies)
    .where(eq(rockBodies.anchorId, anchorId));
  return rows.map((row) => row.id);
}

/** Codes already given that start with this prefix, for choosing the next one. */
export async function listCodesLike(db: Handle, prefix: string): Promise<string[]> {
  const rows = await db
    .select({ code: anchors.code })
    .from(anchors)
    .where(sql`starts_with(${anchors.code}, ${prefix})`);
  return rows.map((row) => row.code);
}

/** Anchor ids a condition on their bolts, site or area selects; ids in ascending order. */
export async function listAnchorIds(
  db: Handle,
  by: { areaId?: string | null; siteId?: string | null; anchorId?: string | null },
): Promise<string[]> {
  const rows = await db
    .select({ id: anchors.id })
    .from(anchors)
    .innerJoin(sites, eq(sites.id, anchors.siteId))
    .where(
      and(
        isNull(anchors.struckAt),
        by.areaId ? eq(sites.areaId, by.areaId) : undefined,
        by.siteId ? eq(anchors.siteId, by.siteId) : undefined,
        by.anchorId ? eq(anchors.id, by.anchorId) : undefined,
      ),
    )
    .orderBy(asc(anchors.id));
  return rows.map((row) => row.id);
}

/** Anchors with a bolt in force of this type or set with this adhesive. */
export async function listAnchorIdsWithHardware(
  db: Handle,
  by: { boltTypeId?: string | null; adhesiveId?: string | null; areaId?: string | null },
): Promise<string[]> {
  const rows = await db
    .selectDistinct({ id: placements.anchorId })
    .from(bolts)
    .innerJoin(placements, eq(placements.id, bolts.placementId))
    .innerJoin(anchors, eq(anchors.id, placements.anchorId))
    .innerJoin(sites, eq(sites.id, anchors.siteId))
    .where(
      and(
        isNull(bolts.removedOn),
        isNull(bolts.struckAt),
        isNull(anchors.struckAt),
        by.boltTypeId ? eq(bolts.boltTypeId, by.boltTypeId) : undefined,
        by.adhesiveId ? eq(bolts.adhesiveId, by.adhesiveId) : undefined,
        by.areaId ? eq(sites.areaId, by.areaId) : undefined,
      ),
    )
    .orderBy(asc(placements.anchorId));
  return rows.map((row) => row.id);
}

/** The site whose point lies nearest within some metres, for reports filed by place. */
export async function findSiteNear(
  db: Handle,
  who: Audience,
  { lon, lat }: LonLat,
  withinM: number,
): Promise<{ siteId: string; areaId: string } | null> {
  const here = sql`ST_SetSRID(ST_MakePoint(${lon}, ${lat}), 4326)::geography`;
  const [row] = await db
    .select({ siteId: sites.id, areaId: sites.areaId })
    .from(sites)
    .innerJoin(areas, eq(areas.id, sites.areaId))
    .where(
      and(
        visibleSites(who),
        seesExactly(who),
        sql`ST_DWithin(${sites.point}::geography, ${here}, ${withinM})`,
      ),
    )
    .orderBy(sql`${sites.point}::geography <-> ${here}`)
    .limit(1);
  return row ?? null;
}

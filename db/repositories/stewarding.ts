import "server-only";
import { and, eq, isNull, sql } from "drizzle-orm";
import type { Handle, Tx } from "@/db/client";
import { visibleSites } from "@/db/repositories/visibility";
import { areas, batchWarnings, closures, findings, sites, watches } from "@/db/schema";
import type { Audience } from "@/lib/shared/audience";

interface By {
  userId: string;
  now: Date;
}

export type WarningRow = typeof batchWarnings.$inferSelect;
export type ClosureRow = typeof closures.$inferSelect;
export type SiteRow = typeof sites.$inferSelect;

/** Locks a site this audience may know of; null when it is absent or hidden. */
export async function lockSite(tx: Tx, who: Audience, id: string) {
  const [row] = await tx
    .select({ site: sites, timeZone: areas.timeZone })
    .from(sites)
    .innerJoin(areas, eq(areas.id, sites.areaId))
    .where(and(eq(sites.id, id), visibleSites(who)))
    .for("update", { of: sites });
  return row ? { ...row.site, timeZone: row.timeZone } : null;
}

export async function findArea(db: Handle, id: string) {
  const [row] = await db.select().from(areas).where(eq(areas.id, id));
  return row ?? null;
}

export async function insertArea(tx: Tx, row: typeof areas.$inferInsert): Promise<boolean> {
  const rows = await tx.insert(areas).values(row).onConflictDoNothing().returning({ id: areas.id });
  return rows.length === 1;
}

export async function insertSite(tx: Tx, row: typeof sites.$inferInsert): Promise<boolean> {
  const rows = await tx.insert(sites).values(row).onConflictDoNothing().returning({ id: sites.id });
  return rows.length === 1;
}

export async function updateSiteRow(
  tx: Tx,
  id: string,
  change: Partial<typeof sites.$inferInsert>,
  by: By,
): Promise<void> {
  await tx
    .update(sites)
    .set({ ...change, updatedAt: by.now, updatedBy: by.userId, version: sql`${sites.version} + 1` })
    .where(eq(sites.id, id));
}

export async function findWarning(db: Handle, id: string): Promise<WarningRow | null> {
  const [row] = await db.select().from(batchWarnings).where(eq(batchWarnings.id, id));
  return row ?? null;
}

export async function lockWarning(tx: Tx, id: string): Promise<WarningRow | null> {
  const [row] = await tx.select().from(batchWarnings).where(eq(batchWarnings.id, id)).for("update");
  return row ?? null;
}

export async function insertWarning(tx: Tx, row: typeof batchWarnings.$inferInsert): Promise<boolean> {
  const rows = await tx
    .insert(batchWarnings)
    .values(row)
    .onConflictDoNothing()
    .returning({ id: batchWarnings.id });
  return rows.length === 1;
}

export async function closeWarningRow(tx: Tx, id: string, by: By): Promise<void> {
  await tx
    .update(batchWarnings)
    .set({
      closedAt: by.now,
      updatedAt: by.now,
      updatedBy: by.userId,
      version: sql`${batchWarnings.version} + 1`,
    })
    .where(eq(batchWarnings.id, id));
}

/** Anchors with a reason that names this warning. */
export async function listAnchorsWarned(db: Handle, warningId: string): Promise<string[]> {
  const rows = await db
    .selectDistinct({ id: findings.anchorId })
    .from(findings)
    .where(and(eq(findings.code, "record.warning"), sql`${findings.numbers} ->> 'warningId' = ${warningId}`));
  return rows.map((row) => row.id);
}

export async function findClosure(db: Handle, id: string): Promise<ClosureRow | null> {
  const [row] = await db.select().from(closures).where(eq(closures.id, id));
  return row ?? null;
}

export async function lockClosure(tx: Tx, id: string): Promise<ClosureRow | null> {
  const [row] = await tx.select().from(closures).where(eq(closures.id, id)).for("update");
  return row ?? null;
}

export async function insertClosure(tx: Tx, row: typeof closures.$inferInsert): Promise<boolean> {
  const rows = await tx.insert(closures).values(row).onConflictDoNothing().returning({ id: closures.id });
  return rows.length === 1;
}

export async function liftClosureRow(tx: Tx, id: string, by: By): Promise<void> {
  await tx
    .update(closures)
    .set({
      liftedAt: by.now,
      updatedAt: by.now,
      updatedBy: by.userId,
      version: sql`${closures.version} + 1`,
    })
    .where(eq(closures.id, id));
}

/** Follows; twice is once. */
export async function insertWatch(tx: Tx, row: typeof watches.$inferInsert): Promise<void> {
  await tx.insert(watches).values(row).onConflictDoNothing();
}

export async function deleteWatch(
  tx: Tx,
  by: { userId: string; anchorId: string | null; siteId: string | null },
): Promise<void> {
  await tx
    .delete(watches)
    .where(
      and(
        eq(watches.userId, by.userId),
        by.anchorId ? eq(watches.anchorId, by.anchorId) : isNull(watches.anchorId),
        by.siteId ? eq(watches.siteId, by.siteId) : isNull(watches.siteId),
      ),
    );
}

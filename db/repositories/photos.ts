import "server-only";
import { and, eq, or, sql } from "drizzle-orm";
import type { Handle, Tx } from "@/db/client";
import { seesExactly, visibleAnchors, visibleSites } from "@/db/repositories/visibility";
import { anchors, areas, photos, reports, sites } from "@/db/schema";
import type { Audience } from "@/lib/shared/audience";

export type PhotoRow = typeof photos.$inferSelect;

export async function findPhotoRow(db: Handle, id: string): Promise<PhotoRow | null> {
  const [row] = await db.select().from(photos).where(eq(photos.id, id));
  return row ?? null;
}

export async function insertPhoto(tx: Tx, row: typeof photos.$inferInsert): Promise<boolean> {
  const rows = await tx.insert(photos).values(row).onConflictDoNothing().returning({ id: photos.id });
  return rows.length === 1;
}

/** The report, job, bolt or anchor a photo is added to. */
export interface PhotoSubject {
  reportId: string | null;
  jobId: string | null;
  boltId: string | null;
  anchorId: string | null;
}

/**
 * Whether a public copy with this key may be shown to the audience: of an anchor they see exactly; of a report
 * about no anchor, at a site they see exactly, or its own writer's. Originals are never shown.
 */
export async function maySeePhoto(
  db: Handle,
  who: Audience,
  key: string,
  userId: string | null,
): Promise<boolean> {
  const [row] = await db
    .select({ id: photos.id })
    .from(photos)
    .leftJoin(reports, eq(reports.id, photos.reportId))
    .leftJoin(anchors, eq(anchors.id, sql`coalesce(${photos.anchorId}, ${reports.anchorId})`))
    .leftJoin(sites, eq(sites.id, sql`coalesce(${anchors.siteId}, ${reports.siteId})`))
    .leftJoin(areas, eq(areas.id, sites.areaId))
    .where(
      and(
        or(eq(photos.largeKey, key), eq(photos.thumbKey, key)),
        or(
          and(sql`${anchors.id} is not null`, visibleAnchors(who), seesExactly(who)),
          and(sql`${anchors.id} is null and ${sites.id} is not null`, visibleSites(who), seesExactly(who)),
          userId ? eq(photos.createdBy, userId) : undefined,
          who.everything ? sql`true` : undefined,
        ),
      ),
    )
    .limit(1);
  return row !== undefined;
}

import "server-only";
import { and, eq, isNull, or, sql } from "drizzle-orm";
import type { Handle, Tx } from "@/db/client";
import { spans } from "@/db/schema";

export type SpanRow = typeof spans.$inferSelect;

export async function findSpan(db: Handle, id: string): Promise<SpanRow | null> {
  const [row] = await db.select().from(spans).where(eq(spans.id, id));
  return row ?? null;
}

export async function insertSpan(tx: Tx, row: typeof spans.$inferInsert): Promise<boolean> {
  const rows = await tx.insert(spans).values(row).onConflictDoNothing().returning({ id: spans.id });
  return rows.length === 1;
}

export async function updateSpanRow(
  tx: Tx,
  id: string,
  change: Partial<typeof spans.$inferInsert>,
  by: { userId: string; now: Date },
): Promise<void> {
  await tx
    .update(spans)
    .set({ ...change, updatedAt: by.now, updatedBy: by.userId, version: sql`${spans.version} + 1` })
    .where(eq(spans.id, id));
}

/** Measures the spans of an anchor again after it moved, on the ellipsoid. */
export async function remeasureSpans(tx: Tx, anchorId: string): Promise<void> {
  const length = sql`(
    select ST_Distance(a.point::geography, b.point::geography) from anchors a, anchors b
    where a.id = ${spans.anchorAId} and b.id = ${spans.anchorBId})`;
  await tx
    .update(spans)
    .set({ lengthM: length })
    .where(and(isNull(spans.struckAt), or(eq(spans.anchorAId, anchorId), eq(spans.anchorBId, anchorId))));
}

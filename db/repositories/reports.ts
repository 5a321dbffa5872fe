import "server-only";
import { and, asc, desc, eq, gt, inArray, ne, sql } from "drizzle-orm";
import type { Handle, Tx } from "@/db/client";
import { anchors, events, photos, reports, users } from "@/db/schema";
import type { ReportKind } from "@/lib/domain/vocabulary";

export type ReportRow = typeof reports.$inferSelect;
export type NewReport = typeof reports.$inferInsert;

interface By {
  userId: string | null;
  now: Date;
}

export async function findReport(db: Handle, id: string): Promise<ReportRow | null> {
  const [row] = await db.select().from(reports).where(eq(reports.id, id));
  return row ?? null;
}

/** The same, locked: for reports about no anchor, whose lock would do. */
export async function lockReport(tx: Tx, id: string): Promise<ReportRow | null> {
  const [row] = await tx.select().from(reports).where(eq(reports.id, id)).for("update");
  return row ?? null;
}

export async function insertReport(tx: Tx, row: NewReport): Promise<boolean> {
  const rows = await tx.insert(reports).values(row).onConflictDoNothing().returning({ id: reports.id });
  return rows.length === 1;
}

export async function updateReportRow(tx: Tx, id: string, change: Partial<NewReport>, by: By): Promise<void> {
  await tx
    .update(reports)
    .set({ ...change, updatedAt: by.now, updatedBy: by.userId, version: sql`${reports.version} + 1` })
    .where(eq(reports.id, id));
}

/** Answers the open reports about a placement, of these kinds only. @returns their ids. */
export async function answerReports(
  tx: Tx,
  about: { placementId: string; kinds: readonly ReportKind[]; how: string },
  by: { userId: string; now: Date },
): Promise<string[]> {
  if (about.kinds.length === 0) return [];
  const rows = await tx
    .update(reports)
    .set({
      state: "handled",
      handledAt: by.now,
      handledBy: by.userId,
      handledHow: about.how,
      updatedAt: by.now,
      updatedBy: by.userId,
      version: sql`${reports.version} + 1`,
    })
    .where(
      and(
        eq(reports.placementId, about.placementId),
        eq(reports.state, "open"),
        inArray(reports.kind, [...about.kinds]),
      ),
    )
    .returning({ id: reports.id });
  return rows.map((row) => row.id);
}

/** Opens again what an install answered that was never made. */
export async function reopenReports(
  tx: Tx,
  answered: { placementId: string; handledAt: Date },
  by: { userId: string; now: Date },
): Promise<void> {
  await tx
    .update(reports)
    .set({
      state: "open",
      handledAt: null,
      handledBy: null,
      handledHow: null,
      updatedAt: by.now,
      updatedBy: by.userId,
      version: sql`${reports.version} + 1`,
    })
    .where(
      and(
        eq(reports.placementId, answered.placementId),
        eq(reports.state, "handled"),
        eq(reports.handledAt, answered.handledAt),
      ),
    );
}

/** When the anchor was last put back in service; null: never. */
export async function lastReturnAt(db: Handle, anchorId: string): Promise<Date | null> {
  const [row] = await db
    .select({ at: events.at })
    .from(events)
    .where(and(eq(events.anchorId, anchorId), eq(events.kind, "anchor.returned")))
    .orderBy(desc(events.at))
    .limit(1);
  return row?.at ?? null;
}

/** The newest event that took the anchor out of use after an instant, struck reports left out. */
export async function newestOutOfUseEvent(db: Handle, anchorId: string, since: Date | null) {
  const [row] = await db
    .select({ at: reports.observedAt })
    .from(reports)
    .where(
      and(
        eq(reports.anchorId, anchorId),
        eq(reports.tookOutOfUse, true),
        ne(reports.state, "struck"),
        since ? gt(reports.receivedAt, since) : undefined,
      ),
    )
    .orderBy(desc(reports.observedAt))
    .limit(1);
  return row?.at ?? null;
}

/** Sets or clears since when the anchor is out of use; the next evaluation works from it. */
export async function setOutOfUseSince(tx: Tx, anchorId: string, since: Date | null): Promise<void> {
  await tx.update(anchors).set({ outOfUseSince: since }).where(eq(anchors.id, anchorId));
}

/** Which of these reports carry a photo. */
export async function listReportsWithPhoto(db: Handle, reportIds: readonly string[]): Promise<Set<string>> {
  if (reportIds.length === 0) return new Set();
  const rows = await db
    .selectDistinct({ id: photos.reportId })
    .from(photos)
    .where(inArray(photos.reportId, [...reportIds]))
    .orderBy(asc(photos.reportId));
  return new Set(rows.map((row) => row.id).filter((id) => id !== null));
}

/** Address and name of an account that is not disabled. */
export async function findMailAddress(db: Handle, userId: string) {
  const [row] = await db
    .select({ id: users.id, email: users.email })
    .from(users)
    .where(and(eq(users.id, userId), sql`${users.disabledAt} is null`));
  return row ?? null;
}

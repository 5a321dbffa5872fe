import "server-only";
import { and, asc, eq, inArray, or, sql } from "drizzle-orm";
import type { Handle, Tx } from "@/db/client";
import { memberships, photos, reboltJobAssignees, reboltJobPlacements, reboltJobs, users } from "@/db/schema";

export type JobRow = typeof reboltJobs.$inferSelect;
export type NewJob = typeof reboltJobs.$inferInsert;

/** Proposed or accepted: still to be done. */
const waiting = or(eq(reboltJobs.state, "proposed"), eq(reboltJobs.state, "accepted"));

export async function findJob(db: Handle, id: string): Promise<JobRow | null> {
  const [row] = await db.select().from(reboltJobs).where(eq(reboltJobs.id, id));
  return row ?? null;
}

/** The oldest entry of an anchor that is still to be done. */
export async function findWaitingJob(db: Handle, anchorId: string): Promise<JobRow | null> {
  const [row] = await db
    .select()
    .from(reboltJobs)
    .where(and(eq(reboltJobs.anchorId, anchorId), waiting))
    .orderBy(asc(reboltJobs.waitingSince))
    .limit(1);
  return row ?? null;
}

export async function listWaitingJobs(db: Handle, anchorIds: readonly string[]) {
  if (anchorIds.length === 0) return [];
  return db
    .select()
    .from(reboltJobs)
    .where(and(inArray(reboltJobs.anchorId, [...anchorIds]), waiting))
    .orderBy(asc(reboltJobs.id));
}

export async function listJobPlacements(db: Handle, jobIds: readonly string[]) {
  if (jobIds.length === 0) return [];
  return db
    .select()
    .from(reboltJobPlacements)
    .where(inArray(reboltJobPlacements.jobId, [...jobIds]));
}

export async function insertJob(tx: Tx, row: NewJob): Promise<boolean> {
  const rows = await tx.insert(reboltJobs).values(row).onConflictDoNothing().returning({ id: reboltJobs.id });
  return rows.length === 1;
}

export async function addJobPlacements(
  tx: Tx,
  rows: readonly (typeof reboltJobPlacements.$inferInsert)[],
): Promise<void> {
  if (rows.length > 0)
    await tx
      .insert(reboltJobPlacements)
      .values([...rows])
      .onConflictDoNothing();
}

export async function updateJobRow(
  tx: Tx,
  id: string,
  change: Partial<NewJob>,
  by: { userId: string; now: Date },
): Promise<void> {
  await tx
    .update(reboltJobs)
    .set({ ...change, updatedAt: by.now, updatedBy: by.userId, version: sql`${reboltJobs.version} + 1` })
    .where(eq(reboltJobs.id, id));
}

/** The computed rank follows from evidence: it raises no version. */
export async function setJobPriority(
  tx: Tx,
  id: string,
  change: Pick<NewJob, "priority" | "priorityParts">,
): Promise<void> {
  await tx.update(reboltJobs).set(change).where(eq(reboltJobs.id, id));
}

export async function listAssignees(db: Handle, jobId: string) {
  return db
    .select({ userId: users.id, name: users.name, email: users.email })
    .from(reboltJobAssignees)
    .innerJoin(users, eq(users.id, reboltJobAssignees.userId))
    .where(eq(reboltJobAssignees.jobId, jobId))
    .orderBy(asc(users.id));
}

export async function replaceAssignees(
  tx: Tx,
  jobId: string,
  userIds: readonly string[],
  now: Date,
): Promise<void> {
  await tx.delete(reboltJobAssignees).where(eq(reboltJobAssignees.jobId, jobId));
  if (userIds.length > 0) {
    await tx.insert(reboltJobAssignees).values(userIds.map((userId) => ({ jobId, userId, createdAt: now })));
  }
}

/** Those of these people who may do rebolt work in the area. */
export async function listWorkers(db: Handle, areaId: string, userIds: readonly string[]) {
  if (userIds.length === 0) return [];
  return db
    .select({ userId: users.id, name: users.name, email: users.email })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(
        eq(memberships.areaId, areaId),
        inArray(memberships.userId, [...userIds]),
        inArray(memberships.role, ["bolter", "steward"]),
        sql`${users.disabledAt} is null`,
      ),
    );
}

export async function isPhotoOfJob(db: Handle, photoId: string, jobId: string): Promise<boolean> {
  const [row] = await db
    .select({ id: photos.id })
    .from(photos)
    .where(and(eq(photos.id, photoId), eq(photos.jobId, jobId)));
  return row !== undefined;
}

import "server-only";
import { and, desc, eq, gt, isNull, sql } from "drizzle-orm";
import type { Handle, Tx } from "@/db/client";
import { areas, invitations, users } from "@/db/schema";

export type InvitationRow = typeof invitations.$inferSelect;
export type NewInvitation = typeof invitations.$inferInsert;

/** False when an invitation with this id is there already. */
export async function insertInvitation(tx: Tx, row: NewInvitation): Promise<boolean> {
  const added = await tx
    .insert(invitations)
    .values(row)
    .onConflictDoNothing({ target: invitations.id })
    .returning({ id: invitations.id });
  return added.length === 1;
}

export async function findInvitation(db: Handle, id: string): Promise<InvitationRow | null> {
  const [row] = await db.select().from(invitations).where(eq(invitations.id, id)).limit(1);
  return row ?? null;
}

export async function lockInvitation(tx: Tx, id: string): Promise<InvitationRow | null> {
  const [row] = await tx.select().from(invitations).where(eq(invitations.id, id)).limit(1).for("update");
  return row ?? null;
}

/** Invitations that still wait for an answer, newest first, with who sent each. */
export async function listOpenInvitations(db: Handle, areaId: string, now: Date) {
  return db
    .select({
      id: invitations.id,
      email: invitations.email,
      role: invitations.role,
      createdAt: invitations.createdAt,
      expiresAt: invitations.expiresAt,
      invitedBy: users.name,
    })
    .from(invitations)
    .leftJoin(users, eq(users.id, invitations.createdBy))
    .where(and(eq(invitations.areaId, areaId), ...open(now)))
    .orderBy(desc(invitations.createdAt));
}

/** What the invited person is shown. */
export async function findOpenInvitation(db: Handle, id: string, now: Date) {
  const [row] = await db
    .select({
      email: invitations.email,
      role: invitations.role,
      expiresAt: invitations.expiresAt,
      areaName: areas.name,
      invitedBy: users.name,
    })
    .from(invitations)
    .innerJoin(areas, eq(areas.id, invitations.areaId))
    .leftJoin(users, eq(users.id, invitations.createdBy))
    .where(and(eq(invitations.id, id), ...open(now)))
    .limit(1);
  return row ?? null;
}

/** Revokes what is still open for an address in an area: a new invitation takes its place. */
export async function revokeOpenInvitations(
  tx: Tx,
  { areaId, email, by }: { areaId: string; email: string; by: string },
  now: Date,
): Promise<void> {
  await tx
    .update(invitations)
    .set({ revokedAt: now, updatedAt: now, updatedBy: by, version: sql`${invitations.version} + 1` })
    .where(and(eq(invitations.areaId, areaId), eq(invitations.email, email), ...open(now)));
}

export async function markInvitation(
  tx: Tx,
  id: string,
  changes: Pick<NewInvitation, "acceptedAt" | "acceptedBy" | "revokedAt">,
  { by, now }: { by: string; now: Date },
): Promise<void> {
  await tx
    .update(invitations)
    .set({ ...changes, updatedAt: now, updatedBy: by, version: sql`${invitations.version} + 1` })
    .where(eq(invitations.id, id));
}

function open(now: Date) {
  return [isNull(invitations.acceptedAt), isNull(invitations.revokedAt), gt(invitations.expiresAt, now)];
}

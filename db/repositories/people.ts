import "server-only";
import { and, eq, gt, isNull, sql } from "drizzle-orm";
import type { Handle, Tx } from "@/db/client";
import { apiTokens, memberships, oneTimeTokens, users } from "@/db/schema";
import type { Role } from "@/lib/shared/actor";

export type UserRow = typeof users.$inferSelect;
export type OneTimePurpose = (typeof oneTimeTokens.$inferSelect)["purpose"];

export async function findUserByEmail(db: Handle, email: string): Promise<UserRow | null> {
  const [row] = await db.select().from(users).where(eq(users.email, email.toLowerCase())).limit(1);
  return row ?? null;
}

export async function findUserById(db: Handle, id: string): Promise<UserRow | null> {
  const [row] = await db.select().from(users).where(eq(users.id, id)).limit(1);
  return row ?? null;
}

/** Role by area id. */
export async function rolesOf(db: Handle, userId: string): Promise<Record<string, Role>> {
  const rows = await db
    .select({ areaId: memberships.areaId, role: memberships.role })
    .from(memberships)
    .where(eq(memberships.userId, userId));
  return Object.fromEntries(rows.map((row) => [row.areaId, row.role]));
}

/** Accounts that exist only in the demo, for its sign-in page. */
export async function listDemoUsers(db: Handle): Promise<{ email: string; name: string }[]> {
  return db
    .select({ email: users.email, name: users.name })
    .from(users)
    .where(eq(users.isDemo, true))
    .orderBy(users.email);
}

export async function hasAdministrator(db: Handle): Promise<boolean> {
  const [row] = await db.select({ id: users.id }).from(users).where(eq(users.isAdmin, true)).limit(1);
  return row !== undefined;
}

/** Ends every session of the person. */
export async function raiseSessionEpoch(tx: Tx, userId: string): Promise<void> {
  await tx
    .update(users)
    .set({ sessionEpoch: sql`${users.sessionEpoch} + 1`, version: sql`${users.version} + 1` })
    .where(eq(users.id, userId));
}

export async function insertOneTimeToken(db: Handle, row: typeof oneTimeTokens.$inferInsert): Promise<void> {
  await db.insert(oneTimeTokens).values(row);
}

/** Reads a live secret without spending it. */
export async function findOneTimeToken(db: Handle, tokenHash: string, purpose: OneTimePurpose, now: Date) {
  const [row] = await db
    .select()
    .from(oneTimeTokens)
    .where(
      and(
        eq(oneTimeTokens.tokenHash, tokenHash),
        eq(oneTimeTokens.purpose, purpose),
        isNull(oneTimeTokens.usedAt),
        gt(oneTimeTokens.expiresAt, now),
      ),
    )
    .limit(1);
  return row ?? null;
}

/** Spends a live secret; null when it is unknown, used or expired. Two at once: one gets it. */
export async function spendOneTimeToken(db: Handle, tokenHash: string, purpose: OneTimePurpose, now: Date) {
  const [row] = await db
    .update(oneTimeTokens)
    .set({ usedAt: now })
    .where(
      and(
        eq(oneTimeTokens.tokenHash, tokenHash),
        eq(oneTimeTokens.purpose, purpose),
        isNull(oneTimeTokens.usedAt),
        gt(oneTimeTokens.expiresAt, now),
      ),
    )
    .returning();
  return row ?? null;
}

/** The live API token with this hash; also notes that it was used. */
export async function touchApiToken(db: Handle, tokenHash: string, now: Date) {
  const [row] = await db
    .update(apiTokens)
    .set({ lastUsedAt: now })
    .where(
      and(
        eq(apiTokens.tokenHash, tokenHash),
        isNull(apiTokens.revokedAt),
        sql`(${apiTokens.expiresAt} is null or ${apiTokens.expiresAt} > ${now.toISOString()})`,
      ),
    )
    .returning();
  return row ?? null;
}

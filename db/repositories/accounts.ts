import "server-only";
import { and, eq, isNull, sql } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { oneTimeTokens, users } from "@/db/schema";

export async function insertUser(
  tx: Tx,
  user: {
    id: string;
    email: string;
    name: string;
    passwordHash: string | null;
    emailVerifiedAt: Date | null;
    isAdmin?: boolean;
  },
  now: Date,
): Promise<void> {
  await tx.insert(users).values({
    ...user,
    createdAt: now,
    createdBy: user.id,
    updatedAt: now,
    updatedBy: user.id,
  });
}

/** Locks the person's row until the transaction ends. */
export async function lockUser(tx: Tx, id: string) {
  const [row] = await tx.select().from(users).where(eq(users.id, id)).limit(1).for("update");
  return row ?? null;
}

/** Changes what the person says about themselves. */
export async function updateUser(
  tx: Tx,
  id: string,
  changes: { name?: string; passwordHash?: string; emailVerifiedAt?: Date },
  now: Date,
): Promise<void> {
  await tx
    .update(users)
    .set({ ...changes, updatedAt: now, updatedBy: id, version: sql`${users.version} + 1` })
    .where(eq(users.id, id));
}

/** Lets only one transaction at a time make the first administrator. */
export async function lockFirstRun(tx: Tx): Promise<void> {
  await tx.execute(sql`select pg_advisory_xact_lock(hashtext('first administrator'))`);
}

/** Makes every unspent sign-in and reset link of the person worthless. */
export async function voidLinks(tx: Tx, userId: string, now: Date): Promise<void> {
  await tx
    .update(oneTimeTokens)
    .set({ usedAt: now })
    .where(and(eq(oneTimeTokens.userId, userId), isNull(oneTimeTokens.usedAt)));
}

/** Makes earlier first-run links worthless, so that only the one printed last works. */
export async function voidFirstRunLinks(tx: Tx, now: Date): Promise<void> {
  await tx
    .update(oneTimeTokens)
    .set({ usedAt: now })
    .where(and(eq(oneTimeTokens.purpose, "first_run"), isNull(oneTimeTokens.usedAt)));
}

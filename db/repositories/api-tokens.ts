import "server-only";
import { and, desc, eq, isNull } from "drizzle-orm";
import type { Handle, Tx } from "@/db/client";
import { apiTokens } from "@/db/schema";

/** False when a token with this id is there already. */
export async function insertApiToken(tx: Tx, row: typeof apiTokens.$inferInsert): Promise<boolean> {
  const added = await tx
    .insert(apiTokens)
    .values(row)
    .onConflictDoNothing({ target: apiTokens.id })
    .returning({ id: apiTokens.id });
  return added.length === 1;
}

/** The person's tokens that were not revoked, newest first. */
export async function listApiTokens(db: Handle, userId: string) {
  return db
    .select({
      id: apiTokens.id,
      name: apiTokens.name,
      hint: apiTokens.hint,
      scopes: apiTokens.scopes,
      createdAt: apiTokens.createdAt,
      expiresAt: apiTokens.expiresAt,
      lastUsedAt: apiTokens.lastUsedAt,
    })
    .from(apiTokens)
    .where(and(eq(apiTokens.userId, userId), isNull(apiTokens.revokedAt)))
    .orderBy(desc(apiTokens.createdAt));
}

/** The name of the token, or null when the person has no such token in force. */
export async function revokeApiToken(tx: Tx, id: string, userId: string, now: Date): Promise<string | null> {
  const [row] = await tx
    .update(apiTokens)
    .set({ revokedAt: now })
    .where(and(eq(apiTokens.id, id), eq(apiTokens.userId, userId), isNull(apiTokens.revokedAt)))
    .returning({ name: apiTokens.name });
  return row?.name ?? null;
}

import "server-only";
import { lt } from "drizzle-orm";
import type { Db } from "@/db/client";
import { oneTimeTokens, rateLimits } from "@/db/schema";

/** Secrets that expired before `before`, used or not. */
export async function deleteOldTokens(db: Db, before: Date): Promise<void> {
  await db.delete(oneTimeTokens).where(lt(oneTimeTokens.expiresAt, before));
}

export async function deleteExpiredLimits(db: Db, now: Date): Promise<void> {
  await db.delete(rateLimits).where(lt(rateLimits.expire, now));
}

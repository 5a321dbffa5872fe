import "server-only";
import type { Db } from "@/db/client";
import { trimSinkMails } from "@/db/repositories/sink-mails";
import { deleteExpiredLimits, deleteOldTokens } from "@/db/repositories/sweep";

const DAY_MS = 86_400_000;

/** Clears away what has served its time: used and expired secrets after a month, spent rate limits, old sink mail. */
export async function sweep(db: Db, now: Date): Promise<void> {
  await deleteOldTokens(db, new Date(now.getTime() - 30 * DAY_MS));
  await deleteExpiredLimits(db, now);
  await trimSinkMails(db);
}

import "server-only";
import { desc, eq, notInArray } from "drizzle-orm";
import { v7 } from "uuid";
import type { Db, Handle } from "@/db/client";
import { sinkMails } from "@/db/schema";

export type SinkMailRow = typeof sinkMails.$inferSelect;

/** How many caught mails stay. */
const KEPT = 500;

export async function insertSinkMail(
  db: Db,
  mail: Pick<SinkMailRow, "fromAddress" | "toAddress" | "subject" | "body" | "receivedAt">,
): Promise<void> {
  await db.insert(sinkMails).values({ ...mail, id: v7() });
}

/** Newest first. */
export async function listSinkMails(db: Handle): Promise<SinkMailRow[]> {
  return db.select().from(sinkMails).orderBy(desc(sinkMails.receivedAt), desc(sinkMails.id)).limit(KEPT);
}

export async function findSinkMail(db: Handle, id: string): Promise<SinkMailRow | null> {
  const [row] = await db.select().from(sinkMails).where(eq(sinkMails.id, id)).limit(1);
  return row ?? null;
}

/** Keeps the newest mails only. */
export async function trimSinkMails(db: Db): Promise<void> {
  const newest = db.select({ id: sinkMails.id }).from(sinkMails).orderBy(desc(sinkMails.id)).limit(KEPT);
  await db.delete(sinkMails).where(notInArray(sinkMails.id, newest));
}

import "server-only";
import { and, asc, eq, lte, sql } from "drizzle-orm";
import { v7 } from "uuid";
import type { Tx } from "@/db/client";
import { outbox } from "@/db/schema";

export type OutboxRow = typeof outbox.$inferSelect;

export interface NewMail {
  toEmail: string;
  subject: string;
  body: string;
  kind: string;
  /** The area whose stewards see the mail when it could not be sent; null: only administrators. */
  areaId: string | null;
  /** One mail per cause and person, for example `report:<id>:<user id>`. */
  dedupeKey: string;
}

/** Queues mails in the transaction that causes them. A mail whose `dedupeKey` is there already is left alone. */
export async function queueMails(tx: Tx, mails: readonly NewMail[], now: Date): Promise<void> {
  if (mails.length === 0) return;
  await tx
    .insert(outbox)
    .values(mails.map((mail) => ({ ...mail, id: v7(), createdAt: now, nextAttemptAt: now })))
    .onConflictDoNothing({ target: outbox.dedupeKey });
}

/**
 * Takes the mail that has waited longest and locks it until the transaction ends. One that another drain
 * holds is passed over, so two drains never send the same mail.
 */
export async function takeDueMail(tx: Tx, now: Date): Promise<OutboxRow | null> {
  const [row] = await tx
    .select()
    .from(outbox)
    .where(and(eq(outbox.state, "queued"), lte(outbox.nextAttemptAt, now)))
    .orderBy(asc(outbox.nextAttemptAt), asc(outbox.id))
    .limit(1)
    .for("update", { skipLocked: true });
  return row ?? null;
}

/** `body`: what is kept of the text; a mail that carried a secret keeps none of it. */
export async function markSent(
  tx: Tx,
  id: string,
  { now, body }: { now: Date; body: string },
): Promise<void> {
  await tx
    .update(outbox)
    .set({ state: "sent", sentAt: now, attempts: sql`${outbox.attempts} + 1`, lastError: null, body })
    .where(eq(outbox.id, id));
}

/** `nextAttemptAt` null: the mail is given up and stays visible to the stewards. */
export async function markFailed(
  tx: Tx,
  id: string,
  { error, nextAttemptAt }: { error: string; nextAttemptAt: Date | null },
): Promise<void> {
  await tx
    .update(outbox)
    .set({
      attempts: sql`${outbox.attempts} + 1`,
      lastError: error,
      ...(nextAttemptAt ? { nextAttemptAt } : { state: "given_up" }),
    })
    .where(eq(outbox.id, id));
}

import "server-only";
import type { Tx } from "@/db/client";
import { queueMails } from "@/db/repositories/outbox";
import type { Recipient } from "@/db/repositories/recipients";
import type { Mail } from "@/lib/mail/mail";

/** Queues one mail a person in this transaction; the same cause never writes to the same person twice. */
export async function writeTo(
  tx: Tx,
  recipients: readonly Recipient[],
  mail: Mail,
  cause: { key: string; areaId: string | null; now: Date },
): Promise<void> {
  await queueMails(
    tx,
    recipients.map(({ userId, email }) => ({
      ...mail,
      toEmail: email,
      areaId: cause.areaId,
      dedupeKey: `${cause.key}:${userId}`,
    })),
    cause.now,
  );
}

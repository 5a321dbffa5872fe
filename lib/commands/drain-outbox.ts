import "server-only";
import { type Db, inTransaction } from "@/db/client";
import { markFailed, markSent, takeDueMail } from "@/db/repositories/outbox";
import { nextAttempt } from "@/lib/mail/backoff";
import { carriesSecret } from "@/lib/mail/mail";
import type { Deliver } from "@/lib/mail/transport";

export interface Drained {
  sent: number;
  failed: number;
}

/**
 * Sends what is due, one mail a transaction: the row stays locked while its mail is handed over, so another
 * drain passes it by, and a crash in between leaves it queued. At least once: a crash after the mail server
 * took the mail and before the commit sends it again, under the same message id.
 */
export async function drainOutbox(db: Db, deliver: Deliver, now: () => Date, most = 500): Promise<Drained> {
  const drained: Drained = { sent: 0, failed: 0 };
  while (drained.sent + drained.failed < most) {
    const outcome = await sendNext(db, deliver, now);
    if (outcome === null) break;
    drained[outcome] += 1;
  }
  return drained;
}

/** Null: nothing is due. */
function sendNext(db: Db, deliver: Deliver, now: () => Date): Promise<keyof Drained | null> {
  return inTransaction(db, async (tx) => {
    const mail = await takeDueMail(tx, now());
    if (!mail) return null;
    try {
      await deliver(mail);
    } catch (error) {
      const reason = error instanceof Error ? error.message : String(error);
      await markFailed(tx, mail.id, {
        error: reason.slice(0, 500),
        nextAttemptAt: nextAttempt(mail.attempts + 1, now()),
      });
      return "failed";
    }
    const body = carriesSecret(mail.kind)
      ? "This mail held a link that works once. Its text is not kept."
      : mail.body;
    await markSent(tx, mail.id, { now: now(), body });
    return "sent";
  });
}

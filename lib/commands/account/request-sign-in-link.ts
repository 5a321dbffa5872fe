import "server-only";
import { inTransaction } from "@/db/client";
import { queueMails } from "@/db/repositories/outbox";
import { findUserByEmail } from "@/db/repositories/people";
import { issueLink, LINK_MINUTES } from "@/lib/commands/account/one-time-link";
import type { CommandContext } from "@/lib/commands/context";
import { nudgeMail } from "@/lib/commands/mail-loop";
import { resetPasswordMail, signInMail } from "@/lib/mail/templates/account";

/** Mails a sign-in link when somebody has this address. The answer is the same when nobody has. */
export function requestSignInLink(ctx: CommandContext, input: { email: string }): Promise<void> {
  return mailLink(ctx, input.email, "sign_in");
}

/** Mails a link to set a new password when somebody has this address. The answer is the same when nobody has. */
export function requestPasswordReset(ctx: CommandContext, input: { email: string }): Promise<void> {
  return mailLink(ctx, input.email, "reset_password");
}

/** For an unknown address a secret is stored too, one that belongs to nobody: the answer takes as long. */
async function mailLink(
  { db, now }: CommandContext,
  email: string,
  purpose: "sign_in" | "reset_password",
): Promise<void> {
  await inTransaction(db, async (tx) => {
    const user = await findUserByEmail(tx, email);
    const userId = user && !user.disabledAt ? user.id : null;
    const secret = await issueLink(tx, purpose, { email, userId }, now);
    if (userId === null) return;
    const template = purpose === "sign_in" ? signInMail : resetPasswordMail;
    const mail = template({ secret, minutes: LINK_MINUTES[purpose] });
    const dedupeKey = `${purpose}:${userId}:${now.toISOString()}`;
    await queueMails(tx, [{ ...mail, toEmail: email, areaId: null, dedupeKey }], now);
  });
  nudgeMail();
}

import "server-only";
import { inTransaction, type Tx } from "@/db/client";
import { lockUser, updateUser, voidLinks } from "@/db/repositories/accounts";
import { appendEvents } from "@/db/repositories/events";
import { queueMails } from "@/db/repositories/outbox";
import { raiseSessionEpoch, spendOneTimeToken, type UserRow } from "@/db/repositories/people";
import { hashPassword, passwordFits } from "@/lib/auth/password";
import { hashSecret } from "@/lib/auth/secrets";
import { issueHandover, linkGone } from "@/lib/commands/account/one-time-link";
import { requireSelf } from "@/lib/commands/account/require-self";
import type { CommandContext } from "@/lib/commands/context";
import { nudgeMail } from "@/lib/commands/mail-loop";
import { invalidField, notFound } from "@/lib/commands/writing/refusals";
import { passwordChangedMail } from "@/lib/mail/templates/account";
import type { Actor } from "@/lib/shared/actor";

/** What the device that set the password signs in with: all its sessions, too, have ended. */
export interface PasswordSet {
  signInSecret: string;
}

/**
 * Changes the password, or sets the first one of somebody who signs in by link. Ends every session.
 * @throws AppError `invalid_input` when the current password does not fit.
 */
export async function changePassword(
  ctx: CommandContext,
  input: { current: string; password: string },
): Promise<PasswordSet> {
  const { userId } = requireSelf(ctx.actor);
  const set = await inTransaction(ctx.db, async (tx) => {
    const user = await lockUser(tx, userId);
    if (!user) throw notFound();
    if (user.passwordHash !== null && !(await passwordFits(user.passwordHash, input.current))) {
      throw invalidField("current", "This is not your current password.");
    }
    return setPassword(tx, user, input.password, ctx.actor, ctx.now);
  });
  nudgeMail();
  return set;
}

/**
 * Sets a new password with a mailed link. Ends every session.
 * @throws AppError `not_found` when the link was used or has expired.
 */
export async function resetPassword(
  ctx: CommandContext,
  input: { secret: string; password: string },
): Promise<PasswordSet> {
  const set = await inTransaction(ctx.db, async (tx) => {
    const token = await spendOneTimeToken(tx, hashSecret(input.secret), "reset_password", ctx.now);
    const user = token?.userId ? await lockUser(tx, token.userId) : null;
    if (!user || user.disabledAt) throw linkGone();
    const self: Actor = {
      kind: "person",
      userId: user.id,
      name: user.name,
      email: user.email,
      isAdmin: user.isAdmin,
      roles: {},
    };
    return setPassword(tx, user, input.password, self, ctx.now);
  });
  nudgeMail();
  return set;
}

async function setPassword(
  tx: Tx,
  user: UserRow,
  password: string,
  actor: Actor,
  now: Date,
): Promise<PasswordSet> {
  await updateUser(tx, user.id, { passwordHash: await hashPassword(password) }, now);
  await raiseSessionEpoch(tx, user.id);
  await voidLinks(tx, user.id, now);
  const dedupeKey = `password_changed:${user.id}:${now.toISOString()}`;
  await queueMails(tx, [{ ...passwordChangedMail(), toEmail: user.email, areaId: null, dedupeKey }], now);
  await appendEvents(tx, { actor, now }, [
    { subjectType: "user", subjectId: user.id, kind: "password.changed", summary: "Password changed" },
  ]);
  return { signInSecret: await issueHandover(tx, user.id, now) };
}

import "server-only";
import { v7 } from "uuid";
import { inTransaction } from "@/db/client";
import { insertUser, lockFirstRun } from "@/db/repositories/accounts";
import { appendEvents } from "@/db/repositories/events";
import { findUserByEmail, hasAdministrator, spendOneTimeToken } from "@/db/repositories/people";
import { hashPassword } from "@/lib/auth/password";
import { hashSecret } from "@/lib/auth/secrets";
import { issueHandover, linkGone } from "@/lib/commands/account/one-time-link";
import type { CommandContext } from "@/lib/commands/context";
import { invalidField } from "@/lib/commands/writing/refusals";
import type { FirstAdministratorInput } from "@/lib/schemas/account";

/**
 * Makes the administrator of a new installation with the link printed at its first start.
 * @throws AppError `not_found` when the link is spent, or there is an administrator already.
 */
export function makeFirstAdministrator(
  { db, now }: CommandContext,
  { secret, name, email, password }: FirstAdministratorInput,
): Promise<{ signInSecret: string }> {
  return inTransaction(db, async (tx) => {
    await lockFirstRun(tx);
    const token = await spendOneTimeToken(tx, hashSecret(secret), "first_run", now);
    if (!token || (await hasAdministrator(tx))) throw linkGone();
    if (await findUserByEmail(tx, email)) throw invalidField("email", "This address has an account already.");
    const id = v7();
    const passwordHash = await hashPassword(password);
    await insertUser(tx, { id, name, email, passwordHash, emailVerifiedAt: null, isAdmin: true }, now);
    const actor = { kind: "person", userId: id, name, email, isAdmin: true, roles: {} } as const;
    await appendEvents(tx, { actor, now }, [
      { subjectType: "user", subjectId: id, kind: "administrator.made", summary: `${name} set up Byssus` },
    ]);
    return { signInSecret: await issueHandover(tx, id, now) };
  });
}

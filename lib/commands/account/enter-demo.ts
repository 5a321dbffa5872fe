import "server-only";
import { inTransaction } from "@/db/client";
import { findUserByEmail } from "@/db/repositories/people";
import { issueHandover } from "@/lib/commands/account/one-time-link";
import type { CommandContext } from "@/lib/commands/context";
import { notFound } from "@/lib/commands/writing/refusals";
import { env } from "@/lib/config/env";

/** Signs in to one of the demo's own accounts without a password. @throws AppError `not_found` outside the demo. */
export function enterDemo(
  { db, now }: CommandContext,
  input: { email: string },
): Promise<{ signInSecret: string }> {
  return inTransaction(db, async (tx) => {
    const user = env().BYSSUS_DEMO === "1" ? await findUserByEmail(tx, input.email) : null;
    if (!user?.isDemo || user.disabledAt) throw notFound();
    return { signInSecret: await issueHandover(tx, user.id, now) };
  });
}

import "server-only";
import { inTransaction } from "@/db/client";
import { voidLinks } from "@/db/repositories/accounts";
import { appendEvents } from "@/db/repositories/events";
import { raiseSessionEpoch } from "@/db/repositories/people";
import { requireSelf } from "@/lib/commands/account/require-self";
import type { CommandContext } from "@/lib/commands/context";

/** Ends every session of the person, this one too, and makes mailed links worthless. API tokens keep working. */
export async function signOutEverywhere({ db, actor, now }: CommandContext): Promise<void> {
  const { userId } = requireSelf(actor);
  await inTransaction(db, async (tx) => {
    await raiseSessionEpoch(tx, userId);
    await voidLinks(tx, userId, now);
    await appendEvents(tx, { actor, now }, [
      { subjectType: "user", subjectId: userId, kind: "sessions.ended", summary: "Signed out everywhere" },
    ]);
  });
}

import "server-only";
import { inTransaction } from "@/db/client";
import { updateUser } from "@/db/repositories/accounts";
import { appendEvents } from "@/db/repositories/events";
import { requireSelf } from "@/lib/commands/account/require-self";
import type { CommandContext } from "@/lib/commands/context";

/** Changes the name others see. What was recorded earlier keeps the name it was recorded under. */
export async function renameAccount(
  { db, actor, now }: CommandContext,
  input: { name: string },
): Promise<void> {
  const person = requireSelf(actor);
  await inTransaction(db, async (tx) => {
    await updateUser(tx, person.userId, { name: input.name }, now);
    await appendEvents(tx, { actor, now }, [
      {
        subjectType: "user",
        subjectId: person.userId,
        kind: "user.renamed",
        summary: `${person.name} is now ${input.name}`,
        before: { name: person.name },
        after: { name: input.name },
      },
    ]);
  });
}

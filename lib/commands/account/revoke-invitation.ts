import "server-only";
import { appendEvents } from "@/db/repositories/events";
import { findInvitation, lockInvitation, markInvitation } from "@/db/repositories/invitations";
import { onMembers } from "@/lib/commands/account/on-members";
import type { CommandContext } from "@/lib/commands/context";
import { notFound } from "@/lib/commands/writing/refusals";

/** Takes an invitation back; its link stops working. Taking it back twice is harmless. */
export async function revokeInvitation(ctx: CommandContext, input: { id: string }): Promise<void> {
  const found = await findInvitation(ctx.db, input.id);
  if (!found) throw notFound();
  await onMembers(ctx, found.areaId, async ({ tx, person }) => {
    const invitation = await lockInvitation(tx, input.id);
    if (!invitation || invitation.acceptedAt) throw notFound();
    if (invitation.revokedAt) return;
    await markInvitation(tx, input.id, { revokedAt: ctx.now }, { by: person.userId, now: ctx.now });
    await appendEvents(tx, ctx, [
      {
        areaId: invitation.areaId,
        subjectType: "invitation",
        subjectId: invitation.id,
        kind: "invitation.revoked",
        summary: "Took an invitation back",
      },
    ]);
  });
}

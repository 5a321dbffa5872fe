import "server-only";
import { appendEvents } from "@/db/repositories/events";
import { deleteMembership, findMembership } from "@/db/repositories/memberships";
import { queueMails } from "@/db/repositories/outbox";
import { onMembers, refuseLastSteward } from "@/lib/commands/account/on-members";
import type { CommandContext } from "@/lib/commands/context";
import { nudgeMail } from "@/lib/commands/mail-loop";
import { notFound } from "@/lib/commands/writing/refusals";
import { membershipEndedMail } from "@/lib/mail/templates/account";

/** Ends a membership. The account and everything the person recorded stay. */
export async function removeMember(
  ctx: CommandContext,
  input: { areaId: string; userId: string },
): Promise<void> {
  const { now } = ctx;
  await onMembers(ctx, input.areaId, async ({ tx, area }) => {
    const member = await findMembership(tx, area.id, input.userId);
    if (!member) throw notFound();
    if (member.role === "steward") await refuseLastSteward(tx, area);
    await deleteMembership(tx, area.id, member.userId);
    const dedupeKey = `membership_ended:${area.id}:${member.userId}:${now.toISOString()}`;
    const mail = membershipEndedMail({ areaName: area.name });
    await queueMails(tx, [{ ...mail, toEmail: member.email, areaId: area.id, dedupeKey }], now);
    await appendEvents(tx, ctx, [
      {
        areaId: area.id,
        subjectType: "membership",
        subjectId: member.userId,
        kind: "member.removed",
        summary: `${member.name} is no longer a member, was ${member.role}`,
        before: { role: member.role },
      },
    ]);
  });
  nudgeMail();
}

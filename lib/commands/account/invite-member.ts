import "server-only";
import { findInvitation, insertInvitation, revokeOpenInvitations } from "@/db/repositories/invitations";
import { appendEvents } from "@/db/repositories/events";
import { findMembership } from "@/db/repositories/memberships";
import { queueMails } from "@/db/repositories/outbox";
import { findUserByEmail } from "@/db/repositories/people";
import { issueLink, LINK_MINUTES } from "@/lib/commands/account/one-time-link";
import { onMembers } from "@/lib/commands/account/on-members";
import type { CommandContext } from "@/lib/commands/context";
import { digestOf } from "@/lib/commands/digest";
import { nudgeMail } from "@/lib/commands/mail-loop";
import { idTaken, invalidField, isReplay } from "@/lib/commands/writing/refusals";
import { invitationMail } from "@/lib/mail/templates/account";
import type { InviteInput } from "@/lib/schemas/account";

const DAY_MINUTES = 24 * 60;

/**
 * Invites an address to an area with a role. An open invitation of the same address is replaced. Sent twice
 * with the same id, it is one invitation and one mail.
 */
export async function inviteMember(ctx: CommandContext, input: InviteInput): Promise<{ id: string }> {
  const { now, actor } = ctx;
  const digest = digestOf(input);
  await onMembers(ctx, input.areaId, async ({ tx, area, person }) => {
    if (isReplay(await findInvitation(tx, input.id), digest)) return;
    const known = await findUserByEmail(tx, input.email);
    if (known && (await findMembership(tx, area.id, known.id))) {
      throw invalidField("email", `${known.name} is a member already. Change the role in the list.`);
    }
    await revokeOpenInvitations(tx, { areaId: area.id, email: input.email, by: person.userId }, now);
    const added = await insertInvitation(tx, {
      id: input.id,
      areaId: area.id,
      email: input.email,
      role: input.role,
      expiresAt: new Date(now.getTime() + LINK_MINUTES.invitation * 60_000),
      digest,
      createdAt: now,
      createdBy: person.userId,
      updatedAt: now,
      updatedBy: person.userId,
    });
    if (!added) throw idTaken();
    const secret = await issueLink(tx, "invitation", { email: input.email, invitationId: input.id }, now);
    const mail = invitationMail({
      secret,
      areaName: area.name,
      role: input.role,
      invitedBy: person.name,
      days: LINK_MINUTES.invitation / DAY_MINUTES,
    });
    await queueMails(
      tx,
      [{ ...mail, toEmail: input.email, areaId: area.id, dedupeKey: `invitation:${input.id}` }],
      now,
    );
    await appendEvents(tx, { actor, now }, [
      {
        areaId: area.id,
        subjectType: "invitation",
        subjectId: input.id,
        kind: "member.invited",
        summary: `Invited somebody as ${input.role}`,
        after: { role: input.role },
      },
    ]);
  });
  nudgeMail();
  return { id: input.id };
}

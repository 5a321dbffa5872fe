import "server-only";
import { appendEvents } from "@/db/repositories/events";
import { findMembership, updateRole } from "@/db/repositories/memberships";
import { queueMails } from "@/db/repositories/outbox";
import { onMembers, refuseLastSteward } from "@/lib/commands/account/on-members";
import type { CommandContext } from "@/lib/commands/context";
import { nudgeMail } from "@/lib/commands/mail-loop";
import { notFound, refuseStale } from "@/lib/commands/writing/refusals";
import { roleChangedMail } from "@/lib/mail/templates/account";
import type { ChangeRoleInput } from "@/lib/schemas/account";

/** Gives a member another role. It counts from their next request on. */
export async function changeRole(ctx: CommandContext, input: ChangeRoleInput): Promise<void> {
  const { now } = ctx;
  await onMembers(ctx, input.areaId, async ({ tx, area, person }) => {
    const member = await findMembership(tx, area.id, input.userId);
    if (!member) throw notFound();
    refuseStale({ version: member.version, name: member.name, role: member.role }, input.version);
    if (member.role === input.role) return;
    if (member.role === "steward") await refuseLastSteward(tx, area);
    await updateRole(tx, { ...input, by: person.userId }, now);
    const dedupeKey = `role_changed:${area.id}:${member.userId}:${input.version}`;
    const mail = roleChangedMail({ areaName: area.name, role: input.role });
    await queueMails(tx, [{ ...mail, toEmail: member.email, areaId: area.id, dedupeKey }], now);
    await appendEvents(tx, ctx, [
      {
        areaId: area.id,
        subjectType: "membership",
        subjectId: member.userId,
        kind: "role.changed",
        summary: `${member.name} is now ${input.role}, was ${member.role}`,
        before: { role: member.role },
        after: { role: input.role },
      },
    ]);
  });
  nudgeMail();
}
